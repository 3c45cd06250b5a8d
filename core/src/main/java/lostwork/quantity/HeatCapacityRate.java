package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * A mass flow times its specific heat capacity.
 *
 * <p>SI unit W/K. Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class HeatCapacityRate extends LinearQuantity<HeatCapacityRate> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<HeatCapacityRate, HeatCapacityRate> KIND = QuantityKind.linear(
            "heat capacity rate",
            HeatCapacityRate.class,
            Dimension.MASS
                    .times(Dimension.LENGTH.pow(2))
                    .dividedBy(Dimension.TEMPERATURE)
                    .dividedBy(Dimension.TIME.pow(3)),
            HeatCapacityRate::new,
            1e3,
            List.of(Units.KILOWATT_PER_KELVIN_CAPACITY, Units.WATT_PER_KELVIN_CAPACITY));

    private HeatCapacityRate(double si) {
        super(si, KIND);
    }

    private HeatCapacityRate(double value, Unit<HeatCapacityRate> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return a heat capacity rate in kilowatts per kelvin}
     *
     * @param value the number of kilowatts per kelvin
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static HeatCapacityRate kilowattsPerKelvin(double value) {
        return new HeatCapacityRate(value, Units.KILOWATT_PER_KELVIN_CAPACITY);
    }

    /**
     * {@return a heat capacity rate in watts per kelvin}
     *
     * @param value the number of watts per kelvin
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static HeatCapacityRate wattsPerKelvin(double value) {
        return new HeatCapacityRate(value);
    }

    /**
     * {@return a heat capacity rate from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static HeatCapacityRate of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the heat capacity rate that a text states, such as {@code "12.5 kW/K"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
     */
    public static HeatCapacityRate parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in kilowatts per kelvin} */
    public double inKilowattsPerKelvin() {
        return Units.KILOWATT_PER_KELVIN_CAPACITY.fromSi(si());
    }

    /** {@return the value in watts per kelvin} */
    public double inWattsPerKelvin() {
        return si();
    }

    /**
     * {@return this heat capacity rate times a temperature span}
     *
     * @param temperatureSpan the other factor
     */
    public Power times(TemperatureSpan temperatureSpan) {
        return Power.watts(si() * temperatureSpan.si());
    }

    /**
     * {@return this heat capacity rate divided by a mass flow}
     *
     * @param massFlow the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public SpecificHeatCapacity over(MassFlow massFlow) {
        return SpecificHeatCapacity.joulesPerKilogramKelvin(si() / massFlow.si());
    }

    /**
     * {@return this heat capacity rate divided by a molar flow}
     *
     * @param molarFlow the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public MolarHeatCapacity over(MolarFlow molarFlow) {
        return MolarHeatCapacity.joulesPerMoleKelvin(si() / molarFlow.si());
    }

    /**
     * {@return this heat capacity rate divided by a molar heat capacity}
     *
     * @param molarHeatCapacity the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public MolarFlow over(MolarHeatCapacity molarHeatCapacity) {
        return MolarFlow.molesPerSecond(si() / molarHeatCapacity.si());
    }

    /**
     * {@return this heat capacity rate divided by a specific heat capacity}
     *
     * @param specificHeatCapacity the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public MassFlow over(SpecificHeatCapacity specificHeatCapacity) {
        return MassFlow.kilogramsPerSecond(si() / specificHeatCapacity.si());
    }

    @Override
    public QuantityKind<HeatCapacityRate, HeatCapacityRate> kind() {
        return KIND;
    }

    @Override
    protected HeatCapacityRate with(double si) {
        return new HeatCapacityRate(si);
    }
}
