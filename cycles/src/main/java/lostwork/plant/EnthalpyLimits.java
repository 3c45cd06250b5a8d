package lostwork.plant;

import lostwork.fluid.FluidModel;
import lostwork.fluid.FluidRange;
import lostwork.fluid.StatePoint;
import lostwork.plant.kernel.SlotScale;
import lostwork.quantity.OutOfRangeException;

/** The enthalpies within which a solver looks for a state of a fluid. */
final class EnthalpyLimits {
    private static final int SAMPLES = 9;

    private EnthalpyLimits() {}

    /** The lowest and highest enthalpy along the cold and the hot edge of the range, with some room outside. */
    static SlotScale scaleOf(FluidModel model, double natural) {
        final FluidRange range = model.range();
        final StatePoint point = new StatePoint();
        double low = Double.POSITIVE_INFINITY;
        double high = Double.NEGATIVE_INFINITY;
        for (int i = 0; i < SAMPLES; i++) {
            final double share = i / (SAMPLES - 1.0);
            final double p = Math.exp(
                    Math.log(range.lowestPressure()) * (1 - share) + Math.log(range.highestPressure()) * share);
            for (int edge = 0; edge < 2; edge++) {
                final double t = edge == 0 ? model.lowestTemperatureAt(p) : model.highestTemperatureAt(p);
                try {
                    model.atTemperaturePressure(t, p, point);
                    low = Math.min(low, point.enthalpy);
                    high = Math.max(high, point.enthalpy);
                } catch (OutOfRangeException e) {
                    // A corner that the model leaves out; its neighbours set the limits.
                }
            }
        }
        final double room = 0.05 * (high - low);
        return new SlotScale(natural, false, low - room, high + room);
    }
}
