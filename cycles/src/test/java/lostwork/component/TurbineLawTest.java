package lostwork.component;

import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.Temperature.celsius;

import java.util.SplittableRandom;
import lostwork.fluid.Fluid;
import lostwork.fluid.water.Water;
import lostwork.quantity.Ratio;

/** The contract of components, for turbine. */
class TurbineLawTest extends ComponentContract {
    @Override
    Case draw(SplittableRandom random) {
        final var turbine = new Turbine("turbine");
        final Fluid fluid = Line.anyGas(random);
        return new Case(
                turbine,
                Line.of(turbine, fluid, bar(between(random, 10, 40)), random)
                        .given(turbine.inlet().temperature(), celsius(between(random, 320, 600)))
                        .given(
                                turbine.pressureRatio(),
                                Ratio.fraction(between(random, 1.1, fluid == Water.industrial() ? 300 : 12)))
                        .given(turbine.isentropicEfficiency(), Ratio.percent(between(random, 55, 100))));
    }

    /** Without steam that becomes wet: there the polytropic path has a kink. */
    @Override
    Case drawSmooth(SplittableRandom random) {
        final var turbine = new Turbine("turbine");
        return new Case(
                turbine,
                Line.of(turbine, Line.anyGas(random), bar(between(random, 10, 40)), random)
                        .given(turbine.inlet().temperature(), celsius(between(random, 450, 600)))
                        .given(turbine.pressureRatio(), Ratio.fraction(between(random, 1.1, 8)))
                        .given(turbine.isentropicEfficiency(), Ratio.percent(between(random, 55, 95))));
    }
}
