package org.notchwork.report;

import java.io.IOException;
import java.math.BigDecimal;
import java.util.List;
import org.notchwork.bundle.Results;
import org.notchwork.exact.Decimals;
import org.notchwork.figure.CellFigures;
import org.notchwork.figure.Interval;
import org.notchwork.figure.RatioFigures;
import org.notchwork.study.Experiment;

/** Charts and tables of every cell, and the ratios on paired trials. */
final class FiguresSection {

    private static final int PLACES = 3;

    /** Numbers with more digits before the point are set with fewer after it, so that a column holds them. */
    private static final int THREE_DIGITS = 3;

    private static final int FIVE_DIGITS = 5;
    private static final float CHART_ROOM = 380;

    private final Results results;

    FiguresSection(Results results) {
        this.results = results;
    }

    void set(Flow flow) throws IOException {
        for (Experiment experiment : results.study().experiments()) {
            List<CellFigures> cells = results.summary().cells().stream()
                    .filter(c -> c.cell().experiment().equals(experiment.id()))
                    .toList();
            flow.require(CHART_ROOM);
            flow.heading("Experiment " + experiment.id() + ": queries against width");
            flow.drawing(new QueryChart(experiment, cells).draw(flow.document(), flow.fonts()));
            flow.note(
                    "Points: observed means with 95 % intervals, set slightly apart where they would cover one another."
                            + " Dotted lines of the same colour: the exact law of the strategy. Confirming calls are not"
                            + " included.");
            table(cells).set(flow);
            flow.note(
                    "success: 95 % Clopper-Pearson interval; q: quartiles; conf.: confirming calls. cens.: censored, the query"
                            + " limit was reached; such a trial counts with what it had spent, so the mean is a lower bound.");
        }
        ratios(flow);
    }

    private static Table table(List<CellFigures> cells) {
        Table table = Table.wide(List.of(
                Table.Column.right("n", 15),
                Table.Column.left("strategy", 102),
                Table.Column.left("sees", 29),
                Table.Column.right("trials", 26),
                Table.Column.right("solved", 28),
                Table.Column.right("wrong", 29),
                Table.Column.right("cens.", 25),
                Table.Column.left("success", 45),
                Table.Column.right("mean", 42),
                Table.Column.right("s.d.", 40),
                Table.Column.left("95 % of the mean", 78),
                Table.Column.right("min/q1/med/q3/max", 80),
                Table.Column.right("conf.", 24)));
        for (CellFigures cell : cells) {
            table.add(List.of(
                    Integer.toString(cell.cell().width()),
                    cell.cell().label(),
                    cell.sight().orElse(""),
                    Long.toString(cell.trials()),
                    Long.toString(cell.solved()),
                    Long.toString(cell.wrong()),
                    Long.toString(cell.censored()),
                    interval(cell.successInterval()),
                    decimal(cell.queries().mean()),
                    cell.queries().deviation().map(FiguresSection::decimal).orElse("-"),
                    cell.queries().interval().map(FiguresSection::interval).orElse("-"),
                    cell.queries().min() + "/" + cell.queries().lowerQuartile() + "/"
                            + cell.queries().median() + "/" + cell.queries().upperQuartile() + "/"
                            + cell.queries().max(),
                    Long.toString(cell.confirming())));
        }
        return table;
    }

    /** The ratios of classical over quantum strategies; all of them where a study has only one sort. */
    private List<RatioFigures> shown() {
        List<RatioFigures> mixed = results.summary().ratios().stream()
                .filter(r -> r.to().label().contains("@") && !r.of().label().contains("@"))
                .toList();
        return mixed.isEmpty() ? results.summary().ratios() : mixed;
    }

    private void ratios(Flow flow) throws IOException {
        if (results.summary().ratios().isEmpty()) {
            return;
        }
        flow.heading("Ratios of mean queries on the same instances");
        Table table = new Table(List.of(
                Table.Column.left("experiment / n", 16),
                Table.Column.left("of", 28),
                Table.Column.left("over", 28),
                Table.Column.right("pairs", 8),
                Table.Column.right("ratio", 12),
                Table.Column.left("95 % interval (Fieller)", 24)));
        for (RatioFigures ratio : shown()) {
            table.add(List.of(
                    ratio.of().experiment() + " / " + ratio.of().width(),
                    ratio.of().label(),
                    ratio.to().label(),
                    Long.toString(ratio.pairs()),
                    decimal(ratio.ratio()),
                    ratio.interval().map(FiguresSection::interval).orElse("none")));
        }
        table.set(flow);
        if (shown().size() < results.summary().ratios().size()) {
            flow.note("Classical over quantum strategies; the other ratios stand in summary.json.");
        }
    }

    private static String interval(Interval interval) {
        return decimal(interval.low()) + "–" + decimal(interval.high());
    }

    private static String decimal(BigDecimal value) {
        int whole = value.precision() - value.scale();
        return Decimals.text(value, whole > FIVE_DIGITS ? 0 : whole > THREE_DIGITS ? 1 : PLACES);
    }
}
