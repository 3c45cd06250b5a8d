package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * A mass per time (mass flow rate).
 *
 * <p>SI unit kg/s. Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class MassFlow extends LinearQuantity<MassFlow> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<MassFlow, MassFlow> KIND = QuantityKind.linear(
            "mass flow",
            MassFlow.class,
            Dimension.MASS.dividedBy(Dimension.TIME),
            MassFlow::new,
            1,
            List.of(
                    Units.KILOGRAM_PER_SECOND,
                    Units.KILOGRAM_PER_HOUR,
                    Units.TONNE_PER_HOUR,
                    Units.TONNE_PER_DAY,
                    Units.POUND_PER_HOUR));

    private MassFlow(double si) {
        super(si, KIND);
    }

    private MassFlow(double value, Unit<MassFlow> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return a mass flow in kilograms per second}
     *
     * @param value the number of kilograms per second
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static MassFlow kilogramsPerSecond(double value) {
        return new MassFlow(value);
    }

    /**
     * {@return a mass flow in kilograms per hour}
     *
     * @param value the number of kilograms per hour
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static MassFlow kilogramsPerHour(double value) {
        return new MassFlow(value, Units.KILOGRAM_PER_HOUR);
    }

    /**
     * {@return a mass flow in tonnes per hour}
     *
     * @param value the number of tonnes per hour
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static MassFlow tonnesPerHour(double value) {
        return new MassFlow(value, Units.TONNE_PER_HOUR);
    }

    /**
     * {@return a mass flow in tonnes per day}
     *
     * @param value the number of tonnes per day
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static MassFlow tonnesPerDay(double value) {
        return new MassFlow(value, Units.TONNE_PER_DAY);
    }

    /**
     * {@return a mass flow in pounds per hour}
     *
     * @param value the number of pounds per hour
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static MassFlow poundsPerHour(double value) {
        return new MassFlow(value, Units.POUND_PER_HOUR);
    }

    /**
     * {@return a mass flow from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static MassFlow of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the mass flow that a text states, such as {@code "12.5 kg/s"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
     */
    public static MassFlow parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in kilograms per second} */
    public double inKilogramsPerSecond() {
        return si();
    }

    /** {@return the value in kilograms per hour} */
    public double inKilogramsPerHour() {
        return Units.KILOGRAM_PER_HOUR.fromSi(si());
    }

    /** {@return the value in tonnes per hour} */
    public double inTonnesPerHour() {
        return Units.TONNE_PER_HOUR.fromSi(si());
    }

    /** {@return the value in tonnes per day} */
    public double inTonnesPerDay() {
        return Units.TONNE_PER_DAY.fromSi(si());
    }

    /** {@return the value in pounds per hour} */
    public double inPoundsPerHour() {
        return Units.POUND_PER_HOUR.fromSi(si());
    }

    /**
     * {@return this mass flow times a specific energy}
     *
     * @param specificEnergy the other factor
     */
    public Power times(SpecificEnergy specificEnergy) {
        return Power.watts(si() * specificEnergy.si());
    }

    /**
     * {@return this mass flow times a specific entropy}
     *
     * @param specificEntropy the other factor
     */
    public EntropyRate times(SpecificEntropy specificEntropy) {
        return EntropyRate.wattsPerKelvin(si() * specificEntropy.si());
    }

    /**
     * {@return this mass flow times a specific volume}
     *
     * @param specificVolume the other factor
     */
    public VolumeFlow times(SpecificVolume specificVolume) {
        return VolumeFlow.cubicMetresPerSecond(si() * specificVolume.si());
    }

    /**
     * {@return this mass flow times a specific heat capacity}
     *
     * @param specificHeatCapacity the other factor
     */
    public HeatCapacityRate times(SpecificHeatCapacity specificHeatCapacity) {
        return HeatCapacityRate.wattsPerKelvin(si() * specificHeatCapacity.si());
    }

    /**
     * {@return this mass flow times a duration}
     *
     * @param duration the other factor
     */
    public Mass times(Duration duration) {
        return Mass.kilograms(si() * duration.si());
    }

    /**
     * {@return this mass flow times a mass price}
     *
     * @param massPrice the other factor
     */
    public MoneyRate times(MassPrice massPrice) {
        return MoneyRate.perSecond(si() * massPrice.si());
    }

    /**
     * {@return this mass flow divided by a molar mass}
     *
     * @param molarMass the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public MolarFlow over(MolarMass molarMass) {
        return MolarFlow.molesPerSecond(si() / molarMass.si());
    }

    /**
     * {@return this mass flow divided by a density}
     *
     * @param density the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public VolumeFlow over(Density density) {
        return VolumeFlow.cubicMetresPerSecond(si() / density.si());
    }

    /**
     * {@return this mass flow divided by an emission factor}
     *
     * @param emissionFactor the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public Power over(EmissionFactor emissionFactor) {
        return Power.watts(si() / emissionFactor.si());
    }

    /**
     * {@return this mass flow divided by a molar flow}
     *
     * @param molarFlow the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public MolarMass over(MolarFlow molarFlow) {
        return MolarMass.kilogramsPerMole(si() / molarFlow.si());
    }

    /**
     * {@return this mass flow divided by a power}
     *
     * @param power the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public EmissionFactor over(Power power) {
        return EmissionFactor.kilogramsPerJoule(si() / power.si());
    }

    /**
     * {@return this mass flow divided by a volume flow}
     *
     * @param volumeFlow the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public Density over(VolumeFlow volumeFlow) {
        return Density.kilogramsPerCubicMetre(si() / volumeFlow.si());
    }

    @Override
    public QuantityKind<MassFlow, MassFlow> kind() {
        return KIND;
    }

    @Override
    protected MassFlow with(double si) {
        return new MassFlow(si);
    }
}
