package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * A length per time.
 *
 * <p>SI unit m/s. Any finite value exists. Immutable and thread-safe.
 */
public final class Speed extends LinearQuantity<Speed> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<Speed, Speed> KIND = QuantityKind.linear(
            "speed",
            Speed.class,
            new Dimension(1, 0, -1, 0, 0, 0),
            Speed::new,
            10,
            List.of(Units.METRE_PER_SECOND, Units.KILOMETRE_PER_HOUR, Units.FOOT_PER_SECOND));

    private Speed(double si) {
        super(si, KIND);
    }

    /**
     * {@return a speed}
     *
     * @param value speed in metres per second
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Speed metresPerSecond(double value) {
        return new Speed(value);
    }

    /**
     * {@return a speed}
     *
     * @param value speed in kilometres per hour
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Speed kilometresPerHour(double value) {
        return new Speed(Units.KILOMETRE_PER_HOUR.toSi(value));
    }

    /**
     * {@return a speed}
     *
     * @param value speed in feet per second
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Speed feetPerSecond(double value) {
        return new Speed(Units.FOOT_PER_SECOND.toSi(value));
    }

    /**
     * {@return a speed from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension is another one, or the value is not allowed
     */
    public static Speed of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the speed that a text states, such as {@code "12.5 m/s"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws IllegalArgumentException if the text cannot be read as this quantity; the message lists what is accepted
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
     * {@return the product with an area}
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

    @Override
    public QuantityKind<Speed, Speed> kind() {
        return KIND;
    }

    @Override
    protected Speed with(double si) {
        return new Speed(si);
    }
}
