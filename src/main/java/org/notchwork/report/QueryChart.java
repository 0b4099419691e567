package org.notchwork.report;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Font;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.graphics.form.PDFormXObject;
import org.knowm.xchart.XYChart;
import org.knowm.xchart.XYSeries;
import org.knowm.xchart.style.XYStyler;
import org.knowm.xchart.style.markers.SeriesMarkers;
import org.notchwork.figure.CellFigures;
import org.notchwork.figure.Interval;
import org.notchwork.law.QueryLaw;
import org.notchwork.study.Experiment;
import org.notchwork.study.StrategyChoice;

/**
 * Mean queries against width for one experiment, on an axis of powers of two, with 95 % intervals and the curves of
 * the laws.
 */
final class QueryChart {

    private static final int WIDTH = 900;
    private static final int HEIGHT = 440;
    private static final int LEGEND_INSET = 70;
    private static final int FOOT = 8;

    /** Half the length of the mark of a law where there is one width only. */
    private static final double MARK = 0.4;

    private static final int MOST_POINTS = 64;

    private static final int PLAIN_POWERS = 16;
    private static final double SPREAD = 0.22;
    private static final String SUPERSCRIPTS = "⁰¹²³⁴⁵⁶⁷⁸⁹";

    private final Experiment experiment;
    private final List<CellFigures> cells;
    private final XYChart chart = new XYChart(WIDTH, HEIGHT);
    private final Font font = ChartFont.load();
    private final ChartLegend legend;
    private double highest = 1;

    QueryChart(Experiment experiment, List<CellFigures> cells) {
        this.experiment = experiment;
        this.cells = List.copyOf(cells);
        boolean laws = experiment.strategies().stream().anyMatch(this::hasLaw);
        List<String> labels =
                experiment.strategies().stream().map(QueryChart::label).toList();
        this.legend = new ChartLegend(labels, laws, font.deriveFont(13f), WIDTH - LEGEND_INSET);
    }

    /** Returns the height of the chart on the page, legend included, in points. */
    float height() {
        return (HEIGHT + legend.height() + FOOT) * Flow.MEASURE / WIDTH;
    }

    /** Returns in words what the chart shows, for those who cannot see it. */
    String words() {
        return "Chart: mean queries of a trial against width, for experiment " + experiment.id() + " at widths "
                + Widths.words(experiment.widths()) + ". Strategies: "
                + String.join(
                        ", ",
                        experiment.strategies().stream().map(QueryChart::label).toList())
                + ". Every number of the chart stands in the tables that follow.";
    }

    /** Returns the chart as a drawing of vectors and text in the report's own font. */
    PDFormXObject draw(PDDocument document, Fonts fonts) throws IOException {
        List<StrategyChoice> choices = experiment.strategies();
        for (int i = 0; i < choices.size(); i++) {
            curve(i, choices.get(i));
            observed(i, choices.get(i), shift(i, choices.size()));
        }
        style();
        return ChartCanvas.draw(document, fonts, font, WIDTH, HEIGHT + legend.height() + FOOT, g -> {
            chart.paint(g, WIDTH, HEIGHT);
            legend.paint(g, LEGEND_INSET, HEIGHT);
        });
    }

    private static String label(StrategyChoice choice) {
        return choice.label() + choice.sight().map(s -> " (" + s + ")").orElse("");
    }

    /** Returns whether any width of the experiment has a law for a choice. */
    private boolean hasLaw(StrategyChoice choice) {
        return experiment.widths().stream()
                .anyMatch(width -> choice.law(experiment.problem(), width).isPresent());
    }

    private static double shift(int series, int all) {
        return all == 1 ? 0 : SPREAD * ((double) series / (all - 1) - 0.5);
    }

    private void observed(int series, StrategyChoice choice, double shift) {
        List<Double> widths = new ArrayList<>();
        List<Double> means = new ArrayList<>();
        List<Double> barWidths = new ArrayList<>();
        List<Double> bars = new ArrayList<>();
        for (CellFigures cell : cells) {
            if (!cell.cell().label().equals(choice.label())) {
                continue;
            }
            double x = cell.cell().width() + shift;
            widths.add(x);
            means.add(log2(cell.queries().mean().doubleValue()));
            Optional<Interval> interval = cell.queries().interval();
            if (interval.isPresent()) {
                barWidths.addAll(List.of(x, x, x));
                bars.add(log2(interval.get().low().doubleValue()));
                bars.add(log2(interval.get().high().doubleValue()));
                bars.add(Double.NaN);
            }
        }
        XYSeries line = chart.addSeries(choice.label(), widths, means);
        line.setMarker(Palette.marker(series));
        line.setMarkerColor(Palette.color(series));
        line.setLineColor(Palette.color(series));
        line.setLineStyle(Palette.stroke(series));
        if (!bars.isEmpty()) {
            hidden("interval " + series, barWidths, bars, Palette.color(series), new BasicStroke(1.1f));
        }
    }

    private void curve(int series, StrategyChoice choice) {
        List<Double> widths = new ArrayList<>();
        List<Double> means = new ArrayList<>();
        int from = experiment.widths().get(0);
        int to = experiment.widths().get(experiment.widths().size() - 1);
        int step = Math.max(1, (to - from) / MOST_POINTS);
        for (int width = from; width <= to; width += step) {
            Optional<QueryLaw> law = choice.law(experiment.problem(), width);
            if (law.isPresent()) {
                widths.add((double) width);
                means.add(log2(law.get().mean(width).value().doubleValue()));
            }
        }
        if (widths.isEmpty()) {
            return;
        }
        if (widths.size() == 1) {
            widths = List.of(widths.get(0) - MARK, widths.get(0) + MARK);
            means = List.of(means.get(0), means.get(0));
        }
        hidden("law " + series, widths, means, Palette.color(series), Palette.law());
    }

    private void hidden(String name, List<Double> x, List<Double> y, Color color, BasicStroke stroke) {
        XYSeries line = chart.addSeries(name, x, y);
        line.setMarker(SeriesMarkers.NONE);
        line.setLineColor(color);
        line.setLineStyle(stroke);
    }

    private double log2(double value) {
        double power = Math.log(Math.max(1, value)) / Math.log(2);
        highest = Math.max(highest, power);
        return power;
    }

    private void style() {
        XYStyler styler = chart.getStyler();
        chart.setXAxisTitle("width n (input bits)");
        chart.setYAxisTitle("mean queries of a trial (axis of powers of two)");
        styler.setAxisTitleFont(font.deriveFont(15f));
        styler.setAxisTickLabelsFont(font.deriveFont(14f));
        styler.setBaseFont(font.deriveFont(13f));
        styler.setChartTitleVisible(false);
        styler.setChartBackgroundColor(Color.WHITE);
        styler.setPlotBorderVisible(false);
        styler.setPlotGridLinesColor(new Color(0xdddddd));
        styler.setPlotGridLinesStroke(new BasicStroke(0.6f));
        styler.setLegendVisible(false);
        styler.setMarkerSize(8);
        styler.setAntiAlias(true);
        styler.setYAxisMin(0.0);
        styler.setYAxisMax(Math.ceil(highest));
        styler.setXAxisMin(experiment.widths().get(0) - 1.0);
        styler.setXAxisMax(experiment.widths().get(experiment.widths().size() - 1) + 1.0);
        styler.setxAxisTickLabelsFormattingFunction(QueryChart::whole);
        styler.setyAxisTickLabelsFormattingFunction(QueryChart::power);
    }

    private static String whole(double value) {
        return isWhole(value) ? Long.toString(Math.round(value)) : "";
    }

    private static String power(double value) {
        if (!isWhole(value)) {
            return "";
        }
        long power = Math.round(value);
        if (power <= PLAIN_POWERS) {
            return Long.toString(1L << power);
        }
        StringBuilder text = new StringBuilder("2");
        Long.toString(power).chars().forEach(d -> text.append(SUPERSCRIPTS.charAt(d - '0')));
        return text.toString();
    }

    private static boolean isWhole(double value) {
        return Math.abs(value - Math.rint(value)) < 1e-9;
    }
}
