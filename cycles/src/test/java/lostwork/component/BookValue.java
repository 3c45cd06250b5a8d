package lostwork.component;

import static org.junit.jupiter.api.Assertions.assertEquals;

import lostwork.testing.PrintedValue;

/** A printed figure of a book whose property tables differ from ours by more than the print. */
record BookValue(PrintedValue printed) {
    static BookValue of(String digits) {
        return new BookValue(PrintedValue.of(digits));
    }

    void assertMatches(double actual, String where) {
        printed.assertMatches(actual, where);
    }

    /** Half a unit of the last digit and the room that the tables of the book need, in the unit of the value. */
    void assertMatches(double actual, double room, String where) {
        assertEquals(printed.value(), actual, printed.halfUnit() + room, where);
    }
}
