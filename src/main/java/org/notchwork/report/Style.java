package org.notchwork.report;

import java.awt.Color;
import org.apache.pdfbox.pdmodel.font.PDFont;

/** The few styles of text that a report uses. */
enum Style {
    /** The title of the report. */
    TITLE(18, 23),
    /** A section's heading. */
    HEADING(12.5f, 17),
    /** Running text. */
    BODY(9, 12.6f),
    /** Running text that must not be missed. */
    STRONG(9.5f, 13.2f),
    /** Tables and notes. */
    SMALL(7, 9.4f),
    /** Tables with many columns. */
    TINY(5.7f, 8),
    /** Headings of such tables. */
    TINY_STRONG(5.7f, 8),
    /** Headings of tables. */
    SMALL_STRONG(7, 9.4f),
    /** Commands. */
    CODE(7.4f, 11),
    /** The seal. */
    SEAL(15, 22);

    /** Text. */
    static final Color INK = new Color(0x1a1a1a);

    /** Notes. */
    static final Color GREY = new Color(0x555555);

    /** Rules. */
    static final Color RULE = new Color(0xb0b0b0);

    /** What must not be missed; the words say it too. */
    static final Color ALARM = new Color(0xa01800);

    private final float size;
    private final float leading;

    Style(float size, float leading) {
        this.size = size;
        this.leading = leading;
    }

    float size() {
        return size;
    }

    float leading() {
        return leading;
    }

    PDFont font(Fonts fonts) {
        return switch (this) {
            case TITLE, HEADING, STRONG, SMALL_STRONG, TINY_STRONG -> fonts.bold();
            case BODY, SMALL, TINY -> fonts.body();
            case CODE, SEAL -> fonts.mono();
        };
    }
}
