package lostwork.component;

import lostwork.fluid.FluidModel;
import lostwork.fluid.StatePoint;
import lostwork.quantity.OutOfRangeException;
import lostwork.solve.DifferentiableFunction;

/**
 * A function of the pressures and enthalpies of two states, continued linearly where one of them lies outside the range of
 * the fluid.
 *
 * <p>The trial values of a solver may leave the range on their way; there the function keeps the value and the gradient of
 * the nearest point inside, so that every residual stays continuous. Where even that point has no value, the result is NaN,
 * which a solver steps back from. One instance serves one thread.
 */
final class WithinRange implements DifferentiableFunction {
    private static final double MARGIN = 1e-9;

    private final FluidModel model;
    private final DifferentiableFunction inner;
    private final StatePoint point = new StatePoint();
    private final double[] inside = new double[4];

    /**
     * Wraps a function.
     *
     * @param model the fluid
     * @param inner a function of p₁, h₁, p₂, h₂
     */
    WithinRange(FluidModel model, DifferentiableFunction inner) {
        this.model = model;
        this.inner = inner;
    }

    @Override
    public double value(double[] x, double[] gradient) {
        try {
            return inner.value(x, gradient);
        } catch (OutOfRangeException e) {
            return continued(x, gradient);
        }
    }

    private double continued(double[] x, double[] gradient) {
        double value;
        try {
            for (int i = 0; i < 4; i += 2) {
                final double p = clamp(
                        x[i],
                        model.range().lowestPressure() * (1 + MARGIN),
                        model.range().highestPressure() * (1 - MARGIN));
                inside[i] = p;
                inside[i + 1] = clamp(
                        x[i + 1],
                        enthalpyAt(model.lowestTemperatureAt(p) * (1 + MARGIN), p),
                        enthalpyAt(model.highestTemperatureAt(p) * (1 - MARGIN), p));
            }
            value = inner.value(inside, gradient);
        } catch (OutOfRangeException e) {
            java.util.Arrays.fill(gradient, Double.NaN);
            return Double.NaN;
        }
        for (int i = 0; i < 4; i++) {
            value += gradient[i] * (x[i] - inside[i]);
        }
        return value;
    }

    private double enthalpyAt(double temperature, double pressure) {
        model.atTemperaturePressure(temperature, pressure, point);
        return point.enthalpy;
    }

    private static double clamp(double value, double low, double high) {
        return Math.max(low, Math.min(high, value));
    }
}
