package lostwork.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.File;
import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.net.URISyntaxException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.SortedSet;
import java.util.TreeSet;
import java.util.regex.Pattern;
import java.util.spi.ToolProvider;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What has no meaning does not compile; beside each, the nearest statement that has one compiles. */
class CompileTest {
    @TempDir
    Path folder;

    private static String location(Class<?> type) throws URISyntaxException {
        return Path.of(type.getProtectionDomain().getCodeSource().getLocation().toURI())
                .toString();
    }

    /** Compiles each statement as a class of its own, all in one run, and returns the numbers of those with an error. */
    private SortedSet<Integer> refused(List<String> statements) throws IOException, URISyntaxException {
        final List<String> arguments = new ArrayList<>(List.of(
                // The same words in every language of the machine.
                "-XDrawDiagnostics",
                "-proc:none",
                "-implicit:none",
                "-encoding",
                "UTF-8",
                "-d",
                folder.toString(),
                "-classpath",
                location(Temperature.class) + File.pathSeparator + location(javax.measure.Quantity.class)));
        for (int i = 0; i < statements.size(); i++) {
            final Path source =
                    Files.writeString(folder.resolve("Snippet" + i + ".java"), """
                    import lostwork.quantity.*;
                    class Snippet%d {
                        static void run(Temperature t, TemperatureSpan dt, Pressure p, PressureDifference dp, MassFlow m,
                                MolarFlow n, SpecificEnergy h, SpecificEntropy s, SpecificHeatCapacity cp, MolarEnergy hm,
                                MolarMass mm, Power w, Conductance ua, HeatCapacityRate c, Duration d, Money money) {
                            %s;
                        }
                    }
                    """.formatted(i, statements.get(i)));
            arguments.add(source.toString());
        }
        final StringWriter out = new StringWriter();
        ToolProvider.findFirst("javac")
                .orElseThrow()
                .run(new PrintWriter(out), new PrintWriter(out), arguments.toArray(String[]::new));
        return Pattern.compile("Snippet(\\d+)\\.java:\\d+:\\d+: compiler\\.err\\.")
                .matcher(out.toString())
                .results()
                .map(error -> Integer.valueOf(error.group(1)))
                .collect(Collectors.toCollection(TreeSet::new));
    }

    private static final String[][] PAIRS = {
        {"Temperature x = t.plus(t)", "Temperature x = t.plus(dt)"},
        {"var x = t.times(2.0)", "var x = dt.times(2.0)"},
        {"TemperatureSpan x = t", "TemperatureSpan x = t.minus(t)"},
        {"Pressure x = p.plus(p)", "Pressure x = p.plus(dp)"},
        {"Pressure x = dp", "PressureDifference x = dp"},
        {"Power x = m.times(s)", "EntropyRate x = m.times(s)"},
        {"var x = h.over(t)", "SpecificHeatCapacity x = h.over(dt)"},
        {"Power x = m.times(hm)", "Power x = n.times(hm)"},
        {"var x = h.plus(hm)", "var x = h.plus(hm.over(mm))"},
        {"var x = s.plus(cp)", "var x = s.plus(s)"},
        {"Conductance x = c", "Conductance x = ua"},
        {"var x = ua.plus(c)", "Ratio x = ua.over(c)"},
        {"var x = w.plus(1.0)", "var x = w.plus(w)"},
        {"var x = t.in(Units.KELVIN_SPAN)", "var x = t.in(Units.KELVIN)"},
        {"t.compareTo(dt)", "t.compareTo(t)"},
        {"javax.measure.Quantity<?> x = t", "javax.measure.Quantity<?> x = t.asQuantity()"},
        {"var x = Money.of(t.asQuantity())", "var x = Temperature.of(t.asQuantity())"},
        {"var x = new Temperature(300)", "var x = Temperature.kelvin(300)"}
    };

    @Test
    void whatHasAMeaningCompiles() throws IOException, URISyntaxException {
        final List<String> statements = Stream.of(PAIRS).map(pair -> pair[1]).toList();
        assertEquals(Set.of(), refused(statements), () -> "must compile: " + statements);
    }

    @Test
    void whatHasNoneDoesNotCompile() throws IOException, URISyntaxException {
        final List<String> statements = Stream.of(PAIRS).map(pair -> pair[0]).toList();
        final SortedSet<Integer> refused = refused(statements);
        for (int i = 0; i < statements.size(); i++) {
            assertTrue(refused.contains(i), "must not compile: " + statements.get(i));
        }
    }
}
