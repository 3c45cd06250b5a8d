package lostwork.quantity;

import java.util.List;

/**
 * Money per energy.
 *
 * <p>Coherent unit ¤/J. Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class EnergyPrice extends LinearQuantity<EnergyPrice> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<EnergyPrice, EnergyPrice> KIND = QuantityKind.linear(
            "energy price",
            EnergyPrice.class,
            Dimension.MONEY
                    .times(Dimension.TIME.pow(2))
                    .dividedBy(Dimension.MASS)
                    .dividedBy(Dimension.LENGTH.pow(2)),
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

    private EnergyPrice(double value, Unit<EnergyPrice> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return an energy price in units of the currency per megawatt hour}
     *
     * @param value the number of units of the currency per megawatt hour
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static EnergyPrice perMegawattHour(double value) {
        return new EnergyPrice(value, Units.CURRENCY_PER_MEGAWATT_HOUR);
    }

    /**
     * {@return an energy price in units of the currency per kilowatt hour}
     *
     * @param value the number of units of the currency per kilowatt hour
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static EnergyPrice perKilowattHour(double value) {
        return new EnergyPrice(value, Units.CURRENCY_PER_KILOWATT_HOUR);
    }

    /**
     * {@return an energy price in units of the currency per gigajoule}
     *
     * @param value the number of units of the currency per gigajoule
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static EnergyPrice perGigajoule(double value) {
        return new EnergyPrice(value, Units.CURRENCY_PER_GIGAJOULE);
    }

    /**
     * {@return an energy price in units of the currency per joule}
     *
     * @param value the number of units of the currency per joule
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static EnergyPrice perJoule(double value) {
        return new EnergyPrice(value);
    }

    /**
     * {@return the energy price that a text states, such as {@code "12.5 ¤/MWh"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
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
     * {@return this energy price times an energy}
     *
     * @param energy the other factor
     */
    public Money times(Energy energy) {
        return Money.of(si() * energy.si());
    }

    /**
     * {@return this energy price times a power}
     *
     * @param power the other factor
     */
    public MoneyRate times(Power power) {
        return MoneyRate.perSecond(si() * power.si());
    }

    /**
     * {@return this energy price times a specific energy}
     *
     * @param specificEnergy the other factor
     */
    public MassPrice times(SpecificEnergy specificEnergy) {
        return MassPrice.perKilogram(si() * specificEnergy.si());
    }

    /**
     * {@return this energy price divided by an emission factor}
     *
     * @param emissionFactor the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public MassPrice over(EmissionFactor emissionFactor) {
        return MassPrice.perKilogram(si() / emissionFactor.si());
    }

    /**
     * {@return this energy price divided by a mass price}
     *
     * @param massPrice the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public EmissionFactor over(MassPrice massPrice) {
        return EmissionFactor.kilogramsPerJoule(si() / massPrice.si());
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
