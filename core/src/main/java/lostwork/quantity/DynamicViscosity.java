package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * A shear stress per velocity gradient.
 *
 * <p>SI unit Pa s. Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class DynamicViscosity extends LinearQuantity<DynamicViscosity> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<DynamicViscosity, DynamicViscosity> KIND = QuantityKind.linear(
            "dynamic viscosity",
            DynamicViscosity.class,
            Dimension.MASS.dividedBy(Dimension.LENGTH).dividedBy(Dimension.TIME),
            DynamicViscosity::new,
            1e-5,
            List.of(Units.MICROPASCAL_SECOND, Units.PASCAL_SECOND, Units.MILLIPASCAL_SECOND));

    private DynamicViscosity(double si) {
        super(si, KIND);
    }

    private DynamicViscosity(double value, Unit<DynamicViscosity> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return a dynamic viscosity in micropascal seconds}
     *
     * @param value the number of micropascal seconds
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static DynamicViscosity micropascalSeconds(double value) {
        return new DynamicViscosity(value, Units.MICROPASCAL_SECOND);
    }

    /**
     * {@return a dynamic viscosity in pascal seconds}
     *
     * @param value the number of pascal seconds
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static DynamicViscosity pascalSeconds(double value) {
        return new DynamicViscosity(value);
    }

    /**
     * {@return a dynamic viscosity in millipascal seconds}
     *
     * @param value the number of millipascal seconds
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static DynamicViscosity millipascalSeconds(double value) {
        return new DynamicViscosity(value, Units.MILLIPASCAL_SECOND);
    }

    /**
     * {@return a dynamic viscosity from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static DynamicViscosity of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the dynamic viscosity that a text states, such as {@code "12.5 µPa s"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
     */
    public static DynamicViscosity parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in micropascal seconds} */
    public double inMicropascalSeconds() {
        return Units.MICROPASCAL_SECOND.fromSi(si());
    }

    /** {@return the value in pascal seconds} */
    public double inPascalSeconds() {
        return si();
    }

    /** {@return the value in millipascal seconds} */
    public double inMillipascalSeconds() {
        return Units.MILLIPASCAL_SECOND.fromSi(si());
    }

    @Override
    public QuantityKind<DynamicViscosity, DynamicViscosity> kind() {
        return KIND;
    }

    @Override
    protected DynamicViscosity with(double si) {
        return new DynamicViscosity(si);
    }
}
