package lostwork.component;

import lostwork.plant.Equations;
import lostwork.plant.ExergyPurpose;
import lostwork.plant.Expression;
import lostwork.plant.ShaftInlet;
import lostwork.plant.Variable;
import lostwork.quantity.Power;

/**
 * An adiabatic compressor, fan or blower.
 *
 * <h2>Equations</h2>
 *
 * <pre>
 * isentropic efficiency  ηₛ (h₂ − h₁) = h(p₂, s₁) − h₁
 * polytropic efficiency  ηₚ (s₂ − s₁) = (1 − ηₚ) ∫ (v/T) dp
 * power                  P = ṁ (h₂ − h₁)
 * pressure ratio         p₂ / p₁
 * </pre>
 *
 * <p>The power counts positive into the machine. States are static or total ones, as the user reads them; kinetic
 * energy is not added.
 *
 * <p>The polytropic efficiency is that of every small step of pressure: dh = v dp/ηₚ along the path. With dh = T ds + v dp
 * the equation above follows; its integral runs along that path. For an ideal gas it is R ln(p₂/p₁), exactly; for other
 * fluids the path is integrated in ln p. It is computed when it is given or read.
 *
 * <p>Source: the definitions of both efficiencies, in every textbook of turbomachinery; for real gases J. M. Schultz, The
 * polytropic analysis of centrifugal compressors, Trans. ASME J. Eng. Power 84 (1962) 69–82 (from memory).
 */
public final class Compressor extends FlowMachine {
    private final ShaftInlet shaft = shaftInlet("shaft");

    /**
     * Creates a compressor.
     *
     * @param name its name
     */
    public Compressor(String name) {
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
        describeRatios(e, outlet().pressure(), inlet().pressure());
    }
}
