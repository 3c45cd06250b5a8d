package lostwork.component;

import lostwork.plant.Equations;
import lostwork.plant.ExergyPurpose;
import lostwork.plant.Expression;
import lostwork.plant.ShaftInlet;
import lostwork.plant.Variable;
import lostwork.quantity.Power;
import lostwork.quantity.PressureDifference;

/**
 * An adiabatic pump.
 *
 * <h2>Equations</h2>
 *
 * <pre>
 * isentropic efficiency  ηₛ (h₂ − h₁) = h(p₂, s₁) − h₁
 * polytropic efficiency  ηₚ (s₂ − s₁) = (1 − ηₚ) ∫ (v/T) dp
 * power                  P = ṁ (h₂ − h₁)
 * pressure rise          p₂ − p₁
 * pressure ratio         p₂ / p₁
 * </pre>
 *
 * <p>The power counts positive into the machine. The ideal work is that of the real liquid, not v Δp; for cold water
 * the two differ by parts in a thousand.
 *
 * <p>The polytropic efficiency is that of every small step of pressure: dh = v dp/ηₚ along the path. With dh = T ds + v dp
 * the equation above follows; its integral runs along that path. For an ideal gas it is R ln(p₂/p₁), exactly; for other
 * fluids the path is integrated in ln p. It is computed when it is given or read.
 *
 * <p>Source: the definitions of both efficiencies, in every textbook of turbomachinery; for real gases J. M. Schultz, The
 * polytropic analysis of centrifugal compressors, Trans. ASME J. Eng. Power 84 (1962) 69–82 (from memory).
 */
public final class Pump extends FlowMachine {
    private final ShaftInlet shaft = shaftInlet("shaft");
    private final Variable<PressureDifference> pressureRise = variable("pressure rise", PressureDifference.KIND);

    /**
     * Creates a pump.
     *
     * @param name its name
     */
    public Pump(String name) {
        super(name);
    }

    /** {@return where the power enters} */
    public ShaftInlet shaft() {
        return shaft;
    }

    /** {@return the shaft power, positive into the machine} */
    public Variable<Power> power() {
        return shaft.power();
    }

    /** {@return the pressure at the outlet less that at the inlet} */
    public Variable<PressureDifference> pressureRise() {
        return pressureRise;
    }

    @Override
    public ExergyPurpose purpose() {
        return ExergyPurpose.fuel(shaft).withProductRise(inlet(), outlet());
    }

    @Override
    protected void describe(Equations e) {
        final Expression rise = outlet().enthalpy().minus(inlet().enthalpy());
        final Expression idealRise = isentropicOutletEnthalpy().minus(inlet().enthalpy());
        e.sameFlow(inlet(), outlet());
        e.model("isentropic efficiency", isentropicEfficiency().times(rise), idealRise);
        e.define(
                "polytropic efficiency",
                polytropicEfficiency(),
                polytropicEfficiency().times(entropyRise(e)),
                Expression.number(1).minus(polytropicEfficiency()).times(polytropicIntegral(e)));
        e.law("power", shaft.power(), inlet().flow().times(rise));
        e.define("pressure rise", pressureRise, outlet().pressure().minus(inlet().pressure()));
        describeRatios(e, outlet().pressure(), inlet().pressure());
    }
}
