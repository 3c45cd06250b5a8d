package lostwork.quantity;

import java.util.List;

/**
 * Money per mass, such as the price of a fuel or of emitted carbon dioxide.
 *
 * <p>Coherent unit ¤/kg. Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class MassPrice extends LinearQuantity<MassPrice> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<MassPrice, MassPrice> KIND = QuantityKind.linear(
            "mass price",
            MassPrice.class,
            Dimension.MONEY.dividedBy(Dimension.MASS),
            MassPrice::new,
            0.1,
            List.of(Units.CURRENCY_PER_TONNE, Units.CURRENCY_PER_KILOGRAM));

    private MassPrice(double si) {
        super(si, KIND);
    }

    private MassPrice(double value, Unit<MassPrice> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return a mass price in units of the currency per tonne}
     *
     * @param value the number of units of the currency per tonne
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static MassPrice perTonne(double value) {
        return new MassPrice(value, Units.CURRENCY_PER_TONNE);
    }

    /**
     * {@return a mass price in units of the currency per kilogram}
     *
     * @param value the number of units of the currency per kilogram
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static MassPrice perKilogram(double value) {
        return new MassPrice(value);
    }

    /**
     * {@return the mass price that a text states, such as {@code "12.5 ¤/t"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
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
     * {@return this mass price times a mass}
     *
     * @param mass the other factor
     */
    public Money times(Mass mass) {
        return Money.of(si() * mass.si());
    }

    /**
     * {@return this mass price times a mass flow}
     *
     * @param massFlow the other factor
     */
    public MoneyRate times(MassFlow massFlow) {
        return MoneyRate.perSecond(si() * massFlow.si());
    }

    /**
     * {@return this mass price times an emission factor}
     *
     * @param emissionFactor the other factor
     */
    public EnergyPrice times(EmissionFactor emissionFactor) {
        return EnergyPrice.perJoule(si() * emissionFactor.si());
    }

    /**
     * {@return this mass price divided by an energy price}
     *
     * @param energyPrice the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public SpecificEnergy over(EnergyPrice energyPrice) {
        return SpecificEnergy.joulesPerKilogram(si() / energyPrice.si());
    }

    /**
     * {@return this mass price divided by a specific energy}
     *
     * @param specificEnergy the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public EnergyPrice over(SpecificEnergy specificEnergy) {
        return EnergyPrice.perJoule(si() / specificEnergy.si());
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
