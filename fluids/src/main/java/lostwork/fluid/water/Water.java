package lostwork.fluid.water;

import lostwork.fluid.Fluid;
import lostwork.fluid.FluidModel;

/**
 * Water and steam: the way in.
 *
 * <pre>{@code
 * Water water = Water.industrial();
 * FluidState live = water.state(celsius(540), bar(120));
 * FluidState exhaust = water.state(bar(0.05), live.entropy());
 * exhaust.vapourFraction();
 * water.saturation(bar(10)).enthalpyOfEvaporation();
 * }</pre>
 *
 * <p>{@link #industrial()} is the formulation of power plants and of everything that must be fast. The package page tells
 * range, accuracy, steps between regions and sources; {@code water.provenance()} prints them.
 *
 * <p>Results are engineering estimates. Pressure equipment and steam fall under local codes and licensed practice.
 *
 * <p>Immutable and thread-safe.
 */
public final class Water extends Fluid {
    private Water(FluidModel model) {
        super(model);
    }

    /**
     * {@return water by the IAPWS Industrial Formulation 1997 (IAPWS-IF97)}
     *
     * <p>273.15 K to 1073.15 K up to 100 MPa, and up to 2273.15 K for pressures up to 50 MPa. Internal energy and entropy
     * are zero in the saturated liquid at the triple point (273.16 K).
     */
    public static Water industrial() {
        return Industrial.WATER;
    }

    /** Holds the one instance, so that its tables are read on first use. */
    private static final class Industrial {
        static final Water WATER = new Water(new If97Model());
    }
}
