package lostwork.component;

import lostwork.plant.Equations;
import lostwork.plant.ExergyPurpose;
import lostwork.plant.HeatOutlet;
import lostwork.plant.Variable;
import lostwork.quantity.Power;

/**
 * A stream that gives off heat to a port: recooler, intercooler, condenser whose coolant is left out.
 *
 * <h2>Equations</h2>
 *
 * <pre>
 * energy balance          Q̇ = ṁ (h₁ − h₂)
 * pressure loss           p₁ − p₂
 * relative pressure loss  (p₁ − p₂) / p₁
 * </pre>
 *
 * <p>The heat counts positive out of the stream. No pressure loss is assumed; the assumption gives way to a given loss,
 * or to given pressures at inlet and outlet. The temperature of the heat port is that of the sink; only where it is given
 * does the second law have anything to check.
 *
 * <p>Source: the first law of an open system without work.
 */
public final class Cooler extends HeatedFlow {
    private final HeatOutlet heat = heatOutlet("heat");

    /**
     * Creates a cooler.
     *
     * @param name its name
     */
    public Cooler(String name) {
        super(name);
    }

    /** {@return where the heat leaves; its temperature is that of the sink} */
    public HeatOutlet heat() {
        return heat;
    }

    /** {@return the heat rate, positive out of the stream} */
    public Variable<Power> duty() {
        return heat.rate();
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
    }
}
