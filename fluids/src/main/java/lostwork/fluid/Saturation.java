package lostwork.fluid;

import lostwork.quantity.Pressure;
import lostwork.quantity.SpecificEnergy;
import lostwork.quantity.SpecificEntropy;
import lostwork.quantity.SpecificVolume;
import lostwork.quantity.Temperature;

/** Saturated liquid and saturated vapour in equilibrium with each other. Immutable and thread-safe. */
public final class Saturation {
    private final FluidState liquid;
    private final FluidState vapour;

    Saturation(FluidState liquid, FluidState vapour) {
        this.liquid = liquid;
        this.vapour = vapour;
    }

    /** {@return the saturated liquid, in one phase} */
    public FluidState liquid() {
        return liquid;
    }

    /** {@return the saturated vapour, in one phase} */
    public FluidState vapour() {
        return vapour;
    }

    /** {@return the saturation temperature} */
    public Temperature temperature() {
        return liquid.temperature();
    }

    /** {@return the saturation pressure} */
    public Pressure pressure() {
        return liquid.pressure();
    }

    /** {@return the enthalpy of evaporation h″ − h′} */
    public SpecificEnergy enthalpyOfEvaporation() {
        return vapour.enthalpy().minus(liquid.enthalpy());
    }

    /** {@return the entropy of evaporation s″ − s′} */
    public SpecificEntropy entropyOfEvaporation() {
        return vapour.entropy().minus(liquid.entropy());
    }

    /** {@return the volume of evaporation v″ − v′} */
    public SpecificVolume volumeOfEvaporation() {
        return vapour.volume().minus(liquid.volume());
    }

    /** {@return liquid, vapour and their difference side by side, in aligned columns with units} */
    @Override
    public String toString() {
        final StateDifference difference = vapour.minus(liquid);
        return PropertyTable.titled(liquid.fluid().name() + ", saturated at " + temperature() + " and " + pressure())
                .columns("liquid", "vapour", "difference")
                .row("v", liquid.volume(), vapour.volume(), difference.volume())
                .row("u", liquid.internalEnergy(), vapour.internalEnergy(), difference.internalEnergy())
                .row("h", liquid.enthalpy(), vapour.enthalpy(), difference.enthalpy())
                .row("s", liquid.entropy(), vapour.entropy(), difference.entropy())
                .print();
    }
}
