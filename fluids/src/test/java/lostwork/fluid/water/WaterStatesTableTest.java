package lostwork.fluid.water;

import static lostwork.quantity.Pressure.megapascal;
import static lostwork.quantity.Temperature.celsius;
import static lostwork.quantity.Temperature.kelvin;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.params.provider.Arguments.arguments;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.nio.charset.StandardCharsets;
import java.util.stream.Stream;
import lostwork.fluid.FluidModel;
import lostwork.fluid.FluidState;
import lostwork.fluid.PhaseSide;
import lostwork.fluid.StatePoint;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** Saturated, superheated and compressed states against an independent evaluation and against a textbook. */
class WaterStatesTableTest {
    private static final FluidModel MODEL = Water.industrial().model();

    static Stream<Arguments> rows() throws IOException {
        try (InputStream stream = WaterStatesTableTest.class.getResourceAsStream("if97-states.tsv")) {
            assertNotNull(stream);
            return new BufferedReader(new InputStreamReader(stream, StandardCharsets.UTF_8))
                            .lines()
                            .filter(line -> !line.startsWith("#"))
                            .map(line -> arguments((Object) line.split("\t")))
                            .toList()
                            .stream();
        }
    }

    @ParameterizedTest
    @MethodSource("rows")
    void agreesWithAnIndependentEvaluation(String[] row) {
        final double temperature = Double.parseDouble(row[1]);
        final double pressure = Double.parseDouble(row[2]) * 1e6;
        for (final PhaseSide side : PhaseSide.values()) {
            final int column = side == PhaseSide.LIQUID ? 3 : 4;
            if (row[column].equals("-")) {
                continue;
            }
            final StatePoint point = new StatePoint();
            switch (row[0]) {
                case "saturation(t)" -> MODEL.saturatedAtTemperature(temperature, side, point);
                case "saturation(p)" -> MODEL.saturatedAtPressure(pressure, side, point);
                default -> MODEL.atTemperaturePressure(temperature, pressure, point);
            }
            final String where = String.join(" ", row) + " " + side;
            matches(row[column], 8, point.volume, where);
            matches(row[column + 2], 8, point.enthalpy / 1e3, where);
            matches(row[column + 4], 7, point.entropy / 1e3, where);
            matches(row[1], 6, point.temperature, where);
            matches(row[2], 8, point.pressure / 1e6, where);
        }
    }

    /** Half a unit of the last digit of a print that drops trailing zeros, and rounding where large terms cancel to 0. */
    private static void matches(String printed, int digits, double actual, String where) {
        final double value = Double.parseDouble(printed);
        final double lastDigit = value == 0 ? 0 : Math.pow(10, Math.floor(Math.log10(Math.abs(value))) + 1 - digits);
        assertEquals(value, actual, lastDigit / 2 + 1e-12, where);
    }

    /**
     * Throttling of steam from 3 MPa, 320 °C to 0.5 MPa against an environment at 298 K: M. J. Moran and H. N. Shapiro,
     * Fundamentals of Engineering Thermodynamics, chapter 7, example 7.5 (from memory): flow exergies 1073.89 and
     * 836.15 kJ/kg, exergy destruction 237.7 kJ/kg. The book's older steam tables leave up to 0.4 kJ/kg; 1 kJ/kg allowed.
     */
    @Test
    void throttlingOfSteam() {
        final Water water = Water.industrial();
        final FluidState inlet = water.state(celsius(320), megapascal(3));
        final FluidState outlet = water.state(megapascal(0.5), inlet.enthalpy());
        final FluidState dead = water.saturation(celsius(25)).liquid();
        assertEquals(1073.89, exergy(inlet, dead), 1);
        assertEquals(836.15, exergy(outlet, dead), 1);
        assertEquals(237.7, exergy(inlet, dead) - exergy(outlet, dead), 1);
    }

    private static double exergy(FluidState state, FluidState dead) {
        final double dh =
                state.enthalpy().inKilojoulesPerKilogram() - dead.enthalpy().inKilojoulesPerKilogram();
        final double ds =
                state.entropy().inKilojoulesPerKilogramKelvin() - dead.entropy().inKilojoulesPerKilogramKelvin();
        return dh - 298 * ds;
    }

    /**
     * Ideal reheat cycle 15 MPa and 600 °C, 4 MPa and 600 °C, 10 kPa: Y. A. Cengel and M. A. Boles, Thermodynamics,
     * chapter 10, example 10-4 (from memory): thermal efficiency 45.0 %, vapour fraction behind the turbine 0.896. Tolerance:
     * the last printed digit and the difference between steam tables.
     */
    @Test
    void idealReheatCycle() {
        final Water water = Water.industrial();
        final FluidState live = water.state(celsius(600), megapascal(15));
        final FluidState cold = water.state(megapascal(4), live.entropy());
        final FluidState hot = water.state(celsius(600), megapascal(4));
        final FluidState exhaust = water.state(megapascal(0.01), hot.entropy());
        final FluidState condensate = water.saturation(megapascal(0.01)).liquid();
        final FluidState feed = water.state(megapascal(15), condensate.entropy());
        final double heat = h(live) - h(feed) + h(hot) - h(cold);
        final double rejected = h(exhaust) - h(condensate);
        assertEquals(45.0, 100 * (1 - rejected / heat), 0.1);
        assertEquals(0.896, exhaust.vapourFraction().orElseThrow().inFraction(), 0.001);
    }

    private static double h(FluidState state) {
        return state.enthalpy().inKilojoulesPerKilogram();
    }

    /** R7-97(2012), section 3: u' = 0 and s' = 0 at the triple point; the equations give them to about 1e-7. */
    @Test
    void datumIsTheLiquidAtTheTriplePoint() {
        final FluidState liquid = Water.industrial().saturation(kelvin(273.16)).liquid();
        assertEquals(0, liquid.internalEnergy().inKilojoulesPerKilogram(), 1e-6);
        assertEquals(0, liquid.entropy().inKilojoulesPerKilogramKelvin(), 1e-7);
        assertEquals(611.657, liquid.pressure().inPascal(), 6e-4);
    }

    /**
     * Water vapour as an ideal gas at 298.15 K and 1 bar, reached from the liquid's formation data by evaporation:
     * -241.826 +- 0.040 kJ/mol and 188.835 +- 0.010 J/(mol K), CODATA Key Values for Thermodynamics (1989), from memory. The
     * liquid's own uncertainties there, 0.040 kJ/mol and 0.03 J/(mol K), are allowed.
     */
    @Test
    void evaporationJoinsTheFormationDataOfLiquidAndGas() {
        final StatePoint vapour = new StatePoint();
        MODEL.atTemperaturePressure(298.15, 1, vapour);
        final double enthalpy = (vapour.enthalpy + MODEL.enthalpyFromElements()) * MODEL.molarMass();
        assertEquals(-241_826, enthalpy, 40);
        final double entropy = (vapour.entropy + MODEL.entropyFromAbsoluteZero()) * MODEL.molarMass()
                + 8.31446261815324 * Math.log(1 / 1e5);
        assertEquals(188.835, entropy, 0.04);
    }
}
