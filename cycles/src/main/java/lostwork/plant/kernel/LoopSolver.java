package lostwork.plant.kernel;

import java.util.SplittableRandom;

/**
 * Solves the loops of a system: a Newton iteration from start values, a scan of the loop cut open where that fails, then
 * restarts from moved start values. One instance belongs to one solve.
 */
final class LoopSolver {
    private final EquationSystem system;
    private final Workspace w;
    private final StartValues starts;
    private final Limits limits;
    private final SolveClock clock;
    private final SingleEquation single;
    private final NewtonLoop newton;

    LoopSolver(
            EquationSystem system,
            Workspace w,
            StartValues starts,
            Limits limits,
            SolveClock clock,
            SingleEquation single,
            NewtonLoop newton) {
        this.system = system;
        this.w = w;
        this.starts = starts;
        this.limits = limits;
        this.clock = clock;
        this.single = single;
        this.newton = newton;
    }

    /**
     * Solves a loop from start values.
     *
     * @param number its place in the order of solving, which goes into the seed of the restarts
     * @param block its equations
     * @param slots its unknowns
     * @param known for each slot whether its value is settled
     * @return whether the equations are met; if not, the unknowns are left where they were missed least
     */
    boolean solve(int number, int[] block, int[] slots, boolean[] known) {
        starts.prepare(slots, known, w);
        final double[] first = values(slots);
        for (int j = 0; j < first.length; j++) {
            first[j] = system.scale(slots[j]).clamp(first[j]);
        }
        // A later search wants another solution: the scan of a cut loop finds them all.
        if (limits.search() > 0 && solveCut(block, slots, first)) {
            return true;
        }
        final SplittableRandom random = new SplittableRandom((limits.seed() * 31 + number) * 31 + limits.search());
        double[] best = first;
        double bestResidual = Double.POSITIVE_INFINITY;
        for (int attempt = 0; attempt <= limits.restarts(); attempt++) {
            final boolean fromStart = attempt == 0 && limits.search() == 0;
            for (int j = 0; j < slots.length; j++) {
                w.x[slots[j]] = fromStart ? first[j] : perturbed(slots[j], first[j], random, attempt + limits.search());
            }
            if (attempt % 2 == 0) {
                sweep(block, slots);
                sweep(block, slots);
            }
            final boolean met = newton.iterate(block, slots);
            if (met && (!isOutside(block) || attempt == limits.restarts())) {
                return true;
            }
            if (fromStart && solveCut(block, slots, first)) {
                return true;
            }
            final double reached = newton.residual(block);
            if (reached < bestResidual) {
                bestResidual = reached;
                best = values(slots);
            }
        }
        setValues(slots, best);
        return false;
    }

    /** Cuts the loop open at one unknown, scans that for a solution, and polishes what it finds. */
    private boolean solveCut(int[] block, int[] slots, double[] start) {
        for (Tearing cut : Tearing.of(system, block)) {
            clock.tick();
            setValues(slots, start);
            if (new CutLoop(system, w, clock, single, cut).scan(limits.search())
                    && newton.iterate(block, slots)
                    && !isOutside(block)) {
                return true;
            }
        }
        return false;
    }

    private double[] values(int[] slots) {
        final double[] values = new double[slots.length];
        for (int j = 0; j < slots.length; j++) {
            values[j] = w.x[slots[j]];
        }
        return values;
    }

    private void setValues(int[] slots, double[] values) {
        for (int j = 0; j < slots.length; j++) {
            w.x[slots[j]] = values[j];
        }
    }

    /** Whether the equations call a property function outside the range of its fluid. */
    private boolean isOutside(int[] block) {
        for (int equation : block) {
            final Tape tape = system.equation(equation);
            tape.forward(w);
            if (tape.isOutside(w)) {
                return true;
            }
        }
        return false;
    }

    private double perturbed(int slot, double value, SplittableRandom random, int attempt) {
        final SlotScale scale = system.scale(slot);
        final double spread = Math.min(1.5, 0.25 * attempt);
        final double draw = 2 * random.nextDouble() - 1;
        final double moved = scale.proportional() && value != 0
                ? value * Math.exp(spread * draw)
                : value + 2 * spread * draw * scale.natural();
        return scale.clamp(moved);
    }

    /** One Gauss–Seidel sweep: each equation is solved for its own unknown where that is easy. */
    private void sweep(int[] block, int[] slots) {
        for (int i = 0; i < block.length; i++) {
            clock.tick();
            final Tape tape = system.equation(block[i]);
            final int slot = slots[i];
            final double before = w.x[slot];
            if (tape.isAffineIn(tape.placeOf(slot))) {
                final double next = w.solveAffine(tape, slot);
                if (!Double.isNaN(next)) {
                    w.x[slot] = system.scale(slot).clamp(next);
                }
            } else if (!single.newton(tape, slot)) {
                w.x[slot] = before;
            }
        }
    }
}
