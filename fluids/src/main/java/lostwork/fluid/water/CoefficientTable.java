package lostwork.fluid.water;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.math.BigDecimal;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/**
 * One table of coefficients, read from a resource file of this package.
 *
 * <p>The file holds its citation in lines that start with {@code #}, then lines {@code argument}, {@code result} and
 * {@code constant}, then {@code columns} and one line for each term. References are turned into SI as they are read:
 * a name that ends in {@code MPa} counts in 10<sup>6</sup> Pa, one with {@code kJ} in 10<sup>3</sup> J.
 */
final class CoefficientTable {
    private final String file;
    private final List<Argument> arguments = new ArrayList<>();
    private final Map<String, Double> constants = new LinkedHashMap<>();
    private final List<double[]> rows = new ArrayList<>();
    private @Nullable Result result;
    private int columns;

    private CoefficientTable(String file) {
        this.file = file;
    }

    /** How an argument of the sum follows from a quantity: offset + scale q, or offset + scale/q. */
    record Argument(String quantity, double scale, double offset, double reference) {}

    /** How the result follows from the sum: reference sum<sup>power</sup>, or reference exp(sum) for the power 0. */
    record Result(String quantity, double reference, double power) {}

    /**
     * Reads a table.
     *
     * @param file the file, relative to this package
     * @throws IllegalStateException if the file is missing or a line cannot be read; names file and line
     */
    static CoefficientTable read(String file) {
        try (InputStream stream = CoefficientTable.class.getResourceAsStream(file)) {
            if (stream == null) {
                throw new IllegalStateException("resource " + file + " is missing beside " + CoefficientTable.class);
            }
            return parse(file, new BufferedReader(new InputStreamReader(stream, StandardCharsets.UTF_8)));
        } catch (IOException e) {
            throw new UncheckedIOException("resource " + file + " cannot be read", e);
        }
    }

    static CoefficientTable parse(String file, BufferedReader reader) throws IOException {
        final CoefficientTable table = new CoefficientTable(file);
        int number = 0;
        for (String line = reader.readLine(); line != null; line = reader.readLine()) {
            number++;
            if (line.isBlank() || line.startsWith("#")) {
                continue;
            }
            try {
                table.accept(line.trim().split("\\s+"));
            } catch (IllegalArgumentException | ArrayIndexOutOfBoundsException e) {
                throw new IllegalStateException(
                        "resource " + file + ", line " + number + ": cannot read \"" + line + "\" (" + e.getMessage()
                                + ")",
                        e);
            }
        }
        if (table.rows.isEmpty()) {
            throw new IllegalStateException("resource " + file + " ends after line " + number + " without a term");
        }
        return table;
    }

    private void accept(String[] words) {
        switch (words[0]) {
            case "argument" -> {
                require(words.length == 5, "an argument has a quantity, a reference, a factor and an offset");
                final boolean inverse = words[1].startsWith("1/");
                final double reference = inSi(words[2], words[1]);
                final double factor = number(words[3]);
                arguments.add(new Argument(
                        words[1], inverse ? factor * reference : factor / reference, number(words[4]), reference));
            }
            case "result" -> {
                require(words.length == 4, "a result has a quantity, a reference and a power");
                result = new Result(words[1], inSi(words[2], words[1]), words[3].equals("exp") ? 0 : number(words[3]));
            }
            case "constant" -> {
                require(words.length == 3, "a constant has a name and a value");
                constants.put(words[1], inSi(words[2], words[1]));
            }
            case "columns" -> columns = words.length - 1;
            default -> {
                require(columns > 0, "a term stands before the line \"columns\"");
                require(words.length == columns, "expected " + columns + " numbers");
                final double[] row = new double[columns];
                for (int i = 0; i < columns; i++) {
                    row[i] = number(words[i]);
                }
                rows.add(row);
            }
        }
    }

    private static void require(boolean condition, String expected) {
        if (!condition) {
            throw new IllegalArgumentException(expected);
        }
    }

    private static double number(String word) {
        final double value = Double.parseDouble(word);
        require(Double.isFinite(value), "not a finite number");
        return value;
    }

    /** Scaled as a decimal number, so that 16.53 MPa is 16.53e6 Pa without rounding in between. */
    private static double inSi(String word, String quantity) {
        number(word);
        final int power = quantity.contains("MPa") ? 6 : quantity.contains("kJ") ? 3 : 0;
        return new BigDecimal(word).scaleByPowerOfTen(power).doubleValue();
    }

    /** {@return the number of terms} */
    int size() {
        return rows.size();
    }

    /** {@return the coefficient of a term, the last column} @param term from 0 */
    double coefficient(int term) {
        return rows.get(term)[columns - 1];
    }

    /**
     * {@return an integer exponent of a term}
     *
     * @param term from 0
     * @param argument 0 or 1
     * @param parts parts of one that the exponent counts in; 4 for quarters
     */
    int exponent(int term, int argument, int parts) {
        final double exponent = rows.get(term)[argument] * parts;
        if (exponent != Math.rint(exponent)) {
            throw new IllegalStateException("resource " + file + ", term " + (term + 1) + ": exponent "
                    + rows.get(term)[argument] + " is no multiple of 1/" + parts);
        }
        return (int) exponent;
    }

    /** {@return the parts of one that the exponents of the first argument count in: 1 or 4} */
    int firstParts() {
        return rows.stream().allMatch(row -> row[0] == Math.rint(row[0])) ? 1 : 4;
    }

    /** {@return an argument of the sum} @param index 0 or 1 */
    Argument argument(int index) {
        if (index >= arguments.size()) {
            throw new IllegalStateException("resource " + file + " has no argument " + (index + 1));
        }
        return arguments.get(index);
    }

    /** {@return the result} */
    Result result() {
        if (result == null) {
            throw new IllegalStateException("resource " + file + " has no line \"result\"");
        }
        return result;
    }

    /** {@return a constant, in SI} @param name its name in the file */
    double constant(String name) {
        final Double value = constants.get(name);
        if (value == null) {
            throw new IllegalStateException("resource " + file + " has no constant " + name);
        }
        return value;
    }
}
