package lostwork.solve;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.SplittableRandom;
import java.util.function.DoubleUnaryOperator;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class BracketedRootTest {
    private static final BracketedRoot ROOTS = BracketedRoot.limitedTo(300);

    /** Functions with roots known in closed form or defined by the function itself. */
    enum Case {
        LINEAR(x -> 3 * x - 1, x -> 3, 0, 1, 1.0 / 3),
        /** Fixed point of the cosine: 0.739085133215160641655... (OEIS A003957, from memory). */
        COSINE(x -> Math.cos(x) - x, x -> -Math.sin(x) - 1, 0, 1, 0.7390851332151607),
        /** Wallis' cubic x³ - 2x - 5, the classic test of Newton's method: 2.0945514815423265... */
        WALLIS(x -> x * x * x - 2 * x - 5, x -> 3 * x * x - 2, 2, 3, 2.0945514815423265),
        /** A wall: flat on one side, exponential on the other. */
        EXPONENTIAL_WALL(x -> Math.exp(40 * x) - 2, x -> 40 * Math.exp(40 * x), -10, 10, Math.log(2) / 40),
        /** Bounds over eighteen decades, as for a pressure. */
        DECADES(x -> Math.log(x / 1.7e-3), x -> 1 / x, 1e-9, 1e9, 1.7e-3),
        DECADES_LINEAR(x -> x - 1.7e-3, x -> 1, 1e-9, 1e9, 1.7e-3),
        /** Newton's method cycles or runs away from most starts. */
        ARC_TANGENT(x -> Math.atan(x - 0.3), x -> 1 / (1 + (x - 0.3) * (x - 0.3)), -1000, 5000, 0.3),
        CUBE_ROOT(x -> Math.cbrt(x - 0.7), x -> 1 / (3 * Math.pow(Math.cbrt(x - 0.7), 2)), -5, 20, 0.7),
        /** A root at a bound. */
        AT_BOUND(x -> x * (x - 2), x -> 2 * x - 2, 1, 2, 2),
        /** Infinite at one bound, as a logarithm of a pressure ratio is. */
        INFINITE_AT_BOUND(x -> Math.log(x) + 3, x -> 1 / x, 0, 10, Math.exp(-3)),
        /** Slopes of twelve decades meet at the root. */
        STEEP_KINK(x -> x < 0.4 ? (x - 0.4) * 1e-6 : (x - 0.4) * 1e6, x -> x < 0.4 ? 1e-6 : 1e6, -7, 9, 0.4);

        final DoubleUnaryOperator f;
        final DoubleUnaryOperator slope;
        final double lower;
        final double upper;
        final double root;

        Case(DoubleUnaryOperator f, DoubleUnaryOperator slope, double lower, double upper, double root) {
            this.f = f;
            this.slope = slope;
            this.lower = lower;
            this.upper = upper;
            this.root = root;
        }

        FunctionWithSlope withSlope() {
            return (x, at) -> at.set(f.applyAsDouble(x), slope.applyAsDouble(x));
        }

        double tolerance() {
            return 4 * Math.ulp(Math.max(1, Math.abs(root)));
        }
    }

    @ParameterizedTest
    @EnumSource
    void findsKnownRootsWithoutSlope(Case c) {
        final RootReport report = ROOTS.report(c.name(), c.f, c.lower, c.upper);
        assertEquals(c.root, report.root(), c.tolerance(), report::toString);
        assertEquals(c.f.applyAsDouble(report.root()), report.residual());
        assertTrue(report.iterations() <= 130, report::toString);
        assertEquals(report.root(), ROOTS.solve(c.name(), c.f, c.lower, c.upper));
    }

    @ParameterizedTest
    @EnumSource
    void findsKnownRootsWithSlopeFromAnyHint(Case c) {
        for (final double share : new double[] {-1, 0, 0.01, 0.3, 0.5, 0.99, 1, 2}) {
            final double hint = c.lower + share * (c.upper - c.lower);
            final RootReport report = ROOTS.report(c.name(), c.withSlope(), c.lower, c.upper, hint);
            assertEquals(c.root, report.root(), c.tolerance(), () -> report + " from " + hint);
            final RootReport plain = ROOTS.report(c.name(), c.f, c.lower, c.upper, hint);
            assertEquals(c.root, plain.root(), c.tolerance(), () -> plain + " from " + hint);
        }
    }

    @Test
    void aGoodHintSavesEvaluations() {
        final Case c = Case.WALLIS;
        final int without = ROOTS.report("cubic", c.f, -100, 100).iterations();
        final int with = ROOTS.report("cubic", c.f, -100, 100, 2.09).iterations();
        final int slope = ROOTS.report("cubic", c.withSlope(), -100, 100, 2.09).iterations();
        assertTrue(with < without && with <= 9, () -> with + " against " + without);
        assertTrue(slope <= 6, () -> "with slope " + slope);
    }

    @Test
    void neverAsksOutsideTheBounds() {
        final SplittableRandom random = new SplittableRandom(11);
        for (int i = 0; i < 2000; i++) {
            final double root = random.nextDouble(0.001, 1000);
            final double power = random.nextDouble(0.1, 9);
            final double lower = root * random.nextDouble();
            final double upper = root * (1 + random.nextDouble(0, 50));
            final double hint = random.nextDouble(lower - 1, upper + 1);
            final DoubleUnaryOperator f = x -> {
                assertTrue(x >= lower && x <= upper, () -> x + " outside " + lower + " .. " + upper);
                return Math.pow(x, power) - Math.pow(root, power);
            };
            final FunctionWithSlope withSlope = (x, at) -> at.set(f.applyAsDouble(x), power * Math.pow(x, power - 1));
            // Rounding of pow moves the sign change by a few units in the last place over the power.
            final double tolerance = root * (4e-16 + 4e-15 / power);
            assertEquals(root, ROOTS.solve("power", f, lower, upper), tolerance);
            assertEquals(root, ROOTS.solve("power", f, lower, upper, hint), tolerance);
            assertEquals(root, ROOTS.solve("power", withSlope, lower, upper, hint, new ValueAndSlope()), tolerance);
        }
    }

    /** The contract itself: a sign change within the stated accuracy, for accuracies of all sizes. */
    @Test
    void signChangeLiesWithinTheStatedAccuracy() {
        final SplittableRandom random = new SplittableRandom(12);
        for (int i = 0; i < 2000; i++) {
            final double root = random.nextDouble(-10, 10);
            final double steepness = Math.exp(random.nextDouble(-3, 6));
            final double accuracy = Math.pow(10, random.nextDouble(-12, -1));
            final DoubleUnaryOperator f = x -> Math.expm1(steepness * (x - root) / 10);
            final FunctionWithSlope withSlope =
                    (x, at) -> at.set(f.applyAsDouble(x), steepness / 10 * Math.exp(steepness * (x - root) / 10));
            final BracketedRoot rough = BracketedRoot.limitedTo(200).withAbsoluteAccuracy(accuracy);
            final double slack = accuracy * (1 + 1e-9) + 4e-15;
            assertEquals(root, rough.solve("exponential", f, -11, 11), slack);
            assertEquals(root, rough.solve("exponential", f, -11, 11, random.nextDouble(-11, 11)), slack);
            assertEquals(
                    root,
                    rough.solve("exponential", withSlope, -11, 11, random.nextDouble(-11, 11), new ValueAndSlope()),
                    slack);
        }
    }

    /** The relative accuracy counts from the root, whatever the size of the bounds. */
    @Test
    void relativeAccuracyCountsFromTheRoot() {
        final SplittableRandom random = new SplittableRandom(14);
        int most = 0;
        for (int i = 0; i < 2000; i++) {
            final double root = Math.pow(10, random.nextDouble(-8, 2));
            final double accuracy = Math.pow(10, random.nextDouble(-12, -1));
            final double power = random.nextDouble(0.2, 3);
            final DoubleUnaryOperator f = x -> Math.pow(x, power) - Math.pow(root, power);
            final FunctionWithSlope withSlope = (x, at) -> at.set(f.applyAsDouble(x), power * Math.pow(x, power - 1));
            final BracketedRoot rough = BracketedRoot.limitedTo(300).withRelativeAccuracy(accuracy);
            final double hint = root * random.nextDouble(0.5, 2);
            final double slack = root * (accuracy * 1.2 + 1e-13);
            final RootReport report = rough.report("power", f, 1e-9, 1e4);
            assertEquals(root, report.root(), slack);
            assertEquals(root, rough.solve("power", f, 1e-9, 1e4, hint), slack);
            assertEquals(root, rough.solve("power", withSlope, 1e-9, 1e4, hint, new ValueAndSlope()), slack);
            assertTrue(report.bracketWidth() <= accuracy * report.root() * (1 + 1e-9) + 1e-300, report::toString);
            most = Math.max(most, report.iterations());
        }
        final int worst = most;
        assertTrue(worst <= 120, () -> "worst " + worst);
    }

    @Test
    void stopsAtTheResidual() {
        final RootReport report = ROOTS.stoppingAtResidual(1e-3).report("cubic", Case.WALLIS.f, 2, 3);
        assertTrue(Math.abs(report.residual()) <= 1e-3 && report.residual() != 0, report::toString);
        assertTrue(
                report.iterations() < ROOTS.report("cubic", Case.WALLIS.f, 2, 3).iterations());
    }

    @Test
    void aWrongSlopeCostsEvaluationsButNotTheContract() {
        for (final double wrong : new double[] {-1, 0, 1e-30, 1e30, Double.NaN, Double.POSITIVE_INFINITY}) {
            final FunctionWithSlope f = (x, at) -> at.set(x * x * x - 2 * x - 5, wrong);
            final RootReport report = ROOTS.report("cubic", f, 2, 3, 2.5);
            assertEquals(Case.WALLIS.root, report.root(), 1e-15, report::toString);
        }
    }

    @Test
    void refusesAPole() {
        final ConvergenceException e =
                assertThrows(ConvergenceException.class, () -> ROOTS.solve("pole", x -> 1 / (x - 0.3), -1, 2));
        assertTrue(e.getMessage().contains("pole"), e.getMessage());
        assertEquals(0.3, e.bestPoint(), 1e-12);
        assertThrows(
                ConvergenceException.class,
                () -> ROOTS.report("pole", (x, at) -> at.set(1 / (x - 0.3), -1 / (x - 0.3) / (x - 0.3)), -1, 2, 1));
    }

    @Test
    void aJumpIsARootOnlyWhereNoResidualIsRequired() {
        final DoubleUnaryOperator jump = x -> x < 0.3 ? -2 : 5;
        assertEquals(0.3, ROOTS.solve("jump", jump, -1, 1), 1e-15);
        final ConvergenceException e = assertThrows(
                ConvergenceException.class, () -> ROOTS.requiringResidual(1e-6).solve("jump", jump, -1, 1));
        assertEquals(-2, e.residual());
    }

    @Test
    void sameSignAtBothBoundsIsAnErrorWithTheFacts() {
        final NoSignChangeException e = assertThrows(
                NoSignChangeException.class, () -> ROOTS.solve("dew point at 3 bar", x -> x * x + 1, -1, 3));
        assertEquals("dew point at 3 bar", e.task());
        assertEquals(-1, e.lower());
        assertEquals(3, e.upper());
        assertEquals(2, e.valueAtLower());
        assertEquals(10, e.valueAtUpper());
        assertTrue(
                e.getMessage().startsWith("dew point at 3 bar has no solution that is certain to lie in -1.0 .. 3.0"));
        assertThrows(NoSignChangeException.class, () -> ROOTS.solve("x", x -> x * x + 1, -1, 3, 2));
        assertThrows(
                NoSignChangeException.class, () -> ROOTS.report("x", (x, at) -> at.set(x * x + 1, 2 * x), -1, 3, 2));
    }

    @Test
    void theLimitEndsTheSearchWithTheBestPoint() {
        final BracketedRoot few = BracketedRoot.limitedTo(5);
        final ConvergenceException e =
                assertThrows(ConvergenceException.class, () -> few.solve("wall", Case.EXPONENTIAL_WALL.f, -10, 10));
        assertEquals(5, e.iterations());
        assertEquals(Case.EXPONENTIAL_WALL.f.applyAsDouble(e.bestPoint()), e.residual());
        assertThrows(
                ConvergenceException.class,
                () -> few.report("wall", Case.EXPONENTIAL_WALL.withSlope(), -10, 10, -9.99));
    }

    @Test
    void refusesNotANumber() {
        final ConvergenceException e =
                assertThrows(ConvergenceException.class, () -> ROOTS.solve("root of a root", Math::sqrt, -1, 1));
        assertEquals(-1, e.bestPoint());
        assertThrows(IllegalArgumentException.class, () -> ROOTS.solve("x", x -> x, Double.NaN, 1));
        assertThrows(IllegalArgumentException.class, () -> ROOTS.solve("x", x -> x, 2, 1));
        assertThrows(IllegalArgumentException.class, () -> ROOTS.solve("x", x -> x, -1, 1, Double.NaN));
        assertThrows(IllegalArgumentException.class, () -> ROOTS.withAbsoluteAccuracy(-1));
        assertThrows(IllegalArgumentException.class, () -> ROOTS.withRelativeAccuracy(Double.NaN));
        assertThrows(IllegalArgumentException.class, () -> BracketedRoot.limitedTo(3));
    }

    @Test
    void evaluationsStayWithinFourTimesBisection() {
        final SplittableRandom random = new SplittableRandom(13);
        int worst = 0;
        for (int i = 0; i < 2000; i++) {
            final double root = random.nextDouble(-1, 1);
            final int odd = 2 * random.nextInt(0, 12) + 1;
            final DoubleUnaryOperator f = x -> Math.pow(x - root, odd);
            final RootReport report =
                    ROOTS.withAbsoluteAccuracy(1e-12).report("odd power", f, -1 - random.nextDouble(), 2);
            worst = Math.max(worst, report.iterations());
        }
        final int bisections = 42; // log2(3 / 1e-12)
        final int found = worst;
        assertTrue(found <= 4 * bisections, () -> "worst " + found);
        assertFalse(found < 10, "the hard cases were not hard");
    }
}
