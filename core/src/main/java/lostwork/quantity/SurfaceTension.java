package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * A force per length along a liquid surface.
 *
 * <p>SI unit N/m. Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class SurfaceTension extends LinearQuantity<SurfaceTension> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<SurfaceTension, SurfaceTension> KIND = QuantityKind.linear(
            "surface tension",
            SurfaceTension.class,
            Dimension.MASS.dividedBy(Dimension.TIME.pow(2)),
            SurfaceTension::new,
            0.05,
            List.of(Units.MILLINEWTON_PER_METRE, Units.NEWTON_PER_METRE));

    private SurfaceTension(double si) {
        super(si, KIND);
    }

    private SurfaceTension(double value, Unit<SurfaceTension> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return a surface tension in millinewtons per metre}
     *
     * @param value the number of millinewtons per metre
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static SurfaceTension millinewtonsPerMetre(double value) {
        return new SurfaceTension(value, Units.MILLINEWTON_PER_METRE);
    }

    /**
     * {@return a surface tension in newtons per metre}
     *
     * @param value the number of newtons per metre
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static SurfaceTension newtonsPerMetre(double value) {
        return new SurfaceTension(value);
    }

    /**
     * {@return a surface tension from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static SurfaceTension of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the surface tension that a text states, such as {@code "12.5 mN/m"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
     */
    public static SurfaceTension parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in millinewtons per metre} */
    public double inMillinewtonsPerMetre() {
        return Units.MILLINEWTON_PER_METRE.fromSi(si());
    }

    /** {@return the value in newtons per metre} */
    public double inNewtonsPerMetre() {
        return si();
    }

    @Override
    public QuantityKind<SurfaceTension, SurfaceTension> kind() {
        return KIND;
    }

    @Override
    protected SurfaceTension with(double si) {
        return new SurfaceTension(si);
    }
}
