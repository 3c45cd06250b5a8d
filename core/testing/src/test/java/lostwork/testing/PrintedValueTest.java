package lostwork.testing;

import static org.junit.jupiter.api.Assertions.assertDoesNotThrow;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Test;

class PrintedValueTest {
    @Test
    void takesTheToleranceFromTheLastDigit() {
        assertEquals(0.05, PrintedValue.of("0.1").halfUnit());
        assertEquals(0.005, PrintedValue.of("0.10").halfUnit());
        assertEquals(0.5, PrintedValue.of("-120").halfUnit());
        assertEquals(5e-9, PrintedValue.of("0.263889776e1").halfUnit(), 1e-24);
    }

    @Test
    void refusesTheNextDigitOnly() {
        final PrintedValue printed = PrintedValue.of("2.63889776");
        assertDoesNotThrow(() -> printed.assertMatches(2.638897764, "below half a unit"));
        assertThrows(AssertionError.class, () -> printed.assertMatches(2.638897766, "above half a unit"));
        assertThrows(AssertionError.class, () -> printed.assertMatches(Double.NaN, "no number"));
    }

    @Test
    void readsNumbersOnly() {
        assertThrows(NumberFormatException.class, () -> PrintedValue.of("1,5"));
    }
}
