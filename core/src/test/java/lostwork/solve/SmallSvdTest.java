package lostwork.solve;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Set;
import java.util.SplittableRandom;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;

class SmallSvdTest {
    @Test
    void rankOneDoneByHand() {
        final RankReport report = SmallSvd.of(new double[] {1, 2, 2, 4}, 2, 2).rankReport(1e-10);
        assertEquals(1, report.rank());
        assertEquals(2 / Math.sqrt(5), report.leftNullVector(0)[0], 1e-15);
        assertEquals(-1 / Math.sqrt(5), report.leftNullVector(0)[1], 1e-15);
        assertEquals(2 / Math.sqrt(5), report.rightNullVector(0)[0], 1e-15);
        assertEquals(-1 / Math.sqrt(5), report.rightNullVector(0)[1], 1e-15);
        assertThrows(IndexOutOfBoundsException.class, () -> report.leftNullVector(1));
        assertThrows(IndexOutOfBoundsException.class, () -> report.rightNullVector(-1));
    }

    /** [[3, 0], [4, 5]] has the singular values 3√5 and √5 (A Aᵀ = [[9, 12], [12, 41]], eigenvalues 45 and 5). */
    @Test
    void singularValuesDoneByHand() {
        final SmallSvd svd = SmallSvd.of(new double[] {3, 0, 4, 5}, 2, 2);
        assertEquals(3 * Math.sqrt(5), svd.singularValue(0), 1e-14);
        assertEquals(Math.sqrt(5), svd.singularValue(1), 1e-14);
        assertEquals(2, svd.count());
    }

    /** Largest and smallest singular value of the Hilbert matrix of order 5: condition 4.766e5 (Higham 2002, table 28.1,
     * from memory). */
    @Test
    void conditionOfTheHilbertMatrix() {
        final SmallSvd svd = SmallSvd.of(DenseLuTest.hilbert(5), 5, 5);
        assertEquals(4.766e5, svd.singularValue(0) / svd.singularValue(4), 0.0005e5);
        assertEquals(5, svd.rank(1e-10));
        assertEquals(3, svd.rank(1e-2) + 1);
    }

    /** Three columns in a plane: the third shrinks until it underflows, and then is zero, not a direction. */
    @Test
    void dependentColumnsThatUnderflow() {
        final RankReport report = SmallSvd.of(
                        new double[] {
                            0.07350365519970428, 0.9656885338596571, 0, 0, 1, -0.03919218905936153, 0, 0, 0,
                        },
                        3,
                        3)
                .rankReport(1e-9);
        assertEquals(2, report.rank());
        assertEquals(1, Math.abs(report.leftNullVector(0)[2]), 1e-12);
    }

    /** A circulant difference matrix: every row and column sums to zero, so both null vectors are constant. */
    @Test
    void aRingOfBalancesHasConstantNullVectors() {
        final int n = 60;
        final double[] a = new double[n * n];
        for (int i = 0; i < n; i++) {
            a[i * n + i] = 1;
            a[i * n + (i + 1) % n] = -1;
        }
        final RankReport report = SmallSvd.of(a, n, n).rankReport(1e-9);
        assertEquals(n - 1, report.rank());
        assertTrue(report.gap() < 1e-13, report::toString);
        for (int i = 0; i < n; i++) {
            assertEquals(1 / Math.sqrt(n), report.leftNullVector(0)[i], 1e-14);
            assertEquals(1 / Math.sqrt(n), report.rightNullVector(0)[i], 1e-14);
        }
    }

    @Test
    void randomMatricesOfKnownRankAndShape() {
        final SplittableRandom random = new SplittableRandom(31);
        for (int trial = 0; trial < 150; trial++) {
            final int rows = random.nextInt(1, 41);
            final int columns = random.nextInt(1, 41);
            final int rank = random.nextInt(0, Math.min(rows, columns) + 1);
            final double[] p = random.doubles((long) rows * rank, -1, 1).toArray();
            final double[] q = random.doubles((long) rank * columns, -1, 1).toArray();
            final double[] a = new double[rows * columns];
            double norm = 0;
            for (int i = 0; i < rows; i++) {
                for (int j = 0; j < columns; j++) {
                    for (int k = 0; k < rank; k++) {
                        a[i * columns + j] += p[i * rank + k] * q[k * columns + j];
                    }
                    norm = Math.max(norm, Math.abs(a[i * columns + j]));
                }
            }
            final String where = "trial " + trial + ": " + rows + " x " + columns + ", rank " + rank;
            final RankReport report = SmallSvd.of(a, rows, columns).rankReport(1e-11);
            assertEquals(rank, report.rank(), where);
            final double small = 1e-13 * Math.max(1, norm) * 40;
            for (int v = 0; v < report.rightNullDimension(); v++) {
                final double[] x = report.rightNullVector(v);
                for (int i = 0; i < rows; i++) {
                    double sum = 0;
                    for (int j = 0; j < columns; j++) {
                        sum += a[i * columns + j] * x[j];
                    }
                    assertEquals(0, sum, small, where);
                }
                assertOrthonormal(report, v, where);
            }
            for (int v = 0; v < report.leftNullDimension(); v++) {
                final double[] y = report.leftNullVector(v);
                for (int j = 0; j < columns; j++) {
                    double sum = 0;
                    for (int i = 0; i < rows; i++) {
                        sum += a[i * columns + j] * y[i];
                    }
                    assertEquals(0, sum, small, where);
                }
                assertEquals(1, SmallSvd.norm(y, 0, rows), 1e-13, where);
            }
        }
    }

    private static void assertOrthonormal(RankReport report, int v, String where) {
        final double[] x = report.rightNullVector(v);
        for (int w = 0; w <= v; w++) {
            final double[] z = report.rightNullVector(w);
            double dot = 0;
            for (int k = 0; k < x.length; k++) {
                dot += x[k] * z[k];
            }
            assertEquals(w == v ? 1 : 0, dot, 1e-13, where);
        }
    }

    /** Three rings of balances in one matrix, their equations shuffled: each separated vector names one ring only. */
    @Test
    void separatedVectorsNameOneGroupEach() {
        final SplittableRandom random = new SplittableRandom(32);
        final int[] size = {3, 5, 9};
        final int n = 17;
        for (int trial = 0; trial < 50; trial++) {
            final int[] row = random.ints(0, 1000).distinct().limit(n).toArray();
            final int[] place = new int[n];
            for (int i = 0; i < n; i++) {
                for (final int other : row) {
                    place[i] += other < row[i] ? 1 : 0;
                }
            }
            final double[] a = new double[n * n];
            final double[] factor = random.doubles(n, 0.5, 2).toArray();
            int first = 0;
            for (final int ring : size) {
                for (int i = 0; i < ring; i++) {
                    final int equation = place[first + i];
                    a[equation * n + first + i] = factor[first + i];
                    a[equation * n + first + (i + 1) % ring] -= factor[first + i];
                }
                first += ring;
            }
            for (int j = 0; j < n; j++) {
                final double scale = random.nextDouble(0.3, 3);
                for (int i = 0; i < n; i++) {
                    a[i * n + j] *= scale;
                }
            }
            final RankReport plain = SmallSvd.of(a, n, n).rankReport(1e-10);
            final RankReport report = plain.separated();
            assertEquals(3, report.leftNullDimension());
            final Set<Integer> found = new TreeSet<>();
            for (int v = 0; v < 3; v++) {
                final double[] y = report.leftNullVector(v);
                int used = 0;
                for (int i = 0; i < n; i++) {
                    used += y[i] != 0 ? 1 : 0;
                }
                found.add(used);
                for (int j = 0; j < n; j++) {
                    double sum = 0;
                    for (int i = 0; i < n; i++) {
                        sum += a[i * n + j] * y[i];
                    }
                    assertEquals(0, sum, 1e-13);
                }
                assertEquals(1, SmallSvd.norm(y, 0, n), 1e-14);
            }
            assertEquals(Set.of(3, 5, 9), found);
            int mixed = 0;
            for (int v = 0; v < 3; v++) {
                final double[] x = report.rightNullVector(v);
                for (int j = 0; j < n; j++) {
                    mixed += x[j] != 0 ? 1 : 0;
                }
            }
            assertEquals(n, mixed); // each unknown belongs to one vector

            // Combining the equations at random hides the rings from the rows, but not from the right null vectors.
            final double[] m = random.doubles((long) n * n, -1, 1).toArray();
            final double[] combined = new double[n * n];
            for (int i = 0; i < n; i++) {
                for (int k = 0; k < n; k++) {
                    for (int j = 0; j < n; j++) {
                        combined[i * n + j] += m[i * n + k] * a[k * n + j];
                    }
                }
            }
            final RankReport dense =
                    SmallSvd.of(combined, n, n).rankReport(1e-10).separated();
            assertEquals(3, dense.rightNullDimension());
            int members = 0;
            for (int v = 0; v < 3; v++) {
                final double[] x = dense.rightNullVector(v);
                for (int j = 0; j < n; j++) {
                    members += x[j] != 0 ? 1 : 0;
                }
            }
            assertEquals(n, members);
        }
        final RankReport regular =
                SmallSvd.of(new double[] {1, 0, 0, 1}, 2, 2).rankReport(1e-10).separated();
        assertEquals(0, regular.leftNullDimension());
    }

    /** Rows scaled over many decades: the small singular values keep their digits (graded matrix). */
    @Test
    void orthogonalColumnsOfAnySizeAreExact() {
        final double[] a = {1e-9, 2e3, 2e-9, -1e3}; // columns (1, 2)e-9 and (2, -1)e3 are orthogonal
        final SmallSvd svd = SmallSvd.of(a, 2, 2);
        assertEquals(Math.sqrt(5) * 1e3, svd.singularValue(0), 1e-12);
        assertEquals(Math.sqrt(5) * 1e-9, svd.singularValue(1), 1e-24);
    }

    @Test
    void zeroMatrixAndOneEntry() {
        final RankReport zero = SmallSvd.of(new double[6], 2, 3).rankReport(1e-10);
        assertEquals(0, zero.rank());
        assertEquals(2, zero.leftNullDimension());
        assertEquals(3, zero.rightNullDimension());
        assertEquals(0, zero.gap());
        final RankReport one = SmallSvd.of(new double[] {-7}, 1, 1).rankReport(1e-10);
        assertEquals(1, one.rank());
        assertEquals(0, one.leftNullDimension());
    }

    @Test
    void badInputIsNamed() {
        assertThrows(IllegalArgumentException.class, () -> SmallSvd.of(new double[3], 2, 2));
        assertThrows(IllegalArgumentException.class, () -> SmallSvd.of(new double[3], 0, 2));
        final IllegalArgumentException e = assertThrows(
                IllegalArgumentException.class, () -> SmallSvd.of(new double[] {1, Double.NEGATIVE_INFINITY}, 1, 2));
        assertTrue(e.getMessage().contains("row 0, column 1"), e.getMessage());
        assertThrows(
                IllegalArgumentException.class,
                () -> SmallSvd.of(new double[] {1}, 1, 1).rank(2));
    }
}
