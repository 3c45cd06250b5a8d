/**
 * Quantities as small immutable value types: one final class per kind, one {@code double} in SI inside.
 *
 * <h2>Making and reading values</h2>
 * <p>Every number enters and leaves with its unit in the method name: {@code Temperature.celsius(540)},
 * {@code Pressure.barGauge(4, atmosphere)}, {@code t.inCelsius()}, {@code flow.in(Units.TONNE_PER_HOUR)}. Text such as
 * {@code 3.5 bar} is read by {@code Pressure.parse} and written by {@code format}; the locale of the machine plays no
 * part.
 *
 * <h2>Arithmetic</h2>
 * <p>Only what physics has: {@code MassFlow × SpecificEnergy = Power}, {@code Power ÷ TemperatureSpan = Conductance}.
 * Temperatures and absolute pressures are points on a scale: their difference is a span, and a sum of two of them does
 * not compile.
 *
 * <h2>Other people's quantities</h2>
 * <p>Any JSR-385 {@code javax.measure.Quantity} comes in through {@code of(...)} with a check of its dimension, and goes
 * out through {@code asQuantity()}. The classes here do not implement that interface, since through it a sum of two
 * temperatures would compile again.
 *
 * <h2>Nulls and threads</h2>
 * <p>No parameter and no result is null. All types are immutable and thread-safe.
 */
@NullMarked
package lostwork.quantity;

import org.jspecify.annotations.NullMarked;
