package lostwork.component;

import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.Temperature.celsius;

import java.util.SplittableRandom;
import lostwork.fluid.water.Water;
import lostwork.quantity.Ratio;
import lostwork.quantity.TemperatureSpan;

/** The contract of components, for heater. */
class HeaterLawTest extends ComponentContract {
    @Override
    Case draw(SplittableRandom random) {
        final var heater = new Heater("heater");
        return new Case(
                heater,
                Line.of(heater, Water.industrial(), bar(between(random, 2, 60)), random)
                        .given(heater.inlet().temperature(), celsius(between(random, 20, 110)))
                        .given(heater.outlet().superheat(), TemperatureSpan.kelvins(between(random, 5, 200)))
                        .given(heater.relativePressureLoss(), Ratio.percent(between(random, 0, 10)))
                        .given(heater.heat().temperature(), celsius(between(random, 600, 900))));
    }
}
