package lostwork.process;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.concurrent.atomic.AtomicInteger;
import lostwork.solve.ConvergenceException;
import org.junit.jupiter.api.Test;

class PathIntegralTest {
    /** The 15-node Kronrod rule is exact up to degree 22, the 7-node Gauss rule inside it up to degree 13. */
    @Test
    void integratesPolynomialsExactly() {
        for (int degree = 0; degree <= 22; degree++) {
            final int n = degree;
            assertEquals(1.0 / (n + 1), PathIntegral.of("x^n", x -> Math.pow(x, n), 0, 1, 1), 2e-15, "degree " + n);
        }
    }

    @Test
    void firstPassIsEnoughWhereBothRulesAreExact() {
        final AtomicInteger calls = new AtomicInteger();
        PathIntegral.of(
                "x^13",
                x -> {
                    calls.incrementAndGet();
                    return Math.pow(x, 13);
                },
                0,
                1,
                0);
        assertEquals(15, calls.get());
    }

    @Test
    void changesItsSignWithTheDirection() {
        assertEquals(-PathIntegral.of("e^x", Math::exp, 0, 2, 0), PathIntegral.of("e^x", Math::exp, 2, 0, 0), 1e-15);
        assertEquals(0, PathIntegral.of("e^x", Math::exp, 2, 2, 0));
    }

    @Test
    void findsKinksAndJumpsByItself() {
        assertEquals(
                0.5 * (0.3 * 0.3 + 0.7 * 0.7), PathIntegral.of("|x - 0.3|", x -> Math.abs(x - 0.3), 0, 1, 1), 1e-11);
        assertEquals(1 + 1e-3 * 0.7, PathIntegral.of("a jump", x -> x < 0.3 ? 1 : 1.001, 0, 1, 1), 1e-11);
    }

    @Test
    void refusesWhatDoesNotSettle() {
        final AtomicInteger calls = new AtomicInteger();
        final ConvergenceException refusal = assertThrows(
                ConvergenceException.class,
                () -> PathIntegral.of("noise", x -> calls.incrementAndGet() * 7919 % 104729, 0, 1, 0));
        assertTrue(refusal.getMessage().startsWith("noise did not converge"), refusal.getMessage());
        assertTrue(calls.get() < 40_000, "evaluations " + calls);
    }
}
