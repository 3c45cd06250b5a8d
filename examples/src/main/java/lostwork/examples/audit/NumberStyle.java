package lostwork.examples.audit;

import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * How the numbers of one file are written: with a decimal point, with a decimal comma, or in a way that cannot be told.
 *
 * <p>Files separated by commas have decimal points. In files separated by semicolons both marks are in use, and
 * {@code 12,500} may be twelve and a half or twelve thousand five hundred. A mark counts as decimal there when at least
 * one number of the file can only be read that way ({@code 412,5} or {@code 0,125}) and the other mark is nowhere used.
 * Thousands separators are never accepted.
 */
final class NumberStyle {
    /** A number at the start of a text: sign, digits and marks, exponent. */
    private static final Pattern NUMBER =
            Pattern.compile("[+\\-\u2212]?(?=[.,]?[0-9])[0-9.,]+(?:[eE][+\\-]?[0-9]+(?![A-Za-z0-9]))?");

    private static final Pattern ONE_MARK = Pattern.compile("[+\\-\u2212]?([0-9]*)[.,]([0-9]+)(?:[eE].*)?");

    private final Marks marks;

    private enum Marks {
        POINT,
        COMMA,
        /** The file holds no number that shows which mark is decimal. */
        UNDECIDED,
        /** The file uses points and commas. */
        MIXED
    }

    /**
     * A number and the text that follows it.
     *
     * @param value the number
     * @param written the number as it stands in the file
     * @param rest what follows, such as a unit, without outer blanks
     */
    record Leading(double value, String written, String rest) {}

    private NumberStyle(Marks marks) {
        this.marks = marks;
    }

    static NumberStyle decimalPoint() {
        return new NumberStyle(Marks.POINT);
    }

    /**
     * {@return the style that the numbers in some texts show}
     *
     * @param texts the cells of a file separated by semicolons that may hold numbers
     */
    static NumberStyle shownBy(Iterable<String> texts) {
        boolean point = false;
        boolean comma = false;
        boolean clear = false;
        for (String text : texts) {
            final Matcher number = NUMBER.matcher(text);
            while (number.find()) {
                final String written = number.group();
                point |= written.indexOf('.') >= 0;
                comma |= written.indexOf(',') >= 0;
                clear |= isClear(written);
            }
        }
        if (point && comma) {
            return new NumberStyle(Marks.MIXED);
        }
        if (!clear) {
            return new NumberStyle(Marks.UNDECIDED);
        }
        return new NumberStyle(comma ? Marks.COMMA : Marks.POINT);
    }

    /** {@return whether the one mark in a number can only be decimal: it does not set off a group of three digits} */
    private static boolean isClear(String written) {
        final Matcher number = ONE_MARK.matcher(written);
        if (!number.matches()) {
            return false;
        }
        final String before = number.group(1);
        return number.group(2).length() != 3 || before.isEmpty() || before.startsWith("0") || before.length() > 3;
    }

    /** {@return how numbers are read, as the end of a sentence; empty where that is not settled} */
    String inWords() {
        return switch (marks) {
            case POINT -> " and a decimal point";
            case COMMA -> " and a decimal comma";
            case UNDECIDED, MIXED -> "";
        };
    }

    /**
     * {@return the number that a text starts with, and the rest}
     *
     * @param text the text, such as {@code 86 t/h}
     * @throws CellRefusedException if the text does not start with a number, or it cannot be told which number is meant
     */
    Leading leading(String text) {
        final Matcher number = NUMBER.matcher(text);
        if (!number.lookingAt()) {
            throw new CellRefusedException("\"" + text + "\" does not start with a number", acceptedNumber());
        }
        final String written = number.group();
        return new Leading(value(written), written, text.substring(number.end()).strip());
    }

    private double value(String written) {
        final boolean marked = written.indexOf('.') >= 0 || written.indexOf(',') >= 0;
        if (marked && marks == Marks.MIXED) {
            throw new CellRefusedException(
                    "\"" + written + "\" cannot be read, since the file uses both points and commas in its numbers:"
                            + " which one is the decimal mark cannot be told",
                    "one decimal mark in the whole file, and no thousands separators");
        }
        if (marked && marks == Marks.UNDECIDED) {
            throw new CellRefusedException(
                    "\"" + written + "\" may be a decimal number or have a thousands separator: no number in the file"
                            + " tells which",
                    "numbers without thousands separators; write \"" + written + "0\" or leave the mark out");
        }
        final char decimal = marks == Marks.COMMA ? ',' : '.';
        final char other = marks == Marks.COMMA ? '.' : ',';
        if (written.indexOf(other) >= 0 || written.indexOf(decimal) != written.lastIndexOf(decimal)) {
            throw new CellRefusedException("\"" + written + "\" is not a number", acceptedNumber());
        }
        final String plain = written.replace('\u2212', '-').replace(',', '.');
        if (plain.endsWith(".")) {
            throw new CellRefusedException("\"" + written + "\" ends with a decimal mark", acceptedNumber());
        }
        final double value = Double.parseDouble(plain);
        if (Double.isInfinite(value)) {
            throw new CellRefusedException("\"" + written + "\" is too large", acceptedNumber());
        }
        return value;
    }

    private String acceptedNumber() {
        return marks == Marks.COMMA
                ? "a number such as 1250,5 with a decimal comma as in the rest of the file, without thousands separators"
                : "a number such as 1250.5 with a decimal point, without thousands separators";
    }
}
