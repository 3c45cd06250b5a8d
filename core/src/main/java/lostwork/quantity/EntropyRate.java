package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * An entropy per time: entropy flow or entropy generation.
 *
 * <p>SI unit W/K. Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class EntropyRate extends LinearQuantity<EntropyRate> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<EntropyRate, EntropyRate> KIND = QuantityKind.linear(
            "entropy rate",
            EntropyRate.class,
            Dimension.MASS
                    .times(Dimension.LENGTH.pow(2))
                    .dividedBy(Dimension.TEMPERATURE)
                    .dividedBy(Dimension.TIME.pow(3)),
            EntropyRate::new,
            1e3,
            List.of(Units.KILOWATT_PER_KELVIN_ENTROPY, Units.WATT_PER_KELVIN_ENTROPY));

    private EntropyRate(double si) {
        super(si, KIND);
    }

    private EntropyRate(double value, Unit<EntropyRate> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return an entropy rate in kilowatts per kelvin}
     *
     * @param value the number of kilowatts per kelvin
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static EntropyRate kilowattsPerKelvin(double value) {
        return new EntropyRate(value, Units.KILOWATT_PER_KELVIN_ENTROPY);
    }

    /**
     * {@return an entropy rate in watts per kelvin}
     *
     * @param value the number of watts per kelvin
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static EntropyRate wattsPerKelvin(double value) {
        return new EntropyRate(value);
    }

    /**
     * {@return an entropy rate from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static EntropyRate of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the entropy rate that a text states, such as {@code "12.5 kW/K"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
     */
    public static EntropyRate parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in kilowatts per kelvin} */
    public double inKilowattsPerKelvin() {
        return Units.KILOWATT_PER_KELVIN_ENTROPY.fromSi(si());
    }

    /** {@return the value in watts per kelvin} */
    public double inWattsPerKelvin() {
        return si();
    }

    /**
     * {@return this entropy rate times a temperature}
     *
     * @param temperature the other factor
     */
    public Power times(Temperature temperature) {
        return Power.watts(si() * temperature.si());
    }

    /**
     * {@return this entropy rate times a duration}
     *
     * @param duration the other factor
     */
    public Entropy times(Duration duration) {
        return Entropy.joulesPerKelvin(si() * duration.si());
    }

    /**
     * {@return this entropy rate divided by a mass flow}
     *
     * @param massFlow the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public SpecificEntropy over(MassFlow massFlow) {
        return SpecificEntropy.joulesPerKilogramKelvin(si() / massFlow.si());
    }

    /**
     * {@return the entropy flow that travels with a heat flow at a temperature: Q/T}
     *
     * @param heat the heat flow
     * @param temperature the temperature at which it crosses the boundary
     */
    public static EntropyRate ofHeat(Power heat, Temperature temperature) {
        return new EntropyRate(heat.si() / temperature.si());
    }

    /**
     * {@return this entropy rate divided by a molar entropy}
     *
     * @param molarEntropy the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public MolarFlow over(MolarEntropy molarEntropy) {
        return MolarFlow.molesPerSecond(si() / molarEntropy.si());
    }

    /**
     * {@return this entropy rate divided by a molar flow}
     *
     * @param molarFlow the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public MolarEntropy over(MolarFlow molarFlow) {
        return MolarEntropy.joulesPerMoleKelvin(si() / molarFlow.si());
    }

    /**
     * {@return this entropy rate divided by a specific entropy}
     *
     * @param specificEntropy the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public MassFlow over(SpecificEntropy specificEntropy) {
        return MassFlow.kilogramsPerSecond(si() / specificEntropy.si());
    }

    @Override
    public QuantityKind<EntropyRate, EntropyRate> kind() {
        return KIND;
    }

    @Override
    protected EntropyRate with(double si) {
        return new EntropyRate(si);
    }
}
