package lostwork.fluid.water;

import java.util.Arrays;
import java.util.TreeSet;

/**
 * A sum Σ n x<sup>I</sup> y<sup>J</sup> with integer exponents, and all its derivatives up to the second order in one pass.
 *
 * <p>Each power that occurs is made once, as the product of two smaller ones; the terms then need no more than
 * multiplications. The derivatives are the logarithmic ones, x ∂/∂x, which need no powers of their own; the callers
 * divide by x and y at the end, so these must not be 0.
 */
final class PowerSum {
    private final double[] coefficients;
    private final int[] firstSlots;
    private final int[] secondSlots;
    /** For each term I, J, I(I-1), J(J-1), I J. */
    private final double[] factors;

    private final int[] firstProgram;
    private final int[] secondProgram;

    private PowerSum(double[] coefficients, int[] first, int[] second) {
        this.coefficients = coefficients;
        final int terms = coefficients.length;
        factors = new double[5 * terms];
        for (int k = 0; k < terms; k++) {
            final double i = first[k];
            final double j = second[k];
            factors[5 * k] = i;
            factors[5 * k + 1] = j;
            factors[5 * k + 2] = i * (i - 1);
            factors[5 * k + 3] = j * (j - 1);
            factors[5 * k + 4] = i * j;
        }
        final int[] firstExponents = withDivisors(first);
        final int[] secondExponents = withDivisors(second);
        firstSlots = slots(first, firstExponents);
        secondSlots = slots(second, secondExponents);
        firstProgram = program(firstExponents);
        secondProgram = program(secondExponents);
    }

    /**
     * {@return the sum of a table}
     *
     * @param table the table
     * @param firstParts parts of one that the exponents of the first argument count in
     */
    static PowerSum of(CoefficientTable table, int firstParts) {
        final int terms = table.size();
        final double[] n = new double[terms];
        final int[] i = new int[terms];
        final int[] j = new int[terms];
        for (int k = 0; k < terms; k++) {
            n[k] = table.coefficient(k);
            i[k] = table.exponent(k, 0, firstParts);
            j[k] = table.exponent(k, 1, 1);
        }
        return new PowerSum(n, i, j);
    }

    /** All exponents needed to make the given ones as products of two, ordered by magnitude; 0, 1 and -1 come first. */
    private static int[] withDivisors(int[] exponents) {
        final TreeSet<Integer> needed = new TreeSet<>();
        for (int e : exponents) {
            need(e, needed);
        }
        return needed.stream()
                .sorted((a, b) -> Math.abs(a) == Math.abs(b) ? Integer.compare(b, a) : Math.abs(a) - Math.abs(b))
                .mapToInt(Integer::intValue)
                .toArray();
    }

    private static void need(int exponent, TreeSet<Integer> needed) {
        if (Math.abs(exponent) > 1 && needed.add(exponent)) {
            need(exponent / 2, needed);
            need(exponent - exponent / 2, needed);
        }
    }

    /** Slots 0, 1 and 2 hold the exponents 0, 1 and -1; the others follow in the order of the program. */
    private static int slot(int exponent, int[] made) {
        if (exponent == 0 || exponent == 1) {
            return exponent;
        }
        if (exponent == -1) {
            return 2;
        }
        for (int k = 0; k < made.length; k++) {
            if (made[k] == exponent) {
                return k + 3;
            }
        }
        throw new AssertionError("exponent " + exponent);
    }

    private static int[] slots(int[] exponents, int[] made) {
        return Arrays.stream(exponents).map(e -> slot(e, made)).toArray();
    }

    private static int[] program(int[] made) {
        final int[] program = new int[2 * made.length];
        for (int k = 0; k < made.length; k++) {
            program[2 * k] = slot(made[k] / 2, made);
            program[2 * k + 1] = slot(made[k] - made[k] / 2, made);
        }
        return program;
    }

    private static void fill(int[] program, double argument, double[] powers) {
        powers[0] = 1;
        powers[1] = argument;
        powers[2] = 1 / argument;
        for (int k = 0, target = 3; k < program.length; k += 2, target++) {
            powers[target] = powers[program[k]] * powers[program[k + 1]];
        }
    }

    /**
     * {@return the sum}
     *
     * @param x first argument
     * @param y second argument
     * @param space the room of this thread
     */
    double value(double x, double y, Workspace space) {
        final double[] xs = space.firstPowers;
        final double[] ys = space.secondPowers;
        fill(firstProgram, x, xs);
        fill(secondProgram, y, ys);
        double sum = 0;
        for (int k = 0; k < coefficients.length; k++) {
            sum += coefficients[k] * xs[firstSlots[k]] * ys[secondSlots[k]];
        }
        return sum;
    }

    /**
     * Makes the powers of the first argument, for evaluations at several second ones.
     *
     * @param x first argument, not 0
     * @param space the room of this thread; no other sum may use it before the last of the evaluations
     */
    void fixFirst(double x, Workspace space) {
        fill(firstProgram, x, space.firstPowers);
    }

    /**
     * Writes the sum and its logarithmic derivatives by the second argument into the workspace.
     *
     * @param y second argument, not 0
     * @param space the room of this thread, with the powers of {@link #fixFirst}
     */
    void evaluateBySecond(double y, Workspace space) {
        final double[] xs = space.firstPowers;
        final double[] ys = space.secondPowers;
        fill(secondProgram, y, ys);
        double value = 0;
        double t = 0;
        double tt = 0;
        for (int k = 0, m = 0; k < coefficients.length; k++, m += 5) {
            final double term = coefficients[k] * xs[firstSlots[k]] * ys[secondSlots[k]];
            value += term;
            t += factors[m + 1] * term;
            tt += factors[m + 3] * term;
        }
        space.value = value;
        space.t = t;
        space.tt = tt;
    }

    /**
     * Writes the sum and its logarithmic derivatives into the workspace.
     *
     * @param y second argument, not 0
     * @param space the room of this thread, with the powers of {@link #fixFirst}
     */
    void evaluate(double y, Workspace space) {
        final double[] xs = space.firstPowers;
        final double[] ys = space.secondPowers;
        fill(secondProgram, y, ys);
        double value = 0;
        double f = 0;
        double t = 0;
        double ff = 0;
        double tt = 0;
        double ft = 0;
        for (int k = 0, m = 0; k < coefficients.length; k++, m += 5) {
            final double term = coefficients[k] * xs[firstSlots[k]] * ys[secondSlots[k]];
            value += term;
            f += factors[m] * term;
            t += factors[m + 1] * term;
            ff += factors[m + 2] * term;
            tt += factors[m + 3] * term;
            ft += factors[m + 4] * term;
        }
        space.value = value;
        space.f = f;
        space.t = t;
        space.ff = ff;
        space.tt = tt;
        space.ft = ft;
    }
}
