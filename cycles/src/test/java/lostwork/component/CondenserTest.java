package lostwork.component;

import static lostwork.quantity.MassFlow.tonnesPerHour;
import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.Pressure.mbar;
import static lostwork.quantity.Ratio.percent;
import static lostwork.quantity.Temperature.celsius;
import static lostwork.quantity.TemperatureSpan.kelvins;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import lostwork.fluid.gas.DryAir;
import lostwork.fluid.water.Water;
import lostwork.plant.Plant;
import lostwork.plant.PlantSolveException;
import lostwork.plant.Solution;
import lostwork.plant.Specification;
import org.junit.jupiter.api.Test;

/** A condenser and a boiler in a steam circuit on hot gas. */
class CondenserTest {
    private final Supply gas = new Supply("furnace gas", DryAir.standard());
    private final HeatExchanger boiler = new HeatExchanger("boiler");
    private final Turbine turbine = new Turbine("turbine");
    private final Condenser condenser = new Condenser("condenser");
    private final Pump pump = new Pump("feed pump");
    private final Discharge stack = new Discharge("stack");
    private final Plant plant;

    CondenserTest() {
        final var b = Plant.builder("furnace-gas steam set");
        b.add(gas);
        b.add(boiler);
        b.add(turbine);
        b.add(condenser);
        b.add(pump);
        b.add(stack);
        b.connect(gas.outlet(), boiler.hotInlet());
        b.connect(boiler.hotOutlet(), stack.inlet());
        b.circuit(Water.industrial(), boiler.coldSide(), turbine, condenser, pump);
        plant = b.build();
    }

    private Specification machines() {
        return plant.specify()
                .given(gas.flow(), tonnesPerHour(86))
                .given(gas.temperature(), celsius(412))
                .given(gas.pressure(), mbar(1011))
                .given(turbine.inlet().pressure(), bar(24))
                .given(turbine.isentropicEfficiency(), percent(78))
                .given(condenser.outlet().subcooling(), kelvins(3))
                .given(pump.isentropicEfficiency(), percent(65))
                .given(boiler.pinch(), kelvins(12));
    }

    @Test
    void pressureFollowsFromTheCoolant() {
        final Solution byPressure = machines()
                .given(boiler.hotOutlet().temperature(), celsius(170))
                .given(condenser.pressure(), bar(0.10))
                .solve();
        assertEquals(12, byPressure.value(boiler.pinch()).inKelvins(), 1e-8);
        assertEquals(0, byPressure.closure().energy(), 1e-9);
        final double boiling =
                Water.industrial().saturation(bar(0.10)).temperature().inCelsius();
        final Solution byCoolant = machines()
                .given(boiler.hotOutlet().temperature(), celsius(170))
                .given(condenser.heat().temperature(), celsius(boiling - 20))
                .given(condenser.temperatureDifference(), kelvins(20))
                .solve();
        assertEquals(0.10, byCoolant.value(condenser.pressure()).inBar(), 1e-9);
        assertEquals(
                byPressure.value(turbine.power()).inKilowatts(),
                byCoolant.value(turbine.power()).inKilowatts(),
                1e-6);
    }

    @Test
    void stackTemperatureAndSuperheatChangePlaces() {
        final Solution first = machines()
                .given(boiler.hotOutlet().temperature(), celsius(170))
                .given(condenser.pressure(), bar(0.10))
                .solve();
        final Solution second = machines()
                .given(turbine.inlet().superheat(), first.value(turbine.inlet().superheat()))
                .given(condenser.pressure(), bar(0.10))
                .solve();
        assertEquals(170, second.value(boiler.hotOutlet().temperature()).inCelsius(), 1e-6);
        final Solution third = machines()
                .release(boiler.pinch())
                .given(boiler.conductance(), first.value(boiler.conductance()))
                .given(boiler.hotOutlet().temperature(), celsius(170))
                .given(condenser.pressure(), bar(0.10))
                .solve();
        assertEquals(12, third.value(boiler.pinch()).inKelvins(), 1e-6);
    }

    @Test
    void aCoolantWarmerThanTheCondensateIsRefused() {
        final Specification s = machines()
                .given(boiler.hotOutlet().temperature(), celsius(170))
                .given(condenser.pressure(), bar(0.10))
                .given(condenser.heat().temperature(), celsius(60));
        final var e = assertThrows(PlantSolveException.class, s::solve);
        assertTrue(e.getMessage().contains("condenser would destroy entropy"), e.getMessage());
    }
}
