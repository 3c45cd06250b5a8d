package lostwork.component;

import lostwork.fluid.FluidModel;
import lostwork.fluid.StatePoint;
import lostwork.solve.DifferentiableFunction;

/**
 * The entropy of a second state less that of a first one. Arguments: p₁ in Pa, h₁ in J/kg, p₂ in Pa, h₂ in J/kg; value
 * in J/(kg K). One instance serves one thread.
 */
final class EntropyRise implements DifferentiableFunction {
    private final FluidModel model;
    private final StatePoint first = new StatePoint();
    private final StatePoint second = new StatePoint();

    EntropyRise(FluidModel model) {
        this.model = model;
    }

    @Override
    public double value(double[] x, double[] gradient) {
        model.atPressureEnthalpy(x[0], x[1], first);
        model.atPressureEnthalpy(x[2], x[3], second);
        // ds = dh/T - (v/T) dp
        gradient[0] = first.volume / first.temperature;
        gradient[1] = -1 / first.temperature;
        gradient[2] = -second.volume / second.temperature;
        gradient[3] = 1 / second.temperature;
        return second.entropy - first.entropy;
    }
}
