package lostwork.component;

import java.util.List;
import lostwork.plant.Component;
import lostwork.plant.Equations;
import lostwork.plant.Expression;
import lostwork.plant.FlowPath;
import lostwork.plant.Inlet;
import lostwork.plant.Outlet;

/**
 * A vessel that parts a wet stream into saturated liquid and saturated vapour: a flash tank or moisture separator.
 *
 * <h2>Equations</h2>
 *
 * <pre>
 * mass balance    ṁ = ṁ′ + ṁ″
 * energy balance  ṁ h = ṁ′ h′ + ṁ″ h″
 * liquid          h′ = h(p, x = 0)
 * vapour          h″ = h(p, x = 1)
 * assumed         p = p′ and p = p″
 * </pre>
 *
 * <p>It is adiabatic and separates completely. The inlet must be wet: for a subcooled or superheated one no flows above
 * zero meet the balances. The assumption of one pressure gives way to a pressure given at an outlet besides that of the
 * inlet; liquid and vapour are saturated at the pressure of their own outlets.
 *
 * <p>Source: the first law of an adiabatic open system without work; the lever rule follows.
 */
public final class Separator extends Component {
    private final Inlet inlet = inlet("inlet");
    private final Outlet liquid = outlet("liquid");
    private final Outlet vapour = outlet("vapour");

    /**
     * Creates a separator.
     *
     * @param name its name
     */
    public Separator(String name) {
        super(name);
    }

    /** {@return where the wet stream enters} */
    public Inlet inlet() {
        return inlet;
    }

    /** {@return where the saturated liquid leaves} */
    public Outlet liquid() {
        return liquid;
    }

    /** {@return where the saturated vapour leaves} */
    public Outlet vapour() {
        return vapour;
    }

    /** {@return the way from the inlet to the liquid, for a line or a circuit} */
    public FlowPath liquidPath() {
        return new Way(inlet, liquid);
    }

    /** {@return the way from the inlet to the vapour, for a line or a circuit} */
    public FlowPath vapourPath() {
        return new Way(inlet, vapour);
    }

    @Override
    protected void describe(Equations e) {
        e.sameFluid(inlet, liquid);
        e.sameFluid(inlet, vapour);
        e.massBalance(List.of(inlet), List.of(liquid, vapour));
        e.law(
                "energy balance",
                inlet.flow().times(inlet.enthalpy()),
                liquid.flow().times(liquid.enthalpy()).plus(vapour.flow().times(vapour.enthalpy())));
        e.model(
                "saturated liquid",
                liquid.enthalpy(),
                liquid.saturatedEnthalpy(liquid.pressure(), Expression.number(0)));
        e.model(
                "saturated vapour",
                vapour.enthalpy(),
                vapour.saturatedEnthalpy(vapour.pressure(), Expression.number(1)));
        e.assume("one pressure at inlet and liquid", inlet.pressure(), liquid.pressure());
        e.assume("one pressure at inlet and vapour", inlet.pressure(), vapour.pressure());
    }
}
