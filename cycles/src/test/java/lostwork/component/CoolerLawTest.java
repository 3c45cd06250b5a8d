package lostwork.component;

import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.Temperature.celsius;

import java.util.SplittableRandom;
import lostwork.quantity.PressureDifference;

/** The contract of components, for cooler. */
class CoolerLawTest extends ComponentContract {
    @Override
    Case draw(SplittableRandom random) {
        final var cooler = new Cooler("cooler");
        return new Case(
                cooler,
                Line.of(cooler, Line.anyGas(random), bar(between(random, 2, 40)), random)
                        .given(cooler.inlet().temperature(), celsius(between(random, 350, 550)))
                        .given(cooler.outlet().temperature(), celsius(between(random, 270, 330)))
                        .given(cooler.pressureLoss(), PressureDifference.bars(between(random, 0.01, 0.3)))
                        .given(cooler.heat().temperature(), celsius(between(random, 5, 250))));
    }
}
