package lostwork.examples.recovery;

import lostwork.plant.Component;
import lostwork.plant.Equations;
import lostwork.plant.ExergyPurpose;
import lostwork.plant.Expression;
import lostwork.plant.FlowPath;
import lostwork.plant.HeatOutlet;
import lostwork.plant.Inlet;
import lostwork.plant.Outlet;
import lostwork.plant.Variable;
import lostwork.plant.WireInlet;
import lostwork.quantity.Power;
import lostwork.quantity.Ratio;

/**
 * A condenser whose heat fans blow into the surroundings: a component of one's own, made of ports, variables and
 * equations like those of the library.
 *
 * <pre>
 *   duty = m (h_in − h_out)
 *   fan power = share of the duty
 *   heat to the surroundings = duty + fan power
 * </pre>
 */
public final class AirCooledCondenser extends Component implements FlowPath {
    private final Inlet inlet = inlet("inlet");
    private final Outlet outlet = outlet("outlet");
    private final WireInlet fans = wireInlet("fans");
    private final HeatOutlet heat = heatOutlet("heat");
    private final Variable<Power> duty = variable("duty", Power.KIND);
    private final Variable<Ratio> fanShare = variable("fan share", Ratio.KIND);

    /**
     * Creates a condenser.
     *
     * @param name its name
     */
    public AirCooledCondenser(String name) {
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

    /** {@return where the power of the fans enters} */
    public WireInlet fans() {
        return fans;
    }

    /** {@return where the heat leaves to the surroundings} */
    public HeatOutlet heat() {
        return heat;
    }

    /** {@return the heat that the steam gives off} */
    public Variable<Power> duty() {
        return duty;
    }

    /** {@return the power of the fans over the duty} */
    public Variable<Ratio> fanShare() {
        return fanShare;
    }

    @Override
    public ExergyPurpose purpose() {
        return ExergyPurpose.dissipative();
    }

    @Override
    protected void describe(Equations e) {
        final Expression fall = inlet.enthalpy().minus(outlet.enthalpy());
        e.sameFlow(inlet, outlet);
        e.law("heat of the steam", duty, inlet.flow().times(fall));
        e.law("energy balance", heat.rate(), duty.plus(fans.power()));
        e.model("fan power", fans.power(), fanShare.times(duty));
        e.assume("no pressure loss", inlet.pressure(), outlet.pressure());
        e.require("the steam gives off heat", fall);
    }
}
