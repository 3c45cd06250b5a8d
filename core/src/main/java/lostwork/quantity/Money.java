package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * An amount of money in one currency, which the caller knows; amounts in different currencies must not meet.
 *
 * <p>Any finite value exists. Immutable and thread-safe.
 */
public final class Money extends LinearQuantity<Money> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<Money, Money> KIND = QuantityKind.linear(
            "money", Money.class, new Dimension(0, 0, 0, 0, 0, 1), Money::new, 1e3, List.of(Units.CURRENCY_UNIT));

    private Money(double si) {
        super(si, KIND);
    }

    /**
     * {@return a money}
     *
     * @param value money in units of the currency
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Money of(double value) {
        return new Money(value);
    }

    /**
     * {@return a money from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension is another one, or the value is not allowed
     */
    public static Money of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the money that a text states, such as {@code "12.5 ¤"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws IllegalArgumentException if the text cannot be read as this quantity; the message lists what is accepted
     */
    public static Money parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in units of the currency} */
    public double amount() {
        return si();
    }

    /**
     * {@return the quotient with a duration}
     *
     * @param duration the divisor, not zero
     * @throws IllegalArgumentException if the quotient is not finite
     */
    public MoneyRate over(Duration duration) {
        return MoneyRate.perSecond(si() / duration.si());
    }

    /**
     * {@return the quotient with an energy}
     *
     * @param energy the divisor, not zero
     * @throws IllegalArgumentException if the quotient is not finite
     */
    public EnergyPrice over(Energy energy) {
        return EnergyPrice.perJoule(si() / energy.si());
    }

    /**
     * {@return the quotient with a mass}
     *
     * @param mass the divisor, not zero
     * @throws IllegalArgumentException if the quotient is not finite
     */
    public MassPrice over(Mass mass) {
        return MassPrice.perKilogram(si() / mass.si());
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
