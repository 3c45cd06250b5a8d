package lostwork.plant.kernel;

import java.util.Arrays;
import lostwork.solve.DenseLu;
import lostwork.solve.RankReport;
import lostwork.solve.SmallSvd;
import org.jspecify.annotations.Nullable;

/**
 * Damped Newton iteration on the equations of one loop, all at once and within bounds, and the test of their rank where it
 * has converged. One instance belongs to one solve and has room for its largest loop.
 */
final class NewtonLoop {
    /** Scaled residual at which an iteration has converged; a further Newton step then polishes. */
    private static final double CONVERGED = 1e-11;
    /** Reciprocal condition below which the singular values are looked at. */
    private static final double SUSPICIOUS = 1e-7;
    /** Reciprocal condition below which a matrix is not solved with. */
    private static final double UNSOLVABLE = 1e-14;

    private static final int ITERATIONS = 80;
    private static final int DAMPINGS = 12;

    private final EquationSystem system;
    private final Workspace w;
    private final SolveClock clock;
    private final double[] matrix;
    private final double[] step;
    private final double[] residuals;
    private final double[] rowScale;
    /** The unknowns before the step. */
    private final double[] saved;

    private final DenseLu lu;

    /**
     * Prepares a solve.
     *
     * @param system the system
     * @param w the workspace
     * @param clock asked before each step
     */
    NewtonLoop(EquationSystem system, Workspace w, SolveClock clock) {
        this.system = system;
        this.w = w;
        this.clock = clock;
        int size = 1;
        for (int[] block : system.blocks()) {
            size = Math.max(size, block.length);
        }
        matrix = new double[size * size];
        step = new double[size];
        residuals = new double[size];
        rowScale = new double[size];
        saved = new double[size];
        lu = DenseLu.ofCapacity(size);
    }

    /**
     * Iterates from the present values.
     *
     * @param block the equations
     * @param slots their unknowns
     * @return whether the equations are met
     */
    boolean iterate(int[] block, int[] slots) {
        final int n = block.length;
        double norm = evaluate(block, slots);
        int polished = 0;
        for (int iteration = 0; iteration < ITERATIONS; iteration++) {
            if (!Double.isFinite(norm) || !isFinite(n)) {
                return false;
            }
            if (norm <= CONVERGED && polished++ >= 1 || norm == 0) {
                return true;
            }
            if (!findStep(n)) {
                return false;
            }
            for (int j = 0; j < n; j++) {
                saved[j] = w.x[slots[j]];
            }
            final boolean lower = moveDown(block, slots, norm);
            if (!lower && norm <= EquationSystem.ACCEPTED) {
                for (int j = 0; j < n; j++) {
                    w.x[slots[j]] = saved[j]; // rounding allows no more
                }
                return true;
            }
            if (!lower) {
                // Over a hump: a short step, then go on.
                move(slots, 1.0 / 16);
            }
            norm = evaluate(block, slots);
        }
        return norm <= EquationSystem.ACCEPTED && isFinite(n);
    }

    /** Halves the step until it lowers the residuals; false when it never does. */
    private boolean moveDown(int[] block, int[] slots, double norm) {
        double damping = 1;
        for (int i = 0; i < DAMPINGS; i++) {
            clock.tick();
            move(slots, damping);
            if (norm(block) < norm * (1 - 1e-4 * damping)) {
                return true;
            }
            damping *= 0.5;
        }
        return false;
    }

    /** Moves the unknowns along the step, each at most to nine tenths of the way to its limit. */
    private void move(int[] slots, double damping) {
        for (int j = 0; j < slots.length; j++) {
            final SlotScale bounds = system.scale(slots[j]);
            final double from = saved[j];
            double to = from + damping * step[j] * bounds.at(from);
            if (bounds.proportional() && from > 0 && to < 0.1 * from && bounds.lowest() >= 0) {
                to = 0.1 * from;
            }
            if (to < bounds.lowest()) {
                to = from + 0.9 * (bounds.lowest() - from);
            } else if (to > bounds.highest()) {
                to = from + 0.9 * (bounds.highest() - from);
            }
            w.x[slots[j]] = to;
        }
    }

    /** Fills the scaled matrix and residuals; gives the largest scaled residual. */
    private double evaluate(int[] block, int[] slots) {
        final int n = block.length;
        double norm = 0;
        for (int i = 0; i < n; i++) {
            final Tape tape = system.equation(block[i]);
            final double r = tape.evaluate(w);
            rowScale[i] = system.rowScale(tape, w);
            residuals[i] = r / rowScale[i];
            norm = larger(norm, Math.abs(residuals[i]));
            for (int j = 0; j < n; j++) {
                final int place = tape.placeOf(slots[j]);
                final double scale = system.scale(slots[j]).at(w.x[slots[j]]);
                matrix[i * n + j] = place < 0 ? 0 : w.gradient[place] * scale / rowScale[i];
            }
        }
        return norm;
    }

    /** The largest residual in the scales of the last evaluation; infinite when one has no value. */
    private double norm(int[] block) {
        double norm = 0;
        for (int i = 0; i < block.length; i++) {
            norm = larger(norm, Math.abs(system.equation(block[i]).forward(w)) / rowScale[i]);
        }
        return Double.isNaN(norm) ? Double.POSITIVE_INFINITY : norm;
    }

    /** {@return the largest scaled residual at the present values; infinite when one has no value} */
    double residual(int[] block) {
        double norm = 0;
        for (int equation : block) {
            norm = larger(norm, system.scaledResidual(system.equation(equation), w));
        }
        return Double.isNaN(norm) ? Double.POSITIVE_INFINITY : norm;
    }

    /** The larger of two numbers, and NaN when one of them is. */
    private static double larger(double a, double b) {
        return a >= b ? a : b > a ? b : Double.NaN;
    }

    private boolean isFinite(int n) {
        for (int i = 0; i < n * n; i++) {
            if (!Double.isFinite(matrix[i])) {
                return false;
            }
        }
        return true;
    }

    private boolean findStep(int n) {
        for (int i = 0; i < n; i++) {
            step[i] = -residuals[i];
        }
        lu.factor(matrix, n);
        if (!lu.isSingular() && lu.reciprocalCondition() > UNSOLVABLE) {
            lu.solve(step, step);
            return true;
        }
        return findLevenbergStep(n);
    }

    /** A step of (JᵀJ + µI) d = −Jᵀr, where the matrix itself cannot be solved. */
    private boolean findLevenbergStep(int n) {
        final double[] normal = new double[n * n];
        final double[] right = new double[n];
        double trace = 0;
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                double sum = 0;
                for (int k = 0; k < n; k++) {
                    sum += matrix[k * n + i] * matrix[k * n + j];
                }
                normal[i * n + j] = sum;
            }
            trace += normal[i * n + i];
            for (int k = 0; k < n; k++) {
                right[i] -= matrix[k * n + i] * residuals[k];
            }
        }
        for (int i = 0; i < n; i++) {
            normal[i * n + i] += 1e-6 * trace / n;
        }
        lu.factor(normal, n);
        if (lu.isSingular()) {
            return false;
        }
        lu.solve(right, step);
        return true;
    }

    /**
     * {@return the null vectors of a block at the present values, where it has converged; null when its equations determine
     * its unknowns}
     *
     * @param block the equations
     * @param slots their unknowns
     */
    @Nullable
    RankReport deficiency(int[] block, int[] slots) {
        final int n = block.length;
        evaluate(block, slots);
        lu.factor(matrix, n);
        if (!lu.isSingular() && lu.reciprocalCondition() > SUSPICIOUS) {
            return null;
        }
        final RankReport rank = SmallSvd.of(Arrays.copyOf(matrix, n * n), n, n)
                .rankReport(EquationSystem.SINGULAR)
                .separated();
        return rank.rank() < n ? rank : null;
    }
}
