package lostwork.plant;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;
import lostwork.plant.kernel.Matching;
import lostwork.plant.kernel.Tape;
import lostwork.quantity.Pressure;
import lostwork.quantity.PressureDifference;
import lostwork.quantity.QuantityKind;
import lostwork.quantity.Ratio;

/**
 * Decides which assumptions hold. An assumption that finds no unknown
 *
 * <ul>
 *   <li>holds all the same when it follows from others that hold, as around parallel branches without loss,
 *   <li>gives way when the values that contradict it stand at its own component,
 *   <li>gives way, or lets another one give way, when the contradiction is one of pressures alone and only one assumption
 *       in it can be meant: one along a stream, such as the missing loss of a parallel branch, before one at a junction.
 * </ul>
 *
 * <p>Every other contradiction is left to the user.
 */
final class Assumptions {
    private final Plant plant;
    private final Layout layout;
    private final List<Planner.Entry> entries;
    private final Matching matching;
    private final TreeSet<Integer> assumed = new TreeSet<>();
    private final TreeSet<Integer> gaveWay = new TreeSet<>();

    Assumptions(Plant plant, List<Planner.Entry> entries, Matching matching) {
        this.plant = plant;
        this.layout = plant.layout();
        this.entries = entries;
        this.matching = matching;
    }

    /** Adds an assumption; false when the user has to settle what contradicts it. */
    boolean add(int assumption) {
        if (matching.add(assumption) || followsFromOthers(assumption)) {
            assumed.add(assumption);
            return true;
        }
        final boolean[] part = matching.overdetermined(assumption);
        if (isContradictedNearby(assumption, part)) {
            gaveWay.add(assumption);
            return true;
        }
        final int weakest = concernsPressuresAlone(part) ? weakest(part) : -1;
        if (weakest < 0) {
            return false;
        }
        gaveWay.add(weakest);
        if (weakest != assumption) {
            assumed.remove(weakest);
            matching.remove(weakest);
            matching.add(assumption);
            assumed.add(assumption);
        }
        return true;
    }

    /** {@return the assumptions that hold} */
    List<Equation> assumed() {
        return assumed.stream().map(e -> entries.get(e).equation()).toList();
    }

    /** {@return the assumptions that gave way} */
    List<Equation> gaveWay() {
        return gaveWay.stream().map(e -> entries.get(e).equation()).toList();
    }

    /** Whether an equality of two values is a chain of equalities that hold. */
    private boolean followsFromOthers(int assumption) {
        if (!isEquality(assumption)) {
            return false;
        }
        final TreeMap<Integer, Integer> roots = new TreeMap<>();
        for (int e = 0; e < entries.size(); e++) {
            if (matching.unknownOf(e) >= 0 && isEquality(e)) {
                final Tape tape = entries.get(e).tape();
                final int a = root(roots, tape.slot(0));
                final int b = root(roots, tape.slot(1));
                roots.put(Math.max(a, b), Math.min(a, b));
            }
        }
        final Tape tape = entries.get(assumption).tape();
        return root(roots, tape.slot(0)) == root(roots, tape.slot(1));
    }

    private static int root(TreeMap<Integer, Integer> roots, int slot) {
        int root = slot;
        for (int next = roots.getOrDefault(root, root); next != root; next = roots.getOrDefault(root, root)) {
            root = next;
        }
        return root;
    }

    private boolean isEquality(int e) {
        final Equation equation = entries.get(e).equation();
        return equation.left() instanceof Variable
                && equation.right() instanceof Variable
                && entries.get(e).tape().size() == 2;
    }

    /**
     * Whether the values that contradict an assumption stand at its own component. A contradiction that runs through other
     * machines is no statement about this one.
     */
    private boolean isContradictedNearby(int assumption, boolean[] part) {
        final String component = entries.get(assumption).equation().component();
        final Set<Integer> states = new HashSet<>();
        layout.stateOf.forEach((port, state) -> {
            if (port.component().equals(component)) {
                states.add(state);
            }
        });
        for (int e = 0; e < part.length; e++) {
            final Planner.Entry entry = entries.get(e);
            if (part[e] && !entry.equation().component().equals(component) && !states.contains(entry.state())) {
                return false;
            }
        }
        return true;
    }

    private boolean concernsPressuresAlone(boolean[] part) {
        for (int e = 0; e < part.length; e++) {
            final Tape tape = entries.get(e).tape();
            for (int k = 0; part[e] && k < tape.size(); k++) {
                final QuantityKind<?, ?> kind = layout.slots.get(tape.slot(k)).kind();
                if (kind != Pressure.KIND && kind != PressureDifference.KIND && kind != Ratio.KIND) {
                    return false;
                }
            }
        }
        return true;
    }

    /** The only assumption along a stream, else the only one at a junction; −1 when there are several or none. */
    private int weakest(boolean[] part) {
        final List<Integer> along = new ArrayList<>();
        final List<Integer> across = new ArrayList<>();
        for (int e = 0; e < part.length; e++) {
            if (part[e] && entries.get(e).isAssumption()) {
                (isAlongOneStream(e) ? along : across).add(e);
            }
        }
        final List<Integer> candidates = along.isEmpty() ? across : along;
        return candidates.size() == 1 ? candidates.get(0) : -1;
    }

    private boolean isAlongOneStream(int e) {
        final Set<Integer> flows = new HashSet<>();
        entries.get(e).equation().variables().forEach(variable -> {
            final int state = layout.slots.get(plant.slotOf(variable)).state();
            layout.stateOf.forEach((port, of) -> {
                if (of == state && port.component().equals(variable.component())) {
                    flows.add(layout.flowSlotOf.get(port));
                }
            });
        });
        return flows.size() == 1;
    }
}
