package org.notchwork.report;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.notchwork.Studies;
import org.notchwork.bundle.Environment;
import org.notchwork.bundle.Results;
import org.notchwork.check.CrossChecker;
import org.notchwork.check.InstanceTally;
import org.notchwork.check.LineChecks;
import org.notchwork.claim.Judge;
import org.notchwork.figure.Summary;
import org.notchwork.figure.SummaryBuilder;
import org.notchwork.study.Claim;
import org.notchwork.study.Experiment;
import org.notchwork.study.StrategyChoice;
import org.notchwork.study.Study;
import org.notchwork.trial.TrialGroup;
import org.notchwork.trial.TrialRunner;

/** Studies small enough to run in a test, and what they come to. */
final class Samples {

    static final String SEAL = "0123456789abcdef00112233445566778899aabbccddeeff0011223344556677";
    static final Environment ENVIRONMENT = new Environment(
            "notchwork test",
            "2026-01-02T03:04:05Z",
            "2026-01-02T03:04:00Z",
            1,
            2,
            "Java of a test",
            "System of a test");

    private Samples() {}

    static Study one() {
        return Studies.of("""
                {"format":"notchwork-study/1","title":"One cell (invented)","question":"?","seed":"a seed of one cell only",
                 "experiments":[{"id":"one","problem":{"kind":"xor-period"},"widths":[2],
                   "strategies":[{"name":"random-draws"}],"trials":1,"query-limit":1}]}
                """);
    }

    static Study many() {
        Study small = Studies.small();
        Experiment first = small.experiments().get(0);
        List<StrategyChoice> choices = new ArrayList<>(first.strategies());
        List<Integer> widths = List.of(2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12);
        Experiment wide =
                new Experiment("many-widths-and-a-long-name-0123456789", first.problem(), widths, choices, 3, 100_000);
        return new Study(small.title(), small.question(), small.seed(), List.of(wide), 0, List.of());
    }

    static Study longTexts() {
        Study small = Studies.small();
        String odd = "W".repeat(90) + " \u6f22\u5b57 \u202e turned \u0007 bell \ud83d\ude00 ";
        return new Study(
                (odd + "x".repeat(200)).substring(0, 200),
                odd.repeat(12),
                small.seed(),
                small.experiments(),
                3,
                small.claims().stream()
                        .map(c -> new Claim(c.id(), odd.repeat(8), c.quantity(), c.bound()))
                        .toList());
    }

    static Results results(Study study) {
        TrialRunner runner = new TrialRunner(study);
        SummaryBuilder figures = new SummaryBuilder(study);
        LineChecks lines = new LineChecks(study);
        for (Experiment experiment : study.experiments()) {
            for (int width : experiment.widths()) {
                for (long trial = 0; trial < experiment.trials(); trial++) {
                    TrialGroup group = runner.run(experiment, width, trial);
                    figures.add(group);
                    lines.add(group);
                }
            }
        }
        Summary summary = figures.summary();
        Map<String, InstanceTally> none = new LinkedHashMap<>();
        return new Results(
                study, summary, new CrossChecker(study).all(none, lines, summary), Judge.judge(study, summary));
    }
}
