package org.notchwork.verify;

import java.util.OptionalLong;
import org.notchwork.check.CertificateCheck;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Instance;
import org.notchwork.study.Experiment;
import org.notchwork.trial.Outcome;
import org.notchwork.trial.TrialGroup;
import org.notchwork.trial.TrialRecord;
import org.notchwork.trial.TrialRunner;

/** Draws each instance again and checks what is hidden, every outcome and every certificate against it. */
final class CertificateStage {

    private final TrialRunner runner;
    private final Findings findings = new Findings();
    private long checked;

    CertificateStage(TrialRunner runner) {
        this.runner = runner;
    }

    /** Checks one instance's lines, which begin at a line of a file. */
    void check(Experiment experiment, TrialGroup group, String path, long firstLine) {
        Instance instance = runner.instance(experiment, group.width(), group.trial());
        for (int i = 0; i < group.records().size(); i++) {
            check(experiment, instance, group.records().get(i), path, firstLine + i);
        }
    }

    private void check(Experiment experiment, Instance instance, TrialRecord record, String path, long line) {
        if (!record.hidden().equals(instance.hidden())) {
            add(path, line, "/hidden/period", text(record.hidden()), text(instance.hidden()));
        }
        if (record.counts().total() > experiment.queryLimit()) {
            add(
                    path,
                    line,
                    "/calls",
                    record.counts().total() + " calls",
                    "at most the query limit " + experiment.queryLimit());
        }
        record.answer().ifPresent(answer -> {
            Outcome right = answer.equals(instance.hidden()) ? Outcome.SOLVED : Outcome.WRONG;
            if (record.outcome() != right) {
                add(path, line, "/outcome", record.outcome().word(), right.word());
            }
            // A wrong answer's certificate cannot hold; its record says so by its outcome.
            if (right == Outcome.SOLVED) {
                record.certificate()
                        .flatMap(c -> CertificateCheck.check(instance.function(), answer, c))
                        .ifPresent(w -> add(path, line, "/certificate" + w.member(), w.written(), w.right()));
            }
            checked++;
        });
    }

    private void add(String path, long line, String pointer, String written, String right) {
        findings.add(new Finding(path, OptionalLong.of(line), pointer, written, right));
    }

    private static String text(Answer answer) {
        return ((Answer.Period) answer).s().hex();
    }

    Findings findings() {
        return findings;
    }

    long checked() {
        return checked;
    }
}
