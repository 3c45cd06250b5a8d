package lostwork.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.lang.reflect.Method;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;

/** Every product and quotient has the dimension and the value that physics gives it. */
class ArithmeticTest {
    private static final double A = 6.25;
    private static final double B = 1.75;

    private static boolean isQuantity(Class<?> type) {
        return ScalarQuantity.class.isAssignableFrom(type) && type != ScalarQuantity.class;
    }

    @Test
    void productsAndQuotientsHaveTheirDimensionAndValue() throws ReflectiveOperationException {
        int methods = 0;
        for (Class<?> type : AllKinds.classes()) {
            final QuantityKind<?, ?> kind = AllKinds.kindOf(type);
            for (Method method : type.getDeclaredMethods()) {
                final boolean product = method.getName().equals("times");
                if (!product && !method.getName().equals("over")
                        || method.isBridge()
                        || method.getParameterCount() != 1
                        || !isQuantity(method.getParameterTypes()[0])) {
                    continue;
                }
                final QuantityKind<?, ?> other = AllKinds.kindOf(method.getParameterTypes()[0]);
                final QuantityKind<?, ?> result = AllKinds.kindOf(method.getReturnType());
                assertEquals(
                        product
                                ? kind.dimension().times(other.dimension())
                                : kind.dimension().dividedBy(other.dimension()),
                        result.dimension(),
                        method.toString());
                final var value = (ScalarQuantity<?, ?>) method.invoke(kind.ofSi(A), other.ofSi(B));
                assertEquals(product ? A * B : A / B, value.si(), method.toString());
                methods++;
            }
        }
        assertTrue(methods > 200, "methods found: " + methods);
    }

    /** {@return the result class of every product or quotient of two kinds, by the classes of the two} */
    private static Map<List<Class<?>>, Class<?>> results(String name) {
        final Map<List<Class<?>>, Class<?>> results = new HashMap<>();
        for (Class<?> type : AllKinds.classes()) {
            for (Method method : type.getDeclaredMethods()) {
                if (method.getName().equals(name)
                        && method.getParameterCount() == 1
                        && isQuantity(method.getParameterTypes()[0])
                        && method.getParameterTypes()[0] != Ratio.class) {
                    results.put(List.of(type, method.getParameterTypes()[0]), method.getReturnType());
                }
            }
        }
        return results;
    }

    @Test
    void everyProductCanBeWrittenEitherWay() {
        final Map<List<Class<?>>, Class<?>> products = results("times");
        assertTrue(products.size() > 100, "products found: " + products.size());
        products.forEach((factors, result) ->
                assertEquals(result, products.get(List.of(factors.get(1), factors.get(0))), factors.toString()));
    }

    @Test
    void everyProductHasItsQuotients() {
        final Map<List<Class<?>>, Class<?>> quotients = results("over");
        results("times").forEach((factors, result) -> {
            final boolean ofPoints = factors.contains(Temperature.class) || factors.contains(Pressure.class);
            final boolean ambiguous = factors.equals(List.of(TemperatureSpan.class, HeatCapacityRate.class));
            if (!ofPoints && !ambiguous) {
                assertEquals(factors.get(1), quotients.get(List.of(result, factors.get(0))), factors + " = " + result);
            }
        });
        assertEquals(Conductance.class, quotients.get(List.of(Power.class, TemperatureSpan.class)));
    }

    @Test
    void quotientsOfAKindAreRatios() {
        assertEquals(Ratio.fraction(0.25), Power.kilowatts(1).over(Power.kilowatts(4)));
        assertEquals(Ratio.fraction(12), Pressure.bar(12).over(Pressure.bar(1)));
        assertEquals(Ratio.fraction(0.5), Temperature.kelvin(300).over(Temperature.kelvin(600)));
        assertEquals(Ratio.percent(12), Ratio.percent(88).complement());
    }

    @Test
    void pointsAndSpans() {
        assertEquals(TemperatureSpan.kelvins(20), Temperature.celsius(45).minus(Temperature.celsius(25)));
        assertEquals(Temperature.celsius(45), Temperature.celsius(25).plus(TemperatureSpan.kelvins(20)));
        assertEquals(TemperatureSpan.rankines(9), TemperatureSpan.kelvins(5));
        assertEquals(PressureDifference.bars(2), Pressure.bar(3).minus(Pressure.bar(1)));
    }

    @Test
    void theWorkedSums() {
        // Common practice, no source: 1 kg/s of water warmed by 10 K at 4.2 kJ/(kg K) takes 42 kW.
        final MassFlow flow = MassFlow.kilogramsPerSecond(1);
        final Power heat = flow.times(SpecificHeatCapacity.kilojoulesPerKilogramKelvin(4.2))
                .times(TemperatureSpan.kelvins(10));
        assertEquals(42, heat.inKilowatts(), 1e-13);
        assertEquals(Conductance.kilowattsPerKelvin(4.2), heat.over(TemperatureSpan.kelvins(10)));
        assertEquals(Temperature.kelvin(300), Power.watts(600).over(EntropyRate.wattsPerKelvin(2)));
        assertEquals(EntropyRate.wattsPerKelvin(2), EntropyRate.ofHeat(Power.watts(600), Temperature.kelvin(300)));
        assertEquals(
                SpecificEnergy.joulesPerKilogram(450), Speed.metresPerSecond(30).kineticEnergy());
        assertEquals(Duration.years(4), Money.of(200).over(MoneyRate.perYear(50)));
    }
}
