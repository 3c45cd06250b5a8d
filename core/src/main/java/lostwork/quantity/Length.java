package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * A length.
 *
 * <p>SI unit m. Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class Length extends LinearQuantity<Length> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<Length, Length> KIND = QuantityKind.linear(
            "length",
            Length.class,
            Dimension.LENGTH,
            Length::new,
            1,
            List.of(Units.METRE, Units.MILLIMETRE, Units.FOOT, Units.INCH));

    private Length(double si) {
        super(si, KIND);
    }

    private Length(double value, Unit<Length> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return a length in metres}
     *
     * @param value the number of metres
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Length metres(double value) {
        return new Length(value);
    }

    /**
     * {@return a length in millimetres}
     *
     * @param value the number of millimetres
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Length millimetres(double value) {
        return new Length(value, Units.MILLIMETRE);
    }

    /**
     * {@return a length in feet}
     *
     * @param value the number of feet
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Length feet(double value) {
        return new Length(value, Units.FOOT);
    }

    /**
     * {@return a length in inches}
     *
     * @param value the number of inches
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Length inches(double value) {
        return new Length(value, Units.INCH);
    }

    /**
     * {@return a length from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static Length of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the length that a text states, such as {@code "12.5 m"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
     */
    public static Length parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in metres} */
    public double inMetres() {
        return si();
    }

    /** {@return the value in millimetres} */
    public double inMillimetres() {
        return Units.MILLIMETRE.fromSi(si());
    }

    /** {@return the value in feet} */
    public double inFeet() {
        return Units.FOOT.fromSi(si());
    }

    /** {@return the value in inches} */
    public double inInches() {
        return Units.INCH.fromSi(si());
    }

    /**
     * {@return this length times a length}
     *
     * @param length the other factor
     */
    public Area times(Length length) {
        return Area.squareMetres(si() * length.si());
    }

    /**
     * {@return this length times an area}
     *
     * @param area the other factor
     */
    public Volume times(Area area) {
        return Volume.cubicMetres(si() * area.si());
    }

    /**
     * {@return this length times a heat transfer coefficient}
     *
     * @param heatTransferCoefficient the other factor
     */
    public ThermalConductivity times(HeatTransferCoefficient heatTransferCoefficient) {
        return ThermalConductivity.wattsPerMetreKelvin(si() * heatTransferCoefficient.si());
    }

    /**
     * {@return this length divided by a duration}
     *
     * @param duration the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public Speed over(Duration duration) {
        return Speed.metresPerSecond(si() / duration.si());
    }

    /**
     * {@return this length divided by a speed}
     *
     * @param speed the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public Duration over(Speed speed) {
        return Duration.seconds(si() / speed.si());
    }

    @Override
    public QuantityKind<Length, Length> kind() {
        return KIND;
    }

    @Override
    protected Length with(double si) {
        return new Length(si);
    }
}
