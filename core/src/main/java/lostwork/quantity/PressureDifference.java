package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * A difference of two pressures, such as the loss along a pipe.
 *
 * <p>SI unit Pa. Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class PressureDifference extends LinearQuantity<PressureDifference> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<PressureDifference, PressureDifference> KIND = QuantityKind.linear(
            "pressure difference",
            PressureDifference.class,
            Dimension.MASS.dividedBy(Dimension.LENGTH).dividedBy(Dimension.TIME.pow(2)),
            PressureDifference::new,
            1e4,
            List.of(
                    Units.BAR_DIFFERENCE,
                    Units.PASCAL_DIFFERENCE,
                    Units.KILOPASCAL_DIFFERENCE,
                    Units.MEGAPASCAL_DIFFERENCE,
                    Units.MILLIMETRE_OF_WATER_DIFFERENCE,
                    Units.INCH_OF_WATER_DIFFERENCE,
                    Units.MILLIBAR_DIFFERENCE,
                    Units.PSI_DIFFERENCE));

    private PressureDifference(double si) {
        super(si, KIND);
    }

    private PressureDifference(double value, Unit<PressureDifference> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return a pressure difference in bar}
     *
     * @param value the number of bar
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static PressureDifference bars(double value) {
        return new PressureDifference(value, Units.BAR_DIFFERENCE);
    }

    /**
     * {@return a pressure difference in pascal}
     *
     * @param value the number of pascal
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static PressureDifference pascals(double value) {
        return new PressureDifference(value);
    }

    /**
     * {@return a pressure difference in kilopascal}
     *
     * @param value the number of kilopascal
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static PressureDifference kilopascals(double value) {
        return new PressureDifference(value, Units.KILOPASCAL_DIFFERENCE);
    }

    /**
     * {@return a pressure difference in millibar}
     *
     * @param value the number of millibar
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static PressureDifference millibars(double value) {
        return new PressureDifference(value, Units.MILLIBAR_DIFFERENCE);
    }

    /**
     * {@return a pressure difference in pounds-force per square inch}
     *
     * @param value the number of pounds-force per square inch
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static PressureDifference psiDifference(double value) {
        return new PressureDifference(value, Units.PSI_DIFFERENCE);
    }

    /**
     * {@return a pressure difference from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static PressureDifference of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the pressure difference that a text states, such as {@code "12.5 bar"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
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
     * {@return this pressure difference times a specific volume}
     *
     * @param specificVolume the other factor
     */
    public SpecificEnergy times(SpecificVolume specificVolume) {
        return SpecificEnergy.joulesPerKilogram(si() * specificVolume.si());
    }

    /**
     * {@return this pressure difference times a volume}
     *
     * @param volume the other factor
     */
    public Energy times(Volume volume) {
        return Energy.joules(si() * volume.si());
    }

    /**
     * {@return this pressure difference times a volume flow}
     *
     * @param volumeFlow the other factor
     */
    public Power times(VolumeFlow volumeFlow) {
        return Power.watts(si() * volumeFlow.si());
    }

    /**
     * {@return this pressure difference times a molar volume}
     *
     * @param molarVolume the other factor
     */
    public MolarEnergy times(MolarVolume molarVolume) {
        return MolarEnergy.joulesPerMole(si() * molarVolume.si());
    }

    /**
     * {@return this pressure difference divided by a density}
     *
     * @param density the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public SpecificEnergy over(Density density) {
        return SpecificEnergy.joulesPerKilogram(si() / density.si());
    }

    /**
     * {@return this pressure difference divided by a specific energy}
     *
     * @param specificEnergy the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public Density over(SpecificEnergy specificEnergy) {
        return Density.kilogramsPerCubicMetre(si() / specificEnergy.si());
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
