package lostwork.quantity;

/**
 * A quantity whose values can be added to each other and multiplied by numbers: an energy, a mass flow, a span.
 *
 * <p>Temperatures and absolute pressures are points on a scale, not linear quantities: two of them have a difference but
 * no sum.
 *
 * @param <Q> the quantity itself
 */
public abstract class LinearQuantity<Q extends LinearQuantity<Q>> extends ScalarQuantity<Q, Q> {
    private static final long serialVersionUID = 1L;

    /**
     * Checks and stores a value.
     *
     * @param si the value in the coherent SI unit
     * @param kind the kind, which sets the bounds
     * @throws OutOfRangeException if the value is NaN, infinite or outside the bounds of the kind
     */
    protected LinearQuantity(double si, QuantityKind<Q, Q> kind) {
        super(kind.requireFinite(si));
    }

    /**
     * Checks and stores a value that is given in a unit; a refusal is worded in that unit.
     *
     * @param value the value in the unit
     * @param unit the unit
     * @param kind the kind, which sets the bounds
     * @throws OutOfRangeException if the value is NaN, infinite or outside the bounds of the kind
     */
    protected LinearQuantity(double value, Unit<Q> unit, QuantityKind<Q, Q> kind) {
        super(value, unit, kind);
    }

    /**
     * {@return a value of the same kind}
     *
     * @param si the value in the coherent SI unit
     */
    protected abstract Q with(double si);

    /**
     * {@return the sum of this value and another}
     *
     * @param other what is added
     * @throws OutOfRangeException if the result is not finite
     */
    public final Q plus(Q other) {
        return with(si() + other.si());
    }

    /**
     * {@return this value less another}
     *
     * @param other what is taken away
     * @throws OutOfRangeException if the result is not finite
     */
    public final Q minus(Q other) {
        return with(si() - other.si());
    }

    /**
     * {@return this value times a number}
     *
     * @param factor the number
     * @throws OutOfRangeException if the result is not finite
     */
    public final Q times(double factor) {
        return with(si() * factor);
    }

    /**
     * {@return this value times a ratio}
     *
     * @param factor the ratio
     * @throws OutOfRangeException if the result is not finite
     */
    public final Q times(Ratio factor) {
        return with(si() * factor.si());
    }

    /**
     * {@return this value divided by a number}
     *
     * @param divisor the number, not zero
     * @throws OutOfRangeException if the quotient is not finite
     */
    public final Q dividedBy(double divisor) {
        return with(si() / divisor);
    }

    /**
     * {@return how many times another value of the same kind goes into this one}
     *
     * @param other the divisor, not zero
     * @throws OutOfRangeException if the quotient is not finite
     */
    public final Ratio over(Q other) {
        return Ratio.fraction(si() / other.si());
    }

    /** {@return this value with its sign changed} */
    public final Q negated() {
        return with(-si());
    }

    /** {@return this value without its sign} */
    public final Q magnitude() {
        return with(Math.abs(si()));
    }
}
