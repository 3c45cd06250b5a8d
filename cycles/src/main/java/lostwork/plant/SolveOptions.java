package lostwork.plant;

import java.time.Duration;
import java.util.function.BooleanSupplier;
import org.jspecify.annotations.Nullable;

/** How a plant is solved: limits, warm start, restarts, and what happens when the second law is violated. Immutable. */
public final class SolveOptions {
    private static final SolveOptions DEFAULTS =
            new SolveOptions(Duration.ofSeconds(60), null, 20_261L, 8, SecondLaw.ENFORCED, () -> false, done -> {});

    private final Duration limit;
    private final @Nullable Solution start;
    private final long seed;
    private final int restarts;
    private final SecondLaw secondLaw;
    private final BooleanSupplier cancelled;
    private final Progress progress;

    /** What happens when a component of the solution generates negative entropy. */
    public enum SecondLaw {
        /** The solve fails with an error that names the component: right for a design. */
        ENFORCED,
        /** The solution carries it as a finding: right for measured data, which may be wrong. */
        REPORTED
    }

    /** Takes the progress of a solve. */
    @FunctionalInterface
    public interface Progress {
        /**
         * Takes the share of the work that is done.
         *
         * @param share from 0 to 1
         */
        void done(double share);
    }

    private SolveOptions(
            Duration limit,
            @Nullable Solution start,
            long seed,
            int restarts,
            SecondLaw secondLaw,
            BooleanSupplier cancelled,
            Progress progress) {
        this.limit = limit;
        this.start = start;
        this.seed = seed;
        this.restarts = restarts;
        this.secondLaw = secondLaw;
        this.cancelled = cancelled;
        this.progress = progress;
    }

    /** {@return cold start, 60 s, 8 restarts, the second law enforced} */
    public static SolveOptions defaults() {
        return DEFAULTS;
    }

    /**
     * {@return these options with another time limit}
     *
     * @param duration how long a solve may take, above zero
     */
    public SolveOptions within(Duration duration) {
        if (duration.isNegative() || duration.isZero()) {
            throw new IllegalArgumentException("time limit = " + duration + " must be above zero");
        }
        return new SolveOptions(duration, start, seed, restarts, secondLaw, cancelled, progress);
    }

    /**
     * {@return these options with a warm start}
     *
     * @param solution a solution of the same plant, near the one that is wanted
     */
    public SolveOptions startingFrom(Solution solution) {
        return new SolveOptions(limit, solution, seed, restarts, secondLaw, cancelled, progress);
    }

    /**
     * {@return these options with other restarts}
     *
     * @param newSeed the seed of the start values
     * @param count how often a loop is started again, 0 to 1000
     */
    public SolveOptions withRestarts(long newSeed, int count) {
        if (count < 0 || count > 1000) {
            throw new IllegalArgumentException("restarts = " + count + " is outside 0 .. 1000");
        }
        return new SolveOptions(limit, start, newSeed, count, secondLaw, cancelled, progress);
    }

    /**
     * {@return these options with another treatment of the second law}
     *
     * @param treatment what happens when a component generates negative entropy
     */
    public SolveOptions with(SecondLaw treatment) {
        return new SolveOptions(limit, start, seed, restarts, treatment, cancelled, progress);
    }

    /**
     * {@return these options with a way to cancel}
     *
     * @param check asked often during a solve; once it is true the solve ends with an error
     */
    public SolveOptions cancelledBy(BooleanSupplier check) {
        return new SolveOptions(limit, start, seed, restarts, secondLaw, check, progress);
    }

    /**
     * {@return these options with reports of progress}
     *
     * @param listener takes the share of the work that is done
     */
    public SolveOptions reportingTo(Progress listener) {
        return new SolveOptions(limit, start, seed, restarts, secondLaw, cancelled, listener);
    }

    Duration limit() {
        return limit;
    }

    @Nullable
    Solution start() {
        return start;
    }

    long seed() {
        return seed;
    }

    int restarts() {
        return restarts;
    }

    SecondLaw secondLaw() {
        return secondLaw;
    }

    BooleanSupplier cancelled() {
        return cancelled;
    }

    Progress progress() {
        return progress;
    }
}
