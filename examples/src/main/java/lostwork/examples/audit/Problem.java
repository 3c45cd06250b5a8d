package lostwork.examples.audit;

/**
 * What is wrong with an input, where it stands, and what would be accepted.
 *
 * @param file name of the file
 * @param line line number from 1; 0 when the file as a whole is meant
 * @param column number of the character in the line, from 1; 0 when the line as a whole is meant
 * @param what what is wrong, without a full stop
 * @param accepted what would be accepted, without a full stop
 */
record Problem(String file, int line, int column, String what, String accepted) {

    static Problem ofFile(String file, String what, String accepted) {
        return new Problem(file, 0, 0, what, accepted);
    }

    @Override
    public String toString() {
        final StringBuilder text = new StringBuilder(file);
        if (line > 0) {
            text.append(", line ").append(line);
        }
        if (column > 0) {
            text.append(", column ").append(column);
        }
        return text.append(": ")
                .append(what)
                .append(". Accepted: ")
                .append(accepted)
                .append('.')
                .toString();
    }
}
