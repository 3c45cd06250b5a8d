package lostwork.solve;

import java.util.Arrays;

/**
 * The numerical rank of a matrix {@code A} and the null vectors of both sides.
 *
 * <p>A right null vector {@code x} fulfils {@code A x = 0}: a direction of the unknowns that the equations do not see. A
 * left null vector {@code y} fulfils {@code yᵀ A = 0}: a combination of equations that says nothing. Both have unit length
 * and a positive largest entry; several of them are orthogonal to each other, unless
 * {@link #separated()}. Immutable and thread-safe.
 */
public final class RankReport {
    /** Share of the largest entry below which an entry of a separated vector is rounding. */
    private static final double NEGLIGIBLE = 1e-9;

    private final int rank;
    private final double[] singularValues;
    private final double[] leftNull;
    private final double[] rightNull;
    private final int rows;
    private final int columns;

    RankReport(int rank, double[] singularValues, double[] leftNull, double[] rightNull, int rows, int columns) {
        this.rank = rank;
        this.singularValues = singularValues;
        this.leftNull = leftNull;
        this.rightNull = rightNull;
        this.rows = rows;
        this.columns = columns;
    }

    /** {@return the number of independent equations} */
    public int rank() {
        return rank;
    }

    /** {@return how many independent combinations of equations say nothing} */
    public int leftNullDimension() {
        return rows - rank;
    }

    /** {@return how many independent directions of the unknowns are not determined} */
    public int rightNullDimension() {
        return columns - rank;
    }

    /**
     * {@return a left null vector: one weight for each equation (row)}
     *
     * @param index which one, from 0
     * @throws IndexOutOfBoundsException if there is no such vector
     */
    public double[] leftNullVector(int index) {
        if (index < 0 || index >= leftNullDimension()) {
            throw new IndexOutOfBoundsException(
                    "left null vector " + index + " of " + leftNullDimension() + " does not exist");
        }
        return Arrays.copyOfRange(leftNull, index * rows, (index + 1) * rows);
    }

    /**
     * {@return a right null vector: one entry for each unknown (column)}
     *
     * @param index which one, from 0
     * @throws IndexOutOfBoundsException if there is no such vector
     */
    public double[] rightNullVector(int index) {
        if (index < 0 || index >= rightNullDimension()) {
            throw new IndexOutOfBoundsException(
                    "right null vector " + index + " of " + rightNullDimension() + " does not exist");
        }
        return Arrays.copyOfRange(rightNull, index * columns, (index + 1) * columns);
    }

    /**
     * {@return this report with null vectors that involve as few equations and unknowns together as elimination can reach}
     *
     * <p>Where two groups of equations depend on each other independently, orthogonal null vectors mix the groups; the
     * separated ones name one group each. They span the same space, have unit length and a positive largest entry, but are
     * not orthogonal. Entries below 1e-9 of the largest are set to zero.
     */
    public RankReport separated() {
        return new RankReport(
                rank,
                singularValues,
                separate(leftNull.clone(), rows),
                separate(rightNull.clone(), columns),
                rows,
                columns);
    }

    /** Gauss-Jordan elimination with complete pivoting on the vectors, each of a length, one after the other. */
    private static double[] separate(double[] vectors, int length) {
        final int count = length == 0 ? 0 : vectors.length / length;
        final boolean[] done = new boolean[count];
        for (int step = 0; step < count; step++) {
            int pivotVector = -1;
            int pivotEntry = 0;
            double largest = 0;
            for (int v = 0; v < count; v++) {
                for (int k = 0; k < length && !done[v]; k++) {
                    // A later entry must be clearly larger, so that rounding does not choose.
                    if (Math.abs(vectors[v * length + k]) > largest * (1 + 1e-9)) {
                        largest = Math.abs(vectors[v * length + k]);
                        pivotVector = v;
                        pivotEntry = k;
                    }
                }
            }
            done[pivotVector] = true;
            for (int v = 0; v < count; v++) {
                if (v != pivotVector) {
                    final double factor = vectors[v * length + pivotEntry] / vectors[pivotVector * length + pivotEntry];
                    for (int k = 0; k < length; k++) {
                        vectors[v * length + k] -= factor * vectors[pivotVector * length + k];
                    }
                    vectors[v * length + pivotEntry] = 0;
                }
            }
        }
        for (int v = 0; v < count; v++) {
            clean(vectors, v * length, length);
            SmallSvd.normalise(vectors, v * length, length);
        }
        return vectors;
    }

    private static void clean(double[] data, int from, int length) {
        double largest = 0;
        for (int k = from; k < from + length; k++) {
            largest = Math.max(largest, Math.abs(data[k]));
        }
        for (int k = from; k < from + length; k++) {
            if (Math.abs(data[k]) < NEGLIGIBLE * largest) {
                data[k] = 0;
            }
        }
    }

    /**
     * {@return how clear the rank is: the largest singular value counted as zero over the smallest one that is not; 0 if
     * none is counted as zero or the rank is 0}
     */
    public double gap() {
        if (rank == 0 || rank == singularValues.length) {
            return 0;
        }
        return singularValues[rank] / singularValues[rank - 1];
    }

    @Override
    public String toString() {
        return "rank " + rank + " of " + rows + " equations in " + columns + " unknowns, singular values "
                + singularValues[0] + " to " + singularValues[singularValues.length - 1];
    }
}
