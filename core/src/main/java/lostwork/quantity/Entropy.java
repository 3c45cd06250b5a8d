package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * An entropy.
 *
 * <p>SI unit J/K. Any finite value exists. Immutable and thread-safe.
 */
public final class Entropy extends LinearQuantity<Entropy> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<Entropy, Entropy> KIND = QuantityKind.linear(
            "entropy",
            Entropy.class,
            new Dimension(2, 1, -2, -1, 0, 0),
            Entropy::new,
            1e3,
            List.of(Units.KILOJOULE_PER_KELVIN, Units.JOULE_PER_KELVIN));

    private Entropy(double si) {
        super(si, KIND);
    }

    /**
     * {@return an entropy}
     *
     * @param value entropy in kilojoules per kelvin
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Entropy kilojoulesPerKelvin(double value) {
        return new Entropy(Units.KILOJOULE_PER_KELVIN.toSi(value));
    }

    /**
     * {@return an entropy}
     *
     * @param value entropy in joules per kelvin
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Entropy joulesPerKelvin(double value) {
        return new Entropy(value);
    }

    /**
     * {@return an entropy from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension is another one, or the value is not allowed
     */
    public static Entropy of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the entropy that a text states, such as {@code "12.5 kJ/K"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws IllegalArgumentException if the text cannot be read as this quantity; the message lists what is accepted
     */
    public static Entropy parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in kilojoules per kelvin} */
    public double inKilojoulesPerKelvin() {
        return Units.KILOJOULE_PER_KELVIN.fromSi(si());
    }

    /** {@return the value in joules per kelvin} */
    public double inJoulesPerKelvin() {
        return si();
    }

    /**
     * {@return the product with a temperature}
     *
     * @param temperature the other factor
     */
    public Energy times(Temperature temperature) {
        return Energy.joules(si() * temperature.si());
    }

    /**
     * {@return the quotient with a duration}
     *
     * @param duration the divisor, not zero
     * @throws IllegalArgumentException if the quotient is not finite
     */
    public EntropyRate over(Duration duration) {
        return EntropyRate.wattsPerKelvin(si() / duration.si());
    }

    /**
     * {@return the quotient with a mass}
     *
     * @param mass the divisor, not zero
     * @throws IllegalArgumentException if the quotient is not finite
     */
    public SpecificEntropy over(Mass mass) {
        return SpecificEntropy.joulesPerKilogramKelvin(si() / mass.si());
    }

    /**
     * {@return the entropy that travels with heat at a temperature: Q/T}
     *
     * @param heat the heat
     * @param temperature the temperature at which it crosses the boundary
     */
    public static Entropy ofHeat(Energy heat, Temperature temperature) {
        return new Entropy(heat.si() / temperature.si());
    }

    @Override
    public QuantityKind<Entropy, Entropy> kind() {
        return KIND;
    }

    @Override
    protected Entropy with(double si) {
        return new Entropy(si);
    }
}
