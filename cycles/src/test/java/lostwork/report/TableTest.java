package lostwork.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import lostwork.report.Table.Cell;
import org.junit.jupiter.api.Test;

class TableTest {
    private final Table table = Table.builder()
            .words("stream")
            .numbers("heat", "kW", 1)
            .row(Cell.of("a, \"b\""), Cell.of(12.345))
            .row(Cell.of("c"), Cell.none())
            .row(Cell.of("d"), Cell.of(-0.001))
            .build();

    @Test
    void printsAligned() {
        assertEquals("""
                stream  heat
                          kW
                ------  ----
                a, "b"  12.3
                c
                d        0.0
                """, table.toString());
    }

    @Test
    void csvQuotesAndKeepsAllDigits() {
        assertEquals("stream,heat in kW\n\"a, \"\"b\"\"\",12.345\nc,\nd,-0.001\n", table.toCsv());
    }

    @Test
    void jsonLeavesOutEmptyCells() {
        final JsonText json = new JsonText().openObject();
        table.writeJson(json, "rows");
        assertEquals("""
                {
                  "rows": [
                    {
                      "stream": "a, \\"b\\"",
                      "heat in kW": 12.345
                    },
                    {
                      "stream": "c"
                    },
                    {
                      "stream": "d",
                      "heat in kW": -0.001
                    }
                  ]
                }
                """, json.closeObject().toString());
    }

    @Test
    void refusesARowOfAnotherWidth() {
        assertThrows(
                IllegalArgumentException.class, () -> Table.builder().words("a").row(Cell.of("1"), Cell.of("2")));
    }
}
