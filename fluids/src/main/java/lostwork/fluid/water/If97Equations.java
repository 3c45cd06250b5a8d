package lostwork.fluid.water;

import lostwork.fluid.Phase;
import lostwork.fluid.StatePoint;

/**
 * The basic equations of IAPWS-IF97 and which of them holds where: R7-97(2012), Figure 1.
 *
 * <p>Regions: 1 liquid up to 623.15 K, 2 vapour, 3 dense fluid about the critical point, 4 saturation line, 5 hot steam.
 */
final class If97Equations {
    static final double LOWEST_K = 273.15;
    /** Where regions 1 and 2 end and region 3 begins. */
    static final double REGION_3_FROM_K = 623.15;
    /** Where region 3 ends. */
    static final double REGION_3_TO_K = 863.15;
    /** Where region 5 begins. */
    static final double REGION_5_FROM_K = 1073.15;

    static final double HIGHEST_K = 2273.15;
    /** Where searches in region 5 start that have no better guess. */
    static final double REGION_5_MIDDLE_K = 1500;
    /** The release says "above 0"; below this a state of water vapour is of no use, and logarithms of 0 are avoided. */
    static final double LOWEST_PA = 1;

    static final double REGION_5_HIGHEST_PA = 50e6;
    static final double HIGHEST_PA = 100e6;

    /**
     * Above this temperature the saturated densities are interpolated. Region 3 follows the pressure of region 4 to about
     * 1e-10 only, and so close to the critical point its isotherm varies less than that.
     */
    private static final double INTERPOLATED_FROM_K = 647.0959;

    /** A pressure counts as the saturation pressure within this relative distance. */
    private static final double SATURATION_WIDTH = 1e-9;

    private static final double CRITICAL_DENSITY = 322;
    /** Beyond the densities of region 3 on both sides. */
    private static final double DILUTE = 80;

    private static final double DENSE = 780;

    final If97Saturation saturation = new If97Saturation(table("r7-97-table-34-region4"));
    final If97Gibbs region1 = new If97Gibbs(1, table("r7-97-table-02-region1"), null, 272.15, 630);
    final If97Gibbs region2 = new If97Gibbs(
            2, table("r7-97-table-11-region2-residual"), table("r7-97-table-10-region2-ideal"), 272.15, 1078);
    final If97Region3 region3 = new If97Region3(table("r7-97-table-30-region3"));
    /** Its limits leave room for the pairs of {@link If97Region5Start}, which form a rectangle about the region. */
    final If97Gibbs region5 = new If97Gibbs(
            5, table("r7-97-table-38-region5-residual"), table("r7-97-table-37-region5-ideal"), 950, 2300);

    final If97Boundary boundary23 = new If97Boundary(table("r7-97-table-01-b23"));
    /** Pressure where regions 1, 2 and 3 meet. */
    final double region3FromPressure = saturation.pressure(REGION_3_FROM_K);

    private final double interpolatedLiquid;
    private final double interpolatedVapour;

    If97Equations() {
        final Workspace w = Workspace.ofThread();
        final double p = saturation.pressure(INTERPOLATED_FROM_K);
        interpolatedLiquid = region3.density(INTERPOLATED_FROM_K, p, true, DENSE, w);
        interpolatedVapour = region3.density(INTERPOLATED_FROM_K, p, false, DILUTE, w);
    }

    private static CoefficientTable table(String name) {
        return CoefficientTable.read("if97/" + name + ".txt");
    }

    /** Evaluates one side of the saturation line; elsewhere the side plays no part. */
    void evaluate(double temperature, double pressure, boolean liquid, Workspace w, StatePoint out) {
        if (temperature <= REGION_3_FROM_K) {
            (liquid ? region1 : region2).evaluate(temperature, pressure, w, out);
        } else if (temperature > REGION_5_FROM_K) {
            region5.evaluate(temperature, pressure, w, out);
        } else if (temperature > REGION_3_TO_K || pressure <= boundary23.pressure(temperature)) {
            region2.evaluate(temperature, pressure, w, out);
        } else {
            region3(temperature, pressure, liquid, w, out);
        }
    }

    void region3(double temperature, double pressure, boolean liquid, Workspace w, StatePoint out) {
        final boolean supercritical = temperature >= If97Saturation.CRITICAL_TEMPERATURE_K;
        final double density;
        if (!supercritical && temperature > INTERPOLATED_FROM_K && isOnSaturation(temperature, pressure)) {
            density = interpolatedDensity(temperature, liquid);
        } else {
            final boolean dense =
                    supercritical ? pressure >= region3.pressure(CRITICAL_DENSITY, temperature, w) : liquid;
            density = region3.density(temperature, pressure, dense, dense ? DENSE : DILUTE, w);
            if (Double.isNaN(density)) {
                throw If97Failure.of(
                        "region 3, " + (dense ? "liquid" : "vapour") + " side",
                        "T = " + temperature + " K, p = " + pressure + " Pa",
                        w.value);
            }
        }
        region3.evaluate(density, temperature, region3Phase(temperature, pressure, liquid), w, out);
        out.pressure = pressure;
    }

    /**
     * {@return whether a temperature and a volume belong to one phase of region 3; if so, the point is filled}
     *
     * <p>They are the natural pair there, so no search is needed.
     */
    boolean evaluateRegion3(double temperature, double volume, Workspace w, StatePoint out) {
        if (!(temperature > REGION_3_FROM_K && temperature <= REGION_3_TO_K && volume > 0)) {
            return false;
        }
        final double density = 1 / volume;
        if (!(density > DILUTE && density < DENSE)) {
            return false;
        }
        final double pressure = region3.pressure(density, temperature, w);
        if (!(pressure > boundary23.pressure(temperature) && pressure <= HIGHEST_PA)) {
            return false;
        }
        final boolean liquid = density > CRITICAL_DENSITY;
        if (temperature < If97Saturation.CRITICAL_TEMPERATURE_K) {
            final double saturationPressure = saturation.pressure(temperature);
            if (isInsideDome(temperature, volume, pressure, saturationPressure, liquid, w, out)) {
                return false;
            }
        }
        region3.evaluate(density, temperature, region3Phase(temperature, pressure, liquid), w, out);
        out.volume = volume;
        return true;
    }

    /** Inside the dome the equation gives pressures of no equilibrium, on both sides of the saturation pressure. */
    private boolean isInsideDome(
            double temperature,
            double volume,
            double pressure,
            double saturationPressure,
            boolean liquid,
            Workspace w,
            StatePoint out) {
        if (liquid ? pressure < saturationPressure : pressure > saturationPressure) {
            return true;
        }
        final StatePoint side = liquid ? out.liquidSide() : out.vapourSide();
        region3(temperature, saturationPressure, liquid, w, side);
        return liquid ? volume > side.volume : volume < side.volume;
    }

    /** {@return whether a point is one phase of region 3} */
    private boolean isRegion3(StatePoint point) {
        return point.phase != Phase.TWO_PHASE
                && point.temperature > REGION_3_FROM_K
                && point.temperature <= REGION_3_TO_K
                && point.pressure > boundary23.pressure(point.temperature);
    }

    /**
     * {@return whether a point that the equation of region 3 has filled belongs there and is stable; if so, its phase is
     * set}
     */
    boolean acceptRegion3(Workspace w, StatePoint point) {
        if (!(isRegion3(point) && point.pressure <= HIGHEST_PA)) {
            return false;
        }
        final double t = point.temperature;
        boolean liquid = 1 / point.volume > CRITICAL_DENSITY;
        if (t < If97Saturation.CRITICAL_TEMPERATURE_K) {
            final double saturationPressure = saturation.pressure(t);
            if (t > INTERPOLATED_FROM_K) {
                liquid = point.pressure >= saturationPressure;
            } else if (isInsideDome(t, point.volume, point.pressure, saturationPressure, liquid, w, point)) {
                return false;
            }
        }
        point.phase = region3Phase(point.temperature, point.pressure, liquid);
        return true;
    }

    /** Fills a point with a mixture of its two sides, which hold saturated liquid and vapour. */
    void mix(double vapourFraction, StatePoint out) {
        final StatePoint liquid = out.liquidSide();
        out.setTwoPhase(liquid, out.vapourSide(), vapourFraction, saturation.pressureByTemperature(liquid.temperature));
    }

    private boolean isOnSaturation(double temperature, double pressure) {
        return Math.abs(pressure / saturation.pressure(temperature) - 1) <= SATURATION_WIDTH;
    }

    /** A parabola through the critical point. */
    private double interpolatedDensity(double temperature, boolean liquid) {
        final double share = Math.sqrt((If97Saturation.CRITICAL_TEMPERATURE_K - temperature)
                / (If97Saturation.CRITICAL_TEMPERATURE_K - INTERPOLATED_FROM_K));
        return CRITICAL_DENSITY + share * ((liquid ? interpolatedLiquid : interpolatedVapour) - CRITICAL_DENSITY);
    }

    static Phase region3Phase(double temperature, double pressure, boolean liquid) {
        if (temperature >= If97Saturation.CRITICAL_TEMPERATURE_K) {
            return pressure >= If97Saturation.CRITICAL_PRESSURE_PA ? Phase.SUPERCRITICAL : Phase.VAPOUR;
        }
        return liquid ? Phase.LIQUID : Phase.VAPOUR;
    }

    static double highestTemperatureAt(double pressure) {
        return pressure > REGION_5_HIGHEST_PA ? REGION_5_FROM_K : HIGHEST_K;
    }
}
