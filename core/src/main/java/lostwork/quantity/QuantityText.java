package lostwork.quantity;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/**
 * Splits a text into number and unit, and prints numbers, independent of locale and of threads.
 *
 * <p>Numbers have a decimal point, no separators between groups of digits, and an exponent after {@code e} or {@code E}
 * at will.
 */
final class QuantityText {
    /** Enough digits for any double to be read back as itself. */
    private static final int EXACT_DIGITS = 17;

    private QuantityText() {}

    /** A number and what is written after it. */
    record Split(double number, String unit) {}

    /**
     * {@return the number and the unit that a text is made of}
     *
     * @param text the text
     * @param kind the wanted kind, for the message
     * @throws UnreadableQuantityException if the text is not one number with something that may be a unit
     */
    static Split split(String text, QuantityKind<?, ?> kind) {
        final String trimmed = strip(text);
        final int end = endOfNumber(trimmed);
        if (end == 0) {
            throw refusal(text, kind, trimmed.isEmpty() ? "it is empty" : "it does not start with a number");
        }
        final String rest = trimmed.substring(end);
        final String unit = strip(rest);
        requireOneNumber(text, rest, unit, kind);
        final String digits = trimmed.substring(0, end).replace('−', '-');
        final double number = Double.parseDouble(digits);
        if (number == 0 && hasNonZeroDigit(digits)) {
            throw refusal(text, kind, "the number is too small to be held");
        }
        if (Double.isInfinite(number)) {
            throw refusal(text, kind, "the number is too large to be held");
        }
        return new Split(number, unit.isEmpty() ? Unit.ONE_SYMBOL : unit);
    }

    private static void requireOneNumber(String text, String rest, String unit, QuantityKind<?, ?> kind) {
        if (unit.isEmpty()) {
            if (kind.findUnit(Unit.ONE_SYMBOL) == null) {
                throw refusal(text, kind, "the unit is missing");
            }
            return;
        }
        final char mark = rest.charAt(0);
        final char first = unit.charAt(0);
        if (mark == ',') {
            throw refusal(text, kind, "a comma is no decimal mark and no separator here: write 3.5 and 1000");
        }
        if (mark == '.') {
            throw refusal(text, kind, "a number has one decimal point");
        }
        if (mark == '\'' || mark == '’' || mark == '_') {
            throw refusal(text, kind, "digits are written without separators: write 1000");
        }
        final boolean startsWithOne = unit.equals("1") || unit.startsWith("1/");
        if (first >= '0' && first <= '9' && !startsWithOne || "+-−±".indexOf(first) >= 0) {
            throw refusal(text, kind, "a second number follows the first: write 1000 without a space, and one value");
        }
    }

    /** {@return the refusal of a text} */
    static UnreadableQuantityException refusal(String text, QuantityKind<?, ?> kind, String problem) {
        final StringBuilder accepted = new StringBuilder("a number with a decimal point and a unit, one of ");
        for (int i = 0; i < kind.units().size(); i++) {
            accepted.append(i == 0 ? "" : ", ").append(kind.units().get(i).symbol());
        }
        return new UnreadableQuantityException(text, kind.name(), problem, accepted.toString());
    }

    private static int endOfNumber(String s) {
        int i = 0;
        if (i < s.length() && "+-−".indexOf(s.charAt(i)) >= 0) {
            i++;
        }
        final int whole = i;
        i = endOfDigits(s, i);
        int digits = i - whole;
        if (i < s.length() && s.charAt(i) == '.') {
            final int fraction = endOfDigits(s, i + 1);
            digits += fraction - i - 1;
            i = digits == 0 ? i : fraction;
        }
        if (digits == 0) {
            return 0;
        }
        if (i < s.length() && (s.charAt(i) == 'e' || s.charAt(i) == 'E')) {
            final boolean signed = i + 1 < s.length() && "+-−".indexOf(s.charAt(i + 1)) >= 0;
            final int from = signed ? i + 2 : i + 1;
            final int to = endOfDigits(s, from);
            return to > from ? to : i;
        }
        return i;
    }

    private static int endOfDigits(String s, int from) {
        int i = from;
        while (i < s.length() && s.charAt(i) >= '0' && s.charAt(i) <= '9') {
            i++;
        }
        return i;
    }

    private static boolean hasNonZeroDigit(String number) {
        for (int i = 0; i < number.length(); i++) {
            final char c = number.charAt(i);
            if (c == 'e' || c == 'E') {
                return false;
            }
            if (c >= '1' && c <= '9') {
                return true;
            }
        }
        return false;
    }

    /** {@return whether a character is a blank, the no-break kinds that word processors write included} */
    static boolean isBlank(char c) {
        return Character.isWhitespace(c) || Character.isSpaceChar(c) || c == '\uFEFF';
    }

    private static String strip(String s) {
        int from = 0;
        int to = s.length();
        while (from < to && isBlank(s.charAt(from))) {
            from++;
        }
        while (to > from && isBlank(s.charAt(to - 1))) {
            to--;
        }
        return s.substring(from, to);
    }

    /** {@return a printed number with its unit; the unit one is not written (ISO 80000-1:2009, 3.8)} */
    static String withUnit(String number, Unit<?> unit) {
        return unit.symbol().equals(Unit.ONE_SYMBOL) ? number : number + " " + unit.symbol();
    }

    /**
     * {@return a number with a given count of significant digits}
     *
     * @param value the number
     * @param significantDigits how many digits, 1 to 17
     */
    static String print(double value, int significantDigits) {
        if (!(significantDigits >= 1 && significantDigits <= EXACT_DIGITS)) {
            throw new IllegalArgumentException("significant digits = " + significantDigits + " is outside 1 .. 17");
        }
        if (!Double.isFinite(value)) {
            return Double.toString(value);
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
                : padded.movePointLeft(exponent).toPlainString() + "e" + exponent;
    }

    /** {@return a number with at most the given count of significant digits, without zeros at its end} */
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

    /** {@return the number with the fewest digits of 15, 16 and 17 that read back as the same double, less final zeros} */
    static String shortest(double value) {
        for (int digits = 15; digits < EXACT_DIGITS; digits++) {
            final String text = printShort(value, digits);
            if (Double.parseDouble(text) == value) {
                return text;
            }
        }
        return printShort(value, EXACT_DIGITS);
    }
}
