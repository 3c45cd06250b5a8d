package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * An energy per mass: specific enthalpy, internal energy, exergy, work.
 *
 * <p>SI unit J/kg. Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class SpecificEnergy extends LinearQuantity<SpecificEnergy> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<SpecificEnergy, SpecificEnergy> KIND = QuantityKind.linear(
            "specific energy",
            SpecificEnergy.class,
            Dimension.LENGTH.pow(2).dividedBy(Dimension.TIME.pow(2)),
            SpecificEnergy::new,
            1e5,
            List.of(
                    Units.KILOJOULE_PER_KILOGRAM,
                    Units.JOULE_PER_KILOGRAM,
                    Units.MEGAJOULE_PER_KILOGRAM,
                    Units.KILOWATT_HOUR_PER_KILOGRAM,
                    Units.BTU_PER_POUND));

    private SpecificEnergy(double si) {
        super(si, KIND);
    }

    private SpecificEnergy(double value, Unit<SpecificEnergy> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return a specific energy in kilojoules per kilogram}
     *
     * @param value the number of kilojoules per kilogram
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static SpecificEnergy kilojoulesPerKilogram(double value) {
        return new SpecificEnergy(value, Units.KILOJOULE_PER_KILOGRAM);
    }

    /**
     * {@return a specific energy in joules per kilogram}
     *
     * @param value the number of joules per kilogram
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static SpecificEnergy joulesPerKilogram(double value) {
        return new SpecificEnergy(value);
    }

    /**
     * {@return a specific energy in megajoules per kilogram}
     *
     * @param value the number of megajoules per kilogram
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static SpecificEnergy megajoulesPerKilogram(double value) {
        return new SpecificEnergy(value, Units.MEGAJOULE_PER_KILOGRAM);
    }

    /**
     * {@return a specific energy in kilowatt hours per kilogram}
     *
     * @param value the number of kilowatt hours per kilogram
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static SpecificEnergy kilowattHoursPerKilogram(double value) {
        return new SpecificEnergy(value, Units.KILOWATT_HOUR_PER_KILOGRAM);
    }

    /**
     * {@return a specific energy in British thermal units (International Table) per pound}
     *
     * @param value the number of British thermal units (International Table) per pound
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static SpecificEnergy btuPerPound(double value) {
        return new SpecificEnergy(value, Units.BTU_PER_POUND);
    }

    /**
     * {@return a specific energy from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static SpecificEnergy of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the specific energy that a text states, such as {@code "12.5 kJ/kg"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
     */
    public static SpecificEnergy parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in kilojoules per kilogram} */
    public double inKilojoulesPerKilogram() {
        return Units.KILOJOULE_PER_KILOGRAM.fromSi(si());
    }

    /** {@return the value in joules per kilogram} */
    public double inJoulesPerKilogram() {
        return si();
    }

    /** {@return the value in megajoules per kilogram} */
    public double inMegajoulesPerKilogram() {
        return Units.MEGAJOULE_PER_KILOGRAM.fromSi(si());
    }

    /** {@return the value in kilowatt hours per kilogram} */
    public double inKilowattHoursPerKilogram() {
        return Units.KILOWATT_HOUR_PER_KILOGRAM.fromSi(si());
    }

    /** {@return the value in British thermal units (International Table) per pound} */
    public double inBtuPerPound() {
        return Units.BTU_PER_POUND.fromSi(si());
    }

    /**
     * {@return this specific energy times a mass flow}
     *
     * @param massFlow the other factor
     */
    public Power times(MassFlow massFlow) {
        return Power.watts(si() * massFlow.si());
    }

    /**
     * {@return this specific energy times a mass}
     *
     * @param mass the other factor
     */
    public Energy times(Mass mass) {
        return Energy.joules(si() * mass.si());
    }

    /**
     * {@return this specific energy times a molar mass}
     *
     * @param molarMass the other factor
     */
    public MolarEnergy times(MolarMass molarMass) {
        return MolarEnergy.joulesPerMole(si() * molarMass.si());
    }

    /**
     * {@return this specific energy divided by a temperature span}
     *
     * @param temperatureSpan the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public SpecificHeatCapacity over(TemperatureSpan temperatureSpan) {
        return SpecificHeatCapacity.joulesPerKilogramKelvin(si() / temperatureSpan.si());
    }

    /**
     * {@return this specific energy divided by a specific heat capacity}
     *
     * @param specificHeatCapacity the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public TemperatureSpan over(SpecificHeatCapacity specificHeatCapacity) {
        return TemperatureSpan.kelvins(si() / specificHeatCapacity.si());
    }

    /**
     * {@return this specific energy times a density}
     *
     * @param density the other factor
     */
    public PressureDifference times(Density density) {
        return PressureDifference.pascals(si() * density.si());
    }

    /**
     * {@return this specific energy times an energy price}
     *
     * @param energyPrice the other factor
     */
    public MassPrice times(EnergyPrice energyPrice) {
        return MassPrice.perKilogram(si() * energyPrice.si());
    }

    /**
     * {@return this specific energy divided by a pressure difference}
     *
     * @param pressureDifference the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public SpecificVolume over(PressureDifference pressureDifference) {
        return SpecificVolume.cubicMetresPerKilogram(si() / pressureDifference.si());
    }

    /**
     * {@return this specific energy divided by a specific entropy: the mean temperature at which heat carries that entropy}
     *
     * @param specificEntropy the divisor, not zero
     * @throws OutOfRangeException if the quotient is no temperature above 0 K, or the divisor is zero
     */
    public Temperature over(SpecificEntropy specificEntropy) {
        return Temperature.kelvin(si() / specificEntropy.si());
    }

    /**
     * {@return this specific energy divided by a specific volume}
     *
     * @param specificVolume the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public PressureDifference over(SpecificVolume specificVolume) {
        return PressureDifference.pascals(si() / specificVolume.si());
    }

    @Override
    public QuantityKind<SpecificEnergy, SpecificEnergy> kind() {
        return KIND;
    }

    @Override
    protected SpecificEnergy with(double si) {
        return new SpecificEnergy(si);
    }
}
