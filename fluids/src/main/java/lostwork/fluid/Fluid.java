package lostwork.fluid;

import lostwork.quantity.MolarMass;
import lostwork.quantity.Pressure;
import lostwork.quantity.Ratio;
import lostwork.quantity.SpecificEnergy;
import lostwork.quantity.SpecificEntropy;
import lostwork.quantity.SpecificVolume;
import lostwork.quantity.Temperature;

/**
 * The typed face of every fluid: states from any pair of properties, saturation, range and provenance.
 *
 * <pre>{@code
 * FluidState inlet = fluid.state(bar(60), celsius(480));
 * FluidState outlet = fluid.state(bar(0.06), inlet.entropy());
 * SpecificEnergy work = inlet.enthalpy().minus(outlet.enthalpy());
 * }</pre>
 *
 * <p>Because each quantity has a class of its own, the overloads of {@code state} pick the right search, and the order of
 * the arguments is free. A state is right when it returns the two values it was asked for (to 1e-9); where two states do,
 * the method says which one it gives. Outside the range of the model there is no state: the refusal names the value, the
 * range and what sets it. No extrapolation is offered, since no published uncertainty would hold for it.
 *
 * <p>The methods are final, so that a typed call costs what the primitive one costs. Immutable and thread-safe.
 */
public abstract class Fluid {
    private final FluidModel model;

    /**
     * Creates the face of a model.
     *
     * @param model the property model
     */
    protected Fluid(FluidModel model) {
        this.model = model;
    }

    /**
     * {@return the typed face of a property model of one's own}
     *
     * @param model the property model
     */
    public static Fluid of(FluidModel model) {
        return new ModelledFluid(model);
    }

    /** {@return the primitive interface behind this fluid} */
    public final FluidModel model() {
        return model;
    }

    /** {@return the name, such as {@code "water"}} */
    public final String name() {
        return model.name();
    }

    /** {@return the molar mass} */
    public final MolarMass molarMass() {
        return MolarMass.KIND.ofSi(model.molarMass());
    }

    /** {@return the temperatures and pressures in which the model holds} */
    public final FluidRange range() {
        return model.range();
    }

    /** {@return where the model comes from and how good it is} */
    public final Provenance provenance() {
        return model.provenance();
    }

    /** {@return whether the fluid has a liquid and a vapour, so that {@code saturation} answers} */
    public final boolean hasSaturation() {
        return model.saturation() != null;
    }

    /**
     * {@return the stable state at a temperature and a pressure}
     *
     * <p>On the saturation line, within 1e-10 of the saturation pressure, the two do not determine a state; this returns
     * the saturated liquid. In the two-phase region they are no pair: take enthalpy, entropy, volume or the vapour fraction
     * instead of one of them.
     *
     * @param temperature the temperature
     * @param pressure the absolute pressure
     * @throws lostwork.quantity.OutOfRangeException if the state lies outside the range of the model
     */
    public final FluidState state(Temperature temperature, Pressure pressure) {
        final StatePoint point = new StatePoint();
        model.atTemperaturePressure(temperature.si(), pressure.si(), point);
        return new FluidState(this, point);
    }

    /**
     * {@return the stable state at a pressure and a temperature}
     *
     * <p>The same as {@link #state(Temperature, Pressure)}.
     *
     * @param pressure the absolute pressure
     * @param temperature the temperature
     * @throws lostwork.quantity.OutOfRangeException if the state lies outside the range of the model
     */
    public final FluidState state(Pressure pressure, Temperature temperature) {
        return state(temperature, pressure);
    }

    /**
     * {@return the stable state at a pressure and an enthalpy}
     *
     * @param pressure the absolute pressure
     * @param enthalpy the specific enthalpy (not the internal energy)
     * @throws lostwork.quantity.OutOfRangeException if the state lies outside the range of the model
     * @throws FlashException if no state is found within the range
     */
    public final FluidState state(Pressure pressure, SpecificEnergy enthalpy) {
        final StatePoint point = new StatePoint();
        model.atPressureEnthalpy(pressure.si(), enthalpy.si(), point);
        return new FluidState(this, point);
    }

    /**
     * {@return the stable state at an enthalpy and a pressure}
     *
     * <p>The same as {@link #state(Pressure, SpecificEnergy)}.
     *
     * @param enthalpy the specific enthalpy (not the internal energy)
     * @param pressure the absolute pressure
     * @throws lostwork.quantity.OutOfRangeException if the state lies outside the range of the model
     * @throws FlashException if no state is found within the range
     */
    public final FluidState state(SpecificEnergy enthalpy, Pressure pressure) {
        return state(pressure, enthalpy);
    }

    /**
     * {@return the stable state at a pressure and an entropy}
     *
     * @param pressure the absolute pressure
     * @param entropy the specific entropy
     * @throws lostwork.quantity.OutOfRangeException if the state lies outside the range of the model
     * @throws FlashException if no state is found within the range
     */
    public final FluidState state(Pressure pressure, SpecificEntropy entropy) {
        final StatePoint point = new StatePoint();
        model.atPressureEntropy(pressure.si(), entropy.si(), point);
        return new FluidState(this, point);
    }

    /**
     * {@return the stable state at an entropy and a pressure}
     *
     * <p>The same as {@link #state(Pressure, SpecificEntropy)}.
     *
     * @param entropy the specific entropy
     * @param pressure the absolute pressure
     * @throws lostwork.quantity.OutOfRangeException if the state lies outside the range of the model
     * @throws FlashException if no state is found within the range
     */
    public final FluidState state(SpecificEntropy entropy, Pressure pressure) {
        return state(pressure, entropy);
    }

    /**
     * {@return the stable state at a pressure and a volume}
     *
     * <p>Where a liquid contracts on heating (cold water below about 4 °C), two states share a pressure and a volume; this
     * returns the warmer one.
     *
     * @param pressure the absolute pressure
     * @param volume the specific volume
     * @throws lostwork.quantity.OutOfRangeException if the state lies outside the range of the model
     * @throws FlashException if no state is found within the range
     */
    public final FluidState state(Pressure pressure, SpecificVolume volume) {
        final StatePoint point = new StatePoint();
        model.atPressureVolume(pressure.si(), volume.si(), point);
        return new FluidState(this, point);
    }

    /**
     * {@return the stable state at a volume and a pressure}
     *
     * <p>The same as {@link #state(Pressure, SpecificVolume)}.
     *
     * @param volume the specific volume
     * @param pressure the absolute pressure
     * @throws lostwork.quantity.OutOfRangeException if the state lies outside the range of the model
     * @throws FlashException if no state is found within the range
     */
    public final FluidState state(SpecificVolume volume, Pressure pressure) {
        return state(pressure, volume);
    }

    /**
     * {@return the stable state at an enthalpy and an entropy}
     *
     * @param enthalpy the specific enthalpy (not the internal energy)
     * @param entropy the specific entropy
     * @throws lostwork.quantity.OutOfRangeException if the state lies outside the range of the model
     * @throws FlashException if no state is found within the range
     */
    public final FluidState state(SpecificEnergy enthalpy, SpecificEntropy entropy) {
        final StatePoint point = new StatePoint();
        model.atEnthalpyEntropy(enthalpy.si(), entropy.si(), point);
        return new FluidState(this, point);
    }

    /**
     * {@return the stable state at an entropy and an enthalpy}
     *
     * <p>The same as {@link #state(SpecificEnergy, SpecificEntropy)}.
     *
     * @param entropy the specific entropy
     * @param enthalpy the specific enthalpy (not the internal energy)
     * @throws lostwork.quantity.OutOfRangeException if the state lies outside the range of the model
     * @throws FlashException if no state is found within the range
     */
    public final FluidState state(SpecificEntropy entropy, SpecificEnergy enthalpy) {
        return state(enthalpy, entropy);
    }

    /**
     * {@return the stable state at a temperature and an entropy}
     *
     * <p>Where a liquid contracts on heating (cold water below about 4 °C), two states share a temperature and an entropy;
     * this returns the one at the lower pressure.
     *
     * @param temperature the temperature
     * @param entropy the specific entropy
     * @throws lostwork.quantity.OutOfRangeException if the state lies outside the range of the model
     * @throws FlashException if no state is found within the range
     */
    public final FluidState state(Temperature temperature, SpecificEntropy entropy) {
        final StatePoint point = new StatePoint();
        model.atTemperatureEntropy(temperature.si(), entropy.si(), point);
        return new FluidState(this, point);
    }

    /**
     * {@return the stable state at an entropy and a temperature}
     *
     * <p>The same as {@link #state(Temperature, SpecificEntropy)}.
     *
     * @param entropy the specific entropy
     * @param temperature the temperature
     * @throws lostwork.quantity.OutOfRangeException if the state lies outside the range of the model
     * @throws FlashException if no state is found within the range
     */
    public final FluidState state(SpecificEntropy entropy, Temperature temperature) {
        return state(temperature, entropy);
    }

    /**
     * {@return the stable state at a temperature and a volume}
     *
     * @param temperature the temperature
     * @param volume the specific volume
     * @throws lostwork.quantity.OutOfRangeException if the state lies outside the range of the model
     * @throws FlashException if no state is found within the range
     */
    public final FluidState state(Temperature temperature, SpecificVolume volume) {
        final StatePoint point = new StatePoint();
        model.atTemperatureVolume(temperature.si(), volume.si(), point);
        return new FluidState(this, point);
    }

    /**
     * {@return the stable state at a volume and a temperature}
     *
     * <p>The same as {@link #state(Temperature, SpecificVolume)}.
     *
     * @param volume the specific volume
     * @param temperature the temperature
     * @throws lostwork.quantity.OutOfRangeException if the state lies outside the range of the model
     * @throws FlashException if no state is found within the range
     */
    public final FluidState state(SpecificVolume volume, Temperature temperature) {
        return state(temperature, volume);
    }

    /**
     * {@return the stable state at an internal energy and a volume}
     *
     * <p>The pair of a closed rigid vessel: beside a volume the energy is the internal one, beside a pressure or an entropy
     * it is the enthalpy.
     *
     * @param internalEnergy the specific internal energy (not the enthalpy)
     * @param volume the specific volume
     * @throws lostwork.quantity.OutOfRangeException if the state lies outside the range of the model
     * @throws FlashException if no state is found within the range
     */
    public final FluidState state(SpecificEnergy internalEnergy, SpecificVolume volume) {
        final StatePoint point = new StatePoint();
        model.atInternalEnergyVolume(internalEnergy.si(), volume.si(), point);
        return new FluidState(this, point);
    }

    /**
     * {@return the stable state at a volume and an internal energy}
     *
     * <p>The same as {@link #state(SpecificEnergy, SpecificVolume)}.
     *
     * @param volume the specific volume
     * @param internalEnergy the specific internal energy (not the enthalpy)
     * @throws lostwork.quantity.OutOfRangeException if the state lies outside the range of the model
     * @throws FlashException if no state is found within the range
     */
    public final FluidState state(SpecificVolume volume, SpecificEnergy internalEnergy) {
        return state(internalEnergy, volume);
    }

    /**
     * {@return the stable state at an entropy and a volume}
     *
     * <p>The pair of a reversible adiabatic piston stroke.
     *
     * @param entropy the specific entropy
     * @param volume the specific volume
     * @throws lostwork.quantity.OutOfRangeException if the state lies outside the range of the model
     * @throws FlashException if no state is found within the range
     */
    public final FluidState state(SpecificEntropy entropy, SpecificVolume volume) {
        final StatePoint point = new StatePoint();
        model.atEntropyVolume(entropy.si(), volume.si(), point);
        return new FluidState(this, point);
    }

    /**
     * {@return the stable state at a volume and an entropy}
     *
     * <p>The same as {@link #state(SpecificEntropy, SpecificVolume)}.
     *
     * @param volume the specific volume
     * @param entropy the specific entropy
     * @throws lostwork.quantity.OutOfRangeException if the state lies outside the range of the model
     * @throws FlashException if no state is found within the range
     */
    public final FluidState state(SpecificVolume volume, SpecificEntropy entropy) {
        return state(entropy, volume);
    }

    /**
     * {@return the state of liquid and vapour in equilibrium at a temperature and a vapour fraction}
     *
     * <p>At 0 and at 1 it is the saturated liquid or vapour, in one phase.
     *
     * @param temperature the temperature, on the saturation line
     * @param vapourFraction mass of vapour per total mass, 0 to 1
     * @throws lostwork.quantity.OutOfRangeException if there is no saturation there, or the fraction is outside 0 to 1
     * @throws UndefinedPropertyException if the fluid has no saturation
     */
    public final FluidState state(Temperature temperature, Ratio vapourFraction) {
        final StatePoint point = new StatePoint();
        if (vapourFraction.si() == 0) {
            model.saturatedAtTemperature(temperature.si(), PhaseSide.LIQUID, point);
        } else if (vapourFraction.si() == 1) {
            model.saturatedAtTemperature(temperature.si(), PhaseSide.VAPOUR, point);
        } else {
            model.atTemperatureVapourFraction(temperature.si(), vapourFraction.si(), point);
        }
        return new FluidState(this, point);
    }

    /**
     * {@return the state of liquid and vapour in equilibrium at a vapour fraction and a temperature}
     *
     * <p>The same as {@link #state(Temperature, Ratio)}.
     *
     * @param vapourFraction mass of vapour per total mass, 0 to 1
     * @param temperature the temperature, on the saturation line
     * @throws lostwork.quantity.OutOfRangeException if there is no saturation there, or the fraction is outside 0 to 1
     * @throws UndefinedPropertyException if the fluid has no saturation
     */
    public final FluidState state(Ratio vapourFraction, Temperature temperature) {
        return state(temperature, vapourFraction);
    }

    /**
     * {@return the state of liquid and vapour in equilibrium at a pressure and a vapour fraction}
     *
     * <p>At 0 and at 1 it is the saturated liquid or vapour, in one phase.
     *
     * @param pressure the absolute pressure, on the saturation line
     * @param vapourFraction mass of vapour per total mass, 0 to 1
     * @throws lostwork.quantity.OutOfRangeException if there is no saturation there, or the fraction is outside 0 to 1
     * @throws UndefinedPropertyException if the fluid has no saturation
     */
    public final FluidState state(Pressure pressure, Ratio vapourFraction) {
        final StatePoint point = new StatePoint();
        if (vapourFraction.si() == 0) {
            model.saturatedAtPressure(pressure.si(), PhaseSide.LIQUID, point);
        } else if (vapourFraction.si() == 1) {
            model.saturatedAtPressure(pressure.si(), PhaseSide.VAPOUR, point);
        } else {
            model.atPressureVapourFraction(pressure.si(), vapourFraction.si(), point);
        }
        return new FluidState(this, point);
    }

    /**
     * {@return the state of liquid and vapour in equilibrium at a vapour fraction and a pressure}
     *
     * <p>The same as {@link #state(Pressure, Ratio)}.
     *
     * @param vapourFraction mass of vapour per total mass, 0 to 1
     * @param pressure the absolute pressure, on the saturation line
     * @throws lostwork.quantity.OutOfRangeException if there is no saturation there, or the fraction is outside 0 to 1
     * @throws UndefinedPropertyException if the fluid has no saturation
     */
    public final FluidState state(Ratio vapourFraction, Pressure pressure) {
        return state(pressure, vapourFraction);
    }

    /**
     * {@return the saturated liquid and the saturated vapour at a temperature}
     *
     * @param temperature the temperature, from the lowest of the saturation line to the critical one
     * @throws lostwork.quantity.OutOfRangeException if there is no saturation at this temperature
     * @throws UndefinedPropertyException if the fluid has no saturation
     */
    public final Saturation saturation(Temperature temperature) {
        final StatePoint liquid = new StatePoint();
        final StatePoint vapour = new StatePoint();
        model.saturatedAtTemperature(temperature.si(), PhaseSide.LIQUID, liquid);
        model.saturatedAtTemperature(temperature.si(), PhaseSide.VAPOUR, vapour);
        return new Saturation(new FluidState(this, liquid), new FluidState(this, vapour));
    }

    /**
     * {@return the saturated liquid and the saturated vapour at a pressure}
     *
     * @param pressure the absolute pressure, from the lowest saturation pressure to the critical one
     * @throws lostwork.quantity.OutOfRangeException if there is no saturation at this pressure
     * @throws UndefinedPropertyException if the fluid has no saturation
     */
    public final Saturation saturation(Pressure pressure) {
        final StatePoint liquid = new StatePoint();
        final StatePoint vapour = new StatePoint();
        model.saturatedAtPressure(pressure.si(), PhaseSide.LIQUID, liquid);
        model.saturatedAtPressure(pressure.si(), PhaseSide.VAPOUR, vapour);
        return new Saturation(new FluidState(this, liquid), new FluidState(this, vapour));
    }

    /**
     * {@return the critical temperature, above which liquid and vapour are one}
     *
     * @throws UndefinedPropertyException if the fluid has no saturation
     */
    public final Temperature criticalTemperature() {
        return Temperature.kelvin(Flash.requireSaturation(model).criticalTemperature());
    }

    /**
     * {@return the critical pressure}
     *
     * @throws UndefinedPropertyException if the fluid has no saturation
     */
    public final Pressure criticalPressure() {
        return Pressure.pascal(Flash.requireSaturation(model).criticalPressure());
    }

    /** {@return the name} */
    @Override
    public String toString() {
        return model.name();
    }

    /** A fluid that is nothing but its model. */
    private static final class ModelledFluid extends Fluid {
        ModelledFluid(FluidModel model) {
            super(model);
        }
    }
}
