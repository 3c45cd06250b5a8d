package lostwork.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.function.Executable;

/** Values that do not exist are refused where they enter, in the unit that they were given in. */
class RefusalTest {
    private static OutOfRangeException refused(Executable action) {
        return assertThrows(OutOfRangeException.class, action);
    }

    @Test
    void belowAbsoluteZeroIsToldInTheUnitGiven() {
        assertEquals(
                "temperature = -300 °C is not allowed: it must be above -273.15 °C (absolute zero)",
                refused(() -> Temperature.celsius(-300)).getMessage());
        assertEquals(
                "temperature = -500 °F is not allowed: it must be above -459.67 °F (absolute zero)",
                refused(() -> Temperature.fahrenheit(-500)).getMessage());
        assertEquals(
                "temperature = 0 K is not allowed: it must be above 0 K (absolute zero)",
                refused(() -> Temperature.kelvin(0)).getMessage());
        refused(() -> Temperature.celsius(-273.15));
        refused(() -> Temperature.rankine(-1));
        assertEquals(1e-9, Temperature.kelvin(1e-9).inKelvin());
    }

    @Test
    void theFactsAreAccessors() {
        final OutOfRangeException e = refused(() -> Temperature.celsius(-300));
        assertEquals("temperature", e.quantity());
        assertEquals(-300, e.value());
        assertEquals(-273.15, e.lowest());
        assertEquals(Double.POSITIVE_INFINITY, e.highest());
        assertEquals("°C", e.unit());
        assertEquals("absolute zero", e.limitedBy());
    }

    @Test
    void belowVacuumIsToldWithTheWayToGaugePressures() {
        final String message = refused(() -> Pressure.bar(-1)).getMessage();
        assertTrue(message.startsWith("pressure = -1 bar is not allowed: it must be at least 0 bar (vacuum)"), message);
        assertTrue(message.contains("barGauge"), message);
        assertEquals(0, Pressure.pascal(0).inPascal());
    }

    @Test
    void gaugePressuresBelowVacuumNameTheAtmosphere() {
        final Pressure atmosphere = Pressure.mbar(1013);
        assertEquals(0.513, Pressure.barGauge(-0.5, atmosphere).inBar(), 1e-15);
        final String message = refused(() -> Pressure.barGauge(-2, atmosphere)).getMessage();
        assertTrue(message.startsWith("gauge pressure = -2 bar"), message);
        assertTrue(message.contains("-1.013 bar (vacuum at an atmosphere of 1.013 bar)"), message);
        refused(() -> Pressure.psiGauge(Double.NaN, atmosphere));
    }

    @Test
    void arithmeticThatLeavesTheScaleIsRefused() {
        refused(() -> Temperature.kelvin(10).minus(TemperatureSpan.kelvins(10)));
        refused(() -> Pressure.bar(1).minus(PressureDifference.bars(2)));
        refused(() -> Pressure.bar(1).times(Ratio.fraction(-0.5)));
        refused(() -> Energy.joules(1e300).times(1e300));
        refused(() -> Density.kilogramsPerCubicMetre(0).inverse());
        final String message =
                refused(() -> Power.kilowatts(1).over(Power.watts(0))).getMessage();
        assertTrue(message.contains("ratio = Infinity is not allowed"), message);
        assertTrue(message.contains("division by zero"), message);
    }

    @Test
    void noKindTakesWhatIsNotFinite() {
        for (QuantityKind<?, ?> kind : AllKinds.kinds()) {
            for (double si : List.of(Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY)) {
                final OutOfRangeException e = refused(() -> kind.ofSi(si));
                assertEquals(kind.name(), e.quantity());
                assertTrue(e.getMessage().contains("finite"), e.getMessage());
            }
            inEveryUnit(kind);
        }
    }

    private static <Q extends ScalarQuantity<Q, D>, D extends LinearQuantity<D>> void inEveryUnit(
            QuantityKind<Q, D> kind) {
        for (Unit<Q> unit : kind.units()) {
            final OutOfRangeException e = refused(() -> kind.of(Double.NaN, unit));
            assertEquals(unit.symbol(), e.unit());
        }
    }

    @Test
    void factoriesRefuseWhatIsNotFinite() throws ReflectiveOperationException {
        int factories = 0;
        for (Class<?> type : AllKinds.classes()) {
            for (var method : type.getMethods()) {
                if (method.getReturnType() == type
                        && List.of(method.getParameterTypes()).equals(List.of(double.class))
                        && java.lang.reflect.Modifier.isStatic(method.getModifiers())) {
                    factories++;
                    final var thrown = assertThrows(
                            java.lang.reflect.InvocationTargetException.class, () -> method.invoke(null, Double.NaN));
                    assertEquals(OutOfRangeException.class, thrown.getCause().getClass(), method.toString());
                }
            }
        }
        assertTrue(factories > 100, "factories found: " + factories);
    }
}
