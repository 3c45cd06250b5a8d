package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * Revolutions per time.
 *
 * <p>SI unit 1/s. Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class RotationalFrequency extends LinearQuantity<RotationalFrequency> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<RotationalFrequency, RotationalFrequency> KIND = QuantityKind.linear(
            "rotational frequency",
            RotationalFrequency.class,
            Dimension.ONE.dividedBy(Dimension.TIME),
            RotationalFrequency::new,
            50,
            List.of(Units.REVOLUTION_PER_MINUTE, Units.REVOLUTION_PER_SECOND));

    private RotationalFrequency(double si) {
        super(si, KIND);
    }

    private RotationalFrequency(double value, Unit<RotationalFrequency> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return a rotational frequency in revolutions per minute}
     *
     * @param value the number of revolutions per minute
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static RotationalFrequency revolutionsPerMinute(double value) {
        return new RotationalFrequency(value, Units.REVOLUTION_PER_MINUTE);
    }

    /**
     * {@return a rotational frequency in revolutions per second}
     *
     * @param value the number of revolutions per second
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static RotationalFrequency revolutionsPerSecond(double value) {
        return new RotationalFrequency(value);
    }

    /**
     * {@return a rotational frequency from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static RotationalFrequency of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the rotational frequency that a text states, such as {@code "12.5 1/min"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
     */
    public static RotationalFrequency parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in revolutions per minute} */
    public double inRevolutionsPerMinute() {
        return Units.REVOLUTION_PER_MINUTE.fromSi(si());
    }

    /** {@return the value in revolutions per second} */
    public double inRevolutionsPerSecond() {
        return si();
    }

    /**
     * {@return this rotational frequency times a volume}
     *
     * @param volume the other factor
     */
    public VolumeFlow times(Volume volume) {
        return VolumeFlow.cubicMetresPerSecond(si() * volume.si());
    }

    @Override
    public QuantityKind<RotationalFrequency, RotationalFrequency> kind() {
        return KIND;
    }

    @Override
    protected RotationalFrequency with(double si) {
        return new RotationalFrequency(si);
    }
}
