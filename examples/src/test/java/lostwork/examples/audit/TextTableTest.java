package lostwork.examples.audit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import lostwork.examples.audit.TextTable.Alignment;
import lostwork.examples.audit.TextTable.Column;
import org.junit.jupiter.api.Test;

class TextTableTest {
    private static TextTable table() {
        return new TextTable(
                List.of(new Column("Stream", "", Alignment.LEFT), new Column("Heat", "kW", Alignment.RIGHT)));
    }

    @Test
    void alignsWordsLeftAndNumbersRight() {
        final TextTable table = table();
        table.add("\u00c4ther", "1.5");
        table.add("a much longer one", "12345.0");
        assertEquals(
                List.of(
                        "Stream                Heat",
                        "                        kW",
                        "-----------------  -------",
                        "\u00c4ther                  1.5",
                        "a much longer one  12345.0"),
                table.lines());
    }

    @Test
    void refusesARowOfAnotherWidth() {
        assertThrows(IllegalArgumentException.class, () -> table().add("one"));
    }
}
