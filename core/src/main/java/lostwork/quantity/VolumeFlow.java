package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * A volume per time, at the state that the fluid has. For a volume counted at a normal condition see {@link MolarFlow#normalCubicMetresPerHour}.
 *
 * <p>SI unit m³/s. Any finite value exists. Immutable and thread-safe.
 */
public final class VolumeFlow extends LinearQuantity<VolumeFlow> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<VolumeFlow, VolumeFlow> KIND = QuantityKind.linear(
            "volume flow",
            VolumeFlow.class,
            new Dimension(3, 0, -1, 0, 0, 0),
            VolumeFlow::new,
            1,
            List.of(
                    Units.CUBIC_METRE_PER_SECOND,
                    Units.CUBIC_METRE_PER_HOUR,
                    Units.LITRE_PER_SECOND,
                    Units.LITRE_PER_MINUTE,
                    Units.CUBIC_FOOT_PER_MINUTE));

    private VolumeFlow(double si) {
        super(si, KIND);
    }

    /**
     * {@return a volume flow}
     *
     * @param value volume flow in cubic metres per second
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static VolumeFlow cubicMetresPerSecond(double value) {
        return new VolumeFlow(value);
    }

    /**
     * {@return a volume flow}
     *
     * @param value volume flow in cubic metres per hour
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static VolumeFlow cubicMetresPerHour(double value) {
        return new VolumeFlow(Units.CUBIC_METRE_PER_HOUR.toSi(value));
    }

    /**
     * {@return a volume flow}
     *
     * @param value volume flow in litres per second
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static VolumeFlow litresPerSecond(double value) {
        return new VolumeFlow(Units.LITRE_PER_SECOND.toSi(value));
    }

    /**
     * {@return a volume flow}
     *
     * @param value volume flow in litres per minute
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static VolumeFlow litresPerMinute(double value) {
        return new VolumeFlow(Units.LITRE_PER_MINUTE.toSi(value));
    }

    /**
     * {@return a volume flow}
     *
     * @param value volume flow in cubic feet per minute
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static VolumeFlow cubicFeetPerMinute(double value) {
        return new VolumeFlow(Units.CUBIC_FOOT_PER_MINUTE.toSi(value));
    }

    /**
     * {@return a volume flow from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension is another one, or the value is not allowed
     */
    public static VolumeFlow of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the volume flow that a text states, such as {@code "12.5 m³/s"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws IllegalArgumentException if the text cannot be read as this quantity; the message lists what is accepted
     */
    public static VolumeFlow parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in cubic metres per second} */
    public double inCubicMetresPerSecond() {
        return si();
    }

    /** {@return the value in cubic metres per hour} */
    public double inCubicMetresPerHour() {
        return Units.CUBIC_METRE_PER_HOUR.fromSi(si());
    }

    /** {@return the value in litres per second} */
    public double inLitresPerSecond() {
        return Units.LITRE_PER_SECOND.fromSi(si());
    }

    /** {@return the value in litres per minute} */
    public double inLitresPerMinute() {
        return Units.LITRE_PER_MINUTE.fromSi(si());
    }

    /** {@return the value in cubic feet per minute} */
    public double inCubicFeetPerMinute() {
        return Units.CUBIC_FOOT_PER_MINUTE.fromSi(si());
    }

    /**
     * {@return the product with a density}
     *
     * @param density the other factor
     */
    public MassFlow times(Density density) {
        return MassFlow.kilogramsPerSecond(si() * density.si());
    }

    /**
     * {@return the quotient with a specific volume}
     *
     * @param specificVolume the divisor, not zero
     * @throws IllegalArgumentException if the quotient is not finite
     */
    public MassFlow over(SpecificVolume specificVolume) {
        return MassFlow.kilogramsPerSecond(si() / specificVolume.si());
    }

    /**
     * {@return the quotient with a molar volume}
     *
     * @param molarVolume the divisor, not zero
     * @throws IllegalArgumentException if the quotient is not finite
     */
    public MolarFlow over(MolarVolume molarVolume) {
        return MolarFlow.molesPerSecond(si() / molarVolume.si());
    }

    /**
     * {@return the product with a pressure difference}
     *
     * @param pressureDifference the other factor
     */
    public Power times(PressureDifference pressureDifference) {
        return Power.watts(si() * pressureDifference.si());
    }

    /**
     * {@return the product with a duration}
     *
     * @param duration the other factor
     */
    public Volume times(Duration duration) {
        return Volume.cubicMetres(si() * duration.si());
    }

    @Override
    public QuantityKind<VolumeFlow, VolumeFlow> kind() {
        return KIND;
    }

    @Override
    protected VolumeFlow with(double si) {
        return new VolumeFlow(si);
    }
}
