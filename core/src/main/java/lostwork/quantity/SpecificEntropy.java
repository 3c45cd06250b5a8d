package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * An entropy per mass.
 *
 * <p>SI unit J/(kg K). Any finite value exists. Immutable and thread-safe.
 */
public final class SpecificEntropy extends LinearQuantity<SpecificEntropy> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<SpecificEntropy, SpecificEntropy> KIND = QuantityKind.linear(
            "specific entropy",
            SpecificEntropy.class,
            new Dimension(2, 0, -2, -1, 0, 0),
            SpecificEntropy::new,
            1e3,
            List.of(Units.KILOJOULE_PER_KILOGRAM_KELVIN, Units.JOULE_PER_KILOGRAM_KELVIN, Units.BTU_PER_POUND_RANKINE));

    private SpecificEntropy(double si) {
        super(si, KIND);
    }

    /**
     * {@return a specific entropy}
     *
     * @param value specific entropy in kilojoules per kilogram and kelvin
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static SpecificEntropy kilojoulesPerKilogramKelvin(double value) {
        return new SpecificEntropy(Units.KILOJOULE_PER_KILOGRAM_KELVIN.toSi(value));
    }

    /**
     * {@return a specific entropy}
     *
     * @param value specific entropy in joules per kilogram and kelvin
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static SpecificEntropy joulesPerKilogramKelvin(double value) {
        return new SpecificEntropy(value);
    }

    /**
     * {@return a specific entropy}
     *
     * @param value specific entropy in British thermal units per pound and degree Rankine
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static SpecificEntropy btuPerPoundRankine(double value) {
        return new SpecificEntropy(Units.BTU_PER_POUND_RANKINE.toSi(value));
    }

    /**
     * {@return a specific entropy from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension is another one, or the value is not allowed
     */
    public static SpecificEntropy of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the specific entropy that a text states, such as {@code "12.5 kJ/(kg K)"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws IllegalArgumentException if the text cannot be read as this quantity; the message lists what is accepted
     */
    public static SpecificEntropy parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in kilojoules per kilogram and kelvin} */
    public double inKilojoulesPerKilogramKelvin() {
        return Units.KILOJOULE_PER_KILOGRAM_KELVIN.fromSi(si());
    }

    /** {@return the value in joules per kilogram and kelvin} */
    public double inJoulesPerKilogramKelvin() {
        return si();
    }

    /** {@return the value in British thermal units per pound and degree Rankine} */
    public double inBtuPerPoundRankine() {
        return Units.BTU_PER_POUND_RANKINE.fromSi(si());
    }

    /**
     * {@return the product with a mass flow}
     *
     * @param massFlow the other factor
     */
    public EntropyRate times(MassFlow massFlow) {
        return EntropyRate.wattsPerKelvin(si() * massFlow.si());
    }

    /**
     * {@return the product with a mass}
     *
     * @param mass the other factor
     */
    public Entropy times(Mass mass) {
        return Entropy.joulesPerKelvin(si() * mass.si());
    }

    /**
     * {@return the product with a temperature}
     *
     * @param temperature the other factor
     */
    public SpecificEnergy times(Temperature temperature) {
        return SpecificEnergy.joulesPerKilogram(si() * temperature.si());
    }

    /**
     * {@return the product with a molar mass}
     *
     * @param molarMass the other factor
     */
    public MolarEntropy times(MolarMass molarMass) {
        return MolarEntropy.joulesPerMoleKelvin(si() * molarMass.si());
    }

    @Override
    public QuantityKind<SpecificEntropy, SpecificEntropy> kind() {
        return KIND;
    }

    @Override
    protected SpecificEntropy with(double si) {
        return new SpecificEntropy(si);
    }
}
