package lostwork.exergy;

import java.io.Serializable;
import java.util.Objects;
import java.util.Optional;
import lostwork.quantity.Energy;
import lostwork.quantity.HeatFlux;
import lostwork.quantity.Length;
import lostwork.quantity.OutOfRangeException;
import lostwork.quantity.Power;
import lostwork.quantity.Pressure;
import lostwork.quantity.Ratio;
import lostwork.quantity.SpecificEnergy;
import lostwork.quantity.SpecificVolume;
import lostwork.quantity.Speed;
import lostwork.quantity.Temperature;
import lostwork.quantity.Units;
import lostwork.quantity.Volume;
import org.jspecify.annotations.Nullable;

/**
 * The environment that exergy is counted from: its temperature and pressure, and where it matters its humidity and
 * composition.
 *
 * <p>It is always stated, never assumed: there is no default environment, and what has not been stated cannot be asked
 * for. Exergy is the most work that something can yield while it comes into equilibrium with this environment, nothing
 * but the environment taking part.
 *
 * <h2>Formulas</h2>
 * <ul>
 *   <li>flow: {@code h - h0 - T0 (s - s0)};
 *   <li>closed mass: {@code u - u0 + p0 (v - v0) - T0 (s - s0)}; it differs from the flow by {@code (p - p0) v};
 *   <li>heat: {@code (1 - T0/T) Q}; at sliding temperature with the Lorenz mean, {@code (1 - T0/Tm) Q};
 *   <li>work of a growing volume: {@code W - p0 ΔV};
 *   <li>black-body radiation: {@code 1 - 4/3 T0/T + 1/3 (T0/T)⁴} of its energy (Petela 1964).
 * </ul>
 * <p>The index 0 stands for the same matter at {@code T0, p0}, the restricted dead state: mixing with the environment and
 * reactions with it are left to the chemical exergy.
 *
 * <h2>Signs</h2>
 * <p>Heat carries exergy in its own direction above {@code T0} and against it below: a positive heat at a temperature
 * below {@code T0} has a negative exergy, so whoever takes up that heat gives exergy away, and a cold room receives exergy
 * while heat is taken out of it. At {@code T0} heat has no exergy, exactly. Closed mass, the thermal part of a flow, and
 * radiation have no negative exergy, on either side of {@code T0}.
 *
 * <h2>Accuracy</h2>
 * <p>Exergy is a small difference near the dead state. It is as accurate there as a few units in the last place of
 * {@code h} and {@code T0 s}: about 1e-9 J/kg where those are 1e6 J/kg.
 *
 * <h2>Example</h2>
 * <pre>{@code
 * var site = ReferenceEnvironment.of(celsius(12), mbar(1013)).withRelativeHumidity(percent(70));
 * Power exergy = site.flowExergy(hot).minus(site.flowExergy(cold)).times(flow);
 * }</pre>
 *
 * <p>Sources: T. J. Kotas, The Exergy Method of Thermal Plant Analysis, Butterworths 1985; A. Bejan, G. Tsatsaronis,
 * M. Moran, Thermal Design and Optimization, Wiley 1996; R. Petela, Exergy of heat radiation, Journal of Heat Transfer 86
 * (1964) 187-192.
 *
 * <p>Immutable, thread-safe and serializable. The calls allocate nothing but their result.
 */
public final class ReferenceEnvironment implements Serializable {
    private static final long serialVersionUID = 1L;

    /** Standard acceleration of free fall, exact: 9.80665 m/s² (3rd General Conference on Weights and Measures, 1901). */
    private static final double STANDARD_GRAVITY = 9.80665;

    /** Temperature. */
    private final Temperature temperature;
    /** Pressure, above 0. */
    private final Pressure pressure;
    /** Relative humidity, 0 to 1; null if not stated. */
    private final @Nullable Ratio relativeHumidity;
    /** Composition of the dry part; null if not stated. */
    private final @Nullable AirComposition dryAir;

    private ReferenceEnvironment(
            Temperature temperature,
            Pressure pressure,
            @Nullable Ratio relativeHumidity,
            @Nullable AirComposition dryAir) {
        this.temperature = temperature;
        this.pressure = pressure;
        this.relativeHumidity = relativeHumidity;
        this.dryAir = dryAir;
    }

    /**
     * {@return an environment of which temperature and pressure are stated, enough for physical exergy}
     *
     * @param temperature the temperature {@code T0}
     * @param pressure the absolute pressure {@code p0}, above 0
     * @throws IllegalArgumentException if the pressure is 0
     */
    public static ReferenceEnvironment of(Temperature temperature, Pressure pressure) {
        if (!(pressure.si() > 0)) {
            throw new IllegalArgumentException("pressure of the reference environment = " + pressure
                    + " must be above 0: against a vacuum the exergy of a flow is not bounded");
        }
        return new ReferenceEnvironment(temperature, pressure, null, null);
    }

    /**
     * {@return this environment with a stated relative humidity}
     *
     * @param relativeHumidity partial pressure of water vapour over its saturation pressure, 0 to 1
     * @throws OutOfRangeException if it is outside 0 to 1
     */
    public ReferenceEnvironment withRelativeHumidity(Ratio relativeHumidity) {
        if (!(relativeHumidity.si() >= 0 && relativeHumidity.si() <= 1)) {
            throw new OutOfRangeException(
                    "relative humidity",
                    relativeHumidity.si(),
                    0,
                    1,
                    "Pa/Pa",
                    "air holds no more water vapour than saturated air",
                    "give percentages as Ratio.percent(70)");
        }
        return new ReferenceEnvironment(temperature, pressure, relativeHumidity, dryAir);
    }

    /**
     * {@return this environment with a stated composition of its dry air}
     *
     * @param dryAir the composition without water vapour; the humidity is stated on its own
     * @throws IllegalArgumentException if the composition contains water vapour
     */
    public ReferenceEnvironment withDryAir(AirComposition dryAir) {
        if (dryAir.fraction(AtmosphericGas.WATER) > 0) {
            throw new IllegalArgumentException("dry air with a mole fraction of H2O of "
                    + dryAir.fraction(AtmosphericGas.WATER)
                    + ": hand over composition.dry() and state the humidity, or use withAtmosphere(composition)");
        }
        return new ReferenceEnvironment(temperature, pressure, relativeHumidity, dryAir);
    }

    /**
     * {@return this environment with a stated composition, its water vapour included; the relative humidity follows}
     *
     * @param atmosphere the composition
     * @throws OutOfRangeException if there is more water vapour than saturated air holds, or the ambient temperature is
     *     outside 130 K to 647.096 K
     */
    public ReferenceEnvironment withAtmosphere(AirComposition atmosphere) {
        final double share = atmosphere.fraction(AtmosphericGas.WATER);
        final Ratio humidity = Ratio.fraction(
                share * pressure.si() / WaterVapourPressure.at(temperature).si());
        return withRelativeHumidity(humidity).withDryAir(atmosphere.dry());
    }

    /** {@return the temperature {@code T0}} */
    public Temperature temperature() {
        return temperature;
    }

    /** {@return the absolute pressure {@code p0}} */
    public Pressure pressure() {
        return pressure;
    }

    /** {@return the relative humidity, if it has been stated} */
    public Optional<Ratio> relativeHumidity() {
        return Optional.ofNullable(relativeHumidity);
    }

    /** {@return the composition of the dry air, if it has been stated} */
    public Optional<AirComposition> dryAir() {
        return Optional.ofNullable(dryAir);
    }

    /**
     * {@return the partial pressure of water vapour: relative humidity times saturation pressure}
     *
     * <p>Saturation pressure over liquid water by IAPWS SR1-86(1992) (W. Wagner, A. Pruss, Journal of Physical and Chemical
     * Reference Data 22 (1993) 783), below 273.16 K over ice by IAPWS R14-08(2011); 130 K to 647.096 K. The small increase
     * by the pressure of the air (0.4 % at 1 bar, the enhancement factor) is not counted.
     *
     * @throws IncompleteEnvironmentException if the relative humidity has not been stated
     * @throws OutOfRangeException if the ambient temperature is outside the range of the formula, or the vapour alone would
     *     have more than the ambient pressure
     */
    public Pressure waterVapourPressure() {
        if (relativeHumidity == null) {
            throw new IncompleteEnvironmentException("the humidity of the reference environment has not been stated;"
                    + " call withRelativeHumidity(...) or withAtmosphere(...)");
        }
        if (relativeHumidity.si() == 0) {
            return Pressure.pascal(0);
        }
        final double vapour =
                relativeHumidity.si() * WaterVapourPressure.at(temperature).si();
        if (!(vapour <= pressure.si())) {
            throw new OutOfRangeException(
                    "partial pressure of water vapour",
                    vapour,
                    0,
                    pressure.si(),
                    "Pa",
                    "pressure of the reference environment",
                    "give a lower relative humidity or temperature");
        }
        return Pressure.pascal(vapour);
    }

    /**
     * {@return the composition of the atmosphere, water vapour included: an ideal mixture of the dry air with vapour at its
     * partial pressure}
     *
     * @throws IncompleteEnvironmentException if humidity or dry air have not been stated
     * @throws OutOfRangeException if the ambient temperature is outside 130 K to 647.096 K, or the vapour alone would have
     *     more than the ambient pressure
     */
    public AirComposition atmosphere() {
        if (dryAir == null) {
            throw new IncompleteEnvironmentException(
                    "the composition of the reference environment has not been stated; call withDryAir(...), for example"
                            + " with AirComposition.szargut1988().dry(), or withAtmosphere(...)");
        }
        return dryAir.with(
                AtmosphericGas.WATER, Ratio.fraction(waterVapourPressure().si() / pressure.si()));
    }

    /**
     * {@return the partial pressure of a gas in the atmosphere, 0 if it is not present}
     *
     * @param gas the gas
     * @throws IncompleteEnvironmentException if humidity or dry air have not been stated
     * @throws OutOfRangeException if the ambient temperature is outside 130 K to 647.096 K, or the vapour alone would have
     *     more than the ambient pressure
     */
    public Pressure partialPressure(AtmosphericGas gas) {
        return pressure.times(atmosphere().moleFraction(gas));
    }

    /**
     * {@return the matter of a state in thermal and mechanical equilibrium with this environment, with its composition kept:
     * the restricted dead state}
     *
     * @param state the state
     * @throws OutOfRangeException if the property model of the state does not hold at {@code T0, p0}
     */
    public ThermodynamicState deadState(ThermodynamicState state) {
        return state.broughtTo(temperature, pressure);
    }

    /**
     * {@return the physical exergy of a flow per mass: {@code h - h0 - T0 (s - s0)}}
     *
     * <p>Negative where the flow needs work to leave against the ambient pressure, as a gas below {@code p0} does.
     *
     * @param state the state of the flow
     * @throws OutOfRangeException if the property model of the state does not hold at {@code T0, p0}
     */
    public SpecificEnergy flowExergy(ThermodynamicState state) {
        final ThermodynamicState dead = deadState(state);
        return SpecificEnergy.joulesPerKilogram(flowFunction(state, dead));
    }

    /**
     * {@return the physical exergy of a flow per mass, split into its thermal and mechanical part}
     *
     * @param state the state of the flow
     * @throws OutOfRangeException if the property model of the state does not hold at {@code T0} and the pressures
     *     {@code p0} and that of the state
     */
    public FlowExergy flowExergyParts(ThermodynamicState state) {
        final ThermodynamicState cooled = state.broughtTo(temperature, state.pressure());
        return new FlowExergy(
                SpecificEnergy.joulesPerKilogram(flowFunction(state, cooled)),
                SpecificEnergy.joulesPerKilogram(flowFunction(cooled, deadState(state))));
    }

    private double flowFunction(ThermodynamicState state, ThermodynamicState base) {
        final double enthalpy = state.enthalpy().si() - base.enthalpy().si();
        final double entropy = state.entropy().si() - base.entropy().si();
        return enthalpy - temperature.si() * entropy;
    }

    /**
     * {@return the physical exergy of a closed mass per mass: {@code u - u0 + p0 (v - v0) - T0 (s - s0)}; never negative up
     * to rounding}
     *
     * @param state the state of the mass
     * @throws OutOfRangeException if the property model of the state does not hold at {@code T0, p0}
     */
    public SpecificEnergy closedMassExergy(ThermodynamicState state) {
        final ThermodynamicState dead = deadState(state);
        final double energy =
                state.internalEnergy().si() - dead.internalEnergy().si();
        final double volume = state.volume().si() - dead.volume().si();
        final double entropy = state.entropy().si() - dead.entropy().si();
        return SpecificEnergy.joulesPerKilogram(energy + pressure.si() * volume - temperature.si() * entropy);
    }

    /**
     * {@return the share of a heat that is exergy: {@code 1 - T0/T}; 0 at {@code T0}, negative below}
     *
     * @param at the temperature at which the heat crosses the boundary
     */
    public Ratio carnotFactor(Temperature at) {
        return Ratio.fraction(factor(at.si()));
    }

    /**
     * {@return the share of a heat at sliding temperature that is exergy: {@code 1 - T0/Tm}, which is the mean of
     * {@code 1 - T0/T} over the heat}
     *
     * @param over the temperatures over which the heat is exchanged
     */
    public Ratio carnotFactor(TemperatureGlide over) {
        return Ratio.fraction(factor(over.meanKelvin()));
    }

    private double factor(double kelvin) {
        return (kelvin - temperature.si()) / kelvin;
    }

    /**
     * {@return the exergy that travels with a heat flow, in its direction: {@code (1 - T0/T) Q}}
     *
     * @param heat the heat flow
     * @param at the temperature at which it crosses the boundary
     */
    public Power heatExergy(Power heat, Temperature at) {
        return heat.times(carnotFactor(at));
    }

    /**
     * {@return the exergy that travels with a heat, in its direction: {@code (1 - T0/T) Q}}
     *
     * @param heat the heat
     * @param at the temperature at which it crosses the boundary
     */
    public Energy heatExergy(Energy heat, Temperature at) {
        return heat.times(carnotFactor(at));
    }

    /**
     * {@return the exergy that travels with a heat flow at sliding temperature, in its direction}
     *
     * @param heat the heat flow
     * @param over the temperatures over which it is exchanged
     */
    public Power heatExergy(Power heat, TemperatureGlide over) {
        return heat.times(carnotFactor(over));
    }

    /**
     * {@return the exergy that travels with a heat at sliding temperature, in its direction}
     *
     * @param heat the heat
     * @param over the temperatures over which it is exchanged
     */
    public Energy heatExergy(Energy heat, TemperatureGlide over) {
        return heat.times(carnotFactor(over));
    }

    /**
     * {@return the exergy that travels with a heat per mass, in its direction: {@code (1 - T0/T) q}}
     *
     * @param heat the heat per mass of some stream
     * @param at the temperature at which it crosses the boundary
     */
    public SpecificEnergy heatExergy(SpecificEnergy heat, Temperature at) {
        return heat.times(carnotFactor(at));
    }

    /**
     * {@return the exergy that travels with a heat per mass at sliding temperature, in its direction}
     *
     * @param heat the heat per mass of some stream
     * @param over the temperatures over which it is exchanged
     */
    public SpecificEnergy heatExergy(SpecificEnergy heat, TemperatureGlide over) {
        return heat.times(carnotFactor(over));
    }

    /**
     * {@return the exergy of a work done by a body whose volume grows: {@code W - p0 ΔV}, what is left when the atmosphere
     * has been pushed back}
     *
     * <p>The work of a shaft or a wire, without a change of volume, is exergy as it is.
     *
     * @param work the work done by the body
     * @param growth the increase of its volume, negative if it shrinks
     */
    public Energy workExergy(Energy work, Volume growth) {
        return Energy.joules(work.si() - pressure.si() * growth.si());
    }

    /**
     * {@return the exergy of a work per mass done by a body whose volume grows: {@code w - p0 Δv}}
     *
     * @param work the work per mass done by the body
     * @param growth the increase of its specific volume, negative if it shrinks
     */
    public SpecificEnergy workExergy(SpecificEnergy work, SpecificVolume growth) {
        return SpecificEnergy.joulesPerKilogram(work.si() - pressure.si() * growth.si());
    }

    /**
     * {@return the share of black-body radiation that is exergy: {@code 1 - 4/3 T0/T + 1/3 (T0/T)⁴}}
     *
     * <p>0 at {@code T0}, positive on both sides of it, and above 1 for radiation colder than about {@code T0/1.6}, which
     * takes more work to make than it has energy. The formula holds for undiluted isotropic black-body radiation that
     * exchanges with the environment at {@code T0} (R. Petela, Journal of Heat Transfer 86 (1964) 187-192).
     *
     * @param of the temperature of the radiation
     */
    public Ratio radiationFactor(Temperature of) {
        final double tau = temperature.si() / of.si();
        // The same polynomial with its double root at T0 taken out, so that it is exactly 0 there.
        return Ratio.fraction((1 - tau) * (1 - tau) * (tau * (tau + 2) + 3) / 3);
    }

    /**
     * {@return the exergy of black-body radiation through an area}
     *
     * @param radiation the energy of the radiation per time and area
     * @param of its temperature
     */
    public HeatFlux radiationExergy(HeatFlux radiation, Temperature of) {
        return radiation.times(radiationFactor(of));
    }

    /**
     * {@return the exergy of black-body radiation}
     *
     * @param radiation the energy of the radiation per time
     * @param of its temperature
     */
    public Power radiationExergy(Power radiation, Temperature of) {
        return radiation.times(radiationFactor(of));
    }

    /**
     * {@return the exergy of motion per mass: {@code w²/2}}
     *
     * @param relative the speed relative to the environment
     */
    public SpecificEnergy kineticExergy(Speed relative) {
        return relative.kineticEnergy();
    }

    /**
     * {@return the exergy of height per mass: {@code g z}, with standard gravity 9.80665 m/s²}
     *
     * @param height the height above the ground level of the environment, negative below
     */
    public SpecificEnergy potentialExergy(Length height) {
        return SpecificEnergy.joulesPerKilogram(STANDARD_GRAVITY * height.si());
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof ReferenceEnvironment that
                && temperature.equals(that.temperature)
                && pressure.equals(that.pressure)
                && Objects.equals(relativeHumidity, that.relativeHumidity)
                && Objects.equals(dryAir, that.dryAir);
    }

    @Override
    public int hashCode() {
        return Objects.hash(temperature, pressure, relativeHumidity, dryAir);
    }

    /** {@return what has been stated, such as {@code 12 °C, 1.013 bar, relative humidity 70 %}} */
    @Override
    public String toString() {
        final StringBuilder text =
                new StringBuilder().append(temperature).append(", ").append(pressure);
        if (relativeHumidity != null) {
            text.append(", relative humidity ").append(relativeHumidity.format(Units.PERCENT, 4));
        }
        if (dryAir != null) {
            text.append(", dry air ").append(dryAir);
        }
        return text.toString();
    }

    /** {@return what is written to a stream} */
    private Object writeReplace() {
        return new Form(temperature, pressure, relativeHumidity, dryAir);
    }

    /**
     * The serial form; read back through the checks.
     *
     * @param temperature temperature
     * @param pressure pressure
     * @param relativeHumidity relative humidity or null
     * @param dryAir composition or null
     */
    private record Form(
            Temperature temperature,
            Pressure pressure,
            @Nullable Ratio relativeHumidity,
            @Nullable AirComposition dryAir)
            implements Serializable {
        private static final long serialVersionUID = 1L;

        /** {@return the environment, checked} */
        private Object readResolve() {
            ReferenceEnvironment environment = of(temperature, pressure);
            if (relativeHumidity != null) {
                environment = environment.withRelativeHumidity(relativeHumidity);
            }
            return dryAir == null ? environment : environment.withDryAir(dryAir);
        }
    }
}
