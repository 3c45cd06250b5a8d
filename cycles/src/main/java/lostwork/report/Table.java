package lostwork.report;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;

/**
 * A table of words and numbers with named columns and units. Prints aligned, words to the left and numbers to the right;
 * gives the same content as CSV and JSON with all digits. Immutable.
 */
public final class Table {
    private static final int WORDS = -1;

    private final List<Column> columns;
    private final List<List<Cell>> rows;

    /** One column: its heading, unit, and decimals in print. */
    private record Column(String heading, String unit, int decimals) {
        boolean isWords() {
            return decimals == WORDS;
        }

        String name() {
            return unit.isEmpty() ? heading : heading + " in " + unit;
        }
    }

    /** One cell: words, a number, or nothing. */
    public static final class Cell {
        private static final Cell NONE = new Cell("", Double.NaN);

        private final String words;
        private final double number;

        private Cell(String words, double number) {
            this.words = words;
            this.number = number;
        }

        /**
         * {@return a cell with words}
         *
         * @param words the words
         */
        public static Cell of(String words) {
            return new Cell(words, Double.NaN);
        }

        /**
         * {@return a cell with a number}
         *
         * @param number the number, in the unit of its column; NaN for an empty cell
         */
        public static Cell of(double number) {
            return Double.isNaN(number) ? NONE : new Cell("", number);
        }

        /** {@return an empty cell} */
        public static Cell none() {
            return NONE;
        }

        private boolean isNumber() {
            return !Double.isNaN(number);
        }

        private String print(Column column) {
            return isNumber() ? fixed(number, column.decimals()) : words;
        }
    }

    /** Fills a table. Not thread-safe. */
    public static final class Builder {
        private final List<Column> columns = new ArrayList<>();
        private final List<List<Cell>> rows = new ArrayList<>();

        private Builder() {}

        /**
         * Adds a column of words.
         *
         * @param heading its heading
         * @return this builder
         */
        public Builder words(String heading) {
            columns.add(new Column(heading, "", WORDS));
            return this;
        }

        /**
         * Adds a column of numbers.
         *
         * @param heading its heading
         * @param unit the unit of its numbers; empty for plain numbers
         * @param decimals how many digits behind the point are printed, 0 to 12
         * @return this builder
         */
        public Builder numbers(String heading, String unit, int decimals) {
            if (decimals < 0 || decimals > 12) {
                throw new IllegalArgumentException("decimals = " + decimals + " is outside 0 .. 12");
            }
            columns.add(new Column(heading, unit, decimals));
            return this;
        }

        /**
         * Adds a row.
         *
         * @param cells one cell a column
         * @return this builder
         * @throws IllegalArgumentException if the number of cells is not that of the columns
         */
        public Builder row(Cell... cells) {
            if (cells.length != columns.size()) {
                throw new IllegalArgumentException(cells.length + " cells for " + columns.size() + " columns");
            }
            rows.add(List.of(cells));
            return this;
        }

        /** {@return the table} */
        public Table build() {
            return new Table(List.copyOf(columns), List.copyOf(rows));
        }
    }

    private Table(List<Column> columns, List<List<Cell>> rows) {
        this.columns = columns;
        this.rows = rows;
    }

    /** {@return a builder without columns and rows} */
    public static Builder builder() {
        return new Builder();
    }

    /** {@return how many rows the table has} */
    public int size() {
        return rows.size();
    }

    /** {@return the table as CSV: a line of headings with units, then a line a row} */
    public String toCsv() {
        final StringBuilder text = new StringBuilder();
        text.append(columns.stream().map(c -> quoted(c.name())).collect(Collectors.joining(",")))
                .append('\n');
        for (List<Cell> row : rows) {
            text.append(row.stream()
                            .map(cell -> cell.isNumber() ? Double.toString(cell.number) : quoted(cell.words))
                            .collect(Collectors.joining(",")))
                    .append('\n');
        }
        return text.toString();
    }

    private static String quoted(String words) {
        return words.matches("(?s).*[\",\n\r].*") ? "\"" + words.replace("\"", "\"\"") + "\"" : words;
    }

    /**
     * Writes the table as a JSON array of objects, one a row; empty cells are left out.
     *
     * @param json takes the array
     * @param name the name of the array in the object that is open
     */
    public void writeJson(JsonText json, String name) {
        json.openArray(name);
        for (List<Cell> row : rows) {
            json.openElement();
            for (int c = 0; c < columns.size(); c++) {
                final Cell cell = row.get(c);
                if (cell.isNumber()) {
                    json.put(columns.get(c).name(), cell.number);
                } else if (!cell.words.isEmpty()) {
                    json.put(columns.get(c).name(), cell.words);
                }
            }
            json.closeObject();
        }
        json.closeArray();
    }

    /** {@return the table with aligned columns: headings, units where there are any, a rule, and a line a row} */
    @Override
    public String toString() {
        final int[] widths = new int[columns.size()];
        for (int c = 0; c < widths.length; c++) {
            final Column column = columns.get(c);
            widths[c] = Math.max(length(column.heading()), length(column.unit()));
            for (List<Cell> row : rows) {
                widths[c] = Math.max(widths[c], length(row.get(c).print(column)));
            }
        }
        final StringBuilder text = new StringBuilder();
        line(columns.stream().map(Column::heading).toList(), widths, text);
        if (columns.stream().anyMatch(c -> !c.unit().isEmpty())) {
            line(columns.stream().map(Column::unit).toList(), widths, text);
        }
        final List<String> rule = new ArrayList<>();
        for (int width : widths) {
            rule.add("-".repeat(width));
        }
        line(rule, widths, text);
        for (List<Cell> row : rows) {
            final List<String> cells = new ArrayList<>();
            for (int c = 0; c < widths.length; c++) {
                cells.add(row.get(c).print(columns.get(c)));
            }
            line(cells, widths, text);
        }
        return text.toString();
    }

    private void line(List<String> cells, int[] widths, StringBuilder text) {
        final StringBuilder line = new StringBuilder();
        for (int c = 0; c < widths.length; c++) {
            final String padding = " ".repeat(widths[c] - length(cells.get(c)));
            line.append(c == 0 ? "" : "  ")
                    .append(columns.get(c).isWords() ? cells.get(c) + padding : padding + cells.get(c));
        }
        text.append(line.toString().stripTrailing()).append('\n');
    }

    /** How many characters a reader sees. */
    private static int length(String text) {
        return text.codePointCount(0, text.length());
    }

    private static String fixed(double value, int decimals) {
        final BigDecimal rounded = new BigDecimal(value).setScale(Math.max(decimals, 0), RoundingMode.HALF_EVEN);
        return rounded.signum() == 0
                ? BigDecimal.ZERO.setScale(Math.max(decimals, 0)).toPlainString()
                : rounded.toPlainString();
    }
}
