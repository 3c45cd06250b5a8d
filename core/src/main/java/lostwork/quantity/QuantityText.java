package lostwork.quantity;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/** Reads and prints values with units, independent of locale and of threads. */
final class QuantityText {
    private QuantityText() {}

    static String print(double value, int significantDigits) {
        if (!(significantDigits >= 1 && significantDigits <= 17)) {
            throw new IllegalArgumentException("significant digits = " + significantDigits + " is outside 1 .. 17");
        }
        final BigDecimal exact = new BigDecimal(value);
        if (exact.signum() == 0) {
            return "0";
        }
        final BigDecimal rounded = exact.round(new MathContext(significantDigits, RoundingMode.HALF_EVEN));
        final int exponent = rounded.precision() - rounded.scale() - 1;
        final BigDecimal padded = rounded.setScale(significantDigits - 1 - exponent);
        return exponent >= -5 && exponent < Math.max(significantDigits, 7)
                ? padded.toPlainString()
                : scientific(padded, exponent);
    }

    static String printShort(double value, int significantDigits) {
        final String text = print(value, significantDigits);
        final int mark = text.indexOf('e');
        final String digits = mark < 0 ? text : text.substring(0, mark);
        if (digits.indexOf('.') < 0) {
            return text;
        }
        int end = digits.length();
        while (digits.charAt(end - 1) == '0') {
            end--;
        }
        if (digits.charAt(end - 1) == '.') {
            end--;
        }
        return digits.substring(0, end) + (mark < 0 ? "" : text.substring(mark));
    }

    private static String scientific(BigDecimal value, int exponent) {
        return value.movePointLeft(exponent).toPlainString() + "e" + exponent;
    }

    static <Q extends ScalarQuantity<Q, ?>> double read(String text, QuantityKind<Q, ?> kind) {
        final String trimmed = text.strip();
        final int gap = trimmed.indexOf(' ');
        if (gap > 0) {
            final String symbol = trimmed.substring(gap + 1).strip();
            for (Unit<Q> unit : kind.units()) {
                if (unit.symbol().equals(symbol) || unit.spellings().contains(symbol)) {
                    return unit.toSi(Double.parseDouble(trimmed.substring(0, gap)));
                }
            }
        }
        throw new IllegalArgumentException(
                "\"" + text + "\" is no " + kind.name() + ": write a number and one of " + kind.units());
    }
}
