package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * A heat flux per temperature gradient.
 *
 * <p>SI unit W/(m K). Any finite value exists. Immutable and thread-safe.
 */
public final class ThermalConductivity extends LinearQuantity<ThermalConductivity> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<ThermalConductivity, ThermalConductivity> KIND = QuantityKind.linear(
            "thermal conductivity",
            ThermalConductivity.class,
            new Dimension(1, 1, -3, -1, 0, 0),
            ThermalConductivity::new,
            1,
            List.of(Units.WATT_PER_METRE_KELVIN, Units.MILLIWATT_PER_METRE_KELVIN));

    private ThermalConductivity(double si) {
        super(si, KIND);
    }

    /**
     * {@return a thermal conductivity}
     *
     * @param value thermal conductivity in watts per metre and kelvin
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static ThermalConductivity wattsPerMetreKelvin(double value) {
        return new ThermalConductivity(value);
    }

    /**
     * {@return a thermal conductivity}
     *
     * @param value thermal conductivity in milliwatts per metre and kelvin
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static ThermalConductivity milliwattsPerMetreKelvin(double value) {
        return new ThermalConductivity(Units.MILLIWATT_PER_METRE_KELVIN.toSi(value));
    }

    /**
     * {@return a thermal conductivity from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension is another one, or the value is not allowed
     */
    public static ThermalConductivity of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the thermal conductivity that a text states, such as {@code "12.5 W/(m K)"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws IllegalArgumentException if the text cannot be read as this quantity; the message lists what is accepted
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

    @Override
    public QuantityKind<ThermalConductivity, ThermalConductivity> kind() {
        return KIND;
    }

    @Override
    protected ThermalConductivity with(double si) {
        return new ThermalConductivity(si);
    }
}
