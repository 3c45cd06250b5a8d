package lostwork.solve;

import java.util.function.DoubleUnaryOperator;
import org.jspecify.annotations.Nullable;

/**
 * Finds a root of a function of one variable between two bounds at which the function has opposite signs.
 *
 * <h2>Contract</h2>
 * <p>The root {@code x} that is returned lies within the bounds, and one of these holds:
 * <ul>
 *   <li>{@code |f(x)| <= stop}, with the residual of {@link #stoppingAtResidual};
 *   <li>the function changes its sign between {@code x} and a point that is not farther away than the largest of the
 *       absolute accuracy, the relative accuracy times {@code |x|}, and two units in the last place of {@code x}.
 * </ul>
 * <p>With {@link #requiringResidual} also {@code |f(x)| <= required} holds. Whatever cannot be kept within the limit of
 * evaluations ends in an exception. A pole is recognised and refused; a jump through zero counts as a sign change,
 * unless a residual is required.
 *
 * <h2>Method</h2>
 * <p>Without slope: inverse quadratic interpolation where it is safe, bisection where it is not (Chandrupatla 1997),
 * plus a bisection whenever three evaluations have not halved the bracket (the safeguard of Alefeld, Potra and Shi
 * 1995), so that at most about four times the evaluations of pure bisection are spent. A bracket that spans magnitudes
 * is bisected at its geometric mean. With slope: Newton steps inside a shrinking bracket under the same safeguard.
 *
 * <p>A hint starts the search beside it. If the sign change is found there, the bounds are never evaluated; if the hint
 * is useless, the bounds are. With several roots the one found need not be the one nearest to the hint.
 *
 * <h2>Example</h2>
 * <pre>{@code
 * var roots = BracketedRoot.limitedTo(80).withAbsoluteAccuracy(1e-9);
 * double x = roots.solve("cosine fixed point", t -> Math.cos(t) - t, 0, 1);
 * RootReport report = roots.report("cosine fixed point", t -> Math.cos(t) - t, 0, 1);
 * }</pre>
 *
 * <p>The {@code solve} forms allocate nothing unless they fail. Immutable and thread-safe.
 */
public final class BracketedRoot {
    /** Above this ratio of its ends a bracket is bisected at the geometric mean. */
    private static final double WIDE = 16;

    /** A residual that has grown by this factor while the bracket closed belongs to a pole. */
    private static final double POLE_GROWTH = 1e3;

    /** How many secant steps look for a sign change near a hint before the bounds are evaluated. */
    private static final int LOCAL_STEPS = 6;

    /** How many Newton steps are made before the bounds are evaluated. */
    private static final int FREE_STEPS = 8;

    private final int limit;
    private final double absoluteAccuracy;
    private final double relativeAccuracy;
    private final double stopResidual;
    private final double requiredResidual;

    private BracketedRoot(
            int limit, double absoluteAccuracy, double relativeAccuracy, double stopResidual, double requiredResidual) {
        this.limit = limit;
        this.absoluteAccuracy = absoluteAccuracy;
        this.relativeAccuracy = relativeAccuracy;
        this.stopResidual = stopResidual;
        this.requiredResidual = requiredResidual;
    }

    /**
     * {@return a search that goes to the limit of double precision}
     *
     * @param evaluations the highest number of evaluations of the function, at least 4
     * @throws IllegalArgumentException if the limit is below 4
     */
    public static BracketedRoot limitedTo(int evaluations) {
        if (evaluations < 4) {
            throw new IllegalArgumentException("limit of evaluations = " + evaluations + " must be at least 4");
        }
        return new BracketedRoot(evaluations, 0, 0, 0, Double.POSITIVE_INFINITY);
    }

    /**
     * {@return a search with another absolute accuracy}
     *
     * @param accuracy how far the sign change may be from the root, in the unit of the variable, 0 or above
     * @throws IllegalArgumentException if the accuracy is negative, NaN or infinite
     */
    public BracketedRoot withAbsoluteAccuracy(double accuracy) {
        return new BracketedRoot(
                limit,
                requireTolerance("absolute accuracy", accuracy),
                relativeAccuracy,
                stopResidual,
                requiredResidual);
    }

    /**
     * {@return a search with another relative accuracy}
     *
     * @param accuracy how far the sign change may be from the root, as a share of the root, 0 or above
     * @throws IllegalArgumentException if the accuracy is negative, NaN or infinite
     */
    public BracketedRoot withRelativeAccuracy(double accuracy) {
        return new BracketedRoot(
                limit,
                absoluteAccuracy,
                requireTolerance("relative accuracy", accuracy),
                stopResidual,
                requiredResidual);
    }

    /**
     * {@return a search that ends at the first point whose residual is small enough}
     *
     * @param residual the residual that is small enough, in the unit of the function, 0 or above
     * @throws IllegalArgumentException if the residual is negative, NaN or infinite
     */
    public BracketedRoot stoppingAtResidual(double residual) {
        return new BracketedRoot(
                limit,
                absoluteAccuracy,
                relativeAccuracy,
                requireTolerance("residual to stop at", residual),
                requiredResidual);
    }

    /**
     * {@return a search that fails where the residual at the enclosed sign change is too large, as at a jump}
     *
     * @param residual the largest residual of an acceptable root, in the unit of the function, 0 or above
     * @throws IllegalArgumentException if the residual is negative, NaN or infinite
     */
    public BracketedRoot requiringResidual(double residual) {
        return new BracketedRoot(
                limit,
                absoluteAccuracy,
                relativeAccuracy,
                stopResidual,
                requireTolerance("required residual", residual));
    }

    /**
     * {@return a root of a function between two bounds}
     *
     * @param task what is being computed, for the message of a failure
     * @param function the function, continuous; infinite values are allowed, NaN is refused
     * @param lower the lower bound
     * @param upper the upper bound, not below the lower
     * @throws NoSignChangeException if the function has the same sign at both bounds
     * @throws ConvergenceException if the contract cannot be kept
     * @throws IllegalArgumentException if the bounds are not finite or not in order
     */
    public double solve(String task, DoubleUnaryOperator function, double lower, double upper) {
        return search(task, function, lower, upper, Double.NaN, null);
    }

    /**
     * {@return a root of a function between two bounds, searched from a hint}
     *
     * @param task what is being computed, for the message of a failure
     * @param function the function, continuous; infinite values are allowed, NaN is refused
     * @param lower the lower bound
     * @param upper the upper bound, not below the lower
     * @param hint where the root is expected; outside the bounds the nearer bound is taken
     * @throws NoSignChangeException if no sign change is found near the hint or between the bounds
     * @throws ConvergenceException if the contract cannot be kept
     * @throws IllegalArgumentException if the bounds are not finite or not in order, or the hint is NaN
     */
    public double solve(String task, DoubleUnaryOperator function, double lower, double upper, double hint) {
        return search(task, function, lower, upper, requireHint(hint), null);
    }

    /**
     * {@return a root of a function with slope between two bounds, searched from a hint}
     *
     * @param task what is being computed, for the message of a failure
     * @param function the function with its slope; a wrong slope costs evaluations, never the contract
     * @param lower the lower bound
     * @param upper the upper bound, not below the lower
     * @param hint where the root is expected; outside the bounds the nearer bound is taken
     * @param workspace takes the values of the function; its content is overwritten
     * @throws NoSignChangeException if no sign change is found near the hint or between the bounds
     * @throws ConvergenceException if the contract cannot be kept
     * @throws IllegalArgumentException if the bounds are not finite or not in order, or the hint is NaN
     */
    public double solve(
            String task, FunctionWithSlope function, double lower, double upper, double hint, ValueAndSlope workspace) {
        return newton(task, function, lower, upper, requireHint(hint), workspace, null);
    }

    /**
     * {@return a root of a function between two bounds, with the proof}
     *
     * @param task what is being computed, for the message of a failure
     * @param function the function, continuous; infinite values are allowed, NaN is refused
     * @param lower the lower bound
     * @param upper the upper bound, not below the lower
     * @throws NoSignChangeException if the function has the same sign at both bounds
     * @throws ConvergenceException if the contract cannot be kept
     * @throws IllegalArgumentException if the bounds are not finite or not in order
     */
    public RootReport report(String task, DoubleUnaryOperator function, double lower, double upper) {
        final Trace trace = new Trace();
        return trace.reportOf(search(task, function, lower, upper, Double.NaN, trace));
    }

    /**
     * {@return a root of a function between two bounds, searched from a hint, with the proof}
     *
     * @param task what is being computed, for the message of a failure
     * @param function the function, continuous; infinite values are allowed, NaN is refused
     * @param lower the lower bound
     * @param upper the upper bound, not below the lower
     * @param hint where the root is expected; outside the bounds the nearer bound is taken
     * @throws NoSignChangeException if no sign change is found near the hint or between the bounds
     * @throws ConvergenceException if the contract cannot be kept
     * @throws IllegalArgumentException if the bounds are not finite or not in order, or the hint is NaN
     */
    public RootReport report(String task, DoubleUnaryOperator function, double lower, double upper, double hint) {
        final Trace trace = new Trace();
        return trace.reportOf(search(task, function, lower, upper, requireHint(hint), trace));
    }

    /**
     * {@return a root of a function with slope between two bounds, searched from a hint, with the proof}
     *
     * @param task what is being computed, for the message of a failure
     * @param function the function with its slope; a wrong slope costs evaluations, never the contract
     * @param lower the lower bound
     * @param upper the upper bound, not below the lower
     * @param hint where the root is expected; outside the bounds the nearer bound is taken
     * @throws NoSignChangeException if no sign change is found near the hint or between the bounds
     * @throws ConvergenceException if the contract cannot be kept
     * @throws IllegalArgumentException if the bounds are not finite or not in order, or the hint is NaN
     */
    public RootReport report(String task, FunctionWithSlope function, double lower, double upper, double hint) {
        final Trace trace = new Trace();
        return trace.reportOf(newton(task, function, lower, upper, requireHint(hint), new ValueAndSlope(), trace));
    }

    private double search(
            String task, DoubleUnaryOperator f, double lower, double upper, double hint, @Nullable Trace trace) {
        requireBounds(task, lower, upper);
        int n = 0;
        double a = Double.NaN; // one end of the bracket, the newest point
        double fa = Double.NaN;
        double b = Double.NaN; // the other end
        double fb = Double.NaN;
        boolean bracketed = false;

        if (!Double.isNaN(hint)) {
            // Two points beside each other at the hint, then secant steps that overshoot until the sign changes.
            a = Math.min(Math.max(hint, lower), upper);
            fa = value(task, f, a, ++n);
            if (Math.abs(fa) <= stopResidual) {
                return accept(task, a, fa, n, Double.POSITIVE_INFINITY, trace);
            }
            final double width = upper - lower;
            double step = Math.min(a == 0 ? 1e-3 * width : 1e-2 * Math.abs(a), 0.25 * width);
            for (int i = 0; i < LOCAL_STEPS && n < limit; i++) {
                double next = Math.min(Math.max(a + step, lower), upper);
                if (i == 0 && next != a + step) {
                    next = Math.max(a - step, lower);
                }
                if (!(Math.abs(next - a) > 0)) {
                    break;
                }
                final double fNext = value(task, f, next, ++n);
                if (Math.abs(fNext) <= stopResidual) {
                    return accept(task, next, fNext, n, Double.POSITIVE_INFINITY, trace);
                }
                b = a;
                fb = fa;
                a = next;
                fa = fNext;
                if (fa > 0 != fb > 0) {
                    bracketed = true;
                    break;
                }
                final double walked = a - b;
                if (Math.abs(fa) > Math.abs(fb)) { // keep the better of the two as the newest
                    final double x = a;
                    a = b;
                    b = x;
                    final double y = fa;
                    fa = fb;
                    fb = y;
                }
                final double secant = -fa * (a - b) / (fa - fb);
                if (Double.isNaN(secant) || Double.isInfinite(secant) || secant == 0) {
                    break;
                }
                final double least = tolerance(a, a);
                step = Math.copySign(Math.min(Math.max(1.3 * Math.abs(secant), least), 20 * Math.abs(walked)), secant);
            }
        }
        if (!bracketed) {
            final double fLower = value(task, f, lower, ++n);
            if (Math.abs(fLower) <= stopResidual) {
                return accept(task, lower, fLower, n, Double.POSITIVE_INFINITY, trace);
            }
            final double fUpper = value(task, f, upper, ++n);
            if (Math.abs(fUpper) <= stopResidual) {
                return accept(task, upper, fUpper, n, Double.POSITIVE_INFINITY, trace);
            }
            if (fLower > 0 == fUpper > 0) {
                throw new NoSignChangeException(task, lower, upper, fLower, fUpper);
            }
            if (fa > 0 == fLower > 0 && !Double.isNaN(fa)) { // the point at the hint still narrows the bracket
                b = upper;
                fb = fUpper;
            } else if (!Double.isNaN(fa)) {
                b = lower;
                fb = fLower;
            } else {
                a = upper;
                fa = fUpper;
                b = lower;
                fb = fLower;
            }
        }

        final double startSize = Math.max(Math.abs(fa), Math.abs(fb));
        double c = b; // the point before, for the interpolation
        double fc = fb;
        boolean haveThree = false;
        double widthBefore = Math.abs(a - b);
        int sinceHalved = 0;
        while (true) {
            final boolean aIsBest = Math.abs(fa) < Math.abs(fb);
            final double best = aIsBest ? a : b;
            final double fBest = aIsBest ? fa : fb;
            final double width = Math.abs(b - a);
            final double tolerance = tolerance(a, b);
            if (width <= tolerance) {
                requireNoPole(task, best, fBest, startSize, n);
                return accept(task, best, fBest, n, width, trace);
            }
            if (n >= limit) {
                throw exhausted(task, n, best, fBest);
            }
            if (width <= 0.5 * widthBefore) {
                widthBefore = width;
                sinceHalved = 0;
            } else {
                sinceHalved++;
            }
            double x = Double.NaN;
            if (sinceHalved < 3) {
                double t; // share of the way from a to b
                if (haveThree) {
                    final double xi = (a - b) / (c - b);
                    final double phi = (fa - fb) / (fc - fb);
                    if (phi * phi < xi && (1 - phi) * (1 - phi) < 1 - xi) {
                        t = fa / (fb - fa) * (fc / (fb - fc)) + (c - a) / (b - a) * (fa / (fc - fa)) * (fb / (fc - fb));
                    } else {
                        t = Double.NaN;
                    }
                } else {
                    t = fa / (fa - fb);
                }
                if (t > 0 && t < 1) {
                    final double least = 0.5 * tolerance / width;
                    t = Math.min(Math.max(t, least), 1 - least);
                    x = a + t * (b - a);
                }
            }
            if (!(x > Math.min(a, b) && x < Math.max(a, b))) {
                x = middle(a, b);
                if (sinceHalved >= 3) {
                    sinceHalved = 0;
                    widthBefore = width;
                }
            }
            final double fx = value(task, f, x, ++n);
            if (Math.abs(fx) <= stopResidual) {
                return accept(task, x, fx, n, fx == 0 ? 0 : width, trace);
            }
            if (fx > 0 == fa > 0) {
                c = a;
                fc = fa;
            } else {
                c = b;
                fc = fb;
                b = a;
                fb = fa;
            }
            a = x;
            fa = fx;
            haveThree = true;
        }
    }

    private double newton(
            String task,
            FunctionWithSlope f,
            double lower,
            double upper,
            double hint,
            ValueAndSlope at,
            @Nullable Trace trace) {
        requireBounds(task, lower, upper);
        int n = 0;
        double x = Math.min(Math.max(hint, lower), upper);
        double fx = value(task, f, x, at, ++n);
        if (Math.abs(fx) <= stopResidual) {
            return accept(task, x, fx, n, Double.POSITIVE_INFINITY, trace);
        }
        double slope = at.slope();

        // Free Newton steps while each at least halves the residual and stays within the bounds.
        double other = Double.NaN; // a point of the other sign
        double fOther = Double.NaN;
        for (int i = 0; i < FREE_STEPS && n + 2 < limit; i++) {
            final double step = overshoot(-fx / slope, 0.5 * tolerance(x, x));
            final double next = x + step;
            if (!(next >= lower && next <= upper) || next == x) {
                break;
            }
            final double fNext = value(task, f, next, at, ++n);
            if (Math.abs(fNext) <= stopResidual) {
                return accept(task, next, fNext, n, Double.POSITIVE_INFINITY, trace);
            }
            final double sizeBefore = Math.abs(fx);
            if (fNext > 0 != fx > 0) {
                other = x;
                fOther = fx;
                x = next;
                fx = fNext;
                slope = at.slope();
                break;
            }
            if (Math.abs(fNext) < sizeBefore) {
                x = next;
                fx = fNext;
                slope = at.slope();
            }
            if (!(Math.abs(fNext) <= 0.5 * sizeBefore)) {
                break;
            }
        }
        if (Double.isNaN(other)) {
            final double fLower = x == lower ? fx : value(task, f, lower, at, ++n);
            if (Math.abs(fLower) <= stopResidual) {
                return accept(task, lower, fLower, n, Double.POSITIVE_INFINITY, trace);
            }
            final double fUpper = x == upper ? fx : value(task, f, upper, at, ++n);
            if (Math.abs(fUpper) <= stopResidual) {
                return accept(task, upper, fUpper, n, Double.POSITIVE_INFINITY, trace);
            }
            if (fLower > 0 == fUpper > 0) {
                throw new NoSignChangeException(task, lower, upper, fLower, fUpper);
            }
            if (fx > 0 == fLower > 0) {
                other = upper;
                fOther = fUpper;
            } else {
                other = lower;
                fOther = fLower;
            }
        }

        final double startSize = Math.max(Math.abs(fx), Math.abs(fOther));
        double widthBefore = Math.abs(x - other);
        int sinceHalved = 0;
        while (true) { // x is the newest point and has the slope; the bracket is x .. other
            final double width = Math.abs(other - x);
            final double tolerance = tolerance(x, other);
            final boolean newestIsBest = Math.abs(fx) <= Math.abs(fOther);
            final double best = newestIsBest ? x : other;
            final double fBest = newestIsBest ? fx : fOther;
            if (width <= tolerance) {
                requireNoPole(task, best, fBest, startSize, n);
                return accept(task, best, fBest, n, width, trace);
            }
            if (n >= limit) {
                throw exhausted(task, n, best, fBest);
            }
            if (width <= 0.5 * widthBefore) {
                widthBefore = width;
                sinceHalved = 0;
            } else {
                sinceHalved++;
            }
            double next = sinceHalved < 3 ? x + overshoot(-fx / slope, 0.5 * tolerance) : Double.NaN;
            if (!(next > Math.min(x, other) && next < Math.max(x, other))) {
                next = middle(x, other);
                if (sinceHalved >= 3) {
                    sinceHalved = 0;
                    widthBefore = width;
                }
            }
            final double fNext = value(task, f, next, at, ++n);
            if (Math.abs(fNext) <= stopResidual) {
                return accept(task, next, fNext, n, fNext == 0 ? 0 : width, trace);
            }
            if (fNext > 0 != fx > 0) {
                other = x;
                fOther = fx;
            }
            x = next;
            fx = fNext;
            slope = at.slope();
        }
    }

    /** A step that goes on by {@code least}, so that the last steps cross the root and close the bracket. */
    private static double overshoot(double step, double least) {
        return Math.abs(step) < least ? step + Math.copySign(0.5 * least, step) : step;
    }

    private double tolerance(double a, double b) {
        final double ulp = 2 * Math.ulp(Math.max(Math.abs(a), Math.abs(b)));
        return Math.max(Math.max(absoluteAccuracy, relativeAccuracy * Math.min(Math.abs(a), Math.abs(b))), ulp);
    }

    private static double middle(double a, double b) {
        final double ratio = b / a;
        if (ratio > WIDE && ratio < Double.POSITIVE_INFINITY || ratio > 0 && ratio < 1 / WIDE) {
            return Math.copySign(Math.sqrt(Math.abs(a)) * Math.sqrt(Math.abs(b)), a);
        }
        return 0.5 * a + 0.5 * b;
    }

    private static double value(String task, DoubleUnaryOperator f, double x, int n) {
        final double y = f.applyAsDouble(x);
        if (Double.isNaN(y)) {
            throw notANumber(task, x, n);
        }
        return y;
    }

    private static double value(String task, FunctionWithSlope f, double x, ValueAndSlope at, int n) {
        f.evaluate(x, at);
        if (Double.isNaN(at.value())) {
            throw notANumber(task, x, n);
        }
        return at.value();
    }

    private double accept(String task, double x, double fx, int n, double width, @Nullable Trace trace) {
        if (!(Math.abs(fx) <= requiredResidual)) {
            throw new ConvergenceException(
                    task,
                    n,
                    x,
                    fx,
                    "the residual changes its sign without becoming as small as " + requiredResidual,
                    "the function jumps here: treat both sides of the jump on their own");
        }
        if (trace != null) {
            trace.residual = fx;
            trace.iterations = n;
            trace.bracketWidth = fx == 0 ? 0 : width;
        }
        return x;
    }

    private static void requireNoPole(String task, double x, double fx, double startSize, int n) {
        if (!(Math.abs(fx) <= POLE_GROWTH * startSize)) {
            throw new ConvergenceException(
                    task,
                    n,
                    x,
                    fx,
                    "the residual grows where it changes its sign, as at a pole",
                    "choose bounds that leave the pole out");
        }
    }

    private ConvergenceException exhausted(String task, int n, double x, double fx) {
        return new ConvergenceException(
                task,
                n,
                x,
                fx,
                "the limit of evaluations is reached",
                "raise the limit, state an absolute accuracy (needed for a root at 0), or narrow the bounds");
    }

    private static ConvergenceException notANumber(String task, double x, int n) {
        return new ConvergenceException(
                task,
                n,
                x,
                Double.NaN,
                "the function is not a number at the point",
                "choose bounds within which the function is defined");
    }

    private static void requireBounds(String task, double lower, double upper) {
        if (!(lower > Double.NEGATIVE_INFINITY && lower <= upper && upper < Double.POSITIVE_INFINITY)) {
            throw new IllegalArgumentException(
                    task + ": bounds " + lower + " .. " + upper + " must be finite and in order");
        }
    }

    private static double requireHint(double hint) {
        if (Double.isNaN(hint)) {
            throw new IllegalArgumentException("hint is not a number; use the form without a hint");
        }
        return hint;
    }

    private static double requireTolerance(String what, double value) {
        if (!(value >= 0 && value < Double.POSITIVE_INFINITY)) {
            throw new IllegalArgumentException(what + " = " + value + " must be finite and 0 or above");
        }
        return value;
    }

    /** Takes what a report needs besides the root. */
    private static final class Trace {
        private double residual;
        private int iterations;
        private double bracketWidth;

        RootReport reportOf(double root) {
            return new RootReport(root, residual, iterations, bracketWidth);
        }
    }
}
