package lostwork.examples.audit;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/** Prints numbers with a decimal point whatever the locale of the machine. */
final class Decimals {
    private Decimals() {}

    /** {@return a number with a fixed count of digits behind the point; a rounded zero has no sign} */
    static String fixed(double value, int digits) {
        final BigDecimal rounded = new BigDecimal(value).setScale(digits, RoundingMode.HALF_EVEN);
        return rounded.signum() == 0 ? BigDecimal.ZERO.setScale(digits).toPlainString() : rounded.toPlainString();
    }

    /** {@return a number rounded to some significant digits and to a whole number} */
    static String significant(double value, int digits) {
        return new BigDecimal(value)
                .round(new MathContext(digits, RoundingMode.HALF_EVEN))
                .toBigInteger()
                .toString();
    }

    /** {@return a number rounded to six digits behind the point, without trailing zeros} */
    static String shortest(double value) {
        final BigDecimal rounded = new BigDecimal(value).setScale(6, RoundingMode.HALF_EVEN);
        return rounded.signum() == 0 ? "0" : rounded.stripTrailingZeros().toPlainString();
    }
}
