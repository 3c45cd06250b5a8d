package lostwork.solve;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;

class DenseLuTest {
    @Test
    void solvesASystemDoneByHand() {
        final DenseLu lu = DenseLu.ofCapacity(3);
        lu.factor(new double[] {2, 1, 1, 3}, 2);
        final double[] x = new double[2];
        lu.solve(new double[] {3, 5}, x);
        assertEquals(0.8, x[0], 1e-15);
        assertEquals(1.4, x[1], 1e-15);
        lu.factor(new double[] {0, 2, 0, 1, 0, 0, 0, 0, 4}, 3); // needs a row exchange
        final double[] y = {2, 3, 4};
        lu.solve(y, y);
        assertEquals(3, y[0]);
        assertEquals(1, y[1]);
        assertEquals(1, y[2]);
    }

    @Test
    void residualsOfRandomSystemsAreAtRounding() {
        final SplittableRandom random = new SplittableRandom(21);
        final DenseLu lu = DenseLu.ofCapacity(100);
        for (int trial = 0; trial < 200; trial++) {
            final int n = random.nextInt(1, 101);
            final double[] a = random.doubles((long) n * n, -1, 1).toArray();
            final double[] b = random.doubles(n, -1, 1).toArray();
            final double[] x = new double[n];
            lu.factor(a, n);
            lu.solve(b, x);
            assertTrue(backwardError(a, x, b, n, false) < 1e-13, () -> "order " + n);
            lu.solveTransposed(b, x);
            assertTrue(backwardError(a, x, b, n, true) < 1e-13, () -> "order " + n + ", transposed");
            assertTrue(lu.pivotGrowth() >= 0.5 && lu.pivotGrowth() < 100);
        }
    }

    /** Normwise backward error |b - Ax| / (|A| |x| + |b|), Higham 2002, theorem 7.1. */
    private static double backwardError(double[] a, double[] x, double[] b, int n, boolean transposed) {
        double worst = 0;
        double norm = 0;
        double sizeX = 0;
        double sizeB = 0;
        for (int i = 0; i < n; i++) {
            double rest = b[i];
            double row = 0;
            for (int j = 0; j < n; j++) {
                final double entry = transposed ? a[j * n + i] : a[i * n + j];
                rest -= entry * x[j];
                row += Math.abs(entry);
            }
            worst = Math.max(worst, Math.abs(rest));
            norm = Math.max(norm, row);
            sizeX = Math.max(sizeX, Math.abs(x[i]));
            sizeB = Math.max(sizeB, Math.abs(b[i]));
        }
        return worst / (norm * sizeX + sizeB);
    }

    /**
     * Condition numbers of Hilbert matrices in the 1-norm: order 3 has 748 exactly, order 4 has 28375, order 5 has 943656
     * (Higham 2002, section 28.1; the figures from memory, and confirmed by the known integer inverse below).
     */
    @Test
    void conditionOfHilbertMatrices() {
        final double[] published = {748, 28375, 943656};
        final DenseLu lu = DenseLu.ofCapacity(5);
        for (int n = 3; n <= 5; n++) {
            assertEquals(published[n - 3], conditionFromInverse(n), 1e-9 * published[n - 3]);
            lu.factor(hilbert(n), n);
            assertEquals(published[n - 3], 1 / lu.reciprocalCondition(), 1e-9 * published[n - 3]);
        }
    }

    static double[] hilbert(int n) {
        final double[] a = new double[n * n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                a[i * n + j] = 1.0 / (i + j + 1);
            }
        }
        return a;
    }

    /** The inverse has integer entries given by binomials, so its norm is exact. */
    private static double conditionFromInverse(int n) {
        double inverse = 0;
        double norm = 0;
        for (int j = 1; j <= n; j++) {
            double column = 0;
            double sum = 0;
            for (int i = 1; i <= n; i++) {
                column += (i + j - 1)
                        * binomial(n + i - 1, n - j)
                        * binomial(n + j - 1, n - i)
                        * Math.pow(binomial(i + j - 2, i - 1), 2);
                sum += 1.0 / (i + j - 1);
            }
            inverse = Math.max(inverse, column);
            norm = Math.max(norm, sum);
        }
        return norm * inverse;
    }

    private static double binomial(int n, int k) {
        double result = 1;
        for (int i = 1; i <= k; i++) {
            result = result * (n - k + i) / i;
        }
        return result;
    }

    /** The estimate is never below the true reciprocal condition number, and within a factor of ten above it. */
    @Test
    void conditionEstimateAgainstTheExplicitInverse() {
        final SplittableRandom random = new SplittableRandom(22);
        final DenseLu lu = DenseLu.ofCapacity(30);
        for (int trial = 0; trial < 500; trial++) {
            final int n = random.nextInt(1, 31);
            final double[] a = random.doubles((long) n * n, -1, 1).toArray();
            for (int i = 0; i < n; i++) { // rows of very different size
                final double factor = Math.pow(10, random.nextDouble(-4, 4));
                for (int j = 0; j < n; j++) {
                    a[i * n + j] *= factor;
                }
            }
            lu.factor(a, n);
            double norm = 0;
            double inverse = 0;
            for (int j = 0; j < n; j++) {
                final double[] unit = new double[n];
                unit[j] = 1;
                lu.solve(unit, unit);
                double column = 0;
                double sum = 0;
                for (int i = 0; i < n; i++) {
                    column += Math.abs(unit[i]);
                    sum += Math.abs(a[i * n + j]);
                }
                inverse = Math.max(inverse, column);
                norm = Math.max(norm, sum);
            }
            final double exact = 1 / (norm * inverse);
            final double estimate = lu.reciprocalCondition();
            assertTrue(estimate >= exact * (1 - 1e-9) && estimate <= 10 * exact, () -> estimate + " against " + exact);
        }
    }

    /**
     * A matrix whose inverse {@code I + θC} hides its size from the estimator's first vectors, since {@code Ce = Cᵀe = 0} and
     * C has an empty first column (after Higham 2002, section 15.4): only the alternating vector finds it.
     */
    @Test
    void conditionEstimateIsNotFooled() {
        final double theta = 1e6;
        final double phi = theta / (1 + 2 * theta);
        final DenseLu lu = DenseLu.ofCapacity(3);
        lu.factor(new double[] {1, 0, 0, 0, 1 - phi, phi, 0, phi, 1 - phi}, 3);
        final double exact = 1 / (1 + 2 * theta);
        final double estimate = lu.reciprocalCondition();
        assertTrue(estimate >= exact * (1 - 1e-9) && estimate <= 3 * exact, () -> estimate + " against " + exact);
    }

    @Test
    void aSingularMatrixIsReportedAndRefused() {
        final DenseLu lu = DenseLu.ofCapacity(3);
        lu.factor(new double[] {1, 2, 3, 2, 4, 6, 1, 0, 1}, 3);
        assertTrue(lu.isSingular());
        assertEquals(0, lu.reciprocalCondition());
        final SingularMatrixException e =
                assertThrows(SingularMatrixException.class, () -> lu.solve(new double[3], new double[3]));
        assertEquals(2, e.step());
        assertEquals(3, e.order());
        assertThrows(SingularMatrixException.class, () -> lu.solveTransposed(new double[3], new double[3]));
        lu.factor(new double[9], 3);
        assertTrue(lu.isSingular());
        lu.factor(new double[] {5}, 1);
        assertFalse(lu.isSingular());
        assertEquals(1, lu.reciprocalCondition());
    }

    @Test
    void aNearlySingularMatrixHasATinyReciprocalCondition() {
        final DenseLu lu = DenseLu.ofCapacity(12);
        lu.factor(hilbert(12), 12); // condition about 4e16 (Higham 2002, table 28.1, from memory)
        assertTrue(lu.reciprocalCondition() < 1e-15, () -> "" + lu.reciprocalCondition());
    }

    /** Wilkinson's matrix, for which partial pivoting reaches its bound: growth 2^(n-1). */
    @Test
    void growthOfWilkinsonsMatrix() {
        final int n = 20;
        final double[] a = new double[n * n];
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < i; j++) {
                a[i * n + j] = -1;
            }
            a[i * n + i] = 1;
            a[i * n + n - 1] = 1;
        }
        final DenseLu lu = DenseLu.ofCapacity(n);
        lu.factor(a, n);
        assertEquals(Math.pow(2, n - 1), lu.pivotGrowth());
    }

    @Test
    void badInputIsNamed() {
        final DenseLu lu = DenseLu.ofCapacity(2);
        assertThrows(IllegalStateException.class, () -> lu.solve(new double[2], new double[2]));
        assertThrows(IllegalArgumentException.class, () -> lu.factor(new double[9], 3));
        assertThrows(IllegalArgumentException.class, () -> lu.factor(new double[3], 2));
        final IllegalArgumentException e =
                assertThrows(IllegalArgumentException.class, () -> lu.factor(new double[] {1, 2, Double.NaN, 4}, 2));
        assertTrue(e.getMessage().contains("row 1, column 0"), e.getMessage());
        assertThrows(IllegalStateException.class, lu::isSingular);
        lu.factor(new double[] {1, 0, 0, 1}, 2);
        assertThrows(IllegalArgumentException.class, () -> lu.solve(new double[1], new double[2]));
        assertThrows(IllegalArgumentException.class, () -> DenseLu.ofCapacity(0));
    }
}
