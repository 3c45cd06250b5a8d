package lostwork.plant;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Deque;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.IntStream;
import lostwork.plant.kernel.BalanceRows;
import lostwork.plant.kernel.Blocks;
import lostwork.plant.kernel.CallSites;
import lostwork.plant.kernel.EquationSystem;
import lostwork.plant.kernel.Matching;
import lostwork.plant.kernel.Tape;
import org.jspecify.annotations.Nullable;

/** Turns a plant and the list of what is given into a solve plan, or says in words why that is not possible. */
final class Planner {
    /**
     * One equation that takes part.
     *
     * @param equation the equation
     * @param tape the equation, compiled
     * @param direct for a relation of a state, the same statement solved for the enthalpy; null for none
     * @param state the state whose properties it relates; −1 for the equation of a component
     */
    record Entry(Equation equation, Tape tape, @Nullable Tape direct, int state) {
        boolean isAssumption() {
            return equation.tag() == EquationTag.ASSUMPTION;
        }
    }

    private final Plant plant;
    private final Layout layout;
    private final List<Variable<?>> givenVariables;
    private final boolean[] given;
    private final boolean[] active;
    private final CallSites sites = new CallSites();
    private final List<Entry> entries = new ArrayList<>();
    private final List<Equation> redundant = new ArrayList<>();

    /**
     * Prepares a plan.
     *
     * @param plant the plant
     * @param givenVariables what is given, in the order in which it was
     * @param wanted further variables that take part, to be read with their derivatives
     */
    Planner(Plant plant, List<Variable<?>> givenVariables, List<Variable<?>> wanted) {
        this.plant = plant;
        this.layout = plant.layout();
        this.givenVariables = givenVariables;
        given = new boolean[layout.slots.size()];
        active = new boolean[layout.slots.size()];
        markGiven();
        collect(wanted);
    }

    private void markGiven() {
        final Map<Integer, Variable<?>> first = new HashMap<>();
        for (Variable<?> variable : givenVariables) {
            final int slot = plant.slotOf(variable);
            final Variable<?> before = first.putIfAbsent(slot, variable);
            if (before != null) {
                throw Diagnosis.givenTwice(plant, before, variable);
            }
            given[slot] = true;
        }
    }

    private void collect(List<Variable<?>> wanted) {
        final Deque<Integer> fresh = new ArrayDeque<>();
        for (Layout.StreamState state : layout.states) {
            activate(state.slot(SlotRole.PRESSURE), fresh);
            activate(state.slot(SlotRole.ENTHALPY), fresh);
        }
        for (int slot = 0; slot < given.length; slot++) {
            if (given[slot] || layout.slots.get(slot).role() == SlotRole.FLOW) {
                activate(slot, fresh);
            }
        }
        wanted.forEach(v -> activate(plant.slotOf(v), fresh));
        final List<Equation> equations = new ArrayList<>(independentEquations());
        equations.forEach(e -> e.variables().forEach(v -> activate(plant.slotOf(v), fresh)));
        final Map<Integer, Equation> definitions = new HashMap<>();
        plant.definitions().forEach((v, e) -> definitions.put(plant.slotOf(v), e));
        while (!fresh.isEmpty()) {
            final Equation definition = definitions.get(fresh.poll());
            if (definition != null) {
                equations.add(definition);
                definition.variables().forEach(v -> activate(plant.slotOf(v), fresh));
            }
        }
        for (Equation equation : equations) {
            final Tape.Builder b = new Tape.Builder(sites);
            final int left = equation.left().emit(b, plant.resolution());
            final int right = equation.right().emit(b, plant.resolution());
            entries.add(new Entry(equation, b.build(left, right), null, -1));
        }
        for (Layout.StreamState state : layout.states) {
            checkSaturation(state);
            for (Relations.Relation relation : Relations.of(state, active, given, sites)) {
                entries.add(new Entry(relation.equation(), relation.tape(), relation.direct(), state.index()));
            }
        }
    }

    private void activate(int slot, Deque<Integer> fresh) {
        if (!active[slot]) {
            active[slot] = true;
            fresh.add(slot);
        }
    }

    private void checkSaturation(Layout.StreamState state) {
        for (SlotRole role : List.of(SlotRole.VAPOUR_FRACTION, SlotRole.SUPERHEAT, SlotRole.SUBCOOLING)) {
            if (active[state.slot(role)] && state.model().saturation() == null) {
                throw Diagnosis.noSaturation(
                        plant, layout.slots.get(state.slot(role)).variable(), state.model());
            }
        }
    }

    /** The equations that always hold, without the mass balances that follow from others. */
    private List<Equation> independentEquations() {
        final BalanceRows rows = new BalanceRows();
        final Map<Equation, Boolean> keep = new HashMap<>();
        for (Equations.MassBalance balance : plant.balances()) {
            final Map<Integer, Integer> row = new HashMap<>();
            balance.inlets().forEach(p -> row.merge(layout.flowSlotOf.get(p), 1, Integer::sum));
            balance.outlets().forEach(p -> row.merge(layout.flowSlotOf.get(p), -1, Integer::sum));
            final boolean independent = rows.addIfIndependent(row);
            keep.put(balance.equation(), independent);
            if (!independent) {
                redundant.add(balance.equation());
            }
        }
        return plant.equations().stream()
                .filter(e -> keep.getOrDefault(e, true))
                .toList();
    }

    SolvePlan plan() {
        final int[] unknownOf = new int[given.length];
        final List<Integer> unknownSlots = new ArrayList<>();
        Arrays.fill(unknownOf, -1);
        for (int slot = 0; slot < given.length; slot++) {
            if (active[slot] && !given[slot]) {
                unknownOf[slot] = unknownSlots.size();
                unknownSlots.add(slot);
            }
        }
        final int[][] unknownsOf = new int[entries.size()][];
        for (int e = 0; e < unknownsOf.length; e++) {
            final Tape tape = entries.get(e).tape();
            unknownsOf[e] = IntStream.range(0, tape.size())
                    .map(k -> unknownOf[tape.slot(k)])
                    .filter(u -> u >= 0)
                    .toArray();
        }
        final Matching matching = new Matching(unknownsOf, unknownSlots.size());
        final List<Integer> surplus = new ArrayList<>();
        for (int e = 0; e < unknownsOf.length; e++) {
            if (!entries.get(e).isAssumption() && !matching.add(e)) {
                surplus.add(e);
            }
        }
        final Assumptions assumptions = new Assumptions(plant, entries, matching);
        for (int e = 0; e < unknownsOf.length; e++) {
            if (entries.get(e).isAssumption() && !assumptions.add(e)) {
                surplus.add(e);
            }
        }
        final Diagnosis diagnosis =
                new Diagnosis(plant, entries, matching, unknownsOf, unknownSlots, givenVariables, active, given);
        diagnosis.check(surplus);
        return new SolvePlan(
                plant,
                givenVariables,
                given,
                active,
                entries,
                order(unknownsOf, matching, unknownSlots),
                assumptions.assumed(),
                assumptions.gaveWay(),
                redundant);
    }

    private EquationSystem order(int[][] unknownsOf, Matching matching, List<Integer> unknownSlots) {
        final int[] matched = new int[entries.size()];
        for (int e = 0; e < matched.length; e++) {
            matched[e] = matching.unknownOf(e) < 0 ? -1 : unknownSlots.get(matching.unknownOf(e));
        }
        final int[] taking =
                IntStream.range(0, matched.length).filter(e -> matched[e] >= 0).toArray();
        final List<int[]> blocks = Blocks.order(unknownsOf, taking, matching);
        final List<Tape> tapes =
                new ArrayList<>(entries.stream().map(Entry::tape).toList());
        for (int[] block : blocks) {
            final int e = block[0];
            final Tape direct = entries.get(e).direct();
            if (block.length == 1
                    && direct != null
                    && layout.slots.get(matched[e]).role() == SlotRole.ENTHALPY) {
                tapes.set(e, direct);
            }
        }
        return new EquationSystem(List.copyOf(tapes), matched, blocks, layout.scales, sites);
    }
}
