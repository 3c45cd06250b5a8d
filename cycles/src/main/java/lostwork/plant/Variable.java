package lostwork.plant;

import java.util.function.Consumer;
import lostwork.plant.kernel.Tape;
import lostwork.quantity.QuantityKind;
import lostwork.quantity.ScalarQuantity;

/**
 * A named physical value of a plant: the temperature at a port, the efficiency of a turbine, the power of a shaft.
 *
 * <p>A variable is an identity, the name of its component and a name of its own; its values live in specifications and
 * solutions. So a specification survives a copy of its plant. A variable is also a term of equations. Immutable and
 * thread-safe.
 *
 * @param <Q> the quantity of its values
 */
public final class Variable<Q extends ScalarQuantity<Q, ?>> extends Expression {
    private final String component;
    private final String name;
    private final QuantityKind<Q, ?> kind;
    private final double lowest;
    private final double highest;

    /** Creates a variable whose values are bounded by their kind alone. */
    Variable(String component, String name, QuantityKind<Q, ?> kind) {
        this(component, name, kind, kind.lowest(), Double.MAX_VALUE);
    }

    /** Creates a variable with the values, in coherent SI units, that a possible machine keeps between. */
    Variable(String component, String name, QuantityKind<Q, ?> kind, double lowest, double highest) {
        super(kind.dimension());
        this.component = component;
        this.name = name;
        this.kind = kind;
        this.lowest = lowest;
        this.highest = highest;
    }

    /** {@return the name of its component} */
    public String component() {
        return component;
    }

    /** {@return its own name within the component} */
    public String name() {
        return name;
    }

    /** {@return the kind of its values} */
    public QuantityKind<Q, ?> kind() {
        return kind;
    }

    /** {@return the lowest value that a possible machine has, in the coherent SI unit} */
    public double lowest() {
        return lowest;
    }

    /** {@return the highest value that a possible machine has, in the coherent SI unit} */
    public double highest() {
        return highest;
    }

    @Override
    void forEachVariable(Consumer<Variable<?>> consumer) {
        consumer.accept(this);
    }

    @Override
    int emit(Tape.Builder tape, Resolution resolution) {
        return resolution.emit(this, tape);
    }

    @Override
    public boolean equals(Object other) {
        return other instanceof Variable<?> that && component.equals(that.component) && name.equals(that.name);
    }

    @Override
    public int hashCode() {
        return 31 * component.hashCode() + name.hashCode();
    }

    /** {@return component and name, such as {@code turbine isentropic efficiency}} */
    @Override
    public String toString() {
        return component + " " + name;
    }
}
