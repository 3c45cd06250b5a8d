package lostwork.examples.audit;

import java.io.IOException;
import java.io.PrintStream;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.function.IntSupplier;

/** Turns a fault of the program itself into one clear line; the stack trace goes to a file that the line names. */
final class FaultGuard {
    private FaultGuard() {}

    /**
     * {@return the exit code of some work, or the one for "nothing done" if it fails}
     *
     * @param work the work
     * @param err where the line goes
     */
    static int guard(IntSupplier work, PrintStream err) {
        try {
            return work.getAsInt();
        } catch (RuntimeException | StackOverflowError | OutOfMemoryError e) {
            err.println("The program failed by a fault of its own ("
                    + e.getClass().getSimpleName() + ": " + e.getMessage() + "). " + whereToLook(e));
            return AuditProgram.NOTHING_DONE;
        }
    }

    private static String whereToLook(Throwable fault) {
        try {
            final Path file = Files.createTempFile("waste-heat-audit-fault", ".txt");
            try (PrintWriter writer = new PrintWriter(Files.newBufferedWriter(file, StandardCharsets.UTF_8))) {
                fault.printStackTrace(writer);
            }
            return "Its trace is in " + file + "; please report it together with the two input files.";
        } catch (IOException e) {
            return "Please report it together with the two input files.";
        }
    }
}
