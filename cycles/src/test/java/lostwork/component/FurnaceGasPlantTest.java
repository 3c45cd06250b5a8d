package lostwork.component;

import static lostwork.fluid.gas.CombustionAir.excessAir;
import static lostwork.fluid.gas.MoleFraction.ethane;
import static lostwork.fluid.gas.MoleFraction.methane;
import static lostwork.fluid.gas.MoleFraction.nitrogen;
import static lostwork.quantity.MassFlow.tonnesPerHour;
import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.Pressure.mbar;
import static lostwork.quantity.Ratio.percent;
import static lostwork.quantity.Temperature.celsius;
import static lostwork.quantity.TemperatureSpan.kelvins;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import lostwork.fluid.gas.FlueGas;
import lostwork.fluid.gas.Fuel;
import lostwork.fluid.water.Water;
import lostwork.plant.Plant;
import lostwork.plant.Solution;
import lostwork.plant.Specification;
import lostwork.plant.SpecificationException;
import org.junit.jupiter.api.Test;

/** A steam set behind a furnace as a user writes it: designed, tested, asked. */
class FurnaceGasPlantTest {
    private final FlueGas gas =
            FlueGas.of(Fuel.naturalGas(methane(0.93), ethane(0.04), nitrogen(0.03)), excessAir(percent(18)));
    private final Supply gasIn = new Supply("furnace gas", gas);
    private final HeatExchanger boiler = new HeatExchanger("boiler");
    private final Turbine turbine = new Turbine("turbine");
    private final Condenser cond = new Condenser("condenser");
    private final Pump pump = new Pump("feed pump");
    private final Generator gen = new Generator("generator");
    private final Discharge stack = new Discharge("stack");

    private Plant plant() {
        final var b = Plant.builder("furnace-gas steam set");
        b.add(gasIn);
        b.add(boiler);
        b.add(turbine);
        b.add(cond);
        b.add(pump);
        b.add(gen);
        b.add(stack);
        b.connect(gasIn.outlet(), boiler.hotInlet());
        b.connect(boiler.hotOutlet(), stack.inlet());
        b.circuit(Water.industrial(), boiler.coldSide(), turbine, cond, pump);
        b.connect(turbine.shaft(), gen.shaft());
        return b.build();
    }

    private Specification design(Plant plant) {
        return plant.specify()
                .given(gasIn.flow(), tonnesPerHour(86))
                .given(gasIn.temperature(), celsius(412))
                .given(gasIn.pressure(), mbar(1011))
                .given(turbine.inlet().pressure(), bar(24))
                .given(turbine.isentropicEfficiency(), percent(78))
                .given(boiler.pinch(), kelvins(12))
                .given(boiler.hotOutlet().temperature(), celsius(180))
                .given(cond.outlet().subcooling(), kelvins(3))
                .given(cond.pressure(), bar(0.10))
                .given(pump.isentropicEfficiency(), percent(65));
    }

    @Test
    void designAndTest() {
        final Specification design = design(plant());
        final Solution s = design.solve();
        assertEquals(0, s.closure().energy(), 1e-9);
        assertEquals(s.value(turbine.power()).inWatts(), s.value(gen.power()).inWatts(), 1e-6);
        // A higher condenser pressure costs power.
        assertTrue(s.sensitivity(gen.power(), cond.pressure()).si() < 0);

        final Specification test = design.release(turbine.isentropicEfficiency())
                .given(turbine.outlet().enthalpy(), s.value(turbine.outlet().enthalpy()));
        assertEquals(78, test.solve().value(turbine.isentropicEfficiency()).inPercent(), 1e-6);
    }

    @Test
    void aForgottenValueIsNamedBeforeSolving() {
        final Specification short1 = design(plant()).release(boiler.pinch());
        final var missing = assertThrows(SpecificationException.class, short1::solve);
        assertTrue(missing.getMessage().contains("boiler pinch"), missing.getMessage());
    }
}
