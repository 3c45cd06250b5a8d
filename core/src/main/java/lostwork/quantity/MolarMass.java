package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * A mass per amount of substance.
 *
 * <p>SI unit kg/mol. Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class MolarMass extends LinearQuantity<MolarMass> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<MolarMass, MolarMass> KIND = QuantityKind.linear(
            "molar mass",
            MolarMass.class,
            Dimension.MASS.dividedBy(Dimension.AMOUNT),
            MolarMass::new,
            0.03,
            List.of(Units.GRAM_PER_MOLE, Units.KILOGRAM_PER_MOLE));

    private MolarMass(double si) {
        super(si, KIND);
    }

    private MolarMass(double value, Unit<MolarMass> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return a molar mass in grams per mole}
     *
     * @param value the number of grams per mole
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static MolarMass gramsPerMole(double value) {
        return new MolarMass(value, Units.GRAM_PER_MOLE);
    }

    /**
     * {@return a molar mass in kilograms per mole}
     *
     * @param value the number of kilograms per mole
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static MolarMass kilogramsPerMole(double value) {
        return new MolarMass(value);
    }

    /**
     * {@return a molar mass from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static MolarMass of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the molar mass that a text states, such as {@code "12.5 g/mol"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
     */
    public static MolarMass parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in grams per mole} */
    public double inGramsPerMole() {
        return Units.GRAM_PER_MOLE.fromSi(si());
    }

    /** {@return the value in kilograms per mole} */
    public double inKilogramsPerMole() {
        return si();
    }

    /**
     * {@return this molar mass times an amount of substance}
     *
     * @param amountOfSubstance the other factor
     */
    public Mass times(AmountOfSubstance amountOfSubstance) {
        return Mass.kilograms(si() * amountOfSubstance.si());
    }

    /**
     * {@return this molar mass times a molar flow}
     *
     * @param molarFlow the other factor
     */
    public MassFlow times(MolarFlow molarFlow) {
        return MassFlow.kilogramsPerSecond(si() * molarFlow.si());
    }

    /**
     * {@return this molar mass times a specific energy}
     *
     * @param specificEnergy the other factor
     */
    public MolarEnergy times(SpecificEnergy specificEnergy) {
        return MolarEnergy.joulesPerMole(si() * specificEnergy.si());
    }

    /**
     * {@return this molar mass times a specific entropy}
     *
     * @param specificEntropy the other factor
     */
    public MolarEntropy times(SpecificEntropy specificEntropy) {
        return MolarEntropy.joulesPerMoleKelvin(si() * specificEntropy.si());
    }

    /**
     * {@return this molar mass times a specific heat capacity}
     *
     * @param specificHeatCapacity the other factor
     */
    public MolarHeatCapacity times(SpecificHeatCapacity specificHeatCapacity) {
        return MolarHeatCapacity.joulesPerMoleKelvin(si() * specificHeatCapacity.si());
    }

    /**
     * {@return this molar mass times a specific volume}
     *
     * @param specificVolume the other factor
     */
    public MolarVolume times(SpecificVolume specificVolume) {
        return MolarVolume.cubicMetresPerMole(si() * specificVolume.si());
    }

    @Override
    public QuantityKind<MolarMass, MolarMass> kind() {
        return KIND;
    }

    @Override
    protected MolarMass with(double si) {
        return new MolarMass(si);
    }
}
