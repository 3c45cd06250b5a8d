package lostwork.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.lang.reflect.Method;
import java.lang.reflect.Modifier;
import java.util.ArrayList;
import java.util.List;
import java.util.TreeSet;
import org.junit.jupiter.api.Test;

/** Equality, order, factories and readers of the value classes. */
class ValueTest {
    @Test
    void equalNumbersAreEqualValues() {
        assertEquals(Temperature.celsius(0), Temperature.kelvin(273.15));
        assertEquals(Ratio.percent(57), Ratio.fraction(0.57));
        assertEquals(Length.millimetres(9), Length.metres(0.009));
        assertEquals(MassFlow.tonnesPerHour(36), MassFlow.kilogramsPerSecond(10));
        assertEquals(TemperatureSpan.kelvins(0.0), TemperatureSpan.kelvins(-0.0));
        assertEquals(
                TemperatureSpan.kelvins(0.0).hashCode(),
                TemperatureSpan.kelvins(-0.0).hashCode());
        assertEquals(0, TemperatureSpan.kelvins(0.0).compareTo(TemperatureSpan.kelvins(-0.0)));
        assertEquals(0, Power.watts(0).compareTo(Power.watts(5).times(-0.0)));
    }

    @Test
    void valuesOfDifferentKindsAreNeverEqual() {
        final List<Object> ones = new ArrayList<>();
        for (QuantityKind<?, ?> kind : AllKinds.kinds()) {
            ones.add(kind.ofSi(1));
        }
        for (int i = 0; i < ones.size(); i++) {
            for (int j = 0; j < ones.size(); j++) {
                assertEquals(i == j, ones.get(i).equals(ones.get(j)));
            }
        }
        assertNotEquals(ones.get(0), null);
        assertNotEquals(ones.get(0), "1");
    }

    @Test
    void orderFollowsTheValue() {
        final var sorted =
                new TreeSet<>(List.of(Temperature.celsius(100), Temperature.kelvin(300), Temperature.fahrenheit(-40)));
        assertEquals(
                List.of(Temperature.celsius(-40), Temperature.kelvin(300), Temperature.celsius(100)),
                List.copyOf(sorted));
    }

    @Test
    void everyFactoryIsOneUnitOfItsKindAndItsReaderInvertsIt() throws ReflectiveOperationException {
        int pairs = 0;
        for (Class<?> type : AllKinds.classes()) {
            for (Method factory : type.getMethods()) {
                if (!Modifier.isStatic(factory.getModifiers())
                        || factory.getReturnType() != type
                        || factory.getParameterCount() != 1
                        || factory.getParameterTypes()[0] != double.class
                        || type == Money.class) {
                    continue;
                }
                final String name = factory.getName();
                final Object value = factory.invoke(null, 7.25);
                assertTrue(isInSomeUnit(AllKinds.kindOf(type), value, 7.25), factory.toString());
                final String reader = "in" + Character.toUpperCase(name.charAt(0)) + name.substring(1);
                final double back =
                        (double) type.getMethod(readerName(type, reader)).invoke(value);
                assertEquals(7.25, back, 7.25 * 1e-15 + (type == Temperature.class ? 1e-13 : 0), factory.toString());
                pairs++;
            }
        }
        assertTrue(pairs > 100, "pairs found: " + pairs);
    }

    /** Readers of prices say the currency: perTonne(12) is read by a reader that contains PerTonne. */
    private static String readerName(Class<?> type, String wanted) {
        for (Method method : type.getMethods()) {
            if (method.getReturnType() == double.class
                    && method.getParameterCount() == 0
                    && method.getName().equals(wanted)) {
                return wanted;
            }
        }
        final String ending = wanted.substring(2);
        final List<String> candidates = new ArrayList<>();
        for (Method method : type.getMethods()) {
            if (method.getReturnType() == double.class
                    && method.getParameterCount() == 0
                    && method.getName().equalsIgnoreCase(ending)) {
                candidates.add(method.getName());
            }
        }
        assertEquals(1, candidates.size(), type + " has no reader for " + wanted);
        return candidates.get(0);
    }

    private static <Q extends ScalarQuantity<Q, D>, D extends LinearQuantity<D>> boolean isInSomeUnit(
            QuantityKind<Q, D> kind, Object value, double number) {
        return kind.units().stream().anyMatch(unit -> kind.of(number, unit).equals(value));
    }

    @Test
    void factorsAreThePublishedOnes() {
        // NIST SP 811 (2008), appendix B.8, printed there to seven digits, exact ones in bold.
        assertEquals(6894.757, Pressure.psi(1).inPascal(), 5e-4);
        assertEquals(133.3224, Pressure.KIND.of(1, Units.MILLIMETRE_OF_MERCURY).inPascal(), 5e-5);
        assertEquals(133.3224, Pressure.KIND.of(1, Units.TORR).inPascal(), 5e-5);
        assertEquals(98066.5, Pressure.KIND.of(1, Units.TECHNICAL_ATMOSPHERE).inPascal());
        assertEquals(
                249.0889,
                PressureDifference.KIND.of(1, Units.INCH_OF_WATER_DIFFERENCE).si(),
                5e-5);
        assertEquals(745.6999, Power.horsepower(1).inWatts(), 5e-5);
        assertEquals(735.4988, Power.KIND.of(1, Units.METRIC_HORSEPOWER).inWatts(), 5e-5);
        assertEquals(1055.056, Energy.btu(1).inJoules(), 5e-4);
        assertEquals(0.2930711, Power.btuPerHour(1).inWatts(), 5e-8);
        assertEquals(2326, SpecificEnergy.btuPerPound(1).inJoulesPerKilogram());
        assertEquals(4186.8, SpecificEntropy.btuPerPoundRankine(1).inJoulesPerKilogramKelvin());
        assertEquals(1.259979e-4, MassFlow.poundsPerHour(1).si(), 5e-11);
        assertEquals(4.719474e-4, VolumeFlow.cubicFeetPerMinute(1).si(), 5e-11);
        assertEquals(
                6.309020e-5, VolumeFlow.KIND.of(1, Units.US_GALLON_PER_MINUTE).si(), 5e-12);
        assertEquals(16.01846, Density.poundsPerCubicFoot(1).si(), 5e-6);
        assertEquals(0.06242796, SpecificVolume.cubicFeetPerPound(1).si(), 5e-9);
        assertEquals(212, Temperature.celsius(100).inFahrenheit(), 1e-12);
        assertEquals(491.67, Temperature.celsius(0).inRankine(), 1e-12);
    }

    @Test
    void durationsOfTheJavaLibraryComeAndGo() {
        final java.time.Duration theirs = java.time.Duration.ofSeconds(-3, 250_000_000);
        assertEquals(-2.75, Duration.of(theirs).inSeconds());
        assertEquals(theirs, Duration.seconds(-2.75).toJavaTime());
        assertEquals(java.time.Duration.ofHours(8760), Duration.years(1).toJavaTime());
        assertEquals(java.time.Duration.ofNanos(1), Duration.seconds(0.6e-9).toJavaTime());
        final Duration endless = Duration.seconds(1e19);
        assertThrows(ArithmeticException.class, endless::toJavaTime);
    }

    @Test
    void absoluteAndGaugeDifferByTheAtmosphere() {
        final Pressure atmosphere = Pressure.mbar(980);
        final Pressure p = Pressure.barGauge(4, atmosphere);
        assertEquals(4.98, p.inBar(), 1e-15);
        assertEquals(4, p.inBarGauge(atmosphere), 1e-14);
        assertEquals(400, p.inKilopascalGauge(atmosphere), 1e-12);
        assertEquals(4000, p.inMbarGauge(atmosphere), 1e-11);
        assertEquals(p, Pressure.mbarGauge(4000, atmosphere));
        assertEquals(p, Pressure.megapascalGauge(0.4, atmosphere));
        assertEquals(4, p.minus(atmosphere).inBars(), 1e-14);
    }
}
