package lostwork.exergy;

import static lostwork.quantity.Power.kilowatts;
import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.Pressure.mbar;
import static lostwork.quantity.Ratio.percent;
import static lostwork.quantity.Temperature.celsius;
import static lostwork.quantity.Temperature.kelvin;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.ObjectInputStream;
import java.io.ObjectOutputStream;
import lostwork.quantity.Energy;
import lostwork.quantity.Length;
import lostwork.quantity.MassFlow;
import lostwork.quantity.OutOfRangeException;
import lostwork.quantity.Power;
import lostwork.quantity.Pressure;
import lostwork.quantity.Ratio;
import lostwork.quantity.SpecificEnergy;
import lostwork.quantity.SpecificVolume;
import lostwork.quantity.Temperature;
import lostwork.quantity.Units;
import lostwork.quantity.Volume;
import lostwork.testing.PrintedValue;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class ReferenceEnvironmentTest {
    private static final ReferenceEnvironment SITE =
            ReferenceEnvironment.of(celsius(12), mbar(1013)).withRelativeHumidity(percent(70));

    /** The first program a user writes: exergy of a stream of rejected heat, with a perfect gas in place of flue gas. */
    @Test
    void streamOfRejectedHeat() {
        final var hot = PerfectGasState.air(celsius(412).inKelvin(), mbar(1011).inPascal());
        final var cold = PerfectGasState.air(celsius(160).inKelvin(), mbar(1009).inPascal());
        final var flow = MassFlow.tonnesPerHour(86);

        final Power heat = flow.times(hot.enthalpy().minus(cold.enthalpy()));
        final Power exergy = SITE.flowExergy(hot).minus(SITE.flowExergy(cold)).times(flow);
        final Ratio quality = exergy.over(heat);

        // By hand: q = 1005 * 252 J/kg; ds = 1005 ln(685.15/433.15) - 287 ln(1011/1009) J/(kg K).
        final double q = 1005 * 252;
        final double ds = 1005 * Math.log(685.15 / 433.15) - 287 * Math.log(1011.0 / 1009.0);
        assertEquals(86 / 3.6 * q * 1e-6, heat.in(Units.MEGAWATT), 1e-12 * q);
        assertEquals((q - 285.15 * ds) / q, quality.inFraction(), 1e-12);
        assertTrue(quality.inPercent() > 45 && quality.inPercent() < 50, quality::toString);
    }

    @Test
    void nothingIsLeftAtTheDeadState() {
        final var dead = PerfectGasState.air(celsius(12).inKelvin(), mbar(1013).inPascal());
        assertEquals(0, SITE.flowExergy(dead).si());
        assertEquals(0, SITE.closedMassExergy(dead).si());
        assertEquals(0, SITE.flowExergyParts(dead).thermal().si());
        assertEquals(0, SITE.flowExergyParts(dead).mechanical().si());
        assertEquals(0, SITE.carnotFactor(celsius(12)).si());
        assertEquals(0, SITE.heatExergy(kilowatts(500), celsius(12)).si());
        assertEquals(0, SITE.radiationFactor(celsius(12)).si());
        assertEquals(
                0,
                SITE.carnotFactor(TemperatureGlide.between(celsius(12), celsius(12)))
                        .si());
    }

    @Test
    void heatBelowAmbientCarriesExergyBackwards() {
        // 100 kW taken from a room at -20 °C: the heat leaves the room, 12.6 kW of exergy enter it.
        final Power exergy = SITE.heatExergy(kilowatts(100), celsius(-20));
        assertEquals(100 * (1 - 285.15 / 253.15), exergy.inKilowatts(), 1e-12);
        assertTrue(exergy.si() < 0);
        // The least power of a refrigerator for it is the same number.
        assertEquals(
                -exergy.inKilowatts(),
                100 / Carnot.refrigeratorCop(celsius(12), celsius(-20)).si(),
                1e-12);
    }

    @Test
    void partsOfAFlow() {
        final var vacuum = PerfectGasState.air(400, 0.2e5);
        final FlowExergy parts = SITE.flowExergyParts(vacuum);
        assertEquals(287 * 285.15 * Math.log(0.2 / 1.013), parts.mechanical().si(), 1e-6);
        assertEquals(
                1005 * (400 - 285.15 - 285.15 * Math.log(400 / 285.15)),
                parts.thermal().si(),
                1e-6);
        assertEquals(SITE.flowExergy(vacuum).si(), parts.total().si(), 1e-8);
        assertTrue(parts.mechanical().si() < 0 && parts.thermal().si() > 0);
    }

    @Test
    void workAgainstTheAtmosphereIsNoExergy() {
        final Energy work = SITE.workExergy(Energy.kilojoules(500), Volume.cubicMetres(2));
        assertEquals(500 - 101.3 * 2, work.inKilojoules(), 1e-9);
        final SpecificEnergy specific =
                SITE.workExergy(SpecificEnergy.kilojoulesPerKilogram(500), SpecificVolume.cubicMetresPerKilogram(-2));
        assertEquals(500 + 101.3 * 2, specific.inKilojoulesPerKilogram(), 1e-9);
        assertEquals(98.0665, SITE.potentialExergy(Length.metres(10)).si(), 1e-12);
    }

    @Test
    void radiationHasExergyOnBothSidesOfAmbient() {
        final var environment = ReferenceEnvironment.of(kelvin(300), bar(1));
        for (final double t : new double[] {10, 100, 250, 299.9, 300.1, 400, 6000}) {
            final double tau = 300 / t;
            final double petela = 1 - 4.0 / 3 * tau + Math.pow(tau, 4) / 3;
            final double factor = environment.radiationFactor(kelvin(t)).si();
            assertEquals(petela, factor, 1e-15 * Math.max(1, Math.pow(tau, 4)));
            assertTrue(factor > 0, () -> "at " + t + " K: " + factor);
        }
        assertTrue(environment.radiationFactor(kelvin(180)).si() > 1);
        assertTrue(environment.radiationFactor(kelvin(200)).si() < 1);
    }

    @Test
    void absoluteZeroAndVacuumAreClearErrors() {
        final OutOfRangeException e =
                assertThrows(OutOfRangeException.class, () -> SITE.carnotFactor(Temperature.kelvin(0)));
        assertTrue(e.getMessage().contains("absolute zero"), e.getMessage());
        final IllegalArgumentException vacuum = assertThrows(
                IllegalArgumentException.class, () -> ReferenceEnvironment.of(celsius(12), Pressure.pascal(0)));
        assertTrue(vacuum.getMessage().contains("vacuum"), vacuum.getMessage());
        // Towards 0 K the factors grow without bound, but stay numbers as far as doubles reach.
        assertEquals(-285.15e9, SITE.carnotFactor(kelvin(1e-9)).si(), 1);
        assertThrows(OutOfRangeException.class, () -> SITE.carnotFactor(kelvin(Double.MIN_VALUE)));
    }

    @Test
    void whatIsNotStatedIsNotAssumed() {
        final var bare = ReferenceEnvironment.of(celsius(12), mbar(1013));
        assertTrue(bare.relativeHumidity().isEmpty() && bare.dryAir().isEmpty());
        final IncompleteEnvironmentException humidity =
                assertThrows(IncompleteEnvironmentException.class, bare::waterVapourPressure);
        assertTrue(humidity.getMessage().contains("withRelativeHumidity"), humidity.getMessage());
        final IncompleteEnvironmentException air = assertThrows(IncompleteEnvironmentException.class, SITE::atmosphere);
        assertTrue(air.getMessage().contains("withDryAir"), air.getMessage());
    }

    @Test
    void humidityIsBounded() {
        final OutOfRangeException e =
                assertThrows(OutOfRangeException.class, () -> SITE.withRelativeHumidity(percent(101)));
        assertEquals("relative humidity", e.quantity());
        assertThrows(OutOfRangeException.class, () -> SITE.withRelativeHumidity(percent(-1)));
        final var kiln = ReferenceEnvironment.of(celsius(120), bar(1)).withRelativeHumidity(percent(100));
        assertThrows(OutOfRangeException.class, kiln::waterVapourPressure); // saturation at 120 °C is 1.987 bar
        final var moon = ReferenceEnvironment.of(kelvin(100), bar(1)).withRelativeHumidity(percent(50));
        assertThrows(OutOfRangeException.class, moon::waterVapourPressure);
        assertEquals(
                0, moon.withRelativeHumidity(percent(0)).waterVapourPressure().si());
    }

    @Test
    void humidAtmosphere() {
        final AirComposition dry = AirComposition.standardAtmosphere1976();
        final AirComposition humid = SITE.withDryAir(dry).atmosphere();
        final double vapour = SITE.waterVapourPressure().over(SITE.pressure()).si();
        assertEquals(vapour, humid.moleFraction(AtmosphericGas.WATER).si(), 1e-15);
        for (final AtmosphericGas gas : dry.gases()) {
            assertEquals(
                    dry.moleFraction(gas).si() * (1 - vapour),
                    humid.moleFraction(gas).si(),
                    1e-15);
        }
        assertEquals(
                1,
                humid.gases().stream()
                        .mapToDouble(g -> humid.moleFraction(g).si())
                        .sum(),
                1e-15);
        assertEquals(
                SITE.waterVapourPressure().si(),
                SITE.withDryAir(dry).partialPressure(AtmosphericGas.WATER).si(),
                1e-9);
        final ReferenceEnvironment back =
                ReferenceEnvironment.of(celsius(12), mbar(1013)).withAtmosphere(humid);
        assertEquals(70, back.relativeHumidity().orElseThrow().inPercent(), 1e-11);
        assertThrows(IllegalArgumentException.class, () -> SITE.withDryAir(humid));
    }

    /** IAPWS SR1-86(1992), table 1, and R14-08(2011), computer-program check at 230 K; digits from memory. */
    @ParameterizedTest
    @CsvSource({"273.16, 611.657", "373.1243, 101325", "230, 8.94735"})
    void saturationPressureOfWater(double kelvin, String pascal) {
        final var saturated = ReferenceEnvironment.of(kelvin(kelvin), bar(2)).withRelativeHumidity(percent(100));
        PrintedValue.of(pascal).assertMatches(saturated.waterVapourPressure().inPascal(), "T = " + kelvin + " K");
    }

    /**
     * The same against other formulations: IAPWS R7-97(2012), equation 30, table 35 (300 K and 500 K, within 0.02 %), and over
     * ice 103.24 Pa at -20 °C (ASHRAE Handbook Fundamentals after Hyland and Wexler 1983, from memory, within 0.03 %).
     */
    @ParameterizedTest
    @CsvSource({"300, 3536.58941, 2e-4", "500, 2638897.76, 2e-4", "253.15, 103.24, 3e-4"})
    void saturationPressureByOtherFormulations(double kelvin, double pascal, double share) {
        final var saturated = ReferenceEnvironment.of(kelvin(kelvin), bar(50)).withRelativeHumidity(percent(100));
        assertEquals(pascal, saturated.waterVapourPressure().inPascal(), share * pascal);
    }

    @Test
    void equalityTextAndSerialForm() throws IOException, ClassNotFoundException {
        assertEquals("12 °C, 1.013 bar, relative humidity 70.00 %", SITE.toString());
        final var full = SITE.withDryAir(AirComposition.szargut1988().dry());
        assertEquals(full, SITE.withDryAir(AirComposition.szargut1988().dry()));
        assertEquals(
                full.hashCode(),
                SITE.withDryAir(AirComposition.szargut1988().dry()).hashCode());
        assertNotEquals(full, SITE);
        assertNotEquals(SITE, ReferenceEnvironment.of(celsius(12), mbar(1013)));
        assertEquals(full, copy(full));
        assertEquals(SITE, copy(SITE));
        final TemperatureGlide glide = TemperatureGlide.between(celsius(100), celsius(40));
        assertEquals(glide, copy(glide));
        assertTrue(full.toString().contains("dry air N2 0.7"), full::toString);
    }

    private static Object copy(Object original) throws IOException, ClassNotFoundException {
        final var bytes = new ByteArrayOutputStream();
        try (var out = new ObjectOutputStream(bytes)) {
            out.writeObject(original);
        }
        try (var in = new ObjectInputStream(new ByteArrayInputStream(bytes.toByteArray()))) {
            return in.readObject();
        }
    }
}
