package lostwork.component;

import lostwork.plant.Equations;
import lostwork.plant.ExergyPurpose;
import lostwork.plant.Expression;
import lostwork.plant.ShaftOutlet;
import lostwork.plant.Variable;
import lostwork.quantity.Power;

/**
 * An adiabatic turbine or expander.
 *
 * <h2>Equations</h2>
 *
 * <pre>
 * isentropic efficiency  h₁ − h₂ = ηₛ (h₁ − h(p₂, s₁))
 * polytropic efficiency  s₁ − s₂ = (1 − ηₚ) ∫ (v/T) dp
 * power                  P = ṁ (h₁ − h₂)
 * pressure ratio         p₁ / p₂
 * </pre>
 *
 * <p>The power counts positive out of the machine. States are static or total ones, as the user reads them; kinetic
 * energy is not added.
 *
 * <p>The polytropic efficiency is that of every small step of pressure: dh = ηₚ v dp along the path. With dh = T ds + v dp
 * the equation above follows; its integral runs along that path. For an ideal gas it is R ln(p₂/p₁), exactly; for other
 * fluids the path is integrated in ln p. It is computed when it is given or read.
 *
 * <p>Source: the definitions of both efficiencies, in every textbook of turbomachinery; for real gases J. M. Schultz, The
 * polytropic analysis of centrifugal compressors, Trans. ASME J. Eng. Power 84 (1962) 69–82 (from memory).
 */
public final class Turbine extends FlowMachine {
    private final ShaftOutlet shaft = shaftOutlet("shaft");

    /**
     * Creates a turbine.
     *
     * @param name its name
     */
    public Turbine(String name) {
        super(name);
    }

    /** {@return where the power leaves} */
    public ShaftOutlet shaft() {
        return shaft;
    }

    /** {@return the shaft power, positive out of the machine} */
    public Variable<Power> power() {
        return shaft.power();
    }

    @Override
    public ExergyPurpose purpose() {
        return ExergyPurpose.fuelDrop(inlet(), outlet()).withProduct(shaft);
    }

    @Override
    protected void describe(Equations e) {
        final Expression drop = inlet().enthalpy().minus(outlet().enthalpy());
        final Expression idealDrop = inlet().enthalpy().minus(isentropicOutletEnthalpy());
        e.sameFlow(inlet(), outlet());
        e.model("isentropic efficiency", drop, isentropicEfficiency().times(idealDrop));
        e.define(
                "polytropic efficiency",
                polytropicEfficiency(),
                entropyRise(e),
                polytropicEfficiency().minus(Expression.number(1)).times(polytropicIntegral(e)));
        e.law("power", shaft.power(), inlet().flow().times(drop));
        describeRatios(e, inlet().pressure(), outlet().pressure());
    }
}
