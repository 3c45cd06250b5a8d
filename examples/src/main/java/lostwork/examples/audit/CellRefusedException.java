package lostwork.examples.audit;

/** The text of one cell cannot be accepted; whoever knows file and line turns this into a {@link Problem}. */
final class CellRefusedException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    /** What would be accepted. */
    private final String accepted;

    CellRefusedException(String what, String accepted) {
        super(what);
        this.accepted = accepted;
    }

    String what() {
        return getMessage();
    }

    String accepted() {
        return accepted;
    }
}
