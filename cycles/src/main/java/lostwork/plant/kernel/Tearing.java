package lostwork.plant.kernel;

import java.util.ArrayList;
import java.util.List;
import org.jspecify.annotations.Nullable;

/**
 * A loop cut open at one unknown: once that unknown has a value, the others follow one by one from one equation each, and
 * the last equation tells whether the value was right. So a loop becomes one equation in one unknown, which can be
 * bracketed. Not every loop can be cut at a single place. Immutable.
 *
 * @param slot the unknown at which the loop is cut
 * @param residual the equation that is left to be met
 * @param equations the equations that give the others, in their order
 * @param slots the unknowns that they give
 */
record Tearing(int slot, int residual, int[] equations, int[] slots) {
    /** More steps than this that need an iteration of their own make a cut too dear. */
    private static final int NESTED = 1;

    /** How many cuts of a block are worth trying. */
    private static final int CUTS = 4;

    /** An unknown whose limits are further apart than this many natural scales cannot be scanned. */
    private static final double WIDEST = 1e9;

    /**
     * {@return the cheapest cuts of a block, those without nested iterations first; empty when it cannot be cut at one
     * place}
     *
     * @param system the system
     * @param block the equations of the block
     */
    static List<Tearing> of(EquationSystem system, int[] block) {
        final List<List<Tearing>> byCost = new ArrayList<>();
        for (int cost = 0; cost <= NESTED; cost++) {
            byCost.add(new ArrayList<>());
        }
        for (int equation : block) {
            final int slot = system.matched(equation);
            final SlotScale scale = system.scale(slot);
            if (scale.highest() - scale.lowest() < WIDEST * scale.natural()) {
                for (int cost = 0; cost <= NESTED; cost++) {
                    final Tearing cut = cutAt(system, block, slot, cost);
                    if (cut != null) {
                        byCost.get(cost).add(cut);
                        break;
                    }
                }
            }
        }
        final List<Tearing> all = new ArrayList<>();
        byCost.forEach(all::addAll);
        return all.subList(0, Math.min(CUTS, all.size()));
    }

    private static @Nullable Tearing cutAt(EquationSystem system, int[] block, int cut, int nestedAllowed) {
        final int n = block.length;
        final boolean[] used = new boolean[n];
        final List<Integer> open = new ArrayList<>();
        for (int equation : block) {
            if (system.matched(equation) != cut) {
                open.add(system.matched(equation));
            }
        }
        final int[] equations = new int[n - 1];
        final int[] slots = new int[n - 1];
        int nested = 0;
        for (int step = 0; step < n - 1; step++) {
            int chosen = next(system, block, used, open, true);
            if (chosen < 0 && nested < nestedAllowed) {
                chosen = next(system, block, used, open, false);
                nested++;
            }
            if (chosen < 0) {
                return null;
            }
            used[chosen] = true;
            equations[step] = block[chosen];
            slots[step] = onlyOpen(system.equation(block[chosen]), open);
            open.remove(Integer.valueOf(slots[step]));
        }
        for (int i = 0; i < n; i++) {
            if (!used[i]) {
                return new Tearing(cut, block[i], equations, slots);
            }
        }
        throw new IllegalStateException("a block of " + n + " equations has no equation left");
    }

    /** The first unused equation with exactly one open unknown. */
    private static int next(
            EquationSystem system, int[] block, boolean[] used, List<Integer> open, boolean affineOnly) {
        for (int i = 0; i < block.length; i++) {
            final Tape tape = system.equation(block[i]);
            final int slot = used[i] ? -1 : onlyOpen(tape, open);
            if (slot >= 0 && (!affineOnly || tape.isAffineIn(tape.placeOf(slot)))) {
                return i;
            }
        }
        return -1;
    }

    /** The only open unknown of an equation; −1 when it has none or several. */
    private static int onlyOpen(Tape tape, List<Integer> open) {
        int found = -1;
        for (int k = 0; k < tape.size(); k++) {
            if (open.contains(tape.slot(k))) {
                if (found >= 0) {
                    return -1;
                }
                found = tape.slot(k);
            }
        }
        return found;
    }
}
