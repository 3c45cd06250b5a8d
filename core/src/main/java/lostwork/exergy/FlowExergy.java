package lostwork.exergy;

import lostwork.quantity.SpecificEnergy;

/**
 * The physical exergy of a flow in two parts, on the path over the state at ambient temperature and stream pressure.
 *
 * <p>Thermal: from the stream's temperature to the ambient temperature at the stream's pressure; never negative.
 * Mechanical: from there to the ambient pressure at the ambient temperature; negative below the ambient pressure.
 *
 * <p>Source: A. Bejan, G. Tsatsaronis, M. Moran, Thermal Design and Optimization, Wiley 1996, chapter 3. Immutable and
 * thread-safe.
 */
public final class FlowExergy {
    private final SpecificEnergy thermal;
    private final SpecificEnergy mechanical;

    FlowExergy(SpecificEnergy thermal, SpecificEnergy mechanical) {
        this.thermal = thermal;
        this.mechanical = mechanical;
    }

    /** {@return the part due to the temperature, never negative up to rounding} */
    public SpecificEnergy thermal() {
        return thermal;
    }

    /** {@return the part due to the pressure, negative below ambient pressure} */
    public SpecificEnergy mechanical() {
        return mechanical;
    }

    /** {@return the sum of both parts} */
    public SpecificEnergy total() {
        return thermal.plus(mechanical);
    }

    @Override
    public String toString() {
        return "flow exergy " + total() + " (thermal " + thermal + ", mechanical " + mechanical + ")";
    }
}
