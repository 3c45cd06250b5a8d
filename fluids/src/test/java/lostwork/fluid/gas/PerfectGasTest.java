package lostwork.fluid.gas;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import lostwork.fluid.Fluid;
import lostwork.fluid.FluidContract;
import lostwork.fluid.FluidState;
import lostwork.quantity.MolarMass;
import lostwork.quantity.OutOfRangeException;
import lostwork.quantity.Pressure;
import lostwork.quantity.Ratio;
import lostwork.quantity.SpecificHeatCapacity;
import lostwork.quantity.Temperature;
import org.junit.jupiter.api.Test;

class PerfectGasTest extends FluidContract {
    private final Fluid air = PerfectGas.of(
            "air", MolarMass.gramsPerMole(28.9647), SpecificHeatCapacity.kilojoulesPerKilogramKelvin(1.005));

    PerfectGasTest() {}

    @Override
    protected Fluid fluid() {
        return air;
    }

    /** Speed of sound in dry air at 20 °C: 343.2 m/s in every handbook of acoustics (from memory). */
    @Test
    void soundInAirIsAsFastAsHandbooksSay() {
        final Fluid diatomic = PerfectGas.of("air", MolarMass.gramsPerMole(28.9647), Ratio.fraction(1.4));
        final FluidState room = diatomic.state(Temperature.celsius(20), Pressure.atm(1));
        assertEquals(343.2, room.speedOfSound().inMetresPerSecond(), 0.05);
    }

    /** Isentropic compression: T2/T1 = (p2/p1)^((kappa-1)/kappa) (Poisson), any textbook. */
    @Test
    void isentropesFollowPoisson() {
        final Fluid gas = PerfectGas.of("helium", MolarMass.gramsPerMole(4.0026), Ratio.fraction(5.0 / 3));
        final FluidState inlet = gas.state(Temperature.kelvin(300), Pressure.bar(1));
        final FluidState outlet = gas.state(Pressure.bar(8), inlet.entropy());
        assertEquals(300 * Math.pow(8, 0.4), outlet.temperature().inKelvin(), 1e-9 * 300);
        final FluidState stroke = gas.state(inlet.entropy(), outlet.volume());
        assertEquals(8, stroke.pressure().inBar(), 1e-9);
    }

    @Test
    void refusesHeatCapacitiesThatLeaveNoIsochoricOne() {
        final MolarMass mass = MolarMass.gramsPerMole(28.96);
        final OutOfRangeException refusal = assertThrows(
                OutOfRangeException.class,
                () -> PerfectGas.of("air", mass, SpecificHeatCapacity.joulesPerKilogramKelvin(287)));
        assertTrue(refusal.getMessage().contains("above R/M"), refusal::getMessage);
        assertThrows(OutOfRangeException.class, () -> PerfectGas.of("air", mass, Ratio.fraction(1)));
        assertThrows(
                IllegalArgumentException.class,
                () -> PerfectGas.of("air", MolarMass.gramsPerMole(0), Ratio.fraction(1.4)));
    }

    @Test
    void enthalpyIsAFunctionOfTemperatureAlone() {
        assertFalse(air.model().enthalpyDependsOnPressure());
    }
}
