package lostwork.solve;

/** A function of one variable that yields its value and its exact slope together. */
@FunctionalInterface
public interface FunctionWithSlope {
    /**
     * Evaluates the function.
     *
     * @param x the point
     * @param result takes the value and the slope at the point; see {@link ValueAndSlope#set}
     */
    void evaluate(double x, ValueAndSlope result);
}
