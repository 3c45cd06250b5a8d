package lostwork.component;

import lostwork.plant.Component;
import lostwork.plant.Equations;
import lostwork.plant.FlowPath;
import lostwork.plant.HeatOutlet;
import lostwork.plant.Inlet;
import lostwork.plant.Outlet;
import lostwork.plant.Variable;
import lostwork.quantity.Power;
import lostwork.quantity.PressureDifference;

/** A stream that gives off heat to a port. */
public final class Cooler extends Component implements FlowPath {
    private final Inlet inlet = inlet("inlet");
    private final Outlet outlet = outlet("outlet");
    private final HeatOutlet heat = heatOutlet("heat");
    private final Variable<PressureDifference> pressureLoss = variable("pressure loss", PressureDifference.KIND);

    /**
     * Creates a cooler.
     *
     * @param name its name
     */
    public Cooler(String name) {
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

    /** {@return where the heat leaves; its temperature is that of the sink} */
    public HeatOutlet heat() {
        return heat;
    }

    /** {@return the heat rate} */
    public Variable<Power> duty() {
        return heat.rate();
    }

    /** {@return the pressure at the inlet less that at the outlet; none is assumed unless something else is given} */
    public Variable<PressureDifference> pressureLoss() {
        return pressureLoss;
    }

    @Override
    protected void describe(Equations e) {
        e.sameFlow(inlet, outlet);
        e.law("energy balance", heat.rate(), inlet.flow().times(inlet.enthalpy().minus(outlet.enthalpy())));
        e.law("pressure loss", pressureLoss, inlet.pressure().minus(outlet.pressure()));
        e.assume("no pressure loss", pressureLoss, PressureDifference.pascals(0));
    }
}
