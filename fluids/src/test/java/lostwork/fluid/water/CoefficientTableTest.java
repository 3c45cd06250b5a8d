package lostwork.fluid.water;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.StringReader;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class CoefficientTableTest {
    private static CoefficientTable parse(String text) throws IOException {
        return CoefficientTable.parse("table.txt", new BufferedReader(new StringReader(text)));
    }

    @Test
    void readsReferencesInSi() throws IOException {
        final CoefficientTable table =
                parse("# comment\nargument p_MPa 16.53 -1 7.1\nresult h_kJ_kg 2500 1\ncolumns I J n\n1 -2 0.5\n");
        assertEquals(16.53e6, table.argument(0).reference());
        assertEquals(-1 / 16.53e6, table.argument(0).scale());
        assertEquals(2500e3, table.result().reference());
        assertEquals(-2, table.exponent(0, 1, 1));
        assertEquals(0.5, table.coefficient(0));
    }

    @ParameterizedTest
    @ValueSource(strings = {"1 2", "1 2 x", "1 2 NaN", "1 2 3 4", "argument p_MPa 1"})
    void aBadLineStopsWithFileAndNumber(String line) {
        final IllegalStateException refusal =
                assertThrows(IllegalStateException.class, () -> parse("# a\ncolumns I J n\n1 2 3\n" + line + "\n"));
        assertTrue(refusal.getMessage().startsWith("resource table.txt, line 4: "), refusal::getMessage);
    }

    @Test
    void aMissingFileIsNamed() {
        final IllegalStateException refusal =
                assertThrows(IllegalStateException.class, () -> CoefficientTable.read("if97/none.txt"));
        assertTrue(refusal.getMessage().contains("if97/none.txt"), refusal::getMessage);
    }
}
