package lostwork.examples.audit;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.OutputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.function.DoubleUnaryOperator;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * The bundled example against a calculation that shares nothing with the library: molar heat capacities as cubic
 * polynomials (B. G. Kyle, Chemical and Process Thermodynamics, 1984, as reprinted in Y. A. Cengel and M. A. Boles,
 * Thermodynamics, table A-2c; from memory; stated error up to 0.7 %), stoichiometry by hand, saturated-water values of
 * table A-4 of the same book (from memory), and quadrature by the midpoint rule.
 *
 * <p>Tolerance: 1 %, the stated error of the polynomials and the reading of the tables.
 */
class GlassworksByHandTest {
    private static final double TOLERANCE = 0.01;
    private static final double T0 = 285.15;
    private static final double AIR_OXYGEN = 0.2095;
    private static final double AIR_ARGON = 0.0093;
    private static final double AIR_NITROGEN = 1 - AIR_OXYGEN - AIR_ARGON;
    /** Moles of vapour per mole of dry air at 12 °C, 70 %: saturation pressure 1.4028 kPa (table A-4), 101.3 kPa. */
    private static final double AIR_VAPOUR = 0.7 * 1.4028 / (101.3 - 0.7 * 1.4028);

    private static final double MOLES_PER_SECOND_OF_NORMAL_CUBIC_METRE_PER_HOUR = 1000 / 22.414 / 3600;

    @TempDir
    static Path folder;

    private static final Map<String, String[]> ROWS = new HashMap<>();

    /** Heat, most work and likely work in kW. */
    private record Hand(double heat, double most, double likely) {}

    /** A gas in moles; only the proportions matter. */
    private record Gas(double n2, double ar, double o2, double co2, double h2o) {
        double total() {
            return n2 + ar + o2 + co2 + h2o;
        }

        double kilogramsPerMole() {
            return (28.013 * n2 + 39.948 * ar + 31.999 * o2 + 44.010 * co2 + 18.015 * h2o) / total() / 1000;
        }

        /** J/(mol K), table A-2c. */
        double heatCapacity(double t) {
            final double ofN2 = 28.90 + t * (-0.1571e-2 + t * (0.8081e-5 - t * 2.873e-9));
            final double ofO2 = 25.48 + t * (1.520e-2 + t * (-0.7155e-5 + t * 1.312e-9));
            final double ofCo2 = 22.26 + t * (5.981e-2 + t * (-3.501e-5 + t * 7.469e-9));
            final double ofH2o = 32.24 + t * (0.1923e-2 + t * (1.055e-5 - t * 3.595e-9));
            final double ofArgon = 20.786;
            return (n2 * ofN2 + ar * ofArgon + o2 * ofO2 + co2 * ofCo2 + h2o * ofH2o) / total();
        }
    }

    @BeforeAll
    static void runsTheProgram() throws Exception {
        final PrintStream nowhere = new PrintStream(OutputStream.nullOutputStream(), true, StandardCharsets.UTF_8);
        assertEquals(0, new AuditProgram(nowhere, nowhere, () -> 0L).run("--out", folder.toString()));
        final List<String> lines = Files.readAllLines(folder.resolve("streams.csv"));
        for (String line : lines.subList(1, lines.size())) {
            final String[] cells = line.replaceAll("\"[^\"]*\"", "quoted").split(",", -1);
            ROWS.put(cells[1].substring(0, cells[1].indexOf(' ')), cells);
        }
        assertEquals(11, ROWS.size());
    }

    private static Hand gas(Gas gas, double molesPerSecond, double hot, double cold) {
        final DoubleUnaryOperator rate = t -> molesPerSecond * gas.heatCapacity(t) / 1000;
        return cooled(rate, hot, cold);
    }

    private static Hand cooled(DoubleUnaryOperator kilowattsPerKelvin, double hot, double cold) {
        final int slices = 2000;
        final double step = (hot - cold) / slices;
        double heat = 0;
        double most = 0;
        double likely = 0;
        for (int i = 0; i < slices; i++) {
            final double t = cold + 273.15 + (i + 0.5) * step;
            final double slice = kilowattsPerKelvin.applyAsDouble(t) * step;
            heat += slice;
            most += slice * (1 - T0 / t);
            likely += slice * (1 - Math.sqrt(T0 / t));
        }
        return new Hand(heat, most, likely);
    }

    private static Hand water(double kilogramsPerSecond, double hot, double cold, double riseOfEnthalpy) {
        return cooled(t -> kilogramsPerSecond * riseOfEnthalpy / (hot - cold), hot, cold);
    }

    /** One mole of natural gas (CH4 93, C2H6 4, N2 2, CO2 1 %) burnt with so much times the least air. */
    private static Gas burnt(double airRatio) {
        final double leastOxygen = 0.93 * 2 + 0.04 * 3.5;
        final double air = leastOxygen * airRatio / AIR_OXYGEN;
        return new Gas(
                0.02 + air * AIR_NITROGEN,
                air * AIR_ARGON,
                leastOxygen * (airRatio - 1),
                0.93 + 0.04 * 2 + 0.01,
                0.93 * 2 + 0.04 * 3 + air * AIR_VAPOUR);
    }

    /** The air ratio that leaves a share of oxygen in the dry gas, by halving. */
    private static double airRatio(double oxygenInDryGas) {
        double low = 1;
        double high = 20;
        for (int i = 0; i < 60; i++) {
            final double middle = (low + high) / 2;
            final Gas gas = burnt(middle);
            if (gas.o2() / (gas.total() - gas.h2o()) < oxygenInDryGas) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return low;
    }

    private static Gas air(double vapourPerDryAir) {
        return new Gas(AIR_NITROGEN, AIR_ARGON, AIR_OXYGEN, 0, vapourPerDryAir);
    }

    private static double moles(double tonnesPerHour, Gas gas) {
        return tonnesPerHour / 3.6 / gas.kilogramsPerMole();
    }

    private static Map<String, Hand> byHand() {
        final Map<String, Hand> hand = new HashMap<>();
        final double normal = MOLES_PER_SECOND_OF_NORMAL_CUBIC_METRE_PER_HOUR;
        hand.put("G1", gas(burnt(airRatio(0.085)), 42000 * normal, 465, 180));
        hand.put("G2", gas(burnt(1.35), moles(3.1, burnt(1.35)), 890, 200));
        hand.put("G3", gas(air(AIR_VAPOUR), moles(28, air(AIR_VAPOUR)), 215, 60));
        hand.put("G4", gas(air(AIR_VAPOUR), moles(65, air(AIR_VAPOUR)), 78, 40));
        hand.put("G5", gas(air(0), 36000 * normal, 68, 35));
        // Table A-4, kJ/kg: 40 °C 167.53, 45 °C 188.44, 60 °C 251.18, 72 °C 301.44, 88 °C 368.60, 179 °C 758.64 (the
        // last three between neighbours); 19 m³/h at 72 °C with 0.001024 m³/kg.
        hand.put("G6", water(19 / 3600.0 / 0.001024, 72, 45, 301.44 - 188.44));
        hand.put("G7", water(55 / 3.6, 88, 60, 368.60 - 251.18));
        hand.put("G8", water(1.2 / 3.6, 179, 40, 758.64 - 167.53));
        final Gas humid = air(0.095 * 28.97 / 18.015);
        hand.put("G9", gas(humid, moles(9.5, humid), 112, 60));
        final Gas mixture = new Gas(73.1, 0, 5.0, 9.6, 12.3);
        hand.put("G10", gas(mixture, moles(6.4, mixture), 240, 150));
        hand.put("G11", new Hand(0, 0, 0));
        return hand;
    }

    @Test
    void everyStreamAgrees() {
        byHand().forEach((tag, hand) -> {
            assertClose(tag + " heat", hand.heat(), column(tag, "heat rejected in kW"));
            assertClose(tag + " most work", hand.most(), column(tag, "most work in kW"));
            assertClose(tag + " likely work", hand.likely(), column(tag, "likely work in kW"));
        });
    }

    @Test
    void theTotalsOfTheReportAgree() throws Exception {
        double heat = 0;
        double most = 0;
        double likely = 0;
        for (Hand hand : byHand().values()) {
            heat += hand.heat();
            most += hand.most();
            likely += hand.likely();
        }
        final List<String> totals = Files.readAllLines(folder.resolve("report.txt")).stream()
                .filter(line -> line.contains("All streams"))
                .map(String::strip)
                .toList();
        final String[] first = totals.get(0).split("\\s+");
        assertClose("heat", heat, Double.parseDouble(first[2]));
        assertClose("most work", most, Double.parseDouble(first[5]));
        assertClose("quality", 100 * most / heat, Double.parseDouble(first[4]));
        assertClose("likely work", likely, Double.parseDouble(totals.get(1).split("\\s+")[2]));
    }

    private static void assertClose(String what, double expected, double actual) {
        assertEquals(expected, actual, TOLERANCE * Math.abs(expected), what);
    }

    private static double column(String tag, String heading) {
        try {
            final String[] headings =
                    Files.readAllLines(folder.resolve("streams.csv")).get(0).split(",");
            return Double.parseDouble(ROWS.get(tag)[List.of(headings).indexOf(heading)]);
        } catch (java.io.IOException e) {
            throw new java.io.UncheckedIOException(e);
        }
    }
}
