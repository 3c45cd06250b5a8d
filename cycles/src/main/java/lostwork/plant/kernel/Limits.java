package lostwork.plant.kernel;

import java.util.function.BooleanSupplier;
import java.util.function.IntConsumer;

/**
 * What bounds a solve from outside.
 *
 * @param deadlineNanos the moment, as {@link System#nanoTime}, when the solve gives up
 * @param cancelled tells whether the caller wants the solve to end
 * @param progress takes the number of blocks that are solved
 * @param seed seed of the restarts
 * @param restarts how often a block is tried again from other start values
 * @param search which search for a solution this is: 0 starts from what is known nearby, later ones elsewhere
 */
public record Limits(
        long deadlineNanos, BooleanSupplier cancelled, IntConsumer progress, long seed, int restarts, int search) {}
