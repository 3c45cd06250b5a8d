package lostwork.fluid.gas;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;

class DataFileTest {
    private static final String GOOD = """
            # a comment
            name = X
            description = example
            phase = gas
            elements = H 2
            molar mass, g/mol = 2.01588
            formation enthalpy at 298.15 K, J/mol = 0.0
            origin of the digits = invented
            status = verified
            range, K = 200.0 1000.0
            a1..a7 = 0 0 3.5 0 0 0 0
            b1 b2 = -1043.525 0
            range, K = 1000.0 2000.0
            a1..a7 = 0 0 3.5 0 0 0 0
            b1 b2 = -1043.525 0.0
            """;

    private static SpeciesRecord read(String text) {
        return SpeciesRecord.read(DataFile.of("X.txt", text.lines().toList()));
    }

    private static void refuses(String good, String bad, int line, String why) {
        assertTrue(GOOD.contains(good), good);
        final DataFileException refused = assertThrows(
                DataFileException.class, () -> read(GOOD.replaceFirst(java.util.regex.Pattern.quote(good), bad)));
        assertEquals(line, refused.line(), refused.getMessage());
        assertEquals("X.txt", refused.file());
        assertTrue(refused.getMessage().contains(why), refused.getMessage());
        assertTrue(
                refused.getMessage().startsWith(line > 0 ? "X.txt:" + line + ": " : "X.txt: "), refused.getMessage());
    }

    @Test
    void readsAGoodFile() {
        final SpeciesRecord record = read(GOOD);
        assertEquals("X", record.name());
        assertEquals(2000, record.curve().highest());
        assertEquals(3.5 * 8.31451, record.curve().heatCapacity(500), 1e-12);
    }

    @Test
    void namesFileAndLineOfABadOne() {
        refuses("elements = H 2", "elements = Q 2", 5, "'Q' is no element");
        refuses("elements = H 2", "elements = H", 5, "pairs");
        refuses("molar mass, g/mol = 2.01588", "molar mass, g/mol = 2,01588", 6, "'2,01588' is not a number");
        refuses("a1..a7 = 0 0 3.5 0 0 0 0", "a1..a7 = 0 0 3.5 0 0 0", 11, "expected 7 numbers");
        refuses("a1..a7 = 0 0 3.5 0 0 0 0", "a1..a7 = 0 0 NaN 0 0 0 0", 11, "not a finite number");
        refuses("b1 b2 = -1043.525 0\nrange", "range", 14, "three lines");
        refuses("b1 b2 = -1043.525 0.0", "b1 b2 = -1043.535 0.0", 0, "jump");
        refuses("b1 b2 = -1043.525 0.0", "b1 b2 = -1043.525 0.1", 0, "jump");
        refuses("J/mol = 0.0", "J/mol = 100.0", 0, "formation enthalpy");
        refuses("range, K = 1000.0 2000.0", "range, K = 1100.0 2000.0", 13, "does not begin where");
        refuses("range, K = 200.0 1000.0", "range, K = 1000.0 200.0", 10, "ends at or below");
        refuses("status = verified", "stutas = verified", 9, "unknown key 'stutas'");
        refuses("status = verified", "verified", 9, "key = value");
        refuses("phase = gas", "phase = plasma", 4, "gas, liquid or solid");
        refuses("name = X\n", "", 0, "missing");
    }

    @Test
    void namesAMissingFile() {
        final DataFileException refused =
                assertThrows(DataFileException.class, () -> DataFile.resource("species/none.txt"));
        assertEquals(0, refused.line());
        assertEquals("species/none.txt: the file is missing from the module", refused.getMessage());
    }

    @Test
    void skipsCommentsAndKeepsLineNumbers() {
        final DataFile file = DataFile.of("f", List.of("# c", "", "  a = 1 "));
        assertEquals(1, file.lines().size());
        assertEquals(3, file.lines().get(0).place());
        assertEquals(1, file.lines().get(0).number());
    }
}
