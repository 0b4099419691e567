package org.notchwork.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.util.List;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.font.PDFont;
import org.junit.jupiter.api.Test;

/** In the fixed-width font every glyph is 1233/2048 em wide, so that lines can be counted by hand. */
class WrapTest {

    /** The width of ten glyphs at size 10, and a little. */
    private static final float TEN = 60.3f;

    private interface Body {
        void run(PDFont font) throws IOException;
    }

    private static void withFont(Body body) throws IOException {
        try (PDDocument document = new PDDocument()) {
            body.run(Fonts.load(document).mono());
        }
    }

    @Test
    void linesBreakAtBlanks() throws IOException {
        withFont(f -> assertEquals(
                List.of("one two", "three four", "five"), Wrap.lines(f, 10, "one two three four five", TEN)));
    }

    @Test
    void aWordThatIsTooWideBreaksAtItsOwnSeams() throws IOException {
        withFont(f -> {
            assertEquals(List.of("all/5/", "fibre-scan"), Wrap.lines(f, 10, "all/5/fibre-scan", TEN));
            assertEquals(List.of("scan@", "fibrefibre"), Wrap.lines(f, 10, "scan@fibrefibre", TEN));
            assertEquals(List.of("abcdefghij", "klm"), Wrap.lines(f, 10, "abcdefghijklm", TEN));
        });
    }

    @Test
    void aPerCentSignStaysWithItsNumber() throws IOException {
        withFont(f -> assertEquals(List.of("abcdef", "95\u00a0%"), Wrap.lines(f, 10, "abcdef 95 %", TEN)));
    }

    @Test
    void nothingIsLostAndNothingAdded() throws IOException {
        withFont(f -> {
            String text = "an-id/12/of-a-cell@engine and words, 12345678901234567890 too";
            String again = String.join("", Wrap.lines(f, 10, text, TEN)).replace(" ", "");
            assertEquals(text.replace(" ", ""), again);
        });
    }

    @Test
    void whatAFontLacksBecomesAQuestionMark() throws IOException {
        withFont(f -> assertEquals(List.of("a??b"), Wrap.lines(f, 10, "a漢字b", TEN)));
    }

    @Test
    void aCutTextFitsAndShowsThatItIsCut() throws IOException {
        withFont(f -> {
            assertEquals("abcdefghij", Wrap.cut(f, 10, "abcdefghij", TEN));
            assertEquals("abcdefghi…", Wrap.cut(f, 10, "abcdefghijk", TEN));
            assertTrue(Fonts.width(f, 10, Wrap.cut(f, 10, "abcdefghijk", TEN)) <= TEN);
        });
    }
}
