package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * Mass of carbon dioxide per energy: the carbon intensity of a grid, the emission factor of a fuel.
 *
 * <p>SI unit kg/J. Any finite value exists. Immutable and thread-safe.
 */
public final class EmissionFactor extends LinearQuantity<EmissionFactor> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<EmissionFactor, EmissionFactor> KIND = QuantityKind.linear(
            "emission factor",
            EmissionFactor.class,
            new Dimension(-2, 0, 2, 0, 0, 0),
            EmissionFactor::new,
            1e-7,
            List.of(Units.KILOGRAM_PER_MEGAWATT_HOUR, Units.KILOGRAM_PER_GIGAJOULE, Units.KILOGRAM_PER_JOULE));

    private EmissionFactor(double si) {
        super(si, KIND);
    }

    /**
     * {@return an emission factor}
     *
     * @param value emission factor in kilograms per megawatt hour
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static EmissionFactor kilogramsPerMegawattHour(double value) {
        return new EmissionFactor(Units.KILOGRAM_PER_MEGAWATT_HOUR.toSi(value));
    }

    /**
     * {@return an emission factor}
     *
     * @param value emission factor in kilograms per gigajoule
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static EmissionFactor kilogramsPerGigajoule(double value) {
        return new EmissionFactor(Units.KILOGRAM_PER_GIGAJOULE.toSi(value));
    }

    /**
     * {@return an emission factor}
     *
     * @param value emission factor in kilograms per joule
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static EmissionFactor kilogramsPerJoule(double value) {
        return new EmissionFactor(value);
    }

    /**
     * {@return an emission factor from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension is another one, or the value is not allowed
     */
    public static EmissionFactor of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the emission factor that a text states, such as {@code "12.5 kg/MWh"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws IllegalArgumentException if the text cannot be read as this quantity; the message lists what is accepted
     */
    public static EmissionFactor parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in kilograms per megawatt hour} */
    public double inKilogramsPerMegawattHour() {
        return Units.KILOGRAM_PER_MEGAWATT_HOUR.fromSi(si());
    }

    /** {@return the value in kilograms per gigajoule} */
    public double inKilogramsPerGigajoule() {
        return Units.KILOGRAM_PER_GIGAJOULE.fromSi(si());
    }

    /** {@return the value in kilograms per joule} */
    public double inKilogramsPerJoule() {
        return si();
    }

    /**
     * {@return the product with an energy}
     *
     * @param energy the other factor
     */
    public Mass times(Energy energy) {
        return Mass.kilograms(si() * energy.si());
    }

    /**
     * {@return the product with a power}
     *
     * @param power the other factor
     */
    public MassFlow times(Power power) {
        return MassFlow.kilogramsPerSecond(si() * power.si());
    }

    @Override
    public QuantityKind<EmissionFactor, EmissionFactor> kind() {
        return KIND;
    }

    @Override
    protected EmissionFactor with(double si) {
        return new EmissionFactor(si);
    }
}
