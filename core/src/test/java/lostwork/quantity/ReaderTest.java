package lostwork.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertSame;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** What the reader takes, and what it refuses because it could be misread. */
class ReaderTest {
    private static String refusal(QuantityKind<?, ?> kind, String text) {
        return assertThrows(UnreadableQuantityException.class, () -> kind.parse(text), text)
                .getMessage();
    }

    @Test
    void readsNumbersWithUnits() {
        assertEquals(Temperature.celsius(25), Temperature.parse("25 °C"));
        assertEquals(Pressure.bar(3.5), Pressure.parse("3.5 bar"));
        assertEquals(SpecificEnergy.kilojoulesPerKilogram(2257), SpecificEnergy.parse("2257 kJ/kg"));
        assertEquals(Pressure.pascal(1e5), Pressure.parse("1e5 Pa"));
        assertEquals(Pressure.pascal(1e5), Pressure.parse("1E+5Pa"));
        assertEquals(Pressure.pascal(2.5e-3), Pressure.parse("2.5e-3 Pa"));
        assertEquals(Temperature.celsius(-5), Temperature.parse("-5°C"));
        assertEquals(Temperature.celsius(-5), Temperature.parse("\u22125\u00a0\u2103"));
        assertEquals(Temperature.kelvin(0.5), Temperature.parse("  +.5 K\t"));
        assertEquals(Duration.days(1), Duration.parse("1 d"));
        assertEquals(RotationalFrequency.revolutionsPerMinute(3000), RotationalFrequency.parse("3000 1/min"));
        assertEquals(DynamicViscosity.micropascalSeconds(18), DynamicViscosity.parse("18 μPa·s"));
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "4.2 kJ/(kg K)",
                "4.2 kJ/kg/K",
                "4.2 kJ/(kg·K)",
                "4.2 kJ/(kg*K)",
                "4.2 kJ/(K kg)",
                "4.2 kJ kg⁻¹ K⁻¹",
                "4.2 kJ kg^-1 K^-1",
                "4.2 kJ·kg-1·K-1",
                "4.2 kJ/kgK",
                "4.2kJ/( kg  K )"
            })
    void readsEverySpellingOfADerivedUnit(String text) {
        assertEquals(SpecificEntropy.kilojoulesPerKilogramKelvin(4.2), SpecificEntropy.parse(text));
    }

    @Test
    void aDerivedUnitThatMeansAnotherIsRefused() {
        // By ISO 80000-1:2009, 7.2.2, kJ/kg K without parentheses is ambiguous.
        refusal(SpecificEntropy.KIND, "4.2 kJ/kg K");
        refusal(SpecificEntropy.KIND, "4.2 kJ/kg");
        refusal(SpecificEnergy.KIND, "4.2 kJ/(kg K)");
        refusal(SpecificEnergy.KIND, "4.2 kg/kJ");
        refusal(Power.KIND, "4 mW");
        refusal(HeatFlux.KIND, "4 W/m");
        refusal(HeatFlux.KIND, "4 W/m²²");
        refusal(HeatFlux.KIND, "4 W/(m²");
        refusal(HeatFlux.KIND, "4 W//m²");
        refusal(HeatFlux.KIND, "4 W/m²)");
        refusal(HeatFlux.KIND, "4 W/");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "25 C      | coulomb",
                "25 F      | farad",
                "25 °K     | write K",
                "300 k     | write K",
                "25        | the unit is missing",
                "3,5 °C    | comma",
                "1,000 K   | comma",
                "1 000 K   | second number",
                "1'000 K   | separators",
                "1_000 K   | separators",
                "20 30 °C  | second number",
                "20-30 °C  | second number",
                "20 ±3 °C  | second number",
                "20..30 °C | one decimal point",
                "2.5.1 K   | one decimal point",
                "warm      | does not start with a number",
                "NaN K     | does not start with a number",
                "Infinity K| does not start with a number",
                "0x1p3 K   | is no unit",
                "1e999 K   | too large",
                "1e-999 K  | too small",
                "٣ K       | does not start with a number",
                "25 bar    | is no unit",
                "e5 K      | does not start with a number",
                ".K        | does not start with a number",
                "- 5 K     | does not start with a number"
            })
    void refusesWhatCanBeMisreadAndSaysWhatIsAccepted(String text, String reason) {
        final String message = refusal(Temperature.KIND, text);
        assertTrue(message.startsWith("\"" + text + "\" cannot be read as temperature ("), message);
        assertTrue(message.contains(reason), message);
        assertTrue(
                message.endsWith("accepted: a number with a decimal point and a unit, one of °C, K, °F, °R"), message);
    }

    @Test
    void emptyAndBlankAreRefused() {
        assertTrue(refusal(Mass.KIND, "").contains("it is empty"));
        assertTrue(refusal(Mass.KIND, " \t ").contains("it is empty"));
    }

    @Test
    void aLongOrOddTextMakesAMessageOfOneLine() {
        final String message = refusal(Mass.KIND, "x".repeat(100_000) + "\n");
        assertTrue(message.length() < 300, message);
        assertTrue(refusal(Mass.KIND, "5\r\nkg\u0007").chars().noneMatch(c -> c < ' '));
        assertTrue(refusal(Mass.KIND, "5 " + "(".repeat(100_000)).length() < 400);
    }

    @Test
    void capitalAndSmallLettersAreHintedAt() {
        assertTrue(refusal(SpecificEntropy.KIND, "4.2 KJ/KG/K").contains("write kJ/(kg K)"));
        assertTrue(refusal(Power.KIND, "5 KW").contains("write kW"));
        assertTrue(refusal(Pressure.KIND, "5 Bar").contains("write bar"));
    }

    @Test
    void pricesAreReadInTheOneCurrencyThatTheCallerKnows() {
        assertEquals(EnergyPrice.perMegawattHour(95), EnergyPrice.parse("95 ¤/MWh"));
        assertTrue(refusal(EnergyPrice.KIND, "95 €/MWh").contains("write ¤ for the currency"));
    }

    @Test
    void aSpanIsNotReadFromDegreesCelsius() {
        assertTrue(refusal(TemperatureSpan.KIND, "5 °C").contains("write a span in K"));
        assertEquals(TemperatureSpan.kelvins(5), TemperatureSpan.parse("5 K"));
    }

    @ParameterizedTest
    @ValueSource(
            strings = {"4 bar(g)", "4 barg", "4 bar g", "4 bar (g)", "4 bar gauge", "4bar_g", "400 kPa(g)", "0.4 MPa(g)"
            })
    void gaugePressuresNeedAnAtmosphere(String text) {
        assertTrue(refusal(Pressure.KIND, text).contains("Pressure.parse(text, atmosphere)"));
        assertEquals(5.013, Pressure.parse(text, Pressure.mbar(1013)).inBar(), 1e-14);
    }

    @Test
    void absolutePressuresAreReadWithOrWithoutTheirMark() {
        final Pressure atmosphere = Pressure.mbar(1013);
        assertEquals(Pressure.bar(4), Pressure.parse("4 bar", atmosphere));
        assertEquals(Pressure.bar(4), Pressure.parse("4 bar(a)", atmosphere));
        assertEquals(Pressure.bar(4), Pressure.parse("4 bara"));
        assertEquals(Pressure.psi(14.7), Pressure.parse("14.7 psia"));
        assertEquals(Pressure.psiGauge(20, atmosphere), Pressure.parse("20 psig", atmosphere));
        assertThrows(OutOfRangeException.class, () -> Pressure.parse("-2 barg", atmosphere));
        assertThrows(UnreadableQuantityException.class, () -> Pressure.parse("4 foo(g)", atmosphere));
    }

    @Test
    void normalVolumesNeedTheirCondition() {
        assertTrue(refusal(VolumeFlow.KIND, "12000 Nm3/h").contains("NormalCondition.DIN_1343"));
        assertTrue(refusal(MolarFlow.KIND, "12000 Sm³/h").contains("NormalCondition.ISO_13443"));
        final MolarFlow flow = MolarFlow.parse("12000 Nm³/h", NormalCondition.DIN_1343);
        // 22.413 969 54 L/mol at 273.15 K and 101.325 kPa: CODATA 2018, molar volume of an ideal gas.
        assertEquals(12000 / 3.6 / 22.41396954, flow.si(), 1e-7);
        assertEquals(12000, flow.inNormalCubicMetresPerHour(NormalCondition.DIN_1343), 1e-9);
        assertEquals(MolarFlow.kilomolesPerHour(3), MolarFlow.parse("3 kmol/h", NormalCondition.DIN_1343));
        final NormalCondition air = NormalCondition.of("contract", Temperature.celsius(20), Pressure.bar(1));
        // R T/p = 8.314462618 × 293.15 / 100 000 = 0.024 373 85 m³/mol, worked by hand.
        assertEquals(0.02437385, air.molarVolume().si(), 5e-9);
        assertEquals(12000, MolarFlow.parse("12000 Nm³/h", air).inNormalCubicMetresPerHour(air), 1e-9);
        assertEquals("DIN 1343 (0 °C, 1.01325 bar)", NormalCondition.DIN_1343.toString());
        assertThrows(
                OutOfRangeException.class, () -> NormalCondition.of("none", Temperature.celsius(0), Pressure.bar(0)));
        assertThrows(UnreadableQuantityException.class, () -> MolarFlow.parse("12000 Sm³/h", NormalCondition.DIN_1343));
    }

    @Test
    void aRatioMayBeAPlainNumber() {
        assertEquals(Ratio.fraction(0.88), Ratio.parse("0.88"));
        assertEquals(Ratio.percent(88), Ratio.parse("88 %"));
        assertEquals(Ratio.percent(88), Ratio.parse("88%"));
        assertEquals(Ratio.partsPerMillion(3), Ratio.parse("3 ppm"));
        refusal(Ratio.KIND, "0,88");
    }

    @Test
    void valuesOutsideTheScaleAreRefusedAsSuch() {
        final var e = assertThrows(OutOfRangeException.class, () -> Temperature.parse("-300 °C"));
        assertEquals("°C", e.unit());
        assertEquals(-300, e.value());
    }

    @Test
    void unitsAreFoundBySymbol() {
        assertSame(Units.TONNE_PER_HOUR, MassFlow.KIND.unit("t/h"));
        assertSame(Units.CUBIC_METRE_PER_HOUR, VolumeFlow.KIND.unit("m^3/h"));
        assertThrows(UnreadableQuantityException.class, () -> MassFlow.KIND.unit("tph"));
    }

    @Test
    void theFactsAreAccessors() {
        final var e = assertThrows(UnreadableQuantityException.class, () -> Temperature.parse("25 C"));
        assertEquals("25 C", e.text());
        assertEquals("temperature", e.quantity());
        assertEquals("C is the coulomb: write °C", e.problem());
        assertNotNull(e.accepted());
    }

    @Test
    void localeAndDefaultsPlayNoPart() {
        final var before = java.util.Locale.getDefault();
        try {
            for (String tag : new String[] {"de-DE", "tr-TR", "ar-EG-u-nu-arab", "hi-IN-u-nu-deva"}) {
                java.util.Locale.setDefault(java.util.Locale.forLanguageTag(tag));
                assertEquals("1234.5 kW", Power.kilowatts(1234.5).toString());
                assertEquals("12.50 bar", Pressure.bar(12.5).format(Units.BAR, 4));
                assertEquals(Power.kilowatts(1234.5), Power.parse("1234.5 kW"));
                assertTrue(refusal(Ratio.KIND, "5 PPM").contains("write ppm"));
            }
        } finally {
            java.util.Locale.setDefault(before);
        }
    }
}
