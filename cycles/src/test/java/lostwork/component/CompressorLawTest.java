package lostwork.component;

import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.Temperature.celsius;

import java.util.SplittableRandom;
import lostwork.fluid.Fluid;
import lostwork.fluid.water.Water;
import lostwork.quantity.Ratio;

/** The contract of components, for compressor. */
class CompressorLawTest extends ComponentContract {
    @Override
    Case draw(SplittableRandom random) {
        final var compressor = new Compressor("compressor");
        final Fluid fluid = Line.anyGas(random);
        final boolean steam = fluid == Water.industrial();
        return new Case(
                compressor,
                Line.of(compressor, fluid, bar(between(random, 0.8, 3)), random)
                        .given(
                                compressor.inlet().temperature(),
                                celsius(steam ? between(random, 150, 250) : between(random, -20, 60)))
                        .given(compressor.pressureRatio(), Ratio.fraction(between(random, 1.1, 20)))
                        .given(compressor.isentropicEfficiency(), Ratio.percent(between(random, 55, 100))));
    }
}
