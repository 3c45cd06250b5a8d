package lostwork.quantity;

import java.util.List;

/**
 * Money per time.
 *
 * <p>Coherent unit ¤/s. Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class MoneyRate extends LinearQuantity<MoneyRate> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<MoneyRate, MoneyRate> KIND = QuantityKind.linear(
            "money rate",
            MoneyRate.class,
            Dimension.MONEY.dividedBy(Dimension.TIME),
            MoneyRate::new,
            1,
            List.of(Units.CURRENCY_PER_YEAR, Units.CURRENCY_PER_HOUR, Units.CURRENCY_PER_SECOND));

    private MoneyRate(double si) {
        super(si, KIND);
    }

    private MoneyRate(double value, Unit<MoneyRate> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return a money rate in units of the currency per year of 8760 hours}
     *
     * @param value the number of units of the currency per year of 8760 hours
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static MoneyRate perYear(double value) {
        return new MoneyRate(value, Units.CURRENCY_PER_YEAR);
    }

    /**
     * {@return a money rate in units of the currency per hour}
     *
     * @param value the number of units of the currency per hour
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static MoneyRate perHour(double value) {
        return new MoneyRate(value, Units.CURRENCY_PER_HOUR);
    }

    /**
     * {@return a money rate in units of the currency per second}
     *
     * @param value the number of units of the currency per second
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static MoneyRate perSecond(double value) {
        return new MoneyRate(value);
    }

    /**
     * {@return the money rate that a text states, such as {@code "12.5 ¤/a"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
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
     * {@return this money rate times a duration}
     *
     * @param duration the other factor
     */
    public Money times(Duration duration) {
        return Money.of(si() * duration.si());
    }

    /**
     * {@return this money rate divided by a power}
     *
     * @param power the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public EnergyPrice over(Power power) {
        return EnergyPrice.perJoule(si() / power.si());
    }

    /**
     * {@return this money rate divided by an energy price}
     *
     * @param energyPrice the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public Power over(EnergyPrice energyPrice) {
        return Power.watts(si() / energyPrice.si());
    }

    /**
     * {@return this money rate divided by a mass flow}
     *
     * @param massFlow the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public MassPrice over(MassFlow massFlow) {
        return MassPrice.perKilogram(si() / massFlow.si());
    }

    /**
     * {@return this money rate divided by a mass price}
     *
     * @param massPrice the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public MassFlow over(MassPrice massPrice) {
        return MassFlow.kilogramsPerSecond(si() / massPrice.si());
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
