package lostwork.plant;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import lostwork.quantity.LinearQuantity;
import lostwork.quantity.QuantityKind;
import lostwork.quantity.ScalarQuantity;

/**
 * A machine, apparatus or junction of a plant: a name, ports, variables, and one method that states its equations.
 *
 * <p>A component of one's own is a class that creates its ports and variables as fields and writes
 * {@link #describe}; it gets diagnosis, solving, ledger and printing like every other one:
 *
 * <pre>{@code
 * final class Nozzle extends Component {
 *     final Inlet inlet = inlet("inlet");
 *     final Outlet outlet = outlet("outlet");
 *     final Variable<Ratio> efficiency = variable("efficiency", Ratio.KIND);
 *
 *     Nozzle(String name) {
 *         super(name);
 *     }
 *
 *     @Override
 *     protected void describe(Equations e) {
 *         e.sameFlow(inlet, outlet);
 *         ...
 *     }
 * }
 * }</pre>
 *
 * <p>A component holds no values: they live in specifications and solutions. Immutable once constructed.
 */
public abstract class Component {
    private final String name;
    private final List<Port> ports = new ArrayList<>();
    private final List<Variable<?>> variables = new ArrayList<>();

    /**
     * Creates a component.
     *
     * @param name its name, unique within a plant
     * @throws IllegalArgumentException if the name is blank
     */
    protected Component(String name) {
        if (name.isBlank()) {
            throw new IllegalArgumentException("a component needs a name that is not blank");
        }
        this.name = name;
    }

    /** {@return the name} */
    public final String name() {
        return name;
    }

    /** {@return the ports} */
    public final List<Port> ports() {
        return Collections.unmodifiableList(ports);
    }

    /** {@return the variables of the component itself, those of its ports left out} */
    public final List<Variable<?>> variables() {
        return Collections.unmodifiableList(variables);
    }

    /** {@return whether the component stands for the surroundings, such as a supply, and keeps no balance of its own} */
    public boolean isBoundary() {
        return false;
    }

    /**
     * {@return what the component is for in terms of exergy; without a statement of its own everything that enters is fuel
     * and everything that leaves is product}
     */
    public ExergyPurpose purpose() {
        ExergyPurpose purpose = ExergyPurpose.dissipative();
        for (Port port : ports) {
            purpose = port.isInlet() ? purpose.withFuel(port) : purpose.withProduct(port);
        }
        return purpose;
    }

    /**
     * States the equations of the component. Called once for each plant that the component is built into.
     *
     * @param e takes the equations
     */
    protected abstract void describe(Equations e);

    /**
     * {@return a new variable of this component}
     *
     * @param <Q> the quantity of its values
     * @param variableName its name, unique within the component
     * @param kind the kind of its values
     */
    protected final <Q extends ScalarQuantity<Q, ?>> Variable<Q> variable(
            String variableName, QuantityKind<Q, ?> kind) {
        return add(new Variable<>(name, variableName, kind));
    }

    /**
     * {@return a new variable of this component whose values lie between two limits}
     *
     * <p>A given value outside the limits is refused at once; a computed one is an error of the design that names the
     * variable.
     *
     * @param <Q> the quantity of its values
     * @param <D> the quantity of a difference of two values
     * @param variableName its name, unique within the component
     * @param lowest the lowest value that a possible machine has
     * @param highest the highest value that a possible machine has
     */
    protected final <Q extends ScalarQuantity<Q, D>, D extends LinearQuantity<D>> Variable<Q> variable(
            String variableName, Q lowest, Q highest) {
        return add(new Variable<>(name, variableName, lowest.kind(), lowest.si(), highest.si()));
    }

    /**
     * {@return a new port where a stream enters}
     *
     * @param portName its name, unique within the component
     */
    protected final Inlet inlet(String portName) {
        return add(new Inlet(name, portName));
    }

    /**
     * {@return a new port where a stream leaves}
     *
     * @param portName its name, unique within the component
     */
    protected final Outlet outlet(String portName) {
        return add(new Outlet(name, portName));
    }

    /**
     * {@return a new port where mechanical power enters}
     *
     * @param portName its name, unique within the component
     */
    protected final ShaftInlet shaftInlet(String portName) {
        return add(new ShaftInlet(name, portName));
    }

    /**
     * {@return a new port where mechanical power leaves}
     *
     * @param portName its name, unique within the component
     */
    protected final ShaftOutlet shaftOutlet(String portName) {
        return add(new ShaftOutlet(name, portName));
    }

    /**
     * {@return a new port where electric power enters}
     *
     * @param portName its name, unique within the component
     */
    protected final WireInlet wireInlet(String portName) {
        return add(new WireInlet(name, portName));
    }

    /**
     * {@return a new port where electric power leaves}
     *
     * @param portName its name, unique within the component
     */
    protected final WireOutlet wireOutlet(String portName) {
        return add(new WireOutlet(name, portName));
    }

    /**
     * {@return a new port where heat enters}
     *
     * @param portName its name, unique within the component
     */
    protected final HeatInlet heatInlet(String portName) {
        return add(new HeatInlet(name, portName));
    }

    /**
     * {@return a new port where heat leaves}
     *
     * @param portName its name, unique within the component
     */
    protected final HeatOutlet heatOutlet(String portName) {
        return add(new HeatOutlet(name, portName));
    }

    private <Q extends ScalarQuantity<Q, ?>> Variable<Q> add(Variable<Q> variable) {
        if (variables.contains(variable)) {
            throw new IllegalArgumentException(name + " already has a variable named \"" + variable.name() + "\"");
        }
        variables.add(variable);
        return variable;
    }

    private <P extends Port> P add(P port) {
        if (ports.stream().anyMatch(other -> other.name().equals(port.name()))) {
            throw new IllegalArgumentException(name + " already has a port named \"" + port.name() + "\"");
        }
        ports.add(port);
        return port;
    }

    /** {@return the name} */
    @Override
    public final String toString() {
        return name;
    }
}
