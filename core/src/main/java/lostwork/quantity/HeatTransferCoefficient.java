package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * A heat flux per temperature span.
 *
 * <p>SI unit W/(m² K). Any finite value exists. Immutable and thread-safe.
 */
public final class HeatTransferCoefficient extends LinearQuantity<HeatTransferCoefficient> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<HeatTransferCoefficient, HeatTransferCoefficient> KIND = QuantityKind.linear(
            "heat transfer coefficient",
            HeatTransferCoefficient.class,
            new Dimension(0, 1, -3, -1, 0, 0),
            HeatTransferCoefficient::new,
            100,
            List.of(Units.WATT_PER_SQUARE_METRE_KELVIN));

    private HeatTransferCoefficient(double si) {
        super(si, KIND);
    }

    /**
     * {@return a heat transfer coefficient}
     *
     * @param value heat transfer coefficient in watts per square metre and kelvin
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static HeatTransferCoefficient wattsPerSquareMetreKelvin(double value) {
        return new HeatTransferCoefficient(value);
    }

    /**
     * {@return a heat transfer coefficient from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension is another one, or the value is not allowed
     */
    public static HeatTransferCoefficient of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the heat transfer coefficient that a text states, such as {@code "12.5 W/(m² K)"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws IllegalArgumentException if the text cannot be read as this quantity; the message lists what is accepted
     */
    public static HeatTransferCoefficient parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in watts per square metre and kelvin} */
    public double inWattsPerSquareMetreKelvin() {
        return si();
    }

    /**
     * {@return the product with an area}
     *
     * @param area the other factor
     */
    public Conductance times(Area area) {
        return Conductance.wattsPerKelvin(si() * area.si());
    }

    /**
     * {@return the product with a temperature span}
     *
     * @param temperatureSpan the other factor
     */
    public HeatFlux times(TemperatureSpan temperatureSpan) {
        return HeatFlux.wattsPerSquareMetre(si() * temperatureSpan.si());
    }

    @Override
    public QuantityKind<HeatTransferCoefficient, HeatTransferCoefficient> kind() {
        return KIND;
    }

    @Override
    protected HeatTransferCoefficient with(double si) {
        return new HeatTransferCoefficient(si);
    }
}
