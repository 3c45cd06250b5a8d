package lostwork.report;

import java.util.Locale;

/**
 * Builds one JSON document (RFC 8259), indented, in the order of the calls. Not thread-safe.
 *
 * <pre>{@code
 * String text = new JsonText().openObject().put("power in kW", 12.5).closeObject().toString();
 * }</pre>
 */
public final class JsonText {
    private final StringBuilder text = new StringBuilder();
    private int depth;
    private boolean first = true;

    /** Starts an empty document. */
    public JsonText() {}

    /**
     * Opens the object that is the document.
     *
     * @return this
     */
    public JsonText openObject() {
        return open('{');
    }

    /**
     * Opens an object that is a member of the one that is open.
     *
     * @param name its name
     * @return this
     */
    public JsonText openObject(String name) {
        return name(name).open('{');
    }

    /**
     * Closes the object that is open.
     *
     * @return this
     */
    public JsonText closeObject() {
        return close('}');
    }

    /**
     * Opens an array that is a member of the object that is open.
     *
     * @param name its name
     * @return this
     */
    public JsonText openArray(String name) {
        return name(name).open('[');
    }

    /**
     * Closes the array that is open.
     *
     * @return this
     */
    public JsonText closeArray() {
        return close(']');
    }

    /**
     * Opens an object that is an element of the array that is open.
     *
     * @return this
     */
    public JsonText openElement() {
        separate();
        return open('{');
    }

    /**
     * Writes an element of the array that is open.
     *
     * @param value its value
     * @return this
     */
    public JsonText element(String value) {
        separate();
        text.append(quoted(value));
        return this;
    }

    /**
     * Writes a member of the object that is open.
     *
     * @param name its name
     * @param value its value
     * @return this
     */
    public JsonText put(String name, String value) {
        name(name);
        text.append(quoted(value));
        return this;
    }

    /**
     * Writes a member of the object that is open, with all digits of its value.
     *
     * @param name its name
     * @param value its value; JSON has no NaN and no infinity, {@code null} is written for them
     * @return this
     */
    public JsonText put(String name, double value) {
        name(name);
        text.append(Double.isFinite(value) ? Double.toString(value) : "null");
        return this;
    }

    /**
     * Writes a member of the object that is open.
     *
     * @param name its name
     * @param value its value, a whole number
     * @return this
     */
    public JsonText put(String name, long value) {
        name(name);
        text.append(value);
        return this;
    }

    private JsonText name(String name) {
        separate();
        text.append(quoted(name)).append(": ");
        return this;
    }

    private void separate() {
        if (!first) {
            text.append(',');
        }
        first = false;
        newLine();
    }

    private JsonText open(char bracket) {
        text.append(bracket);
        depth++;
        first = true;
        return this;
    }

    private JsonText close(char bracket) {
        depth--;
        if (!first) {
            newLine();
        }
        first = false;
        text.append(bracket);
        return this;
    }

    private void newLine() {
        text.append('\n').append("  ".repeat(depth));
    }

    private static String quoted(String value) {
        final StringBuilder quoted = new StringBuilder("\"");
        for (int i = 0; i < value.length(); i++) {
            final char c = value.charAt(i);
            if (c == '"' || c == '\\') {
                quoted.append('\\').append(c);
            } else if (c < 0x20) {
                quoted.append(String.format(Locale.ROOT, "\\u%04x", (int) c));
            } else {
                quoted.append(c);
            }
        }
        return quoted.append('"').toString();
    }

    /** {@return the document, ended by a line feed} */
    @Override
    public String toString() {
        return text.toString().stripLeading() + "\n";
    }
}
