package lostwork.component;

import lostwork.plant.Component;
import lostwork.plant.Equations;
import lostwork.plant.Expression;
import lostwork.plant.FlowPath;
import lostwork.plant.Inlet;
import lostwork.plant.Outlet;
import lostwork.plant.ShaftInlet;
import lostwork.plant.Variable;
import lostwork.quantity.Power;
import lostwork.quantity.Ratio;

/**
 * An adiabatic pump: η<sub>s</sub> (h₂ − h₁) = h(p₂, s₁) − h₁.
 *
 * <p>Source: the definition of the isentropic efficiency, in every textbook of engineering thermodynamics.
 */
public final class Pump extends Component implements FlowPath {
    private final Inlet inlet = inlet("inlet");
    private final Outlet outlet = outlet("outlet");
    private final ShaftInlet shaft = shaftInlet("shaft");
    private final Variable<Ratio> isentropicEfficiency = variable("isentropic efficiency", Ratio.KIND);

    /**
     * Creates a pump.
     *
     * @param name its name
     */
    public Pump(String name) {
        super(name);
    }

    @Override
    public Inlet inlet() {
        return inlet;
    }

    @Override
    public Outlet outlet() {
        return outlet;
    }

    /** {@return where the power enters} */
    public ShaftInlet shaft() {
        return shaft;
    }

    /** {@return the shaft power} */
    public Variable<Power> power() {
        return shaft.power();
    }

    /** {@return the isentropic efficiency} */
    public Variable<Ratio> isentropicEfficiency() {
        return isentropicEfficiency;
    }

    @Override
    protected void describe(Equations e) {
        e.sameFlow(inlet, outlet);
        final Expression rise = outlet.enthalpy().minus(inlet.enthalpy());
        final Expression ideal =
                inlet.enthalpyAt(outlet.pressure(), inlet.entropy()).minus(inlet.enthalpy());
        e.model("isentropic efficiency", isentropicEfficiency.times(rise), ideal);
        e.law("power", shaft.power(), inlet.flow().times(rise));
    }
}
