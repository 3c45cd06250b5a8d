package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * A heat capacity per amount of substance.
 *
 * <p>SI unit J/(mol K). Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class MolarHeatCapacity extends LinearQuantity<MolarHeatCapacity> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<MolarHeatCapacity, MolarHeatCapacity> KIND = QuantityKind.linear(
            "molar heat capacity",
            MolarHeatCapacity.class,
            Dimension.MASS
                    .times(Dimension.LENGTH.pow(2))
                    .dividedBy(Dimension.TEMPERATURE)
                    .dividedBy(Dimension.AMOUNT)
                    .dividedBy(Dimension.TIME.pow(2)),
            MolarHeatCapacity::new,
            30,
            List.of(Units.JOULE_PER_MOLE_KELVIN_CAPACITY));

    private MolarHeatCapacity(double si) {
        super(si, KIND);
    }

    private MolarHeatCapacity(double value, Unit<MolarHeatCapacity> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return a molar heat capacity in joules per mole and kelvin}
     *
     * @param value the number of joules per mole and kelvin
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static MolarHeatCapacity joulesPerMoleKelvin(double value) {
        return new MolarHeatCapacity(value);
    }

    /**
     * {@return a molar heat capacity from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static MolarHeatCapacity of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the molar heat capacity that a text states, such as {@code "12.5 J/(mol K)"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
     */
    public static MolarHeatCapacity parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in joules per mole and kelvin} */
    public double inJoulesPerMoleKelvin() {
        return si();
    }

    /**
     * {@return this molar heat capacity divided by a molar mass}
     *
     * @param molarMass the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public SpecificHeatCapacity over(MolarMass molarMass) {
        return SpecificHeatCapacity.joulesPerKilogramKelvin(si() / molarMass.si());
    }

    /**
     * {@return this molar heat capacity times a temperature span}
     *
     * @param temperatureSpan the other factor
     */
    public MolarEnergy times(TemperatureSpan temperatureSpan) {
        return MolarEnergy.joulesPerMole(si() * temperatureSpan.si());
    }

    /**
     * {@return this molar heat capacity times a molar flow}
     *
     * @param molarFlow the other factor
     */
    public HeatCapacityRate times(MolarFlow molarFlow) {
        return HeatCapacityRate.wattsPerKelvin(si() * molarFlow.si());
    }

    /**
     * {@return this molar heat capacity divided by a specific heat capacity}
     *
     * @param specificHeatCapacity the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public MolarMass over(SpecificHeatCapacity specificHeatCapacity) {
        return MolarMass.kilogramsPerMole(si() / specificHeatCapacity.si());
    }

    @Override
    public QuantityKind<MolarHeatCapacity, MolarHeatCapacity> kind() {
        return KIND;
    }

    @Override
    protected MolarHeatCapacity with(double si) {
        return new MolarHeatCapacity(si);
    }
}
