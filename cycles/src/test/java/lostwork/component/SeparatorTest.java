package lostwork.component;

import static lostwork.quantity.MassFlow.kilogramsPerSecond;
import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.Ratio.percent;
import static lostwork.quantity.Temperature.celsius;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import lostwork.fluid.water.Water;
import lostwork.plant.Plant;
import lostwork.plant.PlantSolveException;
import lostwork.quantity.Power;
import lostwork.quantity.Ratio;
import lostwork.quantity.TemperatureSpan;
import org.junit.jupiter.api.Test;

/** Separator and steam drum, worked by hand from saturated states. */
class SeparatorTest {
    /** By hand: saturated water of 10 bar flashes to 2 bar with x = (h′(10 bar) − h′(2 bar)) / r(2 bar). */
    @Test
    void flashTank() {
        final var water = Water.industrial();
        final var b = Plant.builder("flash tank");
        final var hot = b.add(new Supply("hot condensate", water));
        final var valve = b.add(new Valve("valve"));
        final var tank = b.add(new Separator("tank"));
        final var steam = b.add(new Discharge("steam"));
        final var drain = b.add(new Discharge("drain"));
        b.connect(hot.outlet(), valve.inlet())
                .connect(valve.outlet(), tank.inlet())
                .connect(tank.vapour(), steam.inlet())
                .connect(tank.liquid(), drain.inlet());
        final var s = b.build()
                .specify()
                .given(hot.flow(), kilogramsPerSecond(3))
                .given(hot.pressure(), bar(10))
                .given(hot.outlet().vapourFraction(), percent(0))
                .given(tank.inlet().pressure(), bar(2))
                .solve();
        final var high = water.saturation(bar(10)).liquid().enthalpy().inJoulesPerKilogram();
        final var low = water.saturation(bar(2)).liquid().enthalpy().inJoulesPerKilogram();
        final var vapour = water.saturation(bar(2)).vapour().enthalpy().inJoulesPerKilogram();
        final double x = (high - low) / (vapour - low);
        assertEquals(3 * x, s.value(steam.flow()).inKilogramsPerSecond(), 1e-9);
        assertEquals(3 * (1 - x), s.value(drain.flow()).inKilogramsPerSecond(), 1e-9);
        assertEquals(vapour, s.value(steam.inlet().enthalpy()).inJoulesPerKilogram(), 1e-6);
    }

    @Test
    void aSuperheatedInletIsRefused() {
        final var b = Plant.builder("dry separator");
        final var in = b.add(new Supply("in", Water.industrial()));
        final var separator = b.add(new Separator("separator"));
        b.connect(in.outlet(), separator.inlet())
                .connect(separator.vapour(), b.add(new Discharge("vapour")).inlet())
                .connect(separator.liquid(), b.add(new Discharge("liquid")).inlet());
        final var given = b.build()
                .specify()
                .given(in.flow(), kilogramsPerSecond(1))
                .given(in.pressure(), bar(5))
                .given(in.temperature(), celsius(200));
        final var refused = assertThrows(PlantSolveException.class, given::solve);
        assertTrue(refused.getMessage().contains("separator"), refused.getMessage());
    }

    /** By hand: a duty Q makes Q / (h″ − h_feed) of steam; with ratio n the riser has the vapour fraction near 1/n. */
    @Test
    void drumWithCirculation() {
        final var water = Water.industrial();
        final var b = Plant.builder("drum boiler");
        final var feed = b.add(new Supply("feedwater", water));
        final var drum = b.add(new SteamDrum("drum"));
        final var evaporator = b.add(new Heater("evaporator"));
        final var steam = b.add(new Discharge("steam"));
        b.connect(feed.outlet(), drum.feed())
                .connect(drum.downcomer(), evaporator.inlet())
                .connect(evaporator.outlet(), drum.riser())
                .connect(drum.steam(), steam.inlet());
        final var s = b.build()
                .specify()
                .given(steam.pressure(), bar(40))
                .given(feed.outlet().subcooling(), TemperatureSpan.kelvins(20))
                .given(evaporator.duty(), Power.megawatts(10))
                .given(drum.circulationRatio(), Ratio.fraction(8))
                .solve();
        final var vapour = water.saturation(bar(40)).vapour().enthalpy().inJoulesPerKilogram();
        final var liquid = water.saturation(bar(40)).liquid().enthalpy().inJoulesPerKilogram();
        final double flow = 10e6 / (vapour - s.value(feed.outlet().enthalpy()).inJoulesPerKilogram());
        assertEquals(flow, s.value(steam.flow()).inKilogramsPerSecond(), 1e-9);
        assertEquals(
                10e6 / (8 * flow) / (vapour - liquid),
                s.value(drum.riser().vapourFraction()).si(),
                1e-9);
        assertEquals(0, s.closure().energy(), 1e-12);
        assertEquals(40, s.value(feed.pressure()).inBar(), 1e-9);
    }
}
