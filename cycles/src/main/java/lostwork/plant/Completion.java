package lostwork.plant;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import lostwork.fluid.Phase;
import lostwork.fluid.SaturationModel;
import lostwork.fluid.StatePoint;
import lostwork.plant.kernel.CallSites;
import lostwork.plant.kernel.Tape;
import lostwork.plant.kernel.Workspace;

/**
 * Computes what a solve did not need from what it found: the other properties of the states, the defined variables that
 * nothing asked for, and the requirements of the components. Compiled once for a plan; immutable and thread-safe.
 */
final class Completion {
    /** A defined variable and its equation, which is affine in it. */
    private record Definition(int slot, Tape tape) {}

    private final SolvePlan plan;
    private final Layout layout;
    private final CallSites sites = new CallSites();
    private final List<Definition> definitions = new ArrayList<>();
    private final List<Tape> requirements = new ArrayList<>();
    private final List<Tape> tapes = new ArrayList<>();

    Completion(SolvePlan plan) {
        this.plan = plan;
        layout = plan.plant().layout();
        orderDefinitions();
        for (Equations.Requirement requirement : plan.plant().requirements()) {
            requirements.add(compile(requirement.notNegative(), requirement.notNegative()));
        }
    }

    /** Each definition after those that it uses. */
    private void orderDefinitions() {
        final Plant plant = plan.plant();
        final List<Variable<?>> open = new ArrayList<>();
        final boolean[] pending = new boolean[layout.slots.size()];
        plant.definitions().keySet().forEach(variable -> {
            if (!plan.isActive(plant.slotOf(variable))) {
                open.add(variable);
                pending[plant.slotOf(variable)] = true;
            }
        });
        boolean found = true;
        while (found) {
            found = false;
            for (Variable<?> variable : List.copyOf(open)) {
                final Equation definition = plant.definitions().get(variable);
                if (definition.variables().stream().allMatch(v -> v.equals(variable) || !pending[plant.slotOf(v)])) {
                    definitions.add(
                            new Definition(plant.slotOf(variable), compile(definition.left(), definition.right())));
                    pending[plant.slotOf(variable)] = false;
                    open.remove(variable);
                    found = true;
                }
            }
        }
    }

    private Tape compile(Expression left, Expression right) {
        final Tape.Builder b = new Tape.Builder(sites);
        final int l = left.emit(b, plan.plant().resolution());
        final int r = right.emit(b, plan.plant().resolution());
        final Tape tape = b.build(l, r);
        tapes.add(tape);
        return tape;
    }

    /** {@return the values of all slots; NaN where there is none} */
    double[] complete(double[] values) {
        final double[] all = new double[layout.slots.size()];
        for (int slot = 0; slot < all.length; slot++) {
            all[slot] = plan.isActive(slot) ? values[slot] : Double.NaN;
        }
        final StatePoint point = new StatePoint();
        for (Layout.StreamState state : layout.states) {
            completeState(state, all, point);
        }
        if (!definitions.isEmpty()) {
            final Workspace w = workspace(all);
            for (Definition definition : definitions) {
                if (isReady(definition.tape(), definition.slot(), all)) {
                    w.set(definition.slot(), 0);
                    all[definition.slot()] = w.solveAffine(definition.tape(), definition.slot());
                    w.set(definition.slot(), all[definition.slot()]);
                }
            }
        }
        return all;
    }

    /** {@return the value of each requirement, in the order of the plant; NaN where it has none} */
    double[] requirements(double[] all) {
        final double[] result = new double[requirements.size()];
        Arrays.fill(result, Double.NaN);
        if (result.length > 0) {
            final Workspace w = workspace(all);
            for (int i = 0; i < result.length; i++) {
                if (isReady(requirements.get(i), -1, all)) {
                    result[i] = w.leftSide(requirements.get(i));
                }
            }
        }
        return result;
    }

    private Workspace workspace(double[] all) {
        final Workspace w = new Workspace(all.length, tapes, sites);
        for (int slot = 0; slot < all.length; slot++) {
            w.set(slot, all[slot]);
        }
        return w;
    }

    private static boolean isReady(Tape tape, int except, double[] all) {
        for (int k = 0; k < tape.size(); k++) {
            if (tape.slot(k) != except && Double.isNaN(all[tape.slot(k)])) {
                return false;
            }
        }
        return true;
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
