package lostwork.solve;

/**
 * Thrown when a function has the same sign at both bounds, so that no root is known to lie between them.
 *
 * <p>The message names the task, both bounds and the values there. The same facts are accessors.
 */
public final class NoSignChangeException extends SolveException {
    private static final long serialVersionUID = 1L;

    /** The lower bound. */
    private final double lower;
    /** The upper bound. */
    private final double upper;
    /** The value of the function at the lower bound. */
    private final double valueAtLower;
    /** The value of the function at the upper bound. */
    private final double valueAtUpper;

    /**
     * Creates the exception.
     *
     * @param task what was being computed, such as {@code "saturation temperature at 3.2 bar"}
     * @param lower the lower bound
     * @param upper the upper bound
     * @param valueAtLower the value of the function at the lower bound
     * @param valueAtUpper the value of the function at the upper bound
     */
    public NoSignChangeException(String task, double lower, double upper, double valueAtLower, double valueAtUpper) {
        super(
                task,
                task + " has no solution that is certain to lie in " + lower + " .. " + upper
                        + ": the residual has one sign at both bounds (" + valueAtLower + " and " + valueAtUpper
                        + "); widen the bounds, or check that the target lies between the values at the bounds");
        this.lower = lower;
        this.upper = upper;
        this.valueAtLower = valueAtLower;
        this.valueAtUpper = valueAtUpper;
    }

    /** {@return the lower bound, in the unit of the caller's variable} */
    public double lower() {
        return lower;
    }

    /** {@return the upper bound, in the unit of the caller's variable} */
    public double upper() {
        return upper;
    }

    /** {@return the value of the function at the lower bound} */
    public double valueAtLower() {
        return valueAtLower;
    }

    /** {@return the value of the function at the upper bound} */
    public double valueAtUpper() {
        return valueAtUpper;
    }
}
