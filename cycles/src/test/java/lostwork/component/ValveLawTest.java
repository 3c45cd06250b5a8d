package lostwork.component;

import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.Temperature.celsius;

import java.util.SplittableRandom;
import lostwork.quantity.Ratio;

/** The contract of components, for valve. */
class ValveLawTest extends ComponentContract {
    @Override
    Case draw(SplittableRandom random) {
        final var valve = new Valve("valve");
        return new Case(
                valve,
                Line.of(valve, Line.anyGas(random), bar(between(random, 10, 40)), random)
                        .given(valve.inlet().temperature(), celsius(between(random, 260, 600)))
                        .given(valve.pressureRatio(), Ratio.fraction(between(random, 1.01, 30))));
    }
}
