package org.notchwork.report;

import java.awt.Color;
import org.apache.pdfbox.pdmodel.font.PDFont;

/** The few styles of text that a report uses. Sizes and leadings are in points. */
enum Style {
    /** The title of the report. */
    TITLE(18, 23),
    /** A section's heading. */
    HEADING(12.5f, 17),
    /** A heading within a section. */
    SUBHEADING(9, 12.6f),
    /** Running text. */
    BODY(9, 12.6f),
    /** Running text that must not be missed. */
    STRONG(10.5f, 14),
    /** Tables and notes. */
    SMALL(7, 9.8f),
    /** Headings of tables. */
    SMALL_STRONG(7, 9.8f),
    /** Commands. */
    CODE(7.4f, 11),
    /** The seal. */
    SEAL(22, 29);

    /** Text. */
    static final Color INK = new Color(0x1a1a1a);

    /** Notes. */
    static final Color GREY = new Color(0x555555);

    /** Rules between groups. */
    static final Color RULE = new Color(0x8c8c8c);

    /** Rules between rows. */
    static final Color HAIR = new Color(0xd9d9d9);

    /** The ground of a box. */
    static final Color TINT = new Color(0xf0f0ee);

    /** The ground of a box that must not be missed; its words say it too. */
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
            case TITLE, HEADING, SUBHEADING, STRONG, SMALL_STRONG -> fonts.bold();
            case BODY, SMALL -> fonts.body();
            case CODE, SEAL -> fonts.mono();
        };
    }
}
