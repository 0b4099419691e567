package org.notchwork.report;

import java.io.IOException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.notchwork.check.CheckKind;
import org.notchwork.check.CrossCheck;

/** The calibration of the measuring stick: the exact law beside the observed mean of every cell that has a law. */
final class CalibrationSection {

    private static final String MEAN = "mean ";

    private final List<CrossCheck> checks;

    CalibrationSection(List<CrossCheck> checks) {
        this.checks =
                checks.stream().filter(c -> c.kind() == CheckKind.THEORY_MEAN).toList();
    }

    void set(Flow flow) throws IOException {
        flow.heading("Calibration: the exact law beside the observed mean");
        if (checks.isEmpty()) {
            flow.body("No strategy of this study has a law for the mean.");
            return;
        }
        Map<String, List<CrossCheck>> byExperiment = new LinkedHashMap<>();
        for (CrossCheck check : checks) {
            byExperiment.computeIfAbsent(cell(check)[0], e -> new ArrayList<>()).add(check);
        }
        for (Map.Entry<String, List<CrossCheck>> experiment : byExperiment.entrySet()) {
            flow.subheading("Experiment " + experiment.getKey());
            table(experiment.getValue()).set(flow);
        }
        flow.note(
                "s.e. apart: how many standard errors lie between them. The standard error comes from the variance of the law, or of the sample where the law gives none."
                        + " Beyond five of them the check differs; by chance a normal mean lies there with probability"
                        + " 5.7e-7.");
    }

    private static Table table(List<CrossCheck> checks) {
        Table table = new Table(
                Table.Column.right("n"),
                Table.Column.left("strategy@engine"),
                Table.Column.right("trials"),
                Table.Column.left("law: mean"),
                Table.Column.left("observed: mean"),
                Table.Column.left("standard error"),
                Table.Column.right("s.e. apart"),
                Table.Column.left("outcome"));
        String width = "";
        for (CrossCheck check : checks) {
            String[] cell = cell(check);
            String[] observed = withoutMean(check.observed()).split(", standard error ", 2);
            if (!cell[1].equals(width)) {
                table.group();
                width = cell[1];
            }
            table.add(
                    width,
                    cell[2],
                    Long.toString(check.compared()),
                    withoutMean(check.expected()),
                    observed[0],
                    observed.length == 1 ? "–" : observed[1],
                    check.standardErrors().orElse("–"),
                    check.outcome().word());
        }
        return table;
    }

    /** Returns experiment, width and label of the cell that a check is on. */
    private static String[] cell(CrossCheck check) {
        return check.subject().split("/", 3);
    }

    /** The heading says that these are means. */
    private static String withoutMean(String text) {
        return text.startsWith(MEAN) ? text.substring(MEAN.length()) : text;
    }
}
