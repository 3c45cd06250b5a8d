package lostwork.examples.guide;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import lostwork.examples.audit.WasteHeatAudit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** What README.md shows is what the programs print and what the sources say. */
class ReadmeTest {
    private static final String README = "README.md";

    @Test
    void theExcerptIsWhatTheMainJobPrints(@TempDir Path folder) {
        final List<String> excerpt = Page.part(README, "Run it").indented();
        assertTrue(excerpt.size() >= 5, "an excerpt of a few lines: " + excerpt);
        final List<String> printed = printedBy(() -> WasteHeatAudit.main(new String[] {"--out", folder.toString()}))
                .lines()
                .toList();
        int from = 0;
        for (String line : excerpt) {
            final int at = printed.subList(from, printed.size()).indexOf(line);
            assertTrue(at >= 0, "the main job no longer prints, in this order: " + line);
            from += at + 1;
        }
    }

    @Test
    void thereIsOneCommandEachToRunAndToTest() {
        assertEquals(
                List.of(List.of("mvn -q compile exec:java")),
                Page.part(README, "Run it").fenced(""));
        final List<List<String>> test = Page.part(README, "Test it").fenced("");
        assertEquals(1, test.size());
        assertEquals(1, test.get(0).size());
        final List<String> continuous = Repository.lines(".ci/run");
        assertEquals(
                test.get(0).get(0), continuous.get(continuous.size() - 1), ".ci/run runs the README's test command");
    }

    @Test
    void theTenLinesAreThoseOfTheSource() {
        final List<String> source =
                Repository.lines("examples/src/main/java/lostwork/examples/guide/RejectedHeat.java");
        final int start = source.indexOf("    public static void main(String[] arguments) {") + 1;
        final List<String> rest = source.subList(start, source.size());
        final List<String> body = rest.subList(0, rest.indexOf("    }")).stream()
                .map(String::strip)
                .toList();
        final List<List<String>> shown = Page.part(README, "Embed it").fenced("java");
        assertEquals(List.of(body), shown);
        assertEquals(10, body.size());
    }

    @Test
    void theirAnswerIsWhatTheyPrint() {
        assertEquals(
                String.join("\n", Page.part(README, "Embed it").indented()),
                printedBy(() -> RejectedHeat.main(new String[0])).strip());
    }

    @Test
    void everyPackageStandsInTheTable() throws Exception {
        final Set<String> packages = new TreeSet<>();
        for (String module : List.of("core", "fluids", "cycles")) {
            final Path sources = Repository.file(module + "/src/main/java");
            try (Stream<Path> files = Files.walk(sources)) {
                packages.addAll(files.filter(file -> file.endsWith("package-info.java"))
                        .map(file -> sources.relativize(file.getParent())
                                .toString()
                                .replace(sources.getFileSystem().getSeparator(), "."))
                        .collect(Collectors.toSet()));
            }
        }
        packages.remove("lostwork.plant.kernel");
        final String table =
                String.join("\n", Page.part(README, "What is where").lines());
        packages.removeIf(name -> table.contains("`" + name + "`"));
        assertEquals(Set.of(), packages, "packages that the table of README.md does not name");
    }

    private static String printedBy(Runnable program) {
        final PrintStream before = System.out;
        final ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try {
            System.setOut(new PrintStream(bytes, true, StandardCharsets.UTF_8));
            program.run();
        } finally {
            System.setOut(before);
        }
        return bytes.toString(StandardCharsets.UTF_8);
    }
}
