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
 * power                  P = ṁ (h₂ − h₁)
 * pressure rise          p₂ − p₁
 * pressure ratio         p₂ / p₁
 * </pre>
 *
 * <p>The power counts positive into the machine. The ideal work is that of the real liquid, not v Δp; for cold water
 * the two differ by parts in a thousand.
 *
 * <p>Source: the definition of the isentropic efficiency, in every textbook of engineering thermodynamics.
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
        return ExergyPurpose.dissipative().withFuel(shaft).withProductRise(inlet(), outlet());
    }

    @Override
    protected void describe(Equations e) {
        final Expression rise = outlet().enthalpy().minus(inlet().enthalpy());
        final Expression idealRise = isentropicOutletEnthalpy().minus(inlet().enthalpy());
        e.sameFlow(inlet(), outlet());
        e.model("isentropic efficiency", isentropicEfficiency().times(rise), idealRise);
        e.law("power", shaft.power(), inlet().flow().times(rise));
        e.define("pressure rise", pressureRise, outlet().pressure().minus(inlet().pressure()));
        describeRatios(e, outlet().pressure(), inlet().pressure());
    }
}
