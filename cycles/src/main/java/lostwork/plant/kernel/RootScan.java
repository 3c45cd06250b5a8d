package lostwork.plant.kernel;

import java.util.Arrays;

/**
 * Looks for roots of a residual over the whole range of one unknown: samples it, and closes in on each change of sign, the
 * nearest to the start first.
 */
final class RootScan {
    private static final int SPREAD_POINTS = 48;
    private static final int NEAR_POINTS = 10;

    /** A residual as a function of one unknown. */
    interface Residual {
        /** {@return the residual at a value of the unknown, NaN where there is none} */
        double at(double value);

        /**
         * {@return the root in an interval with a change of sign; NaN when the change is a jump}
         *
         * @param low the lower end
         * @param high the upper end
         * @param lowResidual the residual at the lower end
         */
        double rootBetween(double low, double high, double lowResidual);
    }

    private final Residual residual;
    private final SlotScale bounds;
    private final double start;
    private double first = Double.NaN;

    RootScan(Residual residual, SlotScale bounds, double start) {
        this.residual = residual;
        this.bounds = bounds;
        this.start = start;
    }

    /**
     * Looks for one root more than are to be passed over, and stops there.
     *
     * @param passedOver how many roots are to be passed over
     * @return whether there are enough roots; the last one found is the one asked for
     */
    boolean find(int passedOver) {
        final double[] at = samplePoints();
        final double[] r = new double[at.length];
        for (int i = 0; i < at.length; i++) {
            r[i] = residual.at(at[i]);
        }
        final Integer[] order = new Integer[at.length - 1];
        Arrays.setAll(order, i -> i);
        Arrays.sort(order, (a, b) -> Double.compare(Math.abs(at[a] - start), Math.abs(at[b] - start)));
        int roots = 0;
        for (int i : order) {
            if (r[i] * r[i + 1] <= 0) {
                final double root = residual.rootBetween(at[i], at[i + 1], r[i]);
                if (!Double.isNaN(root)) {
                    if (roots == 0) {
                        first = root;
                    }
                    if (roots == passedOver) {
                        return true;
                    }
                    roots++;
                }
            }
        }
        return false;
    }

    /** {@return the root nearest to the start, NaN when there is none} */
    double first() {
        return first;
    }

    /** Points over the whole range, and more of them around the start, where roots may lie close to each other. */
    private double[] samplePoints() {
        final double[] points = new double[SPREAD_POINTS + 2 * NEAR_POINTS];
        for (int i = 0; i < SPREAD_POINTS; i++) {
            final double share = i / (SPREAD_POINTS - 1.0);
            points[i] = bounds.proportional() && bounds.lowest() > 0
                    ? Math.exp(Math.log(bounds.lowest()) * (1 - share) + Math.log(bounds.highest()) * share)
                    : bounds.lowest() * (1 - share) + bounds.highest() * share;
        }
        final double size = bounds.at(start);
        for (int i = 0; i < NEAR_POINTS; i++) {
            final double distance = size * Math.pow(10, -0.5 * i);
            points[SPREAD_POINTS + 2 * i] = bounds.clamp(start - distance);
            points[SPREAD_POINTS + 2 * i + 1] = bounds.clamp(start + distance);
        }
        Arrays.sort(points);
        return points;
    }
}
