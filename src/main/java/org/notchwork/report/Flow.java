package org.notchwork.report;

import java.awt.Color;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import org.apache.pdfbox.cos.COSName;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.PDPageContentStream;
import org.apache.pdfbox.pdmodel.common.PDRectangle;
import org.apache.pdfbox.pdmodel.documentinterchange.logicalstructure.PDStructureElement;
import org.apache.pdfbox.pdmodel.documentinterchange.taggedpdf.PDLayoutAttributeObject;
import org.apache.pdfbox.pdmodel.font.PDFont;
import org.apache.pdfbox.pdmodel.graphics.form.PDFormXObject;
import org.apache.pdfbox.util.Matrix;

/** Fills pages from top to bottom; a new page begins where the next piece does not fit. Units are points. */
final class Flow implements AutoCloseable {

    /** The left and right margin. */
    static final float MARGIN = 48;

    /** The width of the text. */
    static final float MEASURE = PDRectangle.A4.getWidth() - 2 * MARGIN;

    /** The height of the text. */
    static final float HEIGHT = PDRectangle.A4.getHeight() - 100;

    private static final float TOP = PDRectangle.A4.getHeight() - 46;
    private static final float BOTTOM = TOP - HEIGHT;
    private static final float HEADING_ROOM = 80;
    private static final float INDENT = 12;
    private static final int KEPT_LINES = 4;
    private static final COSName ARTIFACT = COSName.getPDFName("Artifact");

    private final PDDocument document;
    private final Fonts fonts;
    private final Structure structure;
    private final List<PDPage> pages = new ArrayList<>();
    private PDPageContentStream content;
    private float y;

    /** Begins the first page. */
    Flow(PDDocument document, Fonts fonts) throws IOException {
        this.document = document;
        this.fonts = fonts;
        this.structure = new Structure(document);
        this.content = begin();
    }

    Fonts fonts() {
        return fonts;
    }

    PDDocument document() {
        return document;
    }

    Structure structure() {
        return structure;
    }

    /** Begins a new page unless this many points are left on this one; returns whether it did. */
    boolean require(float height) throws IOException {
        if (y - height >= BOTTOM || y >= TOP) {
            return false;
        }
        content.close();
        content = begin();
        return true;
    }

    /** Leaves a gap; none at the top of a page. */
    void gap(float height) {
        if (y < TOP) {
            y -= height;
        }
    }

    /** Sets the title of the document. */
    void title(String text) throws IOException {
        text(structure.add("H1"), Style.TITLE, Style.INK, text);
        gap(4);
    }

    /** Sets a section's heading, with room for some lines after it. */
    void heading(String text) throws IOException {
        gap(14);
        require(HEADING_ROOM);
        text(structure.add("H2"), Style.HEADING, Style.INK, text);
        y -= 3;
        line(y, Style.RULE);
        y -= 6;
    }

    /** Sets a heading within a section. */
    void subheading(String text) throws IOException {
        gap(5);
        require(HEADING_ROOM);
        text(structure.add("H3"), Style.SUBHEADING, Style.INK, text);
        gap(1);
    }

    /** Sets a paragraph over the whole measure. */
    void text(Style style, Color color, String text) throws IOException {
        text(structure.add("P"), style, color, text);
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

    /** Sets a list. */
    void items(List<String> items) throws IOException {
        PDStructureElement list = structure.add("L");
        for (String item : items) {
            PDStructureElement one = structure.add(list, "LI");
            List<String> lines = lines(Style.BODY, item, MEASURE - INDENT);
            keep(lines, Style.BODY);
            draw(structure.add(one, "Lbl"), Style.BODY, Style.INK, "–", MARGIN, y - Style.BODY.size());
            lines(structure.add(one, "LBody"), Style.BODY, Style.INK, lines, MARGIN + INDENT);
            gap(4);
        }
    }

    private void text(PDStructureElement element, Style style, Color color, String text) throws IOException {
        List<String> lines = lines(style, text, MEASURE);
        keep(lines, style);
        lines(element, style, color, lines, MARGIN);
    }

    private List<String> lines(Style style, String text, float measure) throws IOException {
        return Wrap.lines(style.font(fonts), style.size(), text, measure);
    }

    /** Keeps the first lines of a paragraph together, all of them if they are few. */
    private void keep(List<String> lines, Style style) throws IOException {
        require(Math.min(KEPT_LINES, lines.size()) * style.leading());
    }

    private void lines(PDStructureElement element, Style style, Color color, List<String> lines, float x)
            throws IOException {
        for (String line : lines) {
            require(style.leading());
            draw(element, style, color, line, x, y - style.size());
            y -= style.leading();
        }
    }

    /** Returns the height of a paragraph over the whole measure. */
    float height(Style style, String text) throws IOException {
        return lines(style, text, MEASURE).size() * style.leading();
    }

    /** Draws a thin horizontal line over the measure. */
    void line(float at, Color color) throws IOException {
        content.beginMarkedContent(ARTIFACT);
        content.setStrokingColor(color);
        content.setLineWidth(0.5f);
        content.moveTo(MARGIN, at);
        content.lineTo(MARGIN + MEASURE, at);
        content.stroke();
        content.endMarkedContent();
    }

    /** Fills a box whose lower left corner is given. */
    void box(float x, float at, float width, float height, Color color) throws IOException {
        content.beginMarkedContent(ARTIFACT);
        content.setNonStrokingColor(color);
        content.addRect(x, at, width, height);
        content.fill();
        content.endMarkedContent();
    }

    /** Draws one line of text that fits, at a place on this page, as a part of an element. */
    void draw(PDStructureElement element, Style style, Color color, String text, float x, float at) throws IOException {
        content.beginMarkedContent(COSName.getPDFName(element.getStructureType()), structure.mark(element));
        show(content, style, color, text, x, at);
        content.endMarkedContent();
    }

    /** Draws one line of text that repeats what stands elsewhere, so that reading programs pass it over. */
    void drawRepeated(Style style, Color color, String text, float x, float at) throws IOException {
        content.beginMarkedContent(ARTIFACT);
        show(content, style, color, text, x, at);
        content.endMarkedContent();
    }

    /** Returns where the next piece goes. */
    float y() {
        return y;
    }

    /** Moves down. */
    void down(float height) {
        y -= height;
    }

    /** Places a drawing over the measure, scaled to it, with the words that stand for it. */
    void drawing(PDFormXObject form, String words) throws IOException {
        float scale = MEASURE / form.getBBox().getWidth();
        float height = form.getBBox().getHeight() * scale;
        require(height);
        y -= height;
        PDStructureElement figure = structure.add("Figure");
        figure.setAlternateDescription(words);
        PDLayoutAttributeObject place = new PDLayoutAttributeObject();
        place.setBBox(new PDRectangle(MARGIN, y, MEASURE, height));
        figure.addAttribute(place);
        content.beginMarkedContent(COSName.getPDFName("Figure"), structure.mark(figure));
        content.saveGraphicsState();
        content.transform(new Matrix(scale, 0, 0, scale, MARGIN, y));
        content.drawForm(form);
        content.restoreGraphicsState();
        content.endMarkedContent();
        gap(4);
    }

    /** Ends the last page and sets the footers. */
    void finish(String left) throws IOException {
        content.close();
        structure.finish();
        for (int i = 0; i < pages.size(); i++) {
            Footer.set(document, pages.get(i), fonts, left, "page " + (i + 1) + " of " + pages.size());
        }
    }

    /** Shows one line of text. */
    private void show(PDPageContentStream on, Style style, Color color, String text, float x, float at)
            throws IOException {
        PDFont font = style.font(fonts);
        on.beginText();
        on.setNonStrokingColor(color);
        on.setFont(font, style.size());
        on.newLineAtOffset(x, at);
        on.showText(Fonts.drawable(font, text));
        on.endText();
    }

    @Override
    public void close() throws IOException {
        content.close();
    }

    private PDPageContentStream begin() throws IOException {
        PDPage page = new PDPage(PDRectangle.A4);
        document.addPage(page);
        pages.add(page);
        structure.begin(page);
        y = TOP;
        return new PDPageContentStream(document, page);
    }
}
