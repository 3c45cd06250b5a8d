package lostwork.component;

import static lostwork.quantity.MassFlow.kilogramsPerSecond;
import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.Temperature.celsius;

import java.util.SplittableRandom;
import lostwork.plant.Plant;
import lostwork.plant.Specification;

/** The contract of components, for splitter. */
class SplitterLawTest extends ComponentContract {
    @Override
    Case draw(SplittableRandom random) {
        final int streams = 2 + random.nextInt(3);
        final var b = Plant.builder("tee");
        final var in = b.add(new Supply("in", Line.anyGas(random)));
        final var splitter = b.add(new Splitter("splitter", streams));
        b.connect(in.outlet(), splitter.inlet());
        for (int i = 1; i <= streams; i++) {
            b.connect(splitter.outlet(i), b.add(new Discharge("out " + i)).inlet());
        }
        Specification given = b.build()
                .specify()
                .given(in.pressure(), bar(between(random, 1, 20)))
                .given(in.temperature(), celsius(between(random, 230, 600)))
                .given(in.flow(), kilogramsPerSecond(between(random, 5, 20)));
        for (int i = 2; i <= streams; i++) {
            given = given.given(splitter.outlet(i).flow(), kilogramsPerSecond(between(random, 0.1, 1.5)));
        }
        return new Case(splitter, given);
    }
}
