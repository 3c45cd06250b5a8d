package lostwork.component;

import static lostwork.quantity.MassFlow.kilogramsPerSecond;
import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.PressureDifference.bars;
import static lostwork.quantity.Temperature.celsius;
import static lostwork.quantity.TemperatureSpan.kelvins;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import lostwork.fluid.gas.DryAir;
import lostwork.fluid.water.Water;
import lostwork.plant.PlantSolveException;
import lostwork.plant.Solution;
import lostwork.plant.SolveOptions;
import lostwork.plant.Specification;
import org.junit.jupiter.api.Test;

class HeatExchangerTest {
    private static final TwoStreams BOILER =
            new TwoStreams(DryAir.standard(), Water.industrial(), FlowArrangement.COUNTERFLOW);

    private static Specification boiler() {
        return BOILER.plant
                .specify()
                .given(BOILER.hot.flow(), kilogramsPerSecond(40))
                .given(BOILER.hot.temperature(), celsius(480))
                .given(BOILER.hot.pressure(), bar(1.02))
                .given(BOILER.cold.temperature(), celsius(105))
                .given(BOILER.cold.pressure(), bar(30));
    }

    @Test
    void steamFlowComesOutOfThePinch() {
        final Solution s = boiler().given(BOILER.exchanger.pinch(), kelvins(10))
                .given(BOILER.exchanger.coldOutlet().superheat(), kelvins(150))
                .solve();
        final var water = Water.industrial();
        final var air = DryAir.standard();
        final var boiling = water.saturation(bar(30));
        final double above = 40
                * (air.state(celsius(480), bar(1)).enthalpy().si()
                        - air.state(boiling.temperature().plus(kelvins(10)), bar(1))
                                .enthalpy()
                                .si());
        final double steam = above
                / (s.state(BOILER.coldEnd.inlet()).enthalpy().si()
                        - boiling.liquid().enthalpy().si());
        assertEquals(steam, s.value(BOILER.cold.flow()).inKilogramsPerSecond(), 1e-8 * steam);
        assertEquals(0, s.closure().energy(), 1e-9);
        assertTrue(s.value(BOILER.exchanger.meanDifference()).inKelvins()
                > s.value(BOILER.exchanger.pinch()).inKelvins());
    }

    @Test
    void pressureLossMovesTheBoilingPoint() {
        final Specification plain = boiler().given(BOILER.exchanger.pinch(), kelvins(10))
                .given(BOILER.exchanger.coldOutlet().superheat(), kelvins(150));
        final Solution without = plain.solve();
        final Solution with =
                plain.given(BOILER.exchanger.coldPressureLoss(), bars(3)).solve();
        assertEquals(27, with.value(BOILER.coldEnd.pressure()).inBar(), 1e-9);
        assertTrue(with.value(BOILER.cold.flow()).si()
                > without.value(BOILER.cold.flow()).si());
        assertEquals(0, without.value(BOILER.exchanger.hotPressureLoss()).si());
    }

    @Test
    void streamsThatCrossAtTheWarmEndAreRefused() {
        final Specification s = boiler().given(BOILER.cold.flow(), kilogramsPerSecond(1))
                .given(BOILER.coldEnd.temperature(), celsius(490));
        final var e = assertThrows(PlantSolveException.class, s::solve);
        assertEquals(PlantSolveException.Reason.IMPOSSIBLE, e.reason());
        assertTrue(
                e.getMessage().contains("exchanger: the hot stream is not colder than the cold one at the warm end"));
    }

    @Test
    void streamsThatCrossInsideAreRefused() {
        final Specification s = boiler().given(BOILER.cold.flow(), kilogramsPerSecond(6))
                .given(BOILER.coldEnd.temperature(), celsius(420));
        final var e = assertThrows(PlantSolveException.class, s::solve);
        assertEquals(PlantSolveException.Reason.IMPOSSIBLE, e.reason());
        assertTrue(
                e.getMessage().contains("exchanger: the hot stream is not colder than the cold one between the ends"));
        assertTrue(!e.getMessage().contains("at the warm end"));
    }

    @Test
    void aCrossingMayBeLookedAt() {
        final Solution s = boiler().given(BOILER.cold.flow(), kilogramsPerSecond(6))
                .given(BOILER.coldEnd.temperature(), celsius(420))
                .solve(SolveOptions.defaults().with(SolveOptions.SecondLaw.REPORTED));
        assertTrue(s.value(BOILER.exchanger.pinch()).inKelvins() < 0);
        assertEquals(
                1,
                s.violations().stream()
                        .filter(v -> v.contains("between the ends"))
                        .count());
    }

    @Test
    void heatDoesNotPassFromColdToHot() {
        final Specification s = boiler().given(BOILER.cold.flow(), kilogramsPerSecond(1))
                .given(BOILER.hotEnd.temperature(), celsius(481));
        final var e = assertThrows(PlantSolveException.class, s::solve);
        assertTrue(e.getMessage().contains("exchanger: the hot stream gives off heat"), e.getMessage());
    }

    @Test
    void parallelFlowPinchesAtTheOutletEnd() {
        final var p = new TwoStreams(DryAir.standard(), DryAir.standard(), FlowArrangement.PARALLEL_FLOW);
        final Solution s = p.plant
                .specify()
                .given(p.hot.flow(), kilogramsPerSecond(2))
                .given(p.hot.temperature(), celsius(400))
                .given(p.hot.pressure(), bar(1))
                .given(p.cold.flow(), kilogramsPerSecond(3))
                .given(p.cold.temperature(), celsius(20))
                .given(p.cold.pressure(), bar(1))
                .given(p.exchanger.pinch(), kelvins(25))
                .solve();
        assertEquals(25, s.value(p.exchanger.coldEndDifference()).inKelvins(), 1e-8);
        assertEquals(380, s.value(p.exchanger.warmEndDifference()).inKelvins(), 1e-8);
        assertEquals(
                25,
                s.value(p.hotEnd.temperature())
                        .minus(s.value(p.coldEnd.temperature()))
                        .inKelvins(),
                1e-8);
    }
}
