package lostwork.fluid.water;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import lostwork.fluid.FluidModel;
import lostwork.fluid.StatePoint;
import lostwork.quantity.OutOfRangeException;
import org.junit.jupiter.api.Test;

/** The start of searches in region 5, on a grid that includes its limits. */
class If97Region5StartTest {
    private static final FluidModel MODEL = Water.industrial().model();
    private static final int STEPS = 60;

    private final If97Equations equations = new If97Equations();
    private final If97Starts starts = new If97Starts();
    private final If97PressureFlash byEnthalpy = new If97PressureFlash.ByEnthalpy(equations, starts);
    private final If97PressureFlash byEntropy = new If97PressureFlash.ByEntropy(equations, starts);

    private interface AtState {
        void check(StatePoint state);
    }

    private static void onGrid(AtState check) {
        final StatePoint state = new StatePoint();
        for (int i = 0; i <= STEPS; i++) {
            final double temperature = 1073.1500001 + i * (2273.15 - 1073.1500001) / STEPS;
            for (int j = 0; j <= STEPS; j++) {
                final double share = (double) j / STEPS;
                MODEL.atTemperaturePressure(Math.min(temperature, 2273.15), 1 + share * share * (50e6 - 1), state);
                check.check(state);
            }
        }
    }

    /** Within 0.05 K one Newton step leads to the last one. */
    @Test
    void liesWithinOneNewtonStepOfTheState() {
        onGrid(state -> {
            assertEquals(state.temperature, byEnthalpy.startInRegion5(state.pressure, state.enthalpy), 0.05);
            assertEquals(state.temperature, byEntropy.startInRegion5(state.pressure, state.entropy), 0.05);
        });
    }

    /** What is returned is the state of the basic equation at the temperature found, up to the limits of the region. */
    @Test
    void theEquationReturnsThePairAsked() {
        final StatePoint found = new StatePoint();
        final StatePoint again = new StatePoint();
        onGrid(state -> {
            if (state.temperature < 1074) {
                return; // the step from region 2 to region 5 has two answers
            }
            MODEL.atPressureEnthalpy(state.pressure, state.enthalpy, found);
            MODEL.atTemperaturePressure(Math.min(found.temperature, 2273.15), state.pressure, again);
            assertEquals(state.enthalpy, again.enthalpy, 1e-12 * state.enthalpy);
            MODEL.atPressureEntropy(state.pressure, state.entropy, found);
            MODEL.atTemperaturePressure(Math.min(found.temperature, 2273.15), state.pressure, again);
            assertEquals(state.entropy, again.entropy, 1e-12 * state.entropy);
        });
    }

    /** The limit is exact on both sides, although most comparisons use a table. */
    @Test
    void refusesWhatIsHotterThanTheRange() {
        final StatePoint end = new StatePoint();
        final StatePoint found = new StatePoint();
        for (double pressure = 1; pressure <= 50e6; pressure = pressure * 1.3 + 50) {
            final double p = pressure;
            MODEL.atTemperaturePressure(2273.15, p, end);
            MODEL.atPressureEnthalpy(p, end.enthalpy, found);
            assertEquals(2273.15, found.temperature, 1e-8);
            MODEL.atPressureEntropy(p, end.entropy, found);
            assertEquals(2273.15, found.temperature, 1e-8);
            final OutOfRangeException refusal = assertThrows(
                    OutOfRangeException.class, () -> MODEL.atPressureEnthalpy(p, end.enthalpy * (1 + 1e-9), found));
            assertTrue(refusal.getMessage().contains("enthalpy"), refusal.getMessage());
            assertThrows(OutOfRangeException.class, () -> MODEL.atPressureEntropy(p, end.entropy * (1 + 1e-9), found));
        }
    }
}
