package lostwork.component;

import lostwork.plant.Component;
import lostwork.plant.Equations;
import lostwork.plant.FlowPath;
import lostwork.plant.HeatOutlet;
import lostwork.plant.Inlet;
import lostwork.plant.Outlet;
import lostwork.plant.Variable;
import lostwork.quantity.Power;
import lostwork.quantity.Pressure;
import lostwork.quantity.PressureDifference;
import lostwork.quantity.TemperatureSpan;

/**
 * A vapour that condenses and gives off its heat to a port.
 *
 * <p>The coolant is no stream of the plant; its temperature stands at the heat port, and may stay open. Where the coolant
 * has a flow of its own, take a {@link HeatExchanger} with the vapour on the hot side.
 *
 * <pre>
 *   duty = m (h_in − h_out)
 *   temperature difference = T_saturation(p_in) − T_port
 * </pre>
 *
 * <p>How far the condensate is cooled is given at the outlet: {@code given(condenser.outlet().subcooling(), kelvins(3))},
 * or {@code given(condenser.outlet().vapourFraction(), percent(0))} for condensate that is just boiling. No pressure loss
 * is assumed unless one is given.
 */
public final class Condenser extends Component implements FlowPath {
    private final Inlet inlet = inlet("inlet");
    private final Outlet outlet = outlet("outlet");
    private final HeatOutlet heat = heatOutlet("heat");
    private final Variable<PressureDifference> pressureLoss = variable("pressure loss", PressureDifference.KIND);
    private final Variable<TemperatureSpan> temperatureDifference =
            variable("temperature difference", TemperatureSpan.KIND);

    /**
     * Creates a condenser.
     *
     * @param name its name
     */
    public Condenser(String name) {
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

    /** {@return where the heat leaves; its temperature is that of the coolant or the surroundings} */
    public HeatOutlet heat() {
        return heat;
    }

    /** {@return the heat rate} */
    public Variable<Power> duty() {
        return heat.rate();
    }

    /** {@return the absolute pressure of the vapour that enters, at which it condenses} */
    public Variable<Pressure> pressure() {
        return inlet.pressure();
    }

    /** {@return the pressure at the inlet less that at the outlet; none is assumed unless something else is given} */
    public Variable<PressureDifference> pressureLoss() {
        return pressureLoss;
    }

    /** {@return the saturation temperature at the condenser pressure less the temperature of the heat port} */
    public Variable<TemperatureSpan> temperatureDifference() {
        return temperatureDifference;
    }

    @Override
    protected void describe(Equations e) {
        e.sameFlow(inlet, outlet);
        e.law("energy balance", heat.rate(), inlet.flow().times(inlet.enthalpy().minus(outlet.enthalpy())));
        e.law("pressure loss", pressureLoss, inlet.pressure().minus(outlet.pressure()));
        e.assume("no pressure loss", pressureLoss, PressureDifference.pascals(0));
        e.define(
                "temperature difference",
                temperatureDifference,
                inlet.saturationTemperature(inlet.pressure()).minus(heat.temperature()));
        e.require("the stream gives off heat", inlet.enthalpy().minus(outlet.enthalpy()));
    }
}
