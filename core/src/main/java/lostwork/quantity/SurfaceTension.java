package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * A force per length along a liquid surface.
 *
 * <p>SI unit N/m. Any finite value exists. Immutable and thread-safe.
 */
public final class SurfaceTension extends LinearQuantity<SurfaceTension> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<SurfaceTension, SurfaceTension> KIND = QuantityKind.linear(
            "surface tension",
            SurfaceTension.class,
            new Dimension(0, 1, -2, 0, 0, 0),
            SurfaceTension::new,
            0.05,
            List.of(Units.MILLINEWTON_PER_METRE, Units.NEWTON_PER_METRE));

    private SurfaceTension(double si) {
        super(si, KIND);
    }

    /**
     * {@return a surface tension}
     *
     * @param value surface tension in millinewtons per metre
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static SurfaceTension millinewtonsPerMetre(double value) {
        return new SurfaceTension(Units.MILLINEWTON_PER_METRE.toSi(value));
    }

    /**
     * {@return a surface tension}
     *
     * @param value surface tension in newtons per metre
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static SurfaceTension newtonsPerMetre(double value) {
        return new SurfaceTension(value);
    }

    /**
     * {@return a surface tension from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension is another one, or the value is not allowed
     */
    public static SurfaceTension of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the surface tension that a text states, such as {@code "12.5 mN/m"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws IllegalArgumentException if the text cannot be read as this quantity; the message lists what is accepted
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
