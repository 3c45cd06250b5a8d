package lostwork.examples.bench;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.File;
import java.lang.reflect.Field;
import java.lang.reflect.Method;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Objects;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Setup;

/** Each benchmark runs once, and gives the number that its baseline gives. Times are the business of the benchmarks. */
class BenchmarksRunTest {
    /** The same formula in another order of operations: rounding, no more. */
    private static final double SAME = 1e-11;

    private static List<Class<?>> benchmarks() throws ReflectiveOperationException {
        final Class<?> beside = BenchmarkReport.class;
        // The folder of a class, since the tests have a folder of the same name.
        final String path = Objects.requireNonNull(beside.getResource(beside.getSimpleName() + ".class"))
                .getPath();
        final List<Class<?>> found = new ArrayList<>();
        for (String file : Objects.requireNonNull(new File(path).getParentFile().list())) {
            if (file.endsWith("Benchmark.class")) {
                found.add(Class.forName(beside.getPackageName() + "." + file.replace(".class", "")));
            }
        }
        return found;
    }

    @Test
    void allAreFound() throws ReflectiveOperationException {
        assertTrue(benchmarks().contains(PlantBenchmark.class), benchmarks().toString());
        assertTrue(benchmarks().size() >= 6, benchmarks().toString());
    }

    @TestFactory
    Stream<DynamicTest> eachGivesTheNumberOfItsBaseline() throws ReflectiveOperationException {
        final List<DynamicTest> tests = new ArrayList<>();
        for (Class<?> type : benchmarks()) {
            for (List<Object> values : cases(parameters(type))) {
                tests.add(DynamicTest.dynamicTest(type.getSimpleName() + " " + values, () -> runAll(type, values)));
            }
        }
        return tests.stream();
    }

    private static void runAll(Class<?> type, List<Object> values) throws ReflectiveOperationException {
        for (Method method : type.getMethods()) {
            if (method.isAnnotationPresent(Benchmark.class)) {
                final double result = run(type, values, method);
                assertTrue(Double.isFinite(result) && result != 0, method.getName() + " = " + result);
                final HeldTo heldTo = method.getAnnotation(HeldTo.class);
                if (heldTo != null) {
                    final double baseline = run(type, values, type.getMethod(heldTo.baseline()));
                    if (!heldTo.otherResult()) {
                        assertEquals(baseline, result, SAME * Math.abs(baseline), method.getName());
                    }
                }
            }
        }
    }

    private static double run(Class<?> type, List<Object> values, Method method) throws ReflectiveOperationException {
        final Object state = type.getConstructor().newInstance();
        final List<Field> parameters = parameters(type);
        for (int i = 0; i < parameters.size(); i++) {
            parameters.get(i).set(state, values.get(i));
        }
        for (Method setup : type.getMethods()) {
            if (setup.isAnnotationPresent(Setup.class)) {
                setup.invoke(state);
            }
        }
        return ((Number) method.invoke(state)).doubleValue();
    }

    private static List<Field> parameters(Class<?> type) {
        return Arrays.stream(type.getFields())
                .filter(field -> field.isAnnotationPresent(Param.class))
                .toList();
    }

    /** {@return all combinations of the values that the parameters take} */
    private static List<List<Object>> cases(List<Field> parameters) {
        List<List<Object>> cases = List.of(List.of());
        for (Field parameter : parameters) {
            final List<String> named =
                    List.of(parameter.getAnnotation(Param.class).value());
            final List<List<Object>> longer = new ArrayList<>();
            for (Object value : parameter.getType().getEnumConstants()) {
                if (named.contains(Param.BLANK_ARGS) || named.contains(value.toString())) {
                    for (List<Object> start : cases) {
                        longer.add(
                                Stream.concat(start.stream(), Stream.of(value)).toList());
                    }
                }
            }
            cases = longer;
        }
        return cases;
    }
}
