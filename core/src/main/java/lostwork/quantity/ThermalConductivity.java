package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * A heat flux per temperature gradient.
 *
 * <p>SI unit W/(m K). Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class ThermalConductivity extends LinearQuantity<ThermalConductivity> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<ThermalConductivity, ThermalConductivity> KIND = QuantityKind.linear(
            "thermal conductivity",
            ThermalConductivity.class,
            Dimension.MASS
                    .times(Dimension.LENGTH)
                    .dividedBy(Dimension.TEMPERATURE)
                    .dividedBy(Dimension.TIME.pow(3)),
            ThermalConductivity::new,
            1,
            List.of(Units.WATT_PER_METRE_KELVIN, Units.MILLIWATT_PER_METRE_KELVIN));

    private ThermalConductivity(double si) {
        super(si, KIND);
    }

    private ThermalConductivity(double value, Unit<ThermalConductivity> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return a thermal conductivity in watts per metre and kelvin}
     *
     * @param value the number of watts per metre and kelvin
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static ThermalConductivity wattsPerMetreKelvin(double value) {
        return new ThermalConductivity(value);
    }

    /**
     * {@return a thermal conductivity in milliwatts per metre and kelvin}
     *
     * @param value the number of milliwatts per metre and kelvin
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static ThermalConductivity milliwattsPerMetreKelvin(double value) {
        return new ThermalConductivity(value, Units.MILLIWATT_PER_METRE_KELVIN);
    }

    /**
     * {@return a thermal conductivity from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static ThermalConductivity of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the thermal conductivity that a text states, such as {@code "12.5 W/(m K)"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
     */
    public static ThermalConductivity parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in watts per metre and kelvin} */
    public double inWattsPerMetreKelvin() {
        return si();
    }

    /** {@return the value in milliwatts per metre and kelvin} */
    public double inMilliwattsPerMetreKelvin() {
        return Units.MILLIWATT_PER_METRE_KELVIN.fromSi(si());
    }

    /**
     * {@return this thermal conductivity divided by a heat transfer coefficient}
     *
     * @param heatTransferCoefficient the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public Length over(HeatTransferCoefficient heatTransferCoefficient) {
        return Length.metres(si() / heatTransferCoefficient.si());
    }

    /**
     * {@return this thermal conductivity divided by a length}
     *
     * @param length the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public HeatTransferCoefficient over(Length length) {
        return HeatTransferCoefficient.wattsPerSquareMetreKelvin(si() / length.si());
    }

    @Override
    public QuantityKind<ThermalConductivity, ThermalConductivity> kind() {
        return KIND;
    }

    @Override
    protected ThermalConductivity with(double si) {
        return new ThermalConductivity(si);
    }
}
