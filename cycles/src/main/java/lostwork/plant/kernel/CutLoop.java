package lostwork.plant.kernel;

/**
 * A loop cut open at one unknown, as one residual over that unknown: the other unknowns follow from it one by one, and the
 * last equation tells by how much it is missed. Belongs to one solve; all unknowns of the loop are left in the workspace.
 */
final class CutLoop implements RootScan.Residual {
    /** Scaled residual from which the Newton iteration on the whole loop takes over. */
    private static final double CLOSE = 1e-7;

    private static final int ITERATIONS = 120;

    private final EquationSystem system;
    private final Workspace w;
    private final SolveClock clock;
    private final SingleEquation single;
    private final Tearing cut;

    CutLoop(EquationSystem system, Workspace w, SolveClock clock, SingleEquation single, Tearing cut) {
        this.system = system;
        this.w = w;
        this.clock = clock;
        this.single = single;
        this.cut = cut;
    }

    /**
     * Scans the range of the unknown, nearest to its present value first, for a value that closes the loop.
     *
     * @param passedOver how many such values are to be passed over
     * @return whether there is one; the unknowns are then close enough for a Newton iteration on the whole loop
     */
    boolean scan(int passedOver) {
        return new RootScan(this, system.scale(cut.slot()), w.x[cut.slot()]).find(passedOver);
    }

    @Override
    public double at(double value) {
        clock.tick();
        w.x[cut.slot()] = value;
        for (int i = 0; i < cut.slots().length; i++) {
            final Tape tape = system.equation(cut.equations()[i]);
            final int slot = cut.slots()[i];
            if (tape.isAffineIn(tape.placeOf(slot))) {
                w.x[slot] = w.solveAffine(tape, slot);
            } else if (!single.newton(tape, slot) && !single.scan(tape, slot, w.x[slot])) {
                return Double.NaN;
            }
            if (!Double.isFinite(w.x[slot])) {
                return Double.NaN;
            }
        }
        return system.equation(cut.residual()).forward(w);
    }

    /** Secant steps inside the interval, with bisection; there is no derivative through the cut. */
    @Override
    public double rootBetween(double low, double high, double lowResidual) {
        double a = low;
        double b = high;
        double ra = lowResidual;
        double rb = at(high);
        for (int i = 0; i < ITERATIONS; i++) {
            final double secant = a - ra * (b - a) / (rb - ra);
            final double u = i % 3 != 2 && secant > a && secant < b ? secant : 0.5 * (a + b);
            final double r = at(u);
            if (Double.isNaN(r)) {
                return Double.NaN;
            }
            if (system.scaledResidual(system.equation(cut.residual()), w) <= CLOSE) {
                return u;
            }
            if (u == a || u == b) {
                return Double.NaN;
            }
            if (r * ra > 0) {
                a = u;
                ra = r;
            } else {
                b = u;
                rb = r;
            }
        }
        return Double.NaN;
    }
}
