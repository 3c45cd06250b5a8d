package lostwork.component;

import java.util.Arrays;
import java.util.List;
import lostwork.component.ExchangerProfile.Place;
import lostwork.fluid.FluidModel;
import lostwork.solve.DifferentiableFunction;

/**
 * The mean temperature difference of an exchanger, 1/Δ<sub>m</sub> = ∫ dz/ΔT over the share z of the duty, in K. With it
 * UA = duty/Δ<sub>m</sub>. With constant heat capacities it is the logarithmic mean of the differences at the ends.
 *
 * <p>The integral is split at kinks and smooth minima, and each section into parts. Over each part, with differences a
 * and b at its ends and L the straight line between them,
 *
 * <pre>  ∫ dz/ΔT = (Δz/l) ∫ (L/ΔT) du,   u = ln(L/a)/ln(b/a) from 0 to 1,   l = (b − a)/ln(b/a),</pre>
 *
 * <p>which turns the near-singular 1/ΔT of a close approach into a factor close to 1; Gauss–Legendre does the rest and is
 * exact where ΔT is straight. The gradient is that of this formula, the places of the kinks included.
 *
 * <p>Where the streams touch or cross there is no mean. There the smallest difference, then zero or negative, takes its
 * place: continuous, finite, and rising with it, so that a bracketed search finds its way back.
 */
final class MeanDifference implements DifferentiableFunction {
    /** Parts of a section. */
    private static final int PARTS = 2;
    /** Parts of a section where a temperature bends strongly. */
    private static final int STRONGLY_BENT_PARTS = 8;

    private static final int NODES = 8;

    /** Gauss–Legendre nodes and weights on 0 .. 1; Abramowitz, Stegun, Handbook of Mathematical Functions, table 25.4. */
    private static final double[] NODE = new double[NODES];

    private static final double[] WEIGHT = new double[NODES];

    static {
        final double[] abscissa = {0.183434642495650, 0.525532409916329, 0.796666477413627, 0.960289856497536};
        final double[] weight = {0.362683783378362, 0.313706645877887, 0.222381034453374, 0.101228536290376};
        for (int i = 0; i < NODES / 2; i++) {
            NODE[i] = 0.5 * (1 - abscissa[NODES / 2 - 1 - i]);
            NODE[NODES - 1 - i] = 1 - NODE[i];
            WEIGHT[i] = 0.5 * weight[NODES / 2 - 1 - i];
            WEIGHT[NODES - 1 - i] = WEIGHT[i];
        }
    }

    /** Below this |ln(b/a)| series replace quotients that cancel. */
    private static final double NEARLY_EQUAL = 1e-3;

    private final ExchangerProfile profile;
    private final Place[] ends = {new Place(), new Place()};
    private final double[] derivative = new double[ExchangerProfile.ARGUMENTS];
    private double lowest;

    MeanDifference(List<FluidModel> fluids) {
        profile = new ExchangerProfile(fluids);
    }

    @Override
    public double value(double[] x, double[] gradient) {
        profile.set(x);
        final Place smallest = profile.smallest();
        if (!(smallest.difference > 0)) {
            System.arraycopy(smallest.gradient, 0, gradient, 0, ExchangerProfile.ARGUMENTS);
            return smallest.difference;
        }
        Arrays.fill(derivative, 0);
        lowest = smallest.difference;
        double integral = 0;
        for (int i = 0; i + 1 < profile.places(); i++) {
            integral += section(profile.place(i), profile.place(i + 1));
        }
        final double mean = 1 / integral;
        for (int k = 0; k < gradient.length; k++) {
            gradient[k] = -mean * mean * derivative[k];
        }
        return mean;
    }

    /** Integrates a section in parts of equal width. */
    private double section(Place from, Place to) {
        final int parts = profile.bendsStrongly() ? STRONGLY_BENT_PARTS : PARTS;
        double sum = 0;
        Place left = from;
        for (int i = 1; i <= parts; i++) {
            final Place right = i == parts ? to : between(from, to, (double) i / parts, ends[i % 2]);
            sum += part(left, right);
            left = right;
        }
        return sum;
    }

    private Place between(Place from, Place to, double share, Place out) {
        out.z = from.z + share * (to.z - from.z);
        profile.at(out.z);
        out.difference = Math.max(profile.difference(), lowest);
        Arrays.fill(out.gradient, 0);
        profile.addGradient(1, out.z, out.gradient);
        for (int k = 0; k < out.moves.length; k++) {
            out.moves[k] = from.moves[k] + share * (to.moves[k] - from.moves[k]);
            out.gradient[k] += profile.slope() * out.moves[k];
        }
        return out;
    }

    /** Integrates a part and adds its gradient, by reverse differentiation of the formula. */
    private double part(Place from, Place to) {
        final double width = to.z - from.z;
        if (!(width > 0)) {
            return 0;
        }
        final double a = from.difference;
        final double b = to.difference;
        final double r = Math.log(b / a);
        final double mean = a * growth(r);
        double sum = 0;
        double byA = 0;
        double byR = 0;
        double byWidth = 0;
        double byFrom = 0;
        for (int i = 0; i < NODES; i++) {
            final double u = NODE[i];
            final double share = share(r, u);
            final double line = a * Math.exp(r * u);
            final double z = from.z + width * share;
            profile.at(z);
            final double difference = Math.max(profile.difference(), lowest);
            final double term = WEIGHT[i] * line / difference;
            sum += term;
            byA += term / a;
            byR += term * u;
            // The difference falls out of the sum as 1/ΔT: its own gradient, and its move along the exchanger.
            final double byDifference = -term / difference;
            profile.addGradient(byDifference * width / mean, z, derivative);
            final double byPlace = byDifference * profile.slope();
            byFrom += byPlace;
            byWidth += byPlace * share;
            byR += byPlace * width * shareByR(r, u, share);
        }
        // integral = width · sum / mean,  mean = a growth(r),  r = ln b − ln a
        final double integral = width * sum / mean;
        final double scale = width / mean;
        final double toA = scale * byA - integral / a;
        final double toR = scale * byR - integral * growthSlope(r) / growth(r);
        final double toWidth = scale * byWidth + sum / mean;
        final double toFrom = scale * byFrom - toWidth;
        for (int k = 0; k < derivative.length; k++) {
            derivative[k] += (toA - toR / a) * from.gradient[k]
                    + toR / b * to.gradient[k]
                    + toFrom * from.moves[k]
                    + toWidth * to.moves[k];
        }
        return integral;
    }

    /** (eʳ − 1)/r. */
    private static double growth(double r) {
        return Math.abs(r) < NEARLY_EQUAL ? 1 + r / 2 * (1 + r / 3 * (1 + r / 4 * (1 + r / 5))) : Math.expm1(r) / r;
    }

    /** The derivative of {@link #growth}. */
    private static double growthSlope(double r) {
        return Math.abs(r) < NEARLY_EQUAL
                ? 0.5 + r * (1.0 / 3 + r * (1.0 / 8 + r * (1.0 / 30 + r / 144)))
                : (Math.exp(r) - growth(r)) / r;
    }

    /** (eʳᵘ − 1)/(eʳ − 1): how far along the part a node lies. */
    private static double share(double r, double u) {
        return u * growth(r * u) / growth(r);
    }

    /** The derivative of {@link #share} with respect to r. */
    private static double shareByR(double r, double u, double share) {
        return u * u * growthSlope(r * u) / growth(r) - share * growthSlope(r) / growth(r);
    }
}
