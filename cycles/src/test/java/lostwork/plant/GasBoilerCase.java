package lostwork.plant;

import java.util.SplittableRandom;
import lostwork.component.Condenser;
import lostwork.component.Discharge;
import lostwork.component.HeatExchanger;
import lostwork.component.Pump;
import lostwork.component.Supply;
import lostwork.component.Turbine;
import lostwork.fluid.Fluid;
import lostwork.fluid.gas.DryAir;
import lostwork.fluid.water.Water;
import lostwork.quantity.MassFlow;
import lostwork.quantity.Pressure;
import lostwork.quantity.Ratio;
import lostwork.quantity.Temperature;
import lostwork.quantity.TemperatureSpan;

/** A steam set on hot gas, drawn at random but feasible: the pinch of its boiler is given, the steam flow comes out. */
final class GasBoilerCase {
    private static final Fluid GAS = DryAir.standard();
    private static final Fluid WATER = Water.industrial();

    private GasBoilerCase() {}

    static Specification draw(SplittableRandom random) {
        final Plant.Builder b = Plant.builder("steam set on hot gas");
        final Supply gas = b.add(new Supply("gas", GAS));
        final HeatExchanger boiler = b.add(new HeatExchanger("boiler"));
        final Discharge stack = b.add(new Discharge("stack"));
        final Turbine turbine = b.add(new Turbine("turbine"));
        final Condenser condenser = b.add(new Condenser("condenser"));
        final Pump pump = b.add(new Pump("pump"));
        b.connect(gas.outlet(), boiler.hotInlet()).connect(boiler.hotOutlet(), stack.inlet());
        b.circuit(WATER, boiler.coldSide(), turbine, condenser, pump);
        final double hot = between(random, 620, 870);
        final double boiling = between(random, 430, Math.min(540, hot - 120));
        final double live = Math.min(hot - between(random, 25, 80), 820);
        return b.build()
                .specify()
                .given(gas.flow(), MassFlow.kilogramsPerSecond(between(random, 5, 100)))
                .given(gas.temperature(), Temperature.kelvin(hot))
                .given(gas.pressure(), Pressure.mbar(between(random, 1000, 1100)))
                .given(
                        turbine.inlet().pressure(),
                        Pressure.pascal(WATER.model().saturation().pressure(boiling)))
                .given(turbine.inlet().temperature(), Temperature.kelvin(live))
                .given(turbine.isentropicEfficiency(), Ratio.fraction(between(random, 0.65, 0.9)))
                .given(boiler.pinch(), TemperatureSpan.kelvins(between(random, 6, 20)))
                .given(condenser.pressure(), Pressure.bar(between(random, 0.05, 0.5)))
                .given(condenser.outlet().subcooling(), TemperatureSpan.kelvins(between(random, 1, 5)))
                .given(pump.isentropicEfficiency(), Ratio.fraction(between(random, 0.5, 0.8)));
    }

    private static double between(SplittableRandom random, double low, double high) {
        return low + (high - low) * random.nextDouble();
    }
}
