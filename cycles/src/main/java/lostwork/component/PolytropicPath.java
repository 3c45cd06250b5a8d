package lostwork.component;

import java.util.Arrays;
import lostwork.fluid.FluidModel;
import lostwork.fluid.StatePoint;
import lostwork.solve.DifferentiableFunction;

/**
 * The integral ∫ (v/T) dp between two states, taken along the path of constant polytropic efficiency that joins them.
 *
 * <p>With dh = T ds + v dp and dh = v dp/η (compression) or dh = η v dp (expansion), the entropy grows in proportion to
 * ∫ z d(ln p), z = p v/T. So the path obeys ds/dt = κ z(p, s) with ln p linear in t from 0 to 1, and κ is the number that
 * makes it end at the entropy of the second state. For an ideal gas z is the gas constant, the path is a straight line in
 * ln p and s, and the integral is R ln(p₂/p₁) exactly.
 *
 * <p>The path is integrated by the classical fourth-order Runge–Kutta formula in {@value #STEPS} steps; κ by Newton
 * iteration, which is nearly linear. The gradient is that of the discrete formula, so it is exact for the value returned.
 * Where the path enters the two-phase region, z has a kink, and the step that crosses it is of second order.
 *
 * <p>Arguments: p₁ in Pa, h₁ in J/kg, p₂ in Pa, h₂ in J/kg; value in J/(kg K). One instance serves one thread.
 */
final class PolytropicPath implements DifferentiableFunction {
    private static final int STEPS = 8;
    private static final int ITERATIONS = 30;
    /** A miss of the end, against the entropies, below which one more Newton step leaves rounding only. */
    private static final double NEARLY = 1e-8;

    /** What the derivatives along the path are taken with respect to. */
    private static final int LOG_P1 = 0;

    private static final int LOG_P2 = 1;
    private static final int S1 = 2;
    private static final int KAPPA = 3;

    private final FluidModel model;
    private final StatePoint first = new StatePoint();
    private final StatePoint second = new StatePoint();
    private final StatePoint onPath = new StatePoint();

    private double logP1;
    private double logP2;
    private double kappa;
    /** ∫ z dt and its derivatives. */
    private double integral;

    private final double[] integralBy = new double[4];
    /** z at the present stage and its derivatives. */
    private double z;

    private final double[] zBy = new double[4];
    private final double[] stageSumBy = new double[4];

    PolytropicPath(FluidModel model) {
        this.model = model;
    }

    @Override
    public double value(double[] x, double[] gradient) {
        final double p1 = x[0];
        final double p2 = x[2];
        model.atPressureEnthalpy(p1, x[1], first);
        model.atPressureEnthalpy(p2, x[3], second);
        logP1 = Math.log(p1);
        logP2 = Math.log(p2);
        final double slope = shoot(first.entropy, second.entropy);
        final double span = logP2 - logP1;
        // κ moves so that the path still ends at s₂: d(s₁ + κ ∫ z dt) = ds₂.
        final double byEnd = integralBy[KAPPA] / slope;
        final double byLogP1 = integralBy[LOG_P1] - byEnd * kappa * integralBy[LOG_P1];
        final double byLogP2 = integralBy[LOG_P2] - byEnd * kappa * integralBy[LOG_P2];
        final double byS1 = integralBy[S1] - byEnd * (1 + kappa * integralBy[S1]);
        gradient[0] = (span * byLogP1 - integral) / p1 - span * byS1 * first.volume / first.temperature;
        gradient[1] = span * byS1 / first.temperature;
        gradient[2] = (span * byLogP2 + integral) / p2 - span * byEnd * second.volume / second.temperature;
        gradient[3] = span * byEnd / second.temperature;
        return span * integral;
    }

    /** Finds κ and leaves the integral with its derivatives; gives the slope of the entropy at the end by κ. */
    private double shoot(double s1, double s2) {
        final double scale = Math.max(Math.max(Math.abs(s1), Math.abs(s2)), z(first) + z(second));
        kappa = 2 * (s2 - s1) / (z(first) + z(second));
        for (int i = 0; i < ITERATIONS; i++) {
            integrate(s1);
            final double slope = integral + kappa * integralBy[KAPPA];
            final double miss = s1 + kappa * integral - s2;
            kappa -= miss / slope;
            if (Math.abs(miss) <= NEARLY * scale) {
                integral -= integralBy[KAPPA] * miss / slope;
                return slope;
            }
        }
        return Double.NaN;
    }

    private static double z(StatePoint point) {
        return point.pressure * point.volume / point.temperature;
    }

    private void integrate(double s1) {
        final double step = 1.0 / STEPS;
        integral = 0;
        Arrays.fill(integralBy, 0);
        final double[] sumBy = stageSumBy;
        for (int n = 0; n < STEPS; n++) {
            final double t = n * step;
            Arrays.fill(zBy, 0);
            z = 0;
            stage(s1, t, 0);
            double sum = z;
            System.arraycopy(zBy, 0, sumBy, 0, 4);
            stage(s1, t + step / 2, step / 2);
            sum += 2 * z;
            addTo(sumBy, 2);
            stage(s1, t + step / 2, step / 2);
            sum += 2 * z;
            addTo(sumBy, 2);
            stage(s1, t + step, step);
            sum += z;
            addTo(sumBy, 1);
            integral += step / 6 * sum;
            for (int k = 0; k < 4; k++) {
                integralBy[k] += step / 6 * sumBy[k];
            }
        }
    }

    private void addTo(double[] sumBy, double weight) {
        for (int k = 0; k < 4; k++) {
            sumBy[k] += weight * zBy[k];
        }
    }

    /** Evaluates z at t, at the entropy that the last z leads to over a length of the step. */
    private void stage(double s1, double t, double length) {
        final double area = integral + length * z;
        final double p = Math.exp(logP1 + t * (logP2 - logP1));
        model.atPressureEntropy(p, s1 + kappa * area, onPath);
        final double v = onPath.volume;
        final double temperature = onPath.temperature;
        final double vByP = onPath.volumeByPressureAtEnthalpy + v * onPath.volumeByEnthalpy;
        final double tByP = onPath.temperatureByPressureAtEnthalpy + v * onPath.temperatureByEnthalpy;
        z = p * v / temperature;
        final double byLogP = z * (1 + p * vByP / v - p * tByP / temperature);
        final double byS = p * (onPath.volumeByEnthalpy - v / temperature * onPath.temperatureByEnthalpy);
        for (int k = 0; k < 4; k++) {
            final double areaBy = integralBy[k] + length * zBy[k];
            final double sBy = kappa * areaBy + (k == S1 ? 1 : k == KAPPA ? area : 0);
            final double logPBy = k == LOG_P1 ? 1 - t : k == LOG_P2 ? t : 0;
            zBy[k] = byLogP * logPBy + byS * sBy;
        }
    }
}
