package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * Money per time.
 *
 * <p>SI unit ¤/s. Any finite value exists. Immutable and thread-safe.
 */
public final class MoneyRate extends LinearQuantity<MoneyRate> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<MoneyRate, MoneyRate> KIND = QuantityKind.linear(
            "money rate",
            MoneyRate.class,
            new Dimension(0, 0, -1, 0, 0, 1),
            MoneyRate::new,
            1,
            List.of(Units.CURRENCY_PER_YEAR, Units.CURRENCY_PER_HOUR, Units.CURRENCY_PER_SECOND));

    private MoneyRate(double si) {
        super(si, KIND);
    }

    /**
     * {@return a money rate}
     *
     * @param value money rate in units of the currency per year of 8760 hours
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static MoneyRate perYear(double value) {
        return new MoneyRate(Units.CURRENCY_PER_YEAR.toSi(value));
    }

    /**
     * {@return a money rate}
     *
     * @param value money rate in units of the currency per hour
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static MoneyRate perHour(double value) {
        return new MoneyRate(Units.CURRENCY_PER_HOUR.toSi(value));
    }

    /**
     * {@return a money rate}
     *
     * @param value money rate in units of the currency per second
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static MoneyRate perSecond(double value) {
        return new MoneyRate(value);
    }

    /**
     * {@return a money rate from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension is another one, or the value is not allowed
     */
    public static MoneyRate of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the money rate that a text states, such as {@code "12.5 ¤/a"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws IllegalArgumentException if the text cannot be read as this quantity; the message lists what is accepted
     */
    public static MoneyRate parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in units of the currency per year of 8760 hours} */
    public double inPerYear() {
        return Units.CURRENCY_PER_YEAR.fromSi(si());
    }

    /** {@return the value in units of the currency per hour} */
    public double inPerHour() {
        return Units.CURRENCY_PER_HOUR.fromSi(si());
    }

    /** {@return the value in units of the currency per second} */
    public double inPerSecond() {
        return si();
    }

    /**
     * {@return the product with a duration}
     *
     * @param duration the other factor
     */
    public Money times(Duration duration) {
        return Money.of(si() * duration.si());
    }

    /**
     * {@return the quotient with a power}
     *
     * @param power the divisor, not zero
     * @throws IllegalArgumentException if the quotient is not finite
     */
    public EnergyPrice over(Power power) {
        return EnergyPrice.perJoule(si() / power.si());
    }

    @Override
    public QuantityKind<MoneyRate, MoneyRate> kind() {
        return KIND;
    }

    @Override
    protected MoneyRate with(double si) {
        return new MoneyRate(si);
    }
}
