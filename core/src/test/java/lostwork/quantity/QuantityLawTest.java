package lostwork.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import net.jqwik.api.constraints.DoubleRange;
import net.jqwik.api.constraints.IntRange;

/** Identities that hold for every kind, every unit and every value. */
class QuantityLawTest {
    private static final List<QuantityKind<?, ?>> KINDS = AllKinds.kinds();

    /** Values of every size, where a unit of any kind has room for them. */
    @Provide
    Arbitrary<Double> sizes() {
        return Arbitraries.doubles().between(-30, 30).map(exponent -> Math.pow(10, exponent));
    }

    @Property(seed = "1")
    void aValueReadInAUnitIsTheValueGivenInIt(@ForAll("sizes") double value) {
        KINDS.forEach(kind -> roundTrip(kind, value));
    }

    private static <Q extends ScalarQuantity<Q, D>, D extends LinearQuantity<D>> void roundTrip(
            QuantityKind<Q, D> kind, double value) {
        for (Unit<Q> unit : kind.units()) {
            final double back = kind.of(value, unit).in(unit);
            // Offset, factor and divisor are applied on the way in and on the way out: six roundings of 2^-53 at most.
            final double largest = Math.abs(value) + Math.abs(unit.offset());
            assertEquals(value, back, 6 * 0x1p-53 * largest, kind + " in " + unit);
        }
    }

    @Property(seed = "2", tries = 200)
    void theReaderInvertsTheExactText(@ForAll double value) {
        for (QuantityKind<?, ?> kind : KINDS) {
            final double allowed = kind.isLinear() ? value : Math.max(Math.abs(value), Double.MIN_VALUE);
            final ScalarQuantity<?, ?> quantity = (ScalarQuantity<?, ?>) kind.ofSi(allowed);
            assertEquals(quantity, kind.parse(quantity.toExactString()));
        }
    }

    @Property(seed = "3", tries = 200)
    void theReaderInvertsThePrinterToItsDigits(
            @ForAll("sizes") double value, @ForAll @IntRange(min = 1, max = 17) int digits) {
        KINDS.forEach(kind -> printed(kind, value, digits));
    }

    private static <Q extends ScalarQuantity<Q, D>, D extends LinearQuantity<D>> void printed(
            QuantityKind<Q, D> kind, double value, int digits) {
        for (Unit<Q> unit : kind.units()) {
            final Q quantity = kind.of(value, unit);
            final String text = quantity.format(unit, digits);
            final double shown = quantity.in(unit);
            final double back = kind.parse(text).in(unit);
            final double lastDigit = Math.pow(10, Math.floor(Math.log10(Math.abs(shown))) - digits + 1);
            final double largest = Math.abs(shown) + Math.abs(unit.offset());
            assertEquals(shown, back, lastDigit / 2 * (1 + 1e-12) + 3 * Math.ulp(largest), text);
            // Printing what was read gives the same text, as long as the digits are fewer than a double holds.
            if (digits <= 12 && unit.offset() == 0) {
                assertEquals(text, kind.parse(text).format(unit, digits));
            }
        }
    }

    @Property(seed = "4", tries = 200)
    void theShortTextIsReadToSevenDigits(@ForAll("sizes") double value) {
        for (QuantityKind<?, ?> kind : KINDS) {
            // Within 1e-4 K of absolute zero, seven digits in °C round to a temperature that does not exist.
            final double si = kind == Temperature.KIND ? Math.max(value, 1e-4) : value;
            final ScalarQuantity<?, ?> quantity = (ScalarQuantity<?, ?>) kind.ofSi(si);
            final ScalarQuantity<?, ?> back = (ScalarQuantity<?, ?>) kind.parse(quantity.toString());
            final double zeroPoint = kind == Temperature.KIND ? 273.15 : 0;
            assertEquals(si, back.si(), 5.01e-7 * (si + zeroPoint), quantity.toString());
        }
    }

    @Property(seed = "5")
    void pointsAndSpansFormAnAffineSpace(
            @ForAll @DoubleRange(min = 1, max = 3000) double a,
            @ForAll @DoubleRange(min = 1, max = 3000) double b,
            @ForAll @DoubleRange(min = 0, max = 3000) double c) {
        final Temperature t1 = Temperature.kelvin(a);
        final Temperature t2 = Temperature.kelvin(b);
        final TemperatureSpan span = TemperatureSpan.kelvins(c);
        assertEquals(b, t1.plus(t2.minus(t1)).inKelvin(), 1e-12);
        assertEquals(t1.minus(t2), t2.minus(t1).negated());
        assertEquals(TemperatureSpan.kelvins(0), t1.minus(t1));
        assertEquals(a, t1.plus(span).minus(span).inKelvin(), 1e-12);
        assertEquals(
                t1.plus(span).minus(t2).inKelvins(), t1.minus(t2).plus(span).inKelvins(), 1e-12);
        final Pressure p1 = Pressure.kilopascal(a);
        final Pressure p2 = Pressure.kilopascal(b);
        assertEquals(p2.inPascal(), p1.plus(p2.minus(p1)).inPascal(), 1e-8);
        assertEquals(p1.minus(p2), p2.minus(p1).negated());
        // A span is as large on every scale that differs only in its zero.
        assertEquals(t1.inCelsius() - t2.inCelsius(), t1.minus(t2).inKelvins(), 1e-12);
        assertEquals(t1.inFahrenheit() - t2.inFahrenheit(), t1.minus(t2).inRankines(), 3e-12);
    }

    @Property(seed = "6")
    void linearKindsFormAVectorSpace(
            @ForAll @DoubleRange(min = -1e6, max = 1e6) double a,
            @ForAll @DoubleRange(min = -1e6, max = 1e6) double b,
            @ForAll @DoubleRange(min = -1e3, max = 1e3) double k) {
        int linear = 0;
        for (QuantityKind<?, ?> kind : KINDS) {
            if (kind.isLinear()) {
                linear++;
                vectorSpace(kind.difference(), a, b, k);
            }
        }
        assertEquals(KINDS.size() - 2, linear);
    }

    private static <Q extends LinearQuantity<Q>> void vectorSpace(
            QuantityKind<Q, Q> kind, double a, double b, double k) {
        final Q x = kind.ofSi(a);
        final Q y = kind.ofSi(b);
        final double tiny = 1e-9 * (1 + Math.abs(k));
        assertEquals(x.plus(y), y.plus(x));
        assertEquals(x.minus(y), y.minus(x).negated());
        assertEquals(x.si(), x.plus(y).minus(y).si(), tiny);
        assertEquals(x.times(k).plus(y.times(k)).si(), x.plus(y).times(k).si(), tiny);
        assertEquals(x.times(k), x.times(Ratio.fraction(k)));
        assertEquals(x.magnitude(), x.negated().magnitude());
        assertEquals(kind.ofSi(0), x.minus(x));
        if (b != 0 && Double.isFinite(a / b)) {
            assertEquals(Ratio.fraction(a / b), x.over(y));
        }
        assertEquals(Double.compare(a + 0.0, b + 0.0), x.compareTo(y));
        assertEquals(a == b, x.equals(y));
    }

    @Property(seed = "7", tries = 50)
    void aUnitIsReadFromEachOfItsSpellings(@ForAll("sizes") double value) {
        KINDS.forEach(kind -> spellings(kind, value));
    }

    private static <Q extends ScalarQuantity<Q, D>, D extends LinearQuantity<D>> void spellings(
            QuantityKind<Q, D> kind, double value) {
        final String number = QuantityText.shortest(value);
        for (Unit<Q> unit : kind.units()) {
            final Q expected = kind.of(value, unit);
            final List<String> all = new ArrayList<>(unit.spellings());
            all.add(unit.symbol());
            for (String spelling : all) {
                assertEquals(expected, kind.parse(number + " " + spelling));
                assertEquals(
                        expected,
                        kind.parse(
                                number + "\u00a0" + spelling.replace('²', '2').replace('³', '3')));
            }
        }
    }

    @Property(seed = "8", tries = 20)
    void manyThreadsReadAndPrintTheSame(@ForAll("sizes") double value) throws Exception {
        final List<String> expected = texts(value);
        final ExecutorService pool = Executors.newFixedThreadPool(8);
        try {
            final List<Callable<Boolean>> tasks = new ArrayList<>();
            for (int i = 0; i < 64; i++) {
                tasks.add(() -> texts(value).equals(expected));
            }
            for (Future<Boolean> result : pool.invokeAll(tasks)) {
                assertTrue(result.get());
            }
        } finally {
            pool.shutdownNow();
        }
    }

    private static List<String> texts(double value) {
        final List<String> texts = new ArrayList<>();
        for (QuantityKind<?, ?> kind : KINDS) {
            final ScalarQuantity<?, ?> quantity = (ScalarQuantity<?, ?>) kind.ofSi(value);
            texts.add(quantity + " " + kind.parse(quantity.toExactString()));
        }
        return texts;
    }
}
