package lostwork.examples.audit;

/** Breaks text into lines of a terminal's width. */
final class Paragraph {
    static final int WIDTH = 108;

    private Paragraph() {}

    /** {@return the text in lines of at most {@link #WIDTH} characters, the second and later ones indented by two} */
    static String wrap(String text) {
        final StringBuilder wrapped = new StringBuilder();
        int column = 0;
        for (String word : text.split(" ")) {
            if (column > 0 && column + 1 + word.length() > WIDTH) {
                wrapped.append("\n  ");
                column = 2;
            } else if (column > 0) {
                wrapped.append(' ');
                column++;
            }
            wrapped.append(word);
            column += word.length();
        }
        return wrapped.toString();
    }
}
