package lostwork.fluid.gas;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import lostwork.quantity.OutOfRangeException;
import org.junit.jupiter.api.Test;

/** Vapour pressure of water against printed values of IAPWS releases. */
class WaterVapourPressureTableTest {
    /** IAPWS R14-08(2011), table 3: 8.94735 Pa at 230 K, six digits. */
    @Test
    void reproducesTheSublimationPressure() {
        assertEquals(8.94735, WaterVapourPressure.pascal(230), 0.000005);
    }

    /**
     * IAPWS R6-95(2018), table 8: the equation of state, whose saturation line SR1-86(1992) fits within 0.005 %. Two
     * formulations, so the bound is that of the fit, not of the print.
     */
    @Test
    void fitsTheSaturationLineOfTheEquationOfState() {
        assertEquals(698.451167, WaterVapourPressure.pascal(275), 5e-5 * 698);
        assertEquals(0.932203564e6, WaterVapourPressure.pascal(450), 5e-5 * 0.932e6);
        assertEquals(16.9082693e6, WaterVapourPressure.pascal(625), 5e-5 * 16.9e6);
    }

    /** IAPWS R7-97(2012), table 35; the two formulas differ by 0.02 % at most over the whole line. */
    @Test
    void isCloseToTheIndustrialFormulation() {
        assertEquals(0.353658941e4, WaterVapourPressure.pascal(300), 2e-4 * 3537);
        assertEquals(0.263889776e7, WaterVapourPressure.pascal(500), 2e-4 * 2.64e6);
        assertEquals(0.123443146e8, WaterVapourPressure.pascal(600), 2e-4 * 1.234e7);
    }

    @Test
    void theTwoFormulasMeetAtTheTriplePoint() {
        assertEquals(611.657, WaterVapourPressure.pascal(273.16), 1e-5 * 611.657);
        assertEquals(
                WaterVapourPressure.pascal(273.16), WaterVapourPressure.pascal(Math.nextDown(273.16)), 1e-5 * 611.657);
    }

    @Test
    void inverts() {
        for (double t = 130; t <= 647; t += 0.7) {
            assertEquals(t, WaterVapourPressure.temperature(WaterVapourPressure.pascal(t)), 1e-11 * t);
        }
        assertThrows(OutOfRangeException.class, () -> WaterVapourPressure.temperature(0));
        assertThrows(OutOfRangeException.class, () -> WaterVapourPressure.temperature(23e6));
        assertThrows(OutOfRangeException.class, () -> WaterVapourPressure.pascal(650));
        assertThrows(OutOfRangeException.class, () -> WaterVapourPressure.pascal(Double.NaN));
    }
}
