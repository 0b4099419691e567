package org.notchwork.verify;

import java.util.Optional;
import java.util.OptionalLong;
import org.notchwork.certificate.CertificateCheck;
import org.notchwork.problem.Answer;
import org.notchwork.problem.AnswerText;
import org.notchwork.problem.Instance;
import org.notchwork.study.Experiment;
import org.notchwork.trial.ControlOutcome;
import org.notchwork.trial.ControlRecord;
import org.notchwork.trial.Outcome;
import org.notchwork.trial.TrialRecord;
import org.notchwork.trial.TrialRunner;

/** Draws each instance again and checks what is hidden, every outcome and every certificate against it. */
final class CertificateStage {

    private final TrialRunner runner;
    private final Findings findings = new Findings();
    private Optional<Drawn> last = Optional.empty();
    private Optional<Drawn> lastControl = Optional.empty();
    private long checked;

    private record Drawn(String experiment, long trial, Instance instance) {}

    CertificateStage(TrialRunner runner) {
        this.runner = runner;
    }

    /** Checks a line; passes over a trial that the study does not call for, whose instance could not be drawn. */
    void check(Experiment experiment, TrialRecord record, String path, long line) {
        int width = record.cell().width();
        if (Lines.calls(experiment, width, record.trial())) {
            check(experiment, instance(experiment, width, record.trial()), record, path, line);
        }
    }

    /** Checks a line of controls against the instance and the function, both drawn again. */
    void check(Experiment experiment, ControlRecord record, String path, long line) {
        int width = record.cell().width();
        Instance trial = instance(experiment, width, record.trial());
        if (!record.secret().equals(trial.hidden())) {
            add(path, line, "/secret", text(record.secret()), text(trial.hidden()));
        }
        Instance faced = control(experiment, width, record.trial());
        ControlOutcome right = record.answer().isEmpty()
                ? ControlOutcome.NOTHING
                : TrialRunner.outcome(
                        faced, record.answer().get(), record.certificate().orElseThrow(), trial.hidden());
        if (record.outcome() != right) {
            add(path, line, "/outcome", record.outcome().word(), right.word());
        }
    }

    private Instance control(Experiment experiment, int width, long trial) {
        Optional<Drawn> same = lastControl.filter(d -> d.trial() == trial
                && d.instance().function().width() == width
                && d.experiment().equals(experiment.id()));
        Drawn drawn = same.orElseGet(() -> new Drawn(experiment.id(), trial, runner.control(experiment, width, trial)));
        lastControl = Optional.of(drawn);
        return drawn.instance();
    }

    /** The lines of an instance follow each other, so that it is drawn once. */
    private Instance instance(Experiment experiment, int width, long trial) {
        Optional<Drawn> same = last.filter(d -> d.trial() == trial
                && d.instance().function().width() == width
                && d.experiment().equals(experiment.id()));
        Drawn drawn =
                same.orElseGet(() -> new Drawn(experiment.id(), trial, runner.instance(experiment, width, trial)));
        last = Optional.of(drawn);
        return drawn.instance();
    }

    private void check(Experiment experiment, Instance instance, TrialRecord record, String path, long line) {
        if (!record.hidden().equals(instance.hidden())) {
            add(path, line, pointer(record.hidden()), text(record.hidden()), text(instance.hidden()));
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

    private static String pointer(Answer answer) {
        return answer instanceof Answer.Period ? "/hidden/period" : "/hidden";
    }

    private static String text(Answer answer) {
        return AnswerText.of(answer);
    }

    /** Returns the report, once all lines were checked. */
    StageReport report() {
        return StageReport.of(
                Stage.CERTIFICATES,
                findings,
                checked + " answers proved on instances drawn again from the seed",
                "an answer or its certificate does not hold");
    }
}
