package lostwork.fluid.gas;

import static lostwork.quantity.Pressure.bar;
import static lostwork.quantity.Pressure.mbar;
import static lostwork.quantity.Ratio.fraction;
import static lostwork.quantity.Ratio.percent;
import static lostwork.quantity.Temperature.celsius;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import lostwork.exergy.ReferenceEnvironment;
import lostwork.quantity.OutOfRangeException;
import org.junit.jupiter.api.Test;

class HumidAirTest {
    @Test
    void returnsTheHumidityItWasMadeWith() {
        for (double t : new double[] {-20, 0, 12, 35, 80, 99}) {
            for (double phi : new double[] {0.01, 0.5, 1}) {
                final HumidAir air = HumidAir.of(celsius(t), mbar(1013), fraction(phi));
                assertEquals(phi, air.relativeHumidity(celsius(t), mbar(1013)).si(), 1e-12);
                assertEquals(
                        air.humidityRatio().si(),
                        HumidAir.ofDewPoint(air.waterDewPoint(mbar(1013)), mbar(1013))
                                .humidityRatio()
                                .si(),
                        1e-11 * air.humidityRatio().si());
            }
        }
    }

    @Test
    void wetBulbInverts() {
        final double[][] dryAndWet = {{10, 5}, {10, 9.9}, {25, 9.9}, {25, 20}, {40, 20}, {40, 39}, {150, 60}};
        for (double[] pair : dryAndWet) {
            final HumidAir air = HumidAir.ofWetBulb(celsius(pair[0]), celsius(pair[1]), bar(1));
            assertEquals(pair[1], air.wetBulb(celsius(pair[0]), bar(1)).inCelsius(), 1e-8, "dry bulb " + pair[0]);
        }
        final HumidAir saturated = HumidAir.of(celsius(20), bar(1), percent(100));
        assertEquals(20, saturated.wetBulb(celsius(20), bar(1)).inCelsius(), 1e-9);
    }

    @Test
    void refusesFogAndSteam() {
        assertThrows(OutOfRangeException.class, () -> HumidAir.of(celsius(12), bar(1), percent(101)));
        assertThrows(OutOfRangeException.class, () -> HumidAir.of(celsius(12), bar(1), percent(-1)));
        assertTrue(assertThrows(OutOfRangeException.class, () -> HumidAir.of(celsius(120), bar(1), percent(90)))
                .getMessage()
                .contains("steam alone"));
        assertThrows(OutOfRangeException.class, () -> HumidAir.ofWetBulb(celsius(20), celsius(21), bar(1)));
        assertThrows(OutOfRangeException.class, () -> HumidAir.ofWetBulb(celsius(60), celsius(2), bar(1)));
        final HumidAir air = HumidAir.of(celsius(30), bar(1), percent(80));
        assertTrue(air.relativeHumidity(celsius(10), bar(1)).si() > 2);
        assertThrows(OutOfRangeException.class, () -> air.wetBulb(celsius(10), bar(1)));
    }

    @Test
    void dryAirIsItsLimit() {
        final HumidAir dry = HumidAir.ofHumidityRatio(fraction(0));
        assertEquals(DryAir.standard().composition(), dry.composition());
        assertThrows(OutOfRangeException.class, () -> dry.waterDewPoint(bar(1)));
    }

    /** Environment and air take the same vapour pressure formula, so the humidity comes back. */
    @Test
    void isTheAirOfItsEnvironment() {
        for (double t : new double[] {-15, 12, 40}) {
            final var site = ReferenceEnvironment.of(celsius(t), mbar(1013)).withRelativeHumidity(percent(70));
            final HumidAir air = HumidAir.of(site);
            assertEquals(
                    site.waterVapourPressure().si(),
                    air.composition().moleFraction(Species.H2O).si() * 101_300,
                    1e-10);
            assertEquals(0.70, air.relativeHumidity(celsius(t), mbar(1013)).si(), 1e-12);
        }
    }

    /** Water per mass: the balance of the composition. */
    @Test
    void holdsItsWater() {
        final HumidAir air = HumidAir.ofHumidityRatio(fraction(0.02));
        assertEquals(0.02 / 1.02, air.composition().massFraction(Species.H2O).si(), 1e-15);
    }
}
