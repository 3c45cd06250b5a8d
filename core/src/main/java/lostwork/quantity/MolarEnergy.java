package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * An energy per amount of substance.
 *
 * <p>SI unit J/mol. Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class MolarEnergy extends LinearQuantity<MolarEnergy> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<MolarEnergy, MolarEnergy> KIND = QuantityKind.linear(
            "molar energy",
            MolarEnergy.class,
            Dimension.MASS
                    .times(Dimension.LENGTH.pow(2))
                    .dividedBy(Dimension.AMOUNT)
                    .dividedBy(Dimension.TIME.pow(2)),
            MolarEnergy::new,
            1e4,
            List.of(Units.KILOJOULE_PER_MOLE, Units.JOULE_PER_MOLE));

    private MolarEnergy(double si) {
        super(si, KIND);
    }

    private MolarEnergy(double value, Unit<MolarEnergy> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return a molar energy in kilojoules per mole}
     *
     * @param value the number of kilojoules per mole
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static MolarEnergy kilojoulesPerMole(double value) {
        return new MolarEnergy(value, Units.KILOJOULE_PER_MOLE);
    }

    /**
     * {@return a molar energy in joules per mole}
     *
     * @param value the number of joules per mole
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static MolarEnergy joulesPerMole(double value) {
        return new MolarEnergy(value);
    }

    /**
     * {@return a molar energy from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static MolarEnergy of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the molar energy that a text states, such as {@code "12.5 kJ/mol"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
     */
    public static MolarEnergy parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in kilojoules per mole} */
    public double inKilojoulesPerMole() {
        return Units.KILOJOULE_PER_MOLE.fromSi(si());
    }

    /** {@return the value in joules per mole} */
    public double inJoulesPerMole() {
        return si();
    }

    /**
     * {@return this molar energy divided by a molar mass}
     *
     * @param molarMass the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public SpecificEnergy over(MolarMass molarMass) {
        return SpecificEnergy.joulesPerKilogram(si() / molarMass.si());
    }

    /**
     * {@return this molar energy times a molar flow}
     *
     * @param molarFlow the other factor
     */
    public Power times(MolarFlow molarFlow) {
        return Power.watts(si() * molarFlow.si());
    }

    /**
     * {@return this molar energy times an amount of substance}
     *
     * @param amountOfSubstance the other factor
     */
    public Energy times(AmountOfSubstance amountOfSubstance) {
        return Energy.joules(si() * amountOfSubstance.si());
    }

    /**
     * {@return this molar energy divided by a molar entropy: the mean temperature at which heat carries that entropy}
     *
     * @param molarEntropy the divisor, not zero
     * @throws OutOfRangeException if the quotient is no temperature above 0 K, or the divisor is zero
     */
    public Temperature over(MolarEntropy molarEntropy) {
        return Temperature.kelvin(si() / molarEntropy.si());
    }

    /**
     * {@return this molar energy divided by a molar heat capacity}
     *
     * @param molarHeatCapacity the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public TemperatureSpan over(MolarHeatCapacity molarHeatCapacity) {
        return TemperatureSpan.kelvins(si() / molarHeatCapacity.si());
    }

    /**
     * {@return this molar energy divided by a molar volume}
     *
     * @param molarVolume the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public PressureDifference over(MolarVolume molarVolume) {
        return PressureDifference.pascals(si() / molarVolume.si());
    }

    /**
     * {@return this molar energy divided by a pressure difference}
     *
     * @param pressureDifference the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public MolarVolume over(PressureDifference pressureDifference) {
        return MolarVolume.cubicMetresPerMole(si() / pressureDifference.si());
    }

    /**
     * {@return this molar energy divided by a specific energy}
     *
     * @param specificEnergy the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public MolarMass over(SpecificEnergy specificEnergy) {
        return MolarMass.kilogramsPerMole(si() / specificEnergy.si());
    }

    /**
     * {@return this molar energy divided by a temperature span}
     *
     * @param temperatureSpan the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public MolarHeatCapacity over(TemperatureSpan temperatureSpan) {
        return MolarHeatCapacity.joulesPerMoleKelvin(si() / temperatureSpan.si());
    }

    @Override
    public QuantityKind<MolarEnergy, MolarEnergy> kind() {
        return KIND;
    }

    @Override
    protected MolarEnergy with(double si) {
        return new MolarEnergy(si);
    }
}
