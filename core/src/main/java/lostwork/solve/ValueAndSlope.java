package lostwork.solve;

/**
 * Takes the value and the slope of a function at one point. Mutable, so that a search allocates nothing; belongs to one
 * thread.
 */
public final class ValueAndSlope {
    private double value;
    private double slope;

    /** Creates a holder of zeros. */
    public ValueAndSlope() {}

    /**
     * Stores a result.
     *
     * @param value the value of the function
     * @param slope its derivative
     */
    public void set(double value, double slope) {
        this.value = value;
        this.slope = slope;
    }

    /** {@return the value of the function} */
    public double value() {
        return value;
    }

    /** {@return the derivative of the function} */
    public double slope() {
        return slope;
    }
}
