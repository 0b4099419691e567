package org.notchwork.report;

import java.io.IOException;
import java.util.List;
import org.notchwork.bundle.Results;
import org.notchwork.exact.Decimals;
import org.notchwork.figure.CellFigures;
import org.notchwork.figure.Interval;
import org.notchwork.figure.QueryFigures;
import org.notchwork.study.Experiment;

/** For every experiment its chart and two tables of all its cells: how trials ended, and what they cost. */
final class FiguresSection {

    private static final String NONE = "–";

    /** Room for the heading over a chart. */
    private static final float HEADING = 44;

    private final Results results;

    FiguresSection(Results results) {
        this.results = results;
    }

    void set(Flow flow) throws IOException {
        for (Experiment experiment : results.study().experiments()) {
            List<CellFigures> cells = results.summary().cells().stream()
                    .filter(c -> c.cell().experiment().equals(experiment.id()))
                    .toList();
            QueryChart chart = new QueryChart(experiment, cells);
            flow.require(chart.height() + HEADING);
            flow.heading("Experiment " + experiment.id() + ": queries against width");
            flow.drawing(chart.draw(flow.document(), flow.fonts()), chart.words());
            flow.note(
                    "Points: observed means with 95 % intervals, set slightly apart where they would cover one another."
                            + " Confirming calls are not included.");
            outcomes(flow, experiment, cells);
            queries(flow, experiment, cells);
        }
    }

    private static void outcomes(Flow flow, Experiment experiment, List<CellFigures> cells) throws IOException {
        flow.subheading("How the trials of " + experiment.id() + " ended");
        Table table = new Table(
                Table.Column.right("n"),
                Table.Column.left("strategy@engine"),
                Table.Column.left("sees"),
                Table.Column.right("trials"),
                Table.Column.right("solved"),
                Table.Column.right("wrong"),
                Table.Column.right("censored"),
                Table.Column.right("success"),
                Table.Column.right("95 % from"),
                Table.Column.right("to"),
                Table.Column.right("confirming calls"));
        int width = -1;
        for (CellFigures cell : cells) {
            if (cell.cell().width() != width) {
                table.group();
                width = cell.cell().width();
            }
            table.add(
                    Integer.toString(width),
                    cell.cell().label(),
                    cell.sight().orElse(NONE),
                    Long.toString(cell.trials()),
                    Long.toString(cell.solved()),
                    Long.toString(cell.wrong()),
                    Long.toString(cell.censored()),
                    Decimals.text(cell.success()),
                    Decimals.text(cell.successInterval().low()),
                    Decimals.text(cell.successInterval().high()),
                    Long.toString(cell.confirming()));
        }
        table.set(flow);
        flow.note("n: width. sees: what the engine of a quantum strategy works from; classical strategies have none."
                + " censored: the query limit was reached. 95 % intervals of success by Clopper and Pearson (1934).");
    }

    private static void queries(Flow flow, Experiment experiment, List<CellFigures> cells) throws IOException {
        flow.subheading("Queries of a trial of " + experiment.id());
        Table table = new Table(
                Table.Column.right("n"),
                Table.Column.left("strategy@engine"),
                Table.Column.right("mean"),
                Table.Column.right("95 % from"),
                Table.Column.right("to"),
                Table.Column.right("s.d."),
                Table.Column.right("min"),
                Table.Column.right("q1"),
                Table.Column.right("median"),
                Table.Column.right("q3"),
                Table.Column.right("max"));
        int width = -1;
        for (CellFigures cell : cells) {
            if (cell.cell().width() != width) {
                table.group();
                width = cell.cell().width();
            }
            QueryFigures queries = cell.queries();
            table.add(
                    Integer.toString(width),
                    cell.cell().label(),
                    (cell.censored() > 0 ? "≥ " : "") + Numbers.decimal(queries.mean()),
                    queries.interval().map(Interval::low).map(Numbers::decimal).orElse(NONE),
                    queries.interval().map(Interval::high).map(Numbers::decimal).orElse(NONE),
                    queries.deviation().map(Numbers::decimal).orElse(NONE),
                    Long.toString(queries.min()),
                    Long.toString(queries.lowerQuartile()),
                    Long.toString(queries.median()),
                    Long.toString(queries.upperQuartile()),
                    Long.toString(queries.max()));
        }
        table.set(flow);
        flow.note("s.d.: standard deviation of the sample; q1, q3: quartiles. A censored trial counts with what it had"
                + " spent; the mean of a cell with such trials is marked ≥, for it is a lower bound. 95 % intervals of the"
                + " mean by Student's t.");
    }
}
