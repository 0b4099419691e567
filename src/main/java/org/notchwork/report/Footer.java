package org.notchwork.report;

import java.io.IOException;
import org.apache.pdfbox.cos.COSName;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.PDPageContentStream;
import org.apache.pdfbox.pdmodel.font.PDFont;

/** The line at the foot of a page. */
final class Footer {

    private static final float HEIGHT = 32;
    private static final float GAP = 12;

    private Footer() {}

    /** Sets two texts at the foot of a page; the left one is cut off, visibly, where it would reach the right one. */
    static void set(PDDocument document, PDPage page, Fonts fonts, String left, String right) throws IOException {
        PDFont font = Style.SMALL.font(fonts);
        float size = Style.SMALL.size();
        float width = Fonts.width(font, size, right);
        try (PDPageContentStream foot =
                new PDPageContentStream(document, page, PDPageContentStream.AppendMode.APPEND, false, true)) {
            foot.beginMarkedContent(COSName.getPDFName("Artifact"));
            foot.setNonStrokingColor(Style.GREY);
            foot.setFont(font, size);
            show(foot, Wrap.cut(font, size, left, Flow.MEASURE - width - GAP), Flow.MARGIN);
            show(foot, right, Flow.MARGIN + Flow.MEASURE - width);
            foot.endMarkedContent();
        }
    }

    private static void show(PDPageContentStream foot, String text, float x) throws IOException {
        foot.beginText();
        foot.newLineAtOffset(x, HEIGHT);
        foot.showText(text);
        foot.endText();
    }
}
