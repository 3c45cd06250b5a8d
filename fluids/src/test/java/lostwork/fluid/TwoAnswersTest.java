package lostwork.fluid;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import lostwork.fluid.water.Water;
import lostwork.quantity.OutOfRangeException;
import lostwork.quantity.Pressure;
import lostwork.quantity.SpecificVolume;
import lostwork.quantity.Temperature;
import org.junit.jupiter.api.Test;

/** Cold water contracts on heating: where two states fit, the one that the documentation names is returned. */
class TwoAnswersTest {
    private final Fluid water = Water.industrial();

    @Test
    void pressureAndVolumeGiveTheWarmerState() {
        final FluidState cold = water.state(Temperature.celsius(1), Pressure.bar(1));
        final FluidState found = water.state(Pressure.bar(1), cold.volume());
        assertEquals(
                cold.volume().si(), found.volume().si(), 1e-12 * cold.volume().si());
        // The volumes at 1 °C and near 7 °C are equal: 999.90 kg/m³ in tables of water density (from memory).
        assertEquals(7, found.temperature().inCelsius(), 0.2);
    }

    @Test
    void volumeBelowTheLeastOneIsRefused() {
        final OutOfRangeException refusal = assertThrows(
                OutOfRangeException.class,
                () -> water.state(Pressure.bar(1), SpecificVolume.cubicMetresPerKilogram(1.00002e-3)));
        // The greatest density of water at 1 atm is 999.97 kg/m³, at 4 °C (any handbook, from memory).
        assertEquals(1 / 999.97, refusal.lowest(), 1e-8);
        assertTrue(refusal.getMessage().startsWith("specific volume"), refusal::getMessage);
    }

    @Test
    void temperatureAndEntropyGiveTheLowerPressure() {
        final FluidState compressed = water.state(Temperature.celsius(1), Pressure.bar(100));
        assertTrue(compressed.entropy().si()
                > water.saturation(Temperature.celsius(1)).liquid().entropy().si());
        final FluidState found = water.state(Temperature.celsius(1), compressed.entropy());
        assertEquals(compressed.entropy().si(), found.entropy().si(), 1e-9);
        assertEquals(Phase.TWO_PHASE, found.phase());
    }
}
