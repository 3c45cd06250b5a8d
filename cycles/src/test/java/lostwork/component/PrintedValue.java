package lostwork.component;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.math.BigDecimal;

/**
 * A number exactly as a source prints it, so that the tolerance follows from the print and is never chosen: half a unit of
 * the last digit.
 */
record PrintedValue(BigDecimal printed) {
    /** Room for rounding in double arithmetic, relative. */
    private static final double ARITHMETIC = 1e-12;

    static PrintedValue of(String digits) {
        return new PrintedValue(new BigDecimal(digits));
    }

    /** Fails unless a value would be printed the same way. */
    void assertMatches(double actual, String where) {
        assertMatches(actual, 0, where);
    }

    /** The same with room for a stated difference between the data of the source and ours, in the unit of the value. */
    void assertMatches(double actual, double dataDifference, String where) {
        final double expected = printed.doubleValue();
        final double halfUnit = printed.ulp().doubleValue() / 2;
        assertEquals(expected, actual, halfUnit + dataDifference + ARITHMETIC * Math.abs(expected), where);
    }
}
