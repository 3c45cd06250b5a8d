package lostwork.plant.kernel;

/**
 * Ends a solve when the caller wants it or its time is over. It knows the block that is being solved, so that the failure
 * can name it. One instance belongs to one solve.
 */
final class SolveClock {
    /** How many steps pass between two looks at the clock. */
    private static final int TICKS = 16;

    private static final int[] NO_BLOCK = {};

    private final Limits limits;
    private int number;
    private int[] block = NO_BLOCK;
    private int ticks;

    SolveClock(Limits limits) {
        this.limits = limits;
    }

    /** Tells which block the next steps belong to. */
    void enter(int newNumber, int[] newBlock) {
        number = newNumber;
        block = newBlock;
        tick();
    }

    /**
     * Counts a step; called before each one that may take long.
     *
     * @throws BlockFailure if the solve was cancelled or its time is over
     */
    void tick() {
        if (ticks++ % TICKS != 0) {
            return;
        }
        if (limits.cancelled().getAsBoolean()) {
            throw failure(BlockFailure.Reason.CANCELLED);
        }
        if (System.nanoTime() - limits.deadlineNanos() > 0) {
            throw failure(BlockFailure.Reason.OUT_OF_TIME);
        }
    }

    private BlockFailure failure(BlockFailure.Reason reason) {
        return new BlockFailure(reason, number, block, new double[block.length]);
    }
}
