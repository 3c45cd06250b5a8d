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
    /** Steps of a safeguarded Newton search; about six are used, bisection alone would need sixty. */
    private static final int STEP_LIMIT = 200;
    /** A Newton step this small, relative to the temperature, leaves an error of its square: none in a double. */
    private static final double LAST_STEP = 1e-9;

    /** Limits of the segments in K, ascending; one more than there are segments. */
    private final double[] limits;

    private final Segment[] segments;

    private CaloricCurve(double[] limits, Segment[] segments) {
        this.limits = limits;
        this.segments = segments;
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
        final double least = enthalpy(limits[0]) - slope * limits[0];
        final double most = enthalpy(highest()) - slope * highest();
        if (!(wanted >= least && wanted <= most)) {
            throw outside(name, wanted, least, most, unit, limitedBy);
        }
        int i = 0;
        double below = least;
        double above = most;
        while (i < segments.length - 1) {
            final double joint = limits[i + 1];
            above = segments[i].enthalpy(joint, Math.log(joint)) - slope * joint;
            if (wanted <= above) {
                break;
            }
            below = above;
            above = most;
            i++;
        }
        final Segment segment = segments[i];
        double low = limits[i];
        double high = limits[i + 1];
        double t = low + (high - low) * (wanted - below) / (above - below);
        for (int step = 0; step < STEP_LIMIT; step++) {
            final double excess = segment.enthalpy(t, Math.log(t)) - slope * t - wanted;
            if (excess == 0) {
                return t;
            }
            if (excess < 0) {
                low = t;
            } else {
                high = t;
            }
            final double newton = t - excess / (segment.heatCapacity(t) - slope);
            if (newton >= low && newton <= high) {
                if (Math.abs(newton - t) <= LAST_STEP * t) {
                    return newton;
                }
                t = newton;
            } else {
                final double middle = 0.5 * (low + high);
                if (middle <= low || middle >= high) {
                    return middle;
                }
                t = middle;
            }
        }
        final double left = segment.enthalpy(t, Math.log(t)) - slope * t - wanted;
        throw notFound(name, wanted, unit, limitedBy, t, left);
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
        final double least = entropy(limits[0]) - slope * Math.log(limits[0]);
        final double most = entropy(highest()) - slope * Math.log(highest());
        if (!(wanted >= least && wanted <= most)) {
            throw outside(name, wanted, least, most, unit, limitedBy);
        }
        int i = 0;
        double below = least;
        double above = most;
        while (i < segments.length - 1) {
            final double ln = Math.log(limits[i + 1]);
            above = segments[i].entropy(limits[i + 1], ln) - slope * ln;
            if (wanted <= above) {
                break;
            }
            below = above;
            above = most;
            i++;
        }
        final Segment segment = segments[i];
        double low = limits[i];
        double high = limits[i + 1];
        // The entropy is nearly linear in ln T.
        double t = low * Math.exp(Math.log(high / low) * (wanted - below) / (above - below));
        t = Math.min(Math.max(t, low), high);
        for (int step = 0; step < STEP_LIMIT; step++) {
            final double ln = Math.log(t);
            final double excess = segment.entropy(t, ln) - slope * ln - wanted;
            if (excess == 0) {
                return t;
            }
            if (excess < 0) {
                low = t;
            } else {
                high = t;
            }
            final double logStep = -excess / (segment.heatCapacity(t) - slope);
            final double newton = t * Math.exp(logStep);
            if (newton >= low && newton <= high) {
                if (Math.abs(logStep) <= LAST_STEP) {
                    return newton;
                }
                t = newton;
            } else {
                final double middle = 0.5 * (low + high);
                if (middle <= low || middle >= high) {
                    return middle;
                }
                t = middle;
            }
        }
        final double ln = Math.log(t);
        throw notFound(name, wanted, unit, limitedBy, t, segment.entropy(t, ln) - slope * ln - wanted);
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
