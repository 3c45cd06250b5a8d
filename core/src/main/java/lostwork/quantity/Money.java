package lostwork.quantity;

import java.util.List;

/**
 * An amount of money in one currency, which the caller knows; amounts in different currencies must not meet.
 *
 * <p>Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class Money extends LinearQuantity<Money> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<Money, Money> KIND =
            QuantityKind.linear("money", Money.class, Dimension.MONEY, Money::new, 1e3, List.of(Units.CURRENCY_UNIT));

    private Money(double si) {
        super(si, KIND);
    }

    private Money(double value, Unit<Money> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return an amount of money in units of the currency}
     *
     * @param value the number of units of the currency
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Money of(double value) {
        return new Money(value);
    }

    /**
     * {@return the money that a text states, such as {@code "12.5 ¤"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
     */
    public static Money parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in units of the currency} */
    public double amount() {
        return si();
    }

    /**
     * {@return this amount of money divided by a duration}
     *
     * @param duration the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public MoneyRate over(Duration duration) {
        return MoneyRate.perSecond(si() / duration.si());
    }

    /**
     * {@return this amount of money divided by an energy}
     *
     * @param energy the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public EnergyPrice over(Energy energy) {
        return EnergyPrice.perJoule(si() / energy.si());
    }

    /**
     * {@return this amount of money divided by a mass}
     *
     * @param mass the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public MassPrice over(Mass mass) {
        return MassPrice.perKilogram(si() / mass.si());
    }

    /**
     * {@return this amount of money divided by an energy price}
     *
     * @param energyPrice the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public Energy over(EnergyPrice energyPrice) {
        return Energy.joules(si() / energyPrice.si());
    }

    /**
     * {@return this amount of money divided by a mass price}
     *
     * @param massPrice the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public Mass over(MassPrice massPrice) {
        return Mass.kilograms(si() / massPrice.si());
    }

    /**
     * {@return this amount of money divided by a money rate}
     *
     * @param moneyRate the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public Duration over(MoneyRate moneyRate) {
        return Duration.seconds(si() / moneyRate.si());
    }

    @Override
    public QuantityKind<Money, Money> kind() {
        return KIND;
    }

    @Override
    protected Money with(double si) {
        return new Money(si);
    }
}
