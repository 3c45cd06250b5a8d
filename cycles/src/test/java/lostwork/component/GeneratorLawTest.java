package lostwork.component;

import java.util.SplittableRandom;
import lostwork.plant.Plant;
import lostwork.quantity.Power;

/** The contract of components, for generator. */
class GeneratorLawTest extends ComponentContract {
    @Override
    Case draw(SplittableRandom random) {
        final var generator = new Generator("generator");
        final var b = Plant.builder("generator set");
        b.add(generator);
        final double shaft = between(random, 0.01, 200);
        return new Case(
                generator,
                b.build()
                        .specify()
                        .given(generator.shaft().power(), Power.megawatts(shaft))
                        .given(generator.power(), Power.megawatts(shaft * between(random, 0.8, 0.99))));
    }
}
