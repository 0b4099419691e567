package org.notchwork.report;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import org.apache.pdfbox.pdmodel.font.PDFont;

/**
 * Breaks text into lines no wider than a measure: at blanks, and inside a word only where it alone is too wide, there
 * after a slash, an at sign or a hyphen of its own if there is one. No hyphen is ever added.
 */
final class Wrap {

    private static final String ELLIPSIS = "…";

    /** A per cent sign stays with its number. */
    private static final String HELD_PERCENT = "\u00a0%";

    /** Blanks, and what stands inside the names of cells; not the sign of a number. */
    private static final String SEAMS = " |(?<=[/@])|(?<=[a-z0-9]-)(?=[a-z])";

    private Wrap() {}

    /** Returns the lines, at least one. */
    static List<String> lines(PDFont font, float size, String text, float measure) throws IOException {
        List<String> lines = new ArrayList<>();
        StringBuilder line = new StringBuilder();
        for (String word :
                Fonts.drawable(font, text.replace(" %", HELD_PERCENT)).split(" ", -1)) {
            for (String piece : pieces(font, size, word, measure)) {
                String longer = line.length() == 0 ? piece : line + " " + piece;
                if (line.length() > 0 && Fonts.width(font, size, longer) > measure) {
                    lines.add(line.toString());
                    line.setLength(0);
                    line.append(piece);
                } else {
                    line.setLength(0);
                    line.append(longer);
                }
            }
        }
        lines.add(line.toString());
        return lines;
    }

    /** Returns the text in one line; where it is wider than the measure, its end gives way to an ellipsis. */
    static String cut(PDFont font, float size, String text, float measure) throws IOException {
        String whole = Fonts.drawable(font, text);
        if (Fonts.width(font, size, whole) <= measure) {
            return whole;
        }
        int end = whole.length();
        while (end > 0 && Fonts.width(font, size, whole.substring(0, end) + ELLIPSIS) > measure) {
            end = whole.offsetByCodePoints(end, -1);
        }
        return whole.substring(0, end) + ELLIPSIS;
    }

    /** Returns the width of the widest part of a text that holds no blank and no seam. */
    static float widestPart(PDFont font, float size, String text) throws IOException {
        float widest = 0;
        for (String part : Fonts.drawable(font, text).split(SEAMS, -1)) {
            widest = Math.max(widest, Fonts.width(font, size, part));
        }
        return widest;
    }

    private static List<String> pieces(PDFont font, float size, String word, float measure) throws IOException {
        if (Fonts.width(font, size, word) <= measure) {
            return List.of(word);
        }
        List<String> pieces = new ArrayList<>();
        StringBuilder piece = new StringBuilder();
        for (int point : word.codePoints().toArray()) {
            String one = Character.toString(point);
            if (piece.length() > 0 && Fonts.width(font, size, piece + one) > measure) {
                int seam = Math.max(Math.max(piece.lastIndexOf("/"), piece.lastIndexOf("@")), piece.lastIndexOf("-"));
                int end = seam > 0 ? seam + 1 : piece.length();
                pieces.add(piece.substring(0, end));
                piece.delete(0, end);
            }
            piece.append(one);
        }
        pieces.add(piece.toString());
        return pieces;
    }
}
