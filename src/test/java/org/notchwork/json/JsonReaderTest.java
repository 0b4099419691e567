package org.notchwork.json;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.time.Duration;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** What the reader refuses, and that it says so in one plain line. */
class JsonReaderTest {

    private final JsonReader reader = new JsonReader(JsonLimits.FILE);

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '~', textBlock = """
            {"a":1,"a":2}           | line 1
            {"a":null,"a":2}        | line 1
            [1.5]                   | line 1, column 2
            [1e3]                   | line 1, column 2
            [1e400]                 | line 1, column 2
            [-0]                    | line 1, column 2
            [007]                   | line 1
            [NaN]                   | line 1
            [9007199254740992]      | line 1, column 2
            [-9007199254740992]     | line 1, column 2
            [123456789012345678901] | line 1, column 2
            [1,]                    | line 1
            {"a":1} x               | line 1
            [1] [2]                 | line 1
            // comment              | line 1
            ["\\ud800"]              | line 1, column 2
            {"\\udc00":1}            | line 1
            [null]                  | line 1, column 2
            """)
    void refusesWhatTwoReadersCouldUnderstandDifferently(String document, String place) {
        JsonFault fault = refused(document.getBytes(StandardCharsets.UTF_8));
        assertTrue(fault.place().startsWith(place.strip()), () -> document + ": " + fault.place());
    }

    @Test
    void acceptsTheLargestExactNumbers() throws JsonFault {
        assertEquals(
                new JsonArray(List.of(new JsonInteger((1L << 53) - 1), new JsonInteger(1 - (1L << 53)))),
                reader.read("[9007199254740991,-9007199254740991]".getBytes(StandardCharsets.UTF_8)));
    }

    @Test
    void refusesBytesThatAreNotUtf8WithTheirPlace() {
        assertEquals(
                "byte 2",
                refused(new byte[] {'[', '"', (byte) 0xc0, (byte) 0xaf, '"', ']'})
                        .place());
        assertEquals(
                "byte 2", refused(new byte[] {'[', '"', (byte) 0xff, '"', ']'}).place());
        assertEquals(
                "byte 2",
                refused(new byte[] {'[', '"', (byte) 0xed, (byte) 0xa0, (byte) 0x80, '"', ']'})
                        .place());
        assertEquals(
                "byte 0", refused("\uFEFF[1]".getBytes(StandardCharsets.UTF_8)).place());
        refused("[1]".getBytes(StandardCharsets.UTF_16LE));
    }

    @ParameterizedTest
    @ValueSource(strings = {"", " ", "\n\t "})
    void refusesAnEmptyDocument(String document) {
        assertTrue(
                refused(document.getBytes(StandardCharsets.UTF_8)).getMessage().contains("empty"));
    }

    @Test
    void refusesDeepLongAndHugeDocumentsAtOnce() {
        assertTimeoutPreemptively(Duration.ofSeconds(5), () -> {
            refused("[".repeat(10_000).getBytes(StandardCharsets.UTF_8));
            refused(("[" + "9".repeat(1_000_000) + "]").getBytes(StandardCharsets.UTF_8));
            refused("[1e20000000]".getBytes(StandardCharsets.UTF_8));
            refused(("[\"" + "x".repeat(JsonLimits.FILE.text() + 1) + "\"]").getBytes(StandardCharsets.UTF_8));
        });
    }

    @Test
    void acceptsTheDeepestDocumentAndRefusesOneDeeper() throws JsonFault {
        int depth = JsonLimits.FILE.depth();
        reader.read(("[".repeat(depth) + "]".repeat(depth)).getBytes(StandardCharsets.UTF_8));
        refused(("[".repeat(depth + 1) + "]".repeat(depth + 1)).getBytes(StandardCharsets.UTF_8));
    }

    @Test
    void refusesADocumentOverTheLimitOfBytes() {
        JsonReader small = new JsonReader(new JsonLimits(4, 8, 8));
        assertThrows(JsonFault.class, () -> small.read("[1,2]".getBytes(StandardCharsets.UTF_8)));
    }

    @Test
    void aDocumentThatIsNotCanonicalIsRefusedWithTheFirstByte() {
        JsonFault fault = assertThrows(
                JsonFault.class, () -> reader.readCanonical("{\"b\":1,\"a\":2}".getBytes(StandardCharsets.UTF_8)));
        assertEquals("byte 2", fault.place());
        assertThrows(JsonFault.class, () -> reader.readCanonical("[1]\n".getBytes(StandardCharsets.UTF_8)));
        assertThrows(JsonFault.class, () -> reader.readCanonical("[\"\\u0041\"]".getBytes(StandardCharsets.UTF_8)));
    }

    /** A limit names itself, and the place where the document passes it. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            [[[[1]]]]   | line 1, column 4 | nested too deep; at most 3 levels are wanted
            {"a":[[[]]]} | line 1, column 8 | nested too deep; at most 3 levels are wanted
            [12345678901234567890] | line 1, column 2 | a whole number beyond 2^53 - 1 in magnitude; write it as a string
            [1,2,3,4,5,6,7,8,9,0,1,2,3,4,5,6] | byte 32 | the document goes on; at most 32 bytes are wanted
            """)
    void eachLimitHasAMessageOfItsOwn(String document, String place, String message) {
        JsonReader small = new JsonReader(new JsonLimits(32, 3, 24));
        JsonFault fault =
                assertThrows(JsonFault.class, () -> small.read(document.strip().getBytes(StandardCharsets.UTF_8)));
        assertEquals(place, fault.place());
        assertEquals(message, fault.getMessage());
        assertEquals(place + ": " + message, fault.fault().line());
    }

    @Test
    void aLongStringNameOrNumberIsRefusedAndTheLongestAllowedIsRead() throws JsonFault {
        int most = JsonLimits.FILE.text();
        reader.read(("[\"" + "x".repeat(most) + "\"]").getBytes(StandardCharsets.UTF_8));
        reader.read(("{\"" + "x".repeat(most) + "\":1}").getBytes(StandardCharsets.UTF_8));
        for (String document : List.of(
                "[\"" + "x".repeat(most + 1) + "\"]",
                "{\"" + "x".repeat(most + 1) + "\":1}",
                "[" + "9".repeat(1_000_000) + "]")) {
            JsonFault fault = refused(document.getBytes(StandardCharsets.UTF_8));
            assertEquals(
                    "a string, a name or a number is too long; at most 65536 characters are wanted",
                    fault.getMessage());
            assertTrue(fault.place().startsWith("line 1, column "), fault.place());
        }
    }

    @Test
    void placesAreCountedFromLineOneColumnOne() {
        assertEquals(
                "line 3, column 8",
                refused("{\n  \"a\": 1,\n  \"b\": null\n}".getBytes(StandardCharsets.UTF_8))
                        .place());
    }

    private JsonFault refused(byte[] document) {
        JsonFault fault = assertThrows(JsonFault.class, () -> reader.read(document));
        PlainWords.assertPlain(fault);
        return fault;
    }

    @Test
    void textIsReadAsItStands() throws JsonFault {
        byte[] document = "[\"a\\u00e9\\n\\ud83d\\ude00\"]".getBytes(StandardCharsets.UTF_8);
        JsonArray array = (JsonArray) reader.read(document);
        assertEquals(new JsonText("aé\n😀"), array.items().get(0));
        assertArrayEquals("[\"aé\\n😀\"]".getBytes(StandardCharsets.UTF_8), CanonicalJson.bytes(array));
    }
}
