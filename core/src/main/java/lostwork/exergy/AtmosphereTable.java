package lostwork.exergy;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.EnumMap;
import java.util.Map;

/** Reads the tables of atmospheric gases: a formula, a tab, a number; {@code #} begins a comment line. */
final class AtmosphereTable {
    private AtmosphereTable() {}

    static Map<AtmosphericGas, Double> read(String file) {
        try (InputStream in = AtmosphereTable.class.getResourceAsStream(file)) {
            if (in == null) {
                throw new IllegalStateException("data file " + file + " is missing from the library");
            }
            return parse(file, new BufferedReader(new InputStreamReader(in, StandardCharsets.UTF_8)));
        } catch (IOException e) {
            throw new UncheckedIOException("data file " + file + " cannot be read", e);
        }
    }

    static Map<AtmosphericGas, Double> parse(String file, BufferedReader reader) throws IOException {
        final Map<AtmosphericGas, Double> table = new EnumMap<>(AtmosphericGas.class);
        int number = 0;
        for (String line = reader.readLine(); line != null; line = reader.readLine()) {
            number++;
            if (line.isBlank() || line.startsWith("#")) {
                continue;
            }
            final String[] fields = line.split("\t", -1);
            if (fields.length != 2) {
                throw bad(file, number, "a formula, a tab and a number are expected");
            }
            final double value;
            try {
                value = Double.parseDouble(fields[1]);
            } catch (NumberFormatException e) {
                throw bad(file, number, "'" + fields[1] + "' is no number");
            }
            if (!(value > 0 && value < Double.POSITIVE_INFINITY)) {
                throw bad(file, number, "the value must be above 0");
            }
            if (table.put(gas(file, number, fields[0]), value) != null) {
                throw bad(file, number, fields[0] + " occurs twice");
            }
        }
        return table;
    }

    private static AtmosphericGas gas(String file, int number, String formula) {
        for (final AtmosphericGas gas : AtmosphericGas.values()) {
            if (gas.formula().equals(formula)) {
                return gas;
            }
        }
        throw bad(file, number, "'" + formula + "' is no gas of the atmosphere");
    }

    private static IllegalStateException bad(String file, int number, String reason) {
        return new IllegalStateException("data file " + file + ", line " + number + ": " + reason);
    }
}
