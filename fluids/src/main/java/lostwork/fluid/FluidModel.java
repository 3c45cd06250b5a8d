package lostwork.fluid;

import org.jspecify.annotations.Nullable;

/**
 * The primitive interface behind every {@link Fluid}: doubles in coherent SI units (K, Pa, m³/kg, J/kg, J/(kg K)).
 *
 * <p>A new fluid writes {@link #name}, {@link #molarMass}, {@link #range}, {@link #provenance} and
 * {@link #evaluate}, and {@link #saturation} when it has a liquid and a vapour. All state pairs, saturation states,
 * exergies, plants and diagrams follow. A model that has faster inverse equations overrides the flashes.
 *
 * <p>Implementations are immutable and thread-safe, and their evaluations allocate nothing.
 */
public interface FluidModel {
    /** {@return the name of the fluid, such as {@code "water"}} */
    String name();

    /** {@return the molar mass in kg/mol} */
    double molarMass();

    /** {@return the temperatures and pressures in which the model holds} */
    FluidRange range();

    /** {@return where the model comes from and how good it is} */
    Provenance provenance();

    /** {@return the saturation of the fluid; null for a fluid that knows one phase only} */
    default @Nullable SaturationModel saturation() {
        return null;
    }

    /**
     * Evaluates the single-phase properties on one side of the saturation line.
     *
     * <p>Called with temperatures and pressures within the range; near the saturation line the side tells which of the
     * two branches is meant, far from it the model ignores the side.
     *
     * @param temperature temperature in K
     * @param pressure absolute pressure in Pa
     * @param side the side of the saturation line; {@link PhaseSide#VAPOUR} for a fluid without saturation
     * @param out the point to fill, by {@link StatePoint#setSinglePhase}
     */
    void evaluate(double temperature, double pressure, PhaseSide side, StatePoint out);

    /**
     * Finds the stable state at a temperature and a pressure.
     *
     * @param temperature temperature in K
     * @param pressure absolute pressure in Pa
     * @param out the point to fill
     * @throws lostwork.quantity.OutOfRangeException if the state lies outside the range
     */
    default void atTemperaturePressure(double temperature, double pressure, StatePoint out) {
        Flash.temperaturePressure(this, temperature, pressure, out);
    }

    /**
     * Finds the stable state at a pressure and an enthalpy.
     *
     * @param pressure absolute pressure in Pa
     * @param enthalpy specific enthalpy in J/kg
     * @param out the point to fill
     * @throws lostwork.quantity.OutOfRangeException if the state lies outside the range
     */
    default void atPressureEnthalpy(double pressure, double enthalpy, StatePoint out) {
        Flash.pressureEnthalpy(this, pressure, enthalpy, out);
    }

    /**
     * Finds the stable state at a pressure and an entropy.
     *
     * @param pressure absolute pressure in Pa
     * @param entropy specific entropy in J/(kg K)
     * @param out the point to fill
     * @throws lostwork.quantity.OutOfRangeException if the state lies outside the range
     */
    default void atPressureEntropy(double pressure, double entropy, StatePoint out) {
        Flash.pressureEntropy(this, pressure, entropy, out);
    }
}
