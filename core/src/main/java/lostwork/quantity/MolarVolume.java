package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * A volume per amount of substance.
 *
 * <p>SI unit m³/mol. Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class MolarVolume extends LinearQuantity<MolarVolume> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<MolarVolume, MolarVolume> KIND = QuantityKind.linear(
            "molar volume",
            MolarVolume.class,
            Dimension.LENGTH.pow(3).dividedBy(Dimension.AMOUNT),
            MolarVolume::new,
            0.025,
            List.of(Units.CUBIC_METRE_PER_MOLE, Units.LITRE_PER_MOLE));

    private MolarVolume(double si) {
        super(si, KIND);
    }

    private MolarVolume(double value, Unit<MolarVolume> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return a molar volume in cubic metres per mole}
     *
     * @param value the number of cubic metres per mole
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static MolarVolume cubicMetresPerMole(double value) {
        return new MolarVolume(value);
    }

    /**
     * {@return a molar volume in litres per mole}
     *
     * @param value the number of litres per mole
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static MolarVolume litresPerMole(double value) {
        return new MolarVolume(value, Units.LITRE_PER_MOLE);
    }

    /**
     * {@return a molar volume from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static MolarVolume of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the molar volume that a text states, such as {@code "12.5 m³/mol"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
     */
    public static MolarVolume parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in cubic metres per mole} */
    public double inCubicMetresPerMole() {
        return si();
    }

    /** {@return the value in litres per mole} */
    public double inLitresPerMole() {
        return Units.LITRE_PER_MOLE.fromSi(si());
    }

    /**
     * {@return this molar volume divided by a molar mass}
     *
     * @param molarMass the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public SpecificVolume over(MolarMass molarMass) {
        return SpecificVolume.cubicMetresPerKilogram(si() / molarMass.si());
    }

    /**
     * {@return this molar volume times a molar flow}
     *
     * @param molarFlow the other factor
     */
    public VolumeFlow times(MolarFlow molarFlow) {
        return VolumeFlow.cubicMetresPerSecond(si() * molarFlow.si());
    }

    /**
     * {@return this molar volume times an amount of substance}
     *
     * @param amountOfSubstance the other factor
     */
    public Volume times(AmountOfSubstance amountOfSubstance) {
        return Volume.cubicMetres(si() * amountOfSubstance.si());
    }

    /**
     * {@return this molar volume times a pressure}
     *
     * @param pressure the other factor
     */
    public MolarEnergy times(Pressure pressure) {
        return MolarEnergy.joulesPerMole(si() * pressure.si());
    }

    /**
     * {@return this molar volume times a pressure difference}
     *
     * @param pressureDifference the other factor
     */
    public MolarEnergy times(PressureDifference pressureDifference) {
        return MolarEnergy.joulesPerMole(si() * pressureDifference.si());
    }

    /**
     * {@return this molar volume divided by a specific volume}
     *
     * @param specificVolume the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public MolarMass over(SpecificVolume specificVolume) {
        return MolarMass.kilogramsPerMole(si() / specificVolume.si());
    }

    @Override
    public QuantityKind<MolarVolume, MolarVolume> kind() {
        return KIND;
    }

    @Override
    protected MolarVolume with(double si) {
        return new MolarVolume(si);
    }
}
