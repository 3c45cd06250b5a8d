package lostwork.examples.audit;

import java.util.ArrayList;
import java.util.List;

/**
 * One line of a separated file, cut into cells that know where they stand.
 *
 * <p>A cell may be quoted with {@code "}, and a doubled quote inside stands for one (RFC 4180). A quoted cell ends on
 * its own line; here the RFC is narrowed, so that a forgotten quote costs one line and not the rest of the file.
 */
final class CsvRow {
    private final int line;
    private final int length;
    private final List<Cell> cells;

    /**
     * One cell.
     *
     * @param text the content, without quotes and outer blanks
     * @param column number of its first character in the line, from 1
     */
    record Cell(String text, int column) {}

    private CsvRow(int line, int length, List<Cell> cells) {
        this.line = line;
        this.length = length;
        this.cells = List.copyOf(cells);
    }

    /** Marks where in a line the cutting failed. */
    static final class MalformedRowException extends RuntimeException {
        private static final long serialVersionUID = 1L;

        /** Number of the character, from 1. */
        private final int column;

        MalformedRowException(int column, String what) {
            super(what);
            this.column = column;
        }

        int column() {
            return column;
        }
    }

    static CsvRow cut(SourceText.Line line, char separator) {
        final String text = line.text();
        final List<Cell> cells = new ArrayList<>();
        int at = 0;
        while (true) {
            while (at < text.length() && isBlank(text.charAt(at))) {
                at++;
            }
            at = at < text.length() && text.charAt(at) == '"'
                    ? addQuoted(text, at, separator, cells)
                    : addPlain(text, at, separator, cells);
            if (at >= text.length()) {
                return new CsvRow(line.number(), text.length(), cells);
            }
            at++; // over the separator; after it there is one more cell, even at the end of the line
        }
    }

    private static int addPlain(String text, int start, char separator, List<Cell> cells) {
        int end = text.indexOf(separator, start);
        if (end < 0) {
            end = text.length();
        }
        final int quote = text.indexOf('"', start);
        if (quote >= 0 && quote < end) {
            throw new MalformedRowException(quote + 1, "a quote stands inside a cell that does not start with one");
        }
        cells.add(new Cell(text.substring(start, end).strip(), start + 1));
        return end;
    }

    private static int addQuoted(String text, int start, char separator, List<Cell> cells) {
        final StringBuilder content = new StringBuilder();
        int at = start + 1;
        while (true) {
            final int quote = text.indexOf('"', at);
            if (quote < 0) {
                throw new MalformedRowException(start + 1, "the quoted cell is not closed on its line");
            }
            content.append(text, at, quote);
            at = quote + 1;
            if (at >= text.length() || text.charAt(at) != '"') {
                break;
            }
            content.append('"');
            at++;
        }
        while (at < text.length() && isBlank(text.charAt(at))) {
            at++;
        }
        if (at < text.length() && text.charAt(at) != separator) {
            throw new MalformedRowException(at + 1, "text follows the closing quote of a cell");
        }
        cells.add(new Cell(content.toString().strip(), start + 2));
        return at;
    }

    private static boolean isBlank(char c) {
        return c == ' ' || c == '\t' || c == '\u00A0';
    }

    int line() {
        return line;
    }

    /** {@return the number of the character after the last one, where something that is missing would stand} */
    int endColumn() {
        return length + 1;
    }

    List<Cell> cells() {
        return cells;
    }
}
