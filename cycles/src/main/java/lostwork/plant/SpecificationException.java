package lostwork.plant;

import java.util.List;

/**
 * Thrown when the given values of a plant are too few or contradict each other, before anything is solved. The message
 * says by name what is missing or too much; the same facts are accessors.
 */
public final class SpecificationException extends IllegalStateException {
    private static final long serialVersionUID = 1L;

    /** How many more values must be given. */
    private final int missing;
    /** What one more value would settle. */
    private final transient List<Variable<?>> unsettled;
    /** Any of these may be given, best first. */
    private final transient List<Variable<?>> candidates;
    /** Given values of which one is too many, most recent first. */
    private final transient List<Variable<?>> surplus;

    SpecificationException(
            String message,
            int missing,
            List<Variable<?>> unsettled,
            List<Variable<?>> candidates,
            List<Variable<?>> surplus) {
        super(message);
        this.missing = missing;
        this.unsettled = List.copyOf(unsettled);
        this.candidates = List.copyOf(candidates);
        this.surplus = List.copyOf(surplus);
    }

    /** {@return how many more values must be given; 0 when none is missing} */
    public int missing() {
        return missing;
    }

    /** {@return the variables that are not settled} */
    public List<Variable<?>> unsettled() {
        return unsettled;
    }

    /** {@return variables any of which may be given, best first; empty when nothing is missing} */
    public List<Variable<?>> candidates() {
        return candidates;
    }

    /** {@return given variables of which at least one must be released; empty when nothing contradicts} */
    public List<Variable<?>> surplus() {
        return surplus;
    }
}
