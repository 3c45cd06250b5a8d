package lostwork.examples.bench;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;

/** Published coefficients for the baselines, from the files of the library with their citations. */
final class CoefficientFile {
    private CoefficientFile() {}

    private static List<String> lines(String resource) {
        try (InputStream stream = CoefficientFile.class.getResourceAsStream("/lostwork/fluid/" + resource)) {
            if (stream == null) {
                throw new IllegalStateException("resource " + resource + " is missing");
            }
            return new String(stream.readAllBytes(), StandardCharsets.UTF_8)
                    .lines()
                    .filter(line -> !line.isBlank() && !line.startsWith("#"))
                    .toList();
        } catch (IOException e) {
            throw new UncheckedIOException("resource " + resource + " cannot be read", e);
        }
    }

    /** {@return a1 to a7, b1, b2 of each temperature range of a gas} */
    static double[][] nineCoefficients(String species) {
        final List<String> lines = lines("gas/species/" + species + ".txt");
        final List<String> first = valuesOf("a1..a7", lines);
        final List<String> last = valuesOf("b1 b2", lines);
        final double[][] ranges = new double[first.size()][];
        for (int i = 0; i < ranges.length; i++) {
            ranges[i] = numbers(first.get(i) + " " + last.get(i));
        }
        return ranges;
    }

    private static List<String> valuesOf(String key, List<String> lines) {
        return lines.stream()
                .filter(line -> line.startsWith(key + " ="))
                .map(line -> line.substring(line.indexOf('=') + 1))
                .toList();
    }

    /** {@return the terms I, J, n of a sum of IAPWS-IF97} */
    static double[][] terms(String table) {
        return lines("water/if97/" + table + ".txt").stream()
                .filter(line -> Character.isDigit(line.charAt(0)) || line.charAt(0) == '-')
                .map(CoefficientFile::numbers)
                .toArray(double[][]::new);
    }

    private static double[] numbers(String text) {
        return Arrays.stream(text.trim().split("\\s+"))
                .mapToDouble(Double::parseDouble)
                .toArray();
    }
}
