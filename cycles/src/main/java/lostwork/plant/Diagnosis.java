package lostwork.plant;

import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import lostwork.fluid.FluidModel;
import lostwork.plant.kernel.Matching;
import lostwork.quantity.Conductance;
import lostwork.quantity.MassFlow;
import lostwork.quantity.Power;
import lostwork.quantity.Pressure;
import lostwork.quantity.QuantityKind;
import lostwork.quantity.Ratio;
import lostwork.quantity.Temperature;
import lostwork.quantity.TemperatureSpan;

/** Says in words, from the structure of the equations alone, what is missing and what is too much. */
final class Diagnosis {
    private static final int SHOWN = 8;

    private final Plant plant;
    private final List<Planner.Entry> entries;
    private final Matching matching;
    private final int[][] unknownsOf;
    private final List<Integer> unknownSlots;
    private final List<Variable<?>> givenVariables;
    private final boolean[] active;
    private final boolean[] given;

    Diagnosis(
            Plant plant,
            List<Planner.Entry> entries,
            Matching matching,
            int[][] unknownsOf,
            List<Integer> unknownSlots,
            List<Variable<?>> givenVariables,
            boolean[] active,
            boolean[] given) {
        this.plant = plant;
        this.entries = entries;
        this.matching = matching;
        this.unknownsOf = unknownsOf;
        this.unknownSlots = unknownSlots;
        this.givenVariables = givenVariables;
        this.active = active;
        this.given = given;
    }

    static SpecificationException givenTwice(Plant plant, Variable<?> first, Variable<?> second) {
        return new SpecificationException(
                "plant \"" + plant.name() + "\": " + second + " and " + first
                        + " are one and the same value, since their ports are joined; give only one of them",
                0,
                List.of(),
                List.of(),
                List.of(second, first));
    }

    static SpecificationException noSaturation(Plant plant, Variable<?> variable, FluidModel model) {
        return new SpecificationException(
                "plant \"" + plant.name() + "\": " + variable + " has no meaning, since " + model.name()
                        + " has no saturation line; give a temperature instead",
                0,
                List.of(),
                List.of(),
                List.of(variable));
    }

    /**
     * Refuses a system that is not square in every part.
     *
     * @param surplus the equations that found no unknown, assumptions left out
     * @throws SpecificationException if something is missing or too much
     */
    void check(List<Integer> surplus) {
        final List<Integer> loose = new ArrayList<>();
        for (int u = 0; u < unknownSlots.size(); u++) {
            if (matching.equationOf(u) < 0) {
                loose.add(u);
            }
        }
        if (surplus.isEmpty() && loose.isEmpty()) {
            return;
        }
        final StringBuilder text = new StringBuilder("plant \"" + plant.name() + "\": ");
        final Set<Variable<?>> tooMuch = new LinkedHashSet<>();
        for (int equation : surplus) {
            text.append(describeSurplus(equation, tooMuch));
        }
        List<Variable<?>> unsettled = List.of();
        List<Variable<?>> candidates = List.of();
        if (!loose.isEmpty()) {
            final boolean[] part = matching.underdetermined(
                    loose.stream().mapToInt(Integer::intValue).toArray());
            unsettled = unsettled(part);
            candidates = candidates(part);
            text.append(describeMissing(loose.size(), unsettled, candidates));
        }
        throw new SpecificationException(
                text.toString().stripTrailing(), loose.size(), unsettled, candidates, List.copyOf(tooMuch));
    }

    private String describeSurplus(int equation, Set<Variable<?>> tooMuch) {
        final boolean[] part = matching.overdetermined(equation);
        final Set<Integer> slots = new TreeSet<>();
        final Set<String> statements = new LinkedHashSet<>();
        for (int e = 0; e < part.length; e++) {
            if (part[e]) {
                statements.add(entries.get(e).equation().words());
                for (int k = 0; k < entries.get(e).tape().size(); k++) {
                    slots.add(entries.get(e).tape().slot(k));
                }
            }
        }
        final List<Variable<?>> culprits = new ArrayList<>();
        for (Variable<?> variable : givenVariables) {
            if (slots.contains(plant.slotOf(variable))) {
                culprits.add(variable);
            }
        }
        Collections.reverse(culprits);
        tooMuch.addAll(culprits);
        if (culprits.isEmpty()) {
            return "The equations contradict each other: " + join(statements) + ".\n";
        }
        if (culprits.size() == 1) {
            return "The value given for " + culprits.get(0) + " is already determined by " + join(statements)
                    + "; release it.\n";
        }
        return "One given value too many: release one of " + join(culprits) + ". They are tied together by "
                + join(statements) + ".\n";
    }

    private static String describeMissing(int count, List<Variable<?>> unsettled, List<Variable<?>> candidates) {
        final String values = count == 1 ? "One more value must be given." : count + " more values must be given.";
        return values + " Not settled: " + join(unsettled) + ".\n"
                + (count == 1 ? "Any one of these will do: " : "Candidates: ") + join(candidates) + ".\n";
    }

    private List<Variable<?>> unsettled(boolean[] part) {
        final List<Variable<?>> found = new ArrayList<>();
        for (int u = 0; u < part.length; u++) {
            if (part[u]) {
                found.add(variableOf(unknownSlots.get(u)));
            }
        }
        found.sort(Comparator.comparingInt(Diagnosis::rank));
        return found;
    }

    /** What may be given: unsettled unknowns, temperatures of their states, and definitions that depend on them. */
    private List<Variable<?>> candidates(boolean[] part) {
        final boolean[] open = new boolean[active.length];
        for (int u = 0; u < part.length; u++) {
            open[unknownSlots.get(u)] = part[u];
        }
        final Set<Variable<?>> found = new LinkedHashSet<>();
        for (Layout.StreamState state : plant.layout().states) {
            final int t = state.slot(SlotRole.TEMPERATURE);
            final boolean wet = given[state.slot(SlotRole.VAPOUR_FRACTION)];
            if (open[state.slot(SlotRole.ENTHALPY)] && !active[t] && !wet) {
                found.add(variableOf(t));
            }
        }
        for (int slot = 0; slot < open.length; slot++) {
            if (open[slot]) {
                found.add(variableOf(slot));
            }
        }
        plant.definitions().forEach((variable, definition) -> {
            if (!active[plant.slotOf(variable)]
                    && definition.variables().stream().anyMatch(v -> dependsOn(v, open))) {
                found.add(variable);
            }
        });
        return found.stream().sorted(Comparator.comparingInt(Diagnosis::rank)).collect(Collectors.toList());
    }

    /** Whether a variable, or the state it is a property of, is open. */
    private boolean dependsOn(Variable<?> variable, boolean[] open) {
        final int slot = plant.slotOf(variable);
        if (open[slot]) {
            return true;
        }
        final int state = plant.layout().slots.get(slot).state();
        if (state < 0 || active[slot]) {
            return false;
        }
        final Layout.StreamState of = plant.layout().states.get(state);
        return open[of.slot(SlotRole.ENTHALPY)] || open[of.slot(SlotRole.PRESSURE)];
    }

    private Variable<?> variableOf(int slot) {
        return plant.layout().slots.get(slot).variable();
    }

    /** What people usually give comes first. */
    private static int rank(Variable<?> variable) {
        final QuantityKind<?, ?> kind = variable.kind();
        if (kind == Temperature.KIND) {
            return 0;
        }
        if (kind == Pressure.KIND) {
            return 1;
        }
        if (kind == MassFlow.KIND) {
            return 2;
        }
        if (kind == Ratio.KIND || kind == TemperatureSpan.KIND) {
            return 3;
        }
        if (kind == Power.KIND) {
            return 4;
        }
        return kind == Conductance.KIND ? 5 : 6;
    }

    static String join(Iterable<?> things) {
        final List<String> words = new ArrayList<>();
        things.forEach(t -> words.add(t.toString()));
        if (words.size() <= SHOWN) {
            return String.join(", ", words);
        }
        return String.join(", ", words.subList(0, SHOWN))
                + String.format(Locale.ROOT, " and %d more", words.size() - SHOWN);
    }
}
