package org.notchwork.report;

import java.io.IOException;
import java.util.Comparator;
import java.util.List;
import org.notchwork.bundle.Results;
import org.notchwork.check.CheckKind;
import org.notchwork.check.CheckOutcome;
import org.notchwork.check.CrossCheck;

/** The calibration of the measuring stick, and every other cross-check; those that differ go first. */
final class ChecksSection {

    private final Results results;

    ChecksSection(Results results) {
        this.results = results;
    }

    void set(Flow flow) throws IOException {
        calibration(flow);
        flow.heading("Cross-checks");
        Table table = new Table(List.of(
                Table.Column.left("check", 18),
                Table.Column.left("on", 24),
                Table.Column.right("compared", 12),
                Table.Column.left("expected", 40),
                Table.Column.left("observed", 28),
                Table.Column.left("outcome", 12)));
        results.checks().stream()
                .filter(c -> c.kind() != CheckKind.THEORY_MEAN || c.outcome() == CheckOutcome.DIFFERS)
                .sorted(Comparator.comparing((CrossCheck c) -> c.outcome() != CheckOutcome.DIFFERS))
                .forEach(c -> table.add(List.of(
                        c.kind().word(),
                        c.subject(),
                        Long.toString(c.compared()),
                        c.expected(),
                        c.observed(),
                        c.outcome().word())));
        table.set(flow);
    }

    private void calibration(Flow flow) throws IOException {
        flow.heading("Calibration: the exact law beside the observed mean");
        Table table = new Table(List.of(
                Table.Column.left("cell", 34),
                Table.Column.right("trials", 9),
                Table.Column.left("law", 40),
                Table.Column.left("observed", 40),
                Table.Column.right("standard errors apart", 14),
                Table.Column.left("outcome", 13)));
        for (CrossCheck check : results.checks()) {
            if (check.kind() == CheckKind.THEORY_MEAN) {
                table.add(List.of(
                        check.subject(),
                        Long.toString(check.compared()),
                        check.expected(),
                        check.observed(),
                        check.standardErrors().orElse("-"),
                        check.outcome().word()));
            }
        }
        table.set(flow);
        flow.note("The standard error comes from the variance of the law. Beyond five of them the check differs; by"
                + " chance a normal mean lies there with probability 5.7e-7.");
    }
}
