package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * A difference of two pressures, such as the loss along a pipe.
 *
 * <p>SI unit Pa. Any finite value exists. Immutable and thread-safe.
 */
public final class PressureDifference extends LinearQuantity<PressureDifference> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<PressureDifference, PressureDifference> KIND = QuantityKind.linear(
            "pressure difference",
            PressureDifference.class,
            new Dimension(-1, 1, -2, 0, 0, 0),
            PressureDifference::new,
            1e4,
            List.of(
                    Units.BAR_DIFFERENCE,
                    Units.PASCAL_DIFFERENCE,
                    Units.KILOPASCAL_DIFFERENCE,
                    Units.MILLIBAR_DIFFERENCE,
                    Units.PSI_DIFFERENCE));

    private PressureDifference(double si) {
        super(si, KIND);
    }

    /**
     * {@return a pressure difference}
     *
     * @param value pressure difference in bar
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static PressureDifference bars(double value) {
        return new PressureDifference(Units.BAR_DIFFERENCE.toSi(value));
    }

    /**
     * {@return a pressure difference}
     *
     * @param value pressure difference in pascal
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static PressureDifference pascals(double value) {
        return new PressureDifference(value);
    }

    /**
     * {@return a pressure difference}
     *
     * @param value pressure difference in kilopascal
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static PressureDifference kilopascals(double value) {
        return new PressureDifference(Units.KILOPASCAL_DIFFERENCE.toSi(value));
    }

    /**
     * {@return a pressure difference}
     *
     * @param value pressure difference in millibar
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static PressureDifference millibars(double value) {
        return new PressureDifference(Units.MILLIBAR_DIFFERENCE.toSi(value));
    }

    /**
     * {@return a pressure difference}
     *
     * @param value pressure difference in pounds-force per square inch
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static PressureDifference psiDifference(double value) {
        return new PressureDifference(Units.PSI_DIFFERENCE.toSi(value));
    }

    /**
     * {@return a pressure difference from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension is another one, or the value is not allowed
     */
    public static PressureDifference of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the pressure difference that a text states, such as {@code "12.5 bar"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws IllegalArgumentException if the text cannot be read as this quantity; the message lists what is accepted
     */
    public static PressureDifference parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in bar} */
    public double inBars() {
        return Units.BAR_DIFFERENCE.fromSi(si());
    }

    /** {@return the value in pascal} */
    public double inPascals() {
        return si();
    }

    /** {@return the value in kilopascal} */
    public double inKilopascals() {
        return Units.KILOPASCAL_DIFFERENCE.fromSi(si());
    }

    /** {@return the value in millibar} */
    public double inMillibars() {
        return Units.MILLIBAR_DIFFERENCE.fromSi(si());
    }

    /** {@return the value in pounds-force per square inch} */
    public double inPsiDifference() {
        return Units.PSI_DIFFERENCE.fromSi(si());
    }

    /**
     * {@return the product with a specific volume}
     *
     * @param specificVolume the other factor
     */
    public SpecificEnergy times(SpecificVolume specificVolume) {
        return SpecificEnergy.joulesPerKilogram(si() * specificVolume.si());
    }

    /**
     * {@return the product with a volume}
     *
     * @param volume the other factor
     */
    public Energy times(Volume volume) {
        return Energy.joules(si() * volume.si());
    }

    /**
     * {@return the product with a volume flow}
     *
     * @param volumeFlow the other factor
     */
    public Power times(VolumeFlow volumeFlow) {
        return Power.watts(si() * volumeFlow.si());
    }

    @Override
    public QuantityKind<PressureDifference, PressureDifference> kind() {
        return KIND;
    }

    @Override
    protected PressureDifference with(double si) {
        return new PressureDifference(si);
    }
}
