package lostwork.examples.audit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.List;
import org.junit.jupiter.api.Test;

class SiteReaderTest {
    private static final String GOOD = String.join(
            "\n",
            "# a site",
            "site = Invented works",
            "ambient temperature = 12 °C",
            "ambient pressure = 1013 mbar",
            "relative humidity = 70 %",
            "power price = 96 EUR/MWh",
            "heat price = 0.038 EUR/kWh",
            "currency = EUR",
            "grid carbon intensity = 310 g/kWh");

    private static Site read(String text) {
        return SiteReader.read(SourceText.of("site.txt", text.getBytes(StandardCharsets.UTF_8)));
    }

    private static List<String> refusalOf(String text) {
        return assertThrows(RefusedInputException.class, () -> read(text))
                .getMessage()
                .lines()
                .toList();
    }

    @Test
    void readsAllKeys() {
        final Site site = read(GOOD);
        assertEquals("Invented works", site.name());
        assertEquals(12, site.ambientTemperature().inCelsius(), 1e-9);
        assertEquals(70, site.relativeHumidity().inPercent(), 1e-9);
        assertEquals(96, site.powerPrice().inPerMegawattHour(), 1e-9);
        assertEquals(38, site.heatPrice().inPerMegawattHour(), 1e-9);
        assertEquals(310, site.gridCarbonIntensity().inKilogramsPerMegawattHour(), 1e-9);
    }

    @Test
    void namesAMissingKey() {
        assertEquals(
                List.of("site.txt: the key \"heat price\" is missing. Accepted: site, ambient temperature,"
                        + " ambient pressure, relative humidity, currency, power price, heat price, grid carbon"
                        + " intensity."),
                refusalOf(GOOD.replace("heat price = 0.038 EUR/kWh\n", "")));
    }

    @Test
    void namesADoubledAndAnUnknownKey() {
        final List<String> refusal = refusalOf(GOOD + "\ncurrency = USD\npowr price = 3 EUR/MWh\nno equals sign");
        assertEquals(
                "site.txt, line 10, column 1: the key \"currency\" is already given in line 8. Accepted: each key once.",
                refusal.get(0));
        assertTrue(
                refusal.get(1)
                        .startsWith("site.txt, line 11, column 1: unknown key \"powr price\" (did you mean \"power"
                                + " price\"?). Accepted: site, "),
                refusal.get(1));
        assertTrue(
                refusal.get(2).startsWith("site.txt, line 12, column 1: the line has no \"=\". Accepted: key = value"),
                refusal.get(2));
    }

    @Test
    void namesBadValues() {
        assertEquals(
                List.of("site.txt, line 5, column 21: relative humidity: a relative humidity of 170 % does not exist."
                        + " Accepted: 0 % to 100 %."),
                refusalOf(GOOD.replace("70 %", "170 %")));
        assertEquals(
                List.of("site.txt, line 6, column 15: power price: the unit \"USD/MWh\" is none of a price in EUR."
                        + " Accepted: EUR/MWh, EUR/kWh, EUR/GJ, EUR/J."),
                refusalOf(GOOD.replace("96 EUR", "96 USD")));
        assertEquals(
                List.of("site.txt, line 3, column 23: ambient temperature: a temperature of -300 °C does not exist."
                        + " Accepted: a possible value."),
                refusalOf(GOOD.replace("12 °C", "-300 °C")));
        assertEquals(
                List.of("site.txt, line 4, column 20: ambient pressure: a pressure of 0 mbar does not exist."
                        + " Accepted: an absolute pressure above 0."),
                refusalOf(GOOD.replace("1013 mbar", "0 mbar")));
        assertEquals(
                List.of("site.txt, line 6, column 15: power price: \"-96 EUR/MWh\" is negative. Accepted: 0 or more."),
                refusalOf(GOOD.replace("96 EUR", "-96 EUR")));
    }

    @Test
    void namesAnEmptyFile() {
        assertTrue(refusalOf("\n").get(0).startsWith("site.txt: the file is empty. Accepted: site, "));
    }
}
