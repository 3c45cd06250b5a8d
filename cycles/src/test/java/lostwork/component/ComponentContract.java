package lostwork.component;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import lostwork.plant.Component;
import lostwork.plant.HeatPort;
import lostwork.plant.MaterialPort;
import lostwork.plant.Port;
import lostwork.plant.ShaftPort;
import lostwork.plant.Solution;
import lostwork.plant.SolveOptions;
import lostwork.plant.Specification;
import lostwork.plant.Variable;
import lostwork.plant.WirePort;
import lostwork.quantity.ScalarQuantity;
import lostwork.testing.Campaign;
import org.junit.jupiter.api.Test;

/**
 * What every component keeps, checked on random cases: mass and energy close, no entropy is destroyed, the derivatives are
 * those of the equations, and the solution does not depend on which of its own values are given.
 *
 * <p>A test of a component extends this class and says how to draw a case.
 */
abstract class ComponentContract {
    /** Room for the truncation of central differences, relative. */
    private static final double DERIVATIVES = 1e-6;

    private static final int CASES = 40;
    /** Relative step of the central differences; the error of a difference is about its square plus 1e-16 over it. */
    private static final double STEP = 1e-4;

    /**
     * One case: a component in a small plant, and what is given.
     *
     * @param component the component
     * @param specification what is given, at a point where a real machine could work
     */
    record Case(Component component, Specification specification) {}

    /** Draws a case. */
    abstract Case draw(SplittableRandom random);

    /** Draws a case whose equations have no kink nearby, for the comparison with differences. */
    Case drawSmooth(SplittableRandom random) {
        return draw(random);
    }

    @Test
    final void balancesCloseAndNoEntropyIsDestroyed() {
        final SplittableRandom random = new SplittableRandom(20_261_201L);
        for (int i = 0; i < Campaign.cases(CASES); i++) {
            final Case c = draw(random);
            final Solution s = c.specification().solve();
            assertEquals(0, s.closure().mass(), 1e-12, () -> "mass\n" + s);
            assertEquals(0, s.closure().energy(), 1e-12, () -> "energy\n" + s);
            assertEquals(List.of(), s.violations(), s::toString);
            assertTrue(
                    s.entropyGeneration(c.component()).si() >= -1e-9 * largestEntropyFlow(s, c.component()),
                    () -> "entropy " + s.entropyGeneration(c.component()) + "\n" + s);
        }
    }

    private static double largestEntropyFlow(Solution s, Component component) {
        double largest = 0;
        for (Port port : component.ports()) {
            if (port instanceof MaterialPort m) {
                largest = Math.max(
                        largest,
                        Math.abs(s.value(m.flow()).si() * s.value(m.entropy()).si()));
            }
        }
        return largest;
    }

    /** Every value of the component against every given one, by the exact derivative and by solving again beside it. */
    @Test
    final void derivativesAreThoseOfTheEquations() {
        final SplittableRandom random = new SplittableRandom(31_415L);
        int compared = 0;
        for (int i = 0; i < 6; i++) {
            final Case c = drawSmooth(random);
            final Solution s = c.specification().solve();
            for (Variable<?> given : c.specification().givenVariables()) {
                final double centre = s.value(given).si();
                final double step =
                        STEP * Math.max(Math.abs(centre), 1e-3 * given.kind().naturalScale());
                final Solution above = stepped(c.specification(), given, centre + step);
                final Solution below = stepped(c.specification(), given, centre - step);
                for (Variable<?> of : results(c.component(), s)) {
                    final double exact = s.sensitivity(of, given).si();
                    final double difference =
                            (above.value(of).si() - below.value(of).si()) / (2 * step);
                    final double scale = Math.max(
                            Math.abs(exact),
                            1e-3
                                    * Math.max(
                                            Math.abs(s.value(of).si()),
                                            1e-3 * of.kind().naturalScale())
                                    / Math.max(
                                            Math.abs(centre),
                                            1e-3 * given.kind().naturalScale()));
                    assertEquals(exact, difference, DERIVATIVES * scale, of + " by " + given);
                    compared++;
                }
            }
        }
        assertTrue(compared > 0);
    }

    /** The variables of the component that have a value, and the core ones of its ports. */
    private static List<Variable<?>> results(Component component, Solution s) {
        final List<Variable<?>> found = new ArrayList<>(component.variables());
        for (Port port : component.ports()) {
            if (port instanceof MaterialPort m) {
                found.addAll(List.of(m.flow(), m.pressure(), m.enthalpy()));
            } else if (port instanceof ShaftPort shaft) {
                found.add(shaft.power());
            } else if (port instanceof WirePort wire) {
                found.add(wire.power());
            } else if (port instanceof HeatPort heat) {
                found.add(heat.rate());
            }
        }
        found.removeIf(v -> !s.hasValue(v));
        return found;
    }

    private static Solution stepped(Specification specification, Variable<?> variable, double si) {
        return with(specification, variable, si).solve();
    }

    private static <Q extends ScalarQuantity<Q, ?>> Specification with(
            Specification specification, Variable<Q> variable, double si) {
        return specification.with(variable, variable.kind().ofSi(si));
    }

    /**
     * A result taken as given, and a given value left free in its place: the same point comes out. Where the equations have
     * a second root, such as two flows with one mean temperature difference, a cold solve may find that one; a solve that
     * starts from the point must stay there.
     */
    @Test
    final void resultsAndGivenValuesExchange() {
        final SplittableRandom random = new SplittableRandom(2_718L);
        int exchanged = 0;
        int others = 0;
        for (int i = 0; i < 6; i++) {
            final Case c = drawSmooth(random);
            final Solution s = c.specification().solve();
            for (Variable<?> result : c.component().variables()) {
                if (!s.hasValue(result) || c.specification().valueOf(result).isPresent()) {
                    continue;
                }
                for (Variable<?> given : c.specification().givenVariables()) {
                    final double sensitivity = s.sensitivity(result, given).si();
                    final double share = Math.abs(sensitivity * s.value(given).si())
                            / Math.max(
                                    Math.abs(s.value(result).si()),
                                    1e-3 * result.kind().naturalScale());
                    if (share > 0.1) {
                        final Specification back = exchange(c.specification(), s, given, result);
                        final double room = 1e-7 * Math.abs(s.value(given).si()) / Math.min(1, share);
                        if (!isNear(s, back.solve(), given, room)) {
                            others++;
                            final Solution warm =
                                    back.solve(SolveOptions.defaults().startingFrom(s));
                            assertTrue(isNear(s, warm, given, room), given + " from " + result);
                        }
                        exchanged++;
                    }
                }
            }
        }
        assertTrue(others <= largestShareOfOtherRoots() * exchanged, others + " other roots of " + exchanged);
        exchanges(exchanged);
    }

    private static boolean isNear(Solution expected, Solution actual, Variable<?> variable, double room) {
        return Math.abs(actual.value(variable).si() - expected.value(variable).si()) <= room;
    }

    /** How often a cold solve may find another root that the equations have. */
    double largestShareOfOtherRoots() {
        return 0.1;
    }

    /** Looks at how many exchanges were made; a component without variables of its own has none. */
    void exchanges(int count) {
        assertNotEquals(0, count);
    }

    private static <Q extends ScalarQuantity<Q, ?>> Specification exchange(
            Specification specification, Solution s, Variable<?> freed, Variable<Q> result) {
        return specification.release(freed).given(result, s.value(result));
    }

    @Test
    final void namesArePlainAndDifferent() {
        final Case c = draw(new SplittableRandom(1));
        final List<String> names = new ArrayList<>();
        c.component().variables().forEach(v -> names.add(v.name()));
        c.component().ports().forEach(p -> names.add(p.name()));
        for (String name : names) {
            assertEquals(name.strip(), name);
            assertFalse(name.isEmpty());
        }
        assertEquals(names.size(), names.stream().distinct().count(), names.toString());
    }

    static double between(SplittableRandom random, double low, double high) {
        return low + (high - low) * random.nextDouble();
    }
}
