package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * A mass per volume.
 *
 * <p>SI unit kg/m³. Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class Density extends LinearQuantity<Density> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<Density, Density> KIND = QuantityKind.linear(
            "density",
            Density.class,
            Dimension.MASS.dividedBy(Dimension.LENGTH.pow(3)),
            Density::new,
            1,
            List.of(Units.KILOGRAM_PER_CUBIC_METRE, Units.GRAM_PER_CUBIC_CENTIMETRE, Units.POUND_PER_CUBIC_FOOT));

    private Density(double si) {
        super(si, KIND);
    }

    private Density(double value, Unit<Density> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return a density in kilograms per cubic metre}
     *
     * @param value the number of kilograms per cubic metre
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Density kilogramsPerCubicMetre(double value) {
        return new Density(value);
    }

    /**
     * {@return a density in grams per cubic centimetre}
     *
     * @param value the number of grams per cubic centimetre
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Density gramsPerCubicCentimetre(double value) {
        return new Density(value, Units.GRAM_PER_CUBIC_CENTIMETRE);
    }

    /**
     * {@return a density in pounds per cubic foot}
     *
     * @param value the number of pounds per cubic foot
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Density poundsPerCubicFoot(double value) {
        return new Density(value, Units.POUND_PER_CUBIC_FOOT);
    }

    /**
     * {@return a density from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static Density of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the density that a text states, such as {@code "12.5 kg/m³"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
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
     * {@return this density times a volume}
     *
     * @param volume the other factor
     */
    public Mass times(Volume volume) {
        return Mass.kilograms(si() * volume.si());
    }

    /**
     * {@return this density times a volume flow}
     *
     * @param volumeFlow the other factor
     */
    public MassFlow times(VolumeFlow volumeFlow) {
        return MassFlow.kilogramsPerSecond(si() * volumeFlow.si());
    }

    /**
     * {@return one over this value, as a specific volume}
     *
     * @throws OutOfRangeException if this value is zero
     */
    public SpecificVolume inverse() {
        return SpecificVolume.cubicMetresPerKilogram(1 / si());
    }

    /**
     * {@return this density times a specific energy}
     *
     * @param specificEnergy the other factor
     */
    public PressureDifference times(SpecificEnergy specificEnergy) {
        return PressureDifference.pascals(si() * specificEnergy.si());
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
