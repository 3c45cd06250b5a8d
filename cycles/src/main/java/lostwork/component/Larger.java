package lostwork.component;

import lostwork.solve.DifferentiableFunction;

/** The larger of two numbers; of two equal ones the first. */
final class Larger implements DifferentiableFunction {
    @Override
    public double value(double[] x, double[] gradient) {
        final int larger = x[1] > x[0] ? 1 : 0;
        gradient[larger] = 1;
        gradient[1 - larger] = 0;
        return x[larger];
    }
}
