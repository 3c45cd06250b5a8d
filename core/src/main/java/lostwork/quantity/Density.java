package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * A mass per volume.
 *
 * <p>SI unit kg/m³. Any finite value exists. Immutable and thread-safe.
 */
public final class Density extends LinearQuantity<Density> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<Density, Density> KIND = QuantityKind.linear(
            "density",
            Density.class,
            new Dimension(-3, 1, 0, 0, 0, 0),
            Density::new,
            1,
            List.of(Units.KILOGRAM_PER_CUBIC_METRE, Units.GRAM_PER_CUBIC_CENTIMETRE, Units.POUND_PER_CUBIC_FOOT));

    private Density(double si) {
        super(si, KIND);
    }

    /**
     * {@return a density}
     *
     * @param value density in kilograms per cubic metre
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Density kilogramsPerCubicMetre(double value) {
        return new Density(value);
    }

    /**
     * {@return a density}
     *
     * @param value density in grams per cubic centimetre
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Density gramsPerCubicCentimetre(double value) {
        return new Density(Units.GRAM_PER_CUBIC_CENTIMETRE.toSi(value));
    }

    /**
     * {@return a density}
     *
     * @param value density in pounds per cubic foot
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Density poundsPerCubicFoot(double value) {
        return new Density(Units.POUND_PER_CUBIC_FOOT.toSi(value));
    }

    /**
     * {@return a density from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension is another one, or the value is not allowed
     */
    public static Density of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the density that a text states, such as {@code "12.5 kg/m³"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws IllegalArgumentException if the text cannot be read as this quantity; the message lists what is accepted
     */
    public static Density parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in kilograms per cubic metre} */
    public double inKilogramsPerCubicMetre() {
        return si();
    }

    /** {@return the value in grams per cubic centimetre} */
    public double inGramsPerCubicCentimetre() {
        return Units.GRAM_PER_CUBIC_CENTIMETRE.fromSi(si());
    }

    /** {@return the value in pounds per cubic foot} */
    public double inPoundsPerCubicFoot() {
        return Units.POUND_PER_CUBIC_FOOT.fromSi(si());
    }

    /**
     * {@return the product with a volume}
     *
     * @param volume the other factor
     */
    public Mass times(Volume volume) {
        return Mass.kilograms(si() * volume.si());
    }

    /**
     * {@return the product with a volume flow}
     *
     * @param volumeFlow the other factor
     */
    public MassFlow times(VolumeFlow volumeFlow) {
        return MassFlow.kilogramsPerSecond(si() * volumeFlow.si());
    }

    /**
     * {@return one over this value, as a specific volume}
     *
     * @throws IllegalArgumentException if this value is zero
     */
    public SpecificVolume inverse() {
        return SpecificVolume.cubicMetresPerKilogram(1 / si());
    }

    @Override
    public QuantityKind<Density, Density> kind() {
        return KIND;
    }

    @Override
    protected Density with(double si) {
        return new Density(si);
    }
}
