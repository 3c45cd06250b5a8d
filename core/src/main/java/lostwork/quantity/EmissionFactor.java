package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * Mass of carbon dioxide per energy: the carbon intensity of a grid, the emission factor of a fuel.
 *
 * <p>SI unit kg/J. Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class EmissionFactor extends LinearQuantity<EmissionFactor> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<EmissionFactor, EmissionFactor> KIND = QuantityKind.linear(
            "emission factor",
            EmissionFactor.class,
            Dimension.TIME.pow(2).dividedBy(Dimension.LENGTH.pow(2)),
            EmissionFactor::new,
            1e-7,
            List.of(Units.KILOGRAM_PER_MEGAWATT_HOUR, Units.KILOGRAM_PER_GIGAJOULE, Units.KILOGRAM_PER_JOULE));

    private EmissionFactor(double si) {
        super(si, KIND);
    }

    private EmissionFactor(double value, Unit<EmissionFactor> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return an emission factor in kilograms per megawatt hour}
     *
     * @param value the number of kilograms per megawatt hour
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static EmissionFactor kilogramsPerMegawattHour(double value) {
        return new EmissionFactor(value, Units.KILOGRAM_PER_MEGAWATT_HOUR);
    }

    /**
     * {@return an emission factor in kilograms per gigajoule}
     *
     * @param value the number of kilograms per gigajoule
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static EmissionFactor kilogramsPerGigajoule(double value) {
        return new EmissionFactor(value, Units.KILOGRAM_PER_GIGAJOULE);
    }

    /**
     * {@return an emission factor in kilograms per joule}
     *
     * @param value the number of kilograms per joule
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static EmissionFactor kilogramsPerJoule(double value) {
        return new EmissionFactor(value);
    }

    /**
     * {@return an emission factor from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static EmissionFactor of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the emission factor that a text states, such as {@code "12.5 kg/MWh"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
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
     * {@return this emission factor times an energy}
     *
     * @param energy the other factor
     */
    public Mass times(Energy energy) {
        return Mass.kilograms(si() * energy.si());
    }

    /**
     * {@return this emission factor times a power}
     *
     * @param power the other factor
     */
    public MassFlow times(Power power) {
        return MassFlow.kilogramsPerSecond(si() * power.si());
    }

    /**
     * {@return this emission factor times a mass price}
     *
     * @param massPrice the other factor
     */
    public EnergyPrice times(MassPrice massPrice) {
        return EnergyPrice.perJoule(si() * massPrice.si());
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
