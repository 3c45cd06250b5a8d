package lostwork.component;

import static lostwork.quantity.MassFlow.kilogramsPerSecond;

import java.util.SplittableRandom;
import lostwork.fluid.Fluid;
import lostwork.fluid.gas.DryAir;
import lostwork.fluid.water.Water;
import lostwork.plant.Component;
import lostwork.plant.FlowPath;
import lostwork.plant.Plant;
import lostwork.plant.Specification;
import lostwork.quantity.Pressure;

/** A supply, one component, a discharge. */
final class Line {
    private Line() {}

    /** {@return a line whose supply has a random flow and a pressure; its state is still to be given} */
    static <C extends Component & FlowPath> Specification of(
            C component, Fluid fluid, Pressure pressure, SplittableRandom random) {
        final var b = Plant.builder("line");
        final var supply = b.add(new Supply("supply", fluid));
        final var discharge = b.add(new Discharge("discharge"));
        b.add(component);
        b.connect(supply.outlet(), component.inlet()).connect(component.outlet(), discharge.inlet());
        return b.build()
                .specify()
                .given(supply.flow(), kilogramsPerSecond(ComponentContract.between(random, 0.1, 50)))
                .given(supply.pressure(), pressure);
    }

    /** {@return a gas by lot: one of constant heat capacity, dry air, or steam} */
    static Fluid anyGas(SplittableRandom random) {
        return switch (random.nextInt(3)) {
            case 0 -> TestGas.COLD_AIR;
            case 1 -> DryAir.standard();
            default -> Water.industrial();
        };
    }
}
