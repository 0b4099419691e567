package org.notchwork.verify;

import java.util.List;
import java.util.OptionalLong;
import org.notchwork.bundle.ClaimsFile;
import org.notchwork.bundle.Layout;
import org.notchwork.bundle.SummaryFile;
import org.notchwork.check.CrossCheck;
import org.notchwork.check.CrossChecker;
import org.notchwork.claim.Judge;
import org.notchwork.figure.Summary;
import org.notchwork.json.JsonValue;

/** Computes figures, claims and the cross-checks that need only lines again, and compares them with the files. */
final class FiguresStage {

    private FiguresStage() {}

    static StageReport report(OpenedFiles files, LinePass pass) {
        if (pass.misplacement().isPresent()) {
            return StageReport.of(
                    Stage.FIGURES,
                    pass.misplaced(),
                    "",
                    pass.misplacement().get().sentence());
        }
        Findings findings = new Findings();
        Summary summary = pass.figures().summary();
        compare(findings, Layout.SUMMARY, files, SummaryFile.write(summary, files.checks()));
        compare(findings, Layout.CLAIMS, files, ClaimsFile.write(Judge.judge(files.study(), summary)));
        CrossChecker checker = new CrossChecker(files.study());
        List<CrossCheck> recomputed = checker.fromLines(pass.lineChecks(), summary);
        List<CrossCheck> written =
                files.checks().stream().filter(c -> !c.kind().needsInstances()).toList();
        CheckComparison.compare(findings, files.checks(), written, recomputed);
        CheckComparison.names(findings, files.checks(), checker.onInstances());
        int rest = files.checks().size() - recomputed.size();
        return StageReport.of(
                Stage.FIGURES,
                findings,
                "recomputed: identical: " + summary.cells().size() + " cells, "
                        + files.study().claims().size() + " claims, " + recomputed.size()
                        + " cross-checks from the lines; " + rest + " cross-checks are there that need --rerun all",
                "recomputed: different");
    }

    private static void compare(Findings findings, String name, OpenedFiles files, JsonValue recomputed) {
        new JsonDifference((pointer, written, right) ->
                        findings.add(new Finding(Layout.DATA + name, OptionalLong.empty(), pointer, written, right)))
                .compare(files.values().get(name), recomputed);
    }
}
