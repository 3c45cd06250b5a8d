package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * A length of time, such as the hours a year that a stream flows.
 *
 * <p>SI unit s. Any finite value exists. Immutable and thread-safe.
 */
public final class Duration extends LinearQuantity<Duration> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<Duration, Duration> KIND = QuantityKind.linear(
            "duration",
            Duration.class,
            new Dimension(0, 0, 1, 0, 0, 0),
            Duration::new,
            3600,
            List.of(Units.HOUR, Units.SECOND, Units.MINUTE, Units.DAY, Units.YEAR));

    private Duration(double si) {
        super(si, KIND);
    }

    /**
     * {@return a duration}
     *
     * @param value duration in hours
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Duration hours(double value) {
        return new Duration(Units.HOUR.toSi(value));
    }

    /**
     * {@return a duration}
     *
     * @param value duration in seconds
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Duration seconds(double value) {
        return new Duration(value);
    }

    /**
     * {@return a duration}
     *
     * @param value duration in minutes
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Duration minutes(double value) {
        return new Duration(Units.MINUTE.toSi(value));
    }

    /**
     * {@return a duration}
     *
     * @param value duration in days
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Duration days(double value) {
        return new Duration(Units.DAY.toSi(value));
    }

    /**
     * {@return a duration}
     *
     * @param value duration in years of 8760 hours
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Duration years(double value) {
        return new Duration(Units.YEAR.toSi(value));
    }

    /**
     * {@return a duration from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension is another one, or the value is not allowed
     */
    public static Duration of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the duration that a text states, such as {@code "12.5 h"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws IllegalArgumentException if the text cannot be read as this quantity; the message lists what is accepted
     */
    public static Duration parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in hours} */
    public double inHours() {
        return Units.HOUR.fromSi(si());
    }

    /** {@return the value in seconds} */
    public double inSeconds() {
        return si();
    }

    /** {@return the value in minutes} */
    public double inMinutes() {
        return Units.MINUTE.fromSi(si());
    }

    /** {@return the value in days} */
    public double inDays() {
        return Units.DAY.fromSi(si());
    }

    /** {@return the value in years of 8760 hours} */
    public double inYears() {
        return Units.YEAR.fromSi(si());
    }

    /**
     * {@return the product with a power}
     *
     * @param power the other factor
     */
    public Energy times(Power power) {
        return Energy.joules(si() * power.si());
    }

    /**
     * {@return the product with a mass flow}
     *
     * @param massFlow the other factor
     */
    public Mass times(MassFlow massFlow) {
        return Mass.kilograms(si() * massFlow.si());
    }

    /**
     * {@return the product with a money rate}
     *
     * @param moneyRate the other factor
     */
    public Money times(MoneyRate moneyRate) {
        return Money.of(si() * moneyRate.si());
    }

    /**
     * {@return the product with a volume flow}
     *
     * @param volumeFlow the other factor
     */
    public Volume times(VolumeFlow volumeFlow) {
        return Volume.cubicMetres(si() * volumeFlow.si());
    }

    @Override
    public QuantityKind<Duration, Duration> kind() {
        return KIND;
    }

    @Override
    protected Duration with(double si) {
        return new Duration(si);
    }
}
