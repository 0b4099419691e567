package org.notchwork.report;

import java.io.IOException;
import java.util.List;
import java.util.Optional;
import org.notchwork.check.CheckKind;
import org.notchwork.check.CheckOutcome;
import org.notchwork.check.CrossCheck;

/** Every cross-check: those that differ first, then the others by kind. */
final class ChecksSection {

    private final List<CrossCheck> checks;

    ChecksSection(List<CrossCheck> checks) {
        this.checks = List.copyOf(checks);
    }

    void set(Flow flow) throws IOException {
        flow.heading("Cross-checks");
        List<CrossCheck> differing =
                checks.stream().filter(c -> c.outcome() == CheckOutcome.DIFFERS).toList();
        if (!differing.isEmpty()) {
            flow.subheading("Those that DIFFER");
            differing(flow, differing);
        }
        for (CheckKind kind : CheckKind.values()) {
            List<CrossCheck> others = checks.stream()
                    .filter(c -> c.kind() == kind && c.outcome() != CheckOutcome.DIFFERS)
                    .toList();
            if (kind == CheckKind.THEORY_MEAN && !others.isEmpty()) {
                flow.subheading(kind.word() + ": " + kind.statement());
                flow.note(Numbers.count(others.size(), "check") + ", listed above as the calibration.");
            } else if (!others.isEmpty()) {
                flow.subheading(kind.word() + ": " + kind.statement());
                table(flow, others);
            }
        }
    }

    /** Sets checks of one kind; an expectation that is the same for all of them is said once, before them. */
    private static void table(Flow flow, List<CrossCheck> checks) throws IOException {
        Optional<String> common = common(checks);
        flow.note("Source: " + checks.get(0).kind().source() + "."
                + common.map(c -> " Expected each time: " + c + ".").orElse(""));
        Table table = common.isPresent()
                ? new Table(
                        Table.Column.left("on"),
                        Table.Column.right("compared"),
                        Table.Column.left("observed"),
                        Table.Column.left("outcome"))
                : new Table(
                        Table.Column.left("on"),
                        Table.Column.right("compared"),
                        Table.Column.left("expected"),
                        Table.Column.left("observed"),
                        Table.Column.left("outcome"));
        for (CrossCheck check : checks) {
            String compared = Long.toString(check.compared());
            String outcome = check.outcome().word();
            if (common.isPresent()) {
                table.add(check.subject(), compared, check.observed(), outcome);
            } else {
                table.add(check.subject(), compared, check.expected(), check.observed(), outcome);
            }
        }
        table.set(flow);
    }

    private static void differing(Flow flow, List<CrossCheck> checks) throws IOException {
        Table table = new Table(
                Table.Column.left("check"),
                Table.Column.left("on"),
                Table.Column.right("compared"),
                Table.Column.left("expected"),
                Table.Column.left("observed"),
                Table.Column.left("outcome"));
        for (CrossCheck check : checks) {
            table.add(
                    check.kind().word(),
                    check.subject(),
                    Long.toString(check.compared()),
                    check.expected(),
                    check.observed(),
                    check.outcome().word());
        }
        table.set(flow);
    }

    private static Optional<String> common(List<CrossCheck> checks) {
        List<String> expected =
                checks.stream().map(CrossCheck::expected).distinct().toList();
        return expected.size() == 1 ? Optional.of(expected.get(0)) : Optional.empty();
    }
}
