package lostwork.fluid;

import lostwork.quantity.PressureDifference;
import lostwork.quantity.SpecificEnergy;
import lostwork.quantity.SpecificEntropy;
import lostwork.quantity.SpecificVolume;
import lostwork.quantity.TemperatureSpan;

/**
 * What one state has more than another of the same fluid.
 *
 * <p>The zero points of energy and entropy cancel, so that these figures, unlike those of a state, have a meaning of their
 * own. Immutable and thread-safe.
 */
public final class StateDifference {
    private final FluidState to;
    private final FluidState from;

    StateDifference(FluidState to, FluidState from) {
        this.to = to;
        this.from = from;
    }

    /** {@return the difference of the temperatures} */
    public TemperatureSpan temperature() {
        return to.temperature().minus(from.temperature());
    }

    /** {@return the difference of the pressures} */
    public PressureDifference pressure() {
        return to.pressure().minus(from.pressure());
    }

    /** {@return the difference of the specific volumes} */
    public SpecificVolume volume() {
        return to.volume().minus(from.volume());
    }

    /** {@return the difference of the specific internal energies: heat of a rigid closed vessel} */
    public SpecificEnergy internalEnergy() {
        return to.internalEnergy().minus(from.internalEnergy());
    }

    /** {@return the difference of the specific enthalpies: heat of an isobaric flow, work of an adiabatic one} */
    public SpecificEnergy enthalpy() {
        return to.enthalpy().minus(from.enthalpy());
    }

    /** {@return the difference of the specific entropies} */
    public SpecificEntropy entropy() {
        return to.entropy().minus(from.entropy());
    }

    /** {@return the differences in aligned columns with units} */
    @Override
    public String toString() {
        return PropertyTable.titled(to.fluid().name() + ", difference of two states")
                .row("ΔT", temperature())
                .row("Δp", pressure())
                .row("Δv", volume())
                .row("Δu", internalEnergy())
                .row("Δh", enthalpy())
                .row("Δs", entropy())
                .print();
    }
}
