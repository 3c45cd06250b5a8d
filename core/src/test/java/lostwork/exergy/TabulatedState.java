package lostwork.exergy;

import lostwork.quantity.Pressure;
import lostwork.quantity.SpecificEnergy;
import lostwork.quantity.SpecificEntropy;
import lostwork.quantity.SpecificVolume;
import lostwork.quantity.Temperature;

/** A state read from a printed table, with the dead state that the source uses; kJ/kg and kJ/(kg K) as printed. */
record TabulatedState(double printedEnthalpy, double printedEntropy, double kelvin, double bar, TabulatedDead dead)
        implements ThermodynamicState {
    record TabulatedDead(double enthalpy, double entropy) {}

    @Override
    public Temperature temperature() {
        return Temperature.kelvin(kelvin);
    }

    @Override
    public Pressure pressure() {
        return Pressure.bar(bar);
    }

    @Override
    public SpecificVolume volume() {
        throw new UnsupportedOperationException("the source prints no volume");
    }

    @Override
    public SpecificEnergy internalEnergy() {
        throw new UnsupportedOperationException("the source prints no internal energy");
    }

    @Override
    public SpecificEnergy enthalpy() {
        return SpecificEnergy.kilojoulesPerKilogram(printedEnthalpy);
    }

    @Override
    public SpecificEntropy entropy() {
        return SpecificEntropy.kilojoulesPerKilogramKelvin(printedEntropy);
    }

    @Override
    public TabulatedState broughtTo(Temperature temperature, Pressure pressure) {
        return new TabulatedState(dead.enthalpy, dead.entropy, temperature.si(), pressure.inBar(), dead);
    }
}
