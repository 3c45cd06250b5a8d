package lostwork.fluid.gas;

import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import lostwork.quantity.OutOfRangeException;
import lostwork.solve.ConvergenceException;

/**
 * Heat capacity, enthalpy and entropy at standard pressure over temperature: the nine-coefficient form in its ranges,
 * in J/(mol K) and J/mol of one species, or in J/(kg K) and J/kg of a mixture.
 *
 * <p>The form is linear in its coefficients, so a mixture of fixed composition is again such a curve: its coefficients
 * are the weighted sums of those of its species, formed once.
 *
 * <p>The published ranges meet with jumps of about 1e-7 in H/RT and S/R, the rounding of their digits. The integration
 * constants of every range above the first are shifted here by that jump, so that enthalpy and entropy are continuous
 * and rise strictly, and T(h) and T(s) exist for every value between the ends.
 */
final class CaloricCurve {
    /** Steps of a safeguarded Newton search; about three are used, bisection alone would need sixty. */
    private static final int STEP_LIMIT = 200;
    /** After a Newton step this small, relative to the temperature, the error is its square: below a double's digits. */
    private static final double LAST_STEP = 1e-7;
    /** A value this far beyond an end of the range, relative to its terms, is taken as rounded from that end. */
    private static final double ROUNDING = 1e-14;

    /** Limits of the segments in K, ascending; one more than there are segments. */
    private final double[] limits;

    private final Segment[] segments;

    // Values at the limits, from the segment below except at the first.
    private final double[] logLimits;
    private final double[] enthalpies;
    private final double[] entropies;
    private final double[] heatCapacities;

    private CaloricCurve(double[] limits, Segment[] segments) {
        this.limits = limits;
        this.segments = segments;
        final int n = limits.length;
        logLimits = new double[n];
        enthalpies = new double[n];
        entropies = new double[n];
        heatCapacities = new double[n];
        for (int i = 0; i < n; i++) {
            final Segment below = segments[Math.max(i - 1, 0)];
            logLimits[i] = Math.log(limits[i]);
            enthalpies[i] = below.enthalpy(limits[i], logLimits[i]);
            entropies[i] = below.entropy(limits[i], logLimits[i]);
            heatCapacities[i] = below.heatCapacity(limits[i]);
        }
    }

    /**
     * Joins the published ranges of one species.
     *
     * @param limits limits of the ranges in K, ascending
     * @param coefficients a1 to a7, b1, b2 of each range, as printed
     * @param gasConstant the factor that takes the printed form to the wanted unit, J/(mol K)
     */
    static CaloricCurve ofRanges(double[] limits, double[][] coefficients, double gasConstant) {
        final Segment[] segments = new Segment[coefficients.length];
        for (int i = 0; i < segments.length; i++) {
            final double[] c = coefficients[i].clone();
            for (int k = 0; k < c.length; k++) {
                c[k] *= gasConstant;
            }
            segments[i] = new Segment(c);
            if (i > 0) {
                final double joint = limits[i];
                final double ln = Math.log(joint);
                c[7] += segments[i - 1].enthalpy(joint, ln) - segments[i].enthalpy(joint, ln);
                c[8] += segments[i - 1].entropy(joint, ln) - segments[i].entropy(joint, ln);
                segments[i] = new Segment(c);
            }
        }
        return new CaloricCurve(limits.clone(), segments);
    }

    /**
     * {@return the largest jump where two ranges meet: of cp/R relative, of H/RT, of S/R}
     *
     * @param limits limits of the ranges in K, ascending
     * @param coefficients a1 to a7, b1, b2 of each range, as printed
     */
    static double largestJump(double[] limits, double[][] coefficients) {
        double largest = 0;
        for (int i = 1; i < coefficients.length; i++) {
            final Segment below = new Segment(coefficients[i - 1]);
            final Segment above = new Segment(coefficients[i]);
            final double t = limits[i];
            final double ln = Math.log(t);
            largest = Math.max(largest, Math.abs(above.heatCapacity(t) / below.heatCapacity(t) - 1));
            largest = Math.max(largest, Math.abs(above.enthalpy(t, ln) - below.enthalpy(t, ln)) / t);
            largest = Math.max(largest, Math.abs(above.entropy(t, ln) - below.entropy(t, ln)));
        }
        return largest;
    }

    /**
     * {@return the weighted sum of curves, over the temperatures that all of them cover}
     *
     * @param curves the curves
     * @param weights a weight for each
     * @param entropyShift what is added to the entropy, such as that of mixing
     */
    static CaloricCurve sum(List<CaloricCurve> curves, double[] weights, double entropyShift) {
        double low = 0;
        double high = Double.POSITIVE_INFINITY;
        for (CaloricCurve curve : curves) {
            low = Math.max(low, curve.lowest());
            high = Math.min(high, curve.highest());
        }
        if (!(low < high)) {
            throw new IllegalArgumentException(String.format(
                    Locale.ROOT,
                    "the species have no temperature range in common: one begins at %s K, another ends at %s K",
                    low,
                    high));
        }
        final double from = low;
        final double to = high;
        final double[] limits = curves.stream()
                .flatMapToDouble(curve -> Arrays.stream(curve.limits))
                .filter(t -> t >= from && t <= to)
                .sorted()
                .distinct()
                .toArray();
        final Segment[] segments = new Segment[limits.length - 1];
        for (int i = 0; i < segments.length; i++) {
            final double inside = 0.5 * (limits[i] + limits[i + 1]);
            final double[] c = new double[9];
            for (int j = 0; j < curves.size(); j++) {
                curves.get(j).at(inside).addTo(c, weights[j]);
            }
            c[8] += entropyShift;
            segments[i] = new Segment(c);
        }
        return new CaloricCurve(limits, segments);
    }

    double lowest() {
        return limits[0];
    }

    double highest() {
        return limits[limits.length - 1];
    }

    /** {@return the segment of a temperature within the limits; at a joint the upper one} */
    Segment at(double temperature) {
        int i = 0;
        while (i < segments.length - 1 && temperature >= limits[i + 1]) {
            i++;
        }
        return segments[i];
    }

    double heatCapacity(double temperature) {
        return at(temperature).heatCapacity(temperature);
    }

    double enthalpy(double temperature) {
        return at(temperature).enthalpy(temperature, Math.log(temperature));
    }

    double entropy(double temperature) {
        return at(temperature).entropy(temperature, Math.log(temperature));
    }

    /**
     * {@return the temperature in K at which the enthalpy, less a multiple of the temperature, has a value}
     *
     * @param wanted the value, in the curve's energy unit
     * @param slope what is taken off per kelvin: 0 for the enthalpy, the gas constant for the internal energy
     * @param name what the value is called, for the message
     * @param unit its unit, for the message
     * @param limitedBy whose range it is, for the message
     */
    double temperatureAtEnthalpy(double wanted, double slope, String name, String unit, String limitedBy) {
        final int last = segments.length;
        final double least = enthalpies[0] - slope * limits[0];
        final double most = enthalpies[last] - slope * limits[last];
        if (!(wanted > least && wanted < most)) {
            return end(wanted, least, most, heatCapacities[last] * limits[last], name, unit, limitedBy);
        }
        int i = 0;
        while (i < last - 1 && wanted > enthalpies[i + 1] - slope * limits[i + 1]) {
            i++;
        }
        final Segment segment = segments[i];
        double low = limits[i];
        double high = limits[i + 1];
        double t = clipped(
                cubic(
                        wanted,
                        enthalpies[i] - slope * low,
                        enthalpies[i + 1] - slope * high,
                        low,
                        high,
                        1 / (heatCapacities[i] - slope),
                        1 / (heatCapacities[i + 1] - slope)),
                low,
                high);
        double excess = Double.NaN;
        for (int step = 0; step < STEP_LIMIT; step++) {
            excess = segment.enthalpy(t, Math.log(t)) - slope * t - wanted;
            if (excess <= 0) {
                low = t;
            }
            if (excess >= 0) {
                high = t;
            }
            final double newton = t - excess / (segment.heatCapacity(t) - slope);
            if (newton >= low && newton <= high && Math.abs(newton - t) <= LAST_STEP * t) {
                return newton;
            }
            final double next = newton >= low && newton <= high ? newton : 0.5 * (low + high);
            if (next == t) {
                return t;
            }
            t = next;
        }
        throw notFound(name, wanted, unit, limitedBy, t, excess);
    }

    /**
     * {@return the temperature in K at which the entropy at standard pressure, less a multiple of ln T, has a value}
     *
     * @param wanted the value, in the curve's entropy unit
     * @param slope the multiple: 0 where the pressure is fixed, the gas constant where the volume is
     * @param name what the value is called, for the message
     * @param unit its unit, for the message
     * @param limitedBy whose range it is, for the message
     */
    double temperatureAtEntropy(double wanted, double slope, String name, String unit, String limitedBy) {
        final int last = segments.length;
        final double least = entropies[0] - slope * logLimits[0];
        final double most = entropies[last] - slope * logLimits[last];
        if (!(wanted > least && wanted < most)) {
            return end(wanted, least, most, 10 * heatCapacities[last], name, unit, limitedBy);
        }
        int i = 0;
        while (i < last - 1 && wanted > entropies[i + 1] - slope * logLimits[i + 1]) {
            i++;
        }
        final Segment segment = segments[i];
        double low = limits[i];
        double high = limits[i + 1];
        // The entropy is nearly linear in ln T.
        double t = clipped(
                Math.exp(cubic(
                        wanted,
                        entropies[i] - slope * logLimits[i],
                        entropies[i + 1] - slope * logLimits[i + 1],
                        logLimits[i],
                        logLimits[i + 1],
                        1 / (heatCapacities[i] - slope),
                        1 / (heatCapacities[i + 1] - slope))),
                low,
                high);
        double excess = Double.NaN;
        for (int step = 0; step < STEP_LIMIT; step++) {
            final double ln = Math.log(t);
            excess = segment.entropy(t, ln) - slope * ln - wanted;
            if (excess <= 0) {
                low = t;
            }
            if (excess >= 0) {
                high = t;
            }
            final double newton = t - t * excess / (segment.heatCapacity(t) - slope);
            if (newton >= low && newton <= high && Math.abs(newton - t) <= LAST_STEP * t) {
                return newton;
            }
            final double next = newton >= low && newton <= high ? newton : 0.5 * (low + high);
            if (next == t) {
                return t;
            }
            t = next;
        }
        throw notFound(name, wanted, unit, limitedBy, t, excess);
    }

    /** {@return the cubic through two points with their slopes (Hermite), at x: a start within a few kelvins} */
    private static double cubic(double x, double x0, double x1, double y0, double y1, double slope0, double slope1) {
        final double width = x1 - x0;
        final double u = (x - x0) / width;
        final double v = 1 - u;
        return v * v * (1 + 2 * u) * y0 + u * u * (3 - 2 * u) * y1 + u * v * width * (v * slope0 - u * slope1);
    }

    private static double clipped(double t, double low, double high) {
        return Math.min(Math.max(t, low), high);
    }

    /** {@return the end of the range that a value not inside it stands for; refuses one that stands for none} */
    private double end(
            double wanted, double least, double most, double scale, String name, String unit, String limitedBy) {
        final double rounding = ROUNDING * (Math.max(Math.abs(least), Math.abs(most)) + scale);
        if (Math.abs(wanted - least) <= rounding) {
            return lowest();
        }
        if (Math.abs(wanted - most) <= rounding) {
            return highest();
        }
        throw outside(name, wanted, least, most, unit, limitedBy);
    }

    private OutOfRangeException outside(
            String name, double wanted, double least, double most, String unit, String limitedBy) {
        return new OutOfRangeException(
                name,
                wanted,
                least,
                most,
                unit,
                limitedBy,
                String.format(Locale.ROOT, "these are its values at %s K and %s K", lowest(), highest()));
    }

    private static ConvergenceException notFound(
            String name, double wanted, String unit, String limitedBy, double best, double residual) {
        return new ConvergenceException(
                String.format(Locale.ROOT, "temperature of %s at %s = %s %s", limitedBy, name, wanted, unit),
                STEP_LIMIT,
                best,
                residual,
                "the bracket did not close",
                "report it with these numbers");
    }

    /** One range: cp = a1/T² + a2/T + a3 + a4 T + a5 T² + a6 T³ + a7 T⁴ and its two integrals. */
    static final class Segment {
        private final double a1;
        private final double a2;
        private final double a3;
        private final double a4;
        private final double a5;
        private final double a6;
        private final double a7;
        private final double b1;
        private final double b2;
        // Coefficients of the integrals, divided once.
        private final double h4;
        private final double h5;
        private final double h6;
        private final double h7;
        private final double s1;
        private final double s5;
        private final double s6;
        private final double s7;

        Segment(double[] c) {
            a1 = c[0];
            a2 = c[1];
            a3 = c[2];
            a4 = c[3];
            a5 = c[4];
            a6 = c[5];
            a7 = c[6];
            b1 = c[7];
            b2 = c[8];
            h4 = a4 / 2;
            h5 = a5 / 3;
            h6 = a6 / 4;
            h7 = a7 / 5;
            s1 = a1 / 2;
            s5 = a5 / 2;
            s6 = a6 / 3;
            s7 = a7 / 4;
        }

        void addTo(double[] c, double weight) {
            c[0] += weight * a1;
            c[1] += weight * a2;
            c[2] += weight * a3;
            c[3] += weight * a4;
            c[4] += weight * a5;
            c[5] += weight * a6;
            c[6] += weight * a7;
            c[7] += weight * b1;
            c[8] += weight * b2;
        }

        double heatCapacity(double t) {
            return (a1 / t + a2) / t + a3 + t * (a4 + t * (a5 + t * (a6 + t * a7)));
        }

        double enthalpy(double t, double lnT) {
            return -a1 / t + a2 * lnT + b1 + t * (a3 + t * (h4 + t * (h5 + t * (h6 + t * h7))));
        }

        double entropy(double t, double lnT) {
            return (-s1 / t - a2) / t + a3 * lnT + b2 + t * (a4 + t * (s5 + t * (s6 + t * s7)));
        }
    }
}
