package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * An entropy per amount of substance.
 *
 * <p>SI unit J/(mol K). Any finite value exists. Immutable and thread-safe.
 */
public final class MolarEntropy extends LinearQuantity<MolarEntropy> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<MolarEntropy, MolarEntropy> KIND = QuantityKind.linear(
            "molar entropy",
            MolarEntropy.class,
            new Dimension(2, 1, -2, -1, -1, 0),
            MolarEntropy::new,
            100,
            List.of(Units.JOULE_PER_MOLE_KELVIN, Units.KILOJOULE_PER_MOLE_KELVIN));

    private MolarEntropy(double si) {
        super(si, KIND);
    }

    /**
     * {@return a molar entropy}
     *
     * @param value molar entropy in joules per mole and kelvin
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static MolarEntropy joulesPerMoleKelvin(double value) {
        return new MolarEntropy(value);
    }

    /**
     * {@return a molar entropy}
     *
     * @param value molar entropy in kilojoules per mole and kelvin
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static MolarEntropy kilojoulesPerMoleKelvin(double value) {
        return new MolarEntropy(Units.KILOJOULE_PER_MOLE_KELVIN.toSi(value));
    }

    /**
     * {@return a molar entropy from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension is another one, or the value is not allowed
     */
    public static MolarEntropy of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the molar entropy that a text states, such as {@code "12.5 J/(mol K)"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws IllegalArgumentException if the text cannot be read as this quantity; the message lists what is accepted
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
     * {@return the quotient with a molar mass}
     *
     * @param molarMass the divisor, not zero
     * @throws IllegalArgumentException if the quotient is not finite
     */
    public SpecificEntropy over(MolarMass molarMass) {
        return SpecificEntropy.joulesPerKilogramKelvin(si() / molarMass.si());
    }

    /**
     * {@return the product with a molar flow}
     *
     * @param molarFlow the other factor
     */
    public EntropyRate times(MolarFlow molarFlow) {
        return EntropyRate.wattsPerKelvin(si() * molarFlow.si());
    }

    /**
     * {@return the product with a temperature}
     *
     * @param temperature the other factor
     */
    public MolarEnergy times(Temperature temperature) {
        return MolarEnergy.joulesPerMole(si() * temperature.si());
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
