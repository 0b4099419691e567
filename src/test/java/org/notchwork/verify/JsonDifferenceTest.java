package org.notchwork.verify;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.notchwork.json.JsonFault;
import org.notchwork.json.JsonLimits;
import org.notchwork.json.JsonReader;
import org.notchwork.json.JsonValue;

/** The differences of two documents, by RFC 6901 pointers. */
class JsonDifferenceTest {

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '~', textBlock = """
            {"a":1,"b":[1,2]}   | {"a":1,"b":[1,2]}   | ~~
            1                   | 2                   | : 1 / 2
            {"a":1}             | {"a":"1"}           | /a: 1 / "1"
            {"a":1}             | {"a":1,"b":2}       | /b: (nothing) / 2
            {"a":1,"b":2}       | {"a":1}             | /b: 2 / (nothing)
            {"a":[1,2]}         | {"a":[1,3]}         | /a/1: 2 / 3
            {"a":[1,2]}         | {"a":[1]}           | /a/1: 2 / (nothing)
            {"a":[1]}           | {"a":[1,2]}         | /a/1: (nothing) / 2
            {"a":[1]}           | {"a":{"0":1}}       | /a: [1] / {"0":1}
            {"a/b":1}           | {"a/b":2}           | /a~1b: 1 / 2
            {"m~n":1}           | {"m~n":2}           | /m~0n: 1 / 2
            {"":1}              | {"":2}              | /: 1 / 2
            {"a":1,"b":1}       | {"a":2,"b":2}       | /a: 1 / 2; /b: 1 / 2
            {"b":{"c":[{"d":1}]}}|{"b":{"c":[{"d":2}]}}| /b/c/0/d: 1 / 2
            """)
    void eachDifferenceIsNamedByItsPointerInTheOrderOfTheMembers(String written, String right, String expected)
            throws JsonFault {
        assertEquals(expected == null ? "" : expected.strip(), String.join("; ", differences(written, right)));
    }

    /** RFC 6901, section 5: the document and pointers printed there, each member changed in turn. */
    @Test
    void thePointersOfTheStandardAreThoseOfItsDocument() throws JsonFault {
        String standard = "{\"foo\":[\"bar\",\"baz\"],\"\":0,\"a/b\":1,\"c%d\":2,\"e^f\":3,\"g|h\":4,\"i\\\\j\":5,"
                + "\"k\\\"l\":6,\" \":7,\"m~n\":8}";
        String changed = "{\"foo\":[\"rab\",\"baz\"],\"\":10,\"a/b\":11,\"c%d\":12,\"e^f\":13,\"g|h\":14,\"i\\\\j\":15,"
                + "\"k\\\"l\":16,\" \":17,\"m~n\":18}";
        List<String> pointers = differences(standard, changed).stream()
                .map(d -> d.substring(0, d.indexOf(": ")))
                .sorted()
                .toList();
        assertEquals(
                Arrays.asList("/", "/ ", "/a~1b", "/c%d", "/e^f", "/foo/0", "/g|h", "/i\\j", "/k\"l", "/m~0n"),
                pointers);
    }

    private static List<String> differences(String written, String right) throws JsonFault {
        List<String> told = new ArrayList<>();
        new JsonDifference((pointer, a, b) -> told.add(pointer + ": " + a + " / " + b))
                .compare(value(written), value(right));
        return told;
    }

    private static JsonValue value(String text) throws JsonFault {
        return new JsonReader(JsonLimits.FILE).read(text.strip().getBytes(StandardCharsets.UTF_8));
    }
}
