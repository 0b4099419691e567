package org.notchwork.report;

import java.awt.Color;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.PDPageContentStream;
import org.apache.pdfbox.pdmodel.common.PDRectangle;
import org.apache.pdfbox.pdmodel.font.PDFont;
import org.apache.pdfbox.pdmodel.graphics.form.PDFormXObject;
import org.apache.pdfbox.util.Matrix;

/** Fills pages from top to bottom; a new page begins where the next piece does not fit. Units are points. */
final class Flow implements AutoCloseable {

    /** The left and right margin. */
    static final float MARGIN = 48;

    /** The width of the text. */
    static final float MEASURE = PDRectangle.A4.getWidth() - 2 * MARGIN;

    private static final float TOP = PDRectangle.A4.getHeight() - 46;
    private static final float BOTTOM = 54;
    private static final float FOOT = 32;
    private static final float FOOT_GAP = 80;

    private final PDDocument document;
    private final Fonts fonts;
    private final List<PDPage> pages = new ArrayList<>();
    private PDPageContentStream content;
    private float y;

    /** Begins the first page. */
    Flow(PDDocument document, Fonts fonts) throws IOException {
        this.document = document;
        this.fonts = fonts;
        this.content = begin();
    }

    Fonts fonts() {
        return fonts;
    }

    PDDocument document() {
        return document;
    }

    /** Begins a new page unless this many points are left on this one. */
    void require(float height) throws IOException {
        if (y - height < BOTTOM) {
            content.close();
            content = begin();
        }
    }

    /** Leaves a gap; none at the top of a page. */
    void gap(float height) {
        if (y < TOP) {
            y -= height;
        }
    }

    /** Sets a section's heading, with room for some lines after it. */
    void heading(String text) throws IOException {
        gap(14);
        require(80);
        text(Style.HEADING, Style.INK, text);
        rule();
        gap(4);
    }

    /** Sets text over the whole measure. */
    void text(Style style, Color color, String text) throws IOException {
        PDFont font = style.font(fonts);
        for (String line : Wrap.lines(font, style.size(), text, MEASURE)) {
            require(style.leading());
            y -= style.leading();
            draw(style, color, line, MARGIN, y + style.leading() - style.size());
        }
    }

    /** Sets running text. */
    void body(String text) throws IOException {
        text(Style.BODY, Style.INK, text);
        gap(4);
    }

    /** Sets a note. */
    void note(String text) throws IOException {
        text(Style.SMALL, Style.GREY, text);
        gap(4);
    }

    /** Draws a thin line over the measure. */
    void rule() throws IOException {
        y -= 3;
        line(MARGIN, MARGIN + MEASURE, y, Style.RULE);
        y -= 2;
    }

    /** Draws a horizontal line. */
    void line(float from, float to, float at, Color color) throws IOException {
        content.setStrokingColor(color);
        content.setLineWidth(0.5f);
        content.moveTo(from, at);
        content.lineTo(to, at);
        content.stroke();
    }

    /** Draws one line of text that fits, at a place on this page. */
    void draw(Style style, Color color, String text, float x, float at) throws IOException {
        PDFont font = style.font(fonts);
        content.beginText();
        content.setNonStrokingColor(color);
        content.setFont(font, style.size());
        content.newLineAtOffset(x, at);
        content.showText(Fonts.drawable(font, text));
        content.endText();
    }

    /** Returns where the next piece goes. */
    float y() {
        return y;
    }

    /** Moves down. */
    void down(float height) {
        y -= height;
    }

    /** Places a drawing over the measure, scaled to it. */
    void drawing(PDFormXObject form) throws IOException {
        float scale = MEASURE / form.getBBox().getWidth();
        float height = form.getBBox().getHeight() * scale;
        require(height);
        y -= height;
        content.saveGraphicsState();
        content.transform(new Matrix(scale, 0, 0, scale, MARGIN, y));
        content.drawForm(form);
        content.restoreGraphicsState();
        gap(4);
    }

    /** Ends the last page and sets the footers. */
    void finish(String left) throws IOException {
        content.close();
        for (int i = 0; i < pages.size(); i++) {
            String right = "page " + (i + 1) + " of " + pages.size();
            try (PDPageContentStream foot = new PDPageContentStream(
                    document, pages.get(i), PDPageContentStream.AppendMode.APPEND, false, true)) {
                PDFont font = Style.SMALL.font(fonts);
                float size = Style.SMALL.size();
                foot.setNonStrokingColor(Style.GREY);
                foot.beginText();
                foot.setFont(font, size);
                foot.newLineAtOffset(MARGIN, FOOT);
                foot.showText(Wrap.cut(font, size, left, MEASURE - FOOT_GAP));
                foot.endText();
                foot.beginText();
                foot.setFont(font, size);
                foot.newLineAtOffset(MARGIN + MEASURE - Fonts.width(font, size, right), FOOT);
                foot.showText(right);
                foot.endText();
            }
        }
    }

    @Override
    public void close() throws IOException {
        content.close();
    }

    private PDPageContentStream begin() throws IOException {
        PDPage page = new PDPage(PDRectangle.A4);
        document.addPage(page);
        pages.add(page);
        y = TOP;
        return new PDPageContentStream(document, page);
    }
}
