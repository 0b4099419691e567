package org.notchwork.json;

import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.regex.Pattern;

/** Asserts that a message is written for people. */
final class PlainWords {

    /** Words of the library below: class names, constants, source references, quoted code. */
    private static final Pattern JARGON = Pattern.compile(
            "Stream|Source:|Feature|Jackson|Json[A-Z]|Exception|`|\\btoken\\b|[A-Z]{3,}_|REDACTED|\\(.*\\d.*\\)",
            Pattern.CASE_INSENSITIVE);

    private PlainWords() {}

    /** Asserts that message and place are one short line each, in this project's words, with a mend. */
    static void assertPlain(JsonFault fault) {
        String text = fault.place() + ": " + fault.getMessage();
        assertFalse(text.contains("\n"), text);
        assertTrue(text.length() < 200, text);
        assertFalse(JARGON.matcher(text).find(), text);
        assertTrue(fault.place().matches("line \\d+, column \\d+|byte \\d+"), text);
        assertTrue(fault.getMessage().matches("[^;]+; [^;]+"), text);
    }
}
