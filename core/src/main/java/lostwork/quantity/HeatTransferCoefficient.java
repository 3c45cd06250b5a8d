package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * A heat flux per temperature span.
 *
 * <p>SI unit W/(m² K). Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class HeatTransferCoefficient extends LinearQuantity<HeatTransferCoefficient> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<HeatTransferCoefficient, HeatTransferCoefficient> KIND = QuantityKind.linear(
            "heat transfer coefficient",
            HeatTransferCoefficient.class,
            Dimension.MASS.dividedBy(Dimension.TEMPERATURE).dividedBy(Dimension.TIME.pow(3)),
            HeatTransferCoefficient::new,
            100,
            List.of(Units.WATT_PER_SQUARE_METRE_KELVIN));

    private HeatTransferCoefficient(double si) {
        super(si, KIND);
    }

    private HeatTransferCoefficient(double value, Unit<HeatTransferCoefficient> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return a heat transfer coefficient in watts per square metre and kelvin}
     *
     * @param value the number of watts per square metre and kelvin
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static HeatTransferCoefficient wattsPerSquareMetreKelvin(double value) {
        return new HeatTransferCoefficient(value);
    }

    /**
     * {@return a heat transfer coefficient from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static HeatTransferCoefficient of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the heat transfer coefficient that a text states, such as {@code "12.5 W/(m² K)"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
     */
    public static HeatTransferCoefficient parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in watts per square metre and kelvin} */
    public double inWattsPerSquareMetreKelvin() {
        return si();
    }

    /**
     * {@return this heat transfer coefficient times an area}
     *
     * @param area the other factor
     */
    public Conductance times(Area area) {
        return Conductance.wattsPerKelvin(si() * area.si());
    }

    /**
     * {@return this heat transfer coefficient times a temperature span}
     *
     * @param temperatureSpan the other factor
     */
    public HeatFlux times(TemperatureSpan temperatureSpan) {
        return HeatFlux.wattsPerSquareMetre(si() * temperatureSpan.si());
    }

    /**
     * {@return this heat transfer coefficient times a length}
     *
     * @param length the other factor
     */
    public ThermalConductivity times(Length length) {
        return ThermalConductivity.wattsPerMetreKelvin(si() * length.si());
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
