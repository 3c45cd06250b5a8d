package lostwork.quantity;

/**
 * Thrown when a value lies outside the range in which it has a meaning or a formulation holds.
 *
 * <p>The message names the quantity, its value, unit, the limits, what sets the limits, and the way out. The same facts
 * are accessors, so that an embedding program can show them in its own units and language.
 */
public final class OutOfRangeException extends IllegalArgumentException {
    private static final long serialVersionUID = 1L;

    /** What was out of range. */
    private final String quantity;
    /** The refused value, in {@link #unit}. */
    private final double value;
    /** The lowest accepted value, in {@link #unit}. */
    private final double lowest;
    /** The highest accepted value, in {@link #unit}. */
    private final double highest;
    /** The unit of the three numbers. */
    private final String unit;
    /** What sets the limits. */
    private final String limitedBy;

    /**
     * Creates the exception for a value outside two limits that are themselves accepted.
     *
     * @param quantity what was out of range, such as {@code "temperature"}
     * @param value the refused value, in {@code unit}
     * @param lowest the lowest accepted value, in {@code unit}
     * @param highest the highest accepted value, in {@code unit}
     * @param unit the unit of the three numbers, the one that the caller used where it is known
     * @param limitedBy what sets the limits, such as {@code "IAPWS-IF97 region 5"}
     * @param wayOut what the caller can do, as a clause; may be empty
     */
    public OutOfRangeException(
            String quantity,
            double value,
            double lowest,
            double highest,
            String unit,
            String limitedBy,
            String wayOut) {
        this(
                quantity,
                value,
                lowest,
                highest,
                unit,
                limitedBy,
                "is outside " + number(lowest) + " .. " + number(highest) + " " + unit,
                wayOut);
    }

    private OutOfRangeException(
            String quantity,
            double value,
            double lowest,
            double highest,
            String unit,
            String limitedBy,
            String finding,
            String wayOut) {
        super(quantity + " = " + number(value) + (unit.equals(Unit.ONE_SYMBOL) ? " " : " " + unit + " ") + finding
                + (limitedBy.isEmpty() ? "" : " (" + limitedBy + ")")
                + (wayOut.isEmpty() ? "" : "; " + wayOut));
        this.quantity = quantity;
        this.value = value;
        this.lowest = lowest;
        this.highest = highest;
        this.unit = unit;
        this.limitedBy = limitedBy;
    }

    /**
     * {@return the refusal of a value that a kind of quantity does not have}
     *
     * @param quantity the name of the kind
     * @param value the refused value, in {@code unit}
     * @param lowest the lower limit, in {@code unit}
     * @param unit the unit of both numbers
     * @param limitedBy what sets the limit, empty if the kind has none
     * @param finding what is wrong and what is allowed, as the end of a sentence about the value
     * @param wayOut what the caller can do, as a clause; may be empty
     */
    static OutOfRangeException ofKind(
            String quantity,
            double value,
            double lowest,
            String unit,
            String limitedBy,
            String finding,
            String wayOut) {
        return new OutOfRangeException(
                quantity, value, lowest, Double.POSITIVE_INFINITY, unit, limitedBy, finding, wayOut);
    }

    private static String number(double value) {
        return QuantityText.shortest(value);
    }

    /** {@return what was out of range} */
    public String quantity() {
        return quantity;
    }

    /** {@return the refused value, in {@link #unit()}} */
    public double value() {
        return value;
    }

    /** {@return the lower limit, in {@link #unit()}; negative infinity if there is none} */
    public double lowest() {
        return lowest;
    }

    /** {@return the upper limit, in {@link #unit()}; positive infinity if there is none} */
    public double highest() {
        return highest;
    }

    /** {@return the unit of the three numbers} */
    public String unit() {
        return unit;
    }

    /** {@return what sets the limits; empty if the value is refused only for not being finite} */
    public String limitedBy() {
        return limitedBy;
    }
}
