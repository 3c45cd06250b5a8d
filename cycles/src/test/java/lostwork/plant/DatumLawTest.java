package lostwork.plant;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import lostwork.component.Cooler;
import lostwork.component.Heater;
import lostwork.component.Pump;
import lostwork.component.Turbine;
import lostwork.fluid.Fluid;
import lostwork.fluid.FluidModel;
import lostwork.fluid.FluidRange;
import lostwork.fluid.PhaseSide;
import lostwork.fluid.Provenance;
import lostwork.fluid.SaturationModel;
import lostwork.fluid.StatePoint;
import lostwork.fluid.water.Water;
import lostwork.quantity.MassFlow;
import lostwork.quantity.Pressure;
import lostwork.quantity.Ratio;
import lostwork.quantity.Temperature;
import org.jspecify.annotations.Nullable;
import org.junit.jupiter.api.Test;

/** Where enthalpy and entropy of a fluid are set to zero has no influence on what a plant does; nor has its size. */
class DatumLawTest {
    /** Water with another zero of enthalpy and entropy. */
    private static final class Shifted implements FluidModel {
        private final FluidModel water = Water.industrial().model();
        private final double enthalpy;
        private final double entropy;

        Shifted(double enthalpy, double entropy) {
            this.enthalpy = enthalpy;
            this.entropy = entropy;
        }

        @Override
        public String name() {
            return "shifted water";
        }

        @Override
        public double molarMass() {
            return water.molarMass();
        }

        @Override
        public FluidRange range() {
            return water.range();
        }

        @Override
        public Provenance provenance() {
            return water.provenance();
        }

        @Override
        public @Nullable SaturationModel saturation() {
            return water.saturation();
        }

        @Override
        public double lowestTemperatureAt(double pressure) {
            return water.lowestTemperatureAt(pressure);
        }

        @Override
        public double highestTemperatureAt(double pressure) {
            return water.highestTemperatureAt(pressure);
        }

        @Override
        public void evaluate(double temperature, double pressure, PhaseSide side, StatePoint out) {
            water.evaluate(temperature, pressure, side, out);
            shift(out);
        }

        @Override
        public void atTemperaturePressure(double temperature, double pressure, StatePoint out) {
            water.atTemperaturePressure(temperature, pressure, out);
            shift(out);
        }

        @Override
        public void atPressureEnthalpy(double pressure, double h, StatePoint out) {
            water.atPressureEnthalpy(pressure, h - enthalpy, out);
            shift(out);
        }

        @Override
        public void atPressureEntropy(double pressure, double s, StatePoint out) {
            water.atPressureEntropy(pressure, s - entropy, out);
            shift(out);
        }

        private void shift(StatePoint out) {
            out.enthalpy += enthalpy;
            out.entropy += entropy;
        }
    }

    private record Results(double work, double heat, double efficiency, double outlet) {}

    private static Results solve(Fluid fluid, double flow) {
        final Plant.Builder b = Plant.builder("steam set");
        final Heater boiler = b.add(new Heater("boiler"));
        final Turbine turbine = b.add(new Turbine("turbine"));
        final Cooler condenser = b.add(new Cooler("condenser"));
        final Pump pump = b.add(new Pump("pump"));
        // The outlet temperature given and the efficiency free: a loop through the state functions.
        final Solution s = b.circuit(fluid, boiler, turbine, condenser, pump)
                .build()
                .specify()
                .given(turbine.inlet().pressure(), Pressure.bar(40))
                .given(turbine.inlet().temperature(), Temperature.celsius(450))
                .given(turbine.outlet().temperature(), Temperature.celsius(150))
                .given(turbine.outlet().pressure(), Pressure.bar(1))
                .given(condenser.outlet().vapourFraction(), Ratio.percent(0))
                .given(pump.isentropicEfficiency(), Ratio.percent(70))
                .given(boiler.inlet().flow(), MassFlow.kilogramsPerSecond(flow))
                .solve();
        return new Results(
                s.value(turbine.power()).si() / flow,
                s.value(boiler.duty()).si() / flow,
                s.value(turbine.isentropicEfficiency()).si(),
                s.value(pump.outlet().temperature()).si());
    }

    @Test
    void theZeroOfEnthalpyPlaysNoPart() {
        final Results plain = solve(Water.industrial(), 3);
        for (double shift : List.of(-15.9e6, -1e6, 1e6, 15.9e6)) {
            assertAlike(plain, solve(Fluid.of(new Shifted(shift, shift / 1000)), 3));
        }
    }

    @Test
    void theSizeOfThePlantPlaysNoPart() {
        final Results plain = solve(Water.industrial(), 1);
        for (double flow : List.of(1e-6, 1e-3, 1e3, 1e5)) {
            assertAlike(plain, solve(Water.industrial(), flow));
        }
    }

    private static void assertAlike(Results expected, Results actual) {
        assertEquals(expected.work(), actual.work(), 1e-9 * expected.work());
        assertEquals(expected.heat(), actual.heat(), 1e-9 * expected.heat());
        assertEquals(expected.efficiency(), actual.efficiency(), 1e-9);
        assertEquals(expected.outlet(), actual.outlet(), 1e-9 * expected.outlet());
    }
}
