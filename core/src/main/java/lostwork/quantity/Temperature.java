package lostwork.quantity;

import java.util.List;
import java.util.Map;
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
                    List.of(Units.CELSIUS, Units.KELVIN, Units.FAHRENHEIT, Units.RANKINE))
            .withLimit("absolute zero", "")
            .withHints(Map.of(
                    "C", "C is the coulomb: write °C",
                    "c", "write °C",
                    "° C", "write °C",
                    "F", "F is the farad: write °F",
                    "R", "write °R",
                    "°K", "the kelvin has no degree sign: write K",
                    "°", "write °C or °F"));

    private Temperature(double si) {
        super(si, KIND);
    }

    private Temperature(double value, Unit<Temperature> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return a temperature in degrees Celsius}
     *
     * @param value the number of degrees Celsius
     * @throws OutOfRangeException if the value is NaN, infinite or not above absolute zero
     */
    public static Temperature celsius(double value) {
        return new Temperature(value, Units.CELSIUS);
    }

    /**
     * {@return a temperature in kelvin}
     *
     * @param value the number of kelvin
     * @throws OutOfRangeException if the value is NaN, infinite or not above absolute zero
     */
    public static Temperature kelvin(double value) {
        return new Temperature(value);
    }

    /**
     * {@return a temperature in degrees Fahrenheit}
     *
     * @param value the number of degrees Fahrenheit
     * @throws OutOfRangeException if the value is NaN, infinite or not above absolute zero
     */
    public static Temperature fahrenheit(double value) {
        return new Temperature(value, Units.FAHRENHEIT);
    }

    /**
     * {@return a temperature in degrees Rankine}
     *
     * @param value the number of degrees Rankine
     * @throws OutOfRangeException if the value is NaN, infinite or not above absolute zero
     */
    public static Temperature rankine(double value) {
        return new Temperature(value, Units.RANKINE);
    }

    /**
     * {@return a temperature from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static Temperature of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the temperature that a text states, such as {@code "25 °C"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
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
     * @throws OutOfRangeException if the result does not exist
     */
    public Temperature plus(TemperatureSpan difference) {
        return new Temperature(si() + difference.si());
    }

    /**
     * {@return a value that lies below this one}
     *
     * @param difference how far
     * @throws OutOfRangeException if the result does not exist
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

    /**
     * {@return this temperature times an entropy}
     *
     * @param entropy the other factor
     */
    public Energy times(Entropy entropy) {
        return Energy.joules(si() * entropy.si());
    }

    /**
     * {@return this temperature times an entropy rate}
     *
     * @param entropyRate the other factor
     */
    public Power times(EntropyRate entropyRate) {
        return Power.watts(si() * entropyRate.si());
    }

    /**
     * {@return this temperature times a molar entropy}
     *
     * @param molarEntropy the other factor
     */
    public MolarEnergy times(MolarEntropy molarEntropy) {
        return MolarEnergy.joulesPerMole(si() * molarEntropy.si());
    }

    /**
     * {@return this temperature times a specific entropy}
     *
     * @param specificEntropy the other factor
     */
    public SpecificEnergy times(SpecificEntropy specificEntropy) {
        return SpecificEnergy.joulesPerKilogram(si() * specificEntropy.si());
    }

    @Override
    public QuantityKind<Temperature, TemperatureSpan> kind() {
        return KIND;
    }
}
