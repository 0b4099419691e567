package org.notchwork.report;

import java.awt.AWTError;
import java.awt.Font;
import java.awt.FontFormatException;
import java.awt.font.FontRenderContext;
import java.io.IOException;
import java.io.InputStream;

/** The report's font as the platform's drawing classes know it; charts are measured with it. */
final class ChartFont {

    private ChartFont() {}

    /**
     * Returns the font at size 1.
     *
     * @throws IllegalStateException if this Java cannot handle fonts at all: some small installations leave that out
     */
    static Font load() {
        try (InputStream in = Fonts.open("DejaVuSans.ttf")) {
            Font font = Font.createFont(Font.TRUETYPE_FONT, in);
            // The native part is loaded by the first measurement only.
            width(font, "n");
            return font;
        } catch (FontFormatException | IOException | LinkageError | InternalError | AWTError e) {
            throw new IllegalStateException(
                    "charts cannot be drawn: this Java has no working fonts (" + e
                            + "); on Linux install fontconfig and libfreetype6, or a Java with its desktop module",
                    e);
        }
    }

    /** Returns the width of a text. */
    static double width(Font font, String text) {
        return font.getStringBounds(text, new FontRenderContext(null, true, true))
                .getWidth();
    }
}
