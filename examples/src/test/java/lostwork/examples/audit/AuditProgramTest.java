package lostwork.examples.audit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class AuditProgramTest {
    @TempDir
    Path folder;

    private final ByteArrayOutputStream out = new ByteArrayOutputStream();
    private final ByteArrayOutputStream err = new ByteArrayOutputStream();

    private int run(String... arguments) {
        out.reset();
        err.reset();
        final int code = new AuditProgram(
                        new PrintStream(out, true, StandardCharsets.UTF_8),
                        new PrintStream(err, true, StandardCharsets.UTF_8),
                        () -> 0L)
                .run(arguments);
        assertFalse(errors().contains("\tat "), errors());
        return code;
    }

    private String output() {
        return out.toString(StandardCharsets.UTF_8);
    }

    private String errors() {
        return err.toString(StandardCharsets.UTF_8);
    }

    private Path survey(String... lines) throws IOException {
        return Files.write(folder.resolve("survey.csv"), List.of(lines));
    }

    private Path results() {
        return folder.resolve("results");
    }

    @Test
    void runsOnItsOwnExampleAndNamesTheFolderLast() throws IOException {
        assertEquals(0, run("--out", results().toString()), errors());
        assertEquals("", errors());
        final List<String> lines = output().lines().toList();
        final int last = lines.indexOf("Written to " + results() + ":");
        assertEquals(
                "report.txt, streams.csv, streams.json, plant.json, plant-states.csv, plant-machines.csv,"
                        + " plant-pressures.csv, ledger.csv, ledger.json, example-survey.csv, example-site.txt",
                String.join(" ", lines.subList(last + 1, lines.size())).strip().replaceAll("\\s+", " "));
        for (String name : "report.txt streams.csv streams.json plant.json plant-states.csv ledger.csv".split(" ")) {
            assertTrue(Files.size(results().resolve(name)) > 0, name);
        }
        assertTrue(output().startsWith(Files.readString(results().resolve("report.txt"))));
        assertTrue(lines.stream().allMatch(line -> line.length() <= 120 || line.startsWith("Written to")));
        assertTrue(output().contains("F. L. Curzon and B. Ahlborn"));
        assertTrue(output().contains("licensed practice"));
    }

    @Test
    void theExampleFilesThatItWritesGiveTheSameFigures() throws IOException {
        assertEquals(0, run("--out", results().toString()));
        final Path second = folder.resolve("second");
        assertEquals(
                0,
                run(
                        "--survey",
                        results().resolve("example-survey.csv").toString(),
                        "--site",
                        results().resolve("example-site.txt").toString(),
                        "--out",
                        second.toString()));
        assertEquals(
                Files.readString(results().resolve("streams.csv")), Files.readString(second.resolve("streams.csv")));
    }

    @Test
    void theLocalePlaysNoPart() {
        final Locale before = Locale.getDefault();
        try {
            assertEquals(0, run("--out", results().toString()));
            final String expected = output();
            for (String language : List.of("de-DE", "ar-EG-u-nu-arab", "tr-TR")) {
                Locale.setDefault(Locale.forLanguageTag(language));
                assertEquals(0, run("--out", results().toString()));
                assertEquals(expected, output());
            }
        } finally {
            Locale.setDefault(before);
        }
    }

    @Test
    void reportsGoodLinesBesideBadOnesAndExitsWithOne() throws IOException {
        final Path survey = survey(
                SurveyText.HEADING,
                SurveyText.GOOD,
                "A2,dry air,,-3 t/h,220 °C,60 °C,1013 mbar,8000,5 %,2 K",
                "A3,water,,3 t/h,120 °C,60 °C,1013 mbar,8000,5 %,2 K",
                "A4,water,,3 t/h,5000 °C,60 °C,1013 mbar,8000,5 %,2 K");
        assertEquals(1, run("--survey", survey.toString(), "--out", results().toString()));
        final List<String> problems = errors().lines().toList();
        assertEquals(3, problems.size(), errors());
        assertEquals(
                survey + ", line 3, column 13: flow: the flow is negative: -3 t/h. Accepted: a flow above 0.",
                problems.get(0));
        assertEquals(
                survey + ", line 4: water at 120 °C and 1.013 bar is not liquid: it boils at 100.0 °C. Accepted: liquid"
                        + " water: a lower supply temperature or a higher pressure.",
                problems.get(1));
        assertTrue(
                problems.get(2)
                        .startsWith(survey + ", line 5: the property model cannot give a state of this stream: "),
                problems.get(2));
        assertTrue(output().contains("1 stream used, 3 lines refused, see the end of this report"), output());
        assertTrue(output().contains("A1"), output());
        assertTrue(Files.readString(results().resolve("streams.json")).contains("the flow is negative: -3 t/h"));
    }

    @Test
    void exitsWithTwoWhenEveryLineIsRefused() throws IOException {
        final Path survey = survey(SurveyText.HEADING, "A2,dry air,,-3 t/h,220 °C,60 °C,1013 mbar,8000,5 %,2 K");
        assertEquals(2, run("--survey", survey.toString(), "--out", results().toString()));
        assertEquals("", output());
        assertTrue(errors().contains("the flow is negative"), errors());
        assertTrue(errors().contains("Nothing was computed."), errors());
    }

    @Test
    void saysInWordsWhatIsWithStreamsAtAndBelowAmbient() throws IOException {
        final Path survey = survey(
                SurveyText.HEADING,
                "cold,water,,3 t/h,5 °C,2 °C,3 bar,8000,5 %,2 K",
                "ambient,water,,3 t/h,12 °C,5 °C,3 bar,8000,5 %,2 K",
                "through,water,,3 t/h,30 °C,5 °C,3 bar,8000,5 %,2 K",
                "fixed,water,,3 t/h,30 °C,30 °C,3 bar,8000,5 %,2 K",
                "moist,humid air,humidity ratio 95 g/kg,3 t/h,80 °C,30 °C,1 bar,8000,5 %,2 K");
        assertEquals(0, run("--survey", survey.toString(), "--out", results().toString()), errors());
        final String unwrapped = output().replace("\n  ", " ");
        assertTrue(
                unwrapped.contains("- cold: supply is colder than the ambient 12 °C: no heat to win; its exergy is that"
                        + " of cold and could spare refrigeration."),
                unwrapped);
        assertTrue(unwrapped.contains("- ambient: supply is at the ambient temperature: no heat to win."), unwrapped);
        assertTrue(
                unwrapped.contains(
                        "- through: counted down to the ambient 12 °C only, not to 5 °C: cooling below ambient"
                                + " takes work."),
                unwrapped);
        assertTrue(
                unwrapped.contains("- fixed: lowest allowed temperature equals the supply: no heat to win."),
                unwrapped);
        assertTrue(
                unwrapped.contains("- moist: water condenses below 51 °C; its heat of condensation is not counted."),
                unwrapped);
    }

    @Test
    void aSiteInFrostKeepsItsWaterStreams() throws IOException {
        assertEquals(0, run("--out", results().toString()));
        final Path site = Files.writeString(
                folder.resolve("site.txt"),
                Files.readString(results().resolve("example-site.txt")).replace("= 12 °C", "= -10 °C"));
        assertEquals(0, run("--site", site.toString(), "--out", results().toString()), errors());
        final String unwrapped = output().replace("\n  ", " ");
        assertTrue(
                unwrapped.contains("- G7 hot-water return: exergy not given: the model of water does not reach the"
                        + " ambient -10 °C."),
                unwrapped);
        // heat times (1 - T0/Tm), Tm the logarithmic mean of 88 °C and 60 °C; heat as at 12 °C
        assertEquals(1792.7 * (1 - 263.15 / 346.96), Double.parseDouble(row("G7 hot-water return")[12]), 1);
    }

    private String[] row(String tag) throws IOException {
        return Files.readAllLines(results().resolve("streams.csv")).stream()
                .map(line -> line.split(","))
                .filter(cells -> cells[1].equals(tag))
                .findFirst()
                .orElseThrow();
    }

    @Test
    void waterNearBoilingKeepsItsRange() throws IOException {
        final Path survey = survey(SurveyText.HEADING, "W,water,,10 t/h,99.5 °C,60 °C,1013 mbar,8000,0 %,2 K");
        assertEquals(0, run("--survey", survey.toString(), "--out", results().toString()), errors());
        // 2 K of liquid water, 4.22 kJ/(kg K) (table A-9 of Cengel and Boles, from memory), 2.778 kg/s
        assertEquals(2 * 4.22 * 10 / 3.6, cell("W", 9), 0.1);
    }

    @Test
    void namesAFileThatIsNotThere() {
        assertEquals(2, run("--survey", folder.resolve("nowhere.csv").toString()));
        assertTrue(
                errors().startsWith(folder.resolve("nowhere.csv") + ": there is no such file (looked in " + folder
                        + "). Accepted: the path of a text file."),
                errors());
        assertEquals(2, run("--site", folder.toString()));
        assertTrue(errors().startsWith(folder + ": this is a folder. Accepted: the path of a text file."), errors());
    }

    @Test
    void namesAnOutputFolderThatCannotBeWritten() throws IOException {
        final Path file = Files.writeString(folder.resolve("taken"), "x");
        assertEquals(2, run("--out", file.toString()));
        assertTrue(
                errors().startsWith(file + ": there is a file of that name. Accepted: a folder that you may write to;"
                        + " name another one with --out."),
                errors());
        final Path below = file.resolve("below");
        assertEquals(2, run("--out", below.toString()));
        assertTrue(errors().startsWith(below + ": the output folder cannot be written to."), errors());
        assertEquals("", output());
    }

    @Test
    void namesWrongArguments() {
        assertEquals(2, run("--surwey", "x.csv"));
        assertTrue(
                errors().startsWith("unknown argument \"--surwey\" (did you mean \"--survey\"?). Accepted: --survey,"
                        + " --site, --out, each followed by a path, and --help."),
                errors());
        assertEquals(2, run("--survey"));
        assertTrue(errors().startsWith("--survey must be followed by a path."), errors());
        assertEquals(2, run("--out", "a", "--out", "b"));
        assertTrue(errors().startsWith("--out is given twice."), errors());
    }

    @Test
    void helpNamesEveryWordThatIsAccepted() {
        assertEquals(0, run("--help"));
        for (SurveyColumn column : SurveyColumn.values()) {
            assertTrue(output().contains(column.heading()), column.heading());
        }
        for (SiteKey key : SiteKey.values()) {
            assertTrue(output().contains(key.key()), key.key());
        }
        for (String word : MediumName.vocabulary().words()) {
            assertTrue(output().contains(word), word);
        }
        assertTrue(output().lines().allMatch(line -> line.length() <= 120), output());
    }

    @Test
    void dryVolumesBecomeWetOnes() throws IOException {
        final String rest = ",300 °C,160 °C,1 bar,8000,5 %,2 K";
        final Path survey = survey(
                SurveyText.HEADING,
                "wet,gas mixture,N2 80 % + H2O 20 %,1000 Nm³/h wet" + rest,
                "dry,gas mixture,N2 80 % + H2O 20 %,800 Nm³/h dry" + rest);
        assertEquals(0, run("--survey", survey.toString(), "--out", results().toString()), errors());
        final List<String> lines = Files.readAllLines(results().resolve("streams.csv"));
        final double one = Double.parseDouble(lines.get(1).split(",")[3]);
        final double other = Double.parseDouble(lines.get(2).split(",")[3]);
        assertEquals(one, other, 1e-6 * one);
        // 1000/22.414 kmol/h of (0.8 x 28.013 + 0.2 x 18.015) kg/kmol
        assertEquals(1000 / 22.414 * 26.0134 / 3600, one, 1e-4 * one);
    }

    @Test
    void theRangeFollowsTheStatedPropagation() throws IOException {
        final Path survey = survey(
                SurveyText.HEADING,
                "flow only,dry air,,10 t/h,220 °C,60 °C,1 bar,8000,5 %,0 K",
                "temperature only,dry air,,10 t/h,220 °C,60 °C,1 bar,8000,0 %,2 K",
                "both,dry air,,10 t/h,220 °C,60 °C,1 bar,8000,5 %,2 K",
                "none,dry air,,10 t/h,220 °C,60 °C,1 bar,8000,0 %,0 K");
        assertEquals(0, run("--survey", survey.toString(), "--out", results().toString()), errors());
        final double heat = cell("none", 8);
        assertEquals(0, cell("none", 9), 0);
        assertEquals(0.05 * heat, cell("flow only", 9), 1e-5 * heat);
        // cp of air at 220 °C is 1.027 kJ/(kg K) (table A-2b of Cengel and Boles, from memory), flow 2.778 kg/s
        assertEquals(2 * 1.027 * 10 / 3.6, cell("temperature only", 9), 0.02);
        assertEquals(Math.hypot(cell("flow only", 9), cell("temperature only", 9)), cell("both", 9), 1e-5 * heat);
    }

    private double cell(String tag, int position) throws IOException {
        return Files.readAllLines(results().resolve("streams.csv")).stream()
                .map(line -> line.split(","))
                .filter(cells -> cells[1].equals(tag))
                .mapToDouble(cells -> Double.parseDouble(cells[position]))
                .findFirst()
                .orElseThrow();
    }
}
