package lostwork.fluid.water;

import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.params.provider.Arguments.arguments;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import lostwork.fluid.FluidModel;
import lostwork.fluid.Phase;
import lostwork.fluid.StatePoint;
import lostwork.testing.PrintedValue;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Every printed check value of the releases of IAPWS-IF97 that belongs to what is built.
 *
 * <ul>
 *   <li><b>Source:</b> the release and table named in each line of {@code if97-checks.tsv}.
 *   <li><b>Tolerance:</b> half a unit of the last printed digit, and 1e-12 relative for our own arithmetic.
 *   <li><b>Independent of the code:</b> yes; the digits were written down from memory of the releases before the code.
 * </ul>
 */
class If97TableTest {
    private static final FluidModel MODEL = Water.industrial().model();
    private static final If97Saturation SATURATION =
            new If97Saturation(CoefficientTable.read("if97/r7-97-table-34-region4.txt"));
    private static final If97Boundary BOUNDARY_23 =
            new If97Boundary(CoefficientTable.read("if97/r7-97-table-01-b23.txt"));
    private static final If97Region3 REGION_3 =
            new If97Region3(CoefficientTable.read("if97/r7-97-table-30-region3.txt"));
    private static final If97Starts STARTS = new If97Starts();
    private static final Map<String, String> FILES = Map.ofEntries(
            Map.entry("T1_ph", "r7-97-table-06-t1-ph"),
            Map.entry("T1_ps", "r7-97-table-08-t1-ps"),
            Map.entry("T2a_ph", "r7-97-table-20-t2a-ph"),
            Map.entry("T2b_ph", "r7-97-table-21-t2b-ph"),
            Map.entry("T2c_ph", "r7-97-table-22-t2c-ph"),
            Map.entry("T2a_ps", "r7-97-table-25-t2a-ps"),
            Map.entry("T2b_ps", "r7-97-table-26-t2b-ps"),
            Map.entry("T2c_ps", "r7-97-table-27-t2c-ps"),
            Map.entry("p1_hs", "sr2-01-table-02-p1-hs"),
            Map.entry("p2a_hs", "sr2-01-table-06-p2a-hs"),
            Map.entry("p2b_hs", "sr2-01-table-07-p2b-hs"),
            Map.entry("p2c_hs", "sr2-01-table-08-p2c-hs"),
            Map.entry("T3a_ph", "sr3-03-table-03-t3a-ph"),
            Map.entry("T3b_ph", "sr3-03-table-04-t3b-ph"),
            Map.entry("v3a_ph", "sr3-03-table-06-v3a-ph"),
            Map.entry("v3b_ph", "sr3-03-table-07-v3b-ph"),
            Map.entry("T3a_ps", "sr3-03-table-10-t3a-ps"),
            Map.entry("T3b_ps", "sr3-03-table-11-t3b-ps"),
            Map.entry("v3a_ps", "sr3-03-table-13-v3a-ps"),
            Map.entry("v3b_ps", "sr3-03-table-14-v3b-ps"),
            Map.entry("p3sat_h", "sr3-03-table-17-p3sat-h"),
            Map.entry("p3sat_s", "sr3-03-table-19-p3sat-s"),
            Map.entry("p3a_hs", "sr4-04-table-03-p3a-hs"),
            Map.entry("p3b_hs", "sr4-04-table-04-p3b-hs"),
            Map.entry("h1sat_s", "sr4-04-table-09-h1sat-s"),
            Map.entry("h3asat_s", "sr4-04-table-10-h3asat-s"),
            Map.entry("h2absat_s", "sr4-04-table-16-h2absat-s"),
            Map.entry("h2c3bsat_s", "sr4-04-table-17-h2c3bsat-s"),
            Map.entry("hB13_s", "sr4-04-table-23-hb13-s"),
            Map.entry("TB23_hs", "sr4-04-table-25-tb23-hs"),
            Map.entry("Tsat_hs", "sr4-04-table-28-tsat-hs"));
    private static final Workspace SPACE = Workspace.ofThread();

    static Stream<Arguments> checks() throws IOException {
        try (InputStream stream = If97TableTest.class.getResourceAsStream("if97-checks.tsv")) {
            assertNotNull(stream);
            final List<String> lines = new BufferedReader(new InputStreamReader(stream, StandardCharsets.UTF_8))
                    .lines()
                    .toList();
            return lines.stream()
                    .filter(line -> !line.startsWith("#") && !line.startsWith("equation\t"))
                    .map(line -> arguments((Object[]) line.split("\t")))
                    .toList()
                    .stream();
        }
    }

    @ParameterizedTest(name = "{0}, {1} {2}: {4} at {3}")
    @MethodSource("checks")
    void reproducesEveryPrintedDigit(
            String equation,
            String document,
            String table,
            String inputs,
            String quantity,
            String unit,
            String printed) {
        final Map<String, Double> in = new HashMap<>();
        for (String input : inputs.split(";")) {
            final String[] pair = input.split("=");
            in.put(pair[0], Double.parseDouble(pair[1]) * unit(pair[0]));
        }
        final double actual = compute(equation, in, quantity) / unit(quantity);
        PrintedValue.of(printed).assertMatches(actual, document + " " + table + ", " + inputs);
    }

    private static double unit(String quantity) {
        return switch (quantity) {
            case "p" -> 1e6;
            case "h", "s", "u", "cp" -> 1e3;
            default -> 1;
        };
    }

    private static double compute(String equation, Map<String, Double> in, String quantity) {
        return switch (equation) {
            case "region1", "region2", "region5" -> {
                final StatePoint point = new StatePoint();
                MODEL.atTemperaturePressure(in.get("T"), in.get("p"), point);
                yield property(point, quantity);
            }
            case "region3" -> {
                final StatePoint point = new StatePoint();
                REGION_3.evaluate(in.get("rho"), in.get("T"), Phase.SUPERCRITICAL, SPACE, point);
                yield property(point, quantity);
            }
            case "region4_psat" -> SATURATION.pressure(in.get("T"));
            case "region4_Tsat" -> SATURATION.temperature(in.get("p"));
            case "B23_p" -> BOUNDARY_23.pressure(in.get("T"));
            case "B23_T" -> BOUNDARY_23.temperature(in.get("p"));
            case "B2bc_p" -> STARTS.pressure2bc(in.get("h"));
            case "B2bc_h" -> STARTS.enthalpy2bc(in.get("p"));
            case "h2ab_s" -> STARTS.enthalpy2ab(in.get("s"));
            case "h3ab_p" -> STARTS.enthalpy3ab(in.get("p"));
            default -> explicit(equation, in);
        };
    }

    private static double explicit(String equation, Map<String, Double> in) {
        final String file = FILES.get(equation);
        assertNotNull(file, "no equation " + equation);
        final CoefficientTable table = CoefficientTable.read("if97/" + file + ".txt");
        final String first = table.argument(0).quantity().replace("1/", "").split("_")[0];
        final String second = table.argument(1).quantity().split("_")[0];
        return BackwardEquation.read(file).value(in.get(first), in.get(second), SPACE);
    }

    private static double property(StatePoint point, String quantity) {
        return switch (quantity) {
            case "v" -> point.volume;
            case "h" -> point.enthalpy;
            case "u" -> point.internalEnergy();
            case "s" -> point.entropy;
            case "cp" -> point.heatCapacity;
            case "w" -> point.speedOfSound();
            case "p" -> point.pressure;
            default -> throw new AssertionError(quantity);
        };
    }
}
