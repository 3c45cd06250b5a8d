package lostwork.examples.guide;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.HashMap;
import java.util.List;
import jdk.jshell.tool.JavaShellToolBuilder;
import org.junit.jupiter.api.Test;

/** The start-up script works in JShell, and so do the lines that README.md types there. */
class JShellTest {

    @Test
    void theLinesOfTheReadmeWork() throws Exception {
        final List<String> typed = Page.part("README.md", "Explore it in JShell").indented().stream()
                .map(line -> line.replaceFirst("^jshell> ", ""))
                .toList();
        assertTrue(typed.size() >= 4, typed.toString());
        final String answer = answerTo(String.join("\n", typed));
        assertFalse(answer.contains("|  "), answer);
        assertTrue(answer.contains("kJ/(kg K)") && answer.contains("vapour"), answer);
    }

    /** The names that two kinds of quantity share mean what the script says. */
    @Test
    void sharedNamesAreSettled() throws Exception {
        final String answer = answerTo("""
                Object entropy = kilojoulesPerKilogramKelvin(1)
                Object conductance = kilowattsPerKelvin(1)
                System.out.println(entropy.getClass().getSimpleName() + " " + conductance.getClass().getSimpleName())
                show(plus(1))
                """);
        assertTrue(answer.contains("SpecificEntropy Conductance"), answer);
        assertTrue(answer.contains("cannot find symbol"), "a wrong line is seen as wrong: " + answer);
    }

    private String answerTo(String lines) throws Exception {
        final ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        final PrintStream out = new PrintStream(bytes, true, StandardCharsets.UTF_8);
        final int code = JavaShellToolBuilder.builder()
                .in(new ByteArrayInputStream((lines + "\n/exit\n").getBytes(StandardCharsets.UTF_8)), null)
                .out(out)
                .err(out)
                .persistence(new HashMap<>())
                .start(
                        "-q",
                        "--class-path",
                        System.getProperty("java.class.path"),
                        "--startup",
                        "DEFAULT",
                        "--startup",
                        Repository.file("examples/src/jshell/start.jsh").toString());
        assertEquals(0, code, bytes.toString(StandardCharsets.UTF_8));
        return bytes.toString(StandardCharsets.UTF_8);
    }
}
