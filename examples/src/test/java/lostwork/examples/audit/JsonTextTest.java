package lostwork.examples.audit;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

class JsonTextTest {
    @Test
    void writesNestedValuesAndEscapes() {
        final String json = new JsonText()
                .openObject()
                .put("text", "a \"quoted\" back\\slash and\nnew line")
                .put("number", -1.5)
                .putNull("nothing")
                .openArray("list")
                .element("x")
                .openElement()
                .put("y", 1e7)
                .closeObject()
                .closeArray()
                .openArray("empty")
                .closeArray()
                .openObject("inner")
                .put("z", 0)
                .closeObject()
                .closeObject()
                .toString();
        assertEquals("""
                {
                  "text": "a \\"quoted\\" back\\\\slash and\\u000anew line",
                  "number": -1.5,
                  "nothing": null,
                  "list": [
                    "x",
                    {
                      "y": 10000000
                    }
                  ],
                  "empty": [],
                  "inner": {
                    "z": 0
                  }
                }
                """, json);
    }
}
