package lostwork.examples.audit;

import java.io.IOException;
import java.io.PrintStream;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;

/**
 * The main job: from a survey of the streams of a works to what their heat could give.
 *
 * <p>Run it with {@code --help} for the arguments, the form of the files and the exit codes.
 */
public final class WasteHeatAudit {
    private WasteHeatAudit() {}

    /**
     * Runs the audit and ends the process with its exit code.
     *
     * @param arguments see {@code --help}
     */
    public static void main(String[] arguments) {
        final PrintStream out = new PrintStream(System.out, true, StandardCharsets.UTF_8);
        final PrintStream err = new PrintStream(System.err, true, StandardCharsets.UTF_8);
        final int code = guarded(out, err, arguments);
        if (code != AuditProgram.ALL_GOOD) {
            System.exit(code);
        }
    }

    /** Keeps even a fault of the program itself from showing as a stack trace. */
    private static int guarded(PrintStream out, PrintStream err, String... arguments) {
        try {
            return new AuditProgram(out, err).run(arguments);
        } catch (RuntimeException | StackOverflowError | OutOfMemoryError e) {
            err.println("The program failed by a fault of its own ("
                    + e.getClass().getSimpleName() + ": " + e.getMessage() + "). " + whereToLook(e));
            return AuditProgram.NOTHING_DONE;
        }
    }

    private static String whereToLook(Throwable fault) {
        try {
            final Path file = Files.createTempFile("waste-heat-audit-fault", ".txt");
            try (PrintWriter writer = new PrintWriter(Files.newBufferedWriter(file))) {
                fault.printStackTrace(writer);
            }
            return "Its trace is in " + file + "; please report it together with the two input files.";
        } catch (IOException e) {
            return "Please report it together with the two input files.";
        }
    }
}
