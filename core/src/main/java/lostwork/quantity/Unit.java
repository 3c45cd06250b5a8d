package lostwork.quantity;

import java.util.List;

/**
 * A unit of one kind of quantity: {@code value in SI = (value + offset) × factor}.
 *
 * <p>The units that the library knows stand in {@link Units}; others are made with {@link #of}. Immutable and
 * thread-safe.
 *
 * @param <Q> the quantity that the unit measures
 */
public final class Unit<Q> {
    private final String symbol;
    private final double factor;
    private final double offset;
    private final List<String> spellings;

    private Unit(String symbol, double factor, double offset, List<String> spellings) {
        if (!(factor > 0 && factor < Double.POSITIVE_INFINITY)) {
            throw new IllegalArgumentException(
                    "unit " + symbol + ": factor = " + factor + " must be finite and above 0");
        }
        this.symbol = symbol;
        this.factor = factor;
        this.offset = offset;
        this.spellings = spellings;
    }

    /**
     * {@return a unit}
     *
     * @param <Q> the quantity that the unit measures
     * @param symbol how the unit is printed, and read
     * @param factor how many coherent SI units one of this unit is, above 0
     * @param spellings further ways to write the unit that the reader accepts
     */
    public static <Q> Unit<Q> of(String symbol, double factor, String... spellings) {
        return new Unit<>(symbol, factor, 0, List.of(spellings));
    }

    /**
     * {@return a unit of a scale whose zero is not the zero of the SI scale, such as °C}
     *
     * @param <Q> the quantity that the unit measures
     * @param symbol how the unit is printed, and read
     * @param factor how many coherent SI units one of this unit is, above 0
     * @param offset what is added to a value in this unit before it is multiplied by the factor
     * @param spellings further ways to write the unit that the reader accepts
     */
    public static <Q> Unit<Q> withOffset(String symbol, double factor, double offset, String... spellings) {
        return new Unit<>(symbol, factor, offset, List.of(spellings));
    }

    /** {@return how the unit is printed} */
    public String symbol() {
        return symbol;
    }

    /** {@return further ways to write the unit that the reader accepts} */
    public List<String> spellings() {
        return spellings;
    }

    /** {@return how many coherent SI units one of this unit is} */
    public double factor() {
        return factor;
    }

    /** {@return what is added to a value in this unit before it is multiplied by the factor; 0 for most units} */
    public double offset() {
        return offset;
    }

    /**
     * {@return a value in the coherent SI unit}
     *
     * @param value the value in this unit
     */
    public double toSi(double value) {
        return (value + offset) * factor;
    }

    /**
     * {@return a value in this unit}
     *
     * @param si the value in the coherent SI unit
     */
    public double fromSi(double si) {
        return si / factor - offset;
    }

    /** {@return the symbol} */
    @Override
    public String toString() {
        return symbol;
    }
}
