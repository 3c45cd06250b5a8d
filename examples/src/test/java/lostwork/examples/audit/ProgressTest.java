package lostwork.examples.audit;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.concurrent.atomic.AtomicLong;
import org.junit.jupiter.api.Test;

class ProgressTest {
    @Test
    void speaksOnceASecondAtMostAndNotInTheFirst() {
        final AtomicLong milliseconds = new AtomicLong();
        final ByteArrayOutputStream out = new ByteArrayOutputStream();
        final Progress progress =
                new Progress(new PrintStream(out, true, StandardCharsets.UTF_8), () -> milliseconds.get() * 1_000_000);
        for (int done = 1; done <= 25; done++) {
            milliseconds.addAndGet(100);
            progress.report(done + " of 25 streams done");
        }
        assertEquals(
                "10 of 25 streams done\n20 of 25 streams done\n",
                out.toString(StandardCharsets.UTF_8).replace(System.lineSeparator(), "\n"));
    }
}
