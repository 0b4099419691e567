package org.notchwork.run;

import java.io.IOException;
import java.nio.channels.ClosedByInterruptException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.LongSupplier;
import java.util.function.Supplier;
import org.notchwork.bundle.BundleWriter;
import org.notchwork.bundle.ControlLine;
import org.notchwork.bundle.Environment;
import org.notchwork.bundle.Results;
import org.notchwork.catalogue.Engines;
import org.notchwork.check.CrossChecker;
import org.notchwork.check.InstanceExaminer;
import org.notchwork.check.InstanceTally;
import org.notchwork.check.LineChecks;
import org.notchwork.claim.Judge;
import org.notchwork.figure.Summary;
import org.notchwork.figure.SummaryBuilder;
import org.notchwork.json.CanonicalJson;
import org.notchwork.problem.Instance;
import org.notchwork.report.Report;
import org.notchwork.study.Experiment;
import org.notchwork.study.Study;
import org.notchwork.trial.ControlRecord;
import org.notchwork.trial.TrialGroup;
import org.notchwork.trial.TrialPool;
import org.notchwork.trial.TrialRange;
import org.notchwork.trial.TrialRunner;

/** Runs a study from its first trial to its sealed bundle. */
public final class StudyRun {

    private final Study study;
    private final int threads;
    private final LongSupplier clock;
    private final TrialRunner runner;
    private final InstanceExaminer examiner = new InstanceExaminer(Engines.reference());

    /**
     * Creates a run.
     *
     * @param study the study
     * @param threads how many worker threads; the results do not depend on it
     */
    public StudyRun(Study study, int threads) {
        this(study, threads, () -> 0);
    }

    /**
     * Creates a run that writes its journal by a clock.
     *
     * @param clock nanoseconds, for how old a piece of the journal is; the results do not depend on it
     */
    public StudyRun(Study study, int threads, LongSupplier clock) {
        this.clock = clock;
        this.study = study;
        this.threads = threads;
        this.runner = new TrialRunner(study);
    }

    /**
     * What a run left.
     *
     * @param results the results
     * @param seal the seal
     */
    public record Sealed(Results results, String seal) {}

    /** Told of every instance that is done. */
    @FunctionalInterface
    public interface Listener {

        /** One instance of an experiment and width is done. */
        void done(Experiment experiment, int width);
    }

    /**
     * Runs the study.
     *
     * @param target where the bundle will be
     * @param replace whether a bundle that is there already may be replaced
     * @param listener told of the progress, on the calling thread
     * @param environment asked once, when the trials are done
     * @throws IOException if the bundle cannot be written; nothing is then under its name
     * @throws InterruptedException if the calling thread is interrupted; likewise
     */
    public Sealed seal(Path target, boolean replace, Listener listener, Supplier<Environment> environment)
            throws IOException, InterruptedException {
        return seal(target, replace, Unfinished.REFUSE, listener, environment);
    }

    /**
     * Runs the study, or goes on with it.
     *
     * @param unfinished what to do with what an earlier run left beside the target
     */
    public Sealed seal(
            Path target, boolean replace, Unfinished unfinished, Listener listener, Supplier<Environment> environment)
            throws IOException, InterruptedException {
        try (BundleWriter writer = BundleWriter.begin(study, target, replace);
                Journal journal = Journal.open(target, study, unfinished, clock)) {
            Results results = run(writer, journal, listener);
            Environment where = environment.get();
            String seal = writer.finish(results, where, digest -> Report.pdf(results, digest, where));
            journal.done();
            return new Sealed(results, seal);
        } catch (ClosedByInterruptException e) {
            // As for any interrupt that is answered, the thread's mark is taken off.
            Thread.interrupted();
            InterruptedException stopped = new InterruptedException("interrupted while a file was written");
            stopped.initCause(e);
            throw stopped;
        }
    }

    private Results run(BundleWriter writer, Journal journal, Listener listener)
            throws IOException, InterruptedException {
        SummaryBuilder figures = new SummaryBuilder(study);
        LineChecks lines = new LineChecks(study);
        Map<String, InstanceTally> examined = new LinkedHashMap<>();
        Journal.Sink take = notch -> {
            TrialGroup group = notch.group();
            for (Line line : notch.lines()) {
                writer.add(group.experiment(), line.bytes(), line.leafHash());
            }
            for (ControlRecord control : group.controls()) {
                writer.addControl(group.experiment(), CanonicalJson.bytes(ControlLine.write(control)));
                figures.addControl(control);
            }
            figures.add(group);
            lines.add(group);
            examined.merge(
                    CrossChecker.subject(group.experiment(), group.width()), notch.examined(), InstanceTally::plus);
            listener.done(study.experiment(group.experiment()).orElseThrow(), group.width());
        };
        long done = journal.replay(take);
        new TrialPool(threads).run(TrialRange.after(TrialRange.of(study), done), this::notch, (Notch notch) -> {
            journal.add(notch);
            take.take(notch);
        });
        Summary summary = figures.summary();
        return new Results(
                study, summary, new CrossChecker(study).all(examined, lines, summary), Judge.judge(study, summary));
    }

    private Notch notch(Experiment experiment, int width, long trial) {
        TrialGroup group = runner.run(experiment, width, trial);
        List<Line> lines = new ArrayList<>();
        for (int i = 0; i < group.records().size(); i++) {
            lines.add(new Line(
                    group.records().get(i),
                    experiment.strategies().get(i),
                    experiment.problem().functions()));
        }
        InstanceTally examined = InstanceTally.NONE;
        if (CrossChecker.isExhaustive(study, width)) {
            Instance instance = runner.instance(experiment, width, trial);
            examined = examiner.examine(experiment, instance, group);
        }
        return new Notch(group, lines, examined);
    }
}
