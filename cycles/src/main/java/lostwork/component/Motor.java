package lostwork.component;

import lostwork.plant.Component;
import lostwork.plant.Equations;
import lostwork.plant.ExergyPurpose;
import lostwork.plant.HeatOutlet;
import lostwork.plant.ShaftOutlet;
import lostwork.plant.Variable;
import lostwork.plant.WireInlet;
import lostwork.quantity.Power;
import lostwork.quantity.Ratio;

/**
 * A machine that turns electric into mechanical power.
 *
 * <h2>Equations</h2>
 *
 * <pre>
 * efficiency      P_shaft = η P_el
 * energy balance  Q̇_loss = P_el − P_shaft
 * </pre>
 *
 * <p>Electric power counts positive into the machine, shaft power and heat loss positive out of it. No losses are
 * assumed unless the efficiency is given or follows from what is given.
 *
 * <p>Source: the first law; the efficiency is that of IEC 60034-1 in its meaning, output over input.
 */
public final class Motor extends Component {
    private final WireInlet wire = wireInlet("wire");
    private final ShaftOutlet shaft = shaftOutlet("shaft");
    private final HeatOutlet heatLoss = heatOutlet("heat loss");
    private final Variable<Ratio> efficiency = variable("efficiency", Ratio.KIND);

    /**
     * Creates a motor.
     *
     * @param name its name
     */
    public Motor(String name) {
        super(name);
    }

    /** {@return where the electric power enters} */
    public WireInlet wire() {
        return wire;
    }

    /** {@return where the mechanical power leaves} */
    public ShaftOutlet shaft() {
        return shaft;
    }

    /** {@return where the losses leave as heat} */
    public HeatOutlet heatLoss() {
        return heatLoss;
    }

    /** {@return the electric power, positive into the machine} */
    public Variable<Power> power() {
        return wire.power();
    }

    /** {@return mechanical over electric power; 100 % is assumed unless something else is given} */
    public Variable<Ratio> efficiency() {
        return efficiency;
    }

    @Override
    public ExergyPurpose purpose() {
        return ExergyPurpose.fuel(wire).withProduct(shaft);
    }

    @Override
    protected void describe(Equations e) {
        PowerLoss.describe(e, efficiency, "an efficiency", wire.power(), shaft.power(), heatLoss);
    }
}
