package lostwork.fluid.water;

import java.util.function.DoubleUnaryOperator;

/**
 * A curve that a value is compared with, in a table that answers at once where the value is clearly on one side.
 *
 * <p>Straight lines between equidistant nodes, with a margin twice as wide as the largest deviation at the middles. A
 * value within the margin needs the curve itself.
 */
final class Fence {
    private final double from;
    private final double nodesPerUnit;
    private final double[] values;
    private final double margin;

    Fence(DoubleUnaryOperator curve, double from, double to, int intervals) {
        this.from = from;
        nodesPerUnit = intervals / (to - from);
        values = new double[intervals + 1];
        for (int k = 0; k <= intervals; k++) {
            values[k] = curve.applyAsDouble(Math.min(from + k / nodesPerUnit, to));
        }
        double deviation = 0;
        double size = 0;
        for (int k = 0; k < intervals; k++) {
            final double middle = curve.applyAsDouble(from + (k + 0.5) / nodesPerUnit);
            deviation = Math.max(deviation, Math.abs(middle - (values[k] + values[k + 1]) / 2));
            size = Math.max(size, Math.abs(values[k]));
        }
        margin = 2 * deviation + 1e-9 * size;
    }

    private double line(double x) {
        final double position = (x - from) * nodesPerUnit;
        final int k = Math.max(0, Math.min(values.length - 2, (int) position));
        return values[k] + (position - k) * (values[k + 1] - values[k]);
    }

    /** {@return whether a value lies clearly below the curve} */
    boolean isAbove(double x, double value) {
        return value < line(x) - margin;
    }

    /** {@return whether a value lies clearly above the curve} */
    boolean isBelow(double x, double value) {
        return value > line(x) + margin;
    }
}
