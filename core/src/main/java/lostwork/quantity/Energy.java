package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * An energy: heat, work, exergy.
 *
 * <p>SI unit J. Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class Energy extends LinearQuantity<Energy> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<Energy, Energy> KIND = QuantityKind.linear(
            "energy",
            Energy.class,
            Dimension.MASS.times(Dimension.LENGTH.pow(2)).dividedBy(Dimension.TIME.pow(2)),
            Energy::new,
            1e6,
            List.of(
                    Units.KILOJOULE,
                    Units.JOULE,
                    Units.MEGAJOULE,
                    Units.GIGAJOULE,
                    Units.KILOWATT_HOUR,
                    Units.MEGAWATT_HOUR,
                    Units.GIGAWATT_HOUR,
                    Units.BTU));

    private Energy(double si) {
        super(si, KIND);
    }

    private Energy(double value, Unit<Energy> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return an energy in kilojoules}
     *
     * @param value the number of kilojoules
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Energy kilojoules(double value) {
        return new Energy(value, Units.KILOJOULE);
    }

    /**
     * {@return an energy in joules}
     *
     * @param value the number of joules
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Energy joules(double value) {
        return new Energy(value);
    }

    /**
     * {@return an energy in megajoules}
     *
     * @param value the number of megajoules
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Energy megajoules(double value) {
        return new Energy(value, Units.MEGAJOULE);
    }

    /**
     * {@return an energy in gigajoules}
     *
     * @param value the number of gigajoules
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Energy gigajoules(double value) {
        return new Energy(value, Units.GIGAJOULE);
    }

    /**
     * {@return an energy in kilowatt hours}
     *
     * @param value the number of kilowatt hours
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Energy kilowattHours(double value) {
        return new Energy(value, Units.KILOWATT_HOUR);
    }

    /**
     * {@return an energy in megawatt hours}
     *
     * @param value the number of megawatt hours
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Energy megawattHours(double value) {
        return new Energy(value, Units.MEGAWATT_HOUR);
    }

    /**
     * {@return an energy in gigawatt hours}
     *
     * @param value the number of gigawatt hours
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Energy gigawattHours(double value) {
        return new Energy(value, Units.GIGAWATT_HOUR);
    }

    /**
     * {@return an energy in British thermal units (International Table)}
     *
     * @param value the number of British thermal units (International Table)
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Energy btu(double value) {
        return new Energy(value, Units.BTU);
    }

    /**
     * {@return an energy from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static Energy of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the energy that a text states, such as {@code "12.5 kJ"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
     */
    public static Energy parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in kilojoules} */
    public double inKilojoules() {
        return Units.KILOJOULE.fromSi(si());
    }

    /** {@return the value in joules} */
    public double inJoules() {
        return si();
    }

    /** {@return the value in megajoules} */
    public double inMegajoules() {
        return Units.MEGAJOULE.fromSi(si());
    }

    /** {@return the value in gigajoules} */
    public double inGigajoules() {
        return Units.GIGAJOULE.fromSi(si());
    }

    /** {@return the value in kilowatt hours} */
    public double inKilowattHours() {
        return Units.KILOWATT_HOUR.fromSi(si());
    }

    /** {@return the value in megawatt hours} */
    public double inMegawattHours() {
        return Units.MEGAWATT_HOUR.fromSi(si());
    }

    /** {@return the value in gigawatt hours} */
    public double inGigawattHours() {
        return Units.GIGAWATT_HOUR.fromSi(si());
    }

    /** {@return the value in British thermal units (International Table)} */
    public double inBtu() {
        return Units.BTU.fromSi(si());
    }

    /**
     * {@return this energy divided by a duration}
     *
     * @param duration the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public Power over(Duration duration) {
        return Power.watts(si() / duration.si());
    }

    /**
     * {@return this energy divided by a mass}
     *
     * @param mass the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public SpecificEnergy over(Mass mass) {
        return SpecificEnergy.joulesPerKilogram(si() / mass.si());
    }

    /**
     * {@return this energy divided by an amount of substance}
     *
     * @param amountOfSubstance the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public MolarEnergy over(AmountOfSubstance amountOfSubstance) {
        return MolarEnergy.joulesPerMole(si() / amountOfSubstance.si());
    }

    /**
     * {@return this energy times an energy price}
     *
     * @param energyPrice the other factor
     */
    public Money times(EnergyPrice energyPrice) {
        return Money.of(si() * energyPrice.si());
    }

    /**
     * {@return this energy times an emission factor}
     *
     * @param emissionFactor the other factor
     */
    public Mass times(EmissionFactor emissionFactor) {
        return Mass.kilograms(si() * emissionFactor.si());
    }

    /**
     * {@return this energy divided by an entropy: the mean temperature at which heat carries that entropy}
     *
     * @param entropy the divisor, not zero
     * @throws OutOfRangeException if the quotient is no temperature above 0 K, or the divisor is zero
     */
    public Temperature over(Entropy entropy) {
        return Temperature.kelvin(si() / entropy.si());
    }

    /**
     * {@return this energy divided by a molar energy}
     *
     * @param molarEnergy the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public AmountOfSubstance over(MolarEnergy molarEnergy) {
        return AmountOfSubstance.moles(si() / molarEnergy.si());
    }

    /**
     * {@return this energy divided by a power}
     *
     * @param power the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public Duration over(Power power) {
        return Duration.seconds(si() / power.si());
    }

    /**
     * {@return this energy divided by a pressure difference}
     *
     * @param pressureDifference the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public Volume over(PressureDifference pressureDifference) {
        return Volume.cubicMetres(si() / pressureDifference.si());
    }

    /**
     * {@return this energy divided by a specific energy}
     *
     * @param specificEnergy the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public Mass over(SpecificEnergy specificEnergy) {
        return Mass.kilograms(si() / specificEnergy.si());
    }

    /**
     * {@return this energy divided by a volume}
     *
     * @param volume the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public PressureDifference over(Volume volume) {
        return PressureDifference.pascals(si() / volume.si());
    }

    @Override
    public QuantityKind<Energy, Energy> kind() {
        return KIND;
    }

    @Override
    protected Energy with(double si) {
        return new Energy(si);
    }
}
