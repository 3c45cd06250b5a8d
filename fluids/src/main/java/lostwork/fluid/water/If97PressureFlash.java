package lostwork.fluid.water;

import java.util.function.DoubleUnaryOperator;
import lostwork.fluid.StatePoint;

/**
 * States at a pressure and a property that rises with temperature: enthalpy or entropy.
 *
 * <p>Along an isobar the regions follow each other. The property at their borders decides which one a state lies in; the
 * backward equation of the region, or {@link If97Region5Start}, gives a first guess, and Newton's method on the basic equation makes it exact, so that
 * the property asked for is returned to rounding. At most borders the property makes a small step (R7-97(2012), section
 * 10). Inside a step up, a value belongs to no state; at 623.15 K and 1073.15 K the equation above the border, and between
 * regions 3 and 2 the one below, is then followed a little beyond it. Inside a step down, two states have the value, and
 * the colder one of regions 1 and 2 or the hotter one of region 2 is returned.
 *
 * <p>{@link Fence} answers most comparisons at once; all of them use β = p<sup>1/4</sup>, in which the curves are smooth.
 */
abstract class If97PressureFlash {
    private static final int INTERVALS = 512;

    final If97Equations equations;
    final If97Starts starts;
    private final double lowestSaturationPressure;
    private final Fence cold;
    private final Fence liquid;
    private final Fence vapour;
    private final Fence end1;
    private final Fence begin2;
    private final Fence end2;
    private final Fence hot;

    private If97PressureFlash(If97Equations equations, If97Starts starts) {
        this.equations = equations;
        this.starts = starts;
        lowestSaturationPressure = equations.saturation.lowestPressure();
        final double lowest = root(lowestSaturationPressure);
        final double middle = root(equations.region3FromPressure);
        final double highest = root(If97Equations.HIGHEST_PA);
        final Workspace w = Workspace.ofThread();
        cold = fence(p -> of(equations.region1, If97Equations.LOWEST_K, p, w), lowest, highest);
        liquid = fence(p -> of(equations.region1, equations.saturation.temperature(p), p, w), lowest, middle);
        vapour = fence(p -> of(equations.region2, equations.saturation.temperature(p), p, w), lowest, middle);
        end1 = fence(p -> of(equations.region1, If97Equations.REGION_3_FROM_K, p, w), middle, highest);
        begin2 = fence(p -> of(equations.region2, equations.boundary23.temperature(p), p, w), middle, highest);
        end2 = fence(p -> of(equations.region2, If97Equations.REGION_5_FROM_K, p, w), lowest, highest);
        final double highest5 = root(If97Equations.REGION_5_HIGHEST_PA);
        hot = fence(p -> of(equations.region5, If97Equations.HIGHEST_K, p, w), lowest, highest5);
    }

    private static Fence fence(DoubleUnaryOperator ofPressure, double from, double to) {
        return new Fence(root -> ofPressure.applyAsDouble(root * root * root * root), from, to, INTERVALS);
    }

    private static double root(double pressure) {
        return Math.sqrt(Math.sqrt(pressure));
    }

    /** Finds the state; the pressure lies within the range. */
    final void find(double pressure, double value, Workspace w, StatePoint out) {
        if (pressure < lowestSaturationPressure) {
            requireInRange(
                    value >= of(equations.region2, If97Equations.LOWEST_K, pressure, w),
                    equations.region2,
                    pressure,
                    value,
                    w);
            vapour(pressure, root(pressure), value, w, out);
            return;
        }
        final double root = root(pressure);
        if (pressure > equations.region3FromPressure) {
            if (end1.isAbove(root, value)
                    || !end1.isBelow(root, value)
                            && value <= of(equations.region1, If97Equations.REGION_3_FROM_K, pressure, w)) {
                liquid(pressure, root, value, w, out);
            } else if (begin2.isBelow(root, value)
                    || !begin2.isAbove(root, value)
                            && value
                                    >= of(equations.region2, equations.boundary23.temperature(pressure), pressure, w)) {
                vapour(pressure, root, value, w, out);
            } else {
                region3(pressure, value, w, out);
            }
        } else if (liquid.isAbove(root, value)) {
            liquid(pressure, root, value, w, out);
        } else if (vapour.isBelow(root, value)) {
            vapour(pressure, root, value, w, out);
        } else {
            aboutSaturation(pressure, root, value, w, out);
        }
    }

    private void aboutSaturation(double pressure, double root, double value, Workspace w, StatePoint out) {
        final double temperature = equations.saturation.temperature(pressure);
        equations.region1.evaluate(temperature, pressure, w, out.liquidSide());
        if (value < of(out.liquidSide())) {
            liquid(pressure, root, value, w, out);
            return;
        }
        equations.region2.evaluate(temperature, pressure, w, out.vapourSide());
        if (value > of(out.vapourSide())) {
            vapour(pressure, root, value, w, out);
            return;
        }
        mix(value, out);
    }

    private void mix(double value, StatePoint out) {
        final double ofLiquid = of(out.liquidSide());
        equations.mix((value - ofLiquid) / (of(out.vapourSide()) - ofLiquid), out);
        set(value, out);
    }

    private void liquid(double pressure, double root, double value, Workspace w, StatePoint out) {
        requireInRange(
                cold.isBelow(root, value) || value >= of(equations.region1, If97Equations.LOWEST_K, pressure, w),
                equations.region1,
                pressure,
                value,
                w);
        inRegion(equations.region1, pressure, value, startInRegion1(pressure, value, w), w, out);
    }

    private void vapour(double pressure, double root, double value, Workspace w, StatePoint out) {
        final boolean fenced = pressure >= lowestSaturationPressure;
        if (fenced && end2.isAbove(root, value)
                || !(fenced && end2.isBelow(root, value))
                        && value <= of(equations.region2, If97Equations.REGION_5_FROM_K, pressure, w)) {
            inRegion(equations.region2, pressure, value, startInRegion2(pressure, value, w), w, out);
        } else {
            requireInRange(
                    pressure <= If97Equations.REGION_5_HIGHEST_PA
                            && (fenced && hot.isAbove(root, value)
                                    || value <= of(equations.region5, If97Equations.HIGHEST_K, pressure, w)),
                    fenced ? equations.region1 : equations.region2,
                    pressure,
                    value,
                    w);
            inRegion(equations.region5, pressure, value, startInRegion5(pressure, value), w, out);
        }
    }

    private void region3(double pressure, double value, Workspace w, StatePoint out) {
        final boolean dense;
        if (pressure >= If97Saturation.CRITICAL_PRESSURE_PA) {
            dense = isDense(pressure, value);
        } else {
            final double temperature = equations.saturation.temperature(pressure);
            equations.region3(temperature, pressure, true, w, out.liquidSide());
            dense = value < of(out.liquidSide());
            if (!dense) {
                equations.region3(temperature, pressure, false, w, out.vapourSide());
                if (value <= of(out.vapourSide())) {
                    mix(value, out);
                    return;
                }
            }
        }
        if (!inRegion3(pressure, value, dense, w, out)) {
            throw If97Failure.of("region 3", "p = " + pressure + " Pa, " + words(value), w.value);
        }
        out.phase = If97Equations.region3Phase(out.temperature, pressure, dense);
    }

    private void requireInRange(boolean inRange, If97Gibbs coldRegion, double pressure, double value, Workspace w) {
        if (!inRange) {
            final If97Gibbs hotRegion =
                    pressure > If97Equations.REGION_5_HIGHEST_PA ? equations.region2 : equations.region5;
            throw If97Failure.outside(
                    quantity(),
                    value,
                    of(coldRegion, If97Equations.LOWEST_K, pressure, w),
                    of(hotRegion, If97Equations.highestTemperatureAt(pressure), pressure, w),
                    unit(),
                    "at p = " + pressure + " Pa");
        }
    }

    private String words(double value) {
        return quantity() + " = " + value + " " + unit();
    }

    abstract String quantity();

    abstract String unit();

    abstract double of(StatePoint point);

    abstract double of(If97Gibbs equation, double temperature, double pressure, Workspace w);

    abstract void set(double value, StatePoint out);

    abstract double startInRegion1(double pressure, double value, Workspace w);

    abstract double startInRegion2(double pressure, double value, Workspace w);

    abstract double startInRegion5(double pressure, double value);

    abstract boolean isDense(double pressure, double value);

    abstract void inRegion(
            If97Gibbs equation, double pressure, double value, double start, Workspace w, StatePoint out);

    abstract boolean inRegion3(double pressure, double value, boolean dense, Workspace w, StatePoint out);

    /** By enthalpy in J/kg. */
    static final class ByEnthalpy extends If97PressureFlash {
        private final If97Region5Start start5;

        ByEnthalpy(If97Equations equations, If97Starts starts) {
            super(equations, starts);
            final Workspace w = Workspace.ofThread();
            final StatePoint point = new StatePoint();
            start5 = new If97Region5Start(
                    (p, h) -> {
                        equations.region5.atPressureEnthalpy(p, h, If97Equations.REGION_5_MIDDLE_K, w, point);
                        return point.temperature;
                    },
                    equations.region5.enthalpy(If97Equations.REGION_5_FROM_K, If97Equations.REGION_5_HIGHEST_PA, w),
                    equations.region5.enthalpy(If97Equations.HIGHEST_K, If97Equations.LOWEST_PA, w));
        }

        @Override
        String quantity() {
            return "enthalpy";
        }

        @Override
        String unit() {
            return "J/kg";
        }

        @Override
        double of(StatePoint point) {
            return point.enthalpy;
        }

        @Override
        double of(If97Gibbs equation, double temperature, double pressure, Workspace w) {
            return equation.enthalpy(temperature, pressure, w);
        }

        @Override
        void set(double value, StatePoint out) {
            out.enthalpy = value;
        }

        @Override
        double startInRegion1(double pressure, double value, Workspace w) {
            return starts.region1Enthalpy(pressure, value, w);
        }

        @Override
        double startInRegion2(double pressure, double value, Workspace w) {
            return starts.region2Enthalpy(pressure, value, w);
        }

        @Override
        double startInRegion5(double pressure, double value) {
            return start5.temperature(pressure, value);
        }

        @Override
        boolean isDense(double pressure, double value) {
            return value <= starts.enthalpy3ab(pressure);
        }

        @Override
        void inRegion(If97Gibbs equation, double pressure, double value, double start, Workspace w, StatePoint out) {
            equation.atPressureEnthalpy(pressure, value, start, w, out);
        }

        @Override
        boolean inRegion3(double pressure, double value, boolean dense, Workspace w, StatePoint out) {
            return equations.region3.atPressureEnthalpy(
                    pressure,
                    value,
                    1 / starts.region3VolumeEnthalpy(pressure, value, dense, w),
                    starts.region3TemperatureEnthalpy(pressure, value, dense, w),
                    w,
                    out);
        }
    }

    /** By entropy in J/(kg K). */
    static final class ByEntropy extends If97PressureFlash {
        private final If97Region5Start start5;

        ByEntropy(If97Equations equations, If97Starts starts) {
            super(equations, starts);
            final Workspace w = Workspace.ofThread();
            final StatePoint point = new StatePoint();
            start5 = new If97Region5Start(
                    (p, value) -> {
                        equations.region5.atPressureEntropy(
                                p, value - logPart(p), If97Equations.REGION_5_MIDDLE_K, w, point);
                        return point.temperature;
                    },
                    withoutLogPart(If97Equations.REGION_5_FROM_K, If97Equations.REGION_5_HIGHEST_PA, w),
                    withoutLogPart(If97Equations.HIGHEST_K, If97Equations.LOWEST_PA, w));
        }

        /** Entropy plus this varies little with pressure, as in an ideal gas. */
        private static double logPart(double pressure) {
            return If97Starts.GAS_CONSTANT * Math.log(pressure);
        }

        private double withoutLogPart(double temperature, double pressure, Workspace w) {
            return equations.region5.entropy(temperature, pressure, w) + logPart(pressure);
        }

        @Override
        String quantity() {
            return "entropy";
        }

        @Override
        String unit() {
            return "J/(kg K)";
        }

        @Override
        double of(StatePoint point) {
            return point.entropy;
        }

        @Override
        double of(If97Gibbs equation, double temperature, double pressure, Workspace w) {
            return equation.entropy(temperature, pressure, w);
        }

        @Override
        void set(double value, StatePoint out) {
            out.entropy = value;
        }

        @Override
        double startInRegion1(double pressure, double value, Workspace w) {
            return starts.region1Entropy(pressure, value, w);
        }

        @Override
        double startInRegion2(double pressure, double value, Workspace w) {
            return starts.region2Entropy(pressure, value, w);
        }

        @Override
        double startInRegion5(double pressure, double value) {
            return start5.temperature(pressure, value + logPart(pressure));
        }

        @Override
        boolean isDense(double pressure, double value) {
            return value <= If97Starts.CRITICAL_ENTROPY;
        }

        @Override
        void inRegion(If97Gibbs equation, double pressure, double value, double start, Workspace w, StatePoint out) {
            equation.atPressureEntropy(pressure, value, start, w, out);
        }

        @Override
        boolean inRegion3(double pressure, double value, boolean dense, Workspace w, StatePoint out) {
            return equations.region3.atPressureEntropy(
                    pressure,
                    value,
                    1 / starts.region3VolumeEntropy(pressure, value, dense, w),
                    starts.region3TemperatureEntropy(pressure, value, dense, w),
                    w,
                    out);
        }
    }
}
