package lostwork.fluid.water;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.math.BigDecimal;

/**
 * A number exactly as a table prints it, so that the tolerance follows from the print and is never chosen.
 *
 * <p>A source that rounds correctly guarantees its true value to half a unit of the last printed digit.
 * Nothing tighter can be claimed; anything looser would hide an error.
 */
record PrintedValue(BigDecimal printed) {
    /** Room for rounding in our own double arithmetic, relative. Small against nine printed digits. */
    private static final double ARITHMETIC = 1e-12;

    /** {@return the value} @param text the digits as printed, trailing zeros kept */
    public static PrintedValue of(String text) {
        return new PrintedValue(new BigDecimal(text));
    }

    /** {@return half a unit of the last printed digit} */
    public double halfUnit() {
        return printed.ulp().doubleValue() / 2;
    }

    /** Fails unless {@code actual} would be printed the same way. @param actual value in the table's unit
     * @param where table, row and column, for the failure message */
    public void assertMatches(double actual, String where) {
        final double expected = printed.doubleValue();
        assertEquals(expected, actual, halfUnit() + ARITHMETIC * Math.abs(expected), where);
    }
}
