package lostwork.quantity;

import java.io.IOException;
import java.io.InvalidObjectException;
import java.io.ObjectInputStream;
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
     * @throws IllegalArgumentException if the value is NaN, infinite or outside the bounds of the kind
     */
    protected ScalarQuantity(double si, QuantityKind<Q, D> kind) {
        this.si = kind.requireValid(si);
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
        return QuantityText.print(unit.fromSi(si), significantDigits) + " " + unit.symbol();
    }

    /** {@return the value as a JSR-385 quantity in the coherent SI unit} */
    public final Quantity<?> asQuantity() {
        return JsrBridge.toQuantity(si, kind().dimension());
    }

    @Override
    public final int compareTo(Q other) {
        final ScalarQuantity<Q, D> that = other;
        return Double.compare(si, that.si);
    }

    @Override
    public final boolean equals(Object other) {
        return other != null
                && other.getClass() == getClass()
                && Double.compare(si, ((ScalarQuantity<?, ?>) other).si) == 0;
    }

    @Override
    public final int hashCode() {
        return Double.hashCode(si);
    }

    /** {@return the value in the display unit of its kind, up to seven significant digits, such as {@code 540 °C}} */
    @Override
    public final String toString() {
        final Unit<Q> unit = kind().displayUnit();
        return QuantityText.printShort(unit.fromSi(si), 7) + " " + unit.symbol();
    }

    /**
     * Reads a value and applies the checks of its kind.
     *
     * @param in the stream to read from
     * @throws IOException if the stream fails or the value is not allowed
     * @throws ClassNotFoundException if a class of the stream is missing
     */
    private void readObject(ObjectInputStream in) throws IOException, ClassNotFoundException {
        in.defaultReadObject();
        try {
            kind().requireValid(si);
        } catch (IllegalArgumentException e) {
            final InvalidObjectException refused = new InvalidObjectException(e.getMessage());
            refused.initCause(e);
            throw refused;
        }
    }
}
