package org.notchwork.report;

import java.awt.BasicStroke;
import java.awt.Color;
import java.util.List;
import org.knowm.xchart.style.markers.Marker;
import org.knowm.xchart.style.markers.SeriesMarkers;

/**
 * Colours, markers and dashes that tell up to twelve strategies apart, also without colour.
 *
 * <p>The colours are those of M. Okabe and K. Ito (Color Universal Design, 2008), yellow left out because it is faint
 * on white.
 */
final class Palette {

    private static final List<Color> COLORS = List.of(
            new Color(0x0072B2),
            new Color(0xD55E00),
            new Color(0x009E73),
            new Color(0xCC79A7),
            new Color(0x000000),
            new Color(0xE69F00),
            new Color(0x56B4E9));

    private static final List<Marker> MARKERS = List.of(
            SeriesMarkers.CIRCLE,
            SeriesMarkers.SQUARE,
            SeriesMarkers.TRIANGLE_UP,
            SeriesMarkers.DIAMOND,
            SeriesMarkers.CROSS,
            SeriesMarkers.TRIANGLE_DOWN,
            SeriesMarkers.PLUS,
            SeriesMarkers.TRAPEZOID,
            SeriesMarkers.OVAL,
            SeriesMarkers.RECTANGLE);

    private static final float[][] DASHES = {{}, {7, 3}, {2, 3}, {9, 3, 2, 3}, {4, 2}};

    private Palette() {}

    static Color color(int series) {
        return COLORS.get(series % COLORS.size());
    }

    static Marker marker(int series) {
        return MARKERS.get(series % MARKERS.size());
    }

    static BasicStroke stroke(int series) {
        float[] dash = DASHES[series % DASHES.length];
        return dash.length == 0
                ? new BasicStroke(1.6f)
                : new BasicStroke(1.6f, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND, 1, dash, 0);
    }

    /** The stroke of a law: thinner than any observation, in short dashes. */
    static BasicStroke law() {
        return new BasicStroke(0.8f, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND, 1, new float[] {3, 2}, 0);
    }
}
