package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * An amount of substance.
 *
 * <p>SI unit mol. Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class AmountOfSubstance extends LinearQuantity<AmountOfSubstance> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<AmountOfSubstance, AmountOfSubstance> KIND = QuantityKind.linear(
            "amount of substance",
            AmountOfSubstance.class,
            Dimension.AMOUNT,
            AmountOfSubstance::new,
            1,
            List.of(Units.MOLE, Units.KILOMOLE));

    private AmountOfSubstance(double si) {
        super(si, KIND);
    }

    private AmountOfSubstance(double value, Unit<AmountOfSubstance> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return an amount of substance in moles}
     *
     * @param value the number of moles
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static AmountOfSubstance moles(double value) {
        return new AmountOfSubstance(value);
    }

    /**
     * {@return an amount of substance in kilomoles}
     *
     * @param value the number of kilomoles
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static AmountOfSubstance kilomoles(double value) {
        return new AmountOfSubstance(value, Units.KILOMOLE);
    }

    /**
     * {@return an amount of substance from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static AmountOfSubstance of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the amount of substance that a text states, such as {@code "12.5 mol"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
     */
    public static AmountOfSubstance parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in moles} */
    public double inMoles() {
        return si();
    }

    /** {@return the value in kilomoles} */
    public double inKilomoles() {
        return Units.KILOMOLE.fromSi(si());
    }

    /**
     * {@return this amount of substance times a molar mass}
     *
     * @param molarMass the other factor
     */
    public Mass times(MolarMass molarMass) {
        return Mass.kilograms(si() * molarMass.si());
    }

    /**
     * {@return this amount of substance times a molar energy}
     *
     * @param molarEnergy the other factor
     */
    public Energy times(MolarEnergy molarEnergy) {
        return Energy.joules(si() * molarEnergy.si());
    }

    /**
     * {@return this amount of substance divided by a duration}
     *
     * @param duration the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public MolarFlow over(Duration duration) {
        return MolarFlow.molesPerSecond(si() / duration.si());
    }

    /**
     * {@return this amount of substance times a molar entropy}
     *
     * @param molarEntropy the other factor
     */
    public Entropy times(MolarEntropy molarEntropy) {
        return Entropy.joulesPerKelvin(si() * molarEntropy.si());
    }

    /**
     * {@return this amount of substance times a molar volume}
     *
     * @param molarVolume the other factor
     */
    public Volume times(MolarVolume molarVolume) {
        return Volume.cubicMetres(si() * molarVolume.si());
    }

    /**
     * {@return this amount of substance divided by a molar flow}
     *
     * @param molarFlow the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public Duration over(MolarFlow molarFlow) {
        return Duration.seconds(si() / molarFlow.si());
    }

    @Override
    public QuantityKind<AmountOfSubstance, AmountOfSubstance> kind() {
        return KIND;
    }

    @Override
    protected AmountOfSubstance with(double si) {
        return new AmountOfSubstance(si);
    }
}
