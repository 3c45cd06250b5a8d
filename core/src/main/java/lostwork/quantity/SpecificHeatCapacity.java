package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * A heat capacity per mass.
 *
 * <p>SI unit J/(kg K). Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class SpecificHeatCapacity extends LinearQuantity<SpecificHeatCapacity> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<SpecificHeatCapacity, SpecificHeatCapacity> KIND = QuantityKind.linear(
            "specific heat capacity",
            SpecificHeatCapacity.class,
            Dimension.LENGTH.pow(2).dividedBy(Dimension.TEMPERATURE).dividedBy(Dimension.TIME.pow(2)),
            SpecificHeatCapacity::new,
            1e3,
            List.of(
                    Units.KILOJOULE_PER_KILOGRAM_KELVIN_CAPACITY,
                    Units.JOULE_PER_KILOGRAM_KELVIN_CAPACITY,
                    Units.BTU_PER_POUND_RANKINE_CAPACITY));

    private SpecificHeatCapacity(double si) {
        super(si, KIND);
    }

    private SpecificHeatCapacity(double value, Unit<SpecificHeatCapacity> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return a specific heat capacity in kilojoules per kilogram and kelvin}
     *
     * @param value the number of kilojoules per kilogram and kelvin
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static SpecificHeatCapacity kilojoulesPerKilogramKelvin(double value) {
        return new SpecificHeatCapacity(value, Units.KILOJOULE_PER_KILOGRAM_KELVIN_CAPACITY);
    }

    /**
     * {@return a specific heat capacity in joules per kilogram and kelvin}
     *
     * @param value the number of joules per kilogram and kelvin
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static SpecificHeatCapacity joulesPerKilogramKelvin(double value) {
        return new SpecificHeatCapacity(value);
    }

    /**
     * {@return a specific heat capacity in British thermal units per pound and degree Rankine}
     *
     * @param value the number of British thermal units per pound and degree Rankine
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static SpecificHeatCapacity btuPerPoundRankine(double value) {
        return new SpecificHeatCapacity(value, Units.BTU_PER_POUND_RANKINE_CAPACITY);
    }

    /**
     * {@return a specific heat capacity from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static SpecificHeatCapacity of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the specific heat capacity that a text states, such as {@code "12.5 kJ/(kg K)"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
     */
    public static SpecificHeatCapacity parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in kilojoules per kilogram and kelvin} */
    public double inKilojoulesPerKilogramKelvin() {
        return Units.KILOJOULE_PER_KILOGRAM_KELVIN_CAPACITY.fromSi(si());
    }

    /** {@return the value in joules per kilogram and kelvin} */
    public double inJoulesPerKilogramKelvin() {
        return si();
    }

    /** {@return the value in British thermal units per pound and degree Rankine} */
    public double inBtuPerPoundRankine() {
        return Units.BTU_PER_POUND_RANKINE_CAPACITY.fromSi(si());
    }

    /**
     * {@return this specific heat capacity times a temperature span}
     *
     * @param temperatureSpan the other factor
     */
    public SpecificEnergy times(TemperatureSpan temperatureSpan) {
        return SpecificEnergy.joulesPerKilogram(si() * temperatureSpan.si());
    }

    /**
     * {@return this specific heat capacity times a mass flow}
     *
     * @param massFlow the other factor
     */
    public HeatCapacityRate times(MassFlow massFlow) {
        return HeatCapacityRate.wattsPerKelvin(si() * massFlow.si());
    }

    /**
     * {@return this specific heat capacity times a molar mass}
     *
     * @param molarMass the other factor
     */
    public MolarHeatCapacity times(MolarMass molarMass) {
        return MolarHeatCapacity.joulesPerMoleKelvin(si() * molarMass.si());
    }

    @Override
    public QuantityKind<SpecificHeatCapacity, SpecificHeatCapacity> kind() {
        return KIND;
    }

    @Override
    protected SpecificHeatCapacity with(double si) {
        return new SpecificHeatCapacity(si);
    }
}
