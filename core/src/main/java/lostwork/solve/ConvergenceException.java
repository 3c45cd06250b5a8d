package lostwork.solve;

/**
 * Thrown when an iteration ends without keeping its contract.
 *
 * <p>The message names the task, the number of iterations, the best point with its residual, and what to do. The same
 * facts are accessors.
 */
public final class ConvergenceException extends SolveException {
    private static final long serialVersionUID = 1L;

    /** How many iterations were made. */
    private final int iterations;
    /** The best point found. */
    private final double bestPoint;
    /** The residual at the best point. */
    private final double residual;

    /**
     * Creates the exception.
     *
     * @param task what was being computed, such as {@code "saturation temperature at 3.2 bar"}
     * @param iterations how many iterations were made
     * @param bestPoint the best point found, NaN if there is none
     * @param residual the residual at the best point, NaN if there is none
     * @param reason why the iteration ended, as a clause
     * @param wayOut what the caller can do, as a clause
     */
    public ConvergenceException(
            String task, int iterations, double bestPoint, double residual, String reason, String wayOut) {
        super(
                task,
                task + " did not converge: " + reason + " after " + iterations + " iterations (best point " + bestPoint
                        + ", residual " + residual + "); " + wayOut);
        this.iterations = iterations;
        this.bestPoint = bestPoint;
        this.residual = residual;
    }

    /** {@return how many iterations were made} */
    public int iterations() {
        return iterations;
    }

    /** {@return the best point found, in the unit of the caller's variable; NaN if there is none} */
    public double bestPoint() {
        return bestPoint;
    }

    /** {@return the residual at the best point, in the unit of the caller's function; NaN if there is none} */
    public double residual() {
        return residual;
    }
}
