package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * An energy per time: heat rate, shaft power, exergy rate.
 *
 * <p>SI unit W. Any finite value exists; a difference may be negative. Immutable and thread-safe.
 */
public final class Power extends LinearQuantity<Power> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<Power, Power> KIND = QuantityKind.linear(
            "power",
            Power.class,
            Dimension.MASS.times(Dimension.LENGTH.pow(2)).dividedBy(Dimension.TIME.pow(3)),
            Power::new,
            1e6,
            List.of(
                    Units.KILOWATT,
                    Units.WATT,
                    Units.MEGAWATT,
                    Units.GIGAWATT,
                    Units.HORSEPOWER,
                    Units.METRIC_HORSEPOWER,
                    Units.BTU_PER_HOUR));

    private Power(double si) {
        super(si, KIND);
    }

    private Power(double value, Unit<Power> unit) {
        super(value, unit, KIND);
    }

    /**
     * {@return a power in kilowatts}
     *
     * @param value the number of kilowatts
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Power kilowatts(double value) {
        return new Power(value, Units.KILOWATT);
    }

    /**
     * {@return a power in watts}
     *
     * @param value the number of watts
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Power watts(double value) {
        return new Power(value);
    }

    /**
     * {@return a power in megawatts}
     *
     * @param value the number of megawatts
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Power megawatts(double value) {
        return new Power(value, Units.MEGAWATT);
    }

    /**
     * {@return a power in gigawatts}
     *
     * @param value the number of gigawatts
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Power gigawatts(double value) {
        return new Power(value, Units.GIGAWATT);
    }

    /**
     * {@return a power in mechanical horsepower (550 foot-pounds-force per second)}
     *
     * @param value the number of mechanical horsepower (550 foot-pounds-force per second)
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Power horsepower(double value) {
        return new Power(value, Units.HORSEPOWER);
    }

    /**
     * {@return a power in British thermal units per hour}
     *
     * @param value the number of British thermal units per hour
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    public static Power btuPerHour(double value) {
        return new Power(value, Units.BTU_PER_HOUR);
    }

    /**
     * {@return a power from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension or the scale is another one; see {@link QuantityKind#of(Quantity)}
     * @throws OutOfRangeException if the value is not allowed
     */
    public static Power of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the power that a text states, such as {@code "12.5 kW"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws UnreadableQuantityException if the text is not read; the message lists what is accepted
     * @throws OutOfRangeException if the value is not allowed
     */
    public static Power parse(String text) {
        return KIND.parse(text);
    }

    /** {@return the value in kilowatts} */
    public double inKilowatts() {
        return Units.KILOWATT.fromSi(si());
    }

    /** {@return the value in watts} */
    public double inWatts() {
        return si();
    }

    /** {@return the value in megawatts} */
    public double inMegawatts() {
        return Units.MEGAWATT.fromSi(si());
    }

    /** {@return the value in gigawatts} */
    public double inGigawatts() {
        return Units.GIGAWATT.fromSi(si());
    }

    /** {@return the value in mechanical horsepower (550 foot-pounds-force per second)} */
    public double inHorsepower() {
        return Units.HORSEPOWER.fromSi(si());
    }

    /** {@return the value in British thermal units per hour} */
    public double inBtuPerHour() {
        return Units.BTU_PER_HOUR.fromSi(si());
    }

    /**
     * {@return this power times a duration}
     *
     * @param duration the other factor
     */
    public Energy times(Duration duration) {
        return Energy.joules(si() * duration.si());
    }

    /**
     * {@return this power divided by a mass flow}
     *
     * @param massFlow the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public SpecificEnergy over(MassFlow massFlow) {
        return SpecificEnergy.joulesPerKilogram(si() / massFlow.si());
    }

    /**
     * {@return this power divided by a specific energy}
     *
     * @param specificEnergy the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public MassFlow over(SpecificEnergy specificEnergy) {
        return MassFlow.kilogramsPerSecond(si() / specificEnergy.si());
    }

    /**
     * {@return this power divided by a molar flow}
     *
     * @param molarFlow the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public MolarEnergy over(MolarFlow molarFlow) {
        return MolarEnergy.joulesPerMole(si() / molarFlow.si());
    }

    /**
     * {@return this power divided by a temperature span}
     *
     * @param temperatureSpan the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public Conductance over(TemperatureSpan temperatureSpan) {
        return Conductance.wattsPerKelvin(si() / temperatureSpan.si());
    }

    /**
     * {@return this power divided by a thermal conductance}
     *
     * @param conductance the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public TemperatureSpan over(Conductance conductance) {
        return TemperatureSpan.kelvins(si() / conductance.si());
    }

    /**
     * {@return this power divided by a heat capacity rate}
     *
     * @param heatCapacityRate the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public TemperatureSpan over(HeatCapacityRate heatCapacityRate) {
        return TemperatureSpan.kelvins(si() / heatCapacityRate.si());
    }

    /**
     * {@return this power divided by an area}
     *
     * @param area the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public HeatFlux over(Area area) {
        return HeatFlux.wattsPerSquareMetre(si() / area.si());
    }

    /**
     * {@return this power times an energy price}
     *
     * @param energyPrice the other factor
     */
    public MoneyRate times(EnergyPrice energyPrice) {
        return MoneyRate.perSecond(si() * energyPrice.si());
    }

    /**
     * {@return this power times an emission factor}
     *
     * @param emissionFactor the other factor
     */
    public MassFlow times(EmissionFactor emissionFactor) {
        return MassFlow.kilogramsPerSecond(si() * emissionFactor.si());
    }

    /**
     * {@return this power divided by an entropy rate: the mean temperature at which heat carries that entropy}
     *
     * @param entropyRate the divisor, not zero
     * @throws OutOfRangeException if the quotient is no temperature above 0 K, or the divisor is zero
     */
    public Temperature over(EntropyRate entropyRate) {
        return Temperature.kelvin(si() / entropyRate.si());
    }

    /**
     * {@return this power divided by a heat flux}
     *
     * @param heatFlux the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public Area over(HeatFlux heatFlux) {
        return Area.squareMetres(si() / heatFlux.si());
    }

    /**
     * {@return this power divided by a molar energy}
     *
     * @param molarEnergy the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public MolarFlow over(MolarEnergy molarEnergy) {
        return MolarFlow.molesPerSecond(si() / molarEnergy.si());
    }

    /**
     * {@return this power divided by a pressure difference}
     *
     * @param pressureDifference the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public VolumeFlow over(PressureDifference pressureDifference) {
        return VolumeFlow.cubicMetresPerSecond(si() / pressureDifference.si());
    }

    /**
     * {@return this power divided by a volume flow}
     *
     * @param volumeFlow the divisor, not zero
     * @throws OutOfRangeException if the divisor is zero
     */
    public PressureDifference over(VolumeFlow volumeFlow) {
        return PressureDifference.pascals(si() / volumeFlow.si());
    }

    @Override
    public QuantityKind<Power, Power> kind() {
        return KIND;
    }

    @Override
    protected Power with(double si) {
        return new Power(si);
    }
}
