package lostwork.exergy;

import lostwork.quantity.Pressure;
import lostwork.quantity.SpecificEnergy;
import lostwork.quantity.SpecificEntropy;
import lostwork.quantity.SpecificVolume;
import lostwork.quantity.Temperature;

/** A perfect gas, for the laws: p v = R T with a constant heat capacity. Datum 300 K, 1 bar. */
record PerfectGasState(double kelvin, double pascal, double gasConstant, double heatCapacity)
        implements ThermodynamicState {
    static PerfectGasState air(double kelvin, double pascal) {
        return new PerfectGasState(kelvin, pascal, 287, 1005);
    }

    @Override
    public Temperature temperature() {
        return Temperature.kelvin(kelvin);
    }

    @Override
    public Pressure pressure() {
        return Pressure.pascal(pascal);
    }

    @Override
    public SpecificVolume volume() {
        return SpecificVolume.cubicMetresPerKilogram(gasConstant * kelvin / pascal);
    }

    @Override
    public SpecificEnergy internalEnergy() {
        return SpecificEnergy.joulesPerKilogram(heatCapacity * (kelvin - 300) - gasConstant * kelvin);
    }

    @Override
    public SpecificEnergy enthalpy() {
        return SpecificEnergy.joulesPerKilogram(heatCapacity * (kelvin - 300));
    }

    @Override
    public SpecificEntropy entropy() {
        return SpecificEntropy.joulesPerKilogramKelvin(
                heatCapacity * Math.log(kelvin / 300) - gasConstant * Math.log(pascal / 1e5));
    }

    @Override
    public PerfectGasState broughtTo(Temperature temperature, Pressure pressure) {
        return new PerfectGasState(temperature.si(), pressure.si(), gasConstant, heatCapacity);
    }
}
