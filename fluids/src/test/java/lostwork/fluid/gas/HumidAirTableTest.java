package lostwork.fluid.gas;

import static lostwork.quantity.Pressure.kilopascal;
import static lostwork.quantity.Ratio.fraction;
import static lostwork.quantity.Ratio.percent;
import static lostwork.quantity.Temperature.celsius;
import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

/** Humid air against published examples. */
class HumidAirTableTest {
    /**
     * ASHRAE Handbook Fundamentals, chapter on psychrometrics, example 1 (SI), from memory: dry bulb 40 °C, wet bulb 20 °C,
     * 101.325 kPa. Chart readings: the tolerance is half a unit of the last printed digit, and 0.15 g/kg for the humidity
     * ratio, which a chart gives no finer.
     */
    @Test
    void wetBulbExample() {
        final HumidAir air = HumidAir.ofWetBulb(celsius(40), celsius(20), kilopascal(101.325));
        assertEquals(6.5, 1000 * air.humidityRatio().si(), 0.15);
        assertEquals(56.7, air.enthalpyPerDryAir(celsius(40)).inKilojoulesPerKilogram(), 0.05);
        assertEquals(7, air.waterDewPoint(kilopascal(101.325)).inCelsius(), 0.5);
        assertEquals(14, air.relativeHumidity(celsius(40), kilopascal(101.325)).inPercent(), 0.5);
        final double perDryAir = (1 + air.humidityRatio().si())
                * air.state(celsius(40), kilopascal(101.325)).volume().si();
        assertEquals(0.896, perDryAir, 0.0005);
    }

    /**
     * ASHRAE Handbook Fundamentals, chapter on psychrometrics, table of moist air at 101.325 kPa, from memory: saturated air
     * at 25 °C holds 0.02017 kg/kg and has 76.50 kJ per kg of dry air. The table includes the enhancement of saturation by
     * the air, a factor of 1.0044 there, which this model leaves out: 0.45 % of the water, worth 0.23 kJ/kg.
     */
    @Test
    void saturatedAirWithoutTheEnhancementFactor() {
        final HumidAir air = HumidAir.of(celsius(25), kilopascal(101.325), percent(100));
        assertEquals(0.02017, air.humidityRatio().si(), 0.0045 * 0.02017);
        assertEquals(76.50, air.enthalpyPerDryAir(celsius(25)).inKilojoulesPerKilogram(), 0.28);
        final HumidAir enhanced = HumidAir.ofHumidityRatio(fraction(0.02017));
        assertEquals(76.50, enhanced.enthalpyPerDryAir(celsius(25)).inKilojoulesPerKilogram(), 0.05);
    }
}
