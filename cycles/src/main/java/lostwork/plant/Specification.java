package lostwork.plant;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.NoSuchElementException;
import java.util.Objects;
import java.util.Optional;
import lostwork.quantity.OutOfRangeException;
import lostwork.quantity.ScalarQuantity;
import lostwork.quantity.Unit;
import org.jspecify.annotations.Nullable;

/**
 * What is said of a plant: which variables are given, with which values. The others come out of a solve.
 *
 * <p>The same plant serves design (efficiencies given), test (temperatures given, the efficiency comes out) and target
 * (the power given, the flow comes out). Immutable and thread-safe; each change makes a new specification.
 */
public final class Specification {
    private final Plant plant;
    private final Map<Variable<?>, ScalarQuantity<?, ?>> given;
    private volatile @Nullable SolvePlan plan;

    Specification(Plant plant, Map<Variable<?>, ScalarQuantity<?, ?>> given, @Nullable SolvePlan plan) {
        this.plant = plant;
        this.given = given;
        this.plan = plan;
    }

    /** {@return the plant} */
    public Plant plant() {
        return plant;
    }

    /**
     * {@return this specification with one more variable given}
     *
     * @param <Q> the quantity of the value
     * @param variable the variable
     * @param value its value
     * @throws IllegalArgumentException if the variable is given already; {@link #with} changes a value
     * @throws NoSuchElementException if the plant has no such variable
     */
    public <Q extends ScalarQuantity<Q, ?>> Specification given(Variable<Q> variable, Q value) {
        final Variable<Q> own = plant.own(variable);
        requirePossible(own, value);
        if (given.containsKey(variable)) {
            throw new IllegalArgumentException(
                    variable + " is given already, as " + given.get(variable) + "; use with(...) to change its value");
        }
        final Map<Variable<?>, ScalarQuantity<?, ?>> more = new LinkedHashMap<>(given);
        more.put(own, value);
        return new Specification(plant, more, null);
    }

    /**
     * {@return this specification with another value of a given variable}
     *
     * @param <Q> the quantity of the value
     * @param variable a variable that is given
     * @param value its new value
     * @throws NoSuchElementException if the variable is not given
     */
    public <Q extends ScalarQuantity<Q, ?>> Specification with(Variable<Q> variable, Q value) {
        requireGiven(variable);
        requirePossible(plant.own(variable), value);
        final Map<Variable<?>, ScalarQuantity<?, ?>> changed = new LinkedHashMap<>(given);
        changed.put(variable, value);
        return new Specification(plant, changed, plan);
    }

    /**
     * {@return this specification with a variable left free}
     *
     * @param variable a variable that is given
     * @throws NoSuchElementException if the variable is not given
     */
    public Specification release(Variable<?> variable) {
        requireGiven(variable);
        final Map<Variable<?>, ScalarQuantity<?, ?>> fewer = new LinkedHashMap<>(given);
        fewer.remove(variable);
        return new Specification(plant, fewer, null);
    }

    /**
     * {@return the same given values for another plant that has variables of these names: one that was built anew, read
     * from a file, or changed elsewhere}
     *
     * @param other the other plant
     * @throws NoSuchElementException if the other plant lacks a variable that is given
     * @throws OutOfRangeException if a value lies outside what the other plant allows
     */
    public Specification on(Plant other) {
        final Map<Variable<?>, ScalarQuantity<?, ?>> moved = new LinkedHashMap<>();
        given.forEach((variable, value) -> {
            final Variable<?> own = other.own(variable);
            requirePossible(own, value);
            moved.put(own, value);
        });
        return new Specification(other, moved, null);
    }

    private static void requirePossible(Variable<?> variable, ScalarQuantity<?, ?> value) {
        Objects.requireNonNull(value, () -> "value of " + variable);
        if (!(value.si() >= variable.lowest() && value.si() <= variable.highest())) {
            throw new OutOfRangeException(
                    variable.toString(),
                    value.si(),
                    variable.lowest(),
                    variable.highest(),
                    variable.kind().units().stream()
                            .filter(unit -> unit.factor() == 1 && unit.offset() == 0)
                            .map(Unit::symbol)
                            .findFirst()
                            .orElse(""),
                    "what a possible machine can have",
                    "");
        }
    }

    private void requireGiven(Variable<?> variable) {
        plant.slotOf(variable);
        if (!given.containsKey(variable)) {
            throw new NoSuchElementException(variable + " is not given; given are " + given.keySet());
        }
    }

    /** {@return the variables that are given, in the order in which they were} */
    public List<Variable<?>> givenVariables() {
        return List.copyOf(given.keySet());
    }

    /**
     * {@return the value of a given variable; empty when it is free}
     *
     * @param <Q> the quantity of the value
     * @param variable the variable
     */
    public <Q extends ScalarQuantity<Q, ?>> Optional<Q> valueOf(Variable<Q> variable) {
        return Optional.ofNullable(given.get(variable))
                .map(value -> variable.kind().type().cast(value));
    }

    /**
     * {@return the solve plan: which equations are solved in which order for which unknowns; the same for all values}
     *
     * @throws SpecificationException if values are missing or contradict each other
     */
    public SolvePlan plan() {
        SolvePlan made = plan;
        if (made == null) {
            made = new Planner(plant, givenVariables(), List.of()).plan();
            plan = made;
        }
        return made;
    }

    /**
     * {@return the solution}
     *
     * @throws SpecificationException if values are missing or contradict each other
     * @throws PlantSolveException if the values cannot be met
     */
    public Solution solve() {
        return solve(SolveOptions.defaults());
    }

    /**
     * {@return the solution}
     *
     * @param options limits, warm start and treatment of the second law
     * @throws SpecificationException if values are missing or contradict each other
     * @throws PlantSolveException if the values cannot be met
     */
    public Solution solve(SolveOptions options) {
        return plan().solve(this, options);
    }

    double si(Variable<?> variable) {
        return given.get(variable).si();
    }

    /** {@return the given values, one a line} */
    @Override
    public String toString() {
        final StringBuilder text = new StringBuilder("Given in plant \"" + plant.name() + "\"\n");
        given.forEach((variable, value) ->
                text.append("  ").append(variable).append(" = ").append(value).append('\n'));
        return text.toString();
    }
}
