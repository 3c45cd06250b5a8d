package lostwork.component;

import lostwork.fluid.Fluid;
import lostwork.plant.Plant;

/** A plant of one exchanger between two supplies and two discharges, for tests. */
final class TwoStreams {
    final Supply hot;
    final Supply cold;
    final HeatExchanger exchanger;
    final Discharge hotEnd = new Discharge("hot end");
    final Discharge coldEnd = new Discharge("cold end");
    final Plant plant;

    TwoStreams(Fluid hotFluid, Fluid coldFluid, FlowArrangement arrangement) {
        hot = new Supply("hot supply", hotFluid);
        cold = new Supply("cold supply", coldFluid);
        exchanger = new HeatExchanger("exchanger", arrangement);
        final var b = Plant.builder("two streams");
        b.add(hot);
        b.add(cold);
        b.add(exchanger);
        b.add(hotEnd);
        b.add(coldEnd);
        b.connect(hot.outlet(), exchanger.hotInlet());
        b.connect(exchanger.hotOutlet(), hotEnd.inlet());
        b.connect(cold.outlet(), exchanger.coldInlet());
        b.connect(exchanger.coldOutlet(), coldEnd.inlet());
        plant = b.build();
    }
}
