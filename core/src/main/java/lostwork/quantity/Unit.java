package lostwork.quantity;

import java.util.List;

/**
 * A unit of one kind of quantity: {@code value in SI = (value + offset) × numerator ÷ denominator}.
 *
 * <p>The units that the library knows stand in {@link Units}; others are made with {@link #of} or {@link #ofQuotient}.
 * The factor is kept as a quotient of two numbers, so that decimal parts come out correctly rounded: 57 % is the same
 * {@code double} as 0.57, which 57 × 0.01 is not. Immutable and thread-safe.
 *
 * @param <Q> the quantity that the unit measures
 */
public final class Unit<Q> {
    /** The symbol of the unit one, which is not written after a number. */
    static final String ONE_SYMBOL = "1";

    private final String symbol;
    private final double numerator;
    private final double denominator;
    private final double offset;
    private final List<String> spellings;

    private Unit(String symbol, double numerator, double denominator, double offset, List<String> spellings) {
        if (symbol.isBlank()) {
            throw new IllegalArgumentException("a unit needs a symbol that can be printed and read");
        }
        final double factor = numerator / denominator;
        if (!(numerator > 0 && denominator > 0 && factor > 0 && factor < Double.POSITIVE_INFINITY)) {
            throw new IllegalArgumentException("unit " + symbol + ": its factor " + numerator + " / " + denominator
                    + " must be finite and above 0");
        }
        if (!Double.isFinite(offset)) {
            throw new IllegalArgumentException("unit " + symbol + ": its offset " + offset + " must be finite");
        }
        this.symbol = symbol;
        this.numerator = numerator;
        this.denominator = denominator;
        this.offset = offset;
        this.spellings = spellings;
    }

    /**
     * {@return a unit}
     *
     * @param <Q> the quantity that the unit measures
     * @param symbol how the unit is printed, and read
     * @param factor how many coherent SI units one of this unit is, above 0
     * @param spellings further ways to write the unit that the reader accepts; variants such as {@code m3} for
     *     {@code m³} or {@code J kg⁻¹} for {@code J/kg} are read without being listed
     * @throws IllegalArgumentException if the symbol is blank, or the factor is not finite and above 0
     */
    public static <Q> Unit<Q> of(String symbol, double factor, String... spellings) {
        return new Unit<>(symbol, factor, 1, 0, List.of(spellings));
    }

    /**
     * {@return a unit whose factor is a quotient, such as 1000 / 3600 for t/h in kg/s}
     *
     * @param <Q> the quantity that the unit measures
     * @param symbol how the unit is printed, and read
     * @param numerator the numerator of the factor, above 0
     * @param denominator the denominator of the factor, above 0
     * @param spellings further ways to write the unit that the reader accepts
     * @throws IllegalArgumentException if the symbol is blank, or the factor is not finite and above 0
     */
    public static <Q> Unit<Q> ofQuotient(String symbol, double numerator, double denominator, String... spellings) {
        return new Unit<>(symbol, numerator, denominator, 0, List.of(spellings));
    }

    /**
     * {@return a unit of a scale whose zero is not the zero of the SI scale, such as °C}
     *
     * @param <Q> the quantity that the unit measures
     * @param symbol how the unit is printed, and read
     * @param numerator the numerator of the factor, above 0
     * @param denominator the denominator of the factor, above 0
     * @param offset what is added to a value in this unit before it is multiplied by the factor
     * @param spellings further ways to write the unit that the reader accepts
     * @throws IllegalArgumentException if the symbol is blank, the factor is not finite and above 0, or the offset is
     *     not finite
     */
    public static <Q> Unit<Q> withOffset(
            String symbol, double numerator, double denominator, double offset, String... spellings) {
        return new Unit<>(symbol, numerator, denominator, offset, List.of(spellings));
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
        return numerator / denominator;
    }

    /** {@return what is added to a value in this unit before it is multiplied by the factor; 0 for most units} */
    public double offset() {
        return offset;
    }

    /** {@return whether this is the coherent SI unit itself: factor 1, offset 0} */
    public boolean isCoherent() {
        return numerator == denominator && offset == 0;
    }

    /**
     * {@return a value in the coherent SI unit}
     *
     * @param value the value in this unit
     */
    public double toSi(double value) {
        final double scaled = (value + offset) * numerator;
        return denominator == 1 ? scaled : scaled / denominator;
    }

    /**
     * {@return a value in this unit}
     *
     * @param si the value in the coherent SI unit
     */
    public double fromSi(double si) {
        return (denominator == 1 ? si : si * denominator) / numerator - offset;
    }

    /** {@return the symbol} */
    @Override
    public String toString() {
        return symbol;
    }
}
