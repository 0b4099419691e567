package org.notchwork.report;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.util.List;

/** The legend under a chart: one entry a strategy, in as many columns as its longest label allows. */
final class ChartLegend {

    private static final int ROW = 24;
    private static final int SAMPLE = 44;
    private static final int GAP = 10;
    private static final int BETWEEN = 26;
    private static final int MARKER = 8;
    private static final String LAW = "exact law of the strategy of that colour";

    private final List<String> labels;
    private final boolean laws;
    private final Font font;
    private final int columns;
    private final double columnWidth;

    /**
     * Lays the legend out.
     *
     * @param labels one a strategy, in order
     * @param laws whether the chart has curves of laws
     * @param font the font
     * @param width the room, in the units of the chart
     */
    ChartLegend(List<String> labels, boolean laws, Font font, int width) {
        this.labels = List.copyOf(labels);
        this.laws = laws;
        this.font = font;
        double widest = laws ? ChartFont.width(font, LAW) : 0;
        for (String label : labels) {
            widest = Math.max(widest, ChartFont.width(font, label));
        }
        this.columnWidth = SAMPLE + GAP + widest + BETWEEN;
        this.columns = Math.max(1, (int) (width / columnWidth));
    }

    /** Returns the height, in the units of the chart. */
    int height() {
        int entries = labels.size() + (laws ? 1 : 0);
        return ROW * ((entries + columns - 1) / columns);
    }

    /** Paints the legend from a given corner on. */
    void paint(Graphics2D graphics, int left, int top) {
        graphics.setFont(font);
        for (int i = 0; i < labels.size(); i++) {
            double x = x(i, left);
            double y = y(i, top);
            sample(graphics, x, y, Palette.color(i), Palette.stroke(i));
            Palette.marker(i).paint(graphics, x + SAMPLE / 2.0, y, MARKER);
            label(graphics, labels.get(i), x, y);
        }
        if (laws) {
            double x = x(labels.size(), left);
            double y = y(labels.size(), top);
            sample(graphics, x, y, Color.DARK_GRAY, Palette.law());
            label(graphics, LAW, x, y);
        }
    }

    private double x(int entry, int left) {
        return left + entry % columns * columnWidth;
    }

    private double y(int entry, int top) {
        int row = entry / columns;
        return top + row * (double) ROW + ROW / 2.0;
    }

    private static void sample(Graphics2D graphics, double x, double y, Color color, BasicStroke stroke) {
        graphics.setColor(color);
        graphics.setStroke(stroke);
        graphics.draw(new Line2D.Double(x, y, x + SAMPLE, y));
    }

    private void label(Graphics2D graphics, String label, double x, double y) {
        graphics.setColor(Style.INK);
        graphics.drawString(label, (float) (x + SAMPLE + GAP), (float) (y + font.getSize2D() * 0.36));
    }
}
