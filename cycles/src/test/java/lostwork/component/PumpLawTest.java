package lostwork.component;

import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.Temperature.celsius;

import java.util.SplittableRandom;
import lostwork.fluid.water.Water;
import lostwork.quantity.PressureDifference;
import lostwork.quantity.Ratio;

/** The contract of components, for pump. */
class PumpLawTest extends ComponentContract {
    @Override
    Case draw(SplittableRandom random) {
        final var pump = new Pump("pump");
        return new Case(
                pump,
                Line.of(pump, Water.industrial(), bar(between(random, 0.2, 5)), random)
                        .given(pump.inlet().temperature(), celsius(between(random, 15, 55)))
                        .given(pump.pressureRise(), PressureDifference.bars(between(random, 1, 200)))
                        .given(pump.isentropicEfficiency(), Ratio.percent(between(random, 40, 100))));
    }
}
