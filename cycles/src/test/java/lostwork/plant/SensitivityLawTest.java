package lostwork.plant;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import lostwork.quantity.ScalarQuantity;
import org.junit.jupiter.api.Test;

/**
 * Exact derivatives against differences of solves, on random plants with random values given.
 *
 * <p>A state on the saturation line has two derivatives, one to each side; the exact one has to be one of them. So it is
 * held against the one-sided differences of second order.
 */
class SensitivityLawTest {
    private static final double STEP = 1e-5;

    @Test
    void exactDerivativesAgreeWithDifferences() {
        final SplittableRandom random = new SplittableRandom(77);
        final List<String> wrong = new ArrayList<>();
        int compared = 0;
        for (int i = 0; i < 60; i++) {
            final SplittableRandom drawn = new SplittableRandom(3000 + i);
            final Specification spec = (i % 3 == 2
                            ? HeatEngineCase.refrigerator(drawn, new SplittableRandom(1))
                            : HeatEngineCase.engine(drawn, new SplittableRandom(1)))
                    .specification();
            final Solution s = spec.solve();
            final List<Variable<?>> all = s.plant().layout().slots.stream()
                    .<Variable<?>>map(Layout.Slot::variable)
                    .filter(s::hasValue)
                    .toList();
            for (int k = 0; k < 8; k++) {
                final Variable<?> of = all.get(random.nextInt(all.size()));
                final Variable<?> to = spec.givenVariables()
                        .get(random.nextInt(spec.givenVariables().size()));
                if (compare(spec, s, of, to, wrong)) {
                    compared++;
                }
            }
        }
        assertTrue(compared > 350, "compared " + compared);
        assertEquals(List.of(), wrong);
    }

    private static boolean compare(Specification spec, Solution s, Variable<?> of, Variable<?> to, List<String> wrong) {
        final Plant plant = spec.plant();
        final double step = STEP * plant.layout().scales.get(plant.slotOf(to)).at(spec.si(to));
        final double exact = s.sensitivity(of, to).si();
        final double size = plant.layout().scales.get(plant.slotOf(of)).at(s.si(plant.slotOf(of)));
        final double room = 1e-3 * Math.abs(exact) + 1e-6 * size * STEP / step;
        boolean any = false;
        double nearest = Double.POSITIVE_INFINITY;
        for (int side = -1; side <= 1; side += 2) {
            try {
                final double one = moved(spec, s, to, side * step, of);
                final double two = moved(spec, s, to, 2 * side * step, of);
                final double slope = (4 * one - 3 * s.si(plant.slotOf(of)) - two) / (2 * side * step);
                if (!Double.isNaN(slope)) {
                    any = true;
                    nearest = Math.min(nearest, Math.abs(slope - exact));
                }
            } catch (RuntimeException e) {
                continue; // an efficiency above 1, or the end of a fluid
            }
        }
        if (any && nearest > room) {
            wrong.add("d(" + of + ")/d(" + to + ") = " + exact + ", differences miss it by " + nearest);
        }
        return any;
    }

    private static <Q extends ScalarQuantity<Q, ?>> double moved(
            Specification spec, Solution s, Variable<Q> to, double by, Variable<?> of) {
        return spec.with(to, to.kind().ofSi(spec.si(to) + by))
                .solve(SolveOptions.defaults().startingFrom(s).with(SolveOptions.SecondLaw.REPORTED))
                .si(spec.plant().slotOf(of));
    }
}
