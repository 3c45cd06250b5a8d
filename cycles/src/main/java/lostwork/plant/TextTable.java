package lostwork.plant;

import java.util.List;

/** Aligns the cells of a table: the first columns to the left, the others to the right. */
final class TextTable {
    private TextTable() {}

    static void append(List<String[]> rows, int leftAligned, StringBuilder text) {
        final int columns = rows.get(0).length;
        final int[] width = new int[columns];
        for (String[] row : rows) {
            for (int c = 0; c < columns; c++) {
                width[c] = Math.max(width[c], row[c].length());
            }
        }
        for (String[] row : rows) {
            final StringBuilder line = new StringBuilder();
            for (int c = 0; c < columns; c++) {
                final String pad = " ".repeat(width[c] - row[c].length());
                line.append(c == 0 ? "  " : "   ").append(c < leftAligned ? row[c] + pad : pad + row[c]);
            }
            text.append(line.toString().stripTrailing()).append('\n');
        }
    }
}
