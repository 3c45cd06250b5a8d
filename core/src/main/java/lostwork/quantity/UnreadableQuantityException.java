package lostwork.quantity;

/**
 * Thrown when a text does not state a value of the wanted kind.
 *
 * <p>The message quotes the text and says what is wrong with it and what is accepted. The same facts are accessors, so
 * that an embedding program can point at the place in its own words.
 */
public final class UnreadableQuantityException extends IllegalArgumentException {
    private static final long serialVersionUID = 1L;

    private static final int LONGEST_QUOTE = 60;

    /** The text as it was given. */
    private final String text;
    /** The name of the kind that was wanted. */
    private final String quantity;
    /** What is wrong with the text. */
    private final String problem;
    /** What is accepted instead. */
    private final String accepted;

    UnreadableQuantityException(String text, String quantity, String problem, String accepted) {
        super(quote(text) + " cannot be read as " + quantity + " (" + problem + "); accepted: " + accepted);
        this.text = text;
        this.quantity = quantity;
        this.problem = problem;
        this.accepted = accepted;
    }

    /** {@return a text in quotes, shortened and without control characters, fit for a message of one line} */
    static String quote(String text) {
        final String shown = text.length() > LONGEST_QUOTE ? text.substring(0, LONGEST_QUOTE) + "…" : text;
        return "\"" + shown.replaceAll("\\p{Cntrl}", "�") + "\"";
    }

    /** {@return the text as it was given} */
    public String text() {
        return text;
    }

    /** {@return the name of the kind that was wanted, such as {@code "mass flow"}} */
    public String quantity() {
        return quantity;
    }

    /** {@return what is wrong with the text, as a clause} */
    public String problem() {
        return problem;
    }

    /** {@return what is accepted instead} */
    public String accepted() {
        return accepted;
    }
}
