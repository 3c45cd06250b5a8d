package lostwork.plant.kernel;

import java.util.List;
import java.util.concurrent.ConcurrentLinkedQueue;

/**
 * A square system of equations, ordered into blocks, ready to be solved. Immutable and shared between threads.
 */
public final class EquationSystem {
    /** How many workspaces are kept for the next solves. */
    private static final int KEPT = 4;

    /** Scaled residual at which an equation counts as met where rounding prevents more. */
    static final double ACCEPTED = 1e-9;

    /**
     * An equation whose scaled slope, or a block whose smallest singular value against its largest, is below this does not
     * determine its unknowns.
     */
    static final double SINGULAR = 1e-9;

    private final Tape[] equations;
    private final int[] matched;
    private final List<int[]> blocks;
    private final SlotScale[] scales;
    private final CallSites sites;
    /** Scratch of finished solves: what it remembers is the function values at its last arguments, so no result depends on it. */
    private final ConcurrentLinkedQueue<Workspace> idle = new ConcurrentLinkedQueue<>();

    /**
     * Creates a system.
     *
     * @param equations the equations of the system
     * @param matched for each equation the slot that it is matched with
     * @param blocks the blocks in the order of solving, each as a list of equations
     * @param scales how each slot of the whole plant is judged
     * @param sites the call sites of the equations
     */
    public EquationSystem(
            List<Tape> equations, int[] matched, List<int[]> blocks, List<SlotScale> scales, CallSites sites) {
        this.equations = equations.toArray(new Tape[0]);
        this.matched = matched.clone();
        this.blocks = List.copyOf(blocks);
        this.scales = scales.toArray(new SlotScale[0]);
        this.sites = sites;
    }

    /**
     * {@return an equation}
     *
     * @param index its number
     */
    public Tape equation(int index) {
        return equations[index];
    }

    /**
     * {@return the slot that an equation is matched with, negative for none}
     *
     * @param equation its number
     */
    public int matched(int equation) {
        return matched[equation];
    }

    /** {@return the blocks in the order of solving, each as a list of equations; not to be changed} */
    public List<int[]> blocks() {
        return blocks;
    }

    /**
     * {@return how a slot is judged}
     *
     * @param slot the slot
     */
    public SlotScale scale(int slot) {
        return scales[slot];
    }

    /** {@return a workspace for one solve} */
    public Workspace workspace() {
        final Workspace kept = idle.poll();
        return kept != null ? kept : new Workspace(scales.length, List.of(equations), sites);
    }

    /**
     * Takes back a workspace, for a later solve.
     *
     * @param workspace a workspace of this system that nobody uses any more
     */
    public void release(Workspace workspace) {
        if (idle.size() < KEPT) {
            idle.add(workspace);
        }
    }

    /**
     * {@return the largest residual of all equations, each against the sum over its slots of |∂r/∂x| times the scale of the
     * slot}
     *
     * @param values the value of each slot
     */
    public double largestResidual(double[] values) {
        final Workspace w = workspace();
        System.arraycopy(values, 0, w.x, 0, values.length);
        double largest = 0;
        for (int[] block : blocks) {
            for (int equation : block) {
                largest = Math.max(largest, scaledResidual(equations[equation], w));
            }
        }
        release(w);
        return largest;
    }

    /** {@return the residual of an equation against the sum over its slots of |∂r/∂x| times the scale of the slot} */
    double scaledResidual(Tape tape, Workspace w) {
        final double residual = tape.evaluate(w);
        return Math.abs(residual) / rowScale(tape, w);
    }

    /** {@return the sum over the slots of the equation evaluated last of |∂r/∂x| times the scale of the slot} */
    double rowScale(Tape tape, Workspace w) {
        double sum = 0;
        for (int k = 0; k < tape.size(); k++) {
            final int slot = tape.slot(k);
            sum += Math.abs(w.gradient[k]) * scales[slot].at(w.x[slot]);
        }
        return sum > 0 ? sum : 1;
    }
}
