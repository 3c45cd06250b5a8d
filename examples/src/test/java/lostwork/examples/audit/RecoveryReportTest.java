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
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class RecoveryReportTest {
    @TempDir
    Path folder;

    private final ByteArrayOutputStream out = new ByteArrayOutputStream();
    private final ByteArrayOutputStream err = new ByteArrayOutputStream();

    private int run(String... surveyLines) throws IOException {
        final PrintStream report = new PrintStream(out, true, StandardCharsets.UTF_8);
        final PrintStream errors = new PrintStream(err, true, StandardCharsets.UTF_8);
        final AuditProgram program = new AuditProgram(report, errors, () -> 0L);
        if (surveyLines.length == 0) {
            return program.run("--out", results().toString());
        }
        final Path survey = Files.write(folder.resolve("survey.csv"), List.of(surveyLines));
        return program.run("--survey", survey.toString(), "--out", results().toString());
    }

    private Path results() {
        return folder.resolve("results");
    }

    private String output() {
        return out.toString(StandardCharsets.UTF_8);
    }

    /** The report with its broken lines joined. */
    private String unwrapped() {
        return output().replace("\n  ", " ");
    }

    private String file(String name) throws IOException {
        return Files.readString(results().resolve(name));
    }

    private double inJson(String name) throws IOException {
        final Matcher matcher =
                Pattern.compile("\"" + Pattern.quote(name) + "\": ([-0-9.E]+)").matcher(file("plant.json"));
        assertTrue(matcher.find(), name);
        return Double.parseDouble(matcher.group(1));
    }

    private double inCsv(String name, String start, int column) throws IOException {
        final String row = file(name)
                .lines()
                .filter(line -> line.startsWith(start))
                .findFirst()
                .orElseThrow();
        return Double.parseDouble(row.split(",")[column]);
    }

    private double printed(String start) {
        final String row = output().lines()
                .filter(line -> line.startsWith(start))
                .findFirst()
                .orElseThrow();
        return Double.parseDouble(row.substring(start.length()).strip().split("\\s+")[0]);
    }

    @Test
    void filesAndPrintAgree() throws IOException {
        assertEquals(0, run());
        assertEquals("", err.toString(StandardCharsets.UTF_8));
        final double net = inJson("net power in kW");
        assertEquals(net, inCsv("plant-machines.csv", "plant,", 2), 0);
        assertEquals(net, printed("net electric power"), 0.5);
        assertEquals(net, printed("plant           net electric power"), 0.05);
        assertEquals(8.5 * net, inJson("energy per year in MWh"), 1e-9 * net);
        assertEquals(8.5 * net, printed("energy in 8500 hours a year"), 0.5);
        // Price and carbon intensity of the bundled site.
        assertEquals(8.5 * net * 96, printed("worth at the power price"), 500);
        assertEquals(8.5 * net * 96, inJson("worth per year in EUR"), 1e-6 * net);
        assertEquals(8.5 * net * 0.310, printed("CO2 that the grid is spared"), 0.5);
        assertTrue(unwrapped().contains("Result     a steam plant on G1 furnace gas would give " + Math.round(net)));
        assertEquals(8, file("plant-states.csv").lines().count());
        assertTrue(file("ledger.json").contains("\"boundary\""));
        assertTrue(file("report.txt").contains("Exergy ledger: where the work is lost"));
    }

    @Test
    void theLedgerClosesByItsPrintedFigures() throws IOException {
        run();
        final Matcher sum = Pattern.compile("gives up ([0-9.]+) kW of exergy = ([0-9.]+) kW net power \\+ ([0-9.]+) kW"
                        + " destroyed \\+ ([0-9.]+) kW lost")
                .matcher(unwrapped());
        assertTrue(sum.find(), unwrapped());
        final double fuel = Double.parseDouble(sum.group(1));
        final double uses =
                Double.parseDouble(sum.group(2)) + Double.parseDouble(sum.group(3)) + Double.parseDouble(sum.group(4));
        assertEquals(fuel, uses, 0.2001);
        // T0 times entropy generated, summed over the machines in the file: the other book.
        final double destroyed = file("ledger.csv")
                .lines()
                .skip(1)
                .takeWhile(line -> !line.isEmpty())
                .mapToDouble(line -> Double.parseDouble(line.split(",")[4]))
                .sum();
        assertEquals(Double.parseDouble(sum.group(3)), destroyed, 0.05);
    }

    @Test
    void theBalanceOfTheBoilerHoldsInThePrintedTable() throws IOException {
        run();
        final double gasIn = inCsv("plant-states.csv", "gas to boiler", 4);
        final double gasOut = inCsv("plant-states.csv", "gas to draught fan", 4);
        final double gasFlow = inCsv("plant-states.csv", "gas to boiler", 1);
        final double steamFlow = inCsv("plant-states.csv", "steam to turbine", 1);
        final double steam = inCsv("plant-states.csv", "steam to turbine", 4);
        final double water = inCsv("plant-states.csv", "water to boiler", 4);
        final double duty = inCsv("plant-machines.csv", "boiler", 2);
        assertEquals(duty, gasFlow * (gasIn - gasOut), 1e-9 * duty);
        assertEquals(duty, steamFlow * (steam - water), 1e-9 * duty);
    }

    @Test
    void theCautionIsThere() throws IOException {
        run();
        assertTrue(
                unwrapped().contains("Pressure equipment, steam and hot gas are dangerous and fall under local codes"));
        assertTrue(file("plant.json").contains("licensed practice"));
    }

    @Test
    void saysInWordsThatNoStreamIsSuitable() throws IOException {
        assertEquals(
                0,
                run(
                        SurveyText.HEADING,
                        "warm,dry air,,20 t/h,220 °C,60 °C,1013 mbar,8000,5 %,2 K",
                        "small,dry air,,0.3 t/h,500 °C,160 °C,1013 mbar,8000,5 %,2 K",
                        "narrow,dry air,,20 t/h,300 °C,300 °C,1013 mbar,8000,5 %,2 K",
                        "water,water,,20 t/h,90 °C,60 °C,2 bar,8000,5 %,2 K"));
        assertTrue(output().contains("Recovery plant: none"), output());
        assertTrue(
                unwrapped()
                        .contains(
                                "- warm: the gas comes with 220 °C, colder than the 250 °C from which a steam plant is"
                                        + " reasonable."),
                unwrapped());
        assertTrue(
                unwrapped().contains("- small: the gas is likely to give 9.14 kW, less than the 50.0 kW of"),
                unwrapped());
        assertFalse(Files.exists(results().resolve("plant.json")));
    }

    @Test
    void saysThatNoStreamIsAGas() throws IOException {
        Files.createDirectories(results());
        Files.writeString(results().resolve("ledger.csv"), "of an earlier run");
        assertEquals(0, run(SurveyText.HEADING, "water,water,,20 t/h,90 °C,60 °C,2 bar,8000,5 %,2 K"));
        assertTrue(unwrapped().contains("No stream is a gas with heat to give"), unwrapped());
        assertFalse(Files.exists(results().resolve("ledger.csv")), "a ledger of an earlier run is left");
    }

    @Test
    void passesOverAStreamThatRanksHigherAndTakesTheNext() throws IOException {
        assertEquals(
                0,
                run(
                        SurveyText.HEADING,
                        "wide,dry air,,400 t/h,240 °C,60 °C,1013 mbar,8000,5 %,2 K",
                        "hot,dry air,,30 t/h,500 °C,160 °C,1013 mbar,8000,5 %,2 K"));
        assertTrue(unwrapped().contains("Passed over: wide: the gas comes with 240 °C"), unwrapped());
        assertTrue(output().contains("Recovery plant: steam set on hot"), output());
    }

    @Test
    void aPressurisedGasKeepsItsPressure() throws IOException {
        assertEquals(0, run(SurveyText.HEADING, "hot,dry air,,60 t/h,500 °C,160 °C,4 bar,8000,5 %,2 K"));
        assertTrue(output().contains("Recovery plant: steam set on hot"), output());
        assertEquals(4, inCsv("plant-states.csv", "gas to stack", 3), 1e-9);
    }
}
