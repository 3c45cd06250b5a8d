package lostwork.fluid.water;

import java.util.function.DoubleBinaryOperator;

/**
 * A first guess of the temperature in region 5, for which R7-97(2012) has no backward equation.
 *
 * <p>A polynomial in the pressure and a property, which takes the temperatures of the basic equation at a few pairs; it
 * is made from the equation itself when the formulation is loaded and has no coefficients of its own. The pairs are the
 * roots of Chebyshev polynomials, so that the guess lies within 0.05 K everywhere (a test holds that). It is a start
 * only: the basic equation makes the temperature exact.
 */
final class If97Region5Start {
    private static final int VALUES = 7;
    private static final int PRESSURES = 4;

    private final double[] values;
    private final double[] pressures;
    /** Newton's divided differences, by value and then by pressure. */
    private final double[] differences = new double[VALUES * PRESSURES];

    /**
     * Makes the polynomial.
     *
     * @param temperature temperature in K at a pressure in Pa and a value, also a little beyond the region
     * @param lowest the lowest value in the region
     * @param highest the highest value in the region
     */
    If97Region5Start(DoubleBinaryOperator temperature, double lowest, double highest) {
        values = chebyshevRoots(lowest, highest, VALUES);
        pressures = chebyshevRoots(0, If97Equations.REGION_5_HIGHEST_PA, PRESSURES);
        for (int i = 0; i < VALUES; i++) {
            for (int j = 0; j < PRESSURES; j++) {
                differences[i * PRESSURES + j] = temperature.applyAsDouble(pressures[j], values[i]);
            }
        }
        for (int order = 1; order < VALUES; order++) {
            for (int i = VALUES - 1; i >= order; i--) {
                for (int j = 0; j < PRESSURES; j++) {
                    final int k = i * PRESSURES + j;
                    differences[k] = (differences[k] - differences[k - PRESSURES]) / (values[i] - values[i - order]);
                }
            }
        }
        for (int order = 1; order < PRESSURES; order++) {
            for (int j = PRESSURES - 1; j >= order; j--) {
                for (int i = 0; i < VALUES; i++) {
                    final int k = i * PRESSURES + j;
                    differences[k] = (differences[k] - differences[k - 1]) / (pressures[j] - pressures[j - order]);
                }
            }
        }
    }

    private static double[] chebyshevRoots(double from, double to, int count) {
        final double[] roots = new double[count];
        for (int k = 0; k < count; k++) {
            roots[k] = (from + to - (to - from) * Math.cos(Math.PI * (k + 0.5) / count)) / 2;
        }
        return roots;
    }

    /** {@return the guess in K} @param pressure in Pa @param value the property */
    double temperature(double pressure, double value) {
        final double p0 = pressure - pressures[0];
        final double p1 = pressure - pressures[1];
        final double p2 = pressure - pressures[2];
        double temperature = 0;
        for (int i = VALUES - 1, k = i * PRESSURES; i >= 0; i--, k -= PRESSURES) {
            final double along =
                    differences[k] + p0 * (differences[k + 1] + p1 * (differences[k + 2] + p2 * differences[k + 3]));
            temperature = temperature * (value - values[i]) + along;
        }
        return temperature;
    }
}
