package lostwork.plant;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import lostwork.fluid.Phase;
import lostwork.fluid.SaturationModel;
import lostwork.fluid.StatePoint;
import lostwork.plant.kernel.CallSites;
import lostwork.plant.kernel.Tape;
import lostwork.plant.kernel.Workspace;
import org.jspecify.annotations.Nullable;

/**
 * Computes what a solve did not need from what it found: the other properties of the states, defined variables that
 * somebody reads, and the requirements of the components. Compiled once for a plan; immutable and thread-safe.
 */
final class Completion {
    /** The share of the size of its terms below which a difference is rounding. */
    private static final double ROUNDING = 1e-9;

    private final SolvePlan plan;
    private final Layout layout;
    private final Map<Integer, Tape> definitions = new HashMap<>();
    private final List<Tape> requirements = new ArrayList<>();
    // Definitions hold path integrals and other functions with much scratch; requirements, read in every solve, few.
    private final CallSites definitionSites = new CallSites();
    private final CallSites requirementSites = new CallSites();

    Completion(SolvePlan plan) {
        this.plan = plan;
        layout = plan.plant().layout();
        final Plant plant = plan.plant();
        plant.definitions().forEach((variable, definition) -> {
            if (!plan.isActive(plant.slotOf(variable))) {
                definitions.put(
                        plant.slotOf(variable), compile(definition.left(), definition.right(), definitionSites));
            }
        });
        for (Equations.Requirement requirement : plant.requirements()) {
            requirements.add(compileTerm(requirement.notNegative(), requirementSites));
        }
    }

    private Tape compile(Expression left, Expression right, CallSites sites) {
        final Tape.Builder b = new Tape.Builder(sites);
        final int l = left.emit(b, plan.plant().resolution());
        final int r = right.emit(b, plan.plant().resolution());
        return b.build(l, r);
    }

    /** The equation "term = 0", whose residual is the value of the term. */
    private Tape compileTerm(Expression term, CallSites sites) {
        final Tape.Builder b = new Tape.Builder(sites);
        return b.build(term.emit(b, plan.plant().resolution()), b.constant(0));
    }

    /**
     * {@return the values of one solution, completed as they are read}
     *
     * @param values the value of each slot that took part in the solve
     * @throws lostwork.quantity.OutOfRangeException if a state lies outside the range of its fluid
     */
    Values of(double[] values) {
        return new Values(values);
    }

    /** The values of one solution. Thread-safe. */
    final class Values {
        private final double[] all;
        private final boolean[] tried;
        private @Nullable Workspace forDefinitions;
        private @Nullable Workspace forRequirements;

        private Values(double[] values) {
            all = new double[layout.slots.size()];
            tried = new boolean[all.length];
            for (int slot = 0; slot < all.length; slot++) {
                all[slot] = plan.isActive(slot) ? values[slot] : Double.NaN;
            }
            final StatePoint point = new StatePoint();
            for (Layout.StreamState state : layout.states) {
                completeState(state, all, point);
            }
        }

        /** {@return the value of a slot; NaN where it has none} */
        synchronized double get(int slot) {
            if (Double.isNaN(all[slot]) && !tried[slot]) {
                tried[slot] = true; // also ends a circle of definitions
                final Tape definition = definitions.get(slot);
                if (definition != null && isReady(definition, slot)) {
                    final Workspace w = forDefinitions();
                    prepare(definition, slot, w);
                    w.set(slot, 0);
                    final double value = w.solveAffine(definition, slot);
                    all[slot] = definition.isOutside(w) ? Double.NaN : value;
                }
            }
            return all[slot];
        }

        /** {@return the value of each requirement, in the order of the plant; 0 within rounding, NaN where it has none} */
        synchronized double[] requirements() {
            final double[] result = new double[requirements.size()];
            Arrays.fill(result, Double.NaN);
            for (int i = 0; i < result.length; i++) {
                if (isReady(requirements.get(i), -1)) {
                    final Workspace w = forRequirements();
                    prepare(requirements.get(i), -1, w);
                    result[i] = withoutRounding(requirements.get(i), w);
                }
            }
            return result;
        }

        /** The value of a term, 0 where it is no more than the rounding of what it is made of. */
        private double withoutRounding(Tape term, Workspace w) {
            final double[] derivatives = new double[term.size()];
            final double value = w.evaluate(term, derivatives);
            double size = 0;
            for (int k = 0; k < derivatives.length; k++) {
                size += Math.abs(derivatives[k] * w.get(term.slot(k)));
            }
            return Math.abs(value) <= ROUNDING * size ? 0 : value;
        }

        private Workspace forDefinitions() {
            Workspace w = forDefinitions;
            if (w == null) {
                w = new Workspace(all.length, definitions.values(), definitionSites);
                forDefinitions = w;
            }
            return w;
        }

        private Workspace forRequirements() {
            Workspace w = forRequirements;
            if (w == null) {
                w = new Workspace(all.length, requirements, requirementSites);
                forRequirements = w;
            }
            return w;
        }

        /** {@return whether all slots that an equation uses, one excepted, have a value} */
        private boolean isReady(Tape tape, int except) {
            for (int k = 0; k < tape.size(); k++) {
                if (tape.slot(k) != except && Double.isNaN(get(tape.slot(k)))) {
                    return false;
                }
            }
            return true;
        }

        /** Sets the slots that an equation uses, one excepted. */
        private void prepare(Tape tape, int except, Workspace w) {
            for (int k = 0; k < tape.size(); k++) {
                if (tape.slot(k) != except) {
                    w.set(tape.slot(k), get(tape.slot(k)));
                }
            }
        }
    }

    private static void completeState(Layout.StreamState state, double[] all, StatePoint point) {
        final double p = all[state.slot(SlotRole.PRESSURE)];
        state.model().atPressureEnthalpy(p, all[state.slot(SlotRole.ENTHALPY)], point);
        fill(all, state.slot(SlotRole.TEMPERATURE), point.temperature);
        fill(all, state.slot(SlotRole.ENTROPY), point.entropy);
        fill(all, state.slot(SlotRole.VOLUME), point.volume);
        fill(all, state.slot(SlotRole.VAPOUR_FRACTION), point.vapourFraction);
        final SaturationModel saturation = state.model().saturation();
        if (saturation == null
                || point.phase == Phase.TWO_PHASE
                || p >= saturation.criticalPressure()
                || p < saturation.pressure(saturation.lowestTemperature())) {
            return;
        }
        final double span = point.temperature - saturation.temperature(p);
        if (span >= 0) {
            fill(all, state.slot(SlotRole.SUPERHEAT), span);
        } else {
            fill(all, state.slot(SlotRole.SUBCOOLING), -span);
        }
    }

    private static void fill(double[] all, int slot, double value) {
        if (Double.isNaN(all[slot])) {
            all[slot] = value;
        }
    }
}
