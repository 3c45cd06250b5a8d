package lostwork.examples.link;

import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.Temperature.celsius;

import lostwork.exergy.ReferenceEnvironment;
import lostwork.fluid.water.Water;

/** An embedding program that runs on a linked image of core and fluids: it reads resources and uses both modules. */
public final class LinkedProgram {
    private LinkedProgram() {}

    /**
     * Prints the flow exergy of steam, and that of its unit converted by javax.measure.
     *
     * @param arguments none are read
     */
    public static void main(String[] arguments) {
        final var site = ReferenceEnvironment.of(celsius(12), bar(1.013));
        System.out.println(answer(site));
    }

    static String answer(ReferenceEnvironment site) {
        final var exergy = site.flowExergy(Water.industrial().state(bar(60), celsius(480)));
        return exergy + " = " + exergy.asQuantity();
    }
}
