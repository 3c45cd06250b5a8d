package lostwork.plant;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import lostwork.fluid.FluidState;
import lostwork.quantity.EntropyRate;
import lostwork.quantity.Pressure;
import lostwork.quantity.ScalarQuantity;
import lostwork.quantity.SpecificEnergy;
import org.jspecify.annotations.Nullable;

/**
 * The solved plant: the value of every variable, and the proof that the equations hold. Immutable and thread-safe.
 */
public final class Solution {
    private final SolvePlan plan;
    private final Specification specification;
    private final double[] values;
    private volatile Completion.@Nullable Values completed;

    Solution(SolvePlan plan, Specification specification, double[] values) {
        this.plan = plan;
        this.specification = specification;
        this.values = values;
    }

    /** {@return the solve plan} */
    public SolvePlan plan() {
        return plan;
    }

    /** {@return the plant} */
    public Plant plant() {
        return plan.plant();
    }

    /** {@return what was given} */
    public Specification specification() {
        return specification;
    }

    /**
     * {@return the largest residual of all equations, each scaled by what its terms amount to when every variable moves by
     * its natural scale}
     */
    public double largestResidual() {
        return plan.system().largestResidual(values);
    }

    /**
     * {@return the value of a variable}
     *
     * @param <Q> the quantity of the value
     * @param variable the variable
     * @throws IllegalStateException if the variable has no value in this solution, such as the temperature of a heat
     *     port that nothing settles
     */
    public <Q extends ScalarQuantity<Q, ?>> Q value(Variable<Q> variable) {
        final double si = si(plant().slotOf(variable));
        if (Double.isNaN(si)) {
            throw new IllegalStateException(variable + " has no value in this solution: "
                    + (plant().layout().slots.get(plant().slotOf(variable)).state() >= 0
                            ? "the state there has no such property"
                            : "nothing that is given settles it"));
        }
        return variable.kind().ofSi(si);
    }

    /**
     * {@return whether a variable has a value in this solution}
     *
     * @param variable the variable
     */
    public boolean hasValue(Variable<?> variable) {
        return !Double.isNaN(si(plant().slotOf(variable)));
    }

    /**
     * {@return the state of the stream at a port}
     *
     * @param port the port, of this plant or of one with the same names
     * @throws java.util.NoSuchElementException if the plant has no such port
     */
    public FluidState state(MaterialPort port) {
        final Layout layout = plant().layout();
        final Layout.StreamState state = layout.states.get(
                layout.slots.get(plant().slotOf(port.pressure())).state());
        return state.fluid()
                .state(
                        Pressure.pascal(values[state.slot(SlotRole.PRESSURE)]),
                        SpecificEnergy.joulesPerKilogram(values[state.slot(SlotRole.ENTHALPY)]));
    }

    /**
     * {@return how well the balances close, and the entropy that each component generates}
     */
    public Closure closure() {
        return Closure.of(this);
    }

    /**
     * {@return the entropy that a component generates: what leaves less what enters}
     *
     * @param component a component of the plant
     */
    public EntropyRate entropyGeneration(Component component) {
        return EntropyRate.wattsPerKelvin(Closure.entropyGeneration(this, component));
    }

    /**
     * {@return the exact derivative of one value with respect to a given one, from the equations solved}
     *
     * @param of a variable
     * @param to a variable that is given
     * @throws java.util.NoSuchElementException if {@code to} is not given
     * @throws IllegalStateException if {@code of} has no value in this solution
     */
    public Sensitivity sensitivity(Variable<?> of, Variable<?> to) {
        return Sensitivities.of(this, of).to(to);
    }

    /**
     * {@return the exact derivatives of one value with respect to everything that is given}
     *
     * @param of a variable
     * @throws IllegalStateException if it has no value in this solution
     */
    public Sensitivities sensitivities(Variable<?> of) {
        return Sensitivities.of(this, of);
    }

    /** {@return what no real machine could do in this solution, in words; empty when all is well} */
    public List<String> violations() {
        return plan.checks().findings(this);
    }

    /** {@return the value of a slot, NaN where there is none} */
    double si(int slot) {
        return plan.isActive(slot) ? values[slot] : completed().get(slot);
    }

    private Completion.Values completed() {
        Completion.Values all = completed;
        if (all == null) {
            all = plan.completion().of(values);
            completed = all;
        }
        return all;
    }

    /**
     * Computes the properties of all states.
     *
     * @throws lostwork.quantity.OutOfRangeException if a state lies outside the range of its fluid
     */
    void complete() {
        completed();
    }

    /** {@return the value of each requirement of the plant, in its order; NaN where it has none} */
    double[] requirements() {
        return completed().requirements();
    }

    /** {@return the solution as JSON: streams, values with their units, assumptions, closure and findings} */
    public String toJson() {
        return SolutionText.toJson(this);
    }

    /**
     * Writes the streams and the values as CSV, one table after the other with an empty line between.
     *
     * @param file the file to write, in UTF-8; replaced when it exists
     * @throws IOException if the file cannot be written
     */
    public void writeCsv(Path file) throws IOException {
        Files.writeString(
                file,
                SolutionText.streams(this).toCsv() + "\n"
                        + SolutionText.values(this).toCsv(),
                StandardCharsets.UTF_8);
    }

    /** {@return the solution as text: states, machines, assumptions and closure} */
    @Override
    public String toString() {
        return SolutionText.of(this);
    }
}
