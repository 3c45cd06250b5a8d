package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * A plain number that compares two like quantities: an efficiency, a vapour fraction, a share.
 *
 * <p>Any finite value exists. Immutable and thread-safe.
 */
public final class Ratio extends LinearQuantity<Ratio> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<Ratio, Ratio> KIND = QuantityKind.linear(
            "ratio",
            Ratio.class,
            new Dimension(0, 0, 0, 0, 0, 0),
            Ratio::new,
            1,
            List.of(Units.FRACTION, Units.PERCENT, Units.PER_MILLION));

    private Ratio(double si) {
        super(si, KIND);
    }

    /**
     * {@return a ratio}
     *
     * @param value ratio in parts of one
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Ratio fraction(double value) {
        return new Ratio(value);
    }

    /**
     * {@return a ratio}
     *
     * @param value ratio in percent
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Ratio percent(double value) {
        return new Ratio(Units.PERCENT.toSi(value));
    }

    /**
     * {@return a ratio}
     *
     * @param value ratio in parts per million
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Ratio partsPerMillion(double value) {
        return new Ratio(Units.PER_MILLION.toSi(value));
    }

    /**
     * {@return a ratio from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension is another one, or the value is not allowed
     */
    public static Ratio of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the ratio that a text states, such as {@code "12.5 1"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws IllegalArgumentException if the text cannot be read as this quantity; the message lists what is accepted
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

    @Override
    public QuantityKind<Ratio, Ratio> kind() {
        return KIND;
    }

    @Override
    protected Ratio with(double si) {
        return new Ratio(si);
    }
}
