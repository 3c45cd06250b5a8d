package lostwork.plant;

import java.util.ArrayList;
import java.util.List;
import lostwork.fluid.FluidState;
import lostwork.fluid.Phase;
import lostwork.fluid.SaturationModel;
import lostwork.fluid.StatePoint;
import lostwork.plant.kernel.Tape;
import lostwork.plant.kernel.Workspace;
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
    private final double largestResidual;
    private volatile @Nullable double[] completed;

    Solution(SolvePlan plan, Specification specification, double[] values, double largestResidual) {
        this.plan = plan;
        this.specification = specification;
        this.values = values;
        this.largestResidual = largestResidual;
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
        return largestResidual;
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
     * @param port the port
     */
    public FluidState state(MaterialPort port) {
        final Layout.StreamState state =
                plant().layout().states.get(plant().layout().stateOf.get(port));
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
        return EntropyRate.wattsPerKelvin(
                Closure.entropyGeneration(this, component).generation());
    }

    /**
     * {@return the exact derivative of one value with respect to a given one, from the equations solved}
     *
     * @param of a variable
     * @param to a variable that is given
     * @throws java.util.NoSuchElementException if {@code to} is not given
     */
    public Sensitivity sensitivity(Variable<?> of, Variable<?> to) {
        return Sensitivities.of(this, of).to(to);
    }

    /**
     * {@return the exact derivatives of one value with respect to everything that is given}
     *
     * @param of a variable
     */
    public Sensitivities sensitivities(Variable<?> of) {
        return Sensitivities.of(this, of);
    }

    /** {@return what no real machine could do in this solution, in words; empty when all is well} */
    public List<String> violations() {
        return Closure.violations(this);
    }

    /** {@return the value of a slot, NaN where there is none} */
    double si(int slot) {
        return plan.isActive(slot) ? values[slot] : completed()[slot];
    }

    /** All slots, with the properties of states and the defined variables that the solve itself did not need. */
    private double[] completed() {
        double[] all = completed;
        if (all == null) {
            all = complete();
            completed = all;
        }
        return all;
    }

    private double[] complete() {
        final Layout layout = plant().layout();
        final double[] all = new double[layout.slots.size()];
        for (int slot = 0; slot < all.length; slot++) {
            all[slot] = plan.isActive(slot) ? values[slot] : Double.NaN;
        }
        for (Layout.StreamState state : layout.states) {
            completeState(state, all);
        }
        completeDefinitions(all);
        return all;
    }

    private void completeState(Layout.StreamState state, double[] all) {
        final StatePoint point = new StatePoint();
        final double p = all[state.slot(SlotRole.PRESSURE)];
        state.model().atPressureEnthalpy(p, all[state.slot(SlotRole.ENTHALPY)], point);
        fill(all, state.slot(SlotRole.TEMPERATURE), point.temperature);
        fill(all, state.slot(SlotRole.ENTROPY), point.entropy);
        fill(all, state.slot(SlotRole.VOLUME), point.volume);
        fill(all, state.slot(SlotRole.VAPOUR_FRACTION), point.vapourFraction);
        final SaturationModel saturation = state.model().saturation();
        if (saturation != null
                && p < saturation.criticalPressure()
                && p >= saturation.pressure(saturation.lowestTemperature())) {
            final double boiling = saturation.temperature(p);
            final boolean wet = point.phase == Phase.TWO_PHASE;
            if (!wet && point.temperature >= boiling) {
                fill(all, state.slot(SlotRole.SUPERHEAT), point.temperature - boiling);
            } else if (!wet) {
                fill(all, state.slot(SlotRole.SUBCOOLING), boiling - point.temperature);
            }
        }
    }

    private static void fill(double[] all, int slot, double value) {
        if (Double.isNaN(all[slot])) {
            all[slot] = value;
        }
    }

    /** Evaluates the definitions whose variables are all known, until no more are found. */
    private void completeDefinitions(double[] all) {
        final List<Variable<?>> open = new ArrayList<>();
        plant().definitions().forEach((variable, equation) -> {
            if (Double.isNaN(all[plant().slotOf(variable)])) {
                open.add(variable);
            }
        });
        boolean found = true;
        while (found) {
            found = false;
            for (Variable<?> variable : List.copyOf(open)) {
                final Equation definition = plant().definitions().get(variable);
                final boolean ready = definition.variables().stream()
                        .allMatch(v -> v.equals(variable) || !Double.isNaN(all[plant().slotOf(v)]));
                if (ready) {
                    all[plant().slotOf(variable)] = evaluate(definition, variable, all);
                    open.remove(variable);
                    found = true;
                }
            }
        }
    }

    /** The value of a defined variable: definitions are affine in it. */
    private double evaluate(Equation definition, Variable<?> variable, double[] all) {
        final int slot = plant().slotOf(variable);
        return evaluate(definition.left(), definition.right(), slot, all);
    }

    private double evaluate(Expression left, Expression right, int slot, double[] all) {
        final var sites = new lostwork.plant.kernel.CallSites();
        final Tape.Builder b = new Tape.Builder(sites);
        final int l = left.emit(b, plant().resolution());
        final int r = right.emit(b, plant().resolution());
        final Tape tape = b.build(l, r);
        final Workspace w = new Workspace(all.length, List.of(tape), sites);
        for (int k = 0; k < all.length; k++) {
            w.set(k, Double.isNaN(all[k]) ? 0 : all[k]);
        }
        return slot < 0 ? w.leftSide(tape) : w.solveAffine(tape, slot);
    }

    /** {@return the value of a term in this solution, in coherent SI units} */
    double evaluate(Expression term) {
        final double[] all = completed();
        return evaluate(term, term, -1, all);
    }

    /** {@return the solution as text: states, machines, assumptions and closure} */
    @Override
    public String toString() {
        return SolutionText.of(this);
    }
}
