package lostwork.examples.recovery;

/** Thrown when no recovery plant can be built on a stream; the message says why in a sentence. */
public final class NoRecoveryException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    NoRecoveryException(String why) {
        super(why);
    }
}
