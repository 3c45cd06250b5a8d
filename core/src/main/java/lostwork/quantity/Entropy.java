package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * An entropy.
 *
 * <p>SI unit J/K. Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class Entropy extends LinearQuantity<Entropy> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<Entropy, Entropy> KIND = QuantityKind.linear(
            "entropy",
            Entropy.class,
            Dimension.MASS
                    .times(Dimension.LENGTH.pow(2))
                    .dividedBy(Dimension.TEMPERATURE)
                    .dividedBy(Dimension.TIME.pow(2)),
            Entropy::new,
            1e3,
            List.of(Units.KILOJOULE_PER_KELVIN, Units.JOULE_PER_KELVIN));

    private Entropy(double si) {
        super(si, KIND);
    }

    private Entropy(double value, Unit<Entropy> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return an entropy in kilojoules per kelvin}
     *
     * @param value the number of kilojoules per kelvin
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Entropy kilojoulesPerKelvin(double value) {
        return new Entropy(value, Units.KILOJOULE_PER_KELVIN);
    }

    /**
     * {@return an entropy in joules per kelvin}
     *
     * @param value the number of joules per kelvin
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Entropy joulesPerKelvin(double value) {
        return new Entropy(value);
    }

    /**
     * {@return an entropy from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static Entropy of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the entropy that a text states, such as {@code "12.5 kJ/K"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
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
     * {@return this entropy times a temperature}
     *
     * @param temperature the other factor
     */
    public Energy times(Temperature temperature) {
        return Energy.joules(si() * temperature.si());
    }

    /**
     * {@return this entropy divided by a duration}
     *
     * @param duration the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public EntropyRate over(Duration duration) {
        return EntropyRate.wattsPerKelvin(si() / duration.si());
    }

    /**
     * {@return this entropy divided by a mass}
     *
     * @param mass the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
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

    /**
     * {@return this entropy divided by an amount of substance}
     *
     * @param amountOfSubstance the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public MolarEntropy over(AmountOfSubstance amountOfSubstance) {
        return MolarEntropy.joulesPerMoleKelvin(si() / amountOfSubstance.si());
    }

    /**
     * {@return this entropy divided by an entropy rate}
     *
     * @param entropyRate the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public Duration over(EntropyRate entropyRate) {
        return Duration.seconds(si() / entropyRate.si());
    }

    /**
     * {@return this entropy divided by a molar entropy}
     *
     * @param molarEntropy the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public AmountOfSubstance over(MolarEntropy molarEntropy) {
        return AmountOfSubstance.moles(si() / molarEntropy.si());
    }

    /**
     * {@return this entropy divided by a specific entropy}
     *
     * @param specificEntropy the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public Mass over(SpecificEntropy specificEntropy) {
        return Mass.kilograms(si() / specificEntropy.si());
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
