package lostwork.quantity;

import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.function.DoubleFunction;
import javax.measure.Quantity;
import org.jspecify.annotations.Nullable;

/**
 * A kind of quantity: its name, units, bounds, natural scale, dimension, and the kind of its differences.
 *
 * <p>A user's own kind is made with {@link #linear} and a final subclass of {@link LinearQuantity}. Immutable and
 * thread-safe; there is no list of all kinds, so that none can be added behind a program's back.
 *
 * @param <Q> the quantity
 * @param <D> the quantity that a difference of two values has
 */
public final class QuantityKind<Q extends ScalarQuantity<Q, D>, D extends LinearQuantity<D>> {
    private static final String ANY_FINITE = "is not allowed: it must be a finite number";
    private static final String RESULT_ADVICE = "a division by zero or an overflow may have come before";

    private final String name;
    private final Class<Q> type;
    private final Dimension dimension;
    private final DoubleFunction<Q> factory;
    private final double lowest;
    private final String limitedBy;
    private final String wayOut;
    private final double naturalScale;
    private final QuantityKind<D, D> difference;
    private final Unit<Q> coherentUnit;
    private final List<Unit<Q>> units;
    private final Map<String, Unit<Q>> unitsByKey;
    private final Map<String, String> hintsByKey;

    private QuantityKind(
            String name,
            Class<Q> type,
            Dimension dimension,
            DoubleFunction<Q> factory,
            double lowest,
            String limitedBy,
            String wayOut,
            double naturalScale,
            @Nullable QuantityKind<D, D> difference,
            List<Unit<Q>> units,
            Map<String, String> hintsByKey) {
        if (name.isBlank()) {
            throw new IllegalArgumentException("a kind of quantity needs a name");
        }
        if (!(naturalScale > 0 && naturalScale < Double.POSITIVE_INFINITY)) {
            throw new IllegalArgumentException(
                    name + ": its natural scale " + naturalScale + " must be finite and above 0");
        }
        this.name = name;
        this.type = type;
        this.dimension = dimension;
        this.factory = factory;
        this.lowest = lowest;
        this.limitedBy = limitedBy;
        this.wayOut = wayOut;
        this.naturalScale = naturalScale;
        this.difference = difference == null ? asLinear() : difference;
        this.units = List.copyOf(units);
        this.unitsByKey = table(name, this.units);
        this.coherentUnit = this.units.stream()
                .filter(Unit::isCoherent)
                .findFirst()
                .orElseThrow(() -> new IllegalArgumentException(
                        name + ": one of its units must be the coherent SI unit, with factor 1 and no offset"));
        this.hintsByKey = hintsByKey;
    }

    @SuppressWarnings("unchecked") // only reached from linear(...), where D is Q
    private QuantityKind<D, D> asLinear() {
        return (QuantityKind<D, D>) this;
    }

    private static <Q> Map<String, Unit<Q>> table(String name, List<Unit<Q>> units) {
        final Map<String, Unit<Q>> table = new HashMap<>();
        for (Unit<Q> unit : units) {
            put(table, name, unit, unit.symbol());
            for (String spelling : unit.spellings()) {
                put(table, name, unit, spelling);
            }
        }
        return Map.copyOf(table);
    }

    private static <Q> void put(Map<String, Unit<Q>> table, String name, Unit<Q> unit, String spelling) {
        final Unit<Q> other = table.putIfAbsent(UnitSymbol.key(spelling), unit);
        if (other != null && other != unit) {
            throw new IllegalArgumentException(
                    name + ": the spelling " + spelling + " of " + unit + " is taken by " + other);
        }
    }

    /**
     * {@return a kind whose differences are of the same kind, without bounds}
     *
     * @param <Q> the quantity
     * @param name the name in words, such as {@code "mass flow"}
     * @param type the class of the quantity
     * @param dimension the dimension
     * @param factory makes a value from a number in the coherent SI unit
     * @param naturalScale a typical value in the coherent SI unit, above 0, used to judge residuals
     * @param units the units that are read and printed, the one for display first; the coherent SI unit is one of them
     * @throws IllegalArgumentException if the scale is not above 0, the coherent SI unit is missing, or two units share
     *     a spelling
     */
    public static <Q extends LinearQuantity<Q>> QuantityKind<Q, Q> linear(
            String name,
            Class<Q> type,
            Dimension dimension,
            DoubleFunction<Q> factory,
            double naturalScale,
            List<Unit<Q>> units) {
        return new QuantityKind<>(
                name, type, dimension, factory, -Double.MAX_VALUE, "", "", naturalScale, null, units, Map.of());
    }

    /**
     * {@return a kind whose values are points on a scale and whose differences are of another kind}
     *
     * @param <Q> the quantity
     * @param <D> the quantity of a difference
     * @param name the name in words, such as {@code "temperature"}
     * @param type the class of the quantity
     * @param factory makes a value from a number in the coherent SI unit
     * @param lowest the lowest value that exists, in the coherent SI unit; {@link Double#MIN_VALUE} for values above 0
     * @param naturalScale a typical step in the coherent SI unit, above 0, used to judge residuals
     * @param difference the kind of a difference of two values
     * @param units the units that are read and printed, the one for display first; the coherent SI unit is one of them
     * @throws IllegalArgumentException if the scale is not above 0, the coherent SI unit is missing, or two units share
     *     a spelling
     */
    public static <Q extends ScalarQuantity<Q, D>, D extends LinearQuantity<D>> QuantityKind<Q, D> point(
            String name,
            Class<Q> type,
            DoubleFunction<Q> factory,
            double lowest,
            double naturalScale,
            QuantityKind<D, D> difference,
            List<Unit<Q>> units) {
        return new QuantityKind<>(
                name, type, difference.dimension, factory, lowest, "", "", naturalScale, difference, units, Map.of());
    }

    /**
     * {@return this kind with words for the refusal of values below the lowest one}
     *
     * @param limitedBy what sets the limit, such as {@code "absolute zero"}
     * @param wayOut what the caller can do, as a clause; may be empty
     */
    public QuantityKind<Q, D> withLimit(String limitedBy, String wayOut) {
        return new QuantityKind<>(
                name,
                type,
                dimension,
                factory,
                lowest,
                limitedBy,
                wayOut,
                naturalScale,
                isLinear() ? null : difference,
                units,
                hintsByKey);
    }

    /**
     * {@return this kind with advice for spellings that people write and that are not units of this kind}
     *
     * @param hints the advice, as a clause such as {@code "C is the coulomb: write °C"}, by the spelling
     */
    public QuantityKind<Q, D> withHints(Map<String, String> hints) {
        final Map<String, String> all = new HashMap<>(hintsByKey);
        hints.forEach((spelling, hint) -> all.put(UnitSymbol.key(spelling), hint));
        return new QuantityKind<>(
                name,
                type,
                dimension,
                factory,
                lowest,
                limitedBy,
                wayOut,
                naturalScale,
                isLinear() ? null : difference,
                units,
                Map.copyOf(all));
    }

    /** {@return the name in words} */
    public String name() {
        return name;
    }

    /** {@return the class of the quantity} */
    public Class<Q> type() {
        return type;
    }

    /** {@return the dimension} */
    public Dimension dimension() {
        return dimension;
    }

    /** {@return the lowest value that exists, in the coherent SI unit} */
    public double lowest() {
        return lowest;
    }

    /** {@return a typical value or step in the coherent SI unit, used to judge residuals} */
    public double naturalScale() {
        return naturalScale;
    }

    /** {@return the kind of a difference of two values; the kind itself for linear quantities} */
    public QuantityKind<D, D> difference() {
        return difference;
    }

    /** {@return whether two values can be added: whether a difference of two values is of this kind itself} */
    public boolean isLinear() {
        return difference.type.equals(type);
    }

    /** {@return the unit that {@code toString} prints in} */
    public Unit<Q> displayUnit() {
        return units.get(0);
    }

    /** {@return the coherent SI unit: the one that values are held in} */
    public Unit<Q> coherentUnit() {
        return coherentUnit;
    }

    /** {@return the units that are read and printed, the one for display first} */
    public List<Unit<Q>> units() {
        return units;
    }

    /**
     * {@return the unit that a symbol stands for, such as {@code "t/h"}; spellings as in {@link #parse}}
     *
     * @param symbol the symbol
     * @throws UnreadableQuantityException if this kind has no such unit; the message lists those that it has
     */
    public Unit<Q> unit(String symbol) {
        return unitIn(symbol, symbol);
    }

    /**
     * {@return a value of this kind}
     *
     * @param si the value in the coherent SI unit
     * @throws OutOfRangeException if the value is NaN, infinite or outside the bounds
     */
    public Q ofSi(double si) {
        return factory.apply(si);
    }

    /**
     * {@return a value of this kind from a number and its unit}
     *
     * @param value the number, in the unit
     * @param unit the unit
     * @throws OutOfRangeException if the value is NaN, infinite or outside the bounds
     */
    public Q of(double value, Unit<Q> unit) {
        return factory.apply(requireValid(value, unit));
    }

    /**
     * {@return a value of this kind from a JSR-385 quantity in any unit of the same dimension}
     *
     * <p>The scale of the quantity counts: a relative 5 °C is a span of 5 K and no temperature, an absolute 5 °C is a
     * temperature and no span. Units that count angles (rad, sr) are refused, since SI reads them as plain numbers and
     * no kind here counts angles.
     *
     * @param quantity the quantity
     * @throws IllegalArgumentException if the dimension is another one, or a point is given for a difference or the
     *     reverse
     * @throws UnsupportedOperationException if the kind counts money, for which JSR-385 has no unit
     * @throws OutOfRangeException if the value is not allowed
     */
    public Q of(Quantity<?> quantity) {
        return factory.apply(JsrBridge.toSi(quantity, this));
    }

    /**
     * {@return the value that a text states, such as {@code "3.5 bar"}}
     *
     * <p>A number with a decimal point and perhaps an exponent, then a unit of this kind; blanks between them are free.
     * Units may be spelled with {@code m3}, {@code m^3} or {@code m³}, and {@code kJ/(kg K)}, {@code kJ/(kg·K)},
     * {@code kJ/kg/K} or {@code kJ kg⁻¹ K⁻¹}. The locale of the machine plays no part; decimal commas, separators between
     * groups of digits and numbers without a unit are refused, since they can be misread; only a ratio
     * may stand as a plain number.
     *
     * @param text the text
     * @throws UnreadableQuantityException if the text is not one number with a unit of this kind; the message says what
     *     is wrong and lists the units that are accepted
     * @throws OutOfRangeException if the value is not allowed
     */
    public Q parse(String text) {
        final QuantityText.Split split = QuantityText.split(text, this);
        return of(split.number(), unitIn(text, split.unit()));
    }

    /** {@return the unit with a spelling, or null} */
    @Nullable
    Unit<Q> findUnit(String symbol) {
        return unitsByKey.get(UnitSymbol.key(symbol));
    }

    private Unit<Q> unitIn(String text, String symbol) {
        final Unit<Q> unit = findUnit(symbol);
        if (unit != null) {
            return unit;
        }
        final String key = UnitSymbol.key(symbol);
        final String hint = hintsByKey.get(key);
        if (hint != null) {
            throw QuantityText.refusal(text, this, hint);
        }
        final String quoted = UnreadableQuantityException.quote(symbol);
        final String small = UnitSymbol.key(symbol.toLowerCase(Locale.ROOT));
        final List<Unit<Q>> alike = units.stream()
                .filter(u -> UnitSymbol.key(u.symbol().toLowerCase(Locale.ROOT)).equals(small))
                .toList();
        final String advice;
        if (alike.size() == 1) {
            advice = ": capital and small letters differ, write " + alike.get(0);
        } else if (dimension.money() != 0) {
            advice = ": write ¤ for the currency, whichever it is";
        } else {
            advice = "";
        }
        throw QuantityText.refusal(text, this, quoted + " is no unit of it" + advice);
    }

    /**
     * {@return the value itself, when it is allowed}
     *
     * @param si a value in the coherent SI unit
     * @throws OutOfRangeException if the value is NaN, infinite or below the lowest value that exists
     */
    double requireValid(double si) {
        // Written as !(inside), so that NaN is refused as well.
        if (!(si >= lowest && si <= Double.MAX_VALUE)) {
            throw refusal(si, coherentUnit, RESULT_ADVICE);
        }
        return si;
    }

    /**
     * {@return the value itself, when it is finite, which is all that a linear kind asks}
     *
     * @param si a value in the coherent SI unit
     * @throws OutOfRangeException if the value is NaN or infinite
     */
    double requireFinite(double si) {
        // One comparison and no bound to load: this is on the path of all typed arithmetic.
        if (!(Math.abs(si) <= Double.MAX_VALUE)) {
            throw refusal(si, coherentUnit, RESULT_ADVICE);
        }
        return si;
    }

    /**
     * {@return a value in the coherent SI unit, when it is allowed}
     *
     * @param value a value in the unit
     * @param unit the unit, which a refusal is worded in
     * @throws OutOfRangeException if the value is NaN, infinite or below the lowest value that exists
     */
    double requireValid(double value, Unit<Q> unit) {
        final double si = unit.toSi(value);
        if (!(si >= lowest && si <= Double.MAX_VALUE)) {
            throw refusal(value, unit, "");
        }
        return si;
    }

    private OutOfRangeException refusal(double value, Unit<Q> unit, String advice) {
        if (lowest == -Double.MAX_VALUE) {
            return OutOfRangeException.ofKind(
                    name, value, Double.NEGATIVE_INFINITY, unit.symbol(), "", ANY_FINITE, advice);
        }
        final boolean aboveZero = lowest == Double.MIN_VALUE;
        final double limit = unit.fromSi(aboveZero ? 0 : lowest);
        final String finding = (Double.isFinite(value) ? "is not allowed: it must be " : ANY_FINITE + " ")
                + (aboveZero ? "above " : "at least ") + QuantityText.shortest(limit) + " " + unit.symbol();
        return OutOfRangeException.ofKind(
                name, value, limit, unit.symbol(), limitedBy, finding, Double.isFinite(value) ? wayOut : advice);
    }

    /** {@return the name} */
    @Override
    public String toString() {
        return name;
    }
}
