package lostwork.exergy;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.math.BigDecimal;

/**
 * A number exactly as a source prints it, so that the tolerance follows from the print and is never chosen: half a unit of
 * the last printed digit, plus 1e-12 relative for double arithmetic.
 */
record PrintedValue(BigDecimal printed) {
    static PrintedValue of(String text) {
        return new PrintedValue(new BigDecimal(text));
    }

    void assertMatches(double actual, String where) {
        final double expected = printed.doubleValue();
        assertEquals(expected, actual, printed.ulp().doubleValue() / 2 + 1e-12 * Math.abs(expected), where);
    }
}
