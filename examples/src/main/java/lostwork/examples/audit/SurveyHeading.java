package lostwork.examples.audit;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** The first line of a survey: what separates cells, which column stands where, and the units that headings state. */
final class SurveyHeading {
    private static final Pattern WITH_UNIT = Pattern.compile("([^\\[\\]]*?)\\s*(?:\\[([^\\[\\]]*)\\])?");

    private final char separator;
    private final Map<SurveyColumn, Integer> positions = new EnumMap<>(SurveyColumn.class);
    private final Map<SurveyColumn, String> units = new EnumMap<>(SurveyColumn.class);
    private final int width;

    private SurveyHeading(char separator, int width) {
        this.separator = separator;
        this.width = width;
    }

    /**
     * {@return the heading that a line holds}
     *
     * @param file name of the file, for messages
     * @param line the line
     * @throws RefusedInputException if a column is missing, doubled or unknown; the message names all of them
     */
    static SurveyHeading read(String file, SourceText.Line line) {
        final char separator = separator(file, line);
        final CsvRow row;
        try {
            row = CsvRow.cut(line, separator);
        } catch (CsvRow.MalformedRowException e) {
            throw new RefusedInputException(new Problem(
                    file,
                    line.number(),
                    e.column(),
                    e.getMessage(),
                    "headings such as " + SurveyColumn.FLOW.heading()));
        }
        final SurveyHeading heading = new SurveyHeading(separator, row.cells().size());
        final List<Problem> problems = new ArrayList<>();
        for (int i = 0; i < row.cells().size(); i++) {
            final CsvRow.Cell cell = row.cells().get(i);
            try {
                heading.add(cell.text(), i);
            } catch (CellRefusedException e) {
                problems.add(new Problem(file, line.number(), cell.column(), e.what(), e.accepted()));
            }
        }
        heading.missing()
                .ifPresent(what -> problems.add(new Problem(
                        file,
                        line.number(),
                        row.endColumn(),
                        what,
                        "a heading line with the columns "
                                + String.join(", ", SurveyColumn.vocabulary().words()) + " in any order; only "
                                + SurveyColumn.REMARK.heading() + " may be missing")));
        if (!problems.isEmpty()) {
            final List<String> texts = new ArrayList<>();
            problems.forEach(p -> texts.add(p.toString()));
            throw new RefusedInputException(String.join(System.lineSeparator(), texts));
        }
        return heading;
    }

    private Optional<String> missing() {
        final List<String> missing = new ArrayList<>();
        for (SurveyColumn column : SurveyColumn.values()) {
            if (column.isRequired() && !positions.containsKey(column)) {
                missing.add("\"" + column.heading() + "\"");
            }
        }
        return switch (missing.size()) {
            case 0 -> Optional.empty();
            case 1 -> Optional.of("the column " + missing.get(0) + " is missing");
            default -> Optional.of("the columns " + String.join(", ", missing) + " are missing");
        };
    }

    private static char separator(String file, SourceText.Line line) {
        final int comma = line.text().indexOf(',');
        final int semicolon = line.text().indexOf(';');
        if (comma >= 0 && semicolon >= 0) {
            throw new RefusedInputException(new Problem(
                    file,
                    line.number(),
                    Math.max(comma, semicolon) + 1,
                    "the heading line holds commas and semicolons: which of them separates cells cannot be told",
                    "a heading line with one of them only"));
        }
        if (comma < 0 && semicolon < 0) {
            throw new RefusedInputException(new Problem(
                    file,
                    line.number(),
                    1,
                    "the heading line \"" + line.text().strip() + "\" has no commas and no semicolons",
                    "the headings " + String.join(",", SurveyColumn.vocabulary().words())));
        }
        return comma >= 0 ? ',' : ';';
    }

    private void add(String text, int position) {
        final Matcher heading = WITH_UNIT.matcher(text);
        if (!heading.matches()) {
            throw new CellRefusedException(
                    "the heading \"" + text + "\" cannot be read",
                    "a column name, then its unit in one pair of brackets");
        }
        final SurveyColumn column = SurveyColumn.vocabulary().meaningOf(heading.group(1));
        if (positions.putIfAbsent(column, position) != null) {
            throw new CellRefusedException(
                    "the column \"" + column.heading() + "\" is there twice", "each column once");
        }
        if (heading.group(2) != null) {
            if (!column.isMeasured()) {
                throw new CellRefusedException(
                        "the column \"" + column.heading() + "\" takes no unit", "\"" + column.heading() + "\"");
            }
            units.put(column, heading.group(2).strip());
        }
    }

    char separator() {
        return separator;
    }

    /** {@return how many cells each line must have} */
    int width() {
        return width;
    }

    boolean has(SurveyColumn column) {
        return positions.containsKey(column);
    }

    CsvRow.Cell cell(CsvRow row, SurveyColumn column) {
        return row.cells().get(positions.get(column));
    }

    /** {@return the unit that a heading states; empty when it states none} */
    String unit(SurveyColumn column) {
        return units.getOrDefault(column, "");
    }
}
