package lostwork.component;

import java.util.List;
import java.util.stream.IntStream;
import lostwork.plant.Component;
import lostwork.plant.Equations;
import lostwork.plant.Expression;
import lostwork.plant.FlowPath;
import lostwork.plant.Inlet;
import lostwork.plant.Outlet;

/**
 * A junction where streams of one fluid become one: a header, an open feedwater heater, a desuperheater.
 *
 * <h2>Equations</h2>
 *
 * <pre>
 * mass balance    Σ ṁᵢ = ṁ
 * energy balance  Σ ṁᵢ hᵢ = ṁ h
 * assumed         pᵢ = p, for each inlet
 * </pre>
 *
 * <p>It is adiabatic. All streams are assumed to meet at one pressure; for an inlet whose pressure is given besides that
 * of the outlet, the assumption gives way, and the step of pressure is a throttling inside the mixer. Where a stream
 * comes from a higher pressure, a {@link Valve} before the mixer says so more clearly. Where branches part in a
 * {@link Splitter} and meet again, the loss of one settles that of another that has none of its own; with a loss given for
 * each, give the pressure at the outlet too, or put valves before the mixer.
 *
 * <p>Source: the first law of an adiabatic open system without work.
 */
public final class Mixer extends Component {
    private final List<Inlet> inlets;
    private final Outlet outlet = outlet("outlet");

    /**
     * Creates a mixer of two streams.
     *
     * @param name its name
     */
    public Mixer(String name) {
        this(name, 2);
    }

    /**
     * Creates a mixer.
     *
     * @param name its name
     * @param inlets how many streams it mixes, 2 to 100
     * @throws IllegalArgumentException if the number is outside its range
     */
    public Mixer(String name, int inlets) {
        super(name);
        this.inlets = IntStream.rangeClosed(1, PortCount.require(name, "inlets", inlets, 2))
                .mapToObj(i -> inlet("inlet " + i))
                .toList();
    }

    /**
     * {@return where a stream enters}
     *
     * @param number which stream, counted from 1
     * @throws IllegalArgumentException if there is no such inlet
     */
    public Inlet inlet(int number) {
        return PortCount.get(inlets, name(), "inlet", number);
    }

    /** {@return where the streams enter, in the order of their numbers} */
    public List<Inlet> inlets() {
        return inlets;
    }

    /** {@return where the mixed stream leaves} */
    public Outlet outlet() {
        return outlet;
    }

    /**
     * {@return the way from one inlet to the outlet, for a line or a circuit; the other inlets are connected one by one}
     *
     * @param number which inlet, counted from 1
     * @throws IllegalArgumentException if there is no such inlet
     */
    public FlowPath path(int number) {
        return new Way(inlet(number), outlet);
    }

    @Override
    protected void describe(Equations e) {
        e.massBalance(inlets, List.of(outlet));
        Expression entering = energyFlow(inlets.get(0));
        for (Inlet inlet : inlets.subList(1, inlets.size())) {
            entering = entering.plus(energyFlow(inlet));
        }
        e.law("energy balance", entering, outlet.flow().times(outlet.enthalpy()));
        for (Inlet inlet : inlets) {
            e.sameFluid(inlet, outlet);
            e.assume("one pressure at " + inlet.name() + " and outlet", inlet.pressure(), outlet.pressure());
        }
    }

    private static Expression energyFlow(Inlet inlet) {
        return inlet.flow().times(inlet.enthalpy());
    }
}
