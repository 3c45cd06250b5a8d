package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * A heat rate per area.
 *
 * <p>SI unit W/m². Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class HeatFlux extends LinearQuantity<HeatFlux> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<HeatFlux, HeatFlux> KIND = QuantityKind.linear(
            "heat flux",
            HeatFlux.class,
            Dimension.MASS.dividedBy(Dimension.TIME.pow(3)),
            HeatFlux::new,
            1e4,
            List.of(Units.KILOWATT_PER_SQUARE_METRE, Units.WATT_PER_SQUARE_METRE));

    private HeatFlux(double si) {
        super(si, KIND);
    }

    private HeatFlux(double value, Unit<HeatFlux> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return a heat flux in kilowatts per square metre}
     *
     * @param value the number of kilowatts per square metre
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static HeatFlux kilowattsPerSquareMetre(double value) {
        return new HeatFlux(value, Units.KILOWATT_PER_SQUARE_METRE);
    }

    /**
     * {@return a heat flux in watts per square metre}
     *
     * @param value the number of watts per square metre
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static HeatFlux wattsPerSquareMetre(double value) {
        return new HeatFlux(value);
    }

    /**
     * {@return a heat flux from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static HeatFlux of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the heat flux that a text states, such as {@code "12.5 kW/m²"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
     */
    public static HeatFlux parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in kilowatts per square metre} */
    public double inKilowattsPerSquareMetre() {
        return Units.KILOWATT_PER_SQUARE_METRE.fromSi(si());
    }

    /** {@return the value in watts per square metre} */
    public double inWattsPerSquareMetre() {
        return si();
    }

    /**
     * {@return this heat flux times an area}
     *
     * @param area the other factor
     */
    public Power times(Area area) {
        return Power.watts(si() * area.si());
    }

    /**
     * {@return this heat flux divided by a temperature span}
     *
     * @param temperatureSpan the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public HeatTransferCoefficient over(TemperatureSpan temperatureSpan) {
        return HeatTransferCoefficient.wattsPerSquareMetreKelvin(si() / temperatureSpan.si());
    }

    /**
     * {@return this heat flux divided by a heat transfer coefficient}
     *
     * @param heatTransferCoefficient the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public TemperatureSpan over(HeatTransferCoefficient heatTransferCoefficient) {
        return TemperatureSpan.kelvins(si() / heatTransferCoefficient.si());
    }

    @Override
    public QuantityKind<HeatFlux, HeatFlux> kind() {
        return KIND;
    }

    @Override
    protected HeatFlux with(double si) {
        return new HeatFlux(si);
    }
}
