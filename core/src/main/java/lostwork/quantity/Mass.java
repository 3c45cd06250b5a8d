package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * A mass.
 *
 * <p>SI unit kg. Any finite value exists. Immutable and thread-safe.
 */
public final class Mass extends LinearQuantity<Mass> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<Mass, Mass> KIND = QuantityKind.linear(
            "mass",
            Mass.class,
            new Dimension(0, 1, 0, 0, 0, 0),
            Mass::new,
            1,
            List.of(Units.KILOGRAM, Units.GRAM, Units.TONNE, Units.POUND));

    private Mass(double si) {
        super(si, KIND);
    }

    /**
     * {@return a mass}
     *
     * @param value mass in kilograms
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Mass kilograms(double value) {
        return new Mass(value);
    }

    /**
     * {@return a mass}
     *
     * @param value mass in grams
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Mass grams(double value) {
        return new Mass(Units.GRAM.toSi(value));
    }

    /**
     * {@return a mass}
     *
     * @param value mass in tonnes
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Mass tonnes(double value) {
        return new Mass(Units.TONNE.toSi(value));
    }

    /**
     * {@return a mass}
     *
     * @param value mass in pounds (avoirdupois)
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Mass pounds(double value) {
        return new Mass(Units.POUND.toSi(value));
    }

    /**
     * {@return a mass from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension is another one, or the value is not allowed
     */
    public static Mass of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the mass that a text states, such as {@code "12.5 kg"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws IllegalArgumentException if the text cannot be read as this quantity; the message lists what is accepted
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
     * {@return the quotient with a duration}
     *
     * @param duration the divisor, not zero
     * @throws IllegalArgumentException if the quotient is not finite
     */
    public MassFlow over(Duration duration) {
        return MassFlow.kilogramsPerSecond(si() / duration.si());
    }

    /**
     * {@return the quotient with a volume}
     *
     * @param volume the divisor, not zero
     * @throws IllegalArgumentException if the quotient is not finite
     */
    public Density over(Volume volume) {
        return Density.kilogramsPerCubicMetre(si() / volume.si());
    }

    /**
     * {@return the quotient with a molar mass}
     *
     * @param molarMass the divisor, not zero
     * @throws IllegalArgumentException if the quotient is not finite
     */
    public AmountOfSubstance over(MolarMass molarMass) {
        return AmountOfSubstance.moles(si() / molarMass.si());
    }

    /**
     * {@return the product with a specific energy}
     *
     * @param specificEnergy the other factor
     */
    public Energy times(SpecificEnergy specificEnergy) {
        return Energy.joules(si() * specificEnergy.si());
    }

    /**
     * {@return the product with a specific entropy}
     *
     * @param specificEntropy the other factor
     */
    public Entropy times(SpecificEntropy specificEntropy) {
        return Entropy.joulesPerKelvin(si() * specificEntropy.si());
    }

    /**
     * {@return the product with a specific volume}
     *
     * @param specificVolume the other factor
     */
    public Volume times(SpecificVolume specificVolume) {
        return Volume.cubicMetres(si() * specificVolume.si());
    }

    /**
     * {@return the product with a mass price}
     *
     * @param massPrice the other factor
     */
    public Money times(MassPrice massPrice) {
        return Money.of(si() * massPrice.si());
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
