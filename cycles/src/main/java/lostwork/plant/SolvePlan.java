package lostwork.plant;

import java.time.Duration;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import lostwork.fluid.StatePoint;
import lostwork.plant.kernel.BlockFailure;
import lostwork.plant.kernel.BlockSolver;
import lostwork.plant.kernel.EquationSystem;
import lostwork.plant.kernel.Limits;
import lostwork.plant.kernel.Tape;
import lostwork.plant.kernel.Workspace;
import lostwork.quantity.OutOfRangeException;

/**
 * The diagnosed, ordered and compiled form of a plant and of the list of what is given: which equations are solved in
 * which order for which unknowns. It does not depend on the given values and serves any number of solves, also at the
 * same time. Immutable and thread-safe.
 */
public final class SolvePlan {
    private static final int MORE_SEARCHES = 8;
    /** Scaled residual at or below which an equation is met. */
    private static final double MET = 1e-9;
    /** The longest time limit that the clock can hold; more is for ever. */
    private static final Duration LONGEST = Duration.ofDays(36_500);

    private final Plant plant;
    private final List<Variable<?>> givenVariables;
    private final int[] givenSlots;
    private final boolean[] given;
    private final boolean[] active;
    private final List<Planner.Entry> entries;
    private final EquationSystem system;
    private final List<Equation> assumptions;
    private final List<Equation> gaveWay;
    private final List<Equation> redundant;
    private final NeighbourStarts starts;
    private final Completion completion;
    private final SolutionChecks checks;

    SolvePlan(
            Plant plant,
            List<Variable<?>> givenVariables,
            boolean[] given,
            boolean[] active,
            List<Planner.Entry> entries,
            EquationSystem system,
            List<Equation> assumptions,
            List<Equation> gaveWay,
            List<Equation> redundant) {
        this.plant = plant;
        this.givenVariables = List.copyOf(givenVariables);
        givenSlots = givenVariables.stream().mapToInt(plant::slotOf).toArray();
        this.given = given;
        this.active = active;
        this.entries = List.copyOf(entries);
        this.system = system;
        this.assumptions = List.copyOf(assumptions);
        this.gaveWay = List.copyOf(gaveWay);
        this.redundant = List.copyOf(redundant);
        starts = new NeighbourStarts(plant, entries, given);
        completion = new Completion(this);
        checks = new SolutionChecks(this);
    }

    /** {@return the plant} */
    public Plant plant() {
        return plant;
    }

    /** {@return the assumptions that hold in every solution} */
    public List<Equation> assumptions() {
        return assumptions;
    }

    /** {@return the assumptions that gave way to given values} */
    public List<Equation> assumptionsGivenWay() {
        return gaveWay;
    }

    /** {@return the mass balances that follow from others and are only checked} */
    public List<Equation> redundantBalances() {
        return redundant;
    }

    /** {@return how many equations each block has, in the order of solving} */
    public List<Integer> blockSizes() {
        return system.blocks().stream().map(block -> block.length).toList();
    }

    boolean isActive(int slot) {
        return active[slot];
    }

    boolean isGiven(int slot) {
        return given[slot];
    }

    SolutionChecks checks() {
        return checks;
    }

    Completion completion() {
        return completion;
    }

    EquationSystem system() {
        return system;
    }

    List<Planner.Entry> entries() {
        return entries;
    }

    List<Variable<?>> givenVariables() {
        return givenVariables;
    }

    Solution solve(Specification specification, SolveOptions options) {
        final Duration limit = options.limit().compareTo(LONGEST) < 0 ? options.limit() : LONGEST;
        final long deadline = System.nanoTime() + limit.toNanos();
        Solution found = solveOnce(specification, options, deadline, 0);
        if (options.secondLaw() == SolveOptions.SecondLaw.REPORTED) {
            return found;
        }
        final List<String> findings = found.violations();
        // A loop may have several solutions, of which only one is possible: look for it before giving up.
        boolean possible = findings.isEmpty();
        for (int search = 1; !possible; search++) {
            if (search > searches()) {
                throw new PlantSolveException(
                        PlantSolveException.Reason.IMPOSSIBLE,
                        "plant \"" + plant.name() + "\": no real machine can do this: " + String.join("; ", findings)
                                + ". Change a given value, or solve with SecondLaw.REPORTED to look at the numbers",
                        List.of(),
                        List.of());
            }
            try {
                found = solveOnce(specification, options, deadline, search);
                possible = found.violations().isEmpty();
            } catch (PlantSolveException e) {
                if (e.reason() == PlantSolveException.Reason.CANCELLED
                        || e.reason() == PlantSolveException.Reason.OUT_OF_TIME) {
                    throw e;
                }
            }
        }
        return found;
    }

    /** How often other solutions are looked for: only equations that are not affine can have them. */
    private int searches() {
        return system.blocks().stream().anyMatch(this::mayHaveSeveralSolutions) ? MORE_SEARCHES : 0;
    }

    private boolean mayHaveSeveralSolutions(int[] block) {
        final Tape tape = system.equation(block[0]);
        return block.length > 1 || !tape.isAffineIn(tape.placeOf(system.matched(block[0])));
    }

    private Solution solveOnce(Specification specification, SolveOptions options, long deadline, int search) {
        final Workspace w = system.workspace();
        for (int i = 0; i < givenSlots.length; i++) {
            w.set(givenSlots[i], specification.si(givenVariables.get(i)));
        }
        final int blocks = Math.max(1, system.blocks().size());
        final Limits limits = new Limits(
                deadline,
                options.cancelled(),
                done -> options.progress().done((double) done / blocks),
                options.seed(),
                options.restarts(),
                search);
        final BlockSolver solver = new BlockSolver(system, w, given, starts, limits);
        final Solution start = options.start();
        try {
            if (start == null || search > 0) {
                solver.solveCold();
            } else {
                warm(start, w);
                solver.solveWarm();
            }
        } catch (BlockFailure failure) {
            throw explain(failure);
        }
        if (solver.anyOutsideRange()) {
            throw outsideRange(w);
        }
        final Solution solution = new Solution(this, specification, w.copyOfValues());
        try {
            solution.complete();
        } catch (OutOfRangeException e) {
            throw outsideRange(w); // a state whose temperature and entropy no equation used
        }
        system.release(w);
        return solution;
    }

    private void warm(Solution start, Workspace w) {
        if (start.plan().plant != plant) {
            throw new IllegalArgumentException("the start is a solution of another plant");
        }
        for (int slot = 0; slot < active.length; slot++) {
            if (active[slot] && !given[slot]) {
                w.set(slot, start.si(slot));
            }
        }
    }

    private PlantSolveException outsideRange(Workspace w) {
        for (Layout.StreamState state : plant.layout().states) {
            final double p = w.get(state.slot(SlotRole.PRESSURE));
            final double h = w.get(state.slot(SlotRole.ENTHALPY));
            try {
                state.model().atPressureEnthalpy(p, h, new StatePoint());
            } catch (OutOfRangeException e) {
                return new PlantSolveException(
                        PlantSolveException.Reason.OUTSIDE_RANGE,
                        "plant \"" + plant.name() + "\": the given values lead out of the range of "
                                + state.model().name() + " at " + state.port() + ": " + e.getMessage(),
                        List.of(),
                        List.of(state.port().pressure(), state.port().enthalpy()));
            }
        }
        return new PlantSolveException(
                PlantSolveException.Reason.OUTSIDE_RANGE,
                "plant \"" + plant.name() + "\": an ideal state of a machine lies outside the range of its fluid; "
                        + "look at the outlet pressures that are given",
                List.of(),
                List.of());
    }

    private PlantSolveException explain(BlockFailure failure) {
        final int[] block = failure.equations();
        final double[] residuals = failure.residuals();
        final List<Equation> worst = IntStream.range(0, block.length)
                .boxed()
                .sorted(Comparator.comparingDouble(i -> -residuals[i]))
                .map(i -> entries.get(block[i]).equation())
                .toList();
        final List<Variable<?>> unknowns = Arrays.stream(block)
                .mapToObj(e -> variableOf(system.matched(e)))
                .collect(Collectors.toCollection(ArrayList::new));
        final String head = "plant \"" + plant.name() + "\": ";
        return switch (failure.reason()) {
            case SINGULAR -> singular(head, failure, unknowns);
            case SATURATED -> saturated(head, block[0], unknowns);
            case OUT_OF_TIME ->
                new PlantSolveException(
                        PlantSolveException.Reason.OUT_OF_TIME,
                        head + "the time limit ran out in block " + (failure.block() + 1) + " of "
                                + system.blocks().size() + "; raise it with SolveOptions.within(...)",
                        worst,
                        unknowns);
            case CANCELLED ->
                new PlantSolveException(
                        PlantSolveException.Reason.CANCELLED, head + "cancelled by the caller", worst, unknowns);
            case NOT_MET ->
                new PlantSolveException(
                        PlantSolveException.Reason.NOT_MET,
                        head + "no values of " + Diagnosis.join(unknowns) + " within their bounds meet "
                                + describeWorst(block, residuals)
                                + ". Check the given values that these equations use: "
                                + Diagnosis.join(givenIn(block)),
                        worst,
                        unknowns);
        };
    }

    private String describeWorst(int[] block, double[] residuals) {
        final List<Integer> missed = IntStream.range(0, block.length)
                .boxed()
                .filter(i -> !(residuals[i] <= MET))
                .sorted(Comparator.comparingDouble(i -> -residuals[i]))
                .toList();
        return Diagnosis.join(missed.stream()
                .map(i -> "\"" + entries.get(block[i]).equation().words() + "\" (missed by "
                        + String.format(Locale.ROOT, "%.1g", residuals[i]) + " of its scale)")
                .toList());
    }

    private PlantSolveException saturated(String head, int equation, List<Variable<?>> unknowns) {
        final Layout.StreamState state =
                plant.layout().states.get(Math.max(0, entries.get(equation).state()));
        return new PlantSolveException(
                PlantSolveException.Reason.UNDETERMINED,
                head + "the given values do not determine " + Diagnosis.join(unknowns) + ": "
                        + state.port().temperature() + " and " + state.port().pressure()
                        + " lie on the saturation line of "
                        + state.model().name()
                        + ", where they do not tell liquid from vapour. Give the vapour fraction or the enthalpy there"
                        + " instead of the temperature",
                List.of(entries.get(equation).equation()),
                unknowns);
    }

    private PlantSolveException singular(String head, BlockFailure failure, List<Variable<?>> unknowns) {
        final int[] block = failure.equations();
        final List<Equation> dependent = new ArrayList<>();
        final List<Variable<?>> free = new ArrayList<>();
        for (int i = 0; i < block.length; i++) {
            if (Math.abs(failure.dependency()[i]) > 0.05) {
                dependent.add(entries.get(block[i]).equation());
            }
            if (Math.abs(failure.freedom()[i]) > 0.05) {
                free.add(unknowns.get(i));
            }
        }
        return new PlantSolveException(
                PlantSolveException.Reason.UNDETERMINED,
                head + "the given values do not determine " + Diagnosis.join(free) + ": "
                        + Diagnosis.join(dependent.stream()
                                .map(e -> "\"" + e.words() + "\"")
                                .toList())
                        + (dependent.size() > 1 ? " say the same there" : " does not depend on it there")
                        + ". Give one of the former, and release one of "
                        + Diagnosis.join(givenIn(block)),
                dependent,
                free);
    }

    /** The given variables that occur in some equations, most recently given first. */
    private List<Variable<?>> givenIn(int[] block) {
        final List<Variable<?>> found = new ArrayList<>();
        for (int i = givenVariables.size() - 1; i >= 0; i--) {
            final int slot = plant.slotOf(givenVariables.get(i));
            if (Arrays.stream(block).anyMatch(e -> entries.get(e).tape().placeOf(slot) >= 0)) {
                found.add(givenVariables.get(i));
            }
        }
        return found;
    }

    /** {@return the unknowns in the order of solving, a line a block} */
    @Override
    public String toString() {
        final StringBuilder text = new StringBuilder("Solve plan of plant \"" + plant.name() + "\"\n");
        for (int[] block : system.blocks()) {
            text.append("  ")
                    .append(Arrays.stream(block)
                            .mapToObj(e -> variableOf(system.matched(e)) + " from "
                                    + entries.get(e).equation().words())
                            .collect(Collectors.joining("; ")))
                    .append('\n');
        }
        return text.toString();
    }

    private Variable<?> variableOf(int slot) {
        return plant.layout().slots.get(slot).variable();
    }
}
