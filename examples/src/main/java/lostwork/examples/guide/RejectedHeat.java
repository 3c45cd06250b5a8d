package lostwork.examples.guide;

import static lostwork.fluid.gas.CombustionAir.excessAir;
import static lostwork.fluid.gas.MoleFraction.ethane;
import static lostwork.fluid.gas.MoleFraction.methane;
import static lostwork.fluid.gas.MoleFraction.nitrogen;
import static lostwork.quantity.MassFlow.tonnesPerHour;
import static lostwork.quantity.Pressure.mbar;
import static lostwork.quantity.Ratio.percent;
import static lostwork.quantity.Temperature.celsius;
import static lostwork.quantity.Units.MEGAWATT;
import static lostwork.quantity.Units.PERCENT;

import lostwork.exergy.ReferenceEnvironment;
import lostwork.fluid.gas.FlueGas;
import lostwork.fluid.gas.Fuel;
import lostwork.quantity.Power;
import lostwork.quantity.Ratio;

/** How much of the heat in a stack could be work: the ten lines of the README. Figures invented. */
public final class RejectedHeat {
    private RejectedHeat() {}

    /**
     * Prints the answer.
     *
     * @param arguments none are read
     */
    public static void main(String[] arguments) {
        var site = ReferenceEnvironment.of(celsius(12), mbar(1013));
        var fuel = Fuel.naturalGas(methane(0.93), ethane(0.04), nitrogen(0.03));
        var gas = FlueGas.of(fuel, excessAir(percent(18)));
        var hot = gas.state(celsius(412), mbar(1011));
        var cold = gas.state(celsius(160), mbar(1009));
        var flow = tonnesPerHour(86);
        Power heat = flow.times(hot.enthalpy().minus(cold.enthalpy()));
        Power work = flow.times(site.flowExergy(hot).minus(site.flowExergy(cold)));
        Ratio quality = work.over(heat);
        System.out.println(heat.format(MEGAWATT, 3) + ", of which " + quality.format(PERCENT, 3) + " could be work");
    }
}
