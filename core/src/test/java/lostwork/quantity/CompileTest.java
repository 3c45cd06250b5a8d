package lostwork.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;

import java.io.IOException;
import java.io.PrintWriter;
import java.io.StringWriter;
import java.net.URISyntaxException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.spi.ToolProvider;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What has no meaning does not compile; beside each, the nearest statement that has one compiles. */
class CompileTest {
    @TempDir
    Path folder;

    private static String location(Class<?> type) throws URISyntaxException {
        return Path.of(type.getProtectionDomain().getCodeSource().getLocation().toURI())
                .toString();
    }

    private String compile(String statement) throws IOException, URISyntaxException {
        final Path source = Files.writeString(folder.resolve("Snippet.java"), """
                import lostwork.quantity.*;
                class Snippet {
                    static void run(Temperature t, TemperatureSpan dt, Pressure p, PressureDifference dp, MassFlow m,
                            MolarFlow n, SpecificEnergy h, SpecificEntropy s, SpecificHeatCapacity cp, MolarEnergy hm,
                            MolarMass mm, Power w, Conductance ua, HeatCapacityRate c, Duration d, Money money) {
                        %s;
                    }
                }
                """.formatted(statement));
        final StringWriter out = new StringWriter();
        final ToolProvider javac = ToolProvider.findFirst("javac").orElseThrow();
        final int code = javac.run(
                new PrintWriter(out),
                new PrintWriter(out),
                "-proc:none",
                "-implicit:none",
                "-encoding",
                "UTF-8",
                "-d",
                folder.toString(),
                "-classpath",
                location(Temperature.class) + java.io.File.pathSeparator + location(javax.measure.Quantity.class),
                source.toString());
        return code == 0 ? "" : out.toString();
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "Temperature x = t.plus(t)        | Temperature x = t.plus(dt)",
                "var x = t.times(2.0)             | var x = dt.times(2.0)",
                "TemperatureSpan x = t            | TemperatureSpan x = t.minus(t)",
                "Pressure x = p.plus(p)           | Pressure x = p.plus(dp)",
                "Pressure x = dp                  | PressureDifference x = dp",
                "Power x = m.times(s)             | EntropyRate x = m.times(s)",
                "var x = h.over(t)                | SpecificHeatCapacity x = h.over(dt)",
                "Power x = m.times(hm)            | Power x = n.times(hm)",
                "var x = h.plus(hm)               | var x = h.plus(hm.over(mm))",
                "var x = s.plus(cp)               | var x = s.plus(s)",
                "Conductance x = c                | Conductance x = ua",
                "var x = ua.plus(c)               | Ratio x = ua.over(c)",
                "var x = w.plus(1.0)              | var x = w.plus(w)",
                "var x = t.in(Units.KELVIN_SPAN)  | var x = t.in(Units.KELVIN)",
                "t.compareTo(dt)                  | t.compareTo(t)",
                "javax.measure.Quantity<?> x = t  | javax.measure.Quantity<?> x = t.asQuantity()",
                "var x = Money.of(t.asQuantity()) | var x = Temperature.of(t.asQuantity())",
                "var x = new Temperature(300)     | var x = Temperature.kelvin(300)"
            })
    void onlyWhatHasAMeaningCompiles(String without, String with) throws IOException, URISyntaxException {
        assertEquals("", compile(with), "must compile: " + with);
        assertNotEquals("", compile(without), "must not compile: " + without);
    }
}
