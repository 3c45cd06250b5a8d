package lostwork.quantity;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.RoundingMode;
import java.util.List;
import javax.measure.Quantity;

/**
 * A length of time, such as the hours a year that a stream flows.
 *
 * <p>SI unit s. Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class Duration extends LinearQuantity<Duration> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<Duration, Duration> KIND = QuantityKind.linear(
            "duration",
            Duration.class,
            Dimension.TIME,
            Duration::new,
            3600,
            List.of(Units.HOUR, Units.SECOND, Units.MINUTE, Units.DAY, Units.YEAR));

    private Duration(double si) {
        super(si, KIND);
    }

    private Duration(double value, Unit<Duration> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return a duration in hours}
     *
     * @param value the number of hours
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Duration hours(double value) {
        return new Duration(value, Units.HOUR);
    }

    /**
     * {@return a duration in seconds}
     *
     * @param value the number of seconds
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Duration seconds(double value) {
        return new Duration(value);
    }

    /**
     * {@return a duration in minutes}
     *
     * @param value the number of minutes
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Duration minutes(double value) {
        return new Duration(value, Units.MINUTE);
    }

    /**
     * {@return a duration in days}
     *
     * @param value the number of days
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Duration days(double value) {
        return new Duration(value, Units.DAY);
    }

    /**
     * {@return a duration in years of 8760 hours}
     *
     * @param value the number of years of 8760 hours
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Duration years(double value) {
        return new Duration(value, Units.YEAR);
    }

    /**
     * {@return a duration from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static Duration of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return a duration from one of the Java library}
     *
     * @param duration the duration of the Java library
     */
    public static Duration of(java.time.Duration duration) {
        return new Duration(duration.getSeconds() + duration.getNano() / 1e9);
    }

    /**
     * {@return the duration that a text states, such as {@code "12.5 h"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
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
     * {@return this duration times a power}
     *
     * @param power the other factor
     */
    public Energy times(Power power) {
        return Energy.joules(si() * power.si());
    }

    /**
     * {@return this duration times a mass flow}
     *
     * @param massFlow the other factor
     */
    public Mass times(MassFlow massFlow) {
        return Mass.kilograms(si() * massFlow.si());
    }

    /**
     * {@return this duration times a money rate}
     *
     * @param moneyRate the other factor
     */
    public Money times(MoneyRate moneyRate) {
        return Money.of(si() * moneyRate.si());
    }

    /**
     * {@return this duration times a volume flow}
     *
     * @param volumeFlow the other factor
     */
    public Volume times(VolumeFlow volumeFlow) {
        return Volume.cubicMetres(si() * volumeFlow.si());
    }

    /**
     * {@return this duration times an entropy rate}
     *
     * @param entropyRate the other factor
     */
    public Entropy times(EntropyRate entropyRate) {
        return Entropy.joulesPerKelvin(si() * entropyRate.si());
    }

    /**
     * {@return this duration times a molar flow}
     *
     * @param molarFlow the other factor
     */
    public AmountOfSubstance times(MolarFlow molarFlow) {
        return AmountOfSubstance.moles(si() * molarFlow.si());
    }

    /**
     * {@return this duration times a speed}
     *
     * @param speed the other factor
     */
    public Length times(Speed speed) {
        return Length.metres(si() * speed.si());
    }

    /**
     * {@return this duration as one of the Java library, rounded to a nanosecond}
     *
     * @throws ArithmeticException if it is longer than that type can hold, some 292 thousand million years
     */
    public java.time.Duration toJavaTime() {
        final BigDecimal nanoseconds = new BigDecimal(si()).movePointRight(9).setScale(0, RoundingMode.HALF_EVEN);
        final BigInteger[] parts = nanoseconds.toBigInteger().divideAndRemainder(BigInteger.valueOf(1_000_000_000));
        return java.time.Duration.ofSeconds(parts[0].longValueExact(), parts[1].longValueExact());
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
