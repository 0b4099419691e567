package org.notchwork.report;

import java.io.IOException;
import java.util.List;
import org.notchwork.bundle.Results;
import org.notchwork.exact.Decimals;
import org.notchwork.figure.CellFigures;
import org.notchwork.figure.FunctionFigures;
import org.notchwork.figure.SplitFigures;

/** Figures of parts of a cell: each function that is called, each side of a question with two. */
final class PartsSection {

    private final Results results;

    PartsSection(Results results) {
        this.results = results;
    }

    void set(Flow flow) throws IOException {
        functions(flow);
        sides(flow);
    }

    private void functions(Flow flow) throws IOException {
        List<CellFigures> cells = results.summary().cells().stream()
                .filter(c -> !c.byFunction().isEmpty())
                .toList();
        if (cells.isEmpty()) {
            return;
        }
        flow.heading("Queries of each function");
        Table table = new Table(
                Table.Column.left("cell"),
                Table.Column.left("function"),
                Table.Column.right("mean"),
                Table.Column.right("max"),
                Table.Column.right("mean, all functions"));
        for (CellFigures cell : cells) {
            table.group();
            for (FunctionFigures function : cell.byFunction()) {
                table.add(
                        cell.cell().id(),
                        function.function(),
                        Numbers.decimal(function.mean()),
                        Long.toString(function.max()),
                        Numbers.decimal(cell.queries().mean()));
            }
        }
        table.set(flow);
        flow.note(
                "A use of the combined function costs one call of each. Published counts often take the keyed function"
                        + " alone. The constructions are toys of toy size.");
    }

    private void sides(Flow flow) throws IOException {
        List<CellFigures> cells = results.summary().cells().stream()
                .filter(c -> !c.split().isEmpty())
                .toList();
        if (cells.isEmpty()) {
            return;
        }
        flow.heading("Success on each side of a question with two");
        Table table = new Table(
                Table.Column.left("cell"),
                Table.Column.left("hidden"),
                Table.Column.right("trials"),
                Table.Column.right("solved"),
                Table.Column.right("rate"),
                Table.Column.right("95 % from"),
                Table.Column.right("to"));
        for (CellFigures cell : cells) {
            table.group();
            for (SplitFigures side : cell.split()) {
                table.add(
                        cell.cell().id(),
                        side.hidden(),
                        Long.toString(side.trials()),
                        Long.toString(side.solved()),
                        Decimals.text(side.success(), 4),
                        Decimals.text(side.interval().low(), 4),
                        Decimals.text(side.interval().high(), 4));
            }
        }
        table.set(flow);
        flow.note("One minus the rate is the error rate of that side, answers that were not given included.");
    }
}
