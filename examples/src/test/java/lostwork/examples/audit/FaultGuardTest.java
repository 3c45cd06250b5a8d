package lostwork.examples.audit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;

class FaultGuardTest {
    @Test
    void aFaultOfTheProgramIsOneLineThatNamesTheTrace() throws IOException {
        final ByteArrayOutputStream err = new ByteArrayOutputStream();
        final int code = FaultGuard.guard(
                () -> {
                    throw new IllegalStateException("a wheel came off");
                },
                new PrintStream(err, true, StandardCharsets.UTF_8));
        assertEquals(2, code);
        final String text = err.toString(StandardCharsets.UTF_8);
        assertEquals(1, text.lines().count(), text);
        assertTrue(
                text.startsWith("The program failed by a fault of its own (IllegalStateException: a wheel came off)."),
                text);
        final Matcher file =
                Pattern.compile("Its trace is in (.*); please report").matcher(text);
        assertTrue(file.find(), text);
        final Path trace = Path.of(file.group(1));
        assertTrue(Files.readString(trace).contains("\tat lostwork.examples.audit.FaultGuardTest"));
        Files.delete(trace);
    }

    @Test
    void theExitCodeOfTheWorkPasses() {
        assertEquals(1, FaultGuard.guard(() -> 1, System.err));
    }
}
