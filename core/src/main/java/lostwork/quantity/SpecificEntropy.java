package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * An entropy per mass.
 *
 * <p>SI unit J/(kg K). Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class SpecificEntropy extends LinearQuantity<SpecificEntropy> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<SpecificEntropy, SpecificEntropy> KIND = QuantityKind.linear(
            "specific entropy",
            SpecificEntropy.class,
            Dimension.LENGTH.pow(2).dividedBy(Dimension.TEMPERATURE).dividedBy(Dimension.TIME.pow(2)),
            SpecificEntropy::new,
            1e3,
            List.of(Units.KILOJOULE_PER_KILOGRAM_KELVIN, Units.JOULE_PER_KILOGRAM_KELVIN, Units.BTU_PER_POUND_RANKINE));

    private SpecificEntropy(double si) {
        super(si, KIND);
    }

    private SpecificEntropy(double value, Unit<SpecificEntropy> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return a specific entropy in kilojoules per kilogram and kelvin}
     *
     * @param value the number of kilojoules per kilogram and kelvin
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static SpecificEntropy kilojoulesPerKilogramKelvin(double value) {
        return new SpecificEntropy(value, Units.KILOJOULE_PER_KILOGRAM_KELVIN);
    }

    /**
     * {@return a specific entropy in joules per kilogram and kelvin}
     *
     * @param value the number of joules per kilogram and kelvin
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static SpecificEntropy joulesPerKilogramKelvin(double value) {
        return new SpecificEntropy(value);
    }

    /**
     * {@return a specific entropy in British thermal units per pound and degree Rankine}
     *
     * @param value the number of British thermal units per pound and degree Rankine
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static SpecificEntropy btuPerPoundRankine(double value) {
        return new SpecificEntropy(value, Units.BTU_PER_POUND_RANKINE);
    }

    /**
     * {@return a specific entropy from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static SpecificEntropy of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the specific entropy that a text states, such as {@code "12.5 kJ/(kg K)"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
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
     * {@return this specific entropy times a mass flow}
     *
     * @param massFlow the other factor
     */
    public EntropyRate times(MassFlow massFlow) {
        return EntropyRate.wattsPerKelvin(si() * massFlow.si());
    }

    /**
     * {@return this specific entropy times a mass}
     *
     * @param mass the other factor
     */
    public Entropy times(Mass mass) {
        return Entropy.joulesPerKelvin(si() * mass.si());
    }

    /**
     * {@return this specific entropy times a temperature}
     *
     * @param temperature the other factor
     */
    public SpecificEnergy times(Temperature temperature) {
        return SpecificEnergy.joulesPerKilogram(si() * temperature.si());
    }

    /**
     * {@return this specific entropy times a molar mass}
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
