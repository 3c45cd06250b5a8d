package lostwork.examples.audit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Random;
import java.util.stream.Stream;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.lifecycle.AfterContainer;
import net.jqwik.api.lifecycle.BeforeContainer;

/** Damaged copies of the example files never make the program fail: each run ends with a documented exit code. */
class DamagedFilesLawTest {
    private static final String SPICE = ",;.\"=%#\n\r\t -+e0123456789°³\u0000\uFEFFNm/hKCOdryweti\u2212[]()";

    private static Path folder;

    @BeforeContainer
    static void makesAFolder() throws IOException {
        folder = Files.createTempDirectory("damaged");
    }

    @AfterContainer
    static void removesIt() throws IOException {
        try (Stream<Path> paths = Files.walk(folder)) {
            paths.sorted((a, b) -> b.compareTo(a)).forEach(path -> path.toFile().delete());
        }
    }

    @Property(seed = "20261203", tries = 400)
    void aDamagedSurveyEndsWithADocumentedCode(@ForAll long seed) throws IOException {
        final Path survey = folder.resolve("survey.csv");
        Files.write(survey, damaged("glassworks-survey.csv", new Random(seed)));
        assertEndsWell("--survey", survey.toString());
    }

    @Property(seed = "20261204", tries = 200)
    void aDamagedSiteEndsWithADocumentedCode(@ForAll long seed) throws IOException {
        final Path site = folder.resolve("site.txt");
        Files.write(site, damaged("glassworks-site.txt", new Random(seed)));
        assertEndsWell("--site", site.toString());
    }

    private static void assertEndsWell(String option, String file) {
        final ByteArrayOutputStream errors = new ByteArrayOutputStream();
        final int code = new AuditProgram(
                        new PrintStream(OutputStream.nullOutputStream(), true, StandardCharsets.UTF_8),
                        new PrintStream(errors, true, StandardCharsets.UTF_8),
                        () -> 0L)
                .run(option, file, "--out", folder.resolve("results").toString());
        final String text = errors.toString(StandardCharsets.UTF_8);
        assertTrue(code >= 0 && code <= 2, text);
        assertEquals(code == 0, text.isEmpty(), text);
    }

    /** A copy with one to four pieces of text put in, taken out or overwritten. */
    private static byte[] damaged(String name, Random random) throws IOException {
        final StringBuilder text = new StringBuilder(bundled(name));
        final int damages = 1 + random.nextInt(4);
        for (int i = 0; i < damages; i++) {
            final int at = random.nextInt(text.length());
            final int length = random.nextInt(1 + Math.min(4, text.length() - at));
            final StringBuilder piece = new StringBuilder();
            for (int k = random.nextInt(4); k > 0; k--) {
                piece.append(SPICE.charAt(random.nextInt(SPICE.length())));
            }
            text.replace(at, at + length, piece.toString());
        }
        return text.toString().getBytes(random.nextInt(20) == 0 ? StandardCharsets.ISO_8859_1 : StandardCharsets.UTF_8);
    }

    private static String bundled(String name) throws IOException {
        try (InputStream in = DamagedFilesLawTest.class.getResourceAsStream(name)) {
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        }
    }
}
