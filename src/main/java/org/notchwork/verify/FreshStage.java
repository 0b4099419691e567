package org.notchwork.verify;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalLong;
import org.notchwork.bundle.Layout;
import org.notchwork.claim.ClaimResult;
import org.notchwork.claim.ClaimVerdict;
import org.notchwork.claim.Judge;
import org.notchwork.exact.Decimals;
import org.notchwork.figure.CellFigures;
import org.notchwork.figure.Holm;
import org.notchwork.figure.Summary;
import org.notchwork.figure.SummaryBuilder;
import org.notchwork.figure.TwoSamples;
import org.notchwork.study.Study;
import org.notchwork.trial.TrialGroup;
import org.notchwork.trial.TrialPool;
import org.notchwork.trial.TrialRange;
import org.notchwork.trial.TrialRunner;

/**
 * Runs the author's study on the referee's own seed and asks whether both can come from one distribution: query counts by
 * chi-squared, success rates by Fisher's exact test, all corrected together by Holm (1979), incompatible below 0.001. Each
 * claim is judged on the fresh trials alone; one that turns from supported to refuted, or the reverse, is incompatible.
 */
final class FreshStage {

    private static final BigDecimal LEVEL = new BigDecimal("0.001");
    private static final String FILE = Layout.DATA + Layout.SUMMARY;

    private final OpenedFiles files;
    private final LinePass pass;
    private final VerifyOptions options;
    private final Study fresh;

    FreshStage(OpenedFiles files, LinePass pass, VerifyOptions options) {
        this.files = files;
        this.pass = pass;
        this.options = options;
        this.fresh = FreshStudy.of(files.study(), options.refereeSeed(), options.fresh());
    }

    private record Test(String pointer, String observed, BigDecimal p) {}

    StageReport run(LinePass.Listener listener) {
        SummaryBuilder figures = new SummaryBuilder(fresh);
        TrialRunner runner = new TrialRunner(fresh);
        long[] done = {0};
        try {
            new TrialPool(options.threads())
                    .<TrialGroup, RuntimeException>run(TrialRange.of(fresh), runner::run, (TrialGroup group) -> {
                        figures.add(group);
                        done[0]++;
                        listener.read();
                    });
        } catch (InterruptedException e) {
            return StageReport.of(
                    Stage.FRESH,
                    StageOutcome.NOT_FINISHED,
                    "not finished: " + done[0] + " fresh instances of "
                            + fresh.experiments().stream()
                                    .mapToLong(Lines::instances)
                                    .sum());
        }
        return judged(figures);
    }

    private StageReport judged(SummaryBuilder figures) {
        Summary summary = figures.summary();
        List<Test> tests = tests(figures, summary);
        List<BigDecimal> corrected = Holm.adjust(tests.stream().map(Test::p).toList());
        Findings findings = new Findings();
        for (int i = 0; i < tests.size(); i++) {
            if (corrected.get(i).compareTo(LEVEL) < 0) {
                findings.add(new Finding(
                        FILE,
                        OptionalLong.empty(),
                        tests.get(i).pointer(),
                        tests.get(i).observed(),
                        "compatible figures (p = " + Decimals.text(tests.get(i).p()) + ", corrected "
                                + Decimals.text(corrected.get(i)) + ")"));
            }
        }
        String claims = claims(summary, findings);
        return StageReport.of(
                Stage.FRESH,
                findings,
                "compatible: " + options.fresh() + " fresh trials a cell, " + tests.size()
                        + " tests (chi-squared on query counts, Fisher on success rates, Holm), none below 0.001"
                        + claims + "; referee seed \"" + options.refereeSeed().text() + "\"",
                "not compatible with " + options.fresh() + " fresh trials a cell: the seed may have been picked");
    }

    private List<Test> tests(SummaryBuilder figures, Summary summary) {
        List<Test> tests = new ArrayList<>();
        List<CellFigures> authors = pass.figures().summary().cells();
        for (int i = 0; i < authors.size(); i++) {
            CellFigures author = authors.get(i);
            CellFigures own = summary.cells().get(i);
            tests.add(new Test(
                    "/cells/" + i + "/queries",
                    author.cell().id() + ": mean "
                            + Decimals.text(author.queries().mean()) + ", fresh "
                            + Decimals.text(own.queries().mean()),
                    TwoSamples.counts(pass.figures().distribution(author.cell()), figures.distribution(own.cell()))));
            tests.add(new Test(
                    "/cells/" + i + "/success-rate",
                    author.cell().id() + ": " + author.solved() + " of " + author.trials() + " solved, fresh "
                            + own.solved() + " of " + own.trials(),
                    TwoSamples.rates(author.solved(), author.trials(), own.solved(), own.trials())));
        }
        return tests;
    }

    private String claims(Summary summary, Findings findings) {
        List<ClaimResult> authors = Judge.judge(files.study(), pass.figures().summary());
        List<ClaimResult> own = Judge.judge(fresh, summary);
        List<String> words = new ArrayList<>();
        for (int i = 0; i < own.size(); i++) {
            ClaimVerdict author = authors.get(i).verdict();
            ClaimVerdict now = own.get(i).verdict();
            words.add(own.get(i).claim().id() + " " + author.word() + ", fresh " + now.word());
            boolean turned = author != now && author != ClaimVerdict.UNDECIDED && now != ClaimVerdict.UNDECIDED;
            if (turned) {
                findings.add(new Finding(
                        Layout.DATA + Layout.CLAIMS,
                        OptionalLong.empty(),
                        "/claims/" + i + "/verdict",
                        author.word(),
                        now.word() + " on fresh trials"));
            }
        }
        return words.isEmpty() ? "" : "; claims: " + String.join("; ", words);
    }
}
