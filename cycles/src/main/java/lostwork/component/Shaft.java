package lostwork.component;

import java.util.List;
import java.util.stream.IntStream;
import lostwork.plant.Component;
import lostwork.plant.Equations;
import lostwork.plant.ExergyPurpose;
import lostwork.plant.Expression;
import lostwork.plant.HeatOutlet;
import lostwork.plant.ShaftInlet;
import lostwork.plant.ShaftOutlet;
import lostwork.plant.ShaftPort;
import lostwork.plant.Variable;
import lostwork.quantity.Power;
import lostwork.quantity.Ratio;

/**
 * A shaft that several machines drive or are driven by, with its gears and bearings.
 *
 * <h2>Equations</h2>
 *
 * <pre>
 * mechanical efficiency  Σ P_driven = ηₘ Σ P_driving
 * energy balance         Q̇_loss = Σ P_driving − Σ P_driven
 * </pre>
 *
 * <p>The power of a driving machine counts positive into the shaft, that of a driven machine and the heat loss positive
 * out of it. No losses are assumed unless the efficiency is given or follows from what is given. Speed and torque are
 * left out.
 *
 * <pre>{@code
 * var shaft = b.add(new Shaft("main shaft").withDriven(2));   // one turbine drives a compressor and a generator
 * b.connect(turbine.shaft(), shaft.driving(1));
 * b.connect(shaft.driven(1), compressor.shaft());
 * b.connect(shaft.driven(2), generator.shaft());
 * }</pre>
 *
 * <p>Source: the first law; the mechanical efficiency is a definition, power delivered over power taken.
 */
public final class Shaft extends Component {
    private final List<ShaftInlet> driving;
    private final List<ShaftOutlet> driven;
    private final HeatOutlet heatLoss = heatOutlet("heat loss");
    private final Variable<Ratio> mechanicalEfficiency = variable("mechanical efficiency", Ratio.KIND);

    /**
     * Creates a shaft with one driving and one driven machine.
     *
     * @param name its name
     */
    public Shaft(String name) {
        this(name, 1, 1);
    }

    private Shaft(String name, int driving, int driven) {
        super(name);
        this.driving = IntStream.rangeClosed(1, PortCount.require(name, "driving machines", driving, 1))
                .mapToObj(i -> shaftInlet("driving " + i))
                .toList();
        this.driven = IntStream.rangeClosed(1, PortCount.require(name, "driven machines", driven, 1))
                .mapToObj(i -> shaftOutlet("driven " + i))
                .toList();
    }

    /**
     * {@return a shaft of the same name with another number of driving machines}
     *
     * @param machines how many, 1 to 100
     * @throws IllegalArgumentException if the number is outside its range
     */
    public Shaft withDriving(int machines) {
        return new Shaft(name(), machines, driven.size());
    }

    /**
     * {@return a shaft of the same name with another number of driven machines}
     *
     * @param machines how many, 1 to 100
     * @throws IllegalArgumentException if the number is outside its range
     */
    public Shaft withDriven(int machines) {
        return new Shaft(name(), driving.size(), machines);
    }

    /**
     * {@return where the power of a driving machine enters}
     *
     * @param number which machine, counted from 1
     * @throws IllegalArgumentException if there is no such machine
     */
    public ShaftInlet driving(int number) {
        return PortCount.get(driving, name(), "driving machine", number);
    }

    /**
     * {@return where the power for a driven machine leaves}
     *
     * @param number which machine, counted from 1
     * @throws IllegalArgumentException if there is no such machine
     */
    public ShaftOutlet driven(int number) {
        return PortCount.get(driven, name(), "driven machine", number);
    }

    /** {@return where the losses leave as heat} */
    public HeatOutlet heatLoss() {
        return heatLoss;
    }

    /** {@return power delivered over power taken; 100 % is assumed unless something else is given} */
    public Variable<Ratio> mechanicalEfficiency() {
        return mechanicalEfficiency;
    }

    /** {@return the heat that the losses become} */
    public Variable<Power> losses() {
        return heatLoss.rate();
    }

    @Override
    public ExergyPurpose purpose() {
        ExergyPurpose purpose = ExergyPurpose.dissipative();
        for (ShaftInlet inlet : driving) {
            purpose = purpose.withFuel(inlet);
        }
        for (ShaftOutlet outlet : driven) {
            purpose = purpose.withProduct(outlet);
        }
        return purpose;
    }

    @Override
    protected void describe(Equations e) {
        PowerLoss.describe(e, mechanicalEfficiency, "a mechanical efficiency", sum(driving), sum(driven), heatLoss);
    }

    private static Expression sum(List<? extends ShaftPort> ports) {
        Expression sum = ports.get(0).power();
        for (ShaftPort port : ports.subList(1, ports.size())) {
            sum = sum.plus(port.power());
        }
        return sum;
    }
}
