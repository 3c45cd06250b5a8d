package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * A plain number that compares two like quantities: an efficiency, a vapour fraction, a share.
 *
 * <p>Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class Ratio extends LinearQuantity<Ratio> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<Ratio, Ratio> KIND = QuantityKind.linear(
            "ratio",
            Ratio.class,
            Dimension.ONE,
            Ratio::new,
            1,
            List.of(Units.FRACTION, Units.PERCENT, Units.PER_MILLE, Units.PER_MILLION));

    private Ratio(double si) {
        super(si, KIND);
    }

    private Ratio(double value, Unit<Ratio> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return a ratio in parts of one}
     *
     * @param value the number of parts of one
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Ratio fraction(double value) {
        return new Ratio(value);
    }

    /**
     * {@return a ratio in percent}
     *
     * @param value the number of percent
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Ratio percent(double value) {
        return new Ratio(value, Units.PERCENT);
    }

    /**
     * {@return a ratio in parts per million}
     *
     * @param value the number of parts per million
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Ratio partsPerMillion(double value) {
        return new Ratio(value, Units.PER_MILLION);
    }

    /**
     * {@return a ratio from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static Ratio of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the ratio that a text states, such as {@code "0.88"} or {@code "88 %"}}
     *
     * @param text a number with a decimal point, then perhaps a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
     */
    public static Ratio parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in parts of one} */
    public double inFraction() {
        return si();
    }

    /** {@return the value in percent} */
    public double inPercent() {
        return Units.PERCENT.fromSi(si());
    }

    /** {@return the value in parts per million} */
    public double inPartsPerMillion() {
        return Units.PER_MILLION.fromSi(si());
    }

    /** {@return the rest to one: 1 less this ratio, such as the lost share of an efficiency} */
    public Ratio complement() {
        return new Ratio(1 - si());
    }

    @Override
    public QuantityKind<Ratio, Ratio> kind() {
        return KIND;
    }

    @Override
    protected Ratio with(double si) {
        return new Ratio(si);
    }
}
