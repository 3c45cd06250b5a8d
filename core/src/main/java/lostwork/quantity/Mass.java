package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * A mass.
 *
 * <p>SI unit kg. Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class Mass extends LinearQuantity<Mass> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<Mass, Mass> KIND = QuantityKind.linear(
            "mass",
            Mass.class,
            Dimension.MASS,
            Mass::new,
            1,
            List.of(Units.KILOGRAM, Units.GRAM, Units.TONNE, Units.POUND));

    private Mass(double si) {
        super(si, KIND);
    }

    private Mass(double value, Unit<Mass> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return a mass in kilograms}
     *
     * @param value the number of kilograms
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Mass kilograms(double value) {
        return new Mass(value);
    }

    /**
     * {@return a mass in grams}
     *
     * @param value the number of grams
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Mass grams(double value) {
        return new Mass(value, Units.GRAM);
    }

    /**
     * {@return a mass in tonnes}
     *
     * @param value the number of tonnes
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Mass tonnes(double value) {
        return new Mass(value, Units.TONNE);
    }

    /**
     * {@return a mass in pounds (avoirdupois)}
     *
     * @param value the number of pounds (avoirdupois)
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Mass pounds(double value) {
        return new Mass(value, Units.POUND);
    }

    /**
     * {@return a mass from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static Mass of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the mass that a text states, such as {@code "12.5 kg"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
     */
    public static Mass parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in kilograms} */
    public double inKilograms() {
        return si();
    }

    /** {@return the value in grams} */
    public double inGrams() {
        return Units.GRAM.fromSi(si());
    }

    /** {@return the value in tonnes} */
    public double inTonnes() {
        return Units.TONNE.fromSi(si());
    }

    /** {@return the value in pounds (avoirdupois)} */
    public double inPounds() {
        return Units.POUND.fromSi(si());
    }

    /**
     * {@return this mass divided by a duration}
     *
     * @param duration the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public MassFlow over(Duration duration) {
        return MassFlow.kilogramsPerSecond(si() / duration.si());
    }

    /**
     * {@return this mass divided by a volume}
     *
     * @param volume the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public Density over(Volume volume) {
        return Density.kilogramsPerCubicMetre(si() / volume.si());
    }

    /**
     * {@return this mass divided by a molar mass}
     *
     * @param molarMass the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public AmountOfSubstance over(MolarMass molarMass) {
        return AmountOfSubstance.moles(si() / molarMass.si());
    }

    /**
     * {@return this mass times a specific energy}
     *
     * @param specificEnergy the other factor
     */
    public Energy times(SpecificEnergy specificEnergy) {
        return Energy.joules(si() * specificEnergy.si());
    }

    /**
     * {@return this mass times a specific entropy}
     *
     * @param specificEntropy the other factor
     */
    public Entropy times(SpecificEntropy specificEntropy) {
        return Entropy.joulesPerKelvin(si() * specificEntropy.si());
    }

    /**
     * {@return this mass times a specific volume}
     *
     * @param specificVolume the other factor
     */
    public Volume times(SpecificVolume specificVolume) {
        return Volume.cubicMetres(si() * specificVolume.si());
    }

    /**
     * {@return this mass times a mass price}
     *
     * @param massPrice the other factor
     */
    public Money times(MassPrice massPrice) {
        return Money.of(si() * massPrice.si());
    }

    /**
     * {@return this mass divided by an amount of substance}
     *
     * @param amountOfSubstance the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public MolarMass over(AmountOfSubstance amountOfSubstance) {
        return MolarMass.kilogramsPerMole(si() / amountOfSubstance.si());
    }

    /**
     * {@return this mass divided by a density}
     *
     * @param density the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public Volume over(Density density) {
        return Volume.cubicMetres(si() / density.si());
    }

    /**
     * {@return this mass divided by an emission factor}
     *
     * @param emissionFactor the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public Energy over(EmissionFactor emissionFactor) {
        return Energy.joules(si() / emissionFactor.si());
    }

    /**
     * {@return this mass divided by an energy}
     *
     * @param energy the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public EmissionFactor over(Energy energy) {
        return EmissionFactor.kilogramsPerJoule(si() / energy.si());
    }

    /**
     * {@return this mass divided by a mass flow}
     *
     * @param massFlow the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public Duration over(MassFlow massFlow) {
        return Duration.seconds(si() / massFlow.si());
    }

    @Override
    public QuantityKind<Mass, Mass> kind() {
        return KIND;
    }

    @Override
    protected Mass with(double si) {
        return new Mass(si);
    }
}
