package lostwork.component;

import lostwork.plant.Equations;
import lostwork.plant.ExergyPurpose;
import lostwork.plant.HeatInlet;
import lostwork.plant.Variable;
import lostwork.quantity.Power;

/**
 * A stream that takes up heat from a port: boiler, evaporator, combustion chamber of an air-standard cycle.
 *
 * <h2>Equations</h2>
 *
 * <pre>
 * energy balance          Q̇ = ṁ (h₂ − h₁)
 * pressure loss           p₁ − p₂
 * relative pressure loss  (p₁ − p₂) / p₁
 * </pre>
 *
 * <p>The heat counts positive into the stream. No pressure loss is assumed; the assumption gives way to a given loss, or
 * to given pressures at inlet and outlet. The temperature of the heat port is that of the source; only where it is given
 * does the second law have anything to check.
 *
 * <p>Source: the first law of an open system without work.
 */
public final class Heater extends HeatedFlow {
    private final HeatInlet heat = heatInlet("heat");

    /**
     * Creates a heater.
     *
     * @param name its name
     */
    public Heater(String name) {
        super(name);
    }

    /** {@return where the heat enters; its temperature is that of the source} */
    public HeatInlet heat() {
        return heat;
    }

    /** {@return the heat rate, positive into the stream} */
    public Variable<Power> duty() {
        return heat.rate();
    }

    @Override
    public ExergyPurpose purpose() {
        return ExergyPurpose.fuel(heat).withProductRise(inlet(), outlet());
    }

    @Override
    protected void describe(Equations e) {
        e.sameFlow(inlet(), outlet());
        e.law(
                "energy balance",
                heat.rate(),
                inlet().flow().times(outlet().enthalpy().minus(inlet().enthalpy())));
        describePressureLoss(e);
    }
}
