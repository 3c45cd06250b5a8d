package lostwork.component;

import static lostwork.quantity.MassFlow.kilogramsPerSecond;
import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.Temperature.celsius;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import lostwork.fluid.Fluid;
import lostwork.fluid.water.Water;
import lostwork.plant.Plant;
import lostwork.plant.PlantSolveException;
import lostwork.plant.Specification;
import lostwork.quantity.PressureDifference;
import lostwork.quantity.Ratio;
import org.junit.jupiter.api.Test;

class ValveTest {
    private final Valve valve = new Valve("valve");
    private Supply supply;

    private Specification line(Fluid fluid) {
        supply = new Supply("supply", fluid);
        final var discharge = new Discharge("discharge");
        final var b = Plant.builder("throttle");
        b.add(supply);
        b.add(valve);
        b.add(discharge);
        b.connect(supply.outlet(), valve.inlet()).connect(valve.outlet(), discharge.inlet());
        return b.build()
                .specify()
                .given(supply.flow(), kilogramsPerSecond(2))
                .given(supply.pressure(), bar(10))
                .given(supply.temperature(), celsius(300));
    }

    /** By hand: a perfect gas keeps its temperature, and its entropy grows by R ln(p₁/p₂). */
    @Test
    void perfectGasKeepsItsTemperatureAndGainsEntropy() {
        final var s = line(TestGas.COLD_AIR)
                .given(valve.pressureLoss(), PressureDifference.bars(6))
                .solve();
        assertEquals(300, s.value(valve.outlet().temperature()).inCelsius(), 1e-9);
        assertEquals(4, s.value(valve.outlet().pressure()).inBar(), 1e-9);
        assertEquals(2.5, s.value(valve.pressureRatio()).si(), 1e-12);
        assertEquals(
                2 * TestGas.GAS_CONSTANT * Math.log(2.5),
                s.entropyGeneration(valve).si(),
                1e-8);
    }

    @Test
    void theLossFollowsWhenThePressureBehindIsGiven() {
        final var s = line(Water.industrial())
                .given(valve.outlet().pressure(), bar(3))
                .solve();
        assertEquals(7, s.value(valve.pressureLoss()).inPascals() / 1e5, 1e-9);
        assertTrue(s.value(valve.outlet().temperature()).inCelsius() < 300);
    }

    @Test
    void aRiseOfPressureIsRefusedByName() {
        final var specification = line(TestGas.COLD_AIR).given(valve.pressureRatio(), Ratio.fraction(0.5));
        final var refused = assertThrows(PlantSolveException.class, specification::solve);
        assertEquals(PlantSolveException.Reason.IMPOSSIBLE, refused.reason());
        assertTrue(refused.getMessage().contains("valve would destroy entropy"), refused.getMessage());
    }
}
