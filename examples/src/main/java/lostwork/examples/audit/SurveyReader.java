package lostwork.examples.audit;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import lostwork.quantity.Duration;
import lostwork.quantity.Pressure;
import lostwork.quantity.Ratio;
import lostwork.quantity.Temperature;
import lostwork.quantity.TemperatureSpan;

/** Reads a survey: each line either becomes a stream or yields the problems that keep it from being one. */
final class SurveyReader {
    private final SourceText source;
    private final Pressure atmosphere;
    private final List<Problem> problems = new ArrayList<>();
    private final Map<String, Integer> lineOfTag = new HashMap<>();

    private SurveyReader(SourceText source, Pressure atmosphere) {
        this.source = source;
        this.atmosphere = atmosphere;
    }

    /**
     * {@return the survey that a file holds}
     *
     * @param source the text of the file
     * @param atmosphere what gauge pressures are counted from
     * @throws RefusedInputException if the file has no heading line that can be used, or no streams
     */
    static Survey read(SourceText source, Pressure atmosphere) {
        return new SurveyReader(source, atmosphere).read();
    }

    private Survey read() {
        problems.addAll(source.problems());
        final List<SourceText.Line> lines = source.lines().stream()
                .filter(line -> !line.text().isBlank() && !line.text().startsWith("#"))
                .toList();
        if (lines.isEmpty()) {
            throw new RefusedInputException(
                    problems.isEmpty()
                            ? Problem.ofFile(
                                    source.name(), "the file is empty", "a heading line and one line for each stream")
                            : problems.get(0));
        }
        final SurveyHeading heading = SurveyHeading.read(source.name(), lines.get(0));
        final List<CsvRow> rows = cut(lines.subList(1, lines.size()), heading);
        final NumberStyle style = heading.separator() == ';' ? shownStyle(rows, heading) : NumberStyle.decimalPoint();
        final List<SurveyLine> streams = new ArrayList<>();
        for (CsvRow row : rows) {
            stream(row, heading, style).ifPresent(streams::add);
        }
        if (streams.isEmpty() && problems.isEmpty()) {
            throw new RefusedInputException(Problem.ofFile(
                    source.name(), "there is a heading line but no stream", "one line for each stream below it"));
        }
        problems.sort(Comparator.comparingInt(Problem::line).thenComparingInt(Problem::column));
        return new Survey(source.name(), streams, problems, remarks(heading, style));
    }

    private List<String> remarks(SurveyHeading heading, NumberStyle style) {
        return heading.separator() == ';'
                ? List.of(source.name() + " is read with semicolons between cells" + style.inWords() + ".")
                : List.of();
    }

    private List<CsvRow> cut(List<SourceText.Line> lines, SurveyHeading heading) {
        final List<CsvRow> rows = new ArrayList<>();
        for (SourceText.Line line : lines) {
            try {
                final CsvRow row = CsvRow.cut(line, heading.separator());
                if (row.cells().size() == heading.width()) {
                    rows.add(row);
                } else {
                    problems.add(wrongWidth(row, heading));
                }
            } catch (CsvRow.MalformedRowException e) {
                problems.add(new Problem(
                        source.name(),
                        line.number(),
                        e.column(),
                        e.getMessage(),
                        "a cell in quotes from end to end, with quotes inside doubled"));
            }
        }
        return rows;
    }

    private Problem wrongWidth(CsvRow row, SurveyHeading heading) {
        final int count = row.cells().size();
        final boolean tooMany = count > heading.width();
        final int column = tooMany ? row.cells().get(heading.width()).column() : row.endColumn();
        final String cause =
                tooMany && heading.separator() == ',' ? " (a decimal comma, or a comma in a cell without quotes?)" : "";
        return new Problem(
                source.name(),
                row.line(),
                column,
                "the line has " + count + " cells, but the heading has " + heading.width() + " columns" + cause,
                heading.width() + " cells separated by \"" + heading.separator() + "\""
                        + (heading.separator() == ',' ? ", decimal points, and quotes around a cell with commas" : ""));
    }

    private static NumberStyle shownStyle(List<CsvRow> rows, SurveyHeading heading) {
        final List<String> texts = new ArrayList<>();
        for (CsvRow row : rows) {
            for (SurveyColumn column : SurveyColumn.values()) {
                if (column.mayHoldNumbers() && heading.has(column)) {
                    texts.add(heading.cell(row, column).text());
                }
            }
        }
        return NumberStyle.shownBy(texts);
    }

    private Optional<SurveyLine> stream(CsvRow row, SurveyHeading heading, NumberStyle style) {
        final int before = problems.size();
        final RowReader in = new RowReader(row, heading, style);
        final Optional<String> tag = in.text(SurveyColumn.TAG, text -> tag(text, row.line()));
        final Optional<MediumName> name = in.text(SurveyColumn.MEDIUM, MediumName.vocabulary()::meaningOf);
        final Optional<Medium> medium = name.flatMap(
                known -> in.text(SurveyColumn.COMPOSITION, text -> new CompositionReader(style).read(known, text)));
        final Optional<SurveyFlow> flow = in.measured(SurveyColumn.FLOW, cell -> flowOf(medium, cell));
        final Optional<Temperature> supply = in.measured(SurveyColumn.SUPPLY, MeasuredCell::temperature);
        final Optional<Temperature> lowest = in.measured(SurveyColumn.LOWEST, cell -> lowest(cell, supply));
        final Optional<Pressure> pressure = in.measured(SurveyColumn.PRESSURE, cell -> cell.pressure(atmosphere));
        final Optional<Duration> hours = in.measured(SurveyColumn.HOURS, MeasuredCell::hoursPerYear);
        final Optional<Ratio> ofFlow = in.measured(SurveyColumn.FLOW_UNCERTAINTY, MeasuredCell::relativeUncertainty);
        final Optional<TemperatureSpan> ofTemperature =
                in.measured(SurveyColumn.TEMPERATURE_UNCERTAINTY, MeasuredCell::uncertaintySpan);
        if (problems.size() > before) {
            return Optional.empty();
        }
        return Optional.of(new SurveyLine(
                row.line(),
                tag.orElseThrow(),
                medium.orElseThrow(),
                flow.orElseThrow(),
                supply.orElseThrow(),
                lowest.orElseThrow(),
                pressure.orElseThrow(),
                hours.orElseThrow(),
                ofFlow.orElseThrow(),
                ofTemperature.orElseThrow()));
    }

    private String tag(String text, int line) {
        if (text.isEmpty()) {
            throw new CellRefusedException("the tag is empty", "a name of the stream, used once");
        }
        final Integer first = lineOfTag.putIfAbsent(Vocabulary.plain(text), line);
        if (first != null) {
            throw new CellRefusedException(
                    "the tag \"" + text + "\" is already used in line " + first, "a tag that no other line has");
        }
        return text;
    }

    private static SurveyFlow flowOf(Optional<Medium> medium, MeasuredCell cell) {
        final SurveyFlow flow = cell.flow();
        medium.ifPresent(known -> requireFit(flow, known, cell));
        return flow;
    }

    private static void requireFit(SurveyFlow flow, Medium medium, MeasuredCell cell) {
        if (!(flow instanceof SurveyFlow.ByNormalVolume normal)) {
            return;
        }
        if (medium instanceof Medium.LiquidWater) {
            throw new CellRefusedException(
                    "a normal volume flow is counted for gases, not for liquid water: " + cell,
                    "a mass flow such as 12 t/h, or a volume flow such as 12 m³/h");
        }
        if (medium.mayHoldVapour() && normal.basis().isEmpty()) {
            throw new CellRefusedException(
                    "it is not stated whether the normal volume flow " + cell + " counts the gas wet or dry",
                    "\"" + cell + " wet\" or \"" + cell + " dry\"");
        }
    }

    private static Temperature lowest(MeasuredCell cell, Optional<Temperature> supply) {
        final Temperature lowest = cell.temperature();
        if (supply.isPresent() && lowest.compareTo(supply.get()) > 0) {
            throw new CellRefusedException(
                    "the lowest temperature " + cell + " is above the supply temperature " + supply.get(),
                    "a temperature from absolute zero up to the supply temperature");
        }
        return lowest;
    }

    /** Reads the cells of one row and files a problem for each one that is refused. */
    private final class RowReader {
        private final CsvRow row;
        private final SurveyHeading heading;
        private final NumberStyle style;

        RowReader(CsvRow row, SurveyHeading heading, NumberStyle style) {
            this.row = row;
            this.heading = heading;
            this.style = style;
        }

        <T> Optional<T> text(SurveyColumn column, Function<String, T> reading) {
            final CsvRow.Cell cell = heading.cell(row, column);
            try {
                return Optional.of(reading.apply(cell.text()));
            } catch (CellRefusedException e) {
                problems.add(new Problem(
                        source.name(), row.line(), cell.column(), column.heading() + ": " + e.what(), e.accepted()));
                return Optional.empty();
            }
        }

        <T> Optional<T> measured(SurveyColumn column, Function<MeasuredCell, T> reading) {
            return text(column, text -> reading.apply(MeasuredCell.of(text, heading.unit(column), style)));
        }
    }
}
