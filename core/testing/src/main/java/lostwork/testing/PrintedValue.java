package lostwork.testing;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.math.BigDecimal;

/**
 * A number exactly as a source prints it, so that the tolerance follows from the print and is never chosen.
 *
 * <p>A source that rounds correctly guarantees its true value to half a unit of the last printed digit. Nothing tighter
 * can be claimed; anything looser would hide an error. Trailing zeros count: {@code "0.10"} is ten times as sharp as
 * {@code "0.1"}, and an exponent moves the last digit: {@code "0.263889776e1"} ends at the ninth decimal times ten.
 */
public final class PrintedValue {
    /** Room for rounding in our own double arithmetic, relative. Small against nine printed digits. */
    private static final double ARITHMETIC = 1e-12;

    private final BigDecimal printed;

    private PrintedValue(BigDecimal printed) {
        this.printed = printed;
    }

    /**
     * {@return the value}
     *
     * @param digits the digits as printed, trailing zeros kept
     * @throws NumberFormatException if this is no number
     */
    public static PrintedValue of(String digits) {
        return new PrintedValue(new BigDecimal(digits));
    }

    /** {@return the number itself} */
    public double value() {
        return printed.doubleValue();
    }

    /** {@return half a unit of the last printed digit} */
    public double halfUnit() {
        return printed.ulp().doubleValue() / 2;
    }

    /**
     * Fails unless a value would be printed the same way.
     *
     * @param actual value in the unit of the source
     * @param where table, row and column, for the failure message
     */
    public void assertMatches(double actual, String where) {
        assertMatches(actual, 0, where);
    }

    /**
     * Fails unless a value would be printed the same way but for a difference that the data of the source explain, such as
     * another formulation of the properties; the test says which.
     *
     * @param actual value in the unit of the source
     * @param dataDifference largest difference that is explained, in the unit of the source
     * @param where table, row and column, for the failure message
     */
    public void assertMatches(double actual, double dataDifference, String where) {
        assertEquals(value(), actual, halfUnit() + dataDifference + ARITHMETIC * Math.abs(value()), where);
    }

    /** {@return the digits} */
    @Override
    public String toString() {
        return printed.toString();
    }
}
