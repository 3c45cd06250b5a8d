package lostwork.component;

import java.util.Arrays;
import java.util.List;
import lostwork.fluid.FluidModel;

/**
 * The temperature difference between the two streams along an exchanger, hot less cold, as a function of the share z of
 * the duty, z = 0 at the end where the hot stream enters.
 *
 * <p>Finds the places that matter: both ends, the kinks where a stream begins or ends to boil or condense, and the smooth
 * minima between them. Each place carries its difference and the gradient of it with respect to the eight numbers that
 * describe the streams: pressure and enthalpy of the hot stream at z = 0 and z = 1, then those of the cold stream.
 *
 * <p>Keeps scratch values; one thread at a time; allocates nothing once made. SI units throughout.
 */
final class ExchangerProfile {
    static final int ARGUMENTS = 2 * ExchangerSide.ARGUMENTS;

    /** Pieces of a section between kinks in which a smooth minimum is looked for. */
    private static final int PIECES = 4;
    /** The same where a temperature bends strongly. */
    private static final int STRONGLY_BENT_PIECES = 16;
    /** How far inside a section its first and last slope are taken, as a share of the section. */
    private static final double INSIDE = 1e-6;

    private static final int MINIMUM_ITERATIONS = 60;
    /** A minimum is found when the difference cannot fall by more than this many kelvins. */
    private static final double MINIMUM_KELVIN = 1e-12;
    /** Two ends, four kinks, and a minimum for each piece of each section. */
    private static final int MOST_PLACES = 6 + 5 * STRONGLY_BENT_PIECES;

    /** A place along the exchanger. */
    static final class Place {
        double z;
        double difference;
        /** How the place moves; zero for an end, and for a smooth minimum, which is held while differentiating. */
        final double[] moves = new double[ARGUMENTS];
        /** The gradient of the difference, the move of the place included. */
        final double[] gradient = new double[ARGUMENTS];
    }

    private final ExchangerSide hot;
    private final ExchangerSide cold;
    private final Place[] places = new Place[MOST_PLACES];
    private int count;
    private int mainCount;

    private double difference;
    private double slope;

    ExchangerProfile(List<FluidModel> fluids) {
        hot = new ExchangerSide(fluids.get(0));
        cold = new ExchangerSide(fluids.get(1));
        Arrays.setAll(places, i -> new Place());
    }

    /** Takes the eight numbers and finds ends, kinks and smooth minima. */
    void set(double[] x) {
        hot.set(x, 0);
        cold.set(x, ExchangerSide.ARGUMENTS);
        count = 0;
        addEnd(0);
        addEnd(1);
        for (int k = 0; k < hot.kinks(); k++) {
            addKink(hot, cold, k, 0);
        }
        for (int k = 0; k < cold.kinks(); k++) {
            addKink(cold, hot, k, ExchangerSide.ARGUMENTS);
        }
        sort();
        mainCount = count;
        for (int i = 0; i + 1 < mainCount; i++) {
            addMinima(places[i].z, places[i + 1].z);
        }
        sort();
    }

    /** {@return whether a temperature may bend strongly between kinks} */
    boolean bendsStrongly() {
        return hot.bendsStrongly() || cold.bendsStrongly();
    }

    /** {@return how many places were found, in the order of z} */
    int places() {
        return count;
    }

    /** {@return a place} */
    Place place(int index) {
        return places[index];
    }

    /**
     * {@return the place with the smallest difference}
     *
     * <p>Of several with the same difference the first in the order of z is taken, so the gradient there, one of several
     * subgradients, is always the same one.
     */
    Place smallest() {
        Place smallest = places[0];
        for (int i = 1; i < count; i++) {
            if (places[i].difference < smallest.difference) {
                smallest = places[i];
            }
        }
        return smallest;
    }

    /** Evaluates the difference and its slope at a place. */
    void at(double z) {
        hot.at(z);
        cold.at(z);
        difference = hot.temperature() - cold.temperature();
        slope = hot.slope() - cold.slope();
    }

    /** {@return the difference evaluated last} */
    double difference() {
        return difference;
    }

    /** {@return the derivative of the difference evaluated last with respect to z} */
    double slope() {
        return slope;
    }

    /** Adds the partial derivatives of the difference evaluated last, at a fixed place, to a gradient. */
    void addGradient(double factor, double z, double[] gradient) {
        hot.addGradient(factor, z, gradient, 0);
        cold.addGradient(-factor, z, gradient, ExchangerSide.ARGUMENTS);
    }

    private void addEnd(double z) {
        at(z);
        take(z);
    }

    private void addKink(ExchangerSide side, ExchangerSide other, int index, int offset) {
        final double z = side.kink(index);
        side.atKink(index);
        other.at(z);
        difference = hot.temperature() - cold.temperature();
        slope = hot.slope() - cold.slope();
        final Place place = take(z);
        final double[] kinkGradient = side.kinkGradient(index);
        for (int k = 0; k < kinkGradient.length; k++) {
            place.moves[offset + k] = kinkGradient[k];
            place.gradient[offset + k] += slope * kinkGradient[k];
        }
    }

    /** Makes a place of what was evaluated last; it does not move. */
    private Place take(double z) {
        final Place place = places[count++];
        place.z = z;
        place.difference = difference;
        Arrays.fill(place.moves, 0);
        Arrays.fill(place.gradient, 0);
        addGradient(1, z, place.gradient);
        return place;
    }

    /** Insertion sort by z; places with the same z keep their order. */
    private void sort() {
        for (int i = 1; i < count; i++) {
            final Place place = places[i];
            int k = i;
            while (k > 0 && places[k - 1].z > place.z) {
                places[k] = places[k - 1];
                k--;
            }
            places[k] = place;
        }
    }

    // ------------------------------------------------------------------------------------------ smooth minima

    /** Looks for minima inside a section without kinks. */
    private void addMinima(double from, double to) {
        final double width = to - from;
        final int pieces = bendsStrongly() ? STRONGLY_BENT_PIECES : PIECES;
        double left = from + INSIDE * width;
        at(left);
        double leftDifference = difference;
        double leftSlope = slope;
        for (int i = 1; i <= pieces; i++) {
            final double right = i == pieces ? to - INSIDE * width : from + width * i / pieces;
            at(right);
            final double rightDifference = difference;
            final double rightSlope = slope;
            if (leftSlope < 0 && rightSlope > 0) {
                addMinimum(left, leftSlope, right, rightSlope);
            } else {
                addHidden(left, leftDifference, leftSlope, right, rightDifference, rightSlope);
            }
            left = right;
            leftDifference = rightDifference;
            leftSlope = rightSlope;
        }
    }

    /**
     * A piece with slopes of the same sign at both ends may still have a minimum inside, beside a maximum: the cubic
     * through both ends tells where, and the slope there decides.
     */
    private void addHidden(double a, double da, double sa, double b, double db, double sb) {
        final double w = b - a;
        final double mean = (db - da) / w;
        // The slope of the cubic is sa + (6 mean - 4 sa - 2 sb) t + 3 (sa + sb - 2 mean) t², t from 0 to 1.
        final double curve = 3 * (sa + sb - 2 * mean);
        final double linear = 6 * mean - 4 * sa - 2 * sb;
        final double root = linear * linear - 4 * curve * sa;
        if (!(root > 0)) {
            return;
        }
        // The slope of the cubic rises through zero at this root.
        final double t = -2 * sa / (linear + Math.sqrt(root));
        final double u = Double.isFinite(t) && t > 0 && t < 1 ? t : (-linear + Math.sqrt(root)) / (2 * curve);
        if (!(u > 0 && u < 1)) {
            return;
        }
        final double z = a + u * w;
        at(z);
        if (slope < 0 && sb > 0) {
            addMinimum(z, slope, b, sb);
        } else if (slope > 0 && sa < 0) {
            addMinimum(a, sa, z, slope);
        }
    }

    /** Finds the minimum between a falling and a rising slope (regula falsi, bisected where it is slow). */
    private void addMinimum(double from, double fromSlope, double to, double toSlope) {
        double a = from;
        double b = to;
        double sa = fromSlope;
        double sb = toSlope;
        double z = a;
        for (int i = 0; i < MINIMUM_ITERATIONS; i++) {
            final double secant = a - sa * (b - a) / (sb - sa);
            z = i % 3 != 2 && secant > a && secant < b ? secant : 0.5 * (a + b);
            at(z);
            if (Math.abs(slope) * (b - a) <= MINIMUM_KELVIN) {
                break;
            }
            if (slope < 0) {
                a = z;
                sa = slope;
            } else {
                b = z;
                sb = slope;
            }
        }
        take(z);
    }
}
