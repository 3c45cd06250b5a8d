package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * A volume per time, at the state that the fluid has. For a volume counted at a normal condition see {@link MolarFlow#normalCubicMetresPerHour}.
 *
 * <p>SI unit m³/s. Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class VolumeFlow extends LinearQuantity<VolumeFlow> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<VolumeFlow, VolumeFlow> KIND = QuantityKind.linear(
                    "volume flow",
                    VolumeFlow.class,
                    Dimension.LENGTH.pow(3).dividedBy(Dimension.TIME),
                    VolumeFlow::new,
                    1,
                    List.of(
                            Units.CUBIC_METRE_PER_SECOND,
                            Units.CUBIC_METRE_PER_HOUR,
                            Units.LITRE_PER_SECOND,
                            Units.LITRE_PER_MINUTE,
                            Units.CUBIC_FOOT_PER_MINUTE,
                            Units.US_GALLON_PER_MINUTE))
            .withHints(NormalVolumeUnit.hints());

    private VolumeFlow(double si) {
        super(si, KIND);
    }

    private VolumeFlow(double value, Unit<VolumeFlow> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return a volume flow in cubic metres per second}
     *
     * @param value the number of cubic metres per second
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static VolumeFlow cubicMetresPerSecond(double value) {
        return new VolumeFlow(value);
    }

    /**
     * {@return a volume flow in cubic metres per hour}
     *
     * @param value the number of cubic metres per hour
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static VolumeFlow cubicMetresPerHour(double value) {
        return new VolumeFlow(value, Units.CUBIC_METRE_PER_HOUR);
    }

    /**
     * {@return a volume flow in litres per second}
     *
     * @param value the number of litres per second
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static VolumeFlow litresPerSecond(double value) {
        return new VolumeFlow(value, Units.LITRE_PER_SECOND);
    }

    /**
     * {@return a volume flow in litres per minute}
     *
     * @param value the number of litres per minute
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static VolumeFlow litresPerMinute(double value) {
        return new VolumeFlow(value, Units.LITRE_PER_MINUTE);
    }

    /**
     * {@return a volume flow in cubic feet per minute}
     *
     * @param value the number of cubic feet per minute
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static VolumeFlow cubicFeetPerMinute(double value) {
        return new VolumeFlow(value, Units.CUBIC_FOOT_PER_MINUTE);
    }

    /**
     * {@return a volume flow from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static VolumeFlow of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the volume flow that a text states, such as {@code "12.5 m³/s"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
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
     * {@return this volume flow times a density}
     *
     * @param density the other factor
     */
    public MassFlow times(Density density) {
        return MassFlow.kilogramsPerSecond(si() * density.si());
    }

    /**
     * {@return this volume flow divided by a specific volume}
     *
     * @param specificVolume the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public MassFlow over(SpecificVolume specificVolume) {
        return MassFlow.kilogramsPerSecond(si() / specificVolume.si());
    }

    /**
     * {@return this volume flow divided by a molar volume}
     *
     * @param molarVolume the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public MolarFlow over(MolarVolume molarVolume) {
        return MolarFlow.molesPerSecond(si() / molarVolume.si());
    }

    /**
     * {@return this volume flow times a pressure difference}
     *
     * @param pressureDifference the other factor
     */
    public Power times(PressureDifference pressureDifference) {
        return Power.watts(si() * pressureDifference.si());
    }

    /**
     * {@return this volume flow times a duration}
     *
     * @param duration the other factor
     */
    public Volume times(Duration duration) {
        return Volume.cubicMetres(si() * duration.si());
    }

    /**
     * {@return this volume flow times a pressure}
     *
     * @param pressure the other factor
     */
    public Power times(Pressure pressure) {
        return Power.watts(si() * pressure.si());
    }

    /**
     * {@return this volume flow divided by an area}
     *
     * @param area the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public Speed over(Area area) {
        return Speed.metresPerSecond(si() / area.si());
    }

    /**
     * {@return this volume flow divided by a mass flow}
     *
     * @param massFlow the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public SpecificVolume over(MassFlow massFlow) {
        return SpecificVolume.cubicMetresPerKilogram(si() / massFlow.si());
    }

    /**
     * {@return this volume flow divided by a molar flow}
     *
     * @param molarFlow the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public MolarVolume over(MolarFlow molarFlow) {
        return MolarVolume.cubicMetresPerMole(si() / molarFlow.si());
    }

    /**
     * {@return this volume flow divided by a rotational frequency}
     *
     * @param rotationalFrequency the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public Volume over(RotationalFrequency rotationalFrequency) {
        return Volume.cubicMetres(si() / rotationalFrequency.si());
    }

    /**
     * {@return this volume flow divided by a speed}
     *
     * @param speed the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public Area over(Speed speed) {
        return Area.squareMetres(si() / speed.si());
    }

    /**
     * {@return this volume flow divided by a volume}
     *
     * @param volume the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public RotationalFrequency over(Volume volume) {
        return RotationalFrequency.revolutionsPerSecond(si() / volume.si());
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
