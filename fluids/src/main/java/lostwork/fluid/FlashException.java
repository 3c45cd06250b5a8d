package lostwork.fluid;

import java.util.Locale;

/**
 * Thrown when no state with the two properties asked for is found within the range of a model.
 *
 * <p>Two values that lie outside the range by themselves are refused with
 * {@link lostwork.quantity.OutOfRangeException} instead. This exception means that the search ended: at a discontinuity
 * of the model, or in a model whose derivatives or saturation contradict its properties, which
 * a consistency check finds.
 */
public final class FlashException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    /** The fluid. */
    private final String fluid;
    /** The search that ended. */
    private final String search;
    /** The distance that was left, relative. */
    private final double residual;
    /** The number of evaluations. */
    private final int iterations;

    /**
     * Creates the exception.
     *
     * @param fluid the name of the fluid
     * @param search what was asked for, in words and SI units
     * @param residual the distance from the value asked for that was left, relative
     * @param iterations how many iterations were made
     * @param wayOut what the caller can do, as a clause
     */
    public FlashException(String fluid, String search, double residual, int iterations, String wayOut) {
        super(String.format(
                Locale.ROOT,
                "%s: no state with %s; after %d iterations the relative distance is %.3g; %s",
                fluid,
                search,
                iterations,
                residual,
                wayOut));
        this.fluid = fluid;
        this.search = search;
        this.residual = residual;
        this.iterations = iterations;
    }

    /** {@return the name of the fluid} */
    public String fluid() {
        return fluid;
    }

    /** {@return what was asked for, in words and SI units} */
    public String search() {
        return search;
    }

    /** {@return the distance from the value asked for that was left, relative} */
    public double residual() {
        return residual;
    }

    /** {@return how many iterations were made} */
    public int iterations() {
        return iterations;
    }
}
