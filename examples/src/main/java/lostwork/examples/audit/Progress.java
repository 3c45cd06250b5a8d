package lostwork.examples.audit;

import java.io.PrintStream;
import java.util.function.LongSupplier;

/** Says how far long work has come: nothing in the first second, then a line a second at most. */
final class Progress {
    private static final long PAUSE_NANOSECONDS = 1_000_000_000L;

    private final PrintStream out;
    private final LongSupplier clock;
    private long last;

    /**
     * Starts the clock.
     *
     * @param out where to print
     * @param clock time in nanoseconds
     */
    Progress(PrintStream out, LongSupplier clock) {
        this.out = out;
        this.clock = clock;
        this.last = clock.getAsLong();
    }

    void report(String words) {
        final long now = clock.getAsLong();
        if (now - last >= PAUSE_NANOSECONDS) {
            last = now;
            out.println(words);
        }
    }
}
