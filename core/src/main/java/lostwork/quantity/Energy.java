package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * An energy: heat, work, exergy.
 *
 * <p>SI unit J. Any finite value exists. Immutable and thread-safe.
 */
public final class Energy extends LinearQuantity<Energy> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<Energy, Energy> KIND = QuantityKind.linear(
            "energy",
            Energy.class,
            new Dimension(2, 1, -2, 0, 0, 0),
            Energy::new,
            1e6,
            List.of(
                    Units.KILOJOULE,
                    Units.JOULE,
                    Units.MEGAJOULE,
                    Units.GIGAJOULE,
                    Units.KILOWATT_HOUR,
                    Units.MEGAWATT_HOUR,
                    Units.GIGAWATT_HOUR,
                    Units.BTU));

    private Energy(double si) {
        super(si, KIND);
    }

    /**
     * {@return an energy}
     *
     * @param value energy in kilojoules
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Energy kilojoules(double value) {
        return new Energy(Units.KILOJOULE.toSi(value));
    }

    /**
     * {@return an energy}
     *
     * @param value energy in joules
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Energy joules(double value) {
        return new Energy(value);
    }

    /**
     * {@return an energy}
     *
     * @param value energy in megajoules
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Energy megajoules(double value) {
        return new Energy(Units.MEGAJOULE.toSi(value));
    }

    /**
     * {@return an energy}
     *
     * @param value energy in gigajoules
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Energy gigajoules(double value) {
        return new Energy(Units.GIGAJOULE.toSi(value));
    }

    /**
     * {@return an energy}
     *
     * @param value energy in kilowatt hours
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Energy kilowattHours(double value) {
        return new Energy(Units.KILOWATT_HOUR.toSi(value));
    }

    /**
     * {@return an energy}
     *
     * @param value energy in megawatt hours
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Energy megawattHours(double value) {
        return new Energy(Units.MEGAWATT_HOUR.toSi(value));
    }

    /**
     * {@return an energy}
     *
     * @param value energy in gigawatt hours
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Energy gigawattHours(double value) {
        return new Energy(Units.GIGAWATT_HOUR.toSi(value));
    }

    /**
     * {@return an energy}
     *
     * @param value energy in British thermal units (International Table)
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Energy btu(double value) {
        return new Energy(Units.BTU.toSi(value));
    }

    /**
     * {@return an energy from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension is another one, or the value is not allowed
     */
    public static Energy of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the energy that a text states, such as {@code "12.5 kJ"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws IllegalArgumentException if the text cannot be read as this quantity; the message lists what is accepted
     */
    public static Energy parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in kilojoules} */
    public double inKilojoules() {
        return Units.KILOJOULE.fromSi(si());
    }

    /** {@return the value in joules} */
    public double inJoules() {
        return si();
    }

    /** {@return the value in megajoules} */
    public double inMegajoules() {
        return Units.MEGAJOULE.fromSi(si());
    }

    /** {@return the value in gigajoules} */
    public double inGigajoules() {
        return Units.GIGAJOULE.fromSi(si());
    }

    /** {@return the value in kilowatt hours} */
    public double inKilowattHours() {
        return Units.KILOWATT_HOUR.fromSi(si());
    }

    /** {@return the value in megawatt hours} */
    public double inMegawattHours() {
        return Units.MEGAWATT_HOUR.fromSi(si());
    }

    /** {@return the value in gigawatt hours} */
    public double inGigawattHours() {
        return Units.GIGAWATT_HOUR.fromSi(si());
    }

    /** {@return the value in British thermal units (International Table)} */
    public double inBtu() {
        return Units.BTU.fromSi(si());
    }

    /**
     * {@return the quotient with a duration}
     *
     * @param duration the divisor, not zero
     * @throws IllegalArgumentException if the quotient is not finite
     */
    public Power over(Duration duration) {
        return Power.watts(si() / duration.si());
    }

    /**
     * {@return the quotient with a mass}
     *
     * @param mass the divisor, not zero
     * @throws IllegalArgumentException if the quotient is not finite
     */
    public SpecificEnergy over(Mass mass) {
        return SpecificEnergy.joulesPerKilogram(si() / mass.si());
    }

    /**
     * {@return the quotient with an amount of substance}
     *
     * @param amountOfSubstance the divisor, not zero
     * @throws IllegalArgumentException if the quotient is not finite
     */
    public MolarEnergy over(AmountOfSubstance amountOfSubstance) {
        return MolarEnergy.joulesPerMole(si() / amountOfSubstance.si());
    }

    /**
     * {@return the product with an energy price}
     *
     * @param energyPrice the other factor
     */
    public Money times(EnergyPrice energyPrice) {
        return Money.of(si() * energyPrice.si());
    }

    /**
     * {@return the product with an emission factor}
     *
     * @param emissionFactor the other factor
     */
    public Mass times(EmissionFactor emissionFactor) {
        return Mass.kilograms(si() * emissionFactor.si());
    }

    @Override
    public QuantityKind<Energy, Energy> kind() {
        return KIND;
    }

    @Override
    protected Energy with(double si) {
        return new Energy(si);
    }
}
