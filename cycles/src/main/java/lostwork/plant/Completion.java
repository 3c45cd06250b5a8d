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
 *
 * <p>It goes in two steps, since some definitions cost more than the solve, such as a path integral. The first one makes
 * what the checks of a solution use; the rest waits until somebody reads it.
 */
final class Completion {
    /** A defined variable and its equation, which is affine in it. */
    private record Definition(int slot, Tape tape) {}

    private final SolvePlan plan;
    private final Layout layout;
    private final CallSites sites = new CallSites();
    private final List<Definition> checked = new ArrayList<>();
    private final List<Definition> later = new ArrayList<>();
    private final boolean[] isLater;
    private final List<Tape> requirements = new ArrayList<>();
    private final List<Tape> tapes = new ArrayList<>();

    Completion(SolvePlan plan) {
        this.plan = plan;
        layout = plan.plant().layout();
        for (Equations.Requirement requirement : plan.plant().requirements()) {
            requirements.add(compile(requirement.notNegative(), requirement.notNegative()));
        }
        final List<Definition> definitions = orderedDefinitions();
        final boolean[] used = usedByChecks();
        // Backwards, so that what a used definition uses is marked before its turn.
        for (int i = definitions.size() - 1; i >= 0; i--) {
            if (used[definitions.get(i).slot()]) {
                markSlots(definitions.get(i).tape(), used);
            }
        }
        isLater = new boolean[layout.slots.size()];
        for (Definition definition : definitions) {
            (used[definition.slot()] ? checked : later).add(definition);
            isLater[definition.slot()] = !used[definition.slot()];
        }
    }

    /** The slots in requirements and at ports, which {@link Closure} reads. */
    private boolean[] usedByChecks() {
        final boolean[] used = new boolean[layout.slots.size()];
        for (Tape requirement : requirements) {
            markSlots(requirement, used);
        }
        for (Component component : plan.plant().components()) {
            for (Port port : component.ports()) {
                if (port instanceof MaterialPort material) {
                    used[plan.plant().slotOf(material.flow())] = true;
                } else if (port instanceof ShaftPort shaft) {
                    used[plan.plant().slotOf(shaft.power())] = true;
                } else if (port instanceof WirePort wire) {
                    used[plan.plant().slotOf(wire.power())] = true;
                } else if (port instanceof HeatPort heat) {
                    used[plan.plant().slotOf(heat.rate())] = true;
                    used[plan.plant().slotOf(heat.temperature())] = true;
                }
            }
        }
        return used;
    }

    private static void markSlots(Tape tape, boolean[] marks) {
        for (int k = 0; k < tape.size(); k++) {
            marks[tape.slot(k)] = true;
        }
    }

    /** {@return the definitions of variables that the solve left out, each after those that it uses} */
    private List<Definition> orderedDefinitions() {
        final List<Definition> definitions = new ArrayList<>();
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
        return definitions;
    }

    private Tape compile(Expression left, Expression right) {
        final Tape.Builder b = new Tape.Builder(sites);
        final int l = left.emit(b, plan.plant().resolution());
        final int r = right.emit(b, plan.plant().resolution());
        final Tape tape = b.build(l, r);
        tapes.add(tape);
        return tape;
    }

    /** {@return whether a slot is left to the second step} */
    boolean isLater(int slot) {
        return isLater[slot];
    }

    /** {@return the values of all slots but those of the second step; NaN where there is none} */
    double[] complete(double[] values) {
        final double[] all = new double[layout.slots.size()];
        for (int slot = 0; slot < all.length; slot++) {
            all[slot] = plan.isActive(slot) ? values[slot] : Double.NaN;
        }
        final StatePoint point = new StatePoint();
        for (Layout.StreamState state : layout.states) {
            completeState(state, all, point);
        }
        return define(checked, all);
    }

    /**
     * {@return the values of all slots; NaN where there is none}
     *
     * @param afterFirstStep what {@link #complete} gave
     */
    double[] completeAll(double[] afterFirstStep) {
        return define(later, afterFirstStep.clone());
    }

    private double[] define(List<Definition> definitions, double[] all) {
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
