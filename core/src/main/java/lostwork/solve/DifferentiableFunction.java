package lostwork.solve;

/** A function of several numbers that gives its value together with its gradient. */
@FunctionalInterface
public interface DifferentiableFunction {
    /**
     * Evaluates the function.
     *
     * @param x the arguments
     * @param gradient the array to fill with the partial derivatives, as long as {@code x}
     * @return the value
     */
    double value(double[] x, double[] gradient);
}
