package lostwork.plant;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import lostwork.fluid.Fluid;
import lostwork.quantity.Dimension;
import lostwork.quantity.ScalarQuantity;

/**
 * Takes the equations of one component while a plant is built.
 *
 * <p>What two ports have in common is said structurally, by {@link #sameFlow}, {@link #sameState} and
 * {@link #sameFluid}: their variables are then one and the same. Everything else is an equation.
 */
public final class Equations {
    private final String component;
    private final PortUnions unions;
    final List<Equation> equations = new ArrayList<>();
    final Map<Variable<?>, Equation> definitions = new LinkedHashMap<>();
    final List<MassBalance> balances = new ArrayList<>();
    final List<Requirement> requirements = new ArrayList<>();

    /** A mass balance over ports: what enters equals what leaves. */
    record MassBalance(Equation equation, List<MaterialPort> inlets, List<MaterialPort> outlets) {}

    /** A quantity that a possible machine keeps at or above zero. */
    record Requirement(String component, String words, Expression notNegative) {}

    Equations(String component, PortUnions unions) {
        this.component = component;
        this.unions = unions;
    }

    /**
     * Says that the same stream passes two ports: one mass flow and one fluid.
     *
     * @param a a port
     * @param b a port
     */
    public void sameFlow(MaterialPort a, MaterialPort b) {
        unions.sameFlow(a, b);
    }

    /**
     * Says that the streams at two ports are in the same state and of the same fluid, as where a stream is split.
     *
     * @param a a port
     * @param b a port
     */
    public void sameState(MaterialPort a, MaterialPort b) {
        unions.sameState(a, b);
    }

    /**
     * Says that the streams at two ports are of the same fluid.
     *
     * @param a a port
     * @param b a port
     */
    public void sameFluid(MaterialPort a, MaterialPort b) {
        unions.sameFluid(a, b);
    }

    /**
     * Says which fluid passes a port.
     *
     * @param port the port
     * @param fluid the fluid
     */
    public void fluid(MaterialPort port, Fluid fluid) {
        unions.fluid(port, fluid);
    }

    /**
     * States a law: a conservation law, or the definition of a quantity that is always wanted.
     *
     * @param name what it says, in words
     * @param left one side
     * @param right the other side, of the same dimension
     */
    public void law(String name, Expression left, Expression right) {
        equations.add(new Equation(component, name, EquationTag.LAW, left, right));
    }

    /**
     * States a relation that describes the machine.
     *
     * @param name what it says, in words
     * @param left one side
     * @param right the other side, of the same dimension
     */
    public void model(String name, Expression left, Expression right) {
        equations.add(new Equation(component, name, EquationTag.MODEL, left, right));
    }

    /**
     * States a simplification that gives way to a given value.
     *
     * @param name what it says, in words, such as {@code "no pressure loss"}
     * @param left one side
     * @param right the other side, of the same dimension
     */
    public void assume(String name, Expression left, Expression right) {
        equations.add(new Equation(component, name, EquationTag.ASSUMPTION, left, right));
    }

    /**
     * Assumes a value for a variable unless it is given or follows from what is given.
     *
     * @param <Q> the quantity of the value
     * @param name what it says, in words, such as {@code "no pressure loss"}
     * @param variable the variable
     * @param value the value
     */
    public <Q extends ScalarQuantity<Q, ?>> void assume(String name, Variable<Q> variable, Q value) {
        assume(name, variable, Expression.constant(value));
    }

    /**
     * Defines a variable that is only computed when it is given, used or read: a further way to describe the machine,
     * such as the effectiveness of an exchanger beside its terminal differences.
     *
     * @param name what it says, in words
     * @param variable the variable
     * @param value what it equals
     */
    public void define(String name, Variable<?> variable, Expression value) {
        define(name, variable, variable, value);
    }

    /**
     * Defines a variable by an equation that is not solved for it, so that no division is needed.
     *
     * @param name what it says, in words
     * @param variable the variable, which occurs in one of the sides
     * @param left one side
     * @param right the other side, of the same dimension
     */
    public void define(String name, Variable<?> variable, Expression left, Expression right) {
        final Equation equation = new Equation(component, name, EquationTag.LAW, left, right);
        if (!equation.variables().contains(variable)) {
            throw new IllegalArgumentException(equation + " does not contain " + variable + ", which it defines");
        }
        if (definitions.putIfAbsent(variable, equation) != null) {
            throw new IllegalArgumentException(variable + " is defined twice by " + component);
        }
    }

    /**
     * States a mass balance. In a closed network one balance follows from the others; the plant finds it by itself.
     *
     * @param inlets where mass enters
     * @param outlets where mass leaves
     */
    public void massBalance(List<? extends MaterialPort> inlets, List<? extends MaterialPort> outlets) {
        final Equation equation = new Equation(component, "mass balance", EquationTag.LAW, sum(inlets), sum(outlets));
        equations.add(equation);
        balances.add(new MassBalance(equation, List.copyOf(inlets), List.copyOf(outlets)));
    }

    private static Expression sum(List<? extends MaterialPort> ports) {
        Expression sum = ports.get(0).flow();
        for (MaterialPort port : ports.subList(1, ports.size())) {
            sum = sum.plus(port.flow());
        }
        return sum;
    }

    /**
     * Says what a possible machine never falls below: checked after solving, and an error that names the component when
     * it does.
     *
     * @param words what is required, such as {@code "hot side warmer than cold side at the warm end"}
     * @param notNegative the term that must not be negative
     */
    public void require(String words, Expression notNegative) {
        requirements.add(new Requirement(component, words, notNegative));
    }

    /**
     * {@return a term that is a function of other terms and of the fluids at some ports}
     *
     * @param words what it is, for printing
     * @param dimension the dimension of its value
     * @param ports the ports whose fluids it needs
     * @param factory makes the function
     * @param arguments its arguments
     */
    public Expression function(
            String words,
            Dimension dimension,
            List<? extends MaterialPort> ports,
            FluidFunctionFactory factory,
            List<Expression> arguments) {
        return new Expression.Function(words, dimension, factory, List.copyOf(ports), List.copyOf(arguments));
    }
}
