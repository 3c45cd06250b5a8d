package lostwork.quantity;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.lang.reflect.Field;
import java.util.ArrayDeque;
import java.util.Arrays;
import java.util.Deque;
import java.util.HashMap;
import java.util.HashSet;
import java.util.Map;
import java.util.Set;
import javax.measure.IncommensurableException;
import javax.measure.MetricPrefix;
import javax.measure.Quantity.Scale;
import javax.measure.UnitConverter;
import net.jqwik.api.Arbitraries;
import net.jqwik.api.Arbitrary;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.Provide;
import org.junit.jupiter.api.Test;
import tech.units.indriya.AbstractUnit;
import tech.units.indriya.quantity.Quantities;
import tech.units.indriya.unit.BaseUnit;
import tech.units.indriya.unit.Units;

/**
 * Every unit of the library against Indriya's converters.
 *
 * <p>The Indriya unit is built independently: the name of the constant is taken apart word by word, and each word is an
 * Indriya unit of its own or has its definition here (NIST SP 811 (2008), appendix B: pound 0.45359237 kg, foot 0.3048 m,
 * standard gravity 9.80665 m/s², International Table Btu by 1 Btu/lb = 2.326 J/g).
 */
class IndriyaLawTest {
    private static final javax.measure.Unit<?> CURRENCY = new BaseUnit<>("¤", "currency", new OneDimension());
    private static final javax.measure.Unit<?> POUND = Units.KILOGRAM.multiply(0.45359237);
    private static final javax.measure.Unit<?> FOOT = Units.METRE.multiply(0.3048);
    private static final javax.measure.Unit<?> INCH = FOOT.divide(12);
    private static final javax.measure.Unit<?> GRAVITY =
            Units.METRE.divide(Units.SECOND.pow(2)).multiply(9.80665);
    private static final javax.measure.Unit<?> POUND_FORCE = POUND.multiply(GRAVITY);
    private static final javax.measure.Unit<?> RANKINE =
            Units.KELVIN.multiply(5).divide(9);
    private static final Map<String, javax.measure.Unit<?>> WORDS = words();

    /** Stands for money, which JSR-385 has no dimension for. */
    private static final class OneDimension implements javax.measure.Dimension {
        @Override
        public javax.measure.Dimension multiply(javax.measure.Dimension other) {
            return other;
        }

        @Override
        public javax.measure.Dimension divide(javax.measure.Dimension other) {
            return other;
        }

        @Override
        public javax.measure.Dimension pow(int n) {
            return this;
        }

        @Override
        public javax.measure.Dimension root(int n) {
            return this;
        }

        @Override
        public Map<? extends javax.measure.Dimension, Integer> getBaseDimensions() {
            return Map.of();
        }
    }

    private static Map<String, javax.measure.Unit<?>> words() {
        final Map<String, javax.measure.Unit<?>> w = new HashMap<>();
        w.put("KELVIN", Units.KELVIN);
        w.put("RANKINE", RANKINE);
        w.put("PASCAL", Units.PASCAL);
        w.put("BAR", Units.PASCAL.multiply(100_000));
        w.put("ATMOSPHERE", Units.PASCAL.multiply(101_325));
        w.put(
                "TECHNICAL_ATMOSPHERE",
                Units.KILOGRAM.multiply(GRAVITY).divide(Units.METRE.divide(100).pow(2)));
        w.put("TORR", Units.PASCAL.multiply(101_325).divide(760));
        // 13595.1 kg/m³ and 1000 kg/m³ are the densities that the conventional columns are defined with.
        w.put("MILLIMETRE_OF_MERCURY", column(13_595.1).divide(1000));
        w.put("MILLIMETRE_OF_WATER", column(1000).divide(1000));
        w.put("INCH_OF_WATER", column(1000).multiply(0.0254));
        w.put("PSI", POUND_FORCE.divide(INCH.pow(2)));
        w.put("JOULE", Units.JOULE);
        w.put("BTU", Units.JOULE.multiply(2326).multiply(0.45359237));
        w.put("WATT", Units.WATT);
        w.put("HORSEPOWER", POUND_FORCE.multiply(FOOT).divide(Units.SECOND).multiply(550));
        w.put(
                "METRIC_HORSEPOWER",
                Units.KILOGRAM
                        .multiply(GRAVITY)
                        .multiply(Units.METRE)
                        .divide(Units.SECOND)
                        .multiply(75));
        w.put("GRAM", Units.GRAM);
        w.put("TONNE", Units.KILOGRAM.multiply(1000));
        w.put("POUND", POUND);
        w.put("MOLE", Units.MOLE);
        w.put("METRE", Units.METRE);
        w.put("FOOT", FOOT);
        w.put("INCH", INCH);
        w.put("LITRE", Units.LITRE);
        w.put("US_GALLON", INCH.pow(3).multiply(231));
        w.put("SECOND", Units.SECOND);
        w.put("MINUTE", Units.MINUTE);
        w.put("HOUR", Units.HOUR);
        w.put("DAY", Units.DAY);
        w.put("YEAR", Units.HOUR.multiply(8760));
        w.put("NEWTON", Units.NEWTON);
        w.put("REVOLUTION", AbstractUnit.ONE);
        w.put("FRACTION", AbstractUnit.ONE);
        w.put("PERCENT", Units.PERCENT);
        w.put("PER_MILLE", AbstractUnit.ONE.divide(1000));
        w.put("PER_MILLION", AbstractUnit.ONE.divide(1_000_000));
        w.put("CURRENCY", CURRENCY);
        w.put("CURRENCY_UNIT", CURRENCY);
        return w;
    }

    /** {@return the pressure under one metre of a liquid} */
    private static javax.measure.Unit<?> column(double density) {
        return Units.KILOGRAM
                .divide(Units.METRE.pow(3))
                .multiply(density)
                .multiply(GRAVITY)
                .multiply(Units.METRE);
    }

    /** {@return the Indriya unit that the name of a constant spells} */
    static javax.measure.Unit<?> spelled(String constant) {
        if (constant.equals("CELSIUS")) {
            return Units.CELSIUS;
        }
        if (constant.equals("FAHRENHEIT")) {
            return RANKINE.shift(459.67);
        }
        if (WORDS.containsKey(constant)) {
            return WORDS.get(constant);
        }
        final String name = constant.replaceAll("_(SPAN|DIFFERENCE|CAPACITY|ENTROPY)$", "");
        if (WORDS.containsKey(name)) {
            return WORDS.get(name);
        }
        final String[] parts = name.split("_PER_", 2);
        final javax.measure.Unit<?> numerator = product(parts[0]);
        return parts.length == 1 ? numerator : numerator.divide(product(parts[1]));
    }

    private static javax.measure.Unit<?> product(String words) {
        if (WORDS.containsKey(words)) {
            return WORDS.get(words);
        }
        javax.measure.Unit<?> unit = AbstractUnit.ONE;
        final Deque<String> left = new ArrayDeque<>(Arrays.asList(words.split("_")));
        while (!left.isEmpty()) {
            final String word = left.pop();
            unit = switch (word) {
                case "SQUARE" -> unit.multiply(factor(left.pop()).pow(2));
                case "CUBIC" -> unit.multiply(factor(left.pop()).pow(3));
                default -> unit.multiply(factor(word));
            };
        }
        return unit;
    }

    private static javax.measure.Unit<?> factor(String word) {
        if (WORDS.containsKey(word)) {
            return WORDS.get(word);
        }
        for (MetricPrefix prefix : MetricPrefix.values()) {
            final String name = prefix.name();
            if (word.startsWith(name) && WORDS.containsKey(word.substring(name.length()))) {
                return WORDS.get(word.substring(name.length())).prefix(prefix);
            }
        }
        throw new IllegalStateException("no definition of " + word);
    }

    /** The Indriya unit of every constant, and its converter to the coherent unit of the kind. */
    private record Theirs(String name, javax.measure.Unit<?> unit, UnitConverter toSi, UnitConverter fromSi) {
        static Theirs of(Unit<?> unit, QuantityKind<?, ?> kind) {
            final String name = CONSTANTS.get(unit);
            final javax.measure.Unit<?> theirs = spelled(name);
            try {
                final UnitConverter toSi = theirs.getConverterToAny(coherent(kind.dimension()));
                return new Theirs(name, theirs, toSi, toSi.inverse());
            } catch (IncommensurableException e) {
                throw new IllegalStateException(name, e);
            }
        }
    }

    private static final Map<Unit<?>, String> CONSTANTS = constants();
    private static final Map<Unit<?>, Theirs> THEIRS = theirs();

    private static Map<Unit<?>, Theirs> theirs() {
        final Map<Unit<?>, Theirs> theirs = new HashMap<>();
        for (QuantityKind<?, ?> kind : AllKinds.kinds()) {
            for (Unit<?> unit : kind.units()) {
                theirs.put(unit, Theirs.of(unit, kind));
            }
        }
        return theirs;
    }

    private static Map<Unit<?>, String> constants() {
        final Map<Unit<?>, String> constants = new HashMap<>();
        for (Field field : lostwork.quantity.Units.class.getFields()) {
            try {
                constants.put((Unit<?>) field.get(null), field.getName());
            } catch (IllegalAccessException e) {
                throw new IllegalStateException(e);
            }
        }
        return constants;
    }

    private static javax.measure.Unit<?> coherent(Dimension d) {
        return Units.METRE
                .pow(d.length())
                .multiply(Units.KILOGRAM.pow(d.mass()))
                .multiply(Units.SECOND.pow(d.time()))
                .multiply(Units.KELVIN.pow(d.temperature()))
                .multiply(Units.MOLE.pow(d.amount()))
                .multiply(CURRENCY.pow(d.money()));
    }

    @Provide
    Arbitrary<Double> values() {
        return Arbitraries.doubles().between(-12, 12).map(exponent -> Math.pow(10, exponent));
    }

    @Test
    void everyConstantIsAUnitOfExactlyOneKind() {
        final Set<Unit<?>> used = new HashSet<>();
        for (QuantityKind<?, ?> kind : AllKinds.kinds()) {
            for (Unit<?> unit : kind.units()) {
                assertTrue(used.add(unit), kind + " shares " + unit);
            }
        }
        assertEquals(CONSTANTS.keySet(), used);
        assertTrue(used.size() > 120);
    }

    @Property(seed = "21", tries = 200)
    void everyUnitAgreesWithIndriya(@ForAll("values") double value) {
        THEIRS.forEach((unit, theirs) -> {
            final double expected = theirs.toSi().convert(value);
            final double zeroPoint = Math.abs(unit.offset() * unit.factor());
            assertEquals(expected, unit.toSi(value), 1e-15 * (Math.abs(expected) + 2 * zeroPoint), theirs.name());
            final double back = theirs.fromSi().convert(value);
            assertEquals(
                    back, unit.fromSi(value), 1e-15 * (Math.abs(back) + 2 * Math.abs(unit.offset())), theirs.name());
        });
    }

    @Property(seed = "22", tries = 30)
    void quantitiesOfEveryUnitComeInAndGoOut(@ForAll("values") double value) {
        for (QuantityKind<?, ?> kind : AllKinds.kinds()) {
            if (kind.dimension().money() == 0) {
                inAndOut(kind, value);
            }
        }
    }

    private static <Q extends ScalarQuantity<Q, D>, D extends LinearQuantity<D>> void inAndOut(
            QuantityKind<Q, D> kind, double value) {
        for (Unit<Q> unit : kind.units()) {
            final Q ours = kind.of(value, unit);
            final Q read =
                    kind.of(Quantities.getQuantity(value, THEIRS.get(unit).unit(), Scale.ABSOLUTE));
            assertEquals(ours.si(), read.si(), 1e-15 * (ours.si() + 2 * Math.abs(unit.offset() * unit.factor())));
        }
        final Q ours = kind.ofSi(value);
        assertEquals(ours, kind.of(ours.asQuantity()));
    }

    @Test
    void theNamesAreTakenApartRight() {
        assertTrue(spelled("WATT_PER_SQUARE_METRE_KELVIN")
                .isCompatible(Units.KILOGRAM.divide(Units.SECOND.pow(3)).divide(Units.KELVIN)));
        assertTrue(spelled("MICROPASCAL_SECOND").isCompatible(Units.PASCAL.multiply(Units.SECOND)));
    }
}
