package org.notchwork.json;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What a file says may be printed without harm, and nothing readable is lost. */
class PrintableTest {

    /** Unicode's general categories C (other), Zl and Zp, as the platform's regular expressions know them. */
    private static final Pattern HARMFUL = Pattern.compile("[\\p{C}\\p{Zl}\\p{Zp}]");

    @Test
    void everyCharacterOfUnicodeIsEitherHarmlessOrShownAsItsNumber() {
        int escaped = 0;
        for (int c = 0; c <= Character.MAX_CODE_POINT; c++) {
            String one = Character.toString(c);
            String shown = Printable.escape(one);
            assertFalse(HARMFUL.matcher(shown).find(), Integer.toHexString(c));
            if (!shown.equals(one)) {
                assertEquals("\\u{" + Integer.toHexString(c) + "}", shown);
                escaped++;
            } else {
                assertFalse(HARMFUL.matcher(one).find(), Integer.toHexString(c));
            }
        }
        // 6 400 + 2 * 65 534 private-use characters and 2 048 surrogates are the least (Unicode, chapter 23).
        assertTrue(escaped > 6_400 + 2 * 65_534 + 2_048 && escaped < 1_000_000, escaped + " escaped");
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            \\u{1b}[2J    | 27
            \\u{202e}[2J  | 8238
            \\u{2066}[2J  | 8294
            \\u{200b}[2J  | 8203
            \\u{9b}[2J    | 155
            \\u{7f}[2J    | 127
            \\u{a}[2J     | 10
            \\u{2028}[2J  | 8232
            \\u{feff}[2J  | 65279
            \\u{d800}[2J  | 55296
            \\u{e0001}[2J | 917505
            """)
    void whatSteersATerminalIsShownAsItsNumber(String shown, int c) {
        assertEquals(shown.replace("\\\\", "\\"), Printable.escape(Character.toString(c) + "[2J"));
    }

    @Test
    void readableTextStaysAsItIs() {
        String text = "plain \"quoted\" \\ / é ß Ω ж 漢 かな 😀 𝔽 ⊕ ≤ e\u0301 \u00a0";
        assertEquals(text, Printable.escape(text));
    }

    @Test
    void aCutCountsCharactersAndSplitsNone() {
        assertEquals("", Printable.cut("", 0));
        assertEquals("…", Printable.cut("a", 0));
        assertEquals("abc", Printable.cut("abc", 3));
        assertEquals("ab…", Printable.cut("abc", 2));
        assertEquals("😀😀", Printable.cut("😀😀", 2));
        assertEquals("😀…", Printable.cut("😀😀", 1));
    }
}
