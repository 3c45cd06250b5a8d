package lostwork.plant;

import java.util.LinkedHashSet;
import java.util.Set;

/**
 * One equation of a plant: who states it, what it says, and which kind of statement it is. Prints as the formula with
 * the names of its variables. Immutable and thread-safe.
 */
public final class Equation {
    private final String component;
    private final String name;
    private final EquationTag tag;
    private final Expression left;
    private final Expression right;

    Equation(String component, String name, EquationTag tag, Expression left, Expression right) {
        if (!left.dimension().equals(right.dimension())) {
            throw new IllegalArgumentException(component + " " + name + ": " + left + " = " + right + " compares "
                    + left.dimension() + " with " + right.dimension());
        }
        this.component = component;
        this.name = name;
        this.tag = tag;
        this.left = left;
        this.right = right;
    }

    /** {@return the name of the component that states it} */
    public String component() {
        return component;
    }

    /** {@return what it says, in words} */
    public String name() {
        return name;
    }

    /** {@return which kind of statement it is} */
    public EquationTag tag() {
        return tag;
    }

    /** {@return the left side} */
    public Expression left() {
        return left;
    }

    /** {@return the right side} */
    public Expression right() {
        return right;
    }

    Set<Variable<?>> variables() {
        final Set<Variable<?>> found = new LinkedHashSet<>();
        left.forEachVariable(found::add);
        right.forEachVariable(found::add);
        return found;
    }

    /** {@return the words without the formula, such as {@code turbine: efficiency}} */
    String words() {
        return component + ": " + name;
    }

    /** {@return component, name and formula} */
    @Override
    public String toString() {
        return words() + ": " + left + " = " + right;
    }
}
