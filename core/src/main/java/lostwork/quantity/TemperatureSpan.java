package lostwork.quantity;

import java.util.List;
import java.util.Map;
import javax.measure.Quantity;

/**
 * A difference of two temperatures.
 *
 * <p>SI unit K. Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class TemperatureSpan extends LinearQuantity<TemperatureSpan> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<TemperatureSpan, TemperatureSpan> KIND = QuantityKind.linear(
                    "temperature span",
                    TemperatureSpan.class,
                    Dimension.TEMPERATURE,
                    TemperatureSpan::new,
                    10,
                    List.of(Units.KELVIN_SPAN, Units.RANKINE_SPAN))
            .withHints(Map.of(
                    "°C", "°C states a point on a scale: write a span in K, which is as large",
                    "C", "write a span in K",
                    "°F", "°F states a point on a scale: write a span in °R, which is as large",
                    "F", "write a span in °R"));

    private TemperatureSpan(double si) {
        super(si, KIND);
    }

    private TemperatureSpan(double value, Unit<TemperatureSpan> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return a temperature span in kelvin}
     *
     * @param value the number of kelvin
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static TemperatureSpan kelvins(double value) {
        return new TemperatureSpan(value);
    }

    /**
     * {@return a temperature span in degrees Rankine, each as large as a degree Fahrenheit}
     *
     * @param value the number of degrees Rankine, each as large as a degree Fahrenheit
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static TemperatureSpan rankines(double value) {
        return new TemperatureSpan(value, Units.RANKINE_SPAN);
    }

    /**
     * {@return a temperature span from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static TemperatureSpan of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the temperature span that a text states, such as {@code "12.5 K"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
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

    /**
     * {@return this temperature span times a thermal conductance}
     *
     * @param conductance the other factor
     */
    public Power times(Conductance conductance) {
        return Power.watts(si() * conductance.si());
    }

    /**
     * {@return this temperature span times a heat capacity rate}
     *
     * @param heatCapacityRate the other factor
     */
    public Power times(HeatCapacityRate heatCapacityRate) {
        return Power.watts(si() * heatCapacityRate.si());
    }

    /**
     * {@return this temperature span times a heat transfer coefficient}
     *
     * @param heatTransferCoefficient the other factor
     */
    public HeatFlux times(HeatTransferCoefficient heatTransferCoefficient) {
        return HeatFlux.wattsPerSquareMetre(si() * heatTransferCoefficient.si());
    }

    /**
     * {@return this temperature span times a molar heat capacity}
     *
     * @param molarHeatCapacity the other factor
     */
    public MolarEnergy times(MolarHeatCapacity molarHeatCapacity) {
        return MolarEnergy.joulesPerMole(si() * molarHeatCapacity.si());
    }

    /**
     * {@return this temperature span times a specific heat capacity}
     *
     * @param specificHeatCapacity the other factor
     */
    public SpecificEnergy times(SpecificHeatCapacity specificHeatCapacity) {
        return SpecificEnergy.joulesPerKilogram(si() * specificHeatCapacity.si());
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
