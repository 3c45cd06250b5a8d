package lostwork.plant;

import java.util.ArrayList;
import java.util.List;
import java.util.NoSuchElementException;
import lostwork.plant.kernel.Adjoint;

/** The exact derivatives of one value of a solution with respect to everything that is given. Immutable. */
public final class Sensitivities {
    private final Variable<?> of;
    private final List<Sensitivity> all;

    private Sensitivities(Variable<?> of, List<Sensitivity> all) {
        this.of = of;
        this.all = List.copyOf(all);
    }

    static Sensitivities of(Solution solution, Variable<?> of) {
        final Plant plant = solution.plant();
        final int slot = plant.slotOf(of);
        if (!solution.hasValue(of)) {
            throw new IllegalStateException(of + " has no value in this solution, so nothing to differentiate");
        }
        final List<Variable<?>> given = solution.specification().givenVariables();
        // A variable that the solve did not need takes part in a plan of its own.
        final SolvePlan plan =
                solution.plan().isActive(slot) ? solution.plan() : new Planner(plant, given, List.of(of)).plan();
        final double[] values = new double[plant.layout().slots.size()];
        for (int k = 0; k < values.length; k++) {
            values[k] = plan.isActive(k) ? solution.si(k) : 0;
        }
        final double[] gradient = Adjoint.gradient(plan.system(), values, slot);
        final List<Sensitivity> all = new ArrayList<>();
        for (Variable<?> to : given) {
            all.add(new Sensitivity(of, to, gradient[plant.slotOf(to)]));
        }
        return new Sensitivities(of, all);
    }

    /** {@return the value that changes} */
    public Variable<?> of() {
        return of;
    }

    /** {@return the derivatives, in the order in which the values were given} */
    public List<Sensitivity> all() {
        return all;
    }

    /**
     * {@return the derivative with respect to one given value}
     *
     * @param to a variable that is given
     * @throws NoSuchElementException if it is not given
     */
    public Sensitivity to(Variable<?> to) {
        return all.stream()
                .filter(s -> s.to().equals(to))
                .findFirst()
                .orElseThrow(() -> new NoSuchElementException(to + " is not given; given are "
                        + all.stream().map(Sensitivity::to).toList()));
    }

    /** {@return the derivatives, one a line} */
    @Override
    public String toString() {
        final StringBuilder text = new StringBuilder();
        all.forEach(s -> text.append(s).append('\n'));
        return text.toString();
    }
}
