package lostwork.examples.link;

import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.Temperature.celsius;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.junit.jupiter.api.Assumptions.assumeTrue;

import java.io.ByteArrayOutputStream;
import java.io.File;
import java.io.PrintStream;
import java.lang.module.ModuleFinder;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Set;
import java.util.concurrent.TimeUnit;
import java.util.spi.ToolProvider;
import java.util.stream.Collectors;
import lostwork.exergy.ReferenceEnvironment;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The library modules link into a run-time image of their own, as README.md says, and a program runs on it. */
class LinkedImageTest {
    private static final Set<String> NEEDED = Set.of(
            "lostwork.core",
            "lostwork.fluids",
            "lostwork.cycles",
            "java.measure",
            "tech.units.indriya",
            "tech.uom.lib.common",
            "jakarta.inject");

    @Test
    void theLibraryLinksAndRuns(@TempDir Path folder) throws Exception {
        final ToolProvider jlink = ToolProvider.findFirst("jlink").orElse(null);
        assumeTrue(
                jlink != null && Files.isDirectory(Path.of(System.getProperty("java.home"), "jmods")),
                "this JDK comes without jlink or without the modules to link");
        final Path image = folder.resolve("image");
        final ByteArrayOutputStream said = new ByteArrayOutputStream();
        final PrintStream out = new PrintStream(said, true, StandardCharsets.UTF_8);
        final int code = jlink.run(
                out,
                out,
                "--module-path",
                modulePath(),
                "--add-modules",
                "lostwork.cycles",
                "--no-header-files",
                "--no-man-pages",
                "--output",
                image.toString());
        assertEquals(0, code, said.toString(StandardCharsets.UTF_8));

        final String modules = run(folder, image, "--list-modules");
        assertTrue(modules.contains("lostwork.core") && modules.contains("lostwork.cycles"), modules);
        assertFalse(modules.contains("commons.math3") || modules.contains("jspecify"), modules);
        assertEquals(
                LinkedProgram.answer(ReferenceEnvironment.of(celsius(12), bar(1.013))),
                run(folder, image, "-cp", testClasses(), LinkedProgram.class.getName())
                        .strip());
    }

    /** {@return the modules of the class path that the library needs, found by name} */
    private static String modulePath() {
        return Arrays.stream(System.getProperty("java.class.path").split(File.pathSeparator))
                .filter(LinkedImageTest::isNeeded)
                .collect(Collectors.joining(File.pathSeparator));
    }

    private static boolean isNeeded(String entry) {
        return ModuleFinder.of(Path.of(entry)).findAll().stream()
                .map(module -> module.descriptor())
                .anyMatch(module -> !module.isAutomatic() && NEEDED.contains(module.name()));
    }

    private static String testClasses() throws Exception {
        return Path.of(LinkedProgram.class
                        .getProtectionDomain()
                        .getCodeSource()
                        .getLocation()
                        .toURI())
                .toString();
    }

    private static String run(Path folder, Path image, String... arguments) throws Exception {
        final Path output = folder.resolve("output.txt");
        final var command = new ArrayList<String>();
        command.add(image.resolve("bin").resolve("java").toString());
        command.addAll(Arrays.asList(arguments));
        final Process process = new ProcessBuilder(command)
                .redirectErrorStream(true)
                .redirectOutput(output.toFile())
                .start();
        assertTrue(process.waitFor(2, TimeUnit.MINUTES), "the linked image does not end");
        final String text = Files.readString(output);
        assertEquals(0, process.exitValue(), text);
        return text;
    }
}
