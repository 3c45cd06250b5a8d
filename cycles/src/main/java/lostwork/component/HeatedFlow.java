package lostwork.component;

import lostwork.plant.Equations;
import lostwork.plant.Variable;
import lostwork.quantity.PressureDifference;
import lostwork.quantity.Ratio;

/** A stream that exchanges heat on its way: what heater and cooler have in common. */
abstract class HeatedFlow extends ThroughFlow {
    private final Variable<PressureDifference> pressureLoss = variable("pressure loss", PressureDifference.KIND);
    private final Variable<Ratio> relativePressureLoss = variable("relative pressure loss", Ratio.KIND);

    HeatedFlow(String name) {
        super(name);
    }

    /** {@return the pressure at the inlet less that at the outlet; none is assumed unless something else is given} */
    public final Variable<PressureDifference> pressureLoss() {
        return pressureLoss;
    }

    /** {@return the pressure loss over the pressure at the inlet, below 1} */
    public final Variable<Ratio> relativePressureLoss() {
        return relativePressureLoss;
    }

    /** States the pressure loss, and that there is none unless something else is given. */
    final void describePressureLoss(Equations e) {
        e.define("pressure loss", pressureLoss, inlet().pressure().minus(outlet().pressure()));
        e.define(
                "relative pressure loss",
                relativePressureLoss,
                relativePressureLoss.times(inlet().pressure()),
                inlet().pressure().minus(outlet().pressure()));
        e.assume("no pressure loss", inlet().pressure(), outlet().pressure());
        e.require(
                "an outlet pressure of at most the inlet pressure",
                inlet().pressure().minus(outlet().pressure()));
    }
}
