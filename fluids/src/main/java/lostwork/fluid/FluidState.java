package lostwork.fluid;

import lostwork.exergy.ThermodynamicState;
import lostwork.quantity.Pressure;
import lostwork.quantity.SpecificEnergy;
import lostwork.quantity.SpecificEntropy;
import lostwork.quantity.SpecificVolume;
import lostwork.quantity.Temperature;

/** An equilibrium state of a fluid: immutable, complete, thread-safe. */
public final class FluidState implements ThermodynamicState {
    private final Fluid fluid;
    private final double temperature;
    private final double pressure;
    private final double volume;
    private final double enthalpy;
    private final double entropy;

    FluidState(Fluid fluid, StatePoint point) {
        this.fluid = fluid;
        temperature = point.temperature;
        pressure = point.pressure;
        volume = point.volume;
        enthalpy = point.enthalpy;
        entropy = point.entropy;
    }

    /** {@return the fluid} */
    public Fluid fluid() {
        return fluid;
    }

    @Override
    public Temperature temperature() {
        return Temperature.kelvin(temperature);
    }

    @Override
    public Pressure pressure() {
        return Pressure.pascal(pressure);
    }

    @Override
    public SpecificVolume volume() {
        return SpecificVolume.cubicMetresPerKilogram(volume);
    }

    @Override
    public SpecificEnergy internalEnergy() {
        return SpecificEnergy.joulesPerKilogram(enthalpy - pressure * volume);
    }

    @Override
    public SpecificEnergy enthalpy() {
        return SpecificEnergy.joulesPerKilogram(enthalpy);
    }

    @Override
    public SpecificEntropy entropy() {
        return SpecificEntropy.joulesPerKilogramKelvin(entropy);
    }

    @Override
    public FluidState broughtTo(Temperature temperature, Pressure pressure) {
        return fluid.state(temperature, pressure);
    }
}
