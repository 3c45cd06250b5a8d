package lostwork.component;

import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.Temperature.celsius;
import static lostwork.quantity.TemperatureSpan.kelvins;

import java.util.SplittableRandom;
import lostwork.fluid.water.Water;

/** The contract of components, for condenser. */
class CondenserLawTest extends ComponentContract {
    @Override
    Case draw(SplittableRandom random) {
        final var condenser = new Condenser("condenser");
        return new Case(
                condenser,
                Line.of(condenser, Water.industrial(), bar(between(random, 0.05, 3)), random)
                        .given(condenser.inlet().superheat(), kelvins(between(random, 5, 60)))
                        .given(condenser.outlet().subcooling(), kelvins(between(random, 1, 8)))
                        .given(condenser.heat().temperature(), celsius(between(random, 2, 20))));
    }
}
