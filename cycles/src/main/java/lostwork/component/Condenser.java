package lostwork.component;

import lostwork.plant.Equations;
import lostwork.plant.ExergyPurpose;
import lostwork.plant.HeatOutlet;
import lostwork.plant.Variable;
import lostwork.quantity.Power;
import lostwork.quantity.Pressure;
import lostwork.quantity.TemperatureSpan;

/**
 * A vapour that condenses and gives off its heat to a port.
 *
 * <p>The coolant is no stream of the plant; its temperature stands at the heat port and may stay open. Where the coolant
 * has a flow of its own, take a {@link HeatExchanger} with the vapour on the hot side.
 *
 * <h2>Equations</h2>
 *
 * <pre>
 * energy balance          Q = m (h₁ − h₂)
 * temperature difference  T_saturation(p₁) − T_port
 * pressure loss           p₁ − p₂
 * </pre>
 *
 * <p>The heat counts positive out of the stream. How far the condensate is cooled is given at the outlet:
 * {@code given(condenser.outlet().subcooling(), kelvins(3))}, or
 * {@code given(condenser.outlet().vapourFraction(), percent(0))} for condensate that is just boiling. The pressure follows
 * from a given one, or from the coolant: {@code given(condenser.heat().temperature(), celsius(25))} with
 * {@code given(condenser.temperatureDifference(), kelvins(12))}. No pressure loss is assumed; the assumption gives way to a
 * given loss. The temperature of the heat port is that of the sink; only where it is known does the second law have
 * anything to check.
 *
 * <p>Source: the first law of an open system without work. What is taken as the condenser's temperature difference, the
 * saturation temperature less that of the coolant, is common practice; with a coolant that warms up, the trade's terminal
 * difference refers to where the coolant leaves, and an {@linkplain HeatExchanger exchanger} gives it.
 */
public final class Condenser extends HeatedFlow {
    private final HeatOutlet heat = heatOutlet("heat");
    private final Variable<TemperatureSpan> temperatureDifference =
            variable("temperature difference", HeatExchanger.NO_DIFFERENCE, HeatExchanger.LARGEST_DIFFERENCE);

    /**
     * Creates a condenser.
     *
     * @param name its name
     */
    public Condenser(String name) {
        super(name);
    }

    /** {@return where the heat leaves; its temperature is that of the coolant or the surroundings} */
    public HeatOutlet heat() {
        return heat;
    }

    /** {@return the heat rate, positive out of the stream} */
    public Variable<Power> duty() {
        return heat.rate();
    }

    /** {@return the absolute pressure of the vapour that enters, at which it condenses} */
    public Variable<Pressure> pressure() {
        return inlet().pressure();
    }

    /** {@return the saturation temperature at the condenser pressure less the temperature of the heat port} */
    public Variable<TemperatureSpan> temperatureDifference() {
        return temperatureDifference;
    }

    @Override
    public ExergyPurpose purpose() {
        return ExergyPurpose.dissipative();
    }

    @Override
    protected void describe(Equations e) {
        e.sameFlow(inlet(), outlet());
        e.law(
                "energy balance",
                heat.rate(),
                inlet().flow().times(inlet().enthalpy().minus(outlet().enthalpy())));
        describePressureLoss(e);
        e.define(
                "temperature difference",
                temperatureDifference,
                inlet().saturationTemperature(inlet().pressure()).minus(heat.temperature()));
        e.require("the vapour gives off heat", inlet().enthalpy().minus(outlet().enthalpy()));
    }
}
