package org.notchwork.report;

import java.io.IOException;
import java.io.InputStream;
import org.apache.fontbox.ttf.TTFParser;
import org.apache.fontbox.ttf.TrueTypeFont;
import org.apache.pdfbox.io.RandomAccessReadBuffer;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.font.PDFont;
import org.apache.pdfbox.pdmodel.font.PDType0Font;

/**
 * The three embedded fonts of a report.
 *
 * @param body running text
 * @param bold headings
 * @param mono digests, cells, commands
 */
record Fonts(PDFont body, PDFont bold, PDFont mono) {

    private static final String SUBSTITUTE = "?";

    /** Loads the fonts into a document; only the glyphs that are used are embedded. */
    static Fonts load(PDDocument document) throws IOException {
        return new Fonts(
                load(document, "DejaVuSans.ttf"),
                load(document, "DejaVuSans-Bold.ttf"),
                load(document, "DejaVuSansMono.ttf"));
    }

    /** Opens the file of a font. */
    static InputStream open(String file) {
        InputStream in = Fonts.class.getResourceAsStream("/fonts/" + file);
        if (in == null) {
            throw new IllegalStateException("not in the program: /fonts/" + file);
        }
        return in;
    }

    /** Ligatures are left out: a search for a word with two letters drawn as one glyph may not find it. */
    private static PDFont load(PDDocument document, String file) throws IOException {
        try (InputStream in = open(file)) {
            TrueTypeFont font = new TTFParser().parse(new RandomAccessReadBuffer(in));
            document.registerTrueTypeFontForClosing(font);
            font.setEnableGsub(false);
            return PDType0Font.load(document, font, true);
        }
    }

    /** Returns the text with every character that a font lacks replaced by a question mark. */
    static String drawable(PDFont font, String text) throws IOException {
        if (text.chars().allMatch(c -> c >= ' ' && c <= '~')) {
            return text;
        }
        StringBuilder out = new StringBuilder();
        for (int point : text.codePoints().toArray()) {
            String one = Character.toString(point);
            out.append(has(font, one) ? one : SUBSTITUTE);
        }
        return out.toString();
    }

    private static boolean has(PDFont font, String one) throws IOException {
        try {
            font.encode(one);
            return true;
        } catch (IllegalArgumentException e) {
            return false;
        }
    }

    /** Returns the width of a drawable text at a size, in points. */
    static float width(PDFont font, float size, String text) throws IOException {
        return font.getStringWidth(text) * size / 1000;
    }
}
