/**
 * A steam Rankine plant on a stream of hot gas, and the evaporation pressure at which it gives the most net power.
 *
 * <pre>
 *   gas supply → boiler → draught fan → stack
 *   boiler → turbine → air-cooled condenser → feed pump → boiler
 *   turbine → generator;  motors drive feed pump and draught fan
 * </pre>
 *
 * <p>{@code RecoveryDesign} holds every engineering assumption by name with where it comes from, {@code RecoveryPlant}
 * builds the plant and solves it, {@code PressureSearch} finds the pressure, {@code Recovery} puts them together. What
 * cannot be built is a {@code NoRecoveryException} that says why in words.
 *
 * <p>Steam, pressure equipment and hot gas are dangerous and fall under local codes and licensed practice; what is
 * computed here is an engineering estimate.
 */
@NullMarked
package lostwork.examples.recovery;

import org.jspecify.annotations.NullMarked;
