package lostwork.solve;

import java.util.Arrays;

/**
 * The numerical rank of a matrix {@code A} and the null vectors of both sides.
 *
 * <p>A right null vector {@code x} fulfils {@code A x = 0}: a direction of the unknowns that the equations do not see. A
 * left null vector {@code y} fulfils {@code yᵀ A = 0}: a combination of equations that says nothing. Both have unit length
 * and a positive largest entry; several of them are orthogonal to each other. Immutable and thread-safe.
 */
public final class RankReport {
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
