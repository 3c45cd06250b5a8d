package lostwork.component;

import lostwork.plant.Equations;
import lostwork.plant.ExergyPurpose;
import lostwork.plant.Variable;
import lostwork.quantity.PressureDifference;
import lostwork.quantity.Ratio;

/**
 * A throttle valve, orifice or any adiabatic resistance that delivers no work.
 *
 * <h2>Equations</h2>
 *
 * <pre>
 * h₁ = h₂
 * pressure loss  = p₁ − p₂
 * pressure ratio = p₁ / p₂
 * </pre>
 *
 * <p>Kinetic and potential energy are left out. Pressure loss and pressure ratio are computed when they are given or
 * read. A rise of pressure would destroy entropy and is refused by the check of the second law.
 *
 * <p>Source: the first law of an adiabatic open system without work (Joule–Thomson process), in every textbook of
 * engineering thermodynamics.
 */
public final class Valve extends ThroughFlow {
    private final Variable<PressureDifference> pressureLoss = variable("pressure loss", PressureDifference.KIND);
    private final Variable<Ratio> pressureRatio = variable("pressure ratio", Ratio.KIND);

    /**
     * Creates a valve.
     *
     * @param name its name
     */
    public Valve(String name) {
        super(name);
    }

    /** {@return the pressure at the inlet less that at the outlet} */
    public Variable<PressureDifference> pressureLoss() {
        return pressureLoss;
    }

    /** {@return the pressure at the inlet over that at the outlet, 1 or more} */
    public Variable<Ratio> pressureRatio() {
        return pressureRatio;
    }

    @Override
    public ExergyPurpose purpose() {
        return ExergyPurpose.dissipative();
    }

    @Override
    protected void describe(Equations e) {
        e.sameFlow(inlet(), outlet());
        e.law("energy balance", outlet().enthalpy(), inlet().enthalpy());
        e.define("pressure loss", pressureLoss, inlet().pressure().minus(outlet().pressure()));
        e.define("pressure ratio", pressureRatio, pressureRatio.times(outlet().pressure()), inlet().pressure());
        e.require(
                "an outlet pressure of at most the inlet pressure",
                inlet().pressure().minus(outlet().pressure()));
    }
}
