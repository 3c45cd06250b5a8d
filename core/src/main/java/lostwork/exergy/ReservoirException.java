package lostwork.exergy;

import lostwork.quantity.Temperature;

/**
 * Thrown when a law is asked about temperatures between which it says nothing: in the wrong order, or equal where the answer
 * would be infinite.
 */
public final class ReservoirException extends IllegalArgumentException {
    private static final long serialVersionUID = 1L;

    /** Why a law says nothing about two temperatures. */
    public enum Reason {
        /** The hot side is colder than the cold side. */
        REVERSED,
        /** Both sides have the same temperature, and the answer would be infinite. */
        EQUAL
    }

    /** Why. */
    private final Reason reason;
    /** The temperature given for the hot side. */
    private final Temperature hot;
    /** The temperature given for the cold side. */
    private final Temperature cold;

    private ReservoirException(Reason reason, Temperature hot, Temperature cold, String message) {
        super(message);
        this.reason = reason;
        this.hot = hot;
        this.cold = cold;
    }

    static ReservoirException reversed(double hot, double cold) {
        return of(
                Reason.REVERSED,
                hot,
                cold,
                " is below the cold side, ",
                "; give the hot side first, then the cold side");
    }

    static ReservoirException equal(double hot, double cold) {
        return of(
                Reason.EQUAL,
                hot,
                cold,
                " equals the cold side, ",
                ": heat moves between them without work, and the coefficient of performance has no finite value");
    }

    private static ReservoirException of(Reason reason, double hot, double cold, String relation, String wayOut) {
        final Temperature hotSide = Temperature.kelvin(hot);
        final Temperature coldSide = Temperature.kelvin(cold);
        return new ReservoirException(
                reason, hotSide, coldSide, "hot side at " + hotSide + relation + coldSide + wayOut);
    }

    /** {@return why the law says nothing} */
    public Reason reason() {
        return reason;
    }

    /** {@return the temperature given for the hot side} */
    public Temperature hot() {
        return hot;
    }

    /** {@return the temperature given for the cold side} */
    public Temperature cold() {
        return cold;
    }
}
