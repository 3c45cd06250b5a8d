package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * An entropy per time: entropy flow or entropy generation.
 *
 * <p>SI unit W/K. Any finite value exists. Immutable and thread-safe.
 */
public final class EntropyRate extends LinearQuantity<EntropyRate> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<EntropyRate, EntropyRate> KIND = QuantityKind.linear(
            "entropy rate",
            EntropyRate.class,
            new Dimension(2, 1, -3, -1, 0, 0),
            EntropyRate::new,
            1e3,
            List.of(Units.KILOWATT_PER_KELVIN_ENTROPY, Units.WATT_PER_KELVIN_ENTROPY));

    private EntropyRate(double si) {
        super(si, KIND);
    }

    /**
     * {@return an entropy rate}
     *
     * @param value entropy rate in kilowatts per kelvin
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static EntropyRate kilowattsPerKelvin(double value) {
        return new EntropyRate(Units.KILOWATT_PER_KELVIN_ENTROPY.toSi(value));
    }

    /**
     * {@return an entropy rate}
     *
     * @param value entropy rate in watts per kelvin
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static EntropyRate wattsPerKelvin(double value) {
        return new EntropyRate(value);
    }

    /**
     * {@return an entropy rate from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension is another one, or the value is not allowed
     */
    public static EntropyRate of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the entropy rate that a text states, such as {@code "12.5 kW/K"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws IllegalArgumentException if the text cannot be read as this quantity; the message lists what is accepted
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
     * {@return the product with a temperature}
     *
     * @param temperature the other factor
     */
    public Power times(Temperature temperature) {
        return Power.watts(si() * temperature.si());
    }

    /**
     * {@return the product with a duration}
     *
     * @param duration the other factor
     */
    public Entropy times(Duration duration) {
        return Entropy.joulesPerKelvin(si() * duration.si());
    }

    /**
     * {@return the quotient with a mass flow}
     *
     * @param massFlow the divisor, not zero
     * @throws IllegalArgumentException if the quotient is not finite
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

    @Override
    public QuantityKind<EntropyRate, EntropyRate> kind() {
        return KIND;
    }

    @Override
    protected EntropyRate with(double si) {
        return new EntropyRate(si);
    }
}
