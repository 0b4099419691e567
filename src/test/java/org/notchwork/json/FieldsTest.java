package org.notchwork.json;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class FieldsTest {

    private final List<Fault> faults = new ArrayList<>();

    @Test
    void allFaultsOfAnObjectAreNotedInOnePass() throws JsonFault {
        Fields fields = open("{\"trails\":5,\"name\":7,\"widths\":[],\"limit\":0}");
        assertEquals("", fields.text("name", 1, 9));
        assertEquals(1, fields.integer("limit", 1, 9));
        assertEquals(List.of(), fields.items("widths", 1, 3));
        assertEquals(1, fields.integer("trials", 1, 9));
        fields.end();
        assertEquals(
                List.of(
                        "/name: this is a whole number; a string of 1 to 9 characters is wanted",
                        "/limit: 0; a whole number from 1 to 9 is wanted",
                        "/widths: an empty list; 1 to 3 items are wanted",
                        "/trials: this member is missing; a whole number is wanted",
                        "/trails: unknown member \"trails\"; did you mean \"trials\"?"),
                lines());
    }

    @Test
    void pointersAreEscapedAsRfc6901Wants() {
        assertEquals("/a~1b~0c", Fault.step("", "a/b~c"));
    }

    @Test
    void everyTypeAndRangeIsNamedInItsFault() throws JsonFault {
        Fields fields =
                open("{\"a\":[],\"b\":{},\"c\":\"x\",\"d\":true,\"e\":[1,\"y\",99,{}],\"f\":\"long\",\"g\":\"1\"}");
        assertEquals("", fields.text("a", 1, 9));
        assertEquals(2, fields.integer("b", 2, 9));
        assertEquals(List.of(), fields.items("c", 1, 3));
        assertTrue(fields.object("d").isStandIn());
        List<Fields.Item> items = fields.items("e", 1, 4);
        assertEquals(
                List.of(1L, 0L, 0L),
                List.of(
                        items.get(0).integer(0, 9),
                        items.get(1).integer(0, 9),
                        items.get(2).integer(0, 9)));
        items.get(3).text(Pattern.compile("[a-z]"), "a letter is wanted");
        fields.text("f", Pattern.compile("[a-z]"), "a letter is wanted");
        fields.optionalTruth("g");
        fields.require("c", new JsonText("z"));
        fields.end();
        assertEquals(
                List.of(
                        "/a: this is an array; a string of 1 to 9 characters is wanted",
                        "/b: this is an object; a whole number from 2 to 9 is wanted",
                        "/c: this is a string; an array is wanted",
                        "/d: this is true or false; an object is wanted",
                        "/e/1: this is a string; a whole number from 0 to 9 is wanted",
                        "/e/2: 99; a whole number from 0 to 9 is wanted",
                        "/e/3: this is an object; a letter is wanted",
                        "/f: \"long\"; a letter is wanted",
                        "/g: this is a string; true or false is wanted",
                        "/c: \"x\"; \"z\" is wanted"),
                lines());
    }

    @Test
    void whatIsNotAnObjectIsOneFaultAndNotItsMissingMembersAsWell() throws JsonFault {
        Fields fields = open("{\"a\":7}");
        for (String name : List.of("a", "b")) {
            Fields inner = fields.object(name);
            assertTrue(inner.isStandIn());
            assertEquals("", inner.text("x", 1, 2));
            assertEquals(3, inner.integer("y", 3, 4));
            assertEquals(List.of(), inner.items("z", 1, 2));
            assertTrue(inner.object("w").isStandIn());
            inner.end();
        }
        assertEquals(
                List.of(
                        "/a: this is a whole number; an object is wanted",
                        "/b: this member is missing; an object is wanted"),
                lines());
    }

    /** A JSON Schema counts code points too (draft 2020-12, validation, section 6.3.1, with RFC 8259). */
    @Test
    void charactersAreCountedAsCodePoints() throws JsonFault {
        Fields fields = open("{\"a\":\"😀😀😀\",\"b\":\"😀😀😀😀\",\"c\":\"x\"}");
        assertEquals("😀😀😀", fields.text("a", 3, 3));
        fields.text("b", 3, 3);
        fields.text("c", 3, 3);
        assertEquals(
                List.of(
                        "/b: a string of 4 characters; a string of 3 to 3 characters is wanted",
                        "/c: a string of 1 character; a string of 3 to 3 characters is wanted"),
                lines());
    }

    @ParameterizedTest
    @ValueSource(strings = {"\\n", "\\r", "\\t", "\\u0000", "\\u007f", "\\u0085", "\\u2028", "\\u2029"})
    void aLineHasNoControlCharacters(String character) throws JsonFault {
        Fields fields = open("{\"a\":\"x" + character + "y\",\"b\":\"a line – é😀\"}");
        assertEquals("", fields.line("a", 1, 9));
        assertEquals("a line – é😀", fields.line("b", 1, 99));
        assertEquals(
                List.of("/a: a string with a line break or another control character; one line is wanted"), lines());
    }

    /** The cut falls between characters, never inside one that takes two UTF-16 units. */
    @Test
    void aLongTextIsCutBetweenCharacters() {
        for (int before = 55; before < 65; before++) {
            String text = "a".repeat(before) + "😀".repeat(10);
            String shown = Fields.quoted(text);
            assertEquals(60, shown.codePointCount(0, shown.length()) - 3);
            assertTrue(shown.endsWith("…\""), shown);
        }
        assertEquals("\"" + "😀".repeat(60) + "\"", Fields.quoted("😀".repeat(60)));
        assertEquals("/" + "x".repeat(199) + "…: a; b", new Fault("/" + "x".repeat(400), "a", "b").line());
    }

    @Test
    void aHostileDocumentGetsAMessageOfBoundedLength() throws JsonFault {
        StringBuilder members = new StringBuilder("{\"list\":[0");
        members.append(",0".repeat(9_999)).append(']');
        for (int i = 0; i < 1_000; i++) {
            members.append(",\"u").append(i).append("\":0");
        }
        Fields fields = open(members.append('}').toString());
        assertEquals(4, fields.items("list", 1, 4).size());
        fields.end();
        assertEquals(1 + 20 + 1, faults.size());
        assertEquals("/list: a list of 10000; 1 to 4 items are wanted", lines().get(0));
        assertEquals("(top): 980 more unknown members; known here: list", lines().get(21));
    }

    @Test
    void textFromOutsideCannotSteerATerminal() {
        assertEquals("a\\u{1b}[31m\\u{202e}b\\u{a}", Printable.escape("a\u001b[31m\u202eb\n"));
        assertEquals("é€ 漢", Printable.escape("é€ 漢"));
    }

    @Test
    void aRightObjectLeavesNoFault() throws JsonFault {
        Fields fields = open("{\"a\":\"x\",\"b\":3}");
        assertEquals("x", fields.text("a", 1, 1));
        assertEquals(3, fields.integer("b", 3, 3));
        fields.end();
        assertTrue(faults.isEmpty());
    }

    private List<String> lines() {
        return faults.stream().map(Fault::line).toList();
    }

    private Fields open(String document) throws JsonFault {
        JsonValue value = new JsonReader(JsonLimits.FILE).read(document.getBytes(StandardCharsets.UTF_8));
        return Fields.of(value, "", faults);
    }
}
