package lostwork.fluid.gas;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

/** A plain-text data file of this package: comment lines after {@code #}, blank lines, and the lines that count. */
final class DataFile {
    private final String name;
    private final List<Line> lines;

    private DataFile(String name, List<Line> lines) {
        this.name = name;
        this.lines = lines;
    }

    /** Reads a resource of this package. */
    static DataFile resource(String name) {
        final InputStream in = DataFile.class.getResourceAsStream(name);
        if (in == null) {
            throw new DataFileException(name, 0, "the file is missing from the module");
        }
        try (BufferedReader reader = new BufferedReader(new InputStreamReader(in, StandardCharsets.UTF_8))) {
            return of(name, reader.lines().toList());
        } catch (IOException e) {
            throw new UncheckedIOException("reading " + name, e);
        }
    }

    /** Takes the lines of a file, counted from 1. */
    static DataFile of(String name, List<String> text) {
        final List<Line> lines = new ArrayList<>();
        for (int i = 0; i < text.size(); i++) {
            final String line = text.get(i).strip();
            if (!line.isEmpty() && line.charAt(0) != '#') {
                lines.add(new Line(name, i + 1, line));
            }
        }
        return new DataFile(name, List.copyOf(lines));
    }

    List<Line> lines() {
        return lines;
    }

    /** Makes a failure that belongs to the file as a whole. */
    DataFileException failure(String why) {
        return new DataFileException(name, 0, why);
    }

    /** One line that counts, with its place. */
    record Line(String file, int place, String text) {
        DataFileException failure(String why) {
            return new DataFileException(file, place, why);
        }

        /** {@return what stands before {@code " = "}} */
        String key() {
            return text.substring(0, separator());
        }

        /** {@return what stands after {@code " = "}} */
        String value() {
            return text.substring(separator() + 3).strip();
        }

        private int separator() {
            final int at = text.indexOf(" = ");
            if (at < 0) {
                throw failure("expected 'key = value', found '" + text + "'");
            }
            return at;
        }

        /** {@return the value as exactly so many finite numbers} */
        double[] numbers(int count) {
            final String[] words = value().split("\\s+");
            if (words.length != count) {
                throw failure("expected " + count + " numbers after '" + key() + "', found " + words.length);
            }
            final double[] numbers = new double[count];
            for (int i = 0; i < count; i++) {
                numbers[i] = finite(words[i]);
            }
            return numbers;
        }

        double number() {
            return numbers(1)[0];
        }

        double finite(String word) {
            final double number;
            try {
                number = Double.parseDouble(word);
            } catch (NumberFormatException e) {
                throw failure("'" + word + "' is not a number");
            }
            if (!Double.isFinite(number)) {
                throw failure("'" + word + "' is not a finite number");
            }
            return number;
        }
    }
}
