package lostwork.fluid;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.function.DoubleUnaryOperator;
import lostwork.fluid.BracketedNewton.Outcome;
import org.junit.jupiter.api.Test;

class BracketedNewtonTest {
    private final BracketedNewton search = new BracketedNewton();

    private Outcome run(double low, double high, double guess, DoubleUnaryOperator value, DoubleUnaryOperator slope) {
        search.start(low, high, false, false, guess, value.applyAsDouble(low) < value.applyAsDouble(high));
        double residual;
        do {
            residual = value.applyAsDouble(search.x);
        } while (search.next(residual, search.x - residual / slope.applyAsDouble(search.x)));
        return search.outcome;
    }

    @Test
    void takesNewtonStepsWhereTheyHelp() {
        assertEquals(Outcome.FOUND, run(0, 10, 1, x -> x * x - 2, x -> 2 * x));
        assertEquals(Math.sqrt(2), search.x, 1e-12);
        assertTrue(search.iterations <= 7, "iterations " + search.iterations);
    }

    @Test
    void findsRootsOfFallingFunctions() {
        assertEquals(Outcome.FOUND, run(0, 10, 5, x -> 1 - Math.log1p(x), x -> -1 / (1 + x)));
        assertEquals(Math.E - 1, search.x, 1e-12);
    }

    /** Newton's method runs away on the arc tangent from 3; the bracket holds it. */
    @Test
    void halvesTheBracketWhereNewtonFails() {
        assertEquals(Outcome.FOUND, run(-50, 40, 30, Math::atan, x -> 1 / (1 + x * x)));
        assertEquals(0, search.x, 1e-12);
        assertEquals(Outcome.FOUND, run(-50, 40, 30, Math::atan, x -> Double.NaN));
        assertEquals(0, search.x, 1e-10);
    }

    @Test
    void saysOnWhichSideTheRootLies() {
        assertEquals(Outcome.BELOW, run(1, 2, 1.5, x -> x, x -> 1));
        assertEquals(Outcome.ABOVE, run(1, 2, 1.5, x -> x - 3, x -> 1));
        assertEquals(Outcome.FOUND, run(1, 2, 1.5, x -> x - 2, x -> 1));
        assertEquals(Outcome.FOUND, run(1, 2, 1.5, x -> x - 1, x -> 1));
    }

    @Test
    void endsAtJumpsBetweenNeighbouringNumbers() {
        assertEquals(Outcome.STUCK, run(0, 10, 1, x -> x < Math.PI ? -1 : 1, x -> 1));
        assertEquals(Math.PI, search.high);
        assertEquals(Math.nextDown(Math.PI), search.low);
        assertTrue(search.iterations <= 200, "iterations " + search.iterations);
    }

    /** A seam of 1e-4 in the enthalpy is bridged: the value asked for comes back. A large one is refused by name. */
    @Test
    void bridgesSmallSeamsOnly() {
        final StatePoint out = new StatePoint();
        final FluidModel seam = new BrokenFluid(p -> {
            if (p.phase == Phase.VAPOUR && p.temperature > 450) {
                p.enthalpy += 100;
            }
        });
        seam.atTemperaturePressure(450, 1e5, out);
        final double inside = out.enthalpy + 40;
        seam.atPressureEnthalpy(1e5, inside, out);
        assertEquals(inside, out.enthalpy, 1e-6);
        assertEquals(450, out.temperature, 1e-9);
        final FluidModel gap = new BrokenFluid(p -> {
            if (p.phase == Phase.VAPOUR && p.temperature > 450) {
                p.enthalpy += 10_000;
            }
        });
        final FlashException refusal =
                assertThrows(FlashException.class, () -> gap.atPressureEnthalpy(1e5, inside + 4_000, out));
        assertTrue(refusal.getMessage().contains("jumps"), refusal::getMessage);
        assertTrue(refusal.iterations() <= 200 && refusal.residual() > 1e-4, refusal::getMessage);
        assertFalse(refusal.search().isEmpty());
    }
}
