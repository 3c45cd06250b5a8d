package lostwork.fluid;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import lostwork.quantity.OutOfRangeException;
import lostwork.quantity.Pressure;
import lostwork.quantity.Ratio;
import lostwork.quantity.SpecificEnergy;
import lostwork.quantity.SpecificVolume;
import lostwork.quantity.Temperature;
import org.junit.jupiter.api.Test;

/** A fluid of one's own gets every state pair, saturation, printing and refusal without another line. */
class TwoPhaseExampleTest extends FluidContract {
    private final Fluid fluid = Fluid.of(new TwoPhaseExample());

    TwoPhaseExampleTest() {}

    @Override
    protected Fluid fluid() {
        return fluid;
    }

    /** By hand: s = 1650 ln(400/300) - 115 ln(2/0.6) + 380e3/300, w² = (1650/1535) 115 400. */
    @Test
    void printsStatesAsAlignedBlocks() {
        assertEquals("""
                example fluid, vapour
                  T   126.85     °C
                  p     2        bar
                  v     0.23     m³/kg
                  u   499        kJ/kg
                  h   545        kJ/kg
                  s     1.602885 kJ/(kg K)
                  cp    1.65     kJ/(kg K)
                  cv    1.535    kJ/(kg K)
                  w   222.3651   m/s""", fluid.state(Temperature.kelvin(400), Pressure.bar(2)).toString());
    }

    @Test
    void printsTwoPhaseStates() {
        final String text = fluid.state(Pressure.bar(2), Ratio.percent(25)).toString();
        assertTrue(text.startsWith("example fluid, two-phase\n"), text);
        assertTrue(text.contains("\n  cp  infinite"), text);
        assertTrue(text.matches("(?s).*\n  x +0.25"), text);
    }

    @Test
    void printsSaturationSideBySide() {
        final String text = fluid.saturation(Pressure.bar(2)).toString();
        final String[] lines = text.split("\n");
        assertEquals(6, lines.length, text);
        assertTrue(lines[0].startsWith("example fluid, saturated at "), text);
        assertTrue(lines[1].contains("liquid") && lines[1].contains("difference"), text);
        for (int i = 2; i < lines.length; i++) {
            assertEquals(lines[2].lastIndexOf('.') < 0, lines[i].lastIndexOf('.') < 0, text);
        }
    }

    @Test
    void differencesAreCountedWithinOneFluid() {
        final FluidState cold = fluid.state(Temperature.kelvin(300), Pressure.bar(3));
        final FluidState hot = fluid.state(Temperature.kelvin(400), Pressure.bar(3));
        final StateDifference heating = hot.minus(cold);
        assertEquals(100, heating.temperature().inKelvins(), 1e-12);
        assertEquals(0, heating.pressure().si());
        assertEquals(
                hot.enthalpy().si() - cold.enthalpy().si(), heating.enthalpy().si());
        assertTrue(
                heating.toString().startsWith("example fluid, difference of two states\n  ΔT  100 "),
                heating::toString);
        final FluidState stranger = Fluid.of(new TwoPhaseExample()).state(Temperature.kelvin(300), Pressure.bar(3));
        final IllegalArgumentException refusal =
                assertThrows(IllegalArgumentException.class, () -> hot.minus(stranger));
        assertTrue(refusal.getMessage().contains("zero points"), refusal::getMessage);
    }

    @Test
    void hasNoIsobaricHeatCapacityBetweenTwoPhases() {
        final FluidState wet = fluid.state(Pressure.bar(2), Ratio.percent(25));
        final UndefinedPropertyException refusal =
                assertThrows(UndefinedPropertyException.class, wet::isobaricHeatCapacity);
        assertTrue(refusal.getMessage().contains("saturation"), refusal::getMessage);
        assertTrue(wet.isochoricHeatCapacity().si()
                > fluid.saturation(Pressure.bar(2))
                        .liquid()
                        .isochoricHeatCapacity()
                        .si());
    }

    /** A refusal says what was asked, what is allowed, and what to do. */
    @Test
    void refusalsNameValueRangeAndWayOut() {
        final OutOfRangeException tooHot =
                assertThrows(OutOfRangeException.class, () -> fluid.state(Temperature.kelvin(600), Pressure.bar(2)));
        assertTrue(tooHot.getMessage().contains("invented for tests"), tooHot::getMessage);
        assertTrue(tooHot.getMessage().contains("no extrapolation is offered"), tooHot::getMessage);
        assertEquals(500, tooHot.highest());
        final OutOfRangeException tooMuchHeat = assertThrows(
                OutOfRangeException.class, () -> fluid.state(Pressure.bar(2), SpecificEnergy.megajoulesPerKilogram(5)));
        assertEquals("specific enthalpy", tooMuchHeat.quantity());
        assertEquals(
                fluid.state(Pressure.bar(2), Temperature.kelvin(500)).enthalpy().si(), tooMuchHeat.highest());
        final FlashException nowhere = assertThrows(
                FlashException.class,
                () -> fluid.state(SpecificEnergy.megajoulesPerKilogram(5), SpecificVolume.cubicMetresPerKilogram(0.1)));
        assertTrue(nowhere.getMessage().contains("within T = 250.0 .. 500.0 K"), nowhere::getMessage);
        assertEquals("example fluid", nowhere.fluid());
        final UndefinedPropertyException noFormation = assertThrows(
                UndefinedPropertyException.class,
                () -> fluid.state(Temperature.kelvin(300), Pressure.bar(2)).enthalpyFromElements());
        assertTrue(noFormation.getMessage().contains("formation data"), noFormation::getMessage);
    }

    @Test
    void copiesDerivativesForTheHotPath() {
        final StatePoint point = new StatePoint();
        fluid.state(Pressure.bar(2), Ratio.percent(25)).copyTo(point);
        assertEquals(0.25, point.vapourFraction);
        assertTrue(point.vapourFractionByEnthalpy > 0);
        assertTrue(point.temperatureByPressureAtEnthalpy > 0);
    }
}
