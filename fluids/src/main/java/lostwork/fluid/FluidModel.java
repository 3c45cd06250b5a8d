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
     * {@return whether the enthalpy depends on pressure as well as on temperature}
     *
     * <p>False for ideal gases: a plant then computes a temperature from an enthalpy before it knows the pressure.
     */
    default boolean enthalpyDependsOnPressure() {
        return true;
    }

    /**
     * {@return what is added to an enthalpy of this model to count it from the elements at 298.15 K and 1 bar, in J/kg;
     * NaN for a model without formation data}
     */
    default double enthalpyFromElements() {
        return Double.NaN;
    }

    /**
     * {@return what is added to an entropy of this model to make it the absolute entropy of the third law, in J/(kg K);
     * NaN for a model without such data}
     */
    default double entropyFromAbsoluteZero() {
        return Double.NaN;
    }

    /**
     * {@return the lowest temperature in K at which the model holds at a pressure}
     *
     * <p>Overridden where the range is no rectangle, as along a melting line.
     *
     * @param pressure absolute pressure in Pa, within the range
     */
    default double lowestTemperatureAt(double pressure) {
        return range().lowestTemperature();
    }

    /**
     * {@return the highest temperature in K at which the model holds at a pressure}
     *
     * <p>Overridden where the range is no rectangle.
     *
     * @param pressure absolute pressure in Pa, within the range
     */
    default double highestTemperatureAt(double pressure) {
        return range().highestTemperature();
    }

    /**
     * {@return the lowest absolute pressure in Pa at which the model holds at a temperature}
     *
     * <p>Overridden where the range is no rectangle.
     *
     * @param temperature temperature in K, within the range
     */
    default double lowestPressureAt(double temperature) {
        return range().lowestPressure();
    }

    /**
     * {@return the highest absolute pressure in Pa at which the model holds at a temperature}
     *
     * <p>Overridden where the range is no rectangle.
     *
     * @param temperature temperature in K, within the range
     */
    default double highestPressureAt(double temperature) {
        return range().highestPressure();
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
     * <p>On the saturation line (within 1e-10 of the saturation pressure) a temperature and a pressure do not determine a
     * state; the saturated liquid is returned there. Inside the dome they are no pair at all: use
     * {@link #atPressureEnthalpy} or {@link #atTemperatureVapourFraction}.
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
     * @throws FlashException if no state is found within the range
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
     * @throws FlashException if no state is found within the range
     */
    default void atPressureEntropy(double pressure, double entropy, StatePoint out) {
        Flash.pressureEntropy(this, pressure, entropy, out);
    }

    /**
     * Finds the stable state at a pressure and a volume.
     *
     * <p>Where the volume of the liquid has a minimum over temperature (cold water near 4 °C), two states share a pressure
     * and a volume; the warmer one is returned.
     *
     * @param pressure absolute pressure in Pa
     * @param volume specific volume in m³/kg
     * @param out the point to fill
     * @throws lostwork.quantity.OutOfRangeException if the state lies outside the range
     * @throws FlashException if no state is found within the range
     */
    default void atPressureVolume(double pressure, double volume, StatePoint out) {
        Flash.pressureVolume(this, pressure, volume, out);
    }

    /**
     * Finds the stable state at a pressure and a vapour fraction.
     *
     * <p>The result is a two-phase point, also at 0 and at 1.
     *
     * @param pressure absolute pressure in Pa, from the lowest saturation pressure to the critical one
     * @param vapourFraction mass of vapour per total mass, 0 to 1
     * @param out the point to fill
     * @throws lostwork.quantity.OutOfRangeException if the state lies outside the range
     * @throws FlashException if no state is found within the range
     * @throws UndefinedPropertyException if the fluid has no saturation
     */
    default void atPressureVapourFraction(double pressure, double vapourFraction, StatePoint out) {
        Flash.pressureVapourFraction(this, pressure, vapourFraction, out);
    }

    /**
     * Finds the stable state at a temperature and a vapour fraction.
     *
     * <p>The result is a two-phase point, also at 0 and at 1.
     *
     * @param temperature temperature in K, from the lowest of the saturation line to the critical one
     * @param vapourFraction mass of vapour per total mass, 0 to 1
     * @param out the point to fill
     * @throws lostwork.quantity.OutOfRangeException if the state lies outside the range
     * @throws FlashException if no state is found within the range
     * @throws UndefinedPropertyException if the fluid has no saturation
     */
    default void atTemperatureVapourFraction(double temperature, double vapourFraction, StatePoint out) {
        Flash.temperatureVapourFraction(this, temperature, vapourFraction, out);
    }

    /**
     * Finds the stable state at a temperature and an entropy.
     *
     * <p>Where the liquid contracts on heating (cold water below 4 °C), its entropy first rises with pressure and two states
     * share a temperature and an entropy; the one at the lower pressure is returned.
     *
     * @param temperature temperature in K
     * @param entropy specific entropy in J/(kg K)
     * @param out the point to fill
     * @throws lostwork.quantity.OutOfRangeException if the state lies outside the range
     * @throws FlashException if no state is found within the range
     */
    default void atTemperatureEntropy(double temperature, double entropy, StatePoint out) {
        Flash.temperatureEntropy(this, temperature, entropy, out);
    }

    /**
     * Finds the stable state at a temperature and a volume.
     *
     * @param temperature temperature in K
     * @param volume specific volume in m³/kg
     * @param out the point to fill
     * @throws lostwork.quantity.OutOfRangeException if the state lies outside the range
     * @throws FlashException if no state is found within the range
     */
    default void atTemperatureVolume(double temperature, double volume, StatePoint out) {
        Flash.temperatureVolume(this, temperature, volume, out);
    }

    /**
     * Finds the stable state at an enthalpy and an entropy.
     *
     * @param enthalpy specific enthalpy in J/kg
     * @param entropy specific entropy in J/(kg K)
     * @param out the point to fill
     * @throws lostwork.quantity.OutOfRangeException if the state lies outside the range
     * @throws FlashException if no state is found within the range
     */
    default void atEnthalpyEntropy(double enthalpy, double entropy, StatePoint out) {
        Flash.enthalpyEntropy(this, enthalpy, entropy, out);
    }

    /**
     * Finds the stable state at an internal energy and a volume.
     *
     * <p>The pair of a closed rigid vessel.
     *
     * @param internalEnergy specific internal energy in J/kg
     * @param volume specific volume in m³/kg
     * @param out the point to fill
     * @throws lostwork.quantity.OutOfRangeException if the state lies outside the range
     * @throws FlashException if no state is found within the range
     */
    default void atInternalEnergyVolume(double internalEnergy, double volume, StatePoint out) {
        Flash.internalEnergyVolume(this, internalEnergy, volume, out);
    }

    /**
     * Finds the stable state at an entropy and a volume.
     *
     * <p>The pair of a reversible adiabatic piston stroke.
     *
     * @param entropy specific entropy in J/(kg K)
     * @param volume specific volume in m³/kg
     * @param out the point to fill
     * @throws lostwork.quantity.OutOfRangeException if the state lies outside the range
     * @throws FlashException if no state is found within the range
     */
    default void atEntropyVolume(double entropy, double volume, StatePoint out) {
        Flash.entropyVolume(this, entropy, volume, out);
    }

    /**
     * Finds the saturated liquid or vapour at a temperature, as a single-phase point with vapour fraction 0 or 1.
     *
     * @param temperature temperature in K, from the lowest of the saturation line to the critical one
     * @param side liquid or vapour
     * @param out the point to fill; its derivatives are those of the single phase
     * @throws lostwork.quantity.OutOfRangeException if there is no saturation at this temperature
     * @throws UndefinedPropertyException if the fluid has no saturation
     */
    default void saturatedAtTemperature(double temperature, PhaseSide side, StatePoint out) {
        Flash.saturatedAtTemperature(this, temperature, side, out);
    }

    /**
     * Finds the saturated liquid or vapour at a pressure, as a single-phase point with vapour fraction 0 or 1.
     *
     * @param pressure absolute pressure in Pa, from the lowest saturation pressure to the critical one
     * @param side liquid or vapour
     * @param out the point to fill; its derivatives are those of the single phase
     * @throws lostwork.quantity.OutOfRangeException if there is no saturation at this pressure
     * @throws UndefinedPropertyException if the fluid has no saturation
     */
    default void saturatedAtPressure(double pressure, PhaseSide side, StatePoint out) {
        Flash.saturatedAtPressure(this, pressure, side, out);
    }
}
