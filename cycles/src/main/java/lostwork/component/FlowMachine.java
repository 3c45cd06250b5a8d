package lostwork.component;

import lostwork.plant.Equations;
import lostwork.plant.Expression;
import lostwork.plant.Variable;
import lostwork.quantity.Ratio;

/** A machine that exchanges work with a stream: what compressor, pump and turbine have in common. */
abstract class FlowMachine extends ThroughFlow {
    private final Variable<Ratio> isentropicEfficiency = variable("isentropic efficiency", Ratio.KIND);
    private final Variable<Ratio> pressureRatio = variable("pressure ratio", Ratio.KIND);

    FlowMachine(String name) {
        super(name);
    }

    /** {@return the isentropic efficiency, above 0 and at most 100 %} */
    public final Variable<Ratio> isentropicEfficiency() {
        return isentropicEfficiency;
    }

    /** {@return the higher pressure over the lower one, 1 or more} */
    public final Variable<Ratio> pressureRatio() {
        return pressureRatio;
    }

    /** {@return the enthalpy at the outlet pressure and the inlet entropy: where an ideal machine would end} */
    final Expression isentropicOutletEnthalpy() {
        return inlet().enthalpyAt(outlet().pressure(), inlet().entropy());
    }

    /** States the limits of the efficiency and what the pressure ratio is. */
    final void describeRatios(Equations e, Expression higherPressure, Expression lowerPressure) {
        e.define("pressure ratio", pressureRatio, pressureRatio.times(lowerPressure), higherPressure);
        e.require("an isentropic efficiency above 0 %", isentropicEfficiency);
        e.require(
                "an isentropic efficiency of at most 100 %",
                Expression.number(1).minus(isentropicEfficiency));
    }
}
