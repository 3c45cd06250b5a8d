package lostwork.component;

import java.util.List;
import java.util.stream.IntStream;
import lostwork.plant.Component;
import lostwork.plant.Equations;
import lostwork.plant.FlowPath;
import lostwork.plant.Inlet;
import lostwork.plant.Outlet;
import lostwork.plant.Variable;
import lostwork.quantity.Ratio;

/**
 * A junction where one stream becomes several in the same state: a header, a tee, an extraction from a turbine.
 *
 * <h2>Equations</h2>
 *
 * <pre>
 * mass balance  ṁ = Σ ṁᵢ
 * fraction i    ṁᵢ / ṁ
 * </pre>
 *
 * <p>State and fluid are those of the inlet at every outlet: they are one and the same, not equal by an equation. The
 * fractions are computed when they are given or read; at most all but one can be given.
 *
 * <p>Source: the conservation of mass.
 */
public final class Splitter extends Component {
    private final Inlet inlet = inlet("inlet");
    private final List<Outlet> outlets;
    private final List<Variable<Ratio>> fractions;

    /**
     * Creates a splitter into two streams.
     *
     * @param name its name
     */
    public Splitter(String name) {
        this(name, 2);
    }

    /**
     * Creates a splitter.
     *
     * @param name its name
     * @param outlets into how many streams it splits, 2 to 100
     * @throws IllegalArgumentException if the number is outside its range
     */
    public Splitter(String name, int outlets) {
        super(name);
        this.outlets = IntStream.rangeClosed(1, PortCount.require(name, "outlets", outlets, 2))
                .mapToObj(i -> outlet("outlet " + i))
                .toList();
        fractions = this.outlets.stream()
                .map(outlet -> variable(outlet.name() + " fraction", Ratio.KIND))
                .toList();
    }

    /** {@return where the stream enters} */
    public Inlet inlet() {
        return inlet;
    }

    /**
     * {@return where a stream leaves}
     *
     * @param number which stream, counted from 1
     * @throws IllegalArgumentException if there is no such outlet
     */
    public Outlet outlet(int number) {
        return PortCount.get(outlets, name(), "outlet", number);
    }

    /** {@return where the streams leave, in the order of their numbers} */
    public List<Outlet> outlets() {
        return outlets;
    }

    /**
     * {@return the mass flow of one outlet over that of the inlet}
     *
     * @param number which outlet, counted from 1
     * @throws IllegalArgumentException if there is no such outlet
     */
    public Variable<Ratio> fraction(int number) {
        return PortCount.get(fractions, name(), "outlet", number);
    }

    /**
     * {@return the way from the inlet to one outlet, for a line or a circuit; the other outlets are connected one by one}
     *
     * @param number which outlet, counted from 1
     * @throws IllegalArgumentException if there is no such outlet
     */
    public FlowPath path(int number) {
        return new Way(inlet, outlet(number));
    }

    @Override
    protected void describe(Equations e) {
        e.massBalance(List.of(inlet), outlets);
        for (int i = 0; i < outlets.size(); i++) {
            final Outlet outlet = outlets.get(i);
            final Variable<Ratio> fraction = fractions.get(i);
            e.sameState(inlet, outlet);
            e.define(fraction.name(), fraction, fraction.times(inlet.flow()), outlet.flow());
        }
    }
}
