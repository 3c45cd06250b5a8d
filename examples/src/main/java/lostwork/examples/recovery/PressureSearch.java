package lostwork.examples.recovery;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import lostwork.plant.PlantSolveException;
import lostwork.quantity.Pressure;
import lostwork.quantity.Ratio;
import lostwork.quantity.Temperature;
import org.apache.commons.math3.exception.TooManyEvaluationsException;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;

/**
 * Finds the evaporation pressure with the most net power: a coarse scan over the logarithm of the pressure, then Brent's
 * method between the neighbours of the best scanned point.
 *
 * <p>Where pinch and lowest gas temperature change places the net power has a corner. A corner is where Brent's method is
 * slow, so the pressure at which both bind is solved for directly.
 */
final class PressureSearch {
    private static final int SCANNED = 9;
    private static final double RELATIVE_TOLERANCE = 1e-6;
    private static final double ABSOLUTE_TOLERANCE = 1e-6;
    private static final int MOST_EVALUATIONS = 60;

    private final RecoveryPlant plant;
    private final RecoveryDesign design;
    private final Progress progress;
    private final List<OperatingPoint> points = new ArrayList<>();

    /** Takes the count of the pressures that were tried. */
    @FunctionalInterface
    interface Progress {
        /**
         * Takes the count.
         *
         * @param tried how many pressures were tried
         */
        void tried(int tried);
    }

    /**
     * What bounds the pressure, and what was found within.
     *
     * @param best the point with the most net power
     * @param scanned the points of the scan and the best one, by rising pressure
     * @param evaluations how many pressures were tried
     * @param lowest the lowest pressure that was allowed
     * @param highest the highest pressure that was allowed
     * @param upperBound what the highest pressure comes from
     */
    record Result(
            OperatingPoint best,
            List<OperatingPoint> scanned,
            int evaluations,
            Pressure lowest,
            Pressure highest,
            UpperBound upperBound) {
        Result {
            scanned = List.copyOf(scanned);
        }
    }

    /** What the highest pressure comes from. */
    enum UpperBound {
        DESIGN,
        SUPERHEAT,
        WETNESS
    }

    PressureSearch(RecoveryPlant plant, RecoveryDesign design, Progress progress) {
        this.plant = plant;
        this.design = design;
        this.progress = progress;
    }

    /**
     * {@return the best pressure}
     *
     * @throws NoRecoveryException if no pressure is possible
     */
    Result run() {
        final Pressure lowest = design.lowestPressure().value();
        UpperBound bound = UpperBound.DESIGN;
        Pressure highest = design.highestPressure().value();
        final Pressure bySuperheat = highestWithSuperheat();
        if (bySuperheat.compareTo(highest) < 0) {
            highest = bySuperheat;
            bound = UpperBound.SUPERHEAT;
        }
        requireRoom(lowest, highest, "the gas is too cold to superheat steam");
        final Ratio least = design.lowestVapourFraction().value();
        if (isTooWet(plant.at(highest), least)) {
            highest = plant.pressureForOutlet(least);
            bound = UpperBound.WETNESS;
        }
        requireRoom(lowest, highest, "the steam would leave the turbine too wet");
        final OperatingPoint best = search(lowest, highest);
        return new Result(best, shown(best), points.size(), lowest, highest, bound);
    }

    private static void requireRoom(Pressure lowest, Pressure highest, String why) {
        if (highest.compareTo(lowest) <= 0) {
            throw new NoRecoveryException(why + " at any pressure above " + lowest);
        }
    }

    private Pressure highestWithSuperheat() {
        final Temperature boiling =
                plant.steamTemperature().minus(design.leastSuperheat().value());
        final Temperature critical = Temperature.celsius(370);
        return plant.water()
                .saturation(boiling.compareTo(critical) < 0 ? boiling : critical)
                .pressure();
    }

    private static boolean isTooWet(OperatingPoint point, Ratio least) {
        final Optional<Ratio> vapour = point.outletVapour();
        return vapour.isPresent() && vapour.get().compareTo(least) < 0;
    }

    private OperatingPoint search(Pressure lowest, Pressure highest) {
        final double from = Math.log(lowest.si());
        final double to = Math.log(highest.si());
        final double step = (to - from) / (SCANNED - 1);
        int best = 0;
        final List<OperatingPoint> scan = new ArrayList<>();
        for (int i = 0; i < SCANNED; i++) {
            scan.add(at(i == SCANNED - 1 ? highest : Pressure.pascal(Math.exp(from + i * step))));
            if (scan.get(i).netPower().compareTo(scan.get(best).netPower()) > 0) {
                best = i;
            }
        }
        refine(from + Math.max(0, best - 1) * step, from + best * step, Math.min(to, from + (best + 1) * step));
        atCorner();
        return points.stream()
                .max(Comparator.comparing(OperatingPoint::netPower))
                .orElseThrow();
    }

    private void refine(double from, double start, double to) {
        try {
            new BrentOptimizer(RELATIVE_TOLERANCE, ABSOLUTE_TOLERANCE)
                    .optimize(
                            new UnivariateObjectiveFunction(logarithm -> at(Pressure.pascal(Math.exp(logarithm)))
                                    .netPower()
                                    .si()),
                            GoalType.MAXIMIZE,
                            new SearchInterval(from, to, start),
                            new MaxEval(MOST_EVALUATIONS));
        } catch (TooManyEvaluationsException e) {
            // The best point so far stands: the evaluations are bounded so that the search ends.
        }
    }

    /** Tries the corner between the best point and its neighbours, where the limits change. */
    private void atCorner() {
        final OperatingPoint best = points.stream()
                .max(Comparator.comparing(OperatingPoint::netPower))
                .orElseThrow();
        final boolean corner = points.stream()
                .filter(p ->
                        Math.abs(Math.log(p.pressure().si() / best.pressure().si())) < 0.01)
                .anyMatch(p -> p.limit() != best.limit());
        if (corner) {
            try {
                points.add(plant.atBothLimits(best));
            } catch (PlantSolveException e) {
                // No exact corner: the best point of the search stands.
            }
        }
    }

    private OperatingPoint at(Pressure pressure) {
        final OperatingPoint point = plant.at(pressure);
        points.add(point);
        progress.tried(points.size());
        return point;
    }

    /** The points of the scan and the best one. */
    private List<OperatingPoint> shown(OperatingPoint best) {
        final List<OperatingPoint> shown = new ArrayList<>(points.subList(0, SCANNED));
        if (!shown.contains(best)) {
            shown.add(best);
        }
        shown.sort(Comparator.comparing(OperatingPoint::pressure));
        return shown;
    }
}
