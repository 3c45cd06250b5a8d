package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * A volume per amount of substance.
 *
 * <p>SI unit m³/mol. Any finite value exists. Immutable and thread-safe.
 */
public final class MolarVolume extends LinearQuantity<MolarVolume> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<MolarVolume, MolarVolume> KIND = QuantityKind.linear(
            "molar volume",
            MolarVolume.class,
            new Dimension(3, 0, 0, 0, -1, 0),
            MolarVolume::new,
            0.025,
            List.of(Units.CUBIC_METRE_PER_MOLE, Units.LITRE_PER_MOLE));

    private MolarVolume(double si) {
        super(si, KIND);
    }

    /**
     * {@return a molar volume}
     *
     * @param value molar volume in cubic metres per mole
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static MolarVolume cubicMetresPerMole(double value) {
        return new MolarVolume(value);
    }

    /**
     * {@return a molar volume}
     *
     * @param value molar volume in litres per mole
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static MolarVolume litresPerMole(double value) {
        return new MolarVolume(Units.LITRE_PER_MOLE.toSi(value));
    }

    /**
     * {@return a molar volume from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension is another one, or the value is not allowed
     */
    public static MolarVolume of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the molar volume that a text states, such as {@code "12.5 m³/mol"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws IllegalArgumentException if the text cannot be read as this quantity; the message lists what is accepted
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
     * {@return the quotient with a molar mass}
     *
     * @param molarMass the divisor, not zero
     * @throws IllegalArgumentException if the quotient is not finite
     */
    public SpecificVolume over(MolarMass molarMass) {
        return SpecificVolume.cubicMetresPerKilogram(si() / molarMass.si());
    }

    /**
     * {@return the product with a molar flow}
     *
     * @param molarFlow the other factor
     */
    public VolumeFlow times(MolarFlow molarFlow) {
        return VolumeFlow.cubicMetresPerSecond(si() * molarFlow.si());
    }

    /**
     * {@return the product with an amount of substance}
     *
     * @param amountOfSubstance the other factor
     */
    public Volume times(AmountOfSubstance amountOfSubstance) {
        return Volume.cubicMetres(si() * amountOfSubstance.si());
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
