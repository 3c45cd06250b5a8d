package lostwork.component;

import java.util.List;
import lostwork.fluid.FluidModel;
import lostwork.solve.DifferentiableFunction;

/**
 * The smallest temperature difference along an exchanger: the exact minimum over ends, kinks and smooth minima, in K.
 *
 * <p>Its gradient is that of the place where the minimum lies; a smooth minimum may be held while differentiating, since
 * the difference does not change to first order when it moves (envelope theorem). Streams that cross give a negative
 * value.
 */
final class SmallestDifference implements DifferentiableFunction {
    private final ExchangerProfile profile;
    private boolean atEnd;

    SmallestDifference(List<FluidModel> fluids) {
        profile = new ExchangerProfile(fluids);
    }

    @Override
    public double value(double[] x, double[] gradient) {
        profile.set(x);
        final ExchangerProfile.Place smallest = profile.smallest();
        atEnd = smallest.z == 0 || smallest.z == 1;
        System.arraycopy(smallest.gradient, 0, gradient, 0, ExchangerProfile.ARGUMENTS);
        return smallest.difference;
    }

    /** {@return whether the minimum found last lies at an end} */
    boolean isAtEnd() {
        return atEnd;
    }
}
