package lostwork.component;

import java.util.Arrays;
import java.util.List;
import lostwork.fluid.FluidModel;
import lostwork.solve.DifferentiableFunction;

/**
 * The smallest temperature difference between the ends of an exchanger, in K, for the check of a solution: what is wrong
 * at an end is said of the end, so where an end is no better this gives the difference at that end or zero, whichever is
 * larger.
 */
final class InnerDifference implements DifferentiableFunction {
    private final SmallestDifference smallest;

    InnerDifference(List<FluidModel> fluids) {
        smallest = new SmallestDifference(fluids);
    }

    @Override
    public double value(double[] x, double[] gradient) {
        final double value = smallest.value(x, gradient);
        if (smallest.isAtEnd()) {
            Arrays.fill(gradient, 0);
            return Math.max(0, value);
        }
        return value;
    }
}
