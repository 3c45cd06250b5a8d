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
import lostwork.quantity.Power;
import org.junit.jupiter.api.Test;

/** Shaft, generator and motor, worked by hand. */
class ShaftTrainTest {
    /** By hand: 5 MW and 3 MW taken, 98 % delivered, 2.84 MW to a pump set; 5 MW to the generator, 97 % of it to the grid. */
    @Test
    void powersAddUpOnTheShaft() {
        final var b = Plant.builder("shaft train");
        final var shaft = b.add(new Shaft("shaft").withDriving(2).withDriven(2));
        final var generator = b.add(new Generator("generator"));
        b.connect(shaft.driven(1), generator.shaft());
        final var s = b.build()
                .specify()
                .given(shaft.driving(1).power(), Power.megawatts(5))
                .given(shaft.driving(2).power(), Power.megawatts(3))
                .given(shaft.driven(2).power(), Power.megawatts(2.84))
                .given(shaft.mechanicalEfficiency(), percent(98))
                .given(generator.efficiency(), percent(97))
                .solve();
        assertEquals(5.0, s.value(generator.shaft().power()).inMegawatts(), 1e-12);
        assertEquals(4.85, s.value(generator.power()).inMegawatts(), 1e-12);
        assertEquals(0.16, s.value(shaft.losses()).inMegawatts(), 1e-12);
        assertEquals(0.15, s.value(generator.heatLoss().rate()).inMegawatts(), 1e-12);
        assertEquals(0, s.closure().energy(), 1e-12);
    }

    @Test
    void motorDrivesACompressor() {
        final var b = Plant.builder("plant air");
        final var motor = b.add(new Motor("motor"));
        final var compressor = b.add(new Compressor("compressor"));
        final var air = b.add(new Supply("air", TestGas.COLD_AIR));
        final var out = b.add(new Discharge("out"));
        b.connect(air.outlet(), compressor.inlet()).connect(compressor.outlet(), out.inlet());
        b.connect(motor.shaft(), compressor.shaft());
        final var s = b.build()
                .specify()
                .given(air.flow(), kilogramsPerSecond(1))
                .given(air.pressure(), bar(1))
                .given(air.temperature(), celsius(20))
                .given(compressor.pressureRatio(), lostwork.quantity.Ratio.fraction(4))
                .given(compressor.isentropicEfficiency(), percent(80))
                .given(motor.efficiency(), percent(95))
                .solve();
        final double rise = 293.15 * (Math.pow(4, 0.4 / 1.4) - 1) / 0.8;
        assertEquals(293.15 + rise, s.value(compressor.outlet().temperature()).inKelvin(), 1e-9);
        assertEquals(TestGas.HEAT_CAPACITY * rise / 0.95, s.value(motor.power()).inWatts(), 1e-6);
    }

    @Test
    void noLossesAreAssumedAndPrinted() {
        final var b = Plant.builder("set");
        final var motor = b.add(new Motor("motor"));
        final var s = b.build()
                .specify()
                .given(motor.shaft().power(), Power.kilowatts(30))
                .solve();
        assertEquals(30, s.value(motor.power()).inKilowatts(), 1e-12);
        assertEquals("no losses", s.plan().assumptions().get(0).name());
    }

    @Test
    void anEfficiencyBeyondItsRangeIsNamed() {
        final var b = Plant.builder("set");
        final var motor = b.add(new Motor("motor"));
        final var given = b.build().specify().given(motor.shaft().power(), Power.kilowatts(30));
        final var refused = assertThrows(
                PlantSolveException.class,
                () -> given.given(motor.power(), Power.kilowatts(25)).solve());
        assertTrue(
                refused.getMessage().contains("motor: an efficiency of at most 100 % is not met"),
                refused.getMessage());
    }
}
