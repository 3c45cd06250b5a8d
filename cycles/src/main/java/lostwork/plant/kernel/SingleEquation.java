package lostwork.plant.kernel;

/**
 * Solves one equation for one unknown: by a Newton iteration that never leaves its bracket, or by a scan of the whole range
 * of the unknown. One instance belongs to one solve; the unknown is left in the workspace.
 */
final class SingleEquation {
    private static final int ITERATIONS = 60;

    /** Every so many steps inside a bracket one halves it, so that a slow Newton iteration cannot creep. */
    private static final int HALVING = 8;

    private final EquationSystem system;
    private final Workspace w;
    private final SolveClock clock;
    private final int search;
    private final Bracket bracket = new Bracket();

    /**
     * Prepares a solve.
     *
     * @param system the system
     * @param w the workspace
     * @param clock asked before each step
     * @param search how many roots a scan passes over where there are more
     */
    SingleEquation(EquationSystem system, Workspace w, SolveClock clock, int search) {
        this.system = system;
        this.w = w;
        this.clock = clock;
        this.search = search;
    }

    /**
     * Newton iteration from the present value, kept between the limits and inside a bracket once one is found.
     *
     * @return whether the equation is met
     */
    boolean newton(Tape tape, int slot) {
        final int place = tape.placeOf(slot);
        final SlotScale bounds = system.scale(slot);
        bracket.reset(bounds);
        double u = bounds.clamp(w.x[slot]);
        double best = Double.POSITIVE_INFINITY;
        double bestAt = u;
        int stuck = 0;
        for (int i = 0; i < ITERATIONS; i++) {
            clock.tick();
            w.x[slot] = u;
            final double r = tape.evaluate(w);
            final double slope = w.gradient[place];
            final double scaled = Math.abs(r) / system.rowScale(tape, w);
            if (scaled < best) {
                best = scaled;
                bestAt = u;
                stuck = 0;
            } else {
                stuck++;
            }
            if (r == 0 || best <= EquationSystem.ACCEPTED && stuck >= 2) {
                break;
            }
            bracket.take(u, r, slope);
            final double next = nextInside(u, u - r / slope, i);
            if (next == u || bracket.isExhausted()) {
                break;
            }
            u = next;
        }
        w.x[slot] = bestAt;
        return best <= EquationSystem.ACCEPTED;
    }

    /** The wanted point where the bracket allows it, else one that it allows. */
    private double nextInside(double u, double wanted, int iteration) {
        if (!bracket.contains(wanted)) {
            return bracket.isClosed() ? bracket.middle() : bracket.towards(u, wanted);
        }
        return bracket.isClosed() && iteration > 0 && iteration % HALVING == 0 ? bracket.middle() : wanted;
    }

    /**
     * Looks for a change of sign over the whole range, nearest to the start first, and iterates from there. A later search
     * takes another root, where there is one.
     *
     * @return whether there is a root; without one the unknown is left at the start
     */
    boolean scan(Tape tape, int slot, double start) {
        final RootScan scan = new RootScan(new OfTape(tape, slot), system.scale(slot), start);
        if (scan.find(search)) {
            return true;
        }
        final boolean any = !Double.isNaN(scan.first());
        w.x[slot] = any ? scan.first() : start;
        return any;
    }

    /** {@return whether the equation evaluated last determines a slot} */
    boolean determines(Tape tape, int slot) {
        final double slope = w.gradient[tape.placeOf(slot)];
        return Math.abs(slope) * system.scale(slot).at(w.x[slot]) > EquationSystem.SINGULAR * system.rowScale(tape, w);
    }

    /** The residual of an equation over one of its slots. */
    private final class OfTape implements RootScan.Residual {
        private final Tape tape;
        private final int slot;
        private final int place;

        OfTape(Tape tape, int slot) {
            this.tape = tape;
            this.slot = slot;
            place = tape.placeOf(slot);
        }

        @Override
        public double at(double value) {
            clock.tick();
            w.x[slot] = value;
            return tape.forward(w);
        }

        /** Newton inside a bracket that is known to hold a change of sign, with bisection where Newton leaves it. */
        @Override
        public double rootBetween(double low, double high, double lowResidual) {
            double a = low;
            double b = high;
            double u = 0.5 * (a + b);
            double best = Double.POSITIVE_INFINITY;
            double bestAt = u;
            for (int i = 0; i < 4 * ITERATIONS; i++) {
                clock.tick();
                w.x[slot] = u;
                final double r = tape.evaluate(w);
                final double slope = w.gradient[place];
                final double scaled = Math.abs(r) / system.rowScale(tape, w);
                if (scaled < best) {
                    best = scaled;
                    bestAt = u;
                }
                if (r == 0) {
                    break;
                }
                if (r * lowResidual > 0) {
                    a = u;
                } else {
                    b = u;
                }
                final double next = u - r / slope;
                final double chosen = next > a && next < b && i % 4 != 3 ? next : 0.5 * (a + b);
                if (chosen == u || b - a <= 4 * Math.ulp(Math.max(Math.abs(a), Math.abs(b)))) {
                    break;
                }
                u = chosen;
            }
            w.x[slot] = bestAt;
            return best <= EquationSystem.ACCEPTED ? bestAt : Double.NaN;
        }
    }
}
