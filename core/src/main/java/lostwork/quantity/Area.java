package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * An area.
 *
 * <p>SI unit m². Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class Area extends LinearQuantity<Area> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<Area, Area> KIND = QuantityKind.linear(
            "area", Area.class, Dimension.LENGTH.pow(2), Area::new, 10, List.of(Units.SQUARE_METRE, Units.SQUARE_FOOT));

    private Area(double si) {
        super(si, KIND);
    }

    private Area(double value, Unit<Area> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return an area in square metres}
     *
     * @param value the number of square metres
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Area squareMetres(double value) {
        return new Area(value);
    }

    /**
     * {@return an area in square feet}
     *
     * @param value the number of square feet
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Area squareFeet(double value) {
        return new Area(value, Units.SQUARE_FOOT);
    }

    /**
     * {@return an area from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static Area of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the area that a text states, such as {@code "12.5 m²"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
     */
    public static Area parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in square metres} */
    public double inSquareMetres() {
        return si();
    }

    /** {@return the value in square feet} */
    public double inSquareFeet() {
        return Units.SQUARE_FOOT.fromSi(si());
    }

    /**
     * {@return this area times a heat flux}
     *
     * @param heatFlux the other factor
     */
    public Power times(HeatFlux heatFlux) {
        return Power.watts(si() * heatFlux.si());
    }

    /**
     * {@return this area times a heat transfer coefficient}
     *
     * @param heatTransferCoefficient the other factor
     */
    public Conductance times(HeatTransferCoefficient heatTransferCoefficient) {
        return Conductance.wattsPerKelvin(si() * heatTransferCoefficient.si());
    }

    /**
     * {@return this area times a speed}
     *
     * @param speed the other factor
     */
    public VolumeFlow times(Speed speed) {
        return VolumeFlow.cubicMetresPerSecond(si() * speed.si());
    }

    /**
     * {@return this area times a length}
     *
     * @param length the other factor
     */
    public Volume times(Length length) {
        return Volume.cubicMetres(si() * length.si());
    }

    /**
     * {@return this area divided by a length}
     *
     * @param length the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public Length over(Length length) {
        return Length.metres(si() / length.si());
    }

    @Override
    public QuantityKind<Area, Area> kind() {
        return KIND;
    }

    @Override
    protected Area with(double si) {
        return new Area(si);
    }
}
