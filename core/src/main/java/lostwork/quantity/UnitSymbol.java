package lostwork.quantity;

import java.util.Map;
import java.util.TreeMap;

/**
 * Reduces the spellings of a unit to one key, so that {@code kJ/(kg K)}, {@code kJ/kg/K}, {@code kJ/(kg·K)} and
 * {@code kJ kg⁻¹ K⁻¹} are the same unit.
 *
 * <p>A product is written with a space, a dot or a star; a solidus divides by the next factor or by a group in
 * parentheses, as ISO 80000-1:2009, 7.2.2 has it. Letters keep their case: mW is not MW. A text that does not follow this
 * grammar, such as {@code bar(a)}, is its own key.
 */
final class UnitSymbol {
    /** Longer texts are no symbols of units; the limit also bounds how deep parentheses nest. */
    private static final int LONGEST = 64;

    private static final String SUPERSCRIPTS = "⁰¹²³⁴⁵⁶⁷⁸⁹";

    private final String text;
    private int at;
    private final Map<String, Integer> exponents = new TreeMap<>();

    private UnitSymbol(String text) {
        this.text = text;
    }

    /**
     * {@return the key of a symbol}
     *
     * @param symbol the symbol as written
     */
    static String key(String symbol) {
        if (symbol.length() > LONGEST) {
            return symbol;
        }
        final String plain = plain(symbol);
        final UnitSymbol reader = new UnitSymbol(plain);
        if (!reader.product(1, false)) {
            return plain;
        }
        final StringBuilder key = new StringBuilder();
        reader.exponents.forEach((token, exponent) -> {
            if (exponent != 0) {
                key.append(key.length() == 0 ? "" : " ")
                        .append(token)
                        .append('^')
                        .append(exponent);
            }
        });
        return key.length() == 0 ? "1" : key.toString();
    }

    /** Replaces look-alike characters and runs of blanks; superscripts become {@code ^} and digits. */
    private static String plain(String symbol) {
        final StringBuilder out = new StringBuilder(symbol.length());
        boolean raised = false;
        boolean blank = false;
        for (int i = 0; i < symbol.length(); i++) {
            final char c = symbol.charAt(i);
            if (QuantityText.isBlank(c)) {
                blank = out.length() > 0;
                continue;
            }
            if (blank) {
                out.append(' ');
                blank = false;
            }
            final int digit = SUPERSCRIPTS.indexOf(c);
            if (digit >= 0 || c == '⁻') {
                if (!raised) {
                    out.append('^');
                }
                out.append(digit >= 0 ? (char) ('0' + digit) : '-');
                raised = true;
                continue;
            }
            raised = false;
            switch (c) {
                case '·', '⋅', '∙', '×', '*' -> out.append('*');
                case 'μ' -> out.append('µ'); // Greek mu for the micro sign
                case 'º', '˚' -> out.append('°'); // ordinal and ring for the degree sign
                case '℃' -> out.append("°C");
                case '℉' -> out.append("°F");
                case '−' -> out.append('-');
                case '∕', '⁄' -> out.append('/');
                default -> out.append(c);
            }
        }
        return out.toString();
    }

    /** Reads factors up to the end, or up to a closing parenthesis; false if the text is not of this grammar. */
    private boolean product(int sign, boolean inGroup) {
        int next = sign;
        while (true) {
            skipBlank();
            if (!factor(next)) {
                return false;
            }
            final int before = at;
            skipBlank();
            if (at == text.length()) {
                return !inGroup;
            }
            final char c = text.charAt(at);
            if (c == ')') {
                at++;
                return inGroup;
            }
            if (c == '/' || c == '*') {
                at++;
                next = c == '/' ? -sign : sign;
            } else if (at > before) {
                next = sign;
            } else {
                return false;
            }
        }
    }

    private void skipBlank() {
        while (at < text.length() && text.charAt(at) == ' ') {
            at++;
        }
    }

    private boolean factor(int sign) {
        if (at < text.length() && text.charAt(at) == '(') {
            at++;
            return product(sign, true);
        }
        final int start = at;
        while (at < text.length() && " */()^+-0123456789".indexOf(text.charAt(at)) < 0) {
            at++;
        }
        final String token = text.substring(start, at);
        if (token.isEmpty()) {
            // The only number that stands for a unit is 1, as in 1/min.
            final boolean one = at < text.length() && text.charAt(at) == '1';
            at++;
            return one;
        }
        final int exponent = exponent();
        if (exponent == 0) {
            return false;
        }
        exponents.merge(token, sign * exponent, Integer::sum);
        return true;
    }

    /** {@return the exponent that stands here, 1 if none, 0 if what stands here is not a whole number of one digit} */
    private int exponent() {
        boolean wanted = false;
        if (at < text.length() && text.charAt(at) == '^') {
            wanted = true;
            at++;
        }
        int sign = 1;
        if (at < text.length() && (text.charAt(at) == '-' || text.charAt(at) == '+')) {
            wanted = true;
            sign = text.charAt(at) == '-' ? -1 : 1;
            at++;
        }
        if (at < text.length() && text.charAt(at) >= '0' && text.charAt(at) <= '9') {
            return sign * (text.charAt(at++) - '0');
        }
        return wanted ? 0 : 1;
    }
}
