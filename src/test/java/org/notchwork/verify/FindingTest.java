package org.notchwork.verify;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.OptionalLong;
import org.junit.jupiter.api.Test;
import org.notchwork.json.CanonicalJson;

/** What a bundle says cannot steer a terminal or flood it. */
class FindingTest {

    @Test
    void placeAndBothValuesStandInOneLine() {
        Finding finding = new Finding("data/trials-e.jsonl", OptionalLong.of(17), "/calls/quantum", "5", "6");
        assertEquals("data/trials-e.jsonl, line 17, /calls/quantum: found 5, should be 6", finding.text());
        assertEquals(
                "data/x: found a, should be b", Finding.of("data/x", "a", "b").text());
    }

    /** Escape starts a control sequence; U+202E reverses a line; U+0085 and U+2028 begin a new one. */
    @Test
    void controlAndDirectionCharactersAreShownAsEscapes() {
        Finding hostile = new Finding("f\u001b[2J", OptionalLong.empty(), "/\u202ea", "\n\u0085ok", "\u2028\u2066");
        for (String told : new String[] {hostile.text(), CanonicalJson.text(hostile.json())}) {
            assertTrue(told.chars().allMatch(c -> c >= 0x20 && c < 0x7f), told);
        }
        assertTrue(hostile.text().startsWith("f\\u{1b}[2J, /\\u{202e}a: found \\u{a}\\u{85}ok"), hostile.text());
    }

    @Test
    void longValuesAndPointersAreCut() {
        Finding finding = new Finding("f", OptionalLong.empty(), "/" + "p".repeat(5000), "w".repeat(5000), "r");
        assertTrue(finding.text().length() < 500, "" + finding.text().length());
        assertTrue(finding.text().contains("(5000 characters)"));
        assertFalse(CanonicalJson.text(finding.json()).length() > 700);
    }

    @Test
    void twentyFindingsAreKeptAndTheRestCounted() {
        Findings findings = new Findings();
        for (int i = 0; i < 50; i++) {
            findings.add(Finding.of("f" + i, "a", "b"));
        }
        assertEquals(50, findings.count());
        assertEquals(20, findings.first().size());
        assertEquals("f19", findings.first().get(19).file());
    }
}
