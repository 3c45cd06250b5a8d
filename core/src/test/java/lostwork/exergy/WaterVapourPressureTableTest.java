package lostwork.exergy;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import lostwork.quantity.OutOfRangeException;
import lostwork.quantity.Pressure;
import lostwork.quantity.Temperature;
import lostwork.testing.PrintedValue;
import org.junit.jupiter.api.Test;

/** Vapour pressure of water against printed values of IAPWS releases. */
class WaterVapourPressureTableTest {
    /** IAPWS R14-08(2011), table 3: 8.94735 Pa at 230 K, six digits. */
    @Test
    void reproducesTheSublimationPressure() {
        PrintedValue.of("8.94735").assertMatches(pascal(230), "R14-08, 230 K");
    }

    /**
     * IAPWS R6-95(2018), table 8: the equation of state, whose saturation line SR1-86(1992) fits within 0.005 %. Two
     * formulations, so the bound is that of the fit, not of the print.
     */
    @Test
    void fitsTheSaturationLineOfTheEquationOfState() {
        assertEquals(698.451167, pascal(275), 5e-5 * 698);
        assertEquals(0.932203564e6, pascal(450), 5e-5 * 0.932e6);
        assertEquals(16.9082693e6, pascal(625), 5e-5 * 16.9e6);
    }

    /** IAPWS R7-97(2012), table 35; the two formulas differ by 0.02 % at most over the whole line. */
    @Test
    void isCloseToTheIndustrialFormulation() {
        assertEquals(0.353658941e4, pascal(300), 2e-4 * 3537);
        assertEquals(0.263889776e7, pascal(500), 2e-4 * 2.64e6);
        assertEquals(0.123443146e8, pascal(600), 2e-4 * 1.234e7);
    }

    @Test
    void theTwoFormulasMeetAtTheTriplePoint() {
        assertEquals(611.657, pascal(273.16), 1e-5 * 611.657);
        assertEquals(pascal(273.16), pascal(Math.nextDown(273.16)), 1e-5 * 611.657);
    }

    @Test
    void inverts() {
        for (double t = 130; t <= 647; t += 0.7) {
            assertEquals(t, kelvin(pascal(t)), 1e-11 * t);
        }
        assertThrows(OutOfRangeException.class, () -> kelvin(0));
        assertThrows(OutOfRangeException.class, () -> kelvin(23e6));
        assertThrows(OutOfRangeException.class, () -> pascal(650));
        assertThrows(OutOfRangeException.class, () -> pascal(Double.NaN));
    }

    @Test
    void endsAtTheCriticalPoint() {
        assertEquals(
                WaterVapourPressure.criticalPressure(),
                WaterVapourPressure.at(WaterVapourPressure.criticalTemperature()));
    }

    private static double pascal(double kelvin) {
        return WaterVapourPressure.at(Temperature.kelvin(kelvin)).inPascal();
    }

    private static double kelvin(double pascal) {
        return WaterVapourPressure.dewPoint(Pressure.pascal(pascal)).inKelvin();
    }
}
