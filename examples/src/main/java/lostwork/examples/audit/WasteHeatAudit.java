package lostwork.examples.audit;

import java.io.PrintStream;
import java.nio.charset.StandardCharsets;

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
        final int code = FaultGuard.guard(() -> new AuditProgram(out, err, System::nanoTime).run(arguments), err);
        if (code != AuditProgram.ALL_GOOD) {
            System.exit(code);
        }
    }
}
