package lostwork.exergy;

/** Thrown when something is asked of a reference environment that has not been stated: there are no hidden defaults. */
public final class IncompleteEnvironmentException extends IllegalStateException {
    private static final long serialVersionUID = 1L;

    IncompleteEnvironmentException(String message) {
        super(message);
    }
}
