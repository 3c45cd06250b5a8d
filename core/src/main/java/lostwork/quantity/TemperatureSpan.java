package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * A difference of two temperatures.
 *
 * <p>SI unit K. Any finite value exists. Immutable and thread-safe.
 */
public final class TemperatureSpan extends LinearQuantity<TemperatureSpan> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<TemperatureSpan, TemperatureSpan> KIND = QuantityKind.linear(
            "temperature span",
            TemperatureSpan.class,
            new Dimension(0, 0, 0, 1, 0, 0),
            TemperatureSpan::new,
            10,
            List.of(Units.KELVIN_SPAN, Units.RANKINE_SPAN));

    private TemperatureSpan(double si) {
        super(si, KIND);
    }

    /**
     * {@return a temperature span}
     *
     * @param value temperature span in kelvin
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static TemperatureSpan kelvins(double value) {
        return new TemperatureSpan(value);
    }

    /**
     * {@return a temperature span}
     *
     * @param value temperature span in degrees Rankine, each as large as a degree Fahrenheit
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static TemperatureSpan rankines(double value) {
        return new TemperatureSpan(Units.RANKINE_SPAN.toSi(value));
    }

    /**
     * {@return a temperature span from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension is another one, or the value is not allowed
     */
    public static TemperatureSpan of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the temperature span that a text states, such as {@code "12.5 K"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws IllegalArgumentException if the text cannot be read as this quantity; the message lists what is accepted
     */
    public static TemperatureSpan parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in kelvin} */
    public double inKelvins() {
        return si();
    }

    /** {@return the value in degrees Rankine, each as large as a degree Fahrenheit} */
    public double inRankines() {
        return Units.RANKINE_SPAN.fromSi(si());
    }

    @Override
    public QuantityKind<TemperatureSpan, TemperatureSpan> kind() {
        return KIND;
    }

    @Override
    protected TemperatureSpan with(double si) {
        return new TemperatureSpan(si);
    }
}
