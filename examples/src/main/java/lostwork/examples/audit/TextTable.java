package lostwork.examples.audit;

import java.util.ArrayList;
import java.util.List;

/** A table of text with aligned columns: words to the left, numbers to the right, two blanks between. */
final class TextTable {
    private final List<Column> columns;
    private final List<List<String>> rows = new ArrayList<>();

    /** Where the cells of a column line up. */
    enum Alignment {
        LEFT,
        RIGHT
    }

    /**
     * One column.
     *
     * @param heading first line of the heading
     * @param unit second line of the heading, may be empty
     * @param alignment where cells line up
     */
    record Column(String heading, String unit, Alignment alignment) {}

    TextTable(List<Column> columns) {
        this.columns = List.copyOf(columns);
    }

    void add(String... cells) {
        add(List.of(cells));
    }

    void add(List<String> cells) {
        if (cells.size() != columns.size()) {
            throw new IllegalArgumentException(cells.size() + " cells for " + columns.size() + " columns");
        }
        rows.add(List.copyOf(cells));
    }

    /** {@return the lines of the table: two of headings, a rule, and one for each row} */
    List<String> lines() {
        final List<String> headings = columns.stream().map(Column::heading).toList();
        final List<String> units = columns.stream().map(Column::unit).toList();
        final int[] widths = new int[columns.size()];
        widen(widths, headings);
        widen(widths, units);
        rows.forEach(row -> widen(widths, row));
        final List<String> lines = new ArrayList<>();
        lines.add(line(headings, widths));
        lines.add(line(units, widths));
        final List<String> rule = new ArrayList<>();
        for (int width : widths) {
            rule.add("-".repeat(width));
        }
        lines.add(line(rule, widths));
        rows.forEach(row -> lines.add(line(row, widths)));
        return lines;
    }

    private static void widen(int[] widths, List<String> cells) {
        for (int i = 0; i < widths.length; i++) {
            widths[i] = Math.max(widths[i], length(cells.get(i)));
        }
    }

    /** {@return how many characters a reader sees; a character outside the basic plane counts once} */
    private static int length(String text) {
        return text.codePointCount(0, text.length());
    }

    private String line(List<String> cells, int[] widths) {
        final StringBuilder line = new StringBuilder();
        for (int i = 0; i < widths.length; i++) {
            final String padding = " ".repeat(widths[i] - length(cells.get(i)));
            final boolean left = columns.get(i).alignment() == Alignment.LEFT;
            line.append(i == 0 ? "" : "  ").append(left ? cells.get(i) + padding : padding + cells.get(i));
        }
        return line.toString().stripTrailing();
    }
}
