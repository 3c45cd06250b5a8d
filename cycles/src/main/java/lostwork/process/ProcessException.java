package lostwork.process;

import org.jspecify.annotations.Nullable;

/**
 * Thrown when a step of a closed mass cannot be made as asked, or a figure asked for has no meaning for the chain.
 *
 * <p>The message names the step, where it starts, what was asked, and the way out. Where the property model refused a
 * state, its own exception with value and range is the cause.
 */
public final class ProcessException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    /** Why a step or a figure is refused. */
    public enum Reason {
        /** The process never reaches the end asked for, or the model does not hold on the way. */
        END_NOT_REACHED,
        /** The value asked for does not tell one end: inside the two-phase region a pressure and a temperature. */
        END_NOT_DETERMINED,
        /** The exponent of a polytropic process does not fit the end asked for. */
        EXPONENT,
        /** The state belongs to another fluid. */
        OTHER_FLUID,
        /** An engine's figure is asked of a cycle that consumes work, or the reverse. */
        DIRECTION,
        /** Heat would flow from the colder to the hotter side. */
        HEAT_UPHILL
    }

    /** Why. */
    private final Reason reason;

    ProcessException(Reason reason, String message) {
        this(reason, message, null);
    }

    ProcessException(Reason reason, String message, @Nullable RuntimeException cause) {
        super(message, cause);
        this.reason = reason;
    }

    /** {@return why} */
    public Reason reason() {
        return reason;
    }
}
