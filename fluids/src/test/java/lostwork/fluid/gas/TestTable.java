package lostwork.fluid.gas;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;

/** A tab-separated table of check values among the test resources: comment lines, a line of headings, rows. */
final class TestTable {
    private final List<String> headings;
    private final List<String[]> rows;

    private TestTable(List<String> headings, List<String[]> rows) {
        this.headings = headings;
        this.rows = rows;
    }

    static TestTable read(String name) {
        try (BufferedReader reader = new BufferedReader(
                new InputStreamReader(TestTable.class.getResourceAsStream(name), StandardCharsets.UTF_8))) {
            final List<String[]> lines = reader.lines()
                    .filter(line -> !line.isBlank() && line.charAt(0) != '#')
                    .map(line -> line.split("\t"))
                    .toList();
            return new TestTable(List.of(lines.get(0)), lines.subList(1, lines.size()));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    int size() {
        return rows.size();
    }

    String text(int row, String heading) {
        return rows.get(row)[headings.indexOf(heading)];
    }

    double number(int row, String heading) {
        return Double.parseDouble(text(row, heading));
    }
}
