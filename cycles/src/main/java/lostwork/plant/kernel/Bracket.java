package lostwork.plant.kernel;

/**
 * The interval in which a root of one equation is looked for. It starts as the limits of the unknown, of which nothing is
 * known; each point that is tried becomes one of its ends, and once the residuals at both ends are known to differ in sign
 * it holds a root. Reused from search to search.
 */
final class Bracket {
    private boolean proportional;
    private double low;
    private double high;
    /** The residual at the lower end; NaN as long as that end is a mere limit. */
    private double lowResidual;

    private double highResidual;

    /** Starts afresh with the limits of an unknown. */
    void reset(SlotScale bounds) {
        proportional = bounds.proportional();
        low = bounds.lowest();
        high = bounds.highest();
        lowResidual = Double.NaN;
        highResidual = Double.NaN;
    }

    /** Narrows the interval by a point that was tried; one without a residual tells nothing. */
    void take(double u, double residual, double slope) {
        if (Double.isNaN(residual)) {
            return;
        }
        final boolean lowKnown = !Double.isNaN(lowResidual);
        if (!lowKnown && Double.isNaN(highResidual)) {
            // First point: it becomes one end, by the direction in which the root is expected.
            setEnd(residual * slope <= 0, u, residual);
        } else if (lowKnown && u > low) {
            setEnd(residual * lowResidual > 0, u, residual);
        } else if (!lowKnown && u < high) {
            setEnd(!(residual * highResidual > 0), u, residual);
        }
    }

    private void setEnd(boolean lower, double u, double residual) {
        if (lower) {
            low = u;
            lowResidual = residual;
        } else {
            high = u;
            highResidual = residual;
        }
    }

    /** {@return whether the residuals at both ends are known, so that a root lies between} */
    boolean isClosed() {
        return !Double.isNaN(lowResidual) && !Double.isNaN(highResidual);
    }

    /** {@return whether a root lies between ends that no other number fits between} */
    boolean isExhausted() {
        return isClosed() && Math.abs(high - low) <= Math.ulp(Math.max(Math.abs(high), Math.abs(low)));
    }

    boolean contains(double u) {
        return u >= low && u <= high;
    }

    /** {@return the middle, the geometric one where sizes count against the value itself} */
    double middle() {
        return proportional && low > 0 ? Math.sqrt(low) * Math.sqrt(high) : 0.5 * (low + high);
    }

    /**
     * {@return a point between the present one and the limit that a step went beyond}
     *
     * @param u the present point
     * @param wanted where the step went; NaN when the slope gave no direction
     */
    double towards(double u, double wanted) {
        final boolean down = wanted < low || Double.isNaN(wanted) && Double.isNaN(lowResidual);
        return 0.5 * (u + (down ? low : high));
    }
}
