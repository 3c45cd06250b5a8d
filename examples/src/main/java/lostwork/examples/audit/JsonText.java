package lostwork.examples.audit;

import java.util.Locale;

/** Builds one JSON document (RFC 8259), indented, in the order of the calls. */
final class JsonText {
    private final StringBuilder text = new StringBuilder();
    private int depth;
    private boolean first = true;

    JsonText openObject() {
        return open('{');
    }

    JsonText closeObject() {
        return close('}');
    }

    JsonText openArray(String name) {
        return name(name).open('[');
    }

    JsonText closeArray() {
        return close(']');
    }

    /** Starts an object that is an element of an array. */
    JsonText openElement() {
        separate();
        return open('{');
    }

    JsonText openObject(String name) {
        return name(name).open('{');
    }

    JsonText put(String name, String value) {
        name(name);
        text.append(quoted(value));
        return this;
    }

    JsonText put(String name, double value) {
        name(name);
        text.append(Decimals.shortest(value));
        return this;
    }

    JsonText putNull(String name) {
        name(name);
        text.append("null");
        return this;
    }

    JsonText element(String value) {
        separate();
        text.append(quoted(value));
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

    @Override
    public String toString() {
        return text.toString().stripLeading() + "\n";
    }
}
