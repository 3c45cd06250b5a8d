package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * Money per mass, such as the price of a fuel or of emitted carbon dioxide.
 *
 * <p>SI unit ¤/kg. Any finite value exists. Immutable and thread-safe.
 */
public final class MassPrice extends LinearQuantity<MassPrice> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<MassPrice, MassPrice> KIND = QuantityKind.linear(
            "mass price",
            MassPrice.class,
            new Dimension(0, -1, 0, 0, 0, 1),
            MassPrice::new,
            0.1,
            List.of(Units.CURRENCY_PER_TONNE, Units.CURRENCY_PER_KILOGRAM));

    private MassPrice(double si) {
        super(si, KIND);
    }

    /**
     * {@return a mass price}
     *
     * @param value mass price in units of the currency per tonne
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static MassPrice perTonne(double value) {
        return new MassPrice(Units.CURRENCY_PER_TONNE.toSi(value));
    }

    /**
     * {@return a mass price}
     *
     * @param value mass price in units of the currency per kilogram
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static MassPrice perKilogram(double value) {
        return new MassPrice(value);
    }

    /**
     * {@return a mass price from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension is another one, or the value is not allowed
     */
    public static MassPrice of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the mass price that a text states, such as {@code "12.5 ¤/t"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws IllegalArgumentException if the text cannot be read as this quantity; the message lists what is accepted
     */
    public static MassPrice parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in units of the currency per tonne} */
    public double inPerTonne() {
        return Units.CURRENCY_PER_TONNE.fromSi(si());
    }

    /** {@return the value in units of the currency per kilogram} */
    public double inPerKilogram() {
        return si();
    }

    /**
     * {@return the product with a mass}
     *
     * @param mass the other factor
     */
    public Money times(Mass mass) {
        return Money.of(si() * mass.si());
    }

    /**
     * {@return the product with a mass flow}
     *
     * @param massFlow the other factor
     */
    public MoneyRate times(MassFlow massFlow) {
        return MoneyRate.perSecond(si() * massFlow.si());
    }

    @Override
    public QuantityKind<MassPrice, MassPrice> kind() {
        return KIND;
    }

    @Override
    protected MassPrice with(double si) {
        return new MassPrice(si);
    }
}
