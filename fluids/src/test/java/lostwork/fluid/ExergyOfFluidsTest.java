package lostwork.fluid;

import static lostwork.fluid.gas.CombustionAir.excessAir;
import static lostwork.fluid.gas.MoleFraction.ethane;
import static lostwork.fluid.gas.MoleFraction.methane;
import static lostwork.fluid.gas.MoleFraction.nitrogen;
import static lostwork.quantity.MassFlow.tonnesPerHour;
import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.Pressure.mbar;
import static lostwork.quantity.Ratio.percent;
import static lostwork.quantity.Temperature.celsius;
import static lostwork.quantity.Temperature.kelvin;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import lostwork.exergy.AirComposition;
import lostwork.exergy.AtmosphericGas;
import lostwork.exergy.GouyStodola;
import lostwork.exergy.ReferenceEnvironment;
import lostwork.exergy.TemperatureGlide;
import lostwork.fluid.gas.FlueGas;
import lostwork.fluid.gas.Fuel;
import lostwork.fluid.gas.HumidAir;
import lostwork.fluid.water.Water;
import lostwork.quantity.Power;
import lostwork.quantity.Ratio;
import lostwork.quantity.SpecificEnergy;
import lostwork.quantity.Temperature;
import org.junit.jupiter.api.Test;

/** The laws of exergy with real fluids behind them. */
class ExergyOfFluidsTest {
    private final ReferenceEnvironment site =
            ReferenceEnvironment.of(celsius(12), mbar(1013)).withRelativeHumidity(percent(70));

    /** The first program of a user: exergy of a stream of rejected heat. */
    @Test
    void streamOfRejectedHeat() {
        var gas = FlueGas.of(Fuel.naturalGas(methane(0.93), ethane(0.04), nitrogen(0.03)), excessAir(percent(18)));

        var hot = gas.state(celsius(412), mbar(1011));
        var cold = gas.state(celsius(160), mbar(1009));
        var flow = tonnesPerHour(86);

        Power heat = flow.times(hot.enthalpy().minus(cold.enthalpy()));
        Power exergy = site.flowExergy(hot).minus(site.flowExergy(cold)).times(flow);
        Ratio quality = exergy.over(heat);

        // The quality lies between those of the ends, and near that of the Lorenz mean for a constant heat capacity.
        assertTrue(quality.compareTo(site.carnotFactor(celsius(160))) > 0
                && quality.compareTo(site.carnotFactor(celsius(412))) < 0);
        final Ratio lorenz = site.carnotFactor(TemperatureGlide.between(celsius(412), celsius(160)));
        assertEquals(lorenz.inPercent(), quality.inPercent(), 0.5);
    }

    /** Independent of the entropy of the gas: the integral of (1 - T0/T) δq along its cooling at constant pressure. */
    @Test
    void exergyOfFlueGasIsTheIntegralOverItsCoolingCurve() {
        final var gas =
                FlueGas.of(Fuel.naturalGas(methane(0.93), ethane(0.04), nitrogen(0.03)), excessAir(percent(18)));
        final double t0 = site.temperature().inKelvin();
        final double from = celsius(412).inKelvin();
        final double to = celsius(160).inKelvin();
        final int steps = 2000;
        double integral = 0;
        double before = gas.state(kelvin(from), mbar(1011)).enthalpy().si();
        for (int i = 1; i <= steps; i++) {
            final double t = from + (to - from) * i / steps;
            final double after = gas.state(kelvin(t), mbar(1011)).enthalpy().si();
            final double middle = t - (to - from) / steps / 2;
            integral += (1 - t0 / middle) * (before - after);
            before = after;
        }
        final SpecificEnergy drop = site.flowExergy(gas.state(kelvin(from), mbar(1011)))
                .minus(site.flowExergy(gas.state(kelvin(to), mbar(1011))));
        assertEquals(integral, drop.si(), 1e-7 * drop.si()); // error of the midpoint rule
    }

    /**
     * M. J. Moran, H. N. Shapiro, Fundamentals of Engineering Thermodynamics, example 7.5 (from memory): steam at 3 MPa, 320 °C
     * throttled to 0.5 MPa, T0 = 298 K; printed 1073.89, 836.15 and 237.7 kJ/kg. The book takes its properties from older
     * steam tables with saturated water at 25 °C as dead state; those differ from IAPWS-IF97 by up to 0.4 kJ/kg here.
     */
    @Test
    void steamThrottle() {
        final var environment = ReferenceEnvironment.of(kelvin(298), bar(1));
        final var water = Water.industrial();
        final var inlet = water.state(celsius(320), bar(30));
        final var outlet = water.state(bar(5), inlet.enthalpy());
        final SpecificEnergy before = environment.flowExergy(inlet);
        final SpecificEnergy after = environment.flowExergy(outlet);
        assertEquals(1073.89, before.inKilojoulesPerKilogram(), 0.4);
        assertEquals(836.15, after.inKilojoulesPerKilogram(), 0.4);
        assertEquals(237.7, before.minus(after).inKilojoulesPerKilogram(), 0.4);
        assertEquals(
                before.minus(after).si(),
                GouyStodola.lostWork(outlet.entropy().minus(inlet.entropy()), environment)
                        .si(),
                1e-6);
    }

    /** The humidity that the environment and humid air mean is one: the same vapour pressure stands behind both. */
    @Test
    void humidityOfEnvironmentAndOfHumidAirAgree() {
        for (final Temperature t : new Temperature[] {celsius(-30), celsius(-1), celsius(12), celsius(45)}) {
            final var environment = ReferenceEnvironment.of(t, mbar(1013))
                    .withRelativeHumidity(percent(70))
                    .withDryAir(AirComposition.standardAtmosphere1976());
            final double share =
                    environment.atmosphere().moleFraction(AtmosphericGas.WATER).si();
            final var air = HumidAir.of(t, mbar(1013), percent(70));
            final double ratio = air.humidityRatio().si();
            final double water = ratio / 18.01528;
            final double dry = 1 / 28.9651159;
            // Molar masses of the two data sets differ in the fifth digit.
            assertEquals(share, water / (water + dry), 1e-5 * share, t::toString);
            assertEquals(0, environment.flowExergy(air.state(t, mbar(1013))).si());
        }
    }

    @Test
    void aFluidInEquilibriumWithItsSurroundingsHasNoExergy() {
        final var water = Water.industrial();
        final var atAmbient = water.state(celsius(12), mbar(1013));
        assertEquals(0, site.flowExergy(atAmbient).si());
        assertEquals(0, site.closedMassExergy(atAmbient).si());
        // Ice-cold and hot water both have exergy.
        assertTrue(site.flowExergy(water.state(celsius(1), mbar(1013))).si() > 0);
        assertTrue(site.flowExergy(water.state(celsius(40), mbar(1013))).si() > 0);
    }
}
