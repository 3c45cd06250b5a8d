package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * A volume.
 *
 * <p>SI unit m³. Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class Volume extends LinearQuantity<Volume> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<Volume, Volume> KIND = QuantityKind.linear(
            "volume", Volume.class, Dimension.LENGTH.pow(3), Volume::new, 1, List.of(Units.CUBIC_METRE, Units.LITRE));

    private Volume(double si) {
        super(si, KIND);
    }

    private Volume(double value, Unit<Volume> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return a volume in cubic metres}
     *
     * @param value the number of cubic metres
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Volume cubicMetres(double value) {
        return new Volume(value);
    }

    /**
     * {@return a volume in litres}
     *
     * @param value the number of litres
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Volume litres(double value) {
        return new Volume(value, Units.LITRE);
    }

    /**
     * {@return a volume from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static Volume of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the volume that a text states, such as {@code "12.5 m³"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
     */
    public static Volume parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in cubic metres} */
    public double inCubicMetres() {
        return si();
    }

    /** {@return the value in litres} */
    public double inLitres() {
        return Units.LITRE.fromSi(si());
    }

    /**
     * {@return this volume divided by a mass}
     *
     * @param mass the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public SpecificVolume over(Mass mass) {
        return SpecificVolume.cubicMetresPerKilogram(si() / mass.si());
    }

    /**
     * {@return this volume divided by a duration}
     *
     * @param duration the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public VolumeFlow over(Duration duration) {
        return VolumeFlow.cubicMetresPerSecond(si() / duration.si());
    }

    /**
     * {@return this volume times a density}
     *
     * @param density the other factor
     */
    public Mass times(Density density) {
        return Mass.kilograms(si() * density.si());
    }

    /**
     * {@return this volume times a pressure}
     *
     * @param pressure the other factor
     */
    public Energy times(Pressure pressure) {
        return Energy.joules(si() * pressure.si());
    }

    /**
     * {@return this volume times a pressure difference}
     *
     * @param pressureDifference the other factor
     */
    public Energy times(PressureDifference pressureDifference) {
        return Energy.joules(si() * pressureDifference.si());
    }

    /**
     * {@return this volume times a rotational frequency}
     *
     * @param rotationalFrequency the other factor
     */
    public VolumeFlow times(RotationalFrequency rotationalFrequency) {
        return VolumeFlow.cubicMetresPerSecond(si() * rotationalFrequency.si());
    }

    /**
     * {@return this volume divided by an amount of substance}
     *
     * @param amountOfSubstance the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public MolarVolume over(AmountOfSubstance amountOfSubstance) {
        return MolarVolume.cubicMetresPerMole(si() / amountOfSubstance.si());
    }

    /**
     * {@return this volume divided by an area}
     *
     * @param area the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public Length over(Area area) {
        return Length.metres(si() / area.si());
    }

    /**
     * {@return this volume divided by a length}
     *
     * @param length the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public Area over(Length length) {
        return Area.squareMetres(si() / length.si());
    }

    /**
     * {@return this volume divided by a molar volume}
     *
     * @param molarVolume the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public AmountOfSubstance over(MolarVolume molarVolume) {
        return AmountOfSubstance.moles(si() / molarVolume.si());
    }

    /**
     * {@return this volume divided by a specific volume}
     *
     * @param specificVolume the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public Mass over(SpecificVolume specificVolume) {
        return Mass.kilograms(si() / specificVolume.si());
    }

    /**
     * {@return this volume divided by a volume flow}
     *
     * @param volumeFlow the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public Duration over(VolumeFlow volumeFlow) {
        return Duration.seconds(si() / volumeFlow.si());
    }

    @Override
    public QuantityKind<Volume, Volume> kind() {
        return KIND;
    }

    @Override
    protected Volume with(double si) {
        return new Volume(si);
    }
}
