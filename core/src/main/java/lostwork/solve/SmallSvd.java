package lostwork.solve;

import java.util.Arrays;

/**
 * Singular values, numerical rank and null vectors of a small dense matrix.
 *
 * <h2>Method</h2>
 * <p>One-sided Jacobi rotations (Golub and Van Loan 2013, section 8.6.3): slow for large matrices, exact to the last
 * digits for small ones, small singular values included.
 *
 * <h2>Example</h2>
 * <pre>{@code
 * SmallSvd svd = SmallSvd.of(new double[] {1, 2, 2, 4}, 2, 2);
 * RankReport rank = svd.rankReport(1e-10);
 * rank.rank();                  // 1
 * rank.leftNullVector(0);       // 2/√5, -1/√5: twice the first row less the second is zero
 * }</pre>
 *
 * <p>Immutable and thread-safe; the work is done when the instance is made.
 */
public final class SmallSvd {
    private static final int SWEEPS = 60;
    private static final double ORTHOGONAL = 1e-15;
    /** Square of a norm that counts as zero against entries of size 1; a smaller one would underflow. */
    private static final double ZERO = 1e-280;

    private final int rows;
    private final int columns;
    /** Singular values, falling. */
    private final double[] values;
    /** Left singular vectors of the values, one after the other, each of {@code rows} entries; zero where lost. */
    private final double[] left;
    /** Right singular vectors of the values, one after the other, each of {@code columns} entries; zero where lost. */
    private final double[] right;

    private SmallSvd(int rows, int columns, double[] values, double[] left, double[] right) {
        this.rows = rows;
        this.columns = columns;
        this.values = values;
        this.left = left;
        this.right = right;
    }

    /**
     * {@return the singular value decomposition of a matrix}
     *
     * @param matrix the matrix, row after row; not changed
     * @param rows the number of rows, at least 1
     * @param columns the number of columns, at least 1
     * @throws IllegalArgumentException if the array is too short or an entry is NaN or infinite
     * @throws ConvergenceException if the rotations do not settle, which has not been seen with finite matrices
     */
    public static SmallSvd of(double[] matrix, int rows, int columns) {
        if (rows < 1 || columns < 1 || (long) matrix.length < (long) rows * columns) {
            throw new IllegalArgumentException("matrix of " + rows + " rows and " + columns
                    + " columns does not lie in an array of " + matrix.length);
        }
        double scale = 0;
        for (int i = 0; i < rows * columns; i++) {
            if (!(Math.abs(matrix[i]) < Double.POSITIVE_INFINITY)) {
                throw new IllegalArgumentException("matrix entry in row " + i / columns + ", column " + i % columns
                        + " (counted from 0) is " + matrix[i] + "; it must be finite");
            }
            scale = Math.max(scale, Math.abs(matrix[i]));
        }
        // Work on the columns of A, or of its transpose if A is wide: few long columns.
        final boolean tall = rows >= columns;
        final int length = tall ? rows : columns;
        final int count = tall ? columns : rows;
        final double[] work = new double[length * count];
        for (int row = 0; row < rows; row++) {
            for (int column = 0; column < columns; column++) {
                final double entry = scale > 0 ? matrix[row * columns + column] / scale : 0;
                work[tall ? column * length + row : row * length + column] = entry;
            }
        }
        final double[] rotation = new double[count * count];
        for (int i = 0; i < count; i++) {
            rotation[i * count + i] = 1;
        }
        orthogonalise(work, rotation, length, count);

        final double[] size = new double[count];
        final Integer[] order = new Integer[count];
        for (int i = 0; i < count; i++) {
            size[i] = norm(work, i * length, length);
            order[i] = i;
        }
        Arrays.sort(order, (a, b) -> Double.compare(size[b], size[a]));
        final double[] values = new double[count];
        final double[] longVectors = new double[length * count];
        final double[] shortVectors = new double[count * count];
        for (int i = 0; i < count; i++) {
            final int from = order[i];
            values[i] = size[from] * scale;
            for (int k = 0; k < length && size[from] > 0; k++) {
                longVectors[i * length + k] = work[from * length + k] / size[from];
            }
            System.arraycopy(rotation, from * count, shortVectors, i * count, count);
        }
        return tall
                ? new SmallSvd(rows, columns, values, longVectors, shortVectors)
                : new SmallSvd(rows, columns, values, shortVectors, longVectors);
    }

    private static void orthogonalise(double[] work, double[] rotation, int length, int count) {
        double worst = 0;
        for (int sweep = 0; sweep < SWEEPS; sweep++) {
            worst = 0;
            for (int p = 0; p < count - 1; p++) {
                for (int q = p + 1; q < count; q++) {
                    double alpha = 0;
                    double beta = 0;
                    double gamma = 0;
                    for (int k = 0; k < length; k++) {
                        final double x = work[p * length + k];
                        final double y = work[q * length + k];
                        alpha += x * x;
                        beta += y * y;
                        gamma += x * y;
                    }
                    final double cosine = Math.abs(gamma) / (Math.sqrt(alpha) * Math.sqrt(beta));
                    if (!(cosine > ORTHOGONAL) || Math.min(alpha, beta) < ZERO) { // also a column of zeros
                        continue;
                    }
                    worst = Math.max(worst, cosine);
                    final double zeta = (beta - alpha) / (2 * gamma);
                    final double t = Math.copySign(1, zeta) / (Math.abs(zeta) + Math.hypot(1, zeta));
                    final double c = 1 / Math.sqrt(1 + t * t);
                    final double s = c * t;
                    rotate(work, p * length, q * length, length, c, s);
                    rotate(rotation, p * count, q * count, count, c, s);
                }
            }
            if (worst == 0) {
                return;
            }
        }
        if (worst > 1e-12) {
            throw new ConvergenceException(
                    "singular values of a matrix with " + count + " columns",
                    SWEEPS,
                    Double.NaN,
                    worst,
                    "two columns are not orthogonal yet",
                    "scale rows and columns to similar sizes");
        }
    }

    private static void rotate(double[] data, int p, int q, int length, double c, double s) {
        for (int k = 0; k < length; k++) {
            final double x = data[p + k];
            final double y = data[q + k];
            data[p + k] = c * x - s * y;
            data[q + k] = s * x + c * y;
        }
    }

    static double norm(double[] data, int from, int length) {
        double sum = 0;
        for (int k = from; k < from + length; k++) {
            sum += data[k] * data[k];
        }
        return Math.sqrt(sum);
    }

    /** {@return the number of singular values: the smaller of the numbers of rows and columns} */
    public int count() {
        return values.length;
    }

    /**
     * {@return a singular value}
     *
     * @param index which one, from 0, the largest first
     * @throws IndexOutOfBoundsException if there is no such value
     */
    public double singularValue(int index) {
        return values[index];
    }

    /**
     * {@return the number of singular values above a share of the largest one}
     *
     * @param relativeTolerance the share, 0 to 1
     * @throws IllegalArgumentException if the share is outside 0 to 1
     */
    public int rank(double relativeTolerance) {
        if (!(relativeTolerance >= 0 && relativeTolerance <= 1)) {
            throw new IllegalArgumentException("relative tolerance = " + relativeTolerance + " must be 0 to 1");
        }
        int rank = 0;
        while (rank < values.length && values[rank] > relativeTolerance * values[0]) {
            rank++;
        }
        return rank;
    }

    /**
     * {@return the rank with the null vectors of both sides}
     *
     * @param relativeTolerance the share of the largest singular value up to which another one counts as zero, 0 to 1
     * @throws IllegalArgumentException if the share is outside 0 to 1
     */
    public RankReport rankReport(double relativeTolerance) {
        final int rank = rank(relativeTolerance);
        return new RankReport(
                rank, values.clone(), complement(left, rows, rank), complement(right, columns, rank), rows, columns);
    }

    /**
     * The vectors beyond the rank. Those that belong to small singular values are taken where they are orthogonal to the
     * rest; what is missing is completed from the unit vectors that lie farthest outside (Gram-Schmidt, twice).
     */
    private static double[] complement(double[] vectors, int length, int rank) {
        final double[] basis = new double[length * length];
        System.arraycopy(vectors, 0, basis, 0, rank * length);
        for (int next = rank; next < length; next++) {
            final int known = vectors.length / length;
            boolean taken = false;
            if (next < known && norm(vectors, next * length, length) > 0.5) {
                System.arraycopy(vectors, next * length, basis, next * length, length);
                taken = project(basis, length, next) > 0.5;
            }
            if (!taken) {
                complete(basis, length, next);
            }
            normalise(basis, next * length, length);
        }
        return Arrays.copyOfRange(basis, rank * length, length * length);
    }

    private static void complete(double[] basis, int length, int next) {
        int farthest = 0;
        double least = Double.POSITIVE_INFINITY;
        for (int unit = 0; unit < length; unit++) {
            double inside = 0;
            for (int j = 0; j < next; j++) {
                inside += basis[j * length + unit] * basis[j * length + unit];
            }
            if (inside < least) {
                least = inside;
                farthest = unit;
            }
        }
        Arrays.fill(basis, next * length, (next + 1) * length, 0);
        basis[next * length + farthest] = 1;
        project(basis, length, next);
    }

    /** Takes the parts along the vectors before it out of a vector; returns what share of it was left. */
    private static double project(double[] basis, int length, int next) {
        double left = 0;
        for (int pass = 0; pass < 2; pass++) {
            for (int j = 0; j < next; j++) {
                double dot = 0;
                for (int k = 0; k < length; k++) {
                    dot += basis[j * length + k] * basis[next * length + k];
                }
                for (int k = 0; k < length; k++) {
                    basis[next * length + k] -= dot * basis[j * length + k];
                }
            }
            final double rest = norm(basis, next * length, length);
            if (pass == 0) {
                left = rest;
            }
            for (int k = 0; k < length && rest > 0; k++) {
                basis[next * length + k] /= rest;
            }
        }
        return left;
    }

    /** Unit length, and the largest entry positive, so that the same matrix gives the same words. */
    static void normalise(double[] data, int from, int length) {
        final double norm = norm(data, from, length);
        int largest = from;
        for (int k = from; k < from + length; k++) {
            if (Math.abs(data[k]) > Math.abs(data[largest]) * (1 + 1e-9)) {
                largest = k;
            }
        }
        final double factor = Math.copySign(1 / norm, data[largest]);
        for (int k = from; k < from + length; k++) {
            data[k] *= factor;
        }
    }
}
