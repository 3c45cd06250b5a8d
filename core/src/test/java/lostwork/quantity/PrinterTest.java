package lostwork.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Test;

/** Printing with a chosen unit and number of significant digits. */
class PrinterTest {
    @Test
    void toStringIsWhatAPersonWouldWrite() {
        assertEquals("540 °C", Temperature.celsius(540).toString());
        assertEquals("25.4 °C", Temperature.celsius(25.4).toString());
        assertEquals("-5 °C", Temperature.fahrenheit(23).toString());
        assertEquals("60 bar", Pressure.bar(60).toString());
        assertEquals("0.06 bar", Pressure.mbar(60).toString());
        assertEquals("12 K", TemperatureSpan.kelvins(12).toString());
        assertEquals(
                "3422.186 kJ/kg", SpecificEnergy.joulesPerKilogram(3422185.6789).toString());
        assertEquals("18.01527 g/mol", MolarMass.gramsPerMole(18.015268).toString());
        assertEquals("0.88", Ratio.percent(88).toString());
        assertEquals("0 kW", Power.watts(-0.0).toString());
        assertEquals("1.234568e7 kW", Power.kilowatts(12345678.9).toString());
        assertEquals("1e-9 kW", Power.watts(1e-6).toString());
        assertEquals("1250 ¤", Money.of(1250).toString());
    }

    @Test
    void significantDigitsAreKeptAndRoundedOnTheExactValue() {
        assertEquals("12.50 bar", Pressure.bar(12.5).format(Units.BAR, 4));
        assertEquals("1250 kPa", Pressure.bar(12.5).format(Units.KILOPASCAL, 4));
        assertEquals("1.3 MPa", Pressure.bar(12.51).format(Units.MEGAPASCAL, 2));
        assertEquals("10.0 bar", Pressure.bar(9.996).format(Units.BAR, 3));
        assertEquals("88.0 %", Ratio.fraction(0.88).format(Units.PERCENT, 3));
        assertEquals("0.880", Ratio.fraction(0.88).format(Units.FRACTION, 3));
        assertEquals("1200 K", Temperature.kelvin(1234).format(Units.KELVIN, 2));
        assertEquals("1.0e-7 kg/s", MassFlow.kilogramsPerSecond(1e-7).format(Units.KILOGRAM_PER_SECOND, 2));
        // 2.675 is a little less in binary, 2.67499999999999982236431605997495353221893310546875.
        assertEquals("2.67 kg/s", MassFlow.kilogramsPerSecond(2.675).format(Units.KILOGRAM_PER_SECOND, 3));
    }

    @Test
    void digitsOutsideOneToSeventeenAreRefused() {
        final Pressure p = Pressure.bar(1);
        assertThrows(IllegalArgumentException.class, () -> p.format(Units.BAR, 0));
        assertThrows(IllegalArgumentException.class, () -> p.format(Units.BAR, 18));
    }

    @Test
    void theExactTextIsShortWhereItCanBe() {
        assertEquals("813.15 K", Temperature.celsius(540).toExactString());
        assertEquals("6000000 Pa", Pressure.bar(60).toExactString());
        assertEquals("0.1", Ratio.percent(10).toExactString());
        assertEquals("0.30000000000000004 s", Duration.seconds(0.1 + 0.2).toExactString());
        assertEquals(
                Duration.seconds(Double.MIN_VALUE),
                Duration.parse(Duration.seconds(Double.MIN_VALUE).toExactString()));
    }

    @Test
    void dimensionsPrintInBaseUnits() {
        assertEquals("m^2 kg s^-3", Power.KIND.dimension().toString());
        assertEquals("1", Ratio.KIND.dimension().toString());
        assertEquals("¤", Money.KIND.dimension().toString());
    }
}
