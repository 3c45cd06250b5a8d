package lostwork.plant.kernel;

import java.util.Arrays;
import lostwork.solve.RankReport;
import org.jspecify.annotations.Nullable;

/**
 * Solves the blocks of a system one after the other: single equations by a bracketed Newton iteration, loops by a damped
 * Newton iteration within bounds, each tested for rank when it has converged.
 *
 * <p>Residuals are scaled by the sum over all slots of an equation of |∂r/∂x| times the scale of the slot, so that a
 * scaled residual says by what share of their scales the values would have to change. One instance belongs to one solve.
 */
public final class BlockSolver {
    /** What a single equation and its unknown weigh in a null vector of their own. */
    private static final double[] ALONE = {1};

    private final EquationSystem system;
    private final Workspace w;
    private final StartValues starts;
    private final Limits limits;
    private final boolean[] known;
    private final SolveClock clock;
    private final SingleEquation single;
    /** Made for the first loop; most systems have none. */
    private @Nullable NewtonLoop newton;

    /**
     * Prepares a solve.
     *
     * @param system the system
     * @param workspace holds the given values, and start values for a warm start
     * @param known for each slot whether its value is given
     * @param starts gives start values; in a warm start only where those in the workspace do not serve
     * @param limits what bounds the solve
     */
    public BlockSolver(EquationSystem system, Workspace workspace, boolean[] known, StartValues starts, Limits limits) {
        this.system = system;
        this.w = workspace;
        this.known = known.clone();
        this.starts = starts;
        this.limits = limits;
        clock = new SolveClock(limits);
        single = new SingleEquation(system, workspace, clock, limits.search());
    }

    /**
     * Solves all blocks from start values.
     *
     * @throws BlockFailure if a block cannot be solved
     */
    public void solveCold() {
        solve(false);
    }

    /**
     * Solves all blocks starting from the values in the workspace; a block that does not converge from them is started
     * afresh.
     *
     * @throws BlockFailure if a block cannot be solved
     */
    public void solveWarm() {
        solve(true);
    }

    private void solve(boolean warm) {
        int number = 0;
        for (int[] block : system.blocks()) {
            clock.enter(number, block);
            if (block.length == 1) {
                solveSingle(number, block, warm);
            } else {
                solveLoop(number, block, warm);
            }
            for (int equation : block) {
                known[system.matched(equation)] = true;
            }
            number++;
            limits.progress().accept(number);
        }
    }

    private void solveSingle(int number, int[] block, boolean warm) {
        final int slot = system.matched(block[0]);
        final Tape tape = system.equation(block[0]);
        final int place = tape.placeOf(slot);
        if (tape.isAffineIn(place)) {
            w.x[slot] = 0; // also in a warm start, which then gives the same bits as a cold one
            final double residual = tape.evaluate(w);
            w.x[slot] -= residual / w.gradient[place];
            if (tape.isAmbiguous(w)) {
                throw failure(BlockFailure.Reason.SATURATED, number, block);
            }
        } else {
            if (!warm || Double.isNaN(w.x[slot])) {
                starts.prepare(new int[] {slot}, known, w);
            }
            final double start = w.x[slot];
            // A later search takes another root, where there is one.
            if ((limits.search() > 0 || !single.newton(tape, slot)) && !single.scan(tape, slot, start)) {
                throw failure(BlockFailure.Reason.NOT_MET, number, block);
            }
            tape.evaluate(w);
            if (tape.isOutside(w)) {
                throw failure(BlockFailure.Reason.NOT_MET, number, block); // met only where the fluid is continued
            }
        }
        if (!single.determines(tape, slot)) {
            throw singular(number, block, ALONE, ALONE);
        }
    }

    private void solveLoop(int number, int[] block, boolean warm) {
        final int[] slots = slotsOf(block);
        final NewtonLoop loop = newtonLoop();
        if (!(warm && loop.iterate(block, slots))
                && !new LoopSolver(system, w, starts, limits, clock, single, loop).solve(number, block, slots, known)) {
            throw failure(BlockFailure.Reason.NOT_MET, number, block);
        }
        final RankReport rank = loop.deficiency(block, slots);
        if (rank != null) {
            throw singular(number, block, rank.leftNullVector(0), rank.rightNullVector(0));
        }
    }

    private NewtonLoop newtonLoop() {
        NewtonLoop loop = newton;
        if (loop == null) {
            loop = new NewtonLoop(system, w, clock);
            newton = loop;
        }
        return loop;
    }

    private int[] slotsOf(int[] block) {
        final int[] slots = new int[block.length];
        for (int i = 0; i < block.length; i++) {
            slots[i] = system.matched(block[i]);
        }
        return slots;
    }

    private BlockFailure failure(BlockFailure.Reason reason, int number, int[] block) {
        return new BlockFailure(reason, number, block, residuals(block));
    }

    private BlockFailure singular(int number, int[] block, double[] left, double[] right) {
        return new BlockFailure(BlockFailure.Reason.SINGULAR, number, block, residuals(block), left, right);
    }

    private double[] residuals(int[] block) {
        return Arrays.stream(block)
                .mapToDouble(equation -> system.scaledResidual(system.equation(equation), w))
                .toArray();
    }

    /** {@return whether a property function lay outside the range of its fluid in its last evaluation} */
    public boolean anyOutsideRange() {
        return w.anyOutside();
    }
}
