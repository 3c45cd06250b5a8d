package lostwork.fluid;

/**
 * A one-dimensional search that takes the caller's Newton steps as long as they stay in the bracket and make progress, and
 * halves the bracket otherwise.
 *
 * <p>A stepper instead of a solver that calls back: the caller evaluates, so that nothing is captured or allocated. The
 * ends of the bracket are evaluated only when a step leaves it, which tells at that moment whether the root lies inside.
 */
final class BracketedNewton {
    /** Where a search ended. */
    enum Outcome {
        /** The value asked for is reached at the last evaluation. */
        FOUND,
        /** The root lies below the lower end. */
        BELOW,
        /** The root lies above the upper end. */
        ABOVE,
        /** The value changes sign between neighbouring doubles without reaching zero, or the iterations ran out. */
        STUCK
    }

    /** Relative distance at which a search ends at once: a few hundred roundings. */
    private static final double TARGET = 1e-13;
    /** Relative distance that is accepted where rounding allows no better one. */
    private static final double ACCEPTED = 1e-10;

    private static final int MOST_ITERATIONS = 200;

    /** Where the caller evaluates next. */
    double x;
    /** The bracket as it stands. */
    double low;

    double high;
    /** The number of evaluations so far. */
    int iterations;
    /** How far the last evaluation was off, relative. */
    double distance;
    /** The outcome, once {@code next} has returned false. */
    Outcome outcome = Outcome.STUCK;

    private boolean lowTested;
    private boolean highTested;
    private boolean rising;
    private boolean finishing;
    private double bestX;
    private double bestDistance;
    private double lastDistance;

    /**
     * Starts a search.
     *
     * @param low lower end
     * @param high upper end
     * @param lowTested whether the root is known to lie at or above the lower end
     * @param highTested whether the root is known to lie at or below the upper end
     * @param guess first point, brought into the bracket
     * @param rising whether the residual rises from the lower to the upper end
     */
    void start(double low, double high, boolean lowTested, boolean highTested, double guess, boolean rising) {
        this.low = low;
        this.high = high;
        this.lowTested = lowTested;
        this.highTested = highTested;
        this.rising = rising;
        x = guess > low && guess < high ? guess : guess <= low ? low : guess >= high ? high : middle();
        iterations = 0;
        finishing = false;
        bestX = x;
        bestDistance = Double.POSITIVE_INFINITY;
        lastDistance = Double.POSITIVE_INFINITY;
        distance = Double.POSITIVE_INFINITY;
    }

    /**
     * Raises the lower end before the first evaluation.
     *
     * @param end the new lower end, not tested
     */
    void raise(double end) {
        low = end;
        lowTested = false;
        x = Math.max(x, end);
    }

    /**
     * {@return whether another evaluation is wanted}
     *
     * @param residual value at {@link #x} less the value asked for, relative to its scale
     * @param newton where the caller's Newton step leads; may be NaN
     */
    boolean next(double residual, double newton) {
        iterations++;
        distance = Math.abs(residual);
        if (distance <= TARGET || finishing) {
            outcome = distance <= ACCEPTED ? Outcome.FOUND : Outcome.STUCK;
            return false;
        }
        if (distance < bestDistance) {
            bestDistance = distance;
            bestX = x;
        }
        final boolean slow = distance > 0.5 * lastDistance;
        lastDistance = distance;
        return (residual < 0) == rising ? rootAbove(newton, slow) : rootBelow(newton, slow);
    }

    /** {@return whether another evaluation is wanted, when the caller only learnt that the root lies above} */
    boolean nextAbove() {
        iterations++;
        return rootAbove(Double.NaN, true);
    }

    /** {@return whether another evaluation is wanted, when the caller only learnt that the root lies below} */
    boolean nextBelow() {
        iterations++;
        return rootBelow(Double.NaN, true);
    }

    private boolean rootAbove(double newton, boolean slow) {
        if (x >= high) {
            return end(Outcome.ABOVE);
        }
        low = x;
        lowTested = true;
        return step(newton, slow, true);
    }

    private boolean rootBelow(double newton, boolean slow) {
        if (x <= low) {
            return end(Outcome.BELOW);
        }
        high = x;
        highTested = true;
        return step(newton, slow, false);
    }

    private boolean end(Outcome beyond) {
        if (bestDistance <= ACCEPTED) {
            return finish();
        }
        outcome = beyond;
        return false;
    }

    private boolean step(double newton, boolean slow, boolean up) {
        if (iterations >= MOST_ITERATIONS) {
            outcome = Outcome.STUCK;
            return false;
        }
        if (newton == x && bestDistance <= ACCEPTED) {
            return finish();
        }
        if (!slow && newton > low && newton < high) {
            x = newton;
        } else if (up && !highTested) {
            x = high;
        } else if (!up && !lowTested) {
            x = low;
        } else if (slow && newton > low && newton < high && bestDistance <= ACCEPTED) {
            return finish();
        } else {
            x = middle();
            if (x == low || x == high) {
                return finish();
            }
        }
        return true;
    }

    /** Evaluates the best point once more, so that the caller's state is the one of the result. */
    private boolean finish() {
        x = bestX;
        finishing = true;
        return true;
    }

    private double middle() {
        return 0.5 * (low + high);
    }
}
