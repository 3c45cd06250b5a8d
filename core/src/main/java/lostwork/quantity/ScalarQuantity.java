package lostwork.quantity;

import java.io.InvalidObjectException;
import java.io.ObjectStreamException;
import java.io.Serializable;
import javax.measure.Quantity;

/**
 * A value of one kind of quantity: a single {@code double} in the coherent SI unit, with its meaning in the type.
 *
 * <p>Each quantity has a final subclass of its own, so that the compiler keeps temperatures apart from temperature spans
 * and energies per mass apart from energies per mole. A user who needs another kind writes a subclass and a
 * {@link QuantityKind} for it.
 *
 * <p>A value is always finite and within the bounds of its kind; nothing else can be constructed or deserialised.
 * Immutable and thread-safe.
 *
 * @param <Q> the quantity itself
 * @param <D> the quantity that a difference of two values has: a span for a temperature, itself for an energy
 */
public abstract class ScalarQuantity<Q extends ScalarQuantity<Q, D>, D extends LinearQuantity<D>>
        implements Comparable<Q>, Serializable {
    private static final long serialVersionUID = 1L;

    /** The value in the coherent SI unit of the kind. */
    private final double si;

    /**
     * Checks and stores a value.
     *
     * @param si the value in the coherent SI unit
     * @param kind the kind, which sets the bounds
     * @throws OutOfRangeException if the value is NaN, infinite or outside the bounds of the kind
     */
    protected ScalarQuantity(double si, QuantityKind<Q, D> kind) {
        this.si = kind.requireValid(si);
    }

    /** Stores a value that is already checked. */
    ScalarQuantity(double checkedSi) {
        this.si = checkedSi;
    }

    /**
     * Checks and stores a value that is given in a unit; a refusal is worded in that unit.
     *
     * @param value the value in the unit
     * @param unit the unit
     * @param kind the kind, which sets the bounds
     * @throws OutOfRangeException if the value is NaN, infinite or outside the bounds of the kind
     */
    protected ScalarQuantity(double value, Unit<Q> unit, QuantityKind<Q, D> kind) {
        this.si = kind.requireValid(value, unit);
    }

    /** {@return the kind of this quantity: its units, bounds, scale and difference} */
    public abstract QuantityKind<Q, D> kind();

    /** {@return the value in the coherent SI unit of its kind} */
    public final double si() {
        return si;
    }

    /**
     * {@return the value in a unit}
     *
     * @param unit the unit to read the value in
     */
    public final double in(Unit<Q> unit) {
        return unit.fromSi(si);
    }

    /**
     * {@return the value as text in a unit, such as {@code 12.50 bar}; independent of locale}
     *
     * @param unit the unit to print in
     * @param significantDigits how many significant digits to print, 1 to 17
     * @throws IllegalArgumentException if the number of digits is outside 1 to 17
     */
    public final String format(Unit<Q> unit, int significantDigits) {
        return QuantityText.withUnit(QuantityText.print(unit.fromSi(si), significantDigits), unit);
    }

    /**
     * {@return a text that {@code parse} of the same kind reads back as an equal value, such as {@code 813.15 K}}
     *
     * <p>It is in the coherent SI unit, with as many digits as it takes, and meant for files; {@link #toString} is meant
     * for people.
     */
    public final String toExactString() {
        return QuantityText.withUnit(QuantityText.shortest(si), kind().coherentUnit());
    }

    /**
     * {@return the value as a JSR-385 quantity in the coherent SI unit}
     *
     * @throws UnsupportedOperationException if the kind counts money, for which JSR-385 has no unit
     */
    public final Quantity<?> asQuantity() {
        return JsrBridge.toQuantity(si, kind());
    }

    /**
     * {@return the value as a JSR-385 quantity in a unit of the same dimension}
     *
     * @param <U> the JSR-385 type of the unit
     * @param unit the unit
     * @throws IllegalArgumentException if the unit has another dimension, or counts angles
     * @throws UnsupportedOperationException if the kind counts money, for which JSR-385 has no unit
     */
    public final <U extends Quantity<U>> Quantity<U> asQuantity(javax.measure.Unit<U> unit) {
        return JsrBridge.toQuantity(si, kind(), unit);
    }

    @Override
    public final int compareTo(Q other) {
        final ScalarQuantity<Q, D> that = other;
        return Double.compare(si + 0.0, that.si + 0.0); // + 0.0 makes -0.0 and 0.0 one number
    }

    @Override
    public final boolean equals(Object other) {
        return other != null && other.getClass() == getClass() && si == ((ScalarQuantity<?, ?>) other).si;
    }

    @Override
    public final int hashCode() {
        return Double.hashCode(si + 0.0);
    }

    /** {@return the value in the display unit of its kind, up to seven significant digits, such as {@code 540 °C}} */
    @Override
    public final String toString() {
        final Unit<Q> unit = kind().displayUnit();
        return QuantityText.withUnit(QuantityText.printShort(unit.fromSi(si), 7), unit);
    }

    /**
     * {@return the value that was read from a stream, checked and made as every other value is}
     *
     * @throws ObjectStreamException if the value is not allowed
     */
    protected final Object readResolve() throws ObjectStreamException {
        try {
            return kind().ofSi(si);
        } catch (IllegalArgumentException e) {
            final InvalidObjectException refused = new InvalidObjectException(e.getMessage());
            refused.initCause(e);
            throw refused;
        }
    }
}
