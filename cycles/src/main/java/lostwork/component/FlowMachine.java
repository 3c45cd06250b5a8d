package lostwork.component;

import java.util.List;
import java.util.function.Function;
import lostwork.fluid.FluidModel;
import lostwork.plant.Equations;
import lostwork.plant.Expression;
import lostwork.plant.Variable;
import lostwork.quantity.Ratio;
import lostwork.quantity.SpecificEntropy;
import lostwork.solve.DifferentiableFunction;

/** A machine that exchanges work with a stream: what compressor, pump and turbine have in common. */
abstract class FlowMachine extends ThroughFlow {
    private final Variable<Ratio> isentropicEfficiency = variable("isentropic efficiency", Ratio.KIND);
    private final Variable<Ratio> polytropicEfficiency = variable("polytropic efficiency", Ratio.KIND);
    private final Variable<Ratio> pressureRatio = variable("pressure ratio", Ratio.KIND);

    FlowMachine(String name) {
        super(name);
    }

    /** {@return the isentropic efficiency, above 0 and at most 100 %} */
    public final Variable<Ratio> isentropicEfficiency() {
        return isentropicEfficiency;
    }

    /** {@return the polytropic efficiency, that of every small step of pressure; above 0 and at most 100 %} */
    public final Variable<Ratio> polytropicEfficiency() {
        return polytropicEfficiency;
    }

    /** {@return the higher pressure over the lower one, 1 or more} */
    public final Variable<Ratio> pressureRatio() {
        return pressureRatio;
    }

    /** {@return the enthalpy at the outlet pressure and the inlet entropy: where an ideal machine would end} */
    final Expression isentropicOutletEnthalpy() {
        return inlet().enthalpyAt(outlet().pressure(), inlet().entropy());
    }

    /** {@return s₂ − s₁} */
    final Expression entropyRise(Equations e) {
        return ofBothEnds(e, "entropy rise", EntropyRise::new);
    }

    /** {@return ∫ (v/T) dp along the path of constant polytropic efficiency} */
    final Expression polytropicIntegral(Equations e) {
        return ofBothEnds(e, "integral of (v/T) dp", PolytropicPath::new);
    }

    private Expression ofBothEnds(
            Equations e, String words, Function<FluidModel, ? extends DifferentiableFunction> function) {
        return e.function(
                words,
                SpecificEntropy.KIND.dimension(),
                List.of(inlet()),
                fluids -> new WithinRange(fluids.get(0), function.apply(fluids.get(0))),
                List.of(inlet().pressure(), inlet().enthalpy(), outlet().pressure(), outlet().enthalpy()));
    }

    /** States the limits of the efficiency and what the pressure ratio is. */
    final void describeRatios(Equations e, Expression higherPressure, Expression lowerPressure) {
        e.define("pressure ratio", pressureRatio, pressureRatio.times(lowerPressure), higherPressure);
        e.require("a pressure ratio of at least 1", higherPressure.minus(lowerPressure));
        e.require("an isentropic efficiency above 0 %", isentropicEfficiency);
        e.require(
                "an isentropic efficiency of at most 100 %",
                Expression.number(1).minus(isentropicEfficiency));
    }
}
