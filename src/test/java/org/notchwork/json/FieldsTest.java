package org.notchwork.json;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;

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
                faults.stream().map(Fault::line).toList());
    }

    @Test
    void pointersAreEscapedAsRfc6901Wants() {
        assertEquals("/a~1b~0c", Fault.step("", "a/b~c"));
    }

    @Test
    void aFarNameGetsTheWholeList() {
        assertEquals(Optional.empty(), Spelling.nearest("zzzzzz", List.of("trials", "widths")));
        assertEquals("known here: trials, widths", Spelling.mend("zzzzzz", List.of("trials", "widths")));
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

    private Fields open(String document) throws JsonFault {
        JsonValue value = new JsonReader(JsonLimits.FILE).read(document.getBytes(StandardCharsets.UTF_8));
        return Fields.of(value, "", faults);
    }
}
