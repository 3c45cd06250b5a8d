package lostwork.component;

import lostwork.plant.Component;
import lostwork.plant.Equations;
import lostwork.plant.Expression;
import lostwork.plant.FlowPath;
import lostwork.plant.Inlet;
import lostwork.plant.Outlet;
import lostwork.plant.ShaftOutlet;
import lostwork.plant.Variable;
import lostwork.quantity.Power;
import lostwork.quantity.Ratio;

/**
 * An adiabatic turbine: h₁ − h₂ = η<sub>s</sub> (h₁ − h(p₂, s₁)).
 *
 * <p>Source: the definition of the isentropic efficiency, in every textbook of engineering thermodynamics.
 */
public final class Turbine extends Component implements FlowPath {
    private final Inlet inlet = inlet("inlet");
    private final Outlet outlet = outlet("outlet");
    private final ShaftOutlet shaft = shaftOutlet("shaft");
    private final Variable<Ratio> isentropicEfficiency = variable("isentropic efficiency", Ratio.KIND);

    /**
     * Creates a turbine.
     *
     * @param name its name
     */
    public Turbine(String name) {
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

    /** {@return where the power leaves} */
    public ShaftOutlet shaft() {
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
        final Expression drop = inlet.enthalpy().minus(outlet.enthalpy());
        final Expression ideal = inlet.enthalpy().minus(inlet.enthalpyAt(outlet.pressure(), inlet.entropy()));
        e.model("isentropic efficiency", drop, isentropicEfficiency.times(ideal));
        e.law("power", shaft.power(), inlet.flow().times(drop));
    }
}
