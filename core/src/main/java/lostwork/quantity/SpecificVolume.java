package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * A volume per mass.
 *
 * <p>SI unit m³/kg. Any finite value exists. Immutable and thread-safe.
 */
public final class SpecificVolume extends LinearQuantity<SpecificVolume> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<SpecificVolume, SpecificVolume> KIND = QuantityKind.linear(
            "specific volume",
            SpecificVolume.class,
            new Dimension(3, -1, 0, 0, 0, 0),
            SpecificVolume::new,
            1,
            List.of(Units.CUBIC_METRE_PER_KILOGRAM, Units.LITRE_PER_KILOGRAM, Units.CUBIC_FOOT_PER_POUND));

    private SpecificVolume(double si) {
        super(si, KIND);
    }

    /**
     * {@return a specific volume}
     *
     * @param value specific volume in cubic metres per kilogram
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static SpecificVolume cubicMetresPerKilogram(double value) {
        return new SpecificVolume(value);
    }

    /**
     * {@return a specific volume}
     *
     * @param value specific volume in litres per kilogram
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static SpecificVolume litresPerKilogram(double value) {
        return new SpecificVolume(Units.LITRE_PER_KILOGRAM.toSi(value));
    }

    /**
     * {@return a specific volume}
     *
     * @param value specific volume in cubic feet per pound
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static SpecificVolume cubicFeetPerPound(double value) {
        return new SpecificVolume(Units.CUBIC_FOOT_PER_POUND.toSi(value));
    }

    /**
     * {@return a specific volume from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension is another one, or the value is not allowed
     */
    public static SpecificVolume of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the specific volume that a text states, such as {@code "12.5 m³/kg"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws IllegalArgumentException if the text cannot be read as this quantity; the message lists what is accepted
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
     * {@return the product with a mass}
     *
     * @param mass the other factor
     */
    public Volume times(Mass mass) {
        return Volume.cubicMetres(si() * mass.si());
    }

    /**
     * {@return the product with a mass flow}
     *
     * @param massFlow the other factor
     */
    public VolumeFlow times(MassFlow massFlow) {
        return VolumeFlow.cubicMetresPerSecond(si() * massFlow.si());
    }

    /**
     * {@return the product with a molar mass}
     *
     * @param molarMass the other factor
     */
    public MolarVolume times(MolarMass molarMass) {
        return MolarVolume.cubicMetresPerMole(si() * molarMass.si());
    }

    /**
     * {@return one over this value, as a density}
     *
     * @throws IllegalArgumentException if this value is zero
     */
    public Density inverse() {
        return Density.kilogramsPerCubicMetre(1 / si());
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
