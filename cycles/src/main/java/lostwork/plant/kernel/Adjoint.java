package lostwork.plant.kernel;

import java.util.Arrays;
import lostwork.solve.DenseLu;

/** Derivatives of a solution by one pass backwards through its transposed blocks. */
public final class Adjoint {
    private Adjoint() {}

    /**
     * {@return the derivative of one slot with respect to each slot; only those of given slots have a meaning}
     *
     * @param system the system, solved
     * @param values the value of each slot
     * @param of the slot that changes
     */
    public static double[] gradient(EquationSystem system, double[] values, int of) {
        final Workspace w = system.workspace();
        System.arraycopy(values, 0, w.x, 0, values.length);
        final double[] total = new double[values.length];
        total[of] = 1;
        for (int b = system.blocks().size() - 1; b >= 0; b--) {
            passBack(system, system.blocks().get(b), w, total);
        }
        return total;
    }

    private static void passBack(EquationSystem system, int[] block, Workspace w, double[] total) {
        final int n = block.length;
        final double[] seed = new double[n];
        boolean any = false;
        for (int j = 0; j < n; j++) {
            final int slot = system.matched(block[j]);
            seed[j] = total[slot];
            total[slot] = 0;
            any |= seed[j] != 0;
        }
        if (!any) {
            return;
        }
        final double[][] gradients = new double[n][];
        final double[] matrix = new double[n * n];
        for (int i = 0; i < n; i++) {
            final Tape tape = system.equation(block[i]);
            tape.evaluate(w);
            gradients[i] = Arrays.copyOf(w.gradient, tape.size());
            for (int j = 0; j < n; j++) {
                final int place = tape.placeOf(system.matched(block[j]));
                matrix[i * n + j] = place < 0 ? 0 : gradients[i][place];
            }
        }
        scaleRows(matrix, gradients, n);
        final DenseLu lu = DenseLu.ofCapacity(n);
        lu.factor(matrix, n);
        lu.solveTransposed(seed, seed);
        for (int i = 0; i < n; i++) {
            final Tape tape = system.equation(block[i]);
            for (int k = 0; k < tape.size(); k++) {
                final int slot = tape.slot(k);
                if (!isOf(slot, system, block)) {
                    total[slot] -= seed[i] * gradients[i][k];
                }
            }
        }
    }

    /** Divides each equation by its largest entry in the block, for the sake of the pivots. */
    private static void scaleRows(double[] matrix, double[][] gradients, int n) {
        for (int i = 0; i < n; i++) {
            double largest = 0;
            for (int j = 0; j < n; j++) {
                largest = Math.max(largest, Math.abs(matrix[i * n + j]));
            }
            if (largest > 0) {
                for (int j = 0; j < n; j++) {
                    matrix[i * n + j] /= largest;
                }
                for (int k = 0; k < gradients[i].length; k++) {
                    gradients[i][k] /= largest;
                }
            }
        }
    }

    private static boolean isOf(int slot, EquationSystem system, int[] block) {
        for (int equation : block) {
            if (system.matched(equation) == slot) {
                return true;
            }
        }
        return false;
    }
}
