package org.notchwork.report;

import java.io.IOException;
import java.util.List;
import org.notchwork.bundle.Results;
import org.notchwork.exact.Decimals;
import org.notchwork.figure.CellFigures;
import org.notchwork.figure.ControlFigures;

/** What the controls came to: each strategy on functions that hide nothing. */
final class ControlsSection {

    private final Results results;

    ControlsSection(Results results) {
        this.results = results;
    }

    void set(Flow flow) throws IOException {
        List<CellFigures> cells = results.summary().cells().stream()
                .filter(c -> c.control().isPresent())
                .toList();
        if (cells.isEmpty()) {
            return;
        }
        flow.heading("Controls: the same strategies on functions that hide nothing");
        Table table = new Table(
                Table.Column.left("cell"),
                Table.Column.left("sight"),
                Table.Column.right("solved"),
                Table.Column.right("controls"),
                Table.Column.right("named secret"),
                Table.Column.right("chance"),
                Table.Column.right("p"),
                Table.Column.right("claimed"),
                Table.Column.right("failed"),
                Table.Column.left("flag"));
        String group = "";
        for (CellFigures cell : cells) {
            String here = cell.cell().experiment() + "/" + cell.cell().width();
            if (!here.equals(group)) {
                table.group();
                group = here;
            }
            ControlFigures control = cell.control().orElseThrow();
            table.add(
                    cell.cell().id(),
                    cell.sight().orElse("-"),
                    cell.solved() + "/" + cell.trials(),
                    Long.toString(control.trials()),
                    Long.toString(control.named()),
                    Decimals.text(control.chance(), 4),
                    Decimals.text(control.p(), 4),
                    Long.toString(control.claimed()),
                    Long.toString(control.failed()),
                    control.isFlagged() ? "FLAGGED" : "");
        }
        table.set(flow);
        flow.note(
                "Each control puts a function without the secret in the place of a trial's. Named secret: it named what the"
                        + " trial hides all the same; p is the chance of so many by guessing. Flagged below 0.001: such a cell"
                        + " was told its answer, and its success proves nothing about the strategy. Claimed: it named something"
                        + " else and two values agree by accident; failed: its own certificate does not hold.");
    }
}
