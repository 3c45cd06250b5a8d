package lostwork.quantity;

import java.util.List;
import java.util.function.DoubleFunction;
import javax.measure.Quantity;

/**
 * A kind of quantity: its name, units, bounds, natural scale, dimension, and the kind of its differences.
 *
 * <p>A user's own kind is made with {@link #linear} and a final subclass of {@link LinearQuantity}. Immutable and
 * thread-safe.
 *
 * @param <Q> the quantity
 * @param <D> the quantity that a difference of two values has
 */
public final class QuantityKind<Q extends ScalarQuantity<Q, D>, D extends LinearQuantity<D>> {
    private final String name;
    private final Class<Q> type;
    private final Dimension dimension;
    private final DoubleFunction<Q> factory;
    private final double lowest;
    private final double naturalScale;
    private final QuantityKind<D, D> difference;
    private final Unit<Q> displayUnit;
    private final List<Unit<Q>> units;

    private QuantityKind(
            String name,
            Class<Q> type,
            Dimension dimension,
            DoubleFunction<Q> factory,
            double lowest,
            double naturalScale,
            QuantityKind<D, D> difference,
            List<Unit<Q>> units) {
        this.name = name;
        this.type = type;
        this.dimension = dimension;
        this.factory = factory;
        this.lowest = lowest;
        this.naturalScale = naturalScale;
        this.difference = difference == null ? asLinear() : difference;
        this.displayUnit = units.get(0);
        this.units = units;
    }

    @SuppressWarnings("unchecked") // only reached from linear(...), where D is Q
    private QuantityKind<D, D> asLinear() {
        return (QuantityKind<D, D>) this;
    }

    /**
     * {@return a kind whose differences are of the same kind, without bounds}
     *
     * @param <Q> the quantity
     * @param name the name in words, such as {@code "mass flow"}
     * @param type the class of the quantity
     * @param dimension the dimension
     * @param factory makes a value from a number in the coherent SI unit
     * @param naturalScale a typical value in the coherent SI unit, above 0, used to judge residuals
     * @param units the units that are read and printed, the one for display first
     */
    public static <Q extends LinearQuantity<Q>> QuantityKind<Q, Q> linear(
            String name,
            Class<Q> type,
            Dimension dimension,
            DoubleFunction<Q> factory,
            double naturalScale,
            List<Unit<Q>> units) {
        return new QuantityKind<>(
                name, type, dimension, factory, -Double.MAX_VALUE, naturalScale, null, List.copyOf(units));
    }

    /**
     * {@return a kind whose values are points on a scale and whose differences are of another kind}
     *
     * @param <Q> the quantity
     * @param <D> the quantity of a difference
     * @param name the name in words, such as {@code "temperature"}
     * @param type the class of the quantity
     * @param factory makes a value from a number in the coherent SI unit
     * @param lowest the lowest value that exists, in the coherent SI unit
     * @param naturalScale a typical step in the coherent SI unit, above 0, used to judge residuals
     * @param difference the kind of a difference of two values
     * @param units the units that are read and printed, the one for display first
     */
    public static <Q extends ScalarQuantity<Q, D>, D extends LinearQuantity<D>> QuantityKind<Q, D> point(
            String name,
            Class<Q> type,
            DoubleFunction<Q> factory,
            double lowest,
            double naturalScale,
            QuantityKind<D, D> difference,
            List<Unit<Q>> units) {
        return new QuantityKind<>(
                name, type, difference.dimension, factory, lowest, naturalScale, difference, List.copyOf(units));
    }

    /** {@return the name in words} */
    public String name() {
        return name;
    }

    /** {@return the class of the quantity} */
    public Class<Q> type() {
        return type;
    }

    /** {@return the dimension} */
    public Dimension dimension() {
        return dimension;
    }

    /** {@return the lowest value that exists, in the coherent SI unit} */
    public double lowest() {
        return lowest;
    }

    /** {@return a typical value or step in the coherent SI unit, used to judge residuals} */
    public double naturalScale() {
        return naturalScale;
    }

    /** {@return the kind of a difference of two values; the kind itself for linear quantities} */
    public QuantityKind<D, D> difference() {
        return difference;
    }

    /** {@return the unit that {@code toString} prints in} */
    public Unit<Q> displayUnit() {
        return displayUnit;
    }

    /** {@return the units that are read and printed} */
    public List<Unit<Q>> units() {
        return units;
    }

    /**
     * {@return a value of this kind}
     *
     * @param si the value in the coherent SI unit
     * @throws IllegalArgumentException if the value is NaN, infinite or outside the bounds
     */
    public Q ofSi(double si) {
        return factory.apply(si);
    }

    /**
     * {@return a value of this kind from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension is another one, or the value is not allowed
     */
    public Q of(Quantity<?> quantity) {
        return factory.apply(JsrBridge.toSi(quantity, this));
    }

    /**
     * {@return the value that a text states, such as {@code "3.5 bar"}}
     *
     * @param text a number with a decimal point, then a unit of this kind; locale plays no part
     * @throws IllegalArgumentException if the text has no number, no unit, or a unit that this kind does not have; the
     *     message lists the units that are accepted
     */
    public Q parse(String text) {
        return factory.apply(QuantityText.read(text, this));
    }

    /**
     * {@return the value itself, when it is allowed}
     *
     * @param si a value in the coherent SI unit
     * @throws IllegalArgumentException if the value is NaN, infinite or below the lowest value that exists
     */
    double requireValid(double si) {
        // Written as !(inside), so that NaN is refused as well.
        if (!(si >= lowest && si <= Double.MAX_VALUE)) {
            throw new IllegalArgumentException(refusal(si));
        }
        return si + 0.0; // turns -0.0 into 0.0, so that equal numbers are equal values
    }

    private String refusal(double si) {
        final String value = name + " = " + displayUnit.fromSi(si) + " " + displayUnit.symbol();
        return lowest == -Double.MAX_VALUE
                ? value + " is not allowed: it must be finite"
                : value + " is not allowed: it must be finite and at least " + displayUnit.fromSi(lowest) + " "
                        + displayUnit.symbol();
    }

    /** {@return the name} */
    @Override
    public String toString() {
        return name;
    }
}
