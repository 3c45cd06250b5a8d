package lostwork.fluid;

import static lostwork.fluid.gas.CombustionAir.excessAir;
import static lostwork.fluid.gas.MoleFraction.ethane;
import static lostwork.fluid.gas.MoleFraction.methane;
import static lostwork.fluid.gas.MoleFraction.nitrogen;
import static lostwork.quantity.MassFlow.tonnesPerHour;
import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.Pressure.mbar;
import static lostwork.quantity.Ratio.percent;
import static lostwork.quantity.SpecificEntropy.kilojoulesPerKilogramKelvin;
import static lostwork.quantity.Temperature.celsius;
import static lostwork.quantity.Units.MEGAWATT;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import lostwork.exergy.ReferenceEnvironment;
import lostwork.fluid.gas.DryAir;
import lostwork.fluid.gas.FlueGas;
import lostwork.fluid.gas.Fuel;
import lostwork.fluid.gas.HumidAir;
import lostwork.fluid.water.Water;
import lostwork.quantity.Power;
import lostwork.quantity.Ratio;
import org.junit.jupiter.api.Test;

/** What users type, as they type it; the figures are those a practitioner expects. */
class UsesTest {
    @Test
    void aStreamOfRejectedHeat() {
        var site = ReferenceEnvironment.of(celsius(12), mbar(1013)).withRelativeHumidity(percent(70));
        var gas = FlueGas.of(Fuel.naturalGas(methane(0.93), ethane(0.04), nitrogen(0.03)), excessAir(percent(18)));

        var hot = gas.state(celsius(412), mbar(1011));
        var cold = gas.state(celsius(160), mbar(1009));
        var flow = tonnesPerHour(86);

        Power heat = flow.times(hot.enthalpy().minus(cold.enthalpy()));
        Power exergy = site.flowExergy(hot).minus(site.flowExergy(cold)).times(flow);
        Ratio quality = exergy.over(heat);
        final String line = heat.in(MEGAWATT) + "  " + exergy.in(MEGAWATT) + "  " + quality.inPercent();

        // By hand: 23.9 kg/s times a heat capacity of about 1.15 kJ/(kg K) times 252 K is about 6.9 MW.
        assertEquals(6.9, heat.in(MEGAWATT), 0.15, line);
        // By hand: 1 - T0 ln(685.15/433.15)/252 K is 48.1 % at constant cp; the pressure loss of 2 mbar adds 0.1 %.
        assertEquals(48.3, quality.inPercent(), 0.5, line);
    }

    @Test
    void statesEveryWayRound() {
        var w = Water.industrial();
        // Wagner, Kruse, International Steam Tables (2008), superheated steam; from memory: 3375.1 kJ/kg, 6.820 kJ/(kg
        // K).
        assertEquals(3375, w.state(bar(60), celsius(480)).enthalpy().inKilojoulesPerKilogram(), 0.5);
        assertEquals(6.82, w.state(bar(60), celsius(480)).entropy().inKilojoulesPerKilogramKelvin(), 0.001);
        var wet = w.state(bar(0.06), kilojoulesPerKilogramKelvin(6.82));
        // By hand, saturation at 0.06 bar: s' = 0.521, s'' = 8.329 kJ/(kg K) (steam tables, from memory).
        assertEquals(
                (6.82 - 0.521) / (8.329 - 0.521),
                wet.vapourFraction().orElseThrow().si(),
                2e-4);
        var evaporation = w.saturation(celsius(150))
                .vapour()
                .minus(w.saturation(celsius(150)).liquid());
        // 2113.7 kJ/kg at 150 °C: steam tables, from memory.
        assertEquals(2113.7, evaporation.enthalpy().inKilojoulesPerKilogram(), 0.1);
        assertTrue(w.provenance().toString().contains("R7-97"));
    }

    /** 25 °C, 50 %, 1013.25 mbar: 9.88 g/kg, wet bulb 17.9 °C, dew point 13.9 °C (psychrometric chart, from memory). */
    @Test
    void roomAirIsThatOfThePsychrometricChart() {
        final HumidAir air = HumidAir.of(celsius(25), mbar(1013.25), percent(50));
        assertEquals(9.88, 1000 * air.humidityRatio().si(), 0.02);
        assertEquals(17.9, air.wetBulb(celsius(25), mbar(1013.25)).inCelsius(), 0.06);
        assertEquals(13.9, air.waterDewPoint(mbar(1013.25)).inCelsius(), 0.06);
    }

    @Test
    void naturalGasIsAsEveryBoilerHouseKnowsIt() {
        // Lower heating value of methane 50.03 MJ/kg: ISO 6976, from memory.
        assertEquals(50.03, Fuel.naturalGas(methane(1)).lowerHeatingValue().inMegajoulesPerKilogram(), 0.02);
        // Water dew point of its flue gas: 55 °C to 60 °C near stoichiometric; common practice, no source.
        final double dewPoint = FlueGas.of(Fuel.naturalGas(methane(1)), excessAir(percent(10)))
                .waterDewPoint(mbar(1013))
                .inCelsius();
        assertTrue(dewPoint > 55 && dewPoint < 60, () -> "dew point " + dewPoint);
        assertEquals("excess air 18.00 % (dry air)", excessAir(percent(18)).toString());
    }

    /** At the dead state nothing is left, away from it on either side of T0 something is. */
    @Test
    void flowExergyIsLeastAtTheDeadState() {
        final var site = ReferenceEnvironment.of(celsius(12), mbar(1013)).withRelativeHumidity(percent(70));
        final Fluid[] fluids = {
            HumidAir.of(site),
            DryAir.standard(),
            FlueGas.of(Fuel.naturalGas(methane(1)), excessAir(percent(18))),
            Water.industrial()
        };
        for (Fluid fluid : fluids) {
            assertEquals(
                    0, site.flowExergy(fluid.state(celsius(12), mbar(1013))).si(), 1e-6, fluid.toString());
            for (double t : new double[] {1, 11.9, 12.1, 40, 90}) {
                final double exergy =
                        site.flowExergy(fluid.state(celsius(t), mbar(1013))).si();
                assertTrue(exergy > 0, () -> fluid + " at " + t + " °C: " + exergy + " J/kg");
            }
        }
    }
}
