package lostwork.examples.audit;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CoderResult;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.nio.file.AccessDeniedException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;

/**
 * The lines of a UTF-8 text file, with a problem for each line that is not UTF-8.
 *
 * <p>A byte order mark is dropped. UTF-16 and binary files are refused as a whole. In a file of another eight-bit
 * encoding the plain ASCII lines are kept; each line with a foreign byte is named.
 */
final class SourceText {
    private static final String ACCEPTED = "a text file in UTF-8; save it again with that encoding";

    private final String name;
    private final List<Line> lines;
    private final List<Problem> problems;

    /**
     * One line, without its line end.
     *
     * @param number line number from 1
     * @param text the characters
     */
    record Line(int number, String text) {}

    private SourceText(String name, List<Line> lines, List<Problem> problems) {
        this.name = name;
        this.lines = List.copyOf(lines);
        this.problems = List.copyOf(problems);
    }

    static SourceText read(Path file) {
        final String name = file.toString();
        if (Files.isDirectory(file)) {
            throw new RefusedInputException(Problem.ofFile(name, "this is a folder", "the path of a text file"));
        }
        try {
            return of(name, Files.readAllBytes(file));
        } catch (NoSuchFileException e) {
            throw new RefusedInputException(Problem.ofFile(
                    name,
                    "there is no such file (looked in " + file.toAbsolutePath().getParent() + ")",
                    "the path of a text file"));
        } catch (IOException e) {
            throw new RefusedInputException(
                    Problem.ofFile(name, "the file cannot be read (" + reason(e) + ")", "a file that you may read"));
        }
    }

    private static String reason(IOException e) {
        return e instanceof AccessDeniedException ? "access denied" : String.valueOf(e.getMessage());
    }

    static SourceText of(String name, byte[] bytes) {
        if (startsWith(bytes, 0xFF, 0xFE) || startsWith(bytes, 0xFE, 0xFF) || hasZeroByte(bytes)) {
            throw new RefusedInputException(Problem.ofFile(
                    name, "the file is UTF-16 or not text: it holds zero bytes or a UTF-16 mark", ACCEPTED));
        }
        final List<Line> lines = new ArrayList<>();
        final List<Problem> problems = new ArrayList<>();
        int start = startsWith(bytes, 0xEF, 0xBB, 0xBF) ? 3 : 0;
        int number = 0;
        while (start < bytes.length) {
            int end = start;
            while (end < bytes.length && bytes[end] != '\n' && bytes[end] != '\r') {
                end++;
            }
            number++;
            decode(name, number, Arrays.copyOfRange(bytes, start, end), lines, problems);
            final boolean crLf = end + 1 < bytes.length && bytes[end] == '\r' && bytes[end + 1] == '\n';
            start = end + (crLf ? 2 : 1);
        }
        return new SourceText(name, lines, problems);
    }

    private static void decode(String name, int number, byte[] line, List<Line> lines, List<Problem> problems) {
        final ByteBuffer in = ByteBuffer.wrap(line);
        final CharBuffer out = CharBuffer.allocate(line.length);
        final CoderResult result = StandardCharsets.UTF_8
                .newDecoder()
                .onMalformedInput(CodingErrorAction.REPORT)
                .onUnmappableCharacter(CodingErrorAction.REPORT)
                .decode(in, out, true);
        out.flip();
        if (result.isUnderflow()) {
            lines.add(new Line(number, out.toString()));
            return;
        }
        final int foreign = line[in.position()] & 0xFF;
        problems.add(new Problem(
                name,
                number,
                out.length() + 1,
                String.format(Locale.ROOT, "byte 0x%02X is not UTF-8 (in Latin-1 it would be \"%c\")", foreign, (char)
                        foreign),
                ACCEPTED));
    }

    private static boolean startsWith(byte[] bytes, int... mark) {
        if (bytes.length < mark.length) {
            return false;
        }
        for (int i = 0; i < mark.length; i++) {
            if ((bytes[i] & 0xFF) != mark[i]) {
                return false;
            }
        }
        return true;
    }

    private static boolean hasZeroByte(byte[] bytes) {
        for (byte b : bytes) {
            if (b == 0) {
                return true;
            }
        }
        return false;
    }

    String name() {
        return name;
    }

    /** {@return the readable lines; a line that is not UTF-8 is missing here and stands in {@link #problems}} */
    List<Line> lines() {
        return lines;
    }

    List<Problem> problems() {
        return problems;
    }
}
