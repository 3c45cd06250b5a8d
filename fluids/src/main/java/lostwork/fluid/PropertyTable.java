package lostwork.fluid;

import java.util.ArrayList;
import java.util.List;
import lostwork.quantity.ScalarQuantity;

/** Prints quantities under a title, one a line: symbol, numbers aligned on the decimal point, unit. */
final class PropertyTable {
    private final String title;
    private final List<String> headings = new ArrayList<>();
    private final List<Row> rows = new ArrayList<>();

    private PropertyTable(String title) {
        this.title = title;
    }

    static PropertyTable titled(String title) {
        return new PropertyTable(title);
    }

    PropertyTable columns(String... names) {
        headings.addAll(List.of(names));
        return this;
    }

    /** Adds a line of quantities of one kind. */
    @SafeVarargs
    final <Q extends ScalarQuantity<Q, ?>> PropertyTable row(String symbol, Q... values) {
        final List<String> numbers = new ArrayList<>();
        String unit = "";
        for (final Q value : values) {
            final String text = value.toString();
            final int blank = text.indexOf(' ');
            numbers.add(blank < 0 ? text : text.substring(0, blank));
            unit = blank < 0 ? "" : text.substring(blank + 1);
        }
        rows.add(new Row(symbol, numbers, unit));
        return this;
    }

    /** Adds a line of words in the place of a number. */
    PropertyTable note(String symbol, String words) {
        rows.add(new Row(symbol, List.of(), words));
        return this;
    }

    String print() {
        int columns = 0;
        int symbolWidth = 0;
        for (final Row row : rows) {
            columns = Math.max(columns, row.numbers.size());
            symbolWidth = Math.max(symbolWidth, row.symbol.length());
        }
        final StringBuilder[] lines = new StringBuilder[rows.size()];
        for (int i = 0; i < lines.length; i++) {
            final String symbol = rows.get(i).symbol;
            lines[i] = new StringBuilder("  ").append(symbol).append(" ".repeat(symbolWidth - symbol.length()));
        }
        final StringBuilder heading = new StringBuilder(" ".repeat(2 + symbolWidth));
        for (int column = 0; column < columns; column++) {
            appendColumn(column, lines, heading);
        }
        final StringBuilder text = new StringBuilder(title);
        if (!headings.isEmpty()) {
            text.append('\n').append(heading);
        }
        for (int i = 0; i < lines.length; i++) {
            text.append('\n').append(lines[i]).append(' ').append(rows.get(i).unit);
            trimEnd(text);
        }
        return text.toString();
    }

    private static void trimEnd(StringBuilder text) {
        int end = text.length();
        while (text.charAt(end - 1) == ' ') {
            end--;
        }
        text.setLength(end);
    }

    private void appendColumn(int column, StringBuilder[] lines, StringBuilder heading) {
        int whole = 0;
        int fraction = 0;
        for (final Row row : rows) {
            if (column < row.numbers.size()) {
                final String number = row.numbers.get(column);
                whole = Math.max(whole, point(number));
                fraction = Math.max(fraction, number.length() - point(number));
            }
        }
        if (column < headings.size()) {
            whole = Math.max(whole, headings.get(column).length() - fraction);
            final String name = headings.get(column);
            heading.append(" ".repeat(2 + whole + fraction - name.length())).append(name);
        }
        for (int i = 0; i < lines.length; i++) {
            final Row row = rows.get(i);
            if (column < row.numbers.size()) {
                final String number = row.numbers.get(column);
                lines[i].append(" ".repeat(2 + whole - point(number)))
                        .append(number)
                        .append(" ".repeat(fraction - (number.length() - point(number))));
            } else {
                // words start where the numbers of the other lines do
                lines[i].append(' ');
            }
        }
    }

    /** {@return where the whole part of a number ends} */
    private static int point(String number) {
        final int point = number.indexOf('.');
        final int exponent = number.indexOf('E');
        return point >= 0 ? point : exponent >= 0 ? exponent : number.length();
    }

    private record Row(String symbol, List<String> numbers, String unit) {}
}
