package lostwork.plant;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.SplittableRandom;
import lostwork.quantity.ScalarQuantity;

/**
 * Exchanges given against free variables of a solved plant at random and looks whether a cold solve finds the original
 * point again: the hardest test of a kernel that takes no start values.
 */
final class ExchangeGame {
    /** How a variant ended. */
    enum Outcome {
        /** The original point was found. */
        FOUND,
        /** Another point that meets all equations. */
        ANOTHER_ROOT,
        /** The new specification does not determine the original point: its equations are singular there. */
        ILL_POSED,
        /** The solve said that the given values do not determine the unknowns, though they do at the original point. */
        SAID_UNDETERMINED,
        /** The solve said that it found no solution. */
        SAID_NOT_MET,
        /** The solve ended in the second law or outside a range. */
        SAID_IMPOSSIBLE,
        /** A solution that does not meet the equations. */
        WRONG
    }

    private final Specification design;
    private final Solution original;
    private final List<Variable<?>> candidates;
    private final Map<Outcome, Integer> counts = new EnumMap<>(Outcome.class);
    private final List<String> log = new ArrayList<>();

    ExchangeGame(Specification design) {
        this.design = design;
        original = design.solve();
        final Plant plant = design.plant();
        candidates = plant.layout().slots.stream()
                .<Variable<?>>map(Layout.Slot::variable)
                .filter(original::hasValue)
                .filter(v -> !v.name().endsWith("entropy") && !v.name().endsWith("specific volume"))
                .toList();
    }

    Map<Outcome, Integer> counts() {
        return counts;
    }

    List<String> log() {
        return log;
    }

    /** Plays until a number of structurally sound variants has been solved. */
    void play(SplittableRandom random, int variants) {
        int played = 0;
        for (int tries = 0; played < variants && tries < 200 * variants; tries++) {
            final Specification variant = draw(random);
            if (variant != null) {
                played++;
                final Outcome outcome = solve(variant);
                counts.merge(outcome, 1, Integer::sum);
            }
        }
    }

    private Specification draw(SplittableRandom random) {
        Specification spec = design;
        final int exchanges = 1 + random.nextInt(5);
        for (int i = 0; i < exchanges; i++) {
            final List<Variable<?>> given = spec.givenVariables();
            spec = spec.release(given.get(random.nextInt(given.size())));
            final Variable<?> fresh = candidates.get(random.nextInt(candidates.size()));
            if (spec.givenVariables().contains(fresh)) {
                return null;
            }
            spec = giveOriginal(spec, fresh);
        }
        if (givesOneLossTwice(spec)) {
            return null;
        }
        try {
            final SolvePlan plan = spec.plan();
            return plan.assumptionsGivenWay().isEmpty() ? spec : null;
        } catch (SpecificationException e) {
            return null;
        }
    }

    /**
     * Whether both efficiencies of one machine are given. They say the same loss in two ways; together they would settle
     * the pressure ratio, and a machine without any change of state meets both.
     */
    private static boolean givesOneLossTwice(Specification spec) {
        return spec.givenVariables().stream()
                .filter(v -> v.name().equals("polytropic efficiency"))
                .anyMatch(v -> spec.givenVariables().stream()
                        .anyMatch(w ->
                                w.component().equals(v.component()) && w.name().equals("isentropic efficiency")));
    }

    private <Q extends ScalarQuantity<Q, ?>> Specification giveOriginal(Specification spec, Variable<Q> variable) {
        return spec.given(variable, original.value(variable));
    }

    private Outcome solve(Specification variant) {
        try {
            final Solution found = variant.solve();
            if (found.largestResidual() > 1e-8) {
                return note(Outcome.WRONG, variant, "residual " + found.largestResidual());
            }
            final double distance = distance(found);
            return distance < 1e-5
                    ? Outcome.FOUND
                    : isIllPosed(variant)
                            ? Outcome.ILL_POSED
                            : note(Outcome.ANOTHER_ROOT, variant, "distance " + distance);
        } catch (PlantSolveException e) {
            if (isIllPosed(variant)) {
                return Outcome.ILL_POSED;
            }
            final Outcome outcome = switch (e.reason()) {
                case UNDETERMINED -> Outcome.SAID_UNDETERMINED;
                case NOT_MET -> Outcome.SAID_NOT_MET;
                default -> Outcome.SAID_IMPOSSIBLE;
            };
            return note(outcome, variant, e.getMessage());
        }
    }

    private Outcome note(Outcome outcome, Specification variant, String why) {
        log.add(String.format(
                Locale.ROOT,
                "%s: given %s, blocks %s: %s",
                outcome,
                variant.givenVariables(),
                variant.plan().blockSizes().stream().filter(n -> n > 1).toList(),
                why));
        return outcome;
    }

    /** Whether a warm start at the original point itself finds the equations singular there. */
    private boolean isIllPosed(Specification variant) {
        try {
            variant.solve(SolveOptions.defaults().startingFrom(original).withRestarts(1, 0));
            return false;
        } catch (PlantSolveException e) {
            return e.reason() == PlantSolveException.Reason.UNDETERMINED;
        }
    }

    /** The largest difference of a value, against its scale. */
    private double distance(Solution found) {
        double largest = 0;
        final Layout layout = design.plant().layout();
        for (int slot = 0; slot < layout.slots.size(); slot++) {
            if (found.plan().isActive(slot) && original.plan().isActive(slot)) {
                final double scale = layout.scales.get(slot).at(original.si(slot));
                largest = Math.max(largest, Math.abs(found.si(slot) - original.si(slot)) / scale);
            }
        }
        return largest;
    }
}
