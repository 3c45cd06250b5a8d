package lostwork.examples.audit;

/** An input that makes the audit impossible; the message is all that the reader of the terminal needs. */
final class RefusedInputException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    RefusedInputException(String message) {
        super(message);
    }

    RefusedInputException(Problem problem) {
        super(problem.toString());
    }
}
