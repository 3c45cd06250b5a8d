package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * A thermodynamic temperature: a point on the absolute scale, not a difference.
 *
 * <p>SI unit K. Above 0 K. Immutable and thread-safe.
 */
public final class Temperature extends ScalarQuantity<Temperature, TemperatureSpan> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<Temperature, TemperatureSpan> KIND = QuantityKind.point(
            "temperature",
            Temperature.class,
            Temperature::new,
            Double.MIN_VALUE,
            100,
            TemperatureSpan.KIND,
            List.of(Units.CELSIUS, Units.KELVIN, Units.FAHRENHEIT, Units.RANKINE));

    private Temperature(double si) {
        super(si, KIND);
    }

    /**
     * {@return a temperature}
     *
     * @param value temperature in degrees Celsius
     * @throws IllegalArgumentException if the value is NaN, infinite or not above absolute zero
     */
    public static Temperature celsius(double value) {
        return new Temperature(Units.CELSIUS.toSi(value));
    }

    /**
     * {@return a temperature}
     *
     * @param value temperature in kelvin
     * @throws IllegalArgumentException if the value is NaN, infinite or not above absolute zero
     */
    public static Temperature kelvin(double value) {
        return new Temperature(value);
    }

    /**
     * {@return a temperature}
     *
     * @param value temperature in degrees Fahrenheit
     * @throws IllegalArgumentException if the value is NaN, infinite or not above absolute zero
     */
    public static Temperature fahrenheit(double value) {
        return new Temperature(Units.FAHRENHEIT.toSi(value));
    }

    /**
     * {@return a temperature}
     *
     * @param value temperature in degrees Rankine
     * @throws IllegalArgumentException if the value is NaN, infinite or not above absolute zero
     */
    public static Temperature rankine(double value) {
        return new Temperature(Units.RANKINE.toSi(value));
    }

    /**
     * {@return a temperature from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension is another one, or the value is not allowed
     */
    public static Temperature of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the temperature that a text states, such as {@code "25 °C"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws IllegalArgumentException if the text cannot be read as this quantity; the message lists what is accepted
     */
    public static Temperature parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in degrees Celsius} */
    public double inCelsius() {
        return Units.CELSIUS.fromSi(si());
    }

    /** {@return the value in kelvin} */
    public double inKelvin() {
        return si();
    }

    /** {@return the value in degrees Fahrenheit} */
    public double inFahrenheit() {
        return Units.FAHRENHEIT.fromSi(si());
    }

    /** {@return the value in degrees Rankine} */
    public double inRankine() {
        return Units.RANKINE.fromSi(si());
    }

    /**
     * {@return the difference of this value and another}
     *
     * @param other the value that the difference is counted from
     */
    public TemperatureSpan minus(Temperature other) {
        return TemperatureSpan.kelvins(si() - other.si());
    }

    /**
     * {@return a value that lies above this one}
     *
     * @param difference how far
     * @throws IllegalArgumentException if the result does not exist
     */
    public Temperature plus(TemperatureSpan difference) {
        return new Temperature(si() + difference.si());
    }

    /**
     * {@return a value that lies below this one}
     *
     * @param difference how far
     * @throws IllegalArgumentException if the result does not exist
     */
    public Temperature minus(TemperatureSpan difference) {
        return new Temperature(si() - difference.si());
    }

    /**
     * {@return how many times another absolute temperature goes into this one}
     *
     * @param other the divisor
     */
    public Ratio over(Temperature other) {
        return Ratio.fraction(si() / other.si());
    }

    @Override
    public QuantityKind<Temperature, TemperatureSpan> kind() {
        return KIND;
    }
}
