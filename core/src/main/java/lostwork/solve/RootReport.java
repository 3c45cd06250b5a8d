package lostwork.solve;

/**
 * What a search for a root found. Immutable and thread-safe.
 */
public final class RootReport {
    private final double root;
    private final double residual;
    private final int iterations;
    private final double bracketWidth;

    RootReport(double root, double residual, int iterations, double bracketWidth) {
        this.root = root;
        this.residual = residual;
        this.iterations = iterations;
        this.bracketWidth = bracketWidth;
    }

    /** {@return the root, in the unit of the caller's variable} */
    public double root() {
        return root;
    }

    /** {@return the value of the function at {@link #root()}} */
    public double residual() {
        return residual;
    }

    /** {@return how many times the function was evaluated} */
    public int iterations() {
        return iterations;
    }

    /**
     * {@return how far the sign change can be from {@link #root()}; 0 if the residual is zero, infinite if the search ended
     * on the residual before a sign change was enclosed}
     */
    public double bracketWidth() {
        return bracketWidth;
    }

    @Override
    public String toString() {
        return "root " + root + ", residual " + residual + ", iterations " + iterations + ", bracket width "
                + bracketWidth;
    }
}
