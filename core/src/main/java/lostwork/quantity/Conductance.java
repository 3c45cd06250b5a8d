package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * A heat rate per temperature span: the UA of a heat exchanger.
 *
 * <p>SI unit W/K. Any finite value exists. Immutable and thread-safe.
 */
public final class Conductance extends LinearQuantity<Conductance> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<Conductance, Conductance> KIND = QuantityKind.linear(
            "thermal conductance",
            Conductance.class,
            new Dimension(2, 1, -3, -1, 0, 0),
            Conductance::new,
            1e4,
            List.of(Units.KILOWATT_PER_KELVIN, Units.WATT_PER_KELVIN));

    private Conductance(double si) {
        super(si, KIND);
    }

    /**
     * {@return a thermal conductance}
     *
     * @param value thermal conductance in kilowatts per kelvin
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Conductance kilowattsPerKelvin(double value) {
        return new Conductance(Units.KILOWATT_PER_KELVIN.toSi(value));
    }

    /**
     * {@return a thermal conductance}
     *
     * @param value thermal conductance in watts per kelvin
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Conductance wattsPerKelvin(double value) {
        return new Conductance(value);
    }

    /**
     * {@return a thermal conductance from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension is another one, or the value is not allowed
     */
    public static Conductance of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the thermal conductance that a text states, such as {@code "12.5 kW/K"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws IllegalArgumentException if the text cannot be read as this quantity; the message lists what is accepted
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
     * {@return the product with a temperature span}
     *
     * @param temperatureSpan the other factor
     */
    public Power times(TemperatureSpan temperatureSpan) {
        return Power.watts(si() * temperatureSpan.si());
    }

    /**
     * {@return the quotient with an area}
     *
     * @param area the divisor, not zero
     * @throws IllegalArgumentException if the quotient is not finite
     */
    public HeatTransferCoefficient over(Area area) {
        return HeatTransferCoefficient.wattsPerSquareMetreKelvin(si() / area.si());
    }

    /**
     * {@return the quotient with a heat transfer coefficient}
     *
     * @param heatTransferCoefficient the divisor, not zero
     * @throws IllegalArgumentException if the quotient is not finite
     */
    public Area over(HeatTransferCoefficient heatTransferCoefficient) {
        return Area.squareMetres(si() / heatTransferCoefficient.si());
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
