package lostwork.fluid.water;

import lostwork.fluid.Phase;
import lostwork.fluid.StatePoint;
import lostwork.quantity.OutOfRangeException;

/**
 * States at an enthalpy and an entropy, by Newton's method along the isentrope: (∂h/∂p)<sub>s</sub> = v in all regions.
 *
 * <p>The first guess of the pressure comes from the backward equations p(h,s) of SR2-01(2014) and SR4-04(2014), chosen by
 * the equations of the region borders in SR4-04(2014); in wet steam from T(h,s) of the same release.
 */
final class If97Isentrope {
    private static final int STEPS = 12;
    /** Where the steps end: about what the rounding of p v in the enthalpy leaves. */
    private static final double ACCEPTED = 1e-13;
    /** Enthalpies near 0 are compared with this one, in J/kg. */
    private static final double SCALE = 1e5;

    /** Entropies at corners of the regions, SR4-04(2014), in J/(kg K): region 1 at 623.15 K and 100 MPa. */
    private static final double REGION_1_HOTTEST_DENSEST = 3397.782955;
    /** Saturated liquid at 623.15 K. */
    private static final double LIQUID_623 = 3778.281340;
    /** The least entropy on the border between regions 2 and 3. */
    private static final double BORDER_23_LEAST = 5048.096828;
    /** The largest entropy on the border between regions 2 and 3. */
    private static final double BORDER_23_LARGEST = 5260.578707;
    /** Saturated vapour at 623.15 K; from here on T(h,s) of wet steam holds. */
    private static final double VAPOUR_623 = 5210.887825;
    /** The isentrope between subregions 2b and 2c. */
    private static final double SUBREGIONS_2BC = 5850;
    /** Vapour at 4 MPa on the border of subregions 2a and 2b ends here. */
    private static final double SUBREGION_2A_FROM = 7852.340400;
    /** Saturated vapour at 273.15 K. */
    private static final double VAPOUR_273 = 9155.759395;
    /** Enthalpy above which steam is hotter than 1073.15 K whatever its pressure, in J/kg. */
    private static final double HOT = 4.16e6;

    private final If97Equations equations;
    private final If97PressureFlash byEntropy;
    private final BackwardEquation p1 = BackwardEquation.read("sr2-01-table-02-p1-hs");
    private final BackwardEquation p2a = BackwardEquation.read("sr2-01-table-06-p2a-hs");
    private final BackwardEquation p2b = BackwardEquation.read("sr2-01-table-07-p2b-hs");
    private final BackwardEquation p2c = BackwardEquation.read("sr2-01-table-08-p2c-hs");
    private final BackwardEquation p3a = BackwardEquation.read("sr4-04-table-03-p3a-hs");
    private final BackwardEquation p3b = BackwardEquation.read("sr4-04-table-04-p3b-hs");
    private final BackwardEquation liquid1 = BackwardEquation.read("sr4-04-table-09-h1sat-s");
    private final BackwardEquation liquid3a = BackwardEquation.read("sr4-04-table-10-h3asat-s");
    private final BackwardEquation vapour2ab = BackwardEquation.read("sr4-04-table-16-h2absat-s");
    private final BackwardEquation vapour2c3b = BackwardEquation.read("sr4-04-table-17-h2c3bsat-s");
    private final BackwardEquation border13 = BackwardEquation.read("sr4-04-table-23-hb13-s");
    private final BackwardEquation border23 = BackwardEquation.read("sr4-04-table-25-tb23-hs");
    private final BackwardEquation wetTemperature = BackwardEquation.read("sr4-04-table-28-tsat-hs");
    private final If97Starts starts;

    If97Isentrope(If97Equations equations, If97PressureFlash byEntropy) {
        this.equations = equations;
        this.byEntropy = byEntropy;
        starts = byEntropy.starts;
    }

    /** {@return whether a state was found and filled in} */
    boolean find(double enthalpy, double entropy, Workspace w, StatePoint out) {
        double pressure = start(enthalpy, entropy, w);
        double best = Double.POSITIVE_INFINITY;
        if (inRegion3(pressure, enthalpy, entropy, w, out)) {
            return true;
        }
        try {
            for (int k = 0; k < STEPS; k++) {
                if (!(pressure >= If97Equations.LOWEST_PA && pressure <= If97Equations.HIGHEST_PA)) {
                    return false;
                }
                byEntropy.find(pressure, entropy, w, out);
                final double miss = enthalpy - out.enthalpy;
                final double distance = Math.abs(miss) / Math.max(Math.abs(enthalpy), SCALE);
                if (distance <= ACCEPTED) {
                    out.enthalpy = enthalpy;
                    return true;
                }
                final double volume = out.volume;
                final boolean gas = out.phase != Phase.LIQUID && out.phase != Phase.TWO_PHASE;
                // Quadratic convergence or none: a step between regions sends it to and fro.
                if (k > 6 && distance >= best) {
                    return false;
                }
                best = Math.min(best, distance);
                pressure = next(pressure, miss, volume, gas);
            }
        } catch (OutOfRangeException e) {
            return false;
        }
        return false;
    }

    /** In region 3 density and temperature are searched together, which is regular at the critical point too. */
    private boolean inRegion3(double pressure, double enthalpy, double entropy, Workspace w, StatePoint out) {
        if (!(pressure >= equations.region3FromPressure
                && entropy > REGION_1_HOTTEST_DENSEST
                && entropy < BORDER_23_LARGEST)) {
            return false;
        }
        final boolean dense = entropy <= If97Starts.CRITICAL_ENTROPY;
        final double density = 1 / starts.region3VolumeEntropy(pressure, entropy, dense, w);
        final double temperature = starts.region3TemperatureEntropy(pressure, entropy, dense, w);
        return equations.region3.atEnthalpyEntropy(enthalpy, entropy, density, temperature, w, out)
                && equations.acceptRegion3(w, out);
    }

    private static double next(double pressure, double miss, double volume, boolean gas) {
        final double linear = miss / (pressure * volume);
        // Along an isentrope of a gas ln p is nearly proportional to ln T, and h to T; for small steps both agree.
        return gas && Math.abs(linear) > 1e-3
                ? pressure * Math.exp(Math.max(-3, Math.min(3, linear)))
                : pressure + miss / volume;
    }

    private double start(double enthalpy, double entropy, Workspace w) {
        final double h = enthalpy;
        final double s = entropy;
        if (s <= LIQUID_623) {
            if (h < liquid1.value(s, s, w)) {
                return wetFromLiquid(h, s, w);
            }
            return s < REGION_1_HOTTEST_DENSEST || h <= border13.value(s, s, w)
                    ? Math.max(p1.value(h, s, w), If97Equations.LOWEST_PA)
                    : p3a.value(h, s, w);
        }
        if (s <= If97Starts.CRITICAL_ENTROPY) {
            return h >= liquid3a.value(s, s, w) ? p3a.value(h, s, w) : wetFromLiquid(h, s, w);
        }
        if (s < SUBREGIONS_2BC) {
            if (h < vapour2c3b.value(s, s, w)) {
                return s >= VAPOUR_623 ? wet(h, s, w) : wetFromLiquid(h, s, w);
            }
            if (s < BORDER_23_LEAST) {
                return p3b.value(h, s, w);
            }
            final double p = p2c.value(h, s, w);
            return s > BORDER_23_LARGEST || p <= equations.boundary23.pressure(border23.value(h, s, w))
                    ? p
                    : p3b.value(h, s, w);
        }
        if (h > HOT) {
            return hot(h, s, w);
        }
        if (s < VAPOUR_273 && h < vapour2ab.value(s, s, w)) {
            return wet(h, s, w);
        }
        return (s > SUBREGION_2A_FROM || h <= starts.enthalpy2ab(s) ? p2a : p2b).value(h, s, w);
    }

    private double wet(double enthalpy, double entropy, Workspace w) {
        return equations.saturation.pressure(wetTemperature.value(enthalpy, entropy, w));
    }

    /**
     * Where no explicit equation holds: the Gibbs energy of wet steam is that of its liquid, so h − T s = g′(T), which
     * Newton's method solves from the cold end, since g′ is concave.
     */
    private double wetFromLiquid(double enthalpy, double entropy, Workspace w) {
        double t = If97Equations.LOWEST_K;
        for (int k = 0; k < STEPS; k++) {
            final double p = equations.saturation.pressure(t);
            final double ofLiquid = equations.region1.entropy(t, p, w);
            final double miss = enthalpy - equations.region1.enthalpy(t, p, w) - t * (entropy - ofLiquid);
            final double step = miss / (entropy - ofLiquid);
            t += step;
            if (!(t >= If97Equations.LOWEST_K && t <= If97Equations.REGION_3_FROM_K)) {
                return equations.region3FromPressure;
            }
            if (Math.abs(step) < 1e-3) {
                break;
            }
        }
        return equations.saturation.pressure(t);
    }

    /** Hot steam is nearly ideal: its temperature follows from h alone, and its entropy falls with R ln p. */
    private double hot(double enthalpy, double entropy, Workspace w) {
        final double pressure = 1e5;
        final double ratio = Math.exp((ofHot(enthalpy, pressure, w) - entropy) / If97Starts.GAS_CONSTANT);
        return Math.min(pressure * ratio, If97Equations.REGION_5_HIGHEST_PA);
    }

    private double ofHot(double enthalpy, double pressure, Workspace w) {
        // Two Newton steps from the middle of region 5 are near enough for a first guess.
        double t = 1500;
        for (int k = 0; k < 2; k++) {
            final double h = equations.region5.enthalpy(t, pressure, w);
            final double above = equations.region5.enthalpy(t + 1, pressure, w);
            t = Math.max(
                    If97Equations.REGION_5_FROM_K, Math.min(If97Equations.HIGHEST_K, t + (enthalpy - h) / (above - h)));
        }
        return equations.region5.entropy(t, pressure, w);
    }
}
