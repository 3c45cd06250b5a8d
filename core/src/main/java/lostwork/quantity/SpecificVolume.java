package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * A volume per mass.
 *
 * <p>SI unit m³/kg. Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class SpecificVolume extends LinearQuantity<SpecificVolume> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<SpecificVolume, SpecificVolume> KIND = QuantityKind.linear(
            "specific volume",
            SpecificVolume.class,
            Dimension.LENGTH.pow(3).dividedBy(Dimension.MASS),
            SpecificVolume::new,
            1,
            List.of(Units.CUBIC_METRE_PER_KILOGRAM, Units.LITRE_PER_KILOGRAM, Units.CUBIC_FOOT_PER_POUND));

    private SpecificVolume(double si) {
        super(si, KIND);
    }

    private SpecificVolume(double value, Unit<SpecificVolume> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return a specific volume in cubic metres per kilogram}
     *
     * @param value the number of cubic metres per kilogram
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static SpecificVolume cubicMetresPerKilogram(double value) {
        return new SpecificVolume(value);
    }

    /**
     * {@return a specific volume in litres per kilogram}
     *
     * @param value the number of litres per kilogram
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static SpecificVolume litresPerKilogram(double value) {
        return new SpecificVolume(value, Units.LITRE_PER_KILOGRAM);
    }

    /**
     * {@return a specific volume in cubic feet per pound}
     *
     * @param value the number of cubic feet per pound
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static SpecificVolume cubicFeetPerPound(double value) {
        return new SpecificVolume(value, Units.CUBIC_FOOT_PER_POUND);
    }

    /**
     * {@return a specific volume from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static SpecificVolume of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the specific volume that a text states, such as {@code "12.5 m³/kg"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
     */
    public static SpecificVolume parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in cubic metres per kilogram} */
    public double inCubicMetresPerKilogram() {
        return si();
    }

    /** {@return the value in litres per kilogram} */
    public double inLitresPerKilogram() {
        return Units.LITRE_PER_KILOGRAM.fromSi(si());
    }

    /** {@return the value in cubic feet per pound} */
    public double inCubicFeetPerPound() {
        return Units.CUBIC_FOOT_PER_POUND.fromSi(si());
    }

    /**
     * {@return this specific volume times a mass}
     *
     * @param mass the other factor
     */
    public Volume times(Mass mass) {
        return Volume.cubicMetres(si() * mass.si());
    }

    /**
     * {@return this specific volume times a mass flow}
     *
     * @param massFlow the other factor
     */
    public VolumeFlow times(MassFlow massFlow) {
        return VolumeFlow.cubicMetresPerSecond(si() * massFlow.si());
    }

    /**
     * {@return this specific volume times a molar mass}
     *
     * @param molarMass the other factor
     */
    public MolarVolume times(MolarMass molarMass) {
        return MolarVolume.cubicMetresPerMole(si() * molarMass.si());
    }

    /**
     * {@return one over this value, as a density}
     *
     * @throws OutOfRangeException if this value is zero
     */
    public Density inverse() {
        return Density.kilogramsPerCubicMetre(1 / si());
    }

    /**
     * {@return this specific volume times a pressure}
     *
     * @param pressure the other factor
     */
    public SpecificEnergy times(Pressure pressure) {
        return SpecificEnergy.joulesPerKilogram(si() * pressure.si());
    }

    /**
     * {@return this specific volume times a pressure difference}
     *
     * @param pressureDifference the other factor
     */
    public SpecificEnergy times(PressureDifference pressureDifference) {
        return SpecificEnergy.joulesPerKilogram(si() * pressureDifference.si());
    }

    @Override
    public QuantityKind<SpecificVolume, SpecificVolume> kind() {
        return KIND;
    }

    @Override
    protected SpecificVolume with(double si) {
        return new SpecificVolume(si);
    }
}
