package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * An entropy per amount of substance.
 *
 * <p>SI unit J/(mol K). Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class MolarEntropy extends LinearQuantity<MolarEntropy> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<MolarEntropy, MolarEntropy> KIND = QuantityKind.linear(
            "molar entropy",
            MolarEntropy.class,
            Dimension.MASS
                    .times(Dimension.LENGTH.pow(2))
                    .dividedBy(Dimension.TEMPERATURE)
                    .dividedBy(Dimension.AMOUNT)
                    .dividedBy(Dimension.TIME.pow(2)),
            MolarEntropy::new,
            100,
            List.of(Units.JOULE_PER_MOLE_KELVIN, Units.KILOJOULE_PER_MOLE_KELVIN));

    private MolarEntropy(double si) {
        super(si, KIND);
    }

    private MolarEntropy(double value, Unit<MolarEntropy> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return a molar entropy in joules per mole and kelvin}
     *
     * @param value the number of joules per mole and kelvin
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static MolarEntropy joulesPerMoleKelvin(double value) {
        return new MolarEntropy(value);
    }

    /**
     * {@return a molar entropy in kilojoules per mole and kelvin}
     *
     * @param value the number of kilojoules per mole and kelvin
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static MolarEntropy kilojoulesPerMoleKelvin(double value) {
        return new MolarEntropy(value, Units.KILOJOULE_PER_MOLE_KELVIN);
    }

    /**
     * {@return a molar entropy from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static MolarEntropy of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the molar entropy that a text states, such as {@code "12.5 J/(mol K)"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
     */
    public static MolarEntropy parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in joules per mole and kelvin} */
    public double inJoulesPerMoleKelvin() {
        return si();
    }

    /** {@return the value in kilojoules per mole and kelvin} */
    public double inKilojoulesPerMoleKelvin() {
        return Units.KILOJOULE_PER_MOLE_KELVIN.fromSi(si());
    }

    /**
     * {@return this molar entropy divided by a molar mass}
     *
     * @param molarMass the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public SpecificEntropy over(MolarMass molarMass) {
        return SpecificEntropy.joulesPerKilogramKelvin(si() / molarMass.si());
    }

    /**
     * {@return this molar entropy times a molar flow}
     *
     * @param molarFlow the other factor
     */
    public EntropyRate times(MolarFlow molarFlow) {
        return EntropyRate.wattsPerKelvin(si() * molarFlow.si());
    }

    /**
     * {@return this molar entropy times a temperature}
     *
     * @param temperature the other factor
     */
    public MolarEnergy times(Temperature temperature) {
        return MolarEnergy.joulesPerMole(si() * temperature.si());
    }

    /**
     * {@return this molar entropy times an amount of substance}
     *
     * @param amountOfSubstance the other factor
     */
    public Entropy times(AmountOfSubstance amountOfSubstance) {
        return Entropy.joulesPerKelvin(si() * amountOfSubstance.si());
    }

    /**
     * {@return this molar entropy divided by a specific entropy}
     *
     * @param specificEntropy the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public MolarMass over(SpecificEntropy specificEntropy) {
        return MolarMass.kilogramsPerMole(si() / specificEntropy.si());
    }

    @Override
    public QuantityKind<MolarEntropy, MolarEntropy> kind() {
        return KIND;
    }

    @Override
    protected MolarEntropy with(double si) {
        return new MolarEntropy(si);
    }
}
