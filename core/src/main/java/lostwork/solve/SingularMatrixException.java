package lostwork.solve;

/** Thrown when a linear system is solved whose matrix has no inverse in double precision. */
public final class SingularMatrixException extends SolveException {
    private static final long serialVersionUID = 1L;

    /** The order of the matrix. */
    private final int order;
    /** The elimination step, from 0, that found no pivot. */
    private final int step;

    /**
     * Creates the exception.
     *
     * @param order the number of equations
     * @param step the elimination step, from 0, that found no pivot; also the rank that elimination saw
     */
    public SingularMatrixException(int order, int step) {
        super(
                "linear system of " + order + " equations",
                "linear system of " + order + " equations is singular: elimination finds no pivot for unknown " + step
                        + " (counted from 0); the null vectors of SmallSvd tell which equations depend on each other");
        this.order = order;
        this.step = step;
    }

    /** {@return the number of equations} */
    public int order() {
        return order;
    }

    /** {@return the elimination step, from 0, that found no pivot: the index of the unknown it belongs to} */
    public int step() {
        return step;
    }
}
