package lostwork.process;

import java.util.function.DoubleUnaryOperator;
import lostwork.solve.ConvergenceException;

/**
 * Integrals along a smooth piece of a path, by adaptive Gauss–Kronrod quadrature with 7 and 15 nodes.
 *
 * <p>Nodes and weights: R. Piessens, E. de Doncker-Kapenga, C. Überhuber, D. Kahaner, QUADPACK, Springer 1983 (written
 * from memory; that the rule integrates polynomials up to degree 22 exactly is a test).
 */
final class PathIntegral {
    /** Where both rules agree to this share of the largest term, a part is done; far above rounding, far below 1e-8. */
    private static final double ACCURACY = 1e-12;

    /** A part that is this narrow holds a jump of the model at a region border and is taken as it is. */
    private static final double NARROWEST = 1e-11;

    private static final int LIMIT = 30_000;

    private static final double[] NODES = {
        0.991455371120812639206854697526329,
        0.949107912342758524526189684047851,
        0.864864423359769072789712788640926,
        0.741531185599394439863864773280788,
        0.586087235467691130294144691693013,
        0.405845151377397166906606412076961,
        0.207784955007898467600689403773245,
        0
    };
    private static final double[] KRONROD = {
        0.022935322010529224963732008058970,
        0.063092092629978553290700663189204,
        0.104790010322250183839876322541518,
        0.140653259715525918745189590510238,
        0.169004726639267902826583426598550,
        0.190350578064785409913256402421014,
        0.204432940075298892414161999234649,
        0.209482141084727828012999174891714
    };
    private static final double[] GAUSS = {
        0.129484966168869693270611432679082,
        0.279705391489276667901467771423780,
        0.381830050505118944950369775488975,
        0.417959183673469387755102040816327
    };

    private final String task;
    private final DoubleUnaryOperator integrand;
    private final double narrowest;
    private final double scale;
    private int evaluations;

    private PathIntegral(String task, DoubleUnaryOperator integrand, double from, double to, double scale) {
        this.task = task;
        this.integrand = integrand;
        narrowest = NARROWEST * Math.abs(to - from);
        this.scale = scale;
    }

    /**
     * {@return the integral of a function}
     *
     * @param task what is computed, for the message of a failure
     * @param integrand the function
     * @param from lower end
     * @param to upper end; below the lower one the integral changes its sign
     * @param scale the size of the terms that the integral is added to
     * @throws ConvergenceException if the accuracy is not reached within the limit of evaluations
     */
    static double of(String task, DoubleUnaryOperator integrand, double from, double to, double scale) {
        return from == to ? 0 : new PathIntegral(task, integrand, from, to, Math.abs(scale)).part(from, to);
    }

    private double part(double from, double to) {
        final double middle = 0.5 * (from + to);
        final double half = 0.5 * (to - from);
        double fine = 0;
        double coarse = 0;
        double size = 0;
        for (int i = 0; i < NODES.length; i++) {
            final boolean centre = i == NODES.length - 1;
            final double up = integrand.applyAsDouble(middle + half * NODES[i]);
            final double down = centre ? 0 : integrand.applyAsDouble(middle - half * NODES[i]);
            fine += KRONROD[i] * (up + down);
            size += KRONROD[i] * (Math.abs(up) + Math.abs(down));
            if (i % 2 == 1) {
                coarse += GAUSS[i / 2] * (up + down);
            }
        }
        evaluations += 2 * NODES.length - 1;
        final double error = Math.abs(half * (fine - coarse));
        if (error <= ACCURACY * Math.max(scale, Math.abs(half) * size) || Math.abs(to - from) <= narrowest) {
            return half * fine;
        }
        if (!(evaluations < LIMIT)) {
            throw new ConvergenceException(
                    task,
                    evaluations,
                    middle,
                    error,
                    "the quadrature does not settle",
                    "check the property model with FluidCheck, or split the step");
        }
        return part(from, middle) + part(middle, to);
    }
}
