package lostwork.component;

import static lostwork.quantity.MassFlow.kilogramsPerSecond;
import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.Temperature.celsius;

import java.util.SplittableRandom;
import lostwork.fluid.Fluid;
import lostwork.plant.Plant;
import lostwork.plant.Specification;

/** The contract of components, for mixer. */
class MixerLawTest extends ComponentContract {
    @Override
    Case draw(SplittableRandom random) {
        final int streams = 2 + random.nextInt(3);
        final Fluid fluid = Line.anyGas(random);
        final var b = Plant.builder("header");
        final var mixer = b.add(new Mixer("mixer", streams));
        final var out = b.add(new Discharge("out"));
        b.connect(mixer.outlet(), out.inlet());
        final var supplies = new Supply[streams];
        for (int i = 0; i < streams; i++) {
            supplies[i] = b.add(new Supply("supply " + i, fluid));
            b.connect(supplies[i].outlet(), mixer.inlet(i + 1));
        }
        Specification given = b.build().specify().given(out.pressure(), bar(between(random, 1, 20)));
        for (Supply supply : supplies) {
            given = given.given(supply.flow(), kilogramsPerSecond(between(random, 0.1, 20)))
                    .given(supply.temperature(), celsius(between(random, 230, 600)));
        }
        return new Case(mixer, given);
    }

    @Override
    void exchanges(int count) {
        // A mixer has no variables of its own.
    }
}
