package lostwork.quantity;

import java.util.Locale;

/**
 * Thrown when a value lies outside the range in which it has a meaning or a formulation holds.
 *
 * <p>The message names the quantity, its value, unit, both limits, what sets the limits, and the way out. The same facts
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
    /** The coherent SI unit of the three numbers. */
    private final String unit;
    /** What sets the limits. */
    private final String limitedBy;

    /**
     * Creates the exception.
     *
     * @param quantity what was out of range, such as {@code "temperature"}
     * @param value the refused value, in {@code unit}
     * @param lowest the lowest accepted value, in {@code unit}
     * @param highest the highest accepted value, in {@code unit}
     * @param unit the coherent SI unit of the three numbers
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
        super(String.format(
                Locale.ROOT,
                "%s = %s %s is outside %s .. %s %s (%s)%s",
                quantity,
                value,
                unit,
                lowest,
                highest,
                unit,
                limitedBy,
                wayOut.isEmpty() ? "" : "; " + wayOut));
        this.quantity = quantity;
        this.value = value;
        this.lowest = lowest;
        this.highest = highest;
        this.unit = unit;
        this.limitedBy = limitedBy;
    }

    /** {@return what was out of range} */
    public String quantity() {
        return quantity;
    }

    /** {@return the refused value, in {@link #unit()}} */
    public double value() {
        return value;
    }

    /** {@return the lowest accepted value, in {@link #unit()}} */
    public double lowest() {
        return lowest;
    }

    /** {@return the highest accepted value, in {@link #unit()}} */
    public double highest() {
        return highest;
    }

    /** {@return the coherent SI unit of the three numbers} */
    public String unit() {
        return unit;
    }

    /** {@return what sets the limits} */
    public String limitedBy() {
        return limitedBy;
    }
}
