package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * A length per time.
 *
 * <p>SI unit m/s. Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class Speed extends LinearQuantity<Speed> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<Speed, Speed> KIND = QuantityKind.linear(
            "speed",
            Speed.class,
            Dimension.LENGTH.dividedBy(Dimension.TIME),
            Speed::new,
            10,
            List.of(Units.METRE_PER_SECOND, Units.KILOMETRE_PER_HOUR, Units.FOOT_PER_SECOND));

    private Speed(double si) {
        super(si, KIND);
    }

    private Speed(double value, Unit<Speed> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return a speed in metres per second}
     *
     * @param value the number of metres per second
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Speed metresPerSecond(double value) {
        return new Speed(value);
    }

    /**
     * {@return a speed in kilometres per hour}
     *
     * @param value the number of kilometres per hour
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Speed kilometresPerHour(double value) {
        return new Speed(value, Units.KILOMETRE_PER_HOUR);
    }

    /**
     * {@return a speed in feet per second}
     *
     * @param value the number of feet per second
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Speed feetPerSecond(double value) {
        return new Speed(value, Units.FOOT_PER_SECOND);
    }

    /**
     * {@return a speed from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static Speed of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the speed that a text states, such as {@code "12.5 m/s"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
     */
    public static Speed parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in metres per second} */
    public double inMetresPerSecond() {
        return si();
    }

    /** {@return the value in kilometres per hour} */
    public double inKilometresPerHour() {
        return Units.KILOMETRE_PER_HOUR.fromSi(si());
    }

    /** {@return the value in feet per second} */
    public double inFeetPerSecond() {
        return Units.FOOT_PER_SECOND.fromSi(si());
    }

    /**
     * {@return this speed times an area}
     *
     * @param area the other factor
     */
    public VolumeFlow times(Area area) {
        return VolumeFlow.cubicMetresPerSecond(si() * area.si());
    }

    /** {@return the kinetic energy per mass at this speed: w²/2} */
    public SpecificEnergy kineticEnergy() {
        return SpecificEnergy.joulesPerKilogram(si() * si() / 2);
    }

    /**
     * {@return this speed times a duration}
     *
     * @param duration the other factor
     */
    public Length times(Duration duration) {
        return Length.metres(si() * duration.si());
    }

    @Override
    public QuantityKind<Speed, Speed> kind() {
        return KIND;
    }

    @Override
    protected Speed with(double si) {
        return new Speed(si);
    }
}
