package lostwork.component;

import java.util.SplittableRandom;
import lostwork.plant.Plant;
import lostwork.quantity.Power;

/** The contract of components, for shaft. */
class ShaftLawTest extends ComponentContract {
    @Override
    Case draw(SplittableRandom random) {
        final var shaft = new Shaft("shaft").withDriving(2).withDriven(2);
        final var b = Plant.builder("train");
        b.add(shaft);
        return new Case(
                shaft,
                b.build()
                        .specify()
                        .given(shaft.driving(1).power(), Power.megawatts(between(random, 1, 20)))
                        .given(shaft.driving(2).power(), Power.megawatts(between(random, 1, 20)))
                        .given(shaft.driven(1).power(), Power.megawatts(between(random, 0.1, 1.5)))
                        .given(shaft.driven(2).power(), Power.megawatts(between(random, 0.1, 0.3))));
    }
}
