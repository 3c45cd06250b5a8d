package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * Money per energy.
 *
 * <p>SI unit ¤/J. Any finite value exists. Immutable and thread-safe.
 */
public final class EnergyPrice extends LinearQuantity<EnergyPrice> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<EnergyPrice, EnergyPrice> KIND = QuantityKind.linear(
            "energy price",
            EnergyPrice.class,
            new Dimension(-2, -1, 2, 0, 0, 1),
            EnergyPrice::new,
            1e-8,
            List.of(
                    Units.CURRENCY_PER_MEGAWATT_HOUR,
                    Units.CURRENCY_PER_KILOWATT_HOUR,
                    Units.CURRENCY_PER_GIGAJOULE,
                    Units.CURRENCY_PER_JOULE));

    private EnergyPrice(double si) {
        super(si, KIND);
    }

    /**
     * {@return an energy price}
     *
     * @param value energy price in units of the currency per megawatt hour
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static EnergyPrice perMegawattHour(double value) {
        return new EnergyPrice(Units.CURRENCY_PER_MEGAWATT_HOUR.toSi(value));
    }

    /**
     * {@return an energy price}
     *
     * @param value energy price in units of the currency per kilowatt hour
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static EnergyPrice perKilowattHour(double value) {
        return new EnergyPrice(Units.CURRENCY_PER_KILOWATT_HOUR.toSi(value));
    }

    /**
     * {@return an energy price}
     *
     * @param value energy price in units of the currency per gigajoule
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static EnergyPrice perGigajoule(double value) {
        return new EnergyPrice(Units.CURRENCY_PER_GIGAJOULE.toSi(value));
    }

    /**
     * {@return an energy price}
     *
     * @param value energy price in units of the currency per joule
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static EnergyPrice perJoule(double value) {
        return new EnergyPrice(value);
    }

    /**
     * {@return an energy price from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension is another one, or the value is not allowed
     */
    public static EnergyPrice of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the energy price that a text states, such as {@code "12.5 ¤/MWh"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws IllegalArgumentException if the text cannot be read as this quantity; the message lists what is accepted
     */
    public static EnergyPrice parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in units of the currency per megawatt hour} */
    public double inPerMegawattHour() {
        return Units.CURRENCY_PER_MEGAWATT_HOUR.fromSi(si());
    }

    /** {@return the value in units of the currency per kilowatt hour} */
    public double inPerKilowattHour() {
        return Units.CURRENCY_PER_KILOWATT_HOUR.fromSi(si());
    }

    /** {@return the value in units of the currency per gigajoule} */
    public double inPerGigajoule() {
        return Units.CURRENCY_PER_GIGAJOULE.fromSi(si());
    }

    /** {@return the value in units of the currency per joule} */
    public double inPerJoule() {
        return si();
    }

    /**
     * {@return the product with an energy}
     *
     * @param energy the other factor
     */
    public Money times(Energy energy) {
        return Money.of(si() * energy.si());
    }

    /**
     * {@return the product with a power}
     *
     * @param power the other factor
     */
    public MoneyRate times(Power power) {
        return MoneyRate.perSecond(si() * power.si());
    }

    @Override
    public QuantityKind<EnergyPrice, EnergyPrice> kind() {
        return KIND;
    }

    @Override
    protected EnergyPrice with(double si) {
        return new EnergyPrice(si);
    }
}
