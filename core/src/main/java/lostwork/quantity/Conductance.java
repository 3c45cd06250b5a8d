package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * A heat rate per temperature span: the UA of a heat exchanger.
 *
 * <p>SI unit W/K. Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class Conductance extends LinearQuantity<Conductance> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<Conductance, Conductance> KIND = QuantityKind.linear(
            "thermal conductance",
            Conductance.class,
            Dimension.MASS
                    .times(Dimension.LENGTH.pow(2))
                    .dividedBy(Dimension.TEMPERATURE)
                    .dividedBy(Dimension.TIME.pow(3)),
            Conductance::new,
            1e4,
            List.of(Units.KILOWATT_PER_KELVIN, Units.WATT_PER_KELVIN));

    private Conductance(double si) {
        super(si, KIND);
    }

    private Conductance(double value, Unit<Conductance> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return a thermal conductance in kilowatts per kelvin}
     *
     * @param value the number of kilowatts per kelvin
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Conductance kilowattsPerKelvin(double value) {
        return new Conductance(value, Units.KILOWATT_PER_KELVIN);
    }

    /**
     * {@return a thermal conductance in watts per kelvin}
     *
     * @param value the number of watts per kelvin
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Conductance wattsPerKelvin(double value) {
        return new Conductance(value);
    }

    /**
     * {@return a thermal conductance from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static Conductance of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the thermal conductance that a text states, such as {@code "12.5 kW/K"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
     */
    public static Conductance parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in kilowatts per kelvin} */
    public double inKilowattsPerKelvin() {
        return Units.KILOWATT_PER_KELVIN.fromSi(si());
    }

    /** {@return the value in watts per kelvin} */
    public double inWattsPerKelvin() {
        return si();
    }

    /**
     * {@return this thermal conductance times a temperature span}
     *
     * @param temperatureSpan the other factor
     */
    public Power times(TemperatureSpan temperatureSpan) {
        return Power.watts(si() * temperatureSpan.si());
    }

    /**
     * {@return this thermal conductance divided by an area}
     *
     * @param area the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public HeatTransferCoefficient over(Area area) {
        return HeatTransferCoefficient.wattsPerSquareMetreKelvin(si() / area.si());
    }

    /**
     * {@return this thermal conductance divided by a heat transfer coefficient}
     *
     * @param heatTransferCoefficient the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public Area over(HeatTransferCoefficient heatTransferCoefficient) {
        return Area.squareMetres(si() / heatTransferCoefficient.si());
    }

    /**
     * {@return this thermal conductance divided by a heat capacity rate: the number of transfer units}
     *
     * @param heatCapacityRate the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public Ratio over(HeatCapacityRate heatCapacityRate) {
        return Ratio.fraction(si() / heatCapacityRate.si());
    }

    @Override
    public QuantityKind<Conductance, Conductance> kind() {
        return KIND;
    }

    @Override
    protected Conductance with(double si) {
        return new Conductance(si);
    }
}
