package org.notchwork.report;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import org.apache.pdfbox.pdmodel.font.PDFont;

/**
 * Breaks text into lines no wider than a measure: at blanks, and inside a word only where it alone is too wide, there
 * after a slash or an at sign if there is one.
 */
final class Wrap {

    private Wrap() {}

    /** Returns the lines, at least one. */
    static List<String> lines(PDFont font, float size, String text, float measure) throws IOException {
        List<String> lines = new ArrayList<>();
        StringBuilder line = new StringBuilder();
        for (String word : Fonts.drawable(font, text).split(" ", -1)) {
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

    /** Returns the text in one line, its end cut off where it is wider than the measure. */
    static String cut(PDFont font, float size, String text, float measure) throws IOException {
        String whole = Fonts.drawable(font, text);
        return Fonts.width(font, size, whole) <= measure
                ? whole
                : pieces(font, size, whole.replace(' ', '\u00a0'), measure).get(0);
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
                int seam = Math.max(piece.lastIndexOf("/"), piece.lastIndexOf("@"));
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
