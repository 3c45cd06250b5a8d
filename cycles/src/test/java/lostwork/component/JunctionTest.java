package lostwork.component;

import static lostwork.quantity.MassFlow.kilogramsPerSecond;
import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.Ratio.percent;
import static lostwork.quantity.Temperature.celsius;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import lostwork.plant.Plant;
import lostwork.plant.PlantSolveException;
import lostwork.quantity.PressureDifference;
import org.junit.jupiter.api.Test;

/** Mixer and splitter, worked by hand with a perfect gas. */
class JunctionTest {
    /** By hand: 1 kg/s at 20 °C, 2 kg/s at 80 °C and 3 kg/s at 140 °C give (20 + 160 + 420)/6 = 100 °C. */
    @Test
    void mixingTemperatureIsTheMeanByFlow() {
        final var b = Plant.builder("header");
        final var mixer = b.add(new Mixer("mixer", 3));
        final var out = b.add(new Discharge("out"));
        b.connect(mixer.outlet(), out.inlet());
        var supplies = new Supply[3];
        for (int i = 0; i < 3; i++) {
            supplies[i] = b.add(new Supply("supply " + i, TestGas.COLD_AIR));
            b.connect(supplies[i].outlet(), mixer.inlet(i + 1));
        }
        var given = b.build().specify().given(out.pressure(), bar(2));
        for (int i = 0; i < 3; i++) {
            given = given.given(supplies[i].flow(), kilogramsPerSecond(1 + i))
                    .given(supplies[i].temperature(), celsius(20 + 60 * i));
        }
        final var s = given.solve();
        assertEquals(100, s.value(out.temperature()).inCelsius(), 1e-9);
        assertEquals(6, s.value(out.flow()).inKilogramsPerSecond(), 1e-12);
        assertEquals(2, s.value(supplies[0].pressure()).inBar(), 1e-12);
        assertEquals(3, s.plan().assumptions().size());
    }

    @Test
    void anInletOfHigherPressureThrottlesIntoTheMixer() {
        final var b = Plant.builder("header");
        final var mixer = b.add(new Mixer("mixer"));
        final var cold = b.add(new Supply("cold", TestGas.COLD_AIR));
        final var hot = b.add(new Supply("hot", TestGas.COLD_AIR));
        final var out = b.add(new Discharge("out"));
        b.connect(cold.outlet(), mixer.inlet(1))
                .connect(hot.outlet(), mixer.inlet(2))
                .connect(mixer.outlet(), out.inlet());
        final var given = b.build()
                .specify()
                .given(cold.flow(), kilogramsPerSecond(1))
                .given(cold.temperature(), celsius(50))
                .given(cold.pressure(), bar(2))
                .given(hot.flow(), kilogramsPerSecond(1))
                .given(hot.temperature(), celsius(50))
                .given(hot.pressure(), bar(3));
        final var s = given.given(out.pressure(), bar(2)).solve();
        assertEquals(50, s.value(out.temperature()).inCelsius(), 1e-9);
        assertEquals(
                TestGas.GAS_CONSTANT * Math.log(1.5), s.entropyGeneration(mixer).si(), 1e-8);
        final var refused = assertThrows(
                PlantSolveException.class,
                () -> given.given(out.pressure(), bar(4)).solve());
        assertTrue(refused.getMessage().contains("mixer would destroy entropy"), refused.getMessage());
    }

    @Test
    void fractionsShareTheFlow() {
        final var b = Plant.builder("tee");
        final var in = b.add(new Supply("in", TestGas.COLD_AIR));
        final var splitter = b.add(new Splitter("splitter", 3));
        b.connect(in.outlet(), splitter.inlet());
        for (int i = 1; i <= 3; i++) {
            b.connect(splitter.outlet(i), b.add(new Discharge("out " + i)).inlet());
        }
        final var s = b.build()
                .specify()
                .given(in.pressure(), bar(5))
                .given(in.temperature(), celsius(100))
                .given(splitter.outlet(1).flow(), kilogramsPerSecond(2))
                .given(splitter.fraction(1), percent(50))
                .given(splitter.fraction(2), percent(30))
                .solve();
        assertEquals(4, s.value(in.flow()).inKilogramsPerSecond(), 1e-12);
        assertEquals(20, s.value(splitter.fraction(3)).inPercent(), 1e-12);
        assertEquals(100, s.value(splitter.outlet(3).temperature()).inCelsius(), 1e-9);
    }

    @Test
    void numbersOfPortsAreChecked() {
        assertEquals(
                "m: number of inlets = 1 is outside 2 .. 100",
                assertThrows(IllegalArgumentException.class, () -> new Mixer("m", 1))
                        .getMessage());
        assertEquals(
                "s has no outlet 3; it has 2, counted from 1",
                assertThrows(IllegalArgumentException.class, () -> new Splitter("s").outlet(3))
                        .getMessage());
    }

    /** Two coolers in parallel: a balancing valve in one branch takes up the loss of the other. */
    @Test
    void parallelBranchesMeetAgainBehindABalancingValve() {
        final var b = Plant.builder("parallel coolers");
        final var in = b.add(new Supply("in", TestGas.COLD_AIR));
        final var splitter = b.add(new Splitter("splitter"));
        final var first = b.add(new Cooler("cooler 1"));
        final var second = b.add(new Cooler("cooler 2"));
        final var valve = b.add(new Valve("balancing valve"));
        final var mixer = b.add(new Mixer("mixer"));
        final var out = b.add(new Discharge("out"));
        b.connect(in.outlet(), splitter.inlet());
        b.line(splitter.path(1), first, valve, mixer.path(1));
        b.line(splitter.path(2), second, mixer.path(2));
        b.connect(mixer.outlet(), out.inlet());
        final var s = b.build()
                .specify()
                .given(in.pressure(), bar(5))
                .given(in.temperature(), celsius(200))
                .given(in.flow(), kilogramsPerSecond(4))
                .given(splitter.fraction(1), percent(25))
                .given(first.outlet().temperature(), celsius(40))
                .given(second.outlet().temperature(), celsius(80))
                .given(second.pressureLoss(), PressureDifference.bars(0.2))
                .solve();
        assertEquals(70, s.value(out.temperature()).inCelsius(), 1e-9);
        assertEquals(4.8, s.value(out.pressure()).inBar(), 1e-9);
        assertEquals(0.2e5, s.value(valve.pressureLoss()).inPascals(), 1e-4);
    }
}
