/**
 * Quantities as small immutable value types: one final class per kind, one {@code double} in the coherent SI unit
 * inside.
 *
 * <h2>Kinds and dimensions</h2>
 * <p>Quantities are compared and added only within a kind (VIM 3rd edition, JCGM 200:2012, 1.2; ISO 80000-1:2009,
 * 3.2). The dimension (VIM 1.7) is less than that: an entropy rate and a conductance are both W/K, and their sum means
 * nothing. So the kind is the Java type, and the compiler keeps kinds apart; the {@link Dimension} only checks what
 * comes from outside, where no more is known.
 *
 * <h2>Points and differences</h2>
 * <p>A thermodynamic temperature is a point on a scale: two of them have a difference, and no sum. In the words of
 * algebra, temperatures form an affine space over the vector space of temperature spans:
 * <pre>
 *   point − point = span     point + span = point     span + span = span     number × span = span
 * </pre>
 * <p>The point and the span are two types, {@link Temperature} and {@link TemperatureSpan}, since the zero of a scale
 * (0 °C, 0 °F) shifts the one and not the other. Absolute pressure and {@link PressureDifference} are told apart for
 * the same reason: a gauge reading is a difference that becomes a pressure only with the atmosphere it is counted
 * from. All other kinds are linear: they are their own differences, and so a value of either sign exists. Where
 * physics wants a density or a flow above zero, the function that takes it says so.
 *
 * <h2>Coherent units</h2>
 * <p>Inside, every value is in the coherent SI unit (VIM 1.12; SI Brochure, 9th edition, 2.3.4), in which the
 * equations between numbers are those between quantities, without factors. So {@code flow.times(h2.minus(h1))} is one
 * subtraction, one product and a check that the result is finite. Units only stand at the edge: every number enters
 * and leaves with its unit in the name of the method, {@code Temperature.celsius(540)}, {@code p.inBar()}, or as a
 * constant of {@link Units}, {@code flow.in(Units.TONNE_PER_HOUR)}.
 *
 * <h2>Arithmetic</h2>
 * <p>Only what physics has. Every product can be written either way, and its quotients by either factor exist, but
 * for points on a scale and where two kinds would answer (power by span gives the conductance):
 * <pre>
 *   MassFlow × SpecificEnergy = Power       Power ÷ MassFlow = SpecificEnergy       Power ÷ SpecificEnergy = MassFlow
 *   MassFlow × SpecificEntropy = EntropyRate                 EntropyRate × Temperature = Power
 *   Power ÷ TemperatureSpan = Conductance                    Power ÷ Conductance = TemperatureSpan
 *   SpecificEnergy ÷ TemperatureSpan = SpecificHeatCapacity  SpecificEnergy ÷ SpecificEntropy = Temperature
 * </pre>
 * <p>The last is the mean temperature at which heat carries its entropy. An energy is not divided by a temperature:
 * the entropy of a heat is asked for by name, {@code EntropyRate.ofHeat(heat, temperature)}. A quotient of two values
 * of one kind is a {@link Ratio}. Results are rounded once, as {@code double} arithmetic is.
 *
 * <h2>Kinds</h2>
 * <table>
 *   <caption>Classes, coherent units, meanings; ¤ stands for the currency, which the caller knows</caption>
 *   <tr><th colspan="3" scope="rowgroup">Points on a scale</th></tr>
 *   <tr><td>{@link Temperature}</td><td>K</td><td>thermodynamic temperature, a point</td></tr>
 *   <tr><td>{@link Pressure}</td><td>Pa</td><td>absolute pressure, a point</td></tr>
 *   <tr><th colspan="3" scope="rowgroup">Their differences</th></tr>
 *   <tr><td>{@link TemperatureSpan}</td><td>K</td><td>difference of two temperatures</td></tr>
 *   <tr><td>{@link PressureDifference}</td><td>Pa</td><td>difference of two pressures, gauge reading</td></tr>
 *   <tr><th colspan="3" scope="rowgroup">Amounts</th></tr>
 *   <tr><td>{@link Mass}</td><td>kg</td><td>mass</td></tr>
 *   <tr><td>{@link AmountOfSubstance}</td><td>mol</td><td>amount of substance</td></tr>
 *   <tr><td>{@link Volume}</td><td>m³</td><td>volume</td></tr>
 *   <tr><td>{@link Energy}</td><td>J</td><td>heat, work, energy content, exergy</td></tr>
 *   <tr><td>{@link Entropy}</td><td>J/K</td><td>entropy</td></tr>
 *   <tr><td>{@link Duration}</td><td>s</td><td>length of time; a year counts 8760 h</td></tr>
 *   <tr><td>{@link Length}</td><td>m</td><td>length</td></tr>
 *   <tr><td>{@link Area}</td><td>m²</td><td>area</td></tr>
 *   <tr><th colspan="3" scope="rowgroup">Per mass</th></tr>
 *   <tr><td>{@link SpecificVolume}</td><td>m³/kg</td><td>volume per mass</td></tr>
 *   <tr><td>{@link Density}</td><td>kg/m³</td><td>mass per volume</td></tr>
 *   <tr><td>{@link SpecificEnergy}</td><td>J/kg</td><td>enthalpy, internal energy, exergy, work per mass</td></tr>
 *   <tr><td>{@link SpecificEntropy}</td><td>J/(kg K)</td><td>entropy per mass</td></tr>
 *   <tr><td>{@link SpecificHeatCapacity}</td><td>J/(kg K)</td><td>heat capacity per mass</td></tr>
 *   <tr><th colspan="3" scope="rowgroup">Per amount of substance</th></tr>
 *   <tr><td>{@link MolarMass}</td><td>kg/mol</td><td>mass per amount</td></tr>
 *   <tr><td>{@link MolarVolume}</td><td>m³/mol</td><td>volume per amount</td></tr>
 *   <tr><td>{@link MolarEnergy}</td><td>J/mol</td><td>enthalpy, internal energy, exergy per amount</td></tr>
 *   <tr><td>{@link MolarEntropy}</td><td>J/(mol K)</td><td>entropy per amount</td></tr>
 *   <tr><td>{@link MolarHeatCapacity}</td><td>J/(mol K)</td><td>heat capacity per amount</td></tr>
 *   <tr><th colspan="3" scope="rowgroup">Per time</th></tr>
 *   <tr><td>{@link MassFlow}</td><td>kg/s</td><td>mass flow rate</td></tr>
 *   <tr><td>{@link MolarFlow}</td><td>mol/s</td><td>molar flow rate, normal volume flow rate</td></tr>
 *   <tr><td>{@link VolumeFlow}</td><td>m³/s</td><td>volume flow rate at the state that the fluid has</td></tr>
 *   <tr><td>{@link Power}</td><td>W</td><td>heat rate, shaft and electric power, exergy rate</td></tr>
 *   <tr><td>{@link EntropyRate}</td><td>W/K</td><td>entropy flow rate, entropy generation</td></tr>
 *   <tr><td>{@link HeatCapacityRate}</td><td>W/K</td><td>mass flow times specific heat capacity</td></tr>
 *   <tr><td>{@link Speed}</td><td>m/s</td><td>speed</td></tr>
 *   <tr><td>{@link RotationalFrequency}</td><td>1/s</td><td>revolutions per time, not the angular one</td></tr>
 *   <tr><th colspan="3" scope="rowgroup">Transport</th></tr>
 *   <tr><td>{@link Conductance}</td><td>W/K</td><td>heat rate per span: the UA of an exchanger</td></tr>
 *   <tr><td>{@link HeatFlux}</td><td>W/m²</td><td>heat rate per area</td></tr>
 *   <tr><td>{@link HeatTransferCoefficient}</td><td>W/(m² K)</td><td>heat flux per span</td></tr>
 *   <tr><td>{@link ThermalConductivity}</td><td>W/(m K)</td><td>heat flux per temperature gradient</td></tr>
 *   <tr><td>{@link DynamicViscosity}</td><td>Pa s</td><td>shear stress per velocity gradient</td></tr>
 *   <tr><td>{@link SurfaceTension}</td><td>N/m</td><td>force per length along a surface</td></tr>
 *   <tr><th colspan="3" scope="rowgroup">Plain numbers</th></tr>
 *   <tr><td>{@link Ratio}</td><td>1</td><td>efficiency, vapour fraction, share, coefficient of performance</td></tr>
 *   <tr><th colspan="3" scope="rowgroup">Money and emissions</th></tr>
 *   <tr><td>{@link Money}</td><td>¤</td><td>money in one currency</td></tr>
 *   <tr><td>{@link MoneyRate}</td><td>¤/s</td><td>money per time</td></tr>
 *   <tr><td>{@link EnergyPrice}</td><td>¤/J</td><td>money per energy</td></tr>
 *   <tr><td>{@link MassPrice}</td><td>¤/kg</td><td>money per mass</td></tr>
 *   <tr><td>{@link EmissionFactor}</td><td>kg/J</td><td>mass of carbon dioxide per energy</td></tr>
 * </table>
 * <p>A kind that is missing is made with {@link QuantityKind#linear} and a final subclass of {@link LinearQuantity};
 * it gets units, reader, printer, bridge and stream like the others.
 *
 * <h2>Range</h2>
 * <p>Every value is finite; a temperature is above 0 K, an absolute pressure at least 0 Pa. Anything else is refused
 * with an {@link OutOfRangeException} where it enters, where arithmetic makes it, and where it is read from a stream.
 * Negative zero equals zero.
 *
 * <h2>Text</h2>
 * <p>{@code Pressure.parse("3.5 bar")} reads, {@code format(unit, digits)} and {@code toString()} print, and
 * {@code toExactString()} prints what {@code parse} reads back as an equal value. The locale of the machine plays no
 * part. What can be misread is refused: a missing unit, a decimal comma, 25 C (the coulomb), 4 bar(g) without an
 * atmosphere, Nm³/h without its condition.
 *
 * <h2>Other people's quantities</h2>
 * <p>Any JSR-385 {@code javax.measure.Quantity} comes in through {@code of(...)} with a check of its dimension and
 * scale, and goes out through {@code asQuantity()}. The classes here do not implement that interface, since through it
 * a sum of two temperatures would compile again. Money has no unit there.
 *
 * <h2>Nulls and threads</h2>
 * <p>No parameter and no result is null. All types are immutable and thread-safe, and nothing is registered globally.
 *
 * <h2>Sources</h2>
 * <p>JCGM 200:2012, International vocabulary of metrology, 3rd edition (VIM). ISO 80000-1:2009, Quantities and units,
 * part 1: General. BIPM, The International System of Units (SI Brochure), 9th edition, 2019. NIST Special Publication
 * 811, 2008 edition, for the factors of other units. Section numbers are from memory.
 */
@NullMarked
package lostwork.quantity;

import org.jspecify.annotations.NullMarked;
