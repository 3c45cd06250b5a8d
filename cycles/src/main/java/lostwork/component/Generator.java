package lostwork.component;

import lostwork.plant.Component;
import lostwork.plant.Equations;
import lostwork.plant.ExergyPurpose;
import lostwork.plant.HeatOutlet;
import lostwork.plant.ShaftInlet;
import lostwork.plant.Variable;
import lostwork.plant.WireOutlet;
import lostwork.quantity.Power;
import lostwork.quantity.Ratio;

/**
 * A machine that turns mechanical into electric power.
 *
 * <h2>Equations</h2>
 *
 * <pre>
 * efficiency      P_el = η P_shaft
 * energy balance  Q̇_loss = P_shaft − P_el
 * </pre>
 *
 * <p>Shaft power counts positive into the machine, electric power and heat loss positive out of it. No losses are
 * assumed unless the efficiency is given or follows from what is given.
 *
 * <p>Source: the first law; the efficiency is that of IEC 60034-1 in its meaning, output over input.
 */
public final class Generator extends Component {
    private final ShaftInlet shaft = shaftInlet("shaft");
    private final WireOutlet wire = wireOutlet("wire");
    private final HeatOutlet heatLoss = heatOutlet("heat loss");
    private final Variable<Ratio> efficiency = variable("efficiency", Ratio.KIND);

    /**
     * Creates a generator.
     *
     * @param name its name
     */
    public Generator(String name) {
        super(name);
    }

    /** {@return where the mechanical power enters} */
    public ShaftInlet shaft() {
        return shaft;
    }

    /** {@return where the electric power leaves} */
    public WireOutlet wire() {
        return wire;
    }

    /** {@return where the losses leave as heat} */
    public HeatOutlet heatLoss() {
        return heatLoss;
    }

    /** {@return the electric power, positive out of the machine} */
    public Variable<Power> power() {
        return wire.power();
    }

    /** {@return electric over mechanical power; 100 % is assumed unless something else is given} */
    public Variable<Ratio> efficiency() {
        return efficiency;
    }

    @Override
    public ExergyPurpose purpose() {
        return ExergyPurpose.fuel(shaft).withProduct(wire);
    }

    @Override
    protected void describe(Equations e) {
        PowerLoss.describe(e, efficiency, "an efficiency", shaft.power(), wire.power(), heatLoss);
    }
}
