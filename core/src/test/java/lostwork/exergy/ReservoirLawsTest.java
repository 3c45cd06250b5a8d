package lostwork.exergy;

import static lostwork.quantity.Temperature.celsius;
import static lostwork.quantity.Temperature.kelvin;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import lostwork.quantity.MassFlow;
import lostwork.quantity.Power;
import lostwork.quantity.Pressure;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.function.Executable;

class ReservoirLawsTest {
    @Test
    void numbersDoneByHand() {
        assertEquals(0.5, Carnot.engineEfficiency(kelvin(600), kelvin(300)).si());
        assertEquals(9, Carnot.refrigeratorCop(kelvin(300), kelvin(270)).si(), 1e-14);
        assertEquals(10, Carnot.heatPumpCop(kelvin(300), kelvin(270)).si(), 1e-14);
        assertEquals(
                0.5, CurzonAhlborn.engineEfficiency(kelvin(1200), kelvin(300)).si(), 1e-15);
        assertEquals(2, CurzonAhlborn.heatPumpCop(kelvin(400), kelvin(300)).si(), 1e-15);
        assertEquals(1, CurzonAhlborn.refrigeratorCop(kelvin(400), kelvin(300)).si(), 1e-15);
        // Tm of 300 e² K .. 300 K is 300 (e² - 1)/2 K.
        final var hot = TemperatureGlide.between(kelvin(300 * Math.exp(2)), kelvin(300));
        assertEquals(150 * Math.expm1(2), hot.mean().si(), 1e-12);
        final var cold = TemperatureGlide.constant(kelvin(300));
        assertEquals(1 - 2 / Math.expm1(2), Lorenz.engineEfficiency(hot, cold).si(), 1e-15);
    }

    @Test
    void equalReservoirsYieldNothing() {
        assertEquals(0, Carnot.engineEfficiency(celsius(20), celsius(20)).si());
        assertEquals(
                0,
                Carnot.enginePower(Power.megawatts(5), celsius(20), celsius(20)).si());
        assertEquals(0, CurzonAhlborn.engineEfficiency(celsius(20), celsius(20)).si());
        final var glide = TemperatureGlide.between(celsius(80), celsius(20));
        assertEquals(0, Lorenz.engineEfficiency(glide, glide).si());
        assertEquals(0, Lorenz.enginePower(Power.megawatts(5), glide, glide).si());
        final List<Executable> infinite = List.of(
                () -> Carnot.refrigeratorCop(celsius(20), celsius(20)),
                () -> Carnot.heatPumpCop(celsius(20), celsius(20)),
                () -> CurzonAhlborn.refrigeratorCop(celsius(20), celsius(20)),
                () -> CurzonAhlborn.heatPumpCop(celsius(20), celsius(20)),
                () -> Lorenz.refrigeratorCop(glide, glide),
                () -> Lorenz.heatPumpCop(glide, glide));
        for (final Executable call : infinite) {
            final ReservoirException e = assertThrows(ReservoirException.class, call);
            assertEquals(ReservoirException.Reason.EQUAL, e.reason());
            assertTrue(e.getMessage().contains("no finite value"), e.getMessage());
        }
    }

    @Test
    void theWrongOrderIsRefused() {
        final ReservoirException e =
                assertThrows(ReservoirException.class, () -> Carnot.engineEfficiency(celsius(20), celsius(300)));
        assertEquals(ReservoirException.Reason.REVERSED, e.reason());
        assertEquals(celsius(20).si(), e.hot().si());
        assertEquals(celsius(300).si(), e.cold().si());
        assertEquals(
                "hot side at 20 °C is below the cold side, 300 °C; give the hot side first, then the cold side",
                e.getMessage());
    }

    @Test
    void glideOfAStream() {
        final var hot = PerfectGasState.air(700, 1.1e5);
        final var cold = PerfectGasState.air(400, 1.1e5);
        assertEquals(
                TemperatureGlide.between(kelvin(700), kelvin(400)).mean().si(),
                TemperatureGlide.ofStream(hot, cold).mean().si(),
                1e-10);
        assertEquals(700, TemperatureGlide.ofStream(hot, hot).mean().si());
        // Expansion to a lower temperature with rising entropy is no exchange of heat.
        final var expanded = PerfectGasState.air(690, 0.1e5);
        final IllegalArgumentException e =
                assertThrows(IllegalArgumentException.class, () -> TemperatureGlide.ofStream(hot, expanded));
        assertTrue(e.getMessage().contains("no mean temperature"), e.getMessage());
    }

    /** Both ways to name one temperature are one thing, for heat and for entropy. */
    @Test
    void aConstantGlideIsItsTemperature() {
        final var site = ReferenceEnvironment.of(celsius(15), Pressure.bar(1));
        final var glide = TemperatureGlide.constant(celsius(240));
        assertEquals(glide, TemperatureGlide.between(celsius(240), celsius(240)));
        assertEquals("240 °C", glide.toString());
        final Power heat = Power.kilowatts(7);
        assertEquals(site.heatExergy(heat, celsius(240)), site.heatExergy(heat, glide));
        final var atPoint = EntropyBalance.empty().heatIn(heat, celsius(240)).heatOut(heat, celsius(15));
        final var overGlide =
                EntropyBalance.empty().heatIn(heat, glide).heatOut(heat, TemperatureGlide.constant(celsius(15)));
        assertEquals(atPoint.generation(), overGlide.generation());
        assertEquals(
                site.heatExergy(heat, glide).si(),
                GouyStodola.lostPower(atPoint.generation(), site).si(),
                1e-9);
    }

    @Test
    void entropyBalanceNeedsBalancedMasses() {
        final var state = PerfectGasState.air(400, 2e5);
        final var open = EntropyBalance.empty().inflow(MassFlow.kilogramsPerSecond(2), state);
        final IllegalStateException e = assertThrows(IllegalStateException.class, open::generation);
        assertTrue(e.getMessage().contains("do not balance"), e.getMessage());
        assertEquals(2, open.massImbalance().si());
        final var throttled = open.outflow(MassFlow.kilogramsPerSecond(2), PerfectGasState.air(400, 1e5));
        assertEquals(2 * 287 * Math.log(2), throttled.generation().inWattsPerKelvin(), 1e-9);
        assertEquals(0, EntropyBalance.empty().generation().si());
    }

    @Test
    void freeEnergiesOnlyAtOneTemperature() {
        final var before = PerfectGasState.air(350, 4e5);
        final var after = PerfectGasState.air(350, 1e5);
        // Isothermal expansion of a perfect gas: R T ln 4, closed or flowing.
        assertEquals(
                287 * 350 * Math.log(4),
                FreeEnergy.isothermalWork(before, after).si(),
                1e-8);
        assertEquals(
                287 * 350 * Math.log(4),
                FreeEnergy.isothermalShaftWork(before, after).si(),
                1e-8);
        // g - f = p v, whatever the datum.
        assertEquals(
                287 * 350.0,
                FreeEnergy.gibbs(before).minus(FreeEnergy.helmholtz(before)).si(),
                1e-9);
        final var warmer = PerfectGasState.air(351, 1e5);
        assertThrows(IllegalArgumentException.class, () -> FreeEnergy.isothermalWork(before, warmer));
        assertThrows(IllegalArgumentException.class, () -> FreeEnergy.isothermalShaftWork(before, warmer));
    }
}
