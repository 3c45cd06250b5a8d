package lostwork.component;

import static lostwork.quantity.MassFlow.kilogramsPerSecond;
import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.Temperature.celsius;

import java.util.SplittableRandom;
import lostwork.fluid.gas.DryAir;
import lostwork.quantity.PressureDifference;

/**
 * The contract of components, for an exchanger between two gases. The outlet temperature is given: with the effectiveness
 * given instead, a mean difference belongs to two flows, one with either stream as the smaller.
 */
class RecuperatorLawTest extends ComponentContract {
    @Override
    Case draw(SplittableRandom random) {
        final var arrangement = FlowArrangement.values()[random.nextInt(2)];
        final var p = new TwoStreams(DryAir.standard(), DryAir.standard(), arrangement);
        return new Case(
                p.exchanger,
                p.plant
                        .specify()
                        .given(p.hot.flow(), kilogramsPerSecond(between(random, 2, 4)))
                        .given(p.cold.flow(), kilogramsPerSecond(between(random, 9, 15)))
                        .given(p.hot.temperature(), celsius(between(random, 400, 600)))
                        .given(p.cold.temperature(), celsius(between(random, 20, 200)))
                        .given(p.hot.pressure(), bar(between(random, 1, 2)))
                        .given(p.cold.pressure(), bar(between(random, 4, 12)))
                        .given(p.exchanger.hotPressureLoss(), PressureDifference.bars(between(random, 0.01, 0.1)))
                        .given(p.exchanger.coldPressureLoss(), PressureDifference.bars(between(random, 0.01, 0.3)))
                        .given(p.hotEnd.temperature(), celsius(between(random, 300, 340))));
    }
}
