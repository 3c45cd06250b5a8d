package lostwork.quantity;

import java.util.List;
import javax.measure.Quantity;

/**
 * An energy per time: heat rate, shaft power, exergy rate.
 *
 * <p>SI unit W. Any finite value exists. Immutable and thread-safe.
 */
public final class Power extends LinearQuantity<Power> {
    private static final long serialVersionUID = 1L;

    /** Name, units, bounds and scale of this quantity. */
    public static final QuantityKind<Power, Power> KIND = QuantityKind.linear(
            "power",
            Power.class,
            new Dimension(2, 1, -3, 0, 0, 0),
            Power::new,
            1e6,
            List.of(Units.KILOWATT, Units.WATT, Units.MEGAWATT, Units.GIGAWATT, Units.HORSEPOWER, Units.BTU_PER_HOUR));

    private Power(double si) {
        super(si, KIND);
    }

    /**
     * {@return a power}
     *
     * @param value power in kilowatts
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Power kilowatts(double value) {
        return new Power(Units.KILOWATT.toSi(value));
    }

    /**
     * {@return a power}
     *
     * @param value power in watts
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Power watts(double value) {
        return new Power(value);
    }

    /**
     * {@return a power}
     *
     * @param value power in megawatts
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Power megawatts(double value) {
        return new Power(Units.MEGAWATT.toSi(value));
    }

    /**
     * {@return a power}
     *
     * @param value power in gigawatts
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Power gigawatts(double value) {
        return new Power(Units.GIGAWATT.toSi(value));
    }

    /**
     * {@return a power}
     *
     * @param value power in mechanical horsepower (550 foot-pounds-force per second)
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Power horsepower(double value) {
        return new Power(Units.HORSEPOWER.toSi(value));
    }

    /**
     * {@return a power}
     *
     * @param value power in British thermal units per hour
     * @throws IllegalArgumentException if the value is NaN or infinite
     */
    public static Power btuPerHour(double value) {
        return new Power(Units.BTU_PER_HOUR.toSi(value));
    }

    /**
     * {@return a power from a JSR-385 quantity in any unit of the same dimension}
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension is another one, or the value is not allowed
     */
    public static Power of(Quantity<?> quantity) {
        return KIND.of(quantity);
    }

    /**
     * {@return the power that a text states, such as {@code "12.5 kW"}}
     *
     * @param text a number with a decimal point, then a unit; see {@link QuantityKind#parse}
     * @throws IllegalArgumentException if the text cannot be read as this quantity; the message lists what is accepted
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
     * {@return the product with a duration}
     *
     * @param duration the other factor
     */
    public Energy times(Duration duration) {
        return Energy.joules(si() * duration.si());
    }

    /**
     * {@return the quotient with a mass flow}
     *
     * @param massFlow the divisor, not zero
     * @throws IllegalArgumentException if the quotient is not finite
     */
    public SpecificEnergy over(MassFlow massFlow) {
        return SpecificEnergy.joulesPerKilogram(si() / massFlow.si());
    }

    /**
     * {@return the quotient with a specific energy}
     *
     * @param specificEnergy the divisor, not zero
     * @throws IllegalArgumentException if the quotient is not finite
     */
    public MassFlow over(SpecificEnergy specificEnergy) {
        return MassFlow.kilogramsPerSecond(si() / specificEnergy.si());
    }

    /**
     * {@return the quotient with a molar flow}
     *
     * @param molarFlow the divisor, not zero
     * @throws IllegalArgumentException if the quotient is not finite
     */
    public MolarEnergy over(MolarFlow molarFlow) {
        return MolarEnergy.joulesPerMole(si() / molarFlow.si());
    }

    /**
     * {@return the quotient with a temperature span}
     *
     * @param temperatureSpan the divisor, not zero
     * @throws IllegalArgumentException if the quotient is not finite
     */
    public Conductance over(TemperatureSpan temperatureSpan) {
        return Conductance.wattsPerKelvin(si() / temperatureSpan.si());
    }

    /**
     * {@return the quotient with a thermal conductance}
     *
     * @param conductance the divisor, not zero
     * @throws IllegalArgumentException if the quotient is not finite
     */
    public TemperatureSpan over(Conductance conductance) {
        return TemperatureSpan.kelvins(si() / conductance.si());
    }

    /**
     * {@return the quotient with a heat capacity rate}
     *
     * @param heatCapacityRate the divisor, not zero
     * @throws IllegalArgumentException if the quotient is not finite
     */
    public TemperatureSpan over(HeatCapacityRate heatCapacityRate) {
        return TemperatureSpan.kelvins(si() / heatCapacityRate.si());
    }

    /**
     * {@return the quotient with an area}
     *
     * @param area the divisor, not zero
     * @throws IllegalArgumentException if the quotient is not finite
     */
    public HeatFlux over(Area area) {
        return HeatFlux.wattsPerSquareMetre(si() / area.si());
    }

    /**
     * {@return the product with an energy price}
     *
     * @param energyPrice the other factor
     */
    public MoneyRate times(EnergyPrice energyPrice) {
        return MoneyRate.perSecond(si() * energyPrice.si());
    }

    /**
     * {@return the product with an emission factor}
     *
     * @param emissionFactor the other factor
     */
    public MassFlow times(EmissionFactor emissionFactor) {
        return MassFlow.kilogramsPerSecond(si() * emissionFactor.si());
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
