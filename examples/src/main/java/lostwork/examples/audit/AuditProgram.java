package lostwork.examples.audit;

import java.io.IOException;
import java.io.InputStream;
import java.io.PrintStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.LongSupplier;
import lostwork.examples.audit.OutputFolder.Content;
import lostwork.examples.recovery.RecoveryDesign;
import lostwork.fluid.FlashException;
import lostwork.ledger.Ledger;
import lostwork.solve.SolveException;

/** The audit from the arguments to the files, without the process around it. */
final class AuditProgram {
    static final int ALL_GOOD = 0;
    static final int SOME_LINES_REFUSED = 1;
    static final int NOTHING_DONE = 2;

    private static final String BUNDLED_SURVEY = "glassworks-survey.csv";
    private static final String BUNDLED_SITE = "glassworks-site.txt";

    private static final List<String> RECOVERY_FILES = List.of(
            "plant.json", "plant-states.csv", "plant-machines.csv", "plant-pressures.csv", "ledger.csv", "ledger.json");

    private final PrintStream out;
    private final PrintStream err;
    private final LongSupplier clock;

    /**
     * Creates the program.
     *
     * @param out where the report goes
     * @param err where problems and progress go
     * @param clock time in nanoseconds, for the progress
     */
    AuditProgram(PrintStream out, PrintStream err, LongSupplier clock) {
        this.out = out;
        this.err = err;
        this.clock = clock;
    }

    /**
     * Runs the audit.
     *
     * @param arguments the words of the command line
     * @return the exit code that {@code --help} explains
     */
    int run(String... arguments) {
        try {
            return run(AuditArguments.of(arguments));
        } catch (RefusedInputException e) {
            err.println(e.getMessage());
            err.println("Nothing was computed. --help tells how to call the program and how to write its files.");
            return NOTHING_DONE;
        }
    }

    private int run(AuditArguments arguments) {
        if (arguments.help()) {
            out.print(Help.text());
            return ALL_GOOD;
        }
        final SourceText siteText = arguments.site().map(SourceText::read).orElseGet(() -> bundled(BUNDLED_SITE));
        final Site site = SiteReader.read(siteText);
        final SourceText surveyText = arguments.survey().map(SourceText::read).orElseGet(() -> bundled(BUNDLED_SURVEY));
        final Survey survey = SurveyReader.read(surveyText, site.ambientPressure());
        final OutputFolder folder = OutputFolder.prepare(arguments.output());

        final AuditResult result = compute(site, survey);
        result.problems().forEach(problem -> err.println(problem));
        if (result.ranked().isEmpty()) {
            throw new RefusedInputException(survey.file() + ": every line is refused.");
        }
        final Progress progress = new Progress(err, clock);
        final RecoveryOutcome recovery = new RecoveryStudy(result, RecoveryDesign.smallWasteHeatPlant())
                .run(tried -> progress.report("recovery plant: pressure " + tried + " tried"));
        final String report = AuditReport.of(result, recovery);
        final Map<String, Content> files = new LinkedHashMap<>();
        files.put("report.txt", Content.of(report));
        files.put("streams.csv", Content.of(StreamCsv.of(result)));
        files.put("streams.json", Content.of(StreamJson.of(result)));
        recovery.proposal().ifPresent(proposal -> files.putAll(recoveryFiles(result, proposal)));
        if (arguments.survey().isEmpty()) {
            files.put("example-survey.csv", Content.of(bundledText(BUNDLED_SURVEY)));
        }
        if (arguments.site().isEmpty()) {
            files.put("example-site.txt", Content.of(bundledText(BUNDLED_SITE)));
        }
        folder.remove(RECOVERY_FILES);
        folder.write(files);
        out.print(report);
        out.println();
        out.println("Written to " + folder.path() + ":");
        out.println("  " + Paragraph.wrap(String.join(", ", files.keySet())));
        return result.problems().isEmpty() ? ALL_GOOD : SOME_LINES_REFUSED;
    }

    private static Map<String, Content> recoveryFiles(AuditResult result, RecoveryProposal proposal) {
        final RecoveryTables tables = new RecoveryTables(proposal);
        final Ledger ledger = proposal.recovery().ledger();
        final Map<String, Content> files = new LinkedHashMap<>();
        files.put("plant.json", Content.of(RecoveryJson.of(result, proposal)));
        files.put("plant-states.csv", Content.of(tables.states().toCsv()));
        files.put("plant-machines.csv", Content.of(tables.machines().toCsv()));
        files.put("plant-pressures.csv", Content.of(tables.pressures().toCsv()));
        files.put("ledger.csv", ledger::writeCsv);
        files.put("ledger.json", ledger::writeJson);
        return files;
    }

    private AuditResult compute(Site site, Survey survey) {
        final StreamAnalysis analysis = new StreamAnalysis(site);
        final Progress progress = new Progress(err, clock);
        final List<StreamFigures> figures = new ArrayList<>();
        final List<Problem> problems = new ArrayList<>(survey.problems());
        int done = 0;
        for (SurveyLine stream : survey.lines()) {
            try {
                figures.add(analysis.of(stream));
            } catch (CellRefusedException e) {
                problems.add(new Problem(survey.file(), stream.line(), 0, e.what(), e.accepted()));
            } catch (IllegalArgumentException | FlashException | SolveException e) {
                problems.add(new Problem(
                        survey.file(),
                        stream.line(),
                        0,
                        "the property model cannot give a state of this stream: " + e.getMessage(),
                        "temperatures, a pressure and a composition within the range of the model"));
            }
            done++;
            progress.report(done + " of " + survey.lines().size() + " streams done");
        }
        problems.sort(Comparator.comparingInt(Problem::line).thenComparingInt(Problem::column));
        return new AuditResult(site, survey, figures, problems);
    }

    private static SourceText bundled(String name) {
        return SourceText.of(name, bundledText(name).getBytes(StandardCharsets.UTF_8));
    }

    private static String bundledText(String name) {
        try (InputStream in = AuditProgram.class.getResourceAsStream(name)) {
            if (in == null) {
                throw new IllegalStateException("the bundled file " + name + " is missing from the program");
            }
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
