package lostwork.solve;

import java.util.Arrays;

/**
 * Solves small dense systems {@code A x = b} and {@code Aᵀ x = b} by LU factorisation with partial pivoting.
 *
 * <h2>Method</h2>
 * <p>Gaussian elimination with row exchanges (Golub and Van Loan 2013, section 3.4); the reciprocal condition number in
 * the 1-norm by Higham's estimator (Higham 2002, algorithm 15.1), which needs a few solutions instead of the inverse. It
 * is never below the true value, and rarely more than three times above it.
 *
 * <h2>Storage</h2>
 * <p>The instance owns storage for systems up to its capacity; factorising and solving allocate nothing. One instance
 * belongs to one thread. The matrix handed in is copied, row after row, and not changed.
 *
 * <h2>Example</h2>
 * <pre>{@code
 * DenseLu lu = DenseLu.ofCapacity(20);
 * lu.factor(new double[] {2, 1, 1, 3}, 2);
 * double[] x = new double[2];
 * lu.solve(new double[] {3, 5}, x);          // 0.8, 1.4
 * }</pre>
 */
public final class DenseLu {
    private static final int NONE = -1;

    private final int capacity;
    private final double[] lu;
    private final int[] pivotRow; // row exchanged with row k in step k
    private final double[] work;
    private final double[] sign;

    private int n;
    private int singularStep = NONE;
    private double norm1;
    private double largestEntry;

    private DenseLu(int capacity) {
        this.capacity = capacity;
        lu = new double[capacity * capacity];
        pivotRow = new int[capacity];
        work = new double[capacity];
        sign = new double[capacity];
    }

    /**
     * {@return an instance with storage for systems up to a size}
     *
     * @param equations the largest number of equations, 1 to 10,000
     * @throws IllegalArgumentException if the number is outside 1 to 10,000
     */
    public static DenseLu ofCapacity(int equations) {
        if (equations < 1 || equations > 10_000) {
            throw new IllegalArgumentException("number of equations = " + equations + " must be 1 to 10000");
        }
        return new DenseLu(equations);
    }

    /** {@return the largest number of equations that the storage holds} */
    public int capacity() {
        return capacity;
    }

    /**
     * Factorises a matrix. A matrix without a pivot in some column is reported by {@link #isSingular()}, not by an
     * exception.
     *
     * @param matrix the matrix, row after row; not changed
     * @param order the number of rows and of columns
     * @throws IllegalArgumentException if the order exceeds the capacity, the array is too short, or an entry is NaN or
     *     infinite
     */
    public void factor(double[] matrix, int order) {
        if (order < 1 || order > capacity || matrix.length < order * order) {
            throw new IllegalArgumentException("matrix of order " + order + " in an array of " + matrix.length
                    + " does not fit: the capacity is " + capacity);
        }
        n = order;
        singularStep = NONE;
        largestEntry = 0;
        for (int i = 0; i < n * n; i++) {
            final double entry = matrix[i];
            if (!(Math.abs(entry) < Double.POSITIVE_INFINITY)) {
                n = 0; // nothing to solve with
                throw new IllegalArgumentException("matrix entry in row " + i / order + ", column " + i % order
                        + " (counted from 0) is " + entry + "; it must be finite");
            }
            lu[i] = entry;
            largestEntry = Math.max(largestEntry, Math.abs(entry));
        }
        norm1 = 0;
        for (int column = 0; column < n; column++) {
            double sum = 0;
            for (int row = 0; row < n; row++) {
                sum += Math.abs(lu[row * n + column]);
            }
            norm1 = Math.max(norm1, sum);
        }
        for (int k = 0; k < n; k++) {
            eliminate(k);
        }
    }

    private void eliminate(int k) {
        int p = k;
        double largest = Math.abs(lu[k * n + k]);
        for (int row = k + 1; row < n; row++) {
            final double size = Math.abs(lu[row * n + k]);
            if (size > largest) {
                largest = size;
                p = row;
            }
        }
        pivotRow[k] = p;
        if (!(largest > 0)) {
            if (singularStep == NONE) {
                singularStep = k;
            }
            return;
        }
        if (p != k) {
            for (int column = 0; column < n; column++) {
                final double entry = lu[k * n + column];
                lu[k * n + column] = lu[p * n + column];
                lu[p * n + column] = entry;
            }
        }
        final double[] a = lu;
        final int pivotStart = k * n;
        final double pivot = a[pivotStart + k];
        for (int row = k + 1; row < n; row++) {
            final int start = row * n;
            final double entry = a[start + k];
            if (entry != 0) {
                final double factor = entry / pivot;
                a[start + k] = factor;
                for (int column = k + 1; column < n; column++) {
                    a[start + column] -= factor * a[pivotStart + column];
                }
            }
        }
    }

    /** {@return whether elimination found a column without a pivot, so that nothing can be solved} */
    public boolean isSingular() {
        requireFactored();
        return singularStep != NONE;
    }

    /**
     * Solves {@code A x = b}. Allocation-free.
     *
     * @param rightSide the right side {@code b}, at least as long as the order
     * @param solution takes {@code x}; may be the same array as the right side
     * @throws SingularMatrixException if the matrix is singular
     * @throws IllegalArgumentException if an array is too short
     * @throws IllegalStateException if no matrix has been factorised
     */
    public void solve(double[] rightSide, double[] solution) {
        requireSolvable(rightSide, solution);
        if (rightSide != solution) {
            System.arraycopy(rightSide, 0, solution, 0, n);
        }
        forward(solution);
    }

    /**
     * Solves {@code Aᵀ x = b}, the system of the sensitivities. Allocation-free.
     *
     * @param rightSide the right side {@code b}, at least as long as the order
     * @param solution takes {@code x}; may be the same array as the right side
     * @throws SingularMatrixException if the matrix is singular
     * @throws IllegalArgumentException if an array is too short
     * @throws IllegalStateException if no matrix has been factorised
     */
    public void solveTransposed(double[] rightSide, double[] solution) {
        requireSolvable(rightSide, solution);
        if (rightSide != solution) {
            System.arraycopy(rightSide, 0, solution, 0, n);
        }
        transposed(solution);
    }

    private void forward(double[] x) {
        final double[] a = lu;
        for (int k = 0; k < n; k++) {
            final int p = pivotRow[k];
            final double entry = x[p];
            x[p] = x[k];
            x[k] = entry;
        }
        for (int row = 1; row < n; row++) {
            final int start = row * n;
            double sum = x[row];
            for (int column = 0; column < row; column++) {
                sum -= a[start + column] * x[column];
            }
            x[row] = sum;
        }
        for (int row = n - 1; row >= 0; row--) {
            final int start = row * n;
            double sum = x[row];
            for (int column = row + 1; column < n; column++) {
                sum -= a[start + column] * x[column];
            }
            x[row] = sum / a[start + row];
        }
    }

    private void transposed(double[] x) {
        final double[] a = lu;
        for (int k = 0; k < n; k++) {
            final int start = k * n;
            final double entry = x[k] / a[start + k];
            x[k] = entry;
            for (int column = k + 1; column < n; column++) {
                x[column] -= a[start + column] * entry;
            }
        }
        for (int k = n - 1; k > 0; k--) {
            final int start = k * n;
            final double entry = x[k];
            for (int column = 0; column < k; column++) {
                x[column] -= a[start + column] * entry;
            }
        }
        for (int k = n - 1; k >= 0; k--) {
            final int p = pivotRow[k];
            final double entry = x[p];
            x[p] = x[k];
            x[k] = entry;
        }
    }

    /**
     * {@return an estimate of the reciprocal condition number {@code 1 / (|A| |A⁻¹|)} in the 1-norm, 0 for a singular
     * matrix; about 1 is harmless, below about 1e-12 few digits of a solution are left} Allocation-free.
     *
     * <p>It depends on how equations and unknowns are scaled: scale both before the number is judged.
     *
     * @throws IllegalStateException if no matrix has been factorised
     */
    public double reciprocalCondition() {
        requireFactored();
        if (singularStep != NONE) {
            return 0;
        }
        // Higham 2002, algorithm 15.1: a lower bound of |A⁻¹| in the 1-norm.
        Arrays.fill(work, 0, n, 1.0 / n);
        forward(work);
        double estimate = sumOfSizes();
        if (n > 1) {
            storeSigns();
            int last = NONE;
            for (int pass = 0; pass < 5; pass++) {
                System.arraycopy(sign, 0, work, 0, n);
                transposed(work);
                int j = 0;
                for (int i = 1; i < n; i++) {
                    if (Math.abs(work[i]) > Math.abs(work[j])) {
                        j = i;
                    }
                }
                if (j == last) {
                    break;
                }
                last = j;
                Arrays.fill(work, 0, n, 0);
                work[j] = 1;
                forward(work);
                final double previous = estimate;
                estimate = Math.max(estimate, sumOfSizes());
                if (!storeSigns() || estimate <= previous) {
                    break;
                }
            }
            for (int i = 0; i < n; i++) {
                work[i] = (i % 2 == 0 ? 1 : -1) * (1 + (double) i / (n - 1));
            }
            forward(work);
            estimate = Math.max(estimate, 2 * sumOfSizes() / (3.0 * n));
        }
        final double reciprocal = 1 / estimate / norm1;
        return reciprocal >= 0 ? Math.min(reciprocal, 1) : 0; // an overflow on the way is as good as singular
    }

    private double sumOfSizes() {
        double sum = 0;
        for (int i = 0; i < n; i++) {
            sum += Math.abs(work[i]);
        }
        return sum;
    }

    /** Keeps the signs of the last solution; false if they are those of the pass before. */
    private boolean storeSigns() {
        boolean changed = false;
        for (int i = 0; i < n; i++) {
            final double s = work[i] >= 0 ? 1 : -1;
            changed |= s != sign[i];
            sign[i] = s;
        }
        return changed;
    }

    /**
     * {@return the growth of the elimination: the largest entry of U over the largest entry of the matrix; far above 1 it
     * tells that the factorisation lost digits} Allocation-free.
     *
     * @throws IllegalStateException if no matrix has been factorised
     */
    public double pivotGrowth() {
        requireFactored();
        double largest = 0;
        for (int row = 0; row < n; row++) {
            for (int column = row; column < n; column++) {
                largest = Math.max(largest, Math.abs(lu[row * n + column]));
            }
        }
        return largestEntry > 0 ? largest / largestEntry : 1;
    }

    private void requireFactored() {
        if (n == 0) {
            throw new IllegalStateException("no matrix has been factorised; call factor first");
        }
    }

    private void requireSolvable(double[] rightSide, double[] solution) {
        requireFactored();
        if (rightSide.length < n || solution.length < n) {
            throw new IllegalArgumentException("right side of " + rightSide.length + " and solution of "
                    + solution.length + " must hold at least " + n + " entries");
        }
        if (singularStep != NONE) {
            throw new SingularMatrixException(n, singularStep);
        }
    }
}
