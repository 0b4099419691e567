package org.notchwork.report;

import de.rototor.pdfbox.graphics2d.PdfBoxGraphics2D;
import de.rototor.pdfbox.graphics2d.PdfBoxGraphics2DFontTextDrawer;
import java.awt.Font;
import java.awt.Graphics2D;
import java.io.IOException;
import java.util.function.Consumer;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.graphics.form.PDFormXObject;

/** Turns what a chart library paints into vectors and text of a PDF. */
final class ChartCanvas {

    private ChartCanvas() {}

    /** Returns what was painted, all text in one font, as a form that can be placed on a page. */
    static PDFormXObject draw(
            PDDocument document, Fonts fonts, Font font, int width, int height, Consumer<Graphics2D> painter)
            throws IOException {
        PdfBoxGraphics2D graphics = new PdfBoxGraphics2D(document, width, height);
        try (PdfBoxGraphics2DFontTextDrawer drawer = new PdfBoxGraphics2DFontTextDrawer()) {
            drawer.registerFont(font.getFontName(), fonts.body());
            graphics.setFontTextDrawer(drawer);
            painter.accept(graphics);
        } finally {
            graphics.dispose();
        }
        return graphics.getXFormObject();
    }
}
