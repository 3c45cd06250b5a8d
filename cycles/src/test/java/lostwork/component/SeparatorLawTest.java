package lostwork.component;

import static lostwork.quantity.MassFlow.kilogramsPerSecond;
import static lostwork.quantity.Pressure.bar;

import java.util.SplittableRandom;
import lostwork.fluid.water.Water;
import lostwork.plant.Plant;
import lostwork.quantity.Ratio;

/** The contract of components, for separator. */
class SeparatorLawTest extends ComponentContract {
    @Override
    Case draw(SplittableRandom random) {
        final var b = Plant.builder("flash");
        final var in = b.add(new Supply("in", Water.industrial()));
        final var separator = b.add(new Separator("separator"));
        b.connect(in.outlet(), separator.inlet())
                .connect(separator.vapour(), b.add(new Discharge("vapour")).inlet())
                .connect(separator.liquid(), b.add(new Discharge("liquid")).inlet());
        return new Case(
                separator,
                b.build()
                        .specify()
                        .given(in.flow(), kilogramsPerSecond(between(random, 0.1, 20)))
                        .given(in.pressure(), bar(between(random, 0.1, 150)))
                        .given(in.outlet().vapourFraction(), Ratio.percent(between(random, 5, 95))));
    }

    @Override
    void exchanges(int count) {
        // A separator has no variables of its own.
    }
}
