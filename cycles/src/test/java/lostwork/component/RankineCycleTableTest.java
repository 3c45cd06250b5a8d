package lostwork.component;

import static lostwork.quantity.Pressure.megapascal;
import static lostwork.quantity.Ratio.percent;
import static lostwork.quantity.Temperature.celsius;
import static org.junit.jupiter.api.Assertions.assertEquals;

import lostwork.fluid.water.Water;
import lostwork.plant.Plant;
import lostwork.plant.Solution;
import lostwork.quantity.MassFlow;
import org.junit.jupiter.api.Test;

/**
 * Simple ideal Rankine cycle, 3 MPa, 350 °C, 75 kPa.
 *
 * <p>Source: Çengel, Boles, Thermodynamics: An Engineering Approach, chapter 10, example 10-1; figures from memory.
 * Tolerances: the example computes the pump work from v Δp with three-digit table values, so half a unit of the printed
 * digit is widened to the effect of that: 0.02 kJ/kg in the pump work, 1 kJ/kg in the enthalpy of the wet steam.
 */
class RankineCycleTableTest {
    @Test
    void cengelExample10Point1() {
        final var b = Plant.builder("ideal Rankine cycle");
        final var boiler = b.add(new Heater("boiler"));
        final var turbine = b.add(new Turbine("turbine"));
        final var condenser = b.add(new Cooler("condenser"));
        final var pump = b.add(new Pump("pump"));
        b.circuit(Water.industrial(), boiler, turbine, condenser, pump);
        final Plant plant = b.build();
        final Solution s = plant.specify()
                .given(turbine.inlet().pressure(), megapascal(3))
                .given(turbine.inlet().temperature(), celsius(350))
                .given(condenser.outlet().pressure(), megapascal(0.075))
                .given(condenser.outlet().vapourFraction(), percent(0))
                .given(turbine.isentropicEfficiency(), percent(100))
                .given(pump.isentropicEfficiency(), percent(100))
                .given(boiler.inlet().flow(), MassFlow.kilogramsPerSecond(1))
                .solve();
        final double net = s.value(turbine.power()).minus(s.value(pump.power())).inKilowatts();
        assertEquals(26.0, 100 * net / s.value(boiler.duty()).inKilowatts(), 0.05);
        assertEquals(3.03, s.value(pump.power()).inKilowatts(), 0.02);
        assertEquals(0.886, s.value(turbine.outlet().vapourFraction()).si(), 0.0005);
        assertEquals(2403.0, s.value(turbine.outlet().enthalpy()).inKilojoulesPerKilogram(), 1.0);
        assertEquals(0, s.closure().energy(), 1e-9);
    }
}
