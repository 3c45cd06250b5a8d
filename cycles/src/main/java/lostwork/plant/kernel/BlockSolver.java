package lostwork.plant.kernel;

import java.util.Arrays;
import java.util.SplittableRandom;
import lostwork.solve.DenseLu;
import lostwork.solve.RankReport;
import lostwork.solve.SmallSvd;

/**
 * Solves the blocks of a system one after the other: single equations by a bracketed Newton iteration, loops by a damped
 * Newton iteration within bounds, each tested for rank when it has converged.
 *
 * <p>Residuals are scaled by the sum over all slots of an equation of |∂r/∂x| times the scale of the slot, so that a
 * scaled residual says by what share of their scales the values would have to change. One instance belongs to one solve.
 */
public final class BlockSolver {
    /** Scaled residual at which an iteration has converged; a further Newton step then polishes. */
    private static final double CONVERGED = 1e-11;
    /** Scaled residual that is accepted when rounding prevents more. */
    private static final double ACCEPTED = 1e-9;
    /** A block whose smallest singular value, against the largest, is below this does not determine its unknowns. */
    private static final double SINGULAR = 1e-9;
    /** Reciprocal condition below which the singular values are looked at. */
    private static final double SUSPICIOUS = 1e-7;

    /** Scaled residual of a cut loop from which the Newton iteration on the whole loop takes over. */
    private static final double CLOSE = 1e-7;

    private static final int SINGLE_ITERATIONS = 60;
    private static final int SCAN_POINTS = 48;
    private static final int NEAR_POINTS = 10;
    private static final int NEWTON_ITERATIONS = 80;

    /** How many steps pass between two looks at the clock. */
    private static final int TICKS = 16;

    private final EquationSystem system;
    private final Workspace w;
    private final StartValues starts;
    private final Limits limits;
    private final boolean[] known;
    /** The block that is being solved. */
    private int[] present = new int[0];

    private int presentNumber;

    private int ticks;
    private double[] matrix = new double[0];
    private double[] step = new double[0];
    private double[] residuals = new double[0];
    private double[] rowScale = new double[0];
    private double[] saved = new double[0];
    private DenseLu lu = DenseLu.ofCapacity(1);

    /**
     * Prepares a solve.
     *
     * @param system the system
     * @param workspace holds the given values, and start values for a warm start
     * @param known for each slot whether its value is given
     * @param starts gives start values; not asked in a warm start
     * @param limits what bounds the solve
     */
    public BlockSolver(EquationSystem system, Workspace workspace, boolean[] known, StartValues starts, Limits limits) {
        this.system = system;
        this.w = workspace;
        this.known = known.clone();
        this.starts = starts;
        this.limits = limits;
    }

    /**
     * Solves all blocks from start values.
     *
     * @throws BlockFailure if a block cannot be solved
     */
    public void solveCold() {
        solve(false);
    }

    /**
     * Solves all blocks starting from the values in the workspace; a block that does not converge from them is started
     * afresh.
     *
     * @throws BlockFailure if a block cannot be solved
     */
    public void solveWarm() {
        solve(true);
    }

    private void solve(boolean warm) {
        int number = 0;
        for (int[] block : system.blocks()) {
            present = block;
            presentNumber = number;
            checkLimits();
            if (block.length == 1) {
                solveSingle(number, block, warm);
            } else {
                solveLoop(number, block, warm);
            }
            for (int equation : block) {
                known[system.matched(equation)] = true;
            }
            number++;
            limits.progress().accept(number);
        }
    }

    /** Ends the solve when the caller wants it or the time is over; asked before each step that may take long. */
    private void checkLimits() {
        if (ticks++ % TICKS != 0) {
            return;
        }
        final BlockFailure.Reason reason = limits.cancelled().getAsBoolean()
                ? BlockFailure.Reason.CANCELLED
                : System.nanoTime() - limits.deadlineNanos() > 0 ? BlockFailure.Reason.OUT_OF_TIME : null;
        if (reason != null) {
            throw new BlockFailure(
                    reason, presentNumber, present.clone(), new double[present.length], new double[0], new double[0]);
        }
    }

    private BlockFailure failure(BlockFailure.Reason reason, int number, int[] block) {
        final double[] scaled = new double[block.length];
        for (int i = 0; i < block.length; i++) {
            scaled[i] = scaledResidual(block[i]);
        }
        return new BlockFailure(reason, number, block.clone(), scaled, new double[0], new double[0]);
    }

    private int[] slotsOf(int[] block) {
        final int[] slots = new int[block.length];
        for (int i = 0; i < block.length; i++) {
            slots[i] = system.matched(block[i]);
        }
        return slots;
    }

    // ------------------------------------------------------------------------------------------ single equations

    private void solveSingle(int number, int[] block, boolean warm) {
        final int equation = block[0];
        final int slot = system.matched(equation);
        final Tape tape = system.equation(equation);
        final int place = tape.placeOf(slot);
        if (tape.isAffineIn(place)) {
            w.x[slot] = 0; // also in a warm start, which then gives the same bits as a cold one
            final double residual = tape.evaluate(w);
            final double slope = w.gradient[place];
            w.x[slot] -= residual / slope;
            if (tape.isAmbiguous(w)) {
                throw failure(BlockFailure.Reason.SATURATED, number, block);
            }
            if (!(Math.abs(slope) * scale(slot) > SINGULAR * rowScale(tape))) {
                throw singular(number, block, new double[] {1}, new double[] {1});
            }
            return;
        }
        if (!warm || Double.isNaN(w.x[slot])) {
            starts.prepare(new int[] {slot}, known, w);
        }
        final double start = w.x[slot];
        // A later search takes another root, where there is one.
        if ((limits.search() > 0 || !newton(tape, place, slot)) && !scan(tape, place, slot, start)) {
            throw failure(BlockFailure.Reason.NOT_MET, number, block);
        }
        tape.evaluate(w);
        if (tape.isOutside(w)) {
            throw failure(BlockFailure.Reason.NOT_MET, number, block); // met only where the fluid is continued
        }
        if (!(Math.abs(w.gradient[place]) * scale(slot) > SINGULAR * rowScale(tape))) {
            throw singular(number, block, new double[] {1}, new double[] {1});
        }
    }

    /** Newton iteration from the present value, kept between the limits and inside a bracket once one is found. */
    private boolean newton(Tape tape, int place, int slot) {
        final SlotScale bounds = system.scale(slot);
        double low = bounds.lowest();
        double high = bounds.highest();
        double lowResidual = Double.NaN;
        double highResidual = Double.NaN;
        double u = bounds.clamp(w.x[slot]);
        double best = Double.POSITIVE_INFINITY;
        double bestAt = u;
        int stuck = 0;
        for (int i = 0; i < SINGLE_ITERATIONS; i++) {
            checkLimits();
            w.x[slot] = u;
            final double r = tape.evaluate(w);
            final double slope = w.gradient[place];
            final double scaled = Math.abs(r) / rowScale(tape);
            if (scaled < best) {
                best = scaled;
                bestAt = u;
                stuck = 0;
            } else {
                stuck++;
            }
            if (r == 0 || best <= ACCEPTED && stuck >= 2) {
                break;
            }
            if (!Double.isNaN(r)) {
                if (Double.isNaN(lowResidual) && Double.isNaN(highResidual)) {
                    // First point: it becomes one end, by the direction in which the root is expected.
                    if (r * slope <= 0) {
                        low = u;
                        lowResidual = r;
                    } else {
                        high = u;
                        highResidual = r;
                    }
                } else if (!Double.isNaN(lowResidual) && r * lowResidual > 0) {
                    if (u > low) {
                        low = u;
                        lowResidual = r;
                    }
                } else if (!Double.isNaN(lowResidual)) {
                    if (u > low) {
                        high = u;
                        highResidual = r;
                    }
                } else if (r * highResidual > 0) {
                    if (u < high) {
                        high = u;
                        highResidual = r;
                    }
                } else if (u < high) {
                    low = u;
                    lowResidual = r;
                }
            }
            double next = u - r / slope;
            final boolean haveBoth = !Double.isNaN(lowResidual) && !Double.isNaN(highResidual);
            if (!(next >= low && next <= high)) {
                if (haveBoth) {
                    next = middle(low, high, bounds);
                } else {
                    final double target = next < low || Double.isNaN(next) && Double.isNaN(lowResidual) ? low : high;
                    next = 0.5 * (u + target);
                }
            } else if (haveBoth && i > 0 && i % 8 == 0) {
                next = middle(low, high, bounds);
            }
            if (next == u || haveBoth && Math.abs(high - low) <= Math.ulp(Math.max(Math.abs(high), Math.abs(low)))) {
                break;
            }
            u = next;
        }
        w.x[slot] = bestAt;
        return best <= ACCEPTED;
    }

    private static double middle(double low, double high, SlotScale bounds) {
        return bounds.proportional() && low > 0 ? Math.sqrt(low) * Math.sqrt(high) : 0.5 * (low + high);
    }

    /** Looks for a change of sign over the whole range, nearest to the start first, and iterates from there. */
    private boolean scan(Tape tape, int place, int slot, double start) {
        final SlotScale bounds = system.scale(slot);
        final double[] at = scanPoints(bounds, start);
        final double[] r = new double[at.length];
        for (int i = 0; i < at.length; i++) {
            checkLimits();
            w.x[slot] = at[i];
            r[i] = tape.forward(w);
        }
        final Integer[] order = new Integer[at.length - 1];
        Arrays.setAll(order, i -> i);
        Arrays.sort(order, (a, b) -> Double.compare(Math.abs(at[a] - start), Math.abs(at[b] - start)));
        final int wanted = limits.search();
        int roots = 0;
        double first = Double.NaN;
        for (int i : order) {
            if (r[i] * r[i + 1] <= 0 && bisect(tape, place, slot, at[i], at[i + 1], r[i])) {
                if (roots == wanted) {
                    return true;
                }
                first = roots == 0 ? w.x[slot] : first;
                roots++;
            }
        }
        w.x[slot] = roots > 0 ? first : start;
        return roots > 0;
    }

    /** Points over the whole range, and more of them around the start, where roots may lie close to each other. */
    private static double[] scanPoints(SlotScale bounds, double start) {
        final double[] points = new double[SCAN_POINTS + 2 * NEAR_POINTS];
        for (int i = 0; i < SCAN_POINTS; i++) {
            final double share = i / (SCAN_POINTS - 1.0);
            points[i] = bounds.proportional() && bounds.lowest() > 0
                    ? Math.exp(Math.log(bounds.lowest()) * (1 - share) + Math.log(bounds.highest()) * share)
                    : bounds.lowest() * (1 - share) + bounds.highest() * share;
        }
        final double size = bounds.at(start);
        for (int i = 0; i < NEAR_POINTS; i++) {
            final double distance = size * Math.pow(10, -0.5 * i);
            points[SCAN_POINTS + 2 * i] = bounds.clamp(start - distance);
            points[SCAN_POINTS + 2 * i + 1] = bounds.clamp(start + distance);
        }
        Arrays.sort(points);
        return points;
    }

    /** Newton inside a bracket that is known to hold a change of sign, with bisection where Newton leaves it. */
    private boolean bisect(Tape tape, int place, int slot, double low, double high, double lowResidual) {
        double a = low;
        double b = high;
        double u = 0.5 * (a + b);
        double best = Double.POSITIVE_INFINITY;
        double bestAt = u;
        for (int i = 0; i < 4 * SINGLE_ITERATIONS; i++) {
            checkLimits();
            w.x[slot] = u;
            final double r = tape.evaluate(w);
            final double slope = w.gradient[place];
            final double scaled = Math.abs(r) / rowScale(tape);
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
        return best <= ACCEPTED;
    }

    // ------------------------------------------------------------------------------------------------- loops

    private void solveLoop(int number, int[] block, boolean warm) {
        final int n = block.length;
        final int[] slots = slotsOf(block);
        reserve(n);
        if (warm && iterate(block, slots)) {
            finishLoop(number, block, slots);
            return;
        }
        starts.prepare(slots, known, w);
        final double[] first = new double[n];
        for (int j = 0; j < n; j++) {
            first[j] = system.scale(slots[j]).clamp(w.x[slots[j]]);
        }
        final SplittableRandom random = new SplittableRandom((limits.seed() * 31 + number) * 31 + limits.search());
        // A later search wants another solution: the scan of a cut loop finds them all.
        if (limits.search() > 0 && solveTorn(block, slots, first)) {
            finishLoop(number, block, slots);
            return;
        }
        double[] bestStart = first;
        double bestResidual = Double.POSITIVE_INFINITY;
        for (int attempt = 0; attempt <= limits.restarts(); attempt++) {
            for (int j = 0; j < n; j++) {
                w.x[slots[j]] = attempt == 0 && limits.search() == 0
                        ? first[j]
                        : perturbed(slots[j], first[j], random, attempt + limits.search());
            }
            if (attempt % 2 == 0) {
                sweep(block, slots);
                sweep(block, slots);
            }
            final boolean met = iterate(block, slots);
            if (met && (!isOutside(block) || attempt == limits.restarts())) {
                finishLoop(number, block, slots);
                return;
            }
            if (attempt == 0 && limits.search() == 0 && solveTorn(block, slots, first)) {
                finishLoop(number, block, slots);
                return;
            }
            final double reached = residualNorm(block);
            if (reached < bestResidual) {
                bestResidual = reached;
                bestStart = new double[n];
                for (int j = 0; j < n; j++) {
                    bestStart[j] = w.x[slots[j]];
                }
            }
        }
        for (int j = 0; j < n; j++) {
            w.x[slots[j]] = bestStart[j];
        }
        throw failure(BlockFailure.Reason.NOT_MET, number, block);
    }

    /** Cuts the loop open at one unknown, looks for a change of sign over its whole range, and polishes what it finds. */
    private boolean solveTorn(int[] block, int[] slots, double[] start) {
        for (Tearing cut : Tearing.of(system, block)) {
            checkLimits();
            for (int j = 0; j < slots.length; j++) {
                w.x[slots[j]] = start[j];
            }
            if (scanCut(cut, w.x[cut.slot()]) && iterate(block, slots) && !isOutside(block)) {
                return true;
            }
        }
        return false;
    }

    private boolean scanCut(Tearing cut, double start) {
        final SlotScale bounds = system.scale(cut.slot());
        final double[] at = scanPoints(bounds, start);
        final double[] r = new double[at.length];
        for (int i = 0; i < at.length; i++) {
            r[i] = residualOfCut(cut, at[i]);
        }
        final Integer[] order = new Integer[at.length - 1];
        Arrays.setAll(order, i -> i);
        Arrays.sort(order, (a, b) -> Double.compare(Math.abs(at[a] - start), Math.abs(at[b] - start)));
        int roots = 0;
        for (int i : order) {
            if (r[i] * r[i + 1] <= 0 && bisectCut(cut, at[i], at[i + 1], r[i]) && roots++ == limits.search()) {
                return true;
            }
        }
        return false;
    }

    /** Bisection with secant steps; true when the change of sign is a root and no jump. */
    private boolean bisectCut(Tearing cut, double low, double high, double lowResidual) {
        double a = low;
        double b = high;
        double ra = lowResidual;
        double rb = residualOfCut(cut, high);
        for (int i = 0; i < 2 * SINGLE_ITERATIONS; i++) {
            final double secant = a - ra * (b - a) / (rb - ra);
            final double u = i % 3 != 2 && secant > a && secant < b ? secant : 0.5 * (a + b);
            final double r = residualOfCut(cut, u);
            if (Double.isNaN(r)) {
                return false;
            }
            if (scaledResidual(cut.residual()) <= CLOSE) {
                return true;
            }
            if (u == a || u == b) {
                return false;
            }
            if (r * ra > 0) {
                a = u;
                ra = r;
            } else {
                b = u;
                rb = r;
            }
        }
        return false;
    }

    /** The residual that is left when the loop is cut at a value and all other unknowns follow from it. */
    private double residualOfCut(Tearing cut, double value) {
        checkLimits();
        w.x[cut.slot()] = value;
        for (int i = 0; i < cut.slots().length; i++) {
            final Tape tape = system.equation(cut.equations()[i]);
            final int slot = cut.slots()[i];
            final int place = tape.placeOf(slot);
            if (tape.isAffineIn(place)) {
                w.x[slot] = w.solveAffine(tape, slot);
            } else if (!newton(tape, place, slot) && !scan(tape, place, slot, w.x[slot])) {
                return Double.NaN;
            }
            if (!Double.isFinite(w.x[slot])) {
                return Double.NaN;
            }
        }
        return system.equation(cut.residual()).forward(w);
    }

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

    private void reserve(int n) {
        if (step.length < n) {
            matrix = new double[n * n];
            step = new double[n];
            residuals = new double[n];
            rowScale = new double[n];
            saved = new double[n];
            lu = DenseLu.ofCapacity(n);
        }
    }

    /** One Gauss–Seidel sweep: each equation is solved for its own unknown where that is easy. */
    private void sweep(int[] block, int[] slots) {
        for (int i = 0; i < block.length; i++) {
            checkLimits();
            final Tape tape = system.equation(block[i]);
            final int slot = slots[i];
            final int place = tape.placeOf(slot);
            final double before = w.x[slot];
            if (tape.isAffineIn(place)) {
                final double r = tape.evaluate(w);
                final double next = before - r / w.gradient[place];
                final SlotScale bounds = system.scale(slot);
                if (Double.isFinite(next)) {
                    w.x[slot] = bounds.clamp(next);
                }
            } else if (!newton(tape, place, slot)) {
                w.x[slot] = before;
            }
        }
    }

    /** Damped Newton iteration; true when it has converged. */
    private boolean iterate(int[] block, int[] slots) {
        final int n = block.length;
        double norm = evaluateLoop(block, slots);
        int polished = 0;
        for (int iteration = 0; iteration < NEWTON_ITERATIONS; iteration++) {
            if (!Double.isFinite(norm) || !isFinite(n)) {
                return false;
            }
            if (norm <= CONVERGED && polished++ >= 1 || norm == 0) {
                return true;
            }
            if (!newtonStep(n)) {
                return false;
            }
            for (int j = 0; j < n; j++) {
                saved[j] = w.x[slots[j]];
            }
            double damping = 1;
            double next = Double.NaN;
            boolean lower = false;
            for (int cut = 0; cut < 12 && !lower; cut++) {
                checkLimits();
                move(slots, damping);
                next = residualNorm(block, rowScale);
                lower = next < norm * (1 - 1e-4 * damping);
                if (!lower) {
                    damping *= 0.5;
                }
            }
            if (!lower && norm <= ACCEPTED) {
                for (int j = 0; j < n; j++) {
                    w.x[slots[j]] = saved[j]; // rounding allows no more
                }
                return true;
            }
            if (!lower) {
                // Over a hump: a short step, then go on.
                move(slots, 1.0 / 16);
            }
            norm = evaluateLoop(block, slots);
        }
        return norm <= ACCEPTED && isFinite(n);
    }

    /** Moves the unknowns along the step, each at most to nine tenths of the way to its limit. */
    private void move(int[] slots, double damping) {
        for (int j = 0; j < slots.length; j++) {
            final SlotScale bounds = system.scale(slots[j]);
            final double from = saved[j];
            double to = from + damping * step[j] * bounds.at(from);
            if (bounds.proportional() && from > 0 && to < 0.1 * from && bounds.lowest() >= 0) {
                to = 0.1 * from;
            }
            if (to < bounds.lowest()) {
                to = from + 0.9 * (bounds.lowest() - from);
            } else if (to > bounds.highest()) {
                to = from + 0.9 * (bounds.highest() - from);
            }
            w.x[slots[j]] = to;
        }
    }

    /** Fills the scaled matrix and residuals; gives the largest scaled residual. */
    private double evaluateLoop(int[] block, int[] slots) {
        final int n = block.length;
        double norm = 0;
        for (int i = 0; i < n; i++) {
            final Tape tape = system.equation(block[i]);
            final double r = tape.evaluate(w);
            rowScale[i] = rowScale(tape);
            residuals[i] = r / rowScale[i];
            norm = larger(norm, Math.abs(residuals[i]));
            for (int j = 0; j < n; j++) {
                final int place = tape.placeOf(slots[j]);
                matrix[i * n + j] = place < 0 ? 0 : w.gradient[place] * scale(slots[j]) / rowScale[i];
            }
        }
        return norm;
    }

    /** The larger of two numbers, and NaN when one of them is. */
    private static double larger(double a, double b) {
        return a >= b ? a : b > a ? b : Double.NaN;
    }

    private boolean isFinite(int n) {
        for (int i = 0; i < n * n; i++) {
            if (!Double.isFinite(matrix[i])) {
                return false;
            }
        }
        return true;
    }

    private boolean newtonStep(int n) {
        for (int i = 0; i < n; i++) {
            step[i] = -residuals[i];
        }
        lu.factor(matrix, n);
        if (!lu.isSingular() && lu.reciprocalCondition() > 1e-14) {
            lu.solve(step, step);
            return true;
        }
        return levenbergStep(n);
    }

    /** A step of (JᵀJ + µI) d = −Jᵀr, where the matrix itself cannot be solved. */
    private boolean levenbergStep(int n) {
        final double[] normal = new double[n * n];
        final double[] right = new double[n];
        double trace = 0;
        for (int i = 0; i < n; i++) {
            for (int j = 0; j < n; j++) {
                double sum = 0;
                for (int k = 0; k < n; k++) {
                    sum += matrix[k * n + i] * matrix[k * n + j];
                }
                normal[i * n + j] = sum;
            }
            trace += normal[i * n + i];
            for (int k = 0; k < n; k++) {
                right[i] -= matrix[k * n + i] * residuals[k];
            }
        }
        for (int i = 0; i < n; i++) {
            normal[i * n + i] += 1e-6 * trace / n;
        }
        lu.factor(normal, n);
        if (lu.isSingular()) {
            return false;
        }
        lu.solve(right, step);
        return true;
    }

    private double residualNorm(int[] block, double[] scales) {
        double norm = 0;
        for (int i = 0; i < block.length; i++) {
            norm = larger(norm, Math.abs(system.equation(block[i]).forward(w)) / scales[i]);
        }
        return Double.isNaN(norm) ? Double.POSITIVE_INFINITY : norm;
    }

    private double residualNorm(int[] block) {
        double norm = 0;
        for (int equation : block) {
            norm = larger(norm, scaledResidual(equation));
        }
        return Double.isNaN(norm) ? Double.POSITIVE_INFINITY : norm;
    }

    /** Tests the rank of a converged block. */
    private void finishLoop(int number, int[] block, int[] slots) {
        final int n = block.length;
        evaluateLoop(block, slots);
        lu.factor(matrix, n);
        if (!lu.isSingular() && lu.reciprocalCondition() > SUSPICIOUS) {
            return;
        }
        final RankReport rank = SmallSvd.of(Arrays.copyOf(matrix, n * n), n, n)
                .rankReport(SINGULAR)
                .separated();
        if (rank.rank() < n) {
            throw singular(number, block, rank.leftNullVector(0), rank.rightNullVector(0));
        }
    }

    private BlockFailure singular(int number, int[] block, double[] left, double[] right) {
        final double[] scaled = new double[block.length];
        for (int i = 0; i < block.length; i++) {
            scaled[i] = scaledResidual(block[i]);
        }
        return new BlockFailure(BlockFailure.Reason.SINGULAR, number, block.clone(), scaled, left, right);
    }

    // ------------------------------------------------------------------------------------------------ scales

    private double scale(int slot) {
        return system.scale(slot).at(w.x[slot]);
    }

    private double rowScale(Tape tape) {
        return system.rowScale(tape, w);
    }

    /**
     * {@return the scaled residual of an equation at the present values, without its sign}
     *
     * @param equation the equation
     */
    public double scaledResidual(int equation) {
        return system.scaledResidual(system.equation(equation), w);
    }

    /** {@return whether a property function lay outside the range of its fluid in its last evaluation} */
    public boolean anyOutsideRange() {
        return w.anyOutside();
    }
}
