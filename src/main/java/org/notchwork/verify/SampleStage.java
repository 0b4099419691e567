package org.notchwork.verify;

import java.io.IOException;
import java.math.BigDecimal;
import java.util.Arrays;
import java.util.List;
import java.util.NavigableSet;
import java.util.Optional;
import java.util.TreeSet;
import org.notchwork.bundle.Bag;
import org.notchwork.bundle.BundleFault;
import org.notchwork.bundle.Layout;
import org.notchwork.bundle.LineReader;
import org.notchwork.bundle.TrialLine;
import org.notchwork.catalogue.Engines;
import org.notchwork.check.CheckOutcome;
import org.notchwork.check.CrossChecker;
import org.notchwork.check.InstanceExaminer;
import org.notchwork.check.InstanceTally;
import org.notchwork.exact.Decimals;
import org.notchwork.json.CanonicalJson;
import org.notchwork.problem.Instance;
import org.notchwork.seed.Address;
import org.notchwork.seed.RandomStream;
import org.notchwork.seed.SeedTree;
import org.notchwork.study.Experiment;
import org.notchwork.study.StrategyChoice;
import org.notchwork.trial.TrialGroup;
import org.notchwork.trial.TrialRecord;
import org.notchwork.trial.TrialRunner;

/** Runs a random sample of trials again, drawn without replacement from the referee's own seed. */
final class SampleStage {

    private static final Address CHOICE = new Address("referee", 1, 0, "sample");

    private final OpenedFiles files;
    private final Bag bag;
    private final VerifyOptions options;
    private final TrialRunner runner;
    private final Findings findings = new Findings();
    private InstanceTally examined = InstanceTally.NONE;
    private long compared;

    SampleStage(OpenedFiles files, Bag bag, VerifyOptions options, TrialRunner runner) {
        this.files = files;
        this.bag = bag;
        this.options = options;
        this.runner = runner;
    }

    /** Runs the sample. An interrupt ends it early, and the report says how far it came. */
    StageReport sample(int wanted, LinePass.Listener listener) throws IOException, BundleFault {
        long all = files.seal().trials();
        NavigableSet<Long> chosen = choose(Math.min(wanted, all), all);
        long offset = 0;
        try {
            for (Experiment experiment : files.study().experiments()) {
                long lines = (long) experiment.widths().size()
                        * experiment.trials()
                        * experiment.strategies().size();
                run(experiment, chosen.subSet(offset, true, offset + lines, false), offset, listener);
                offset += lines;
            }
        } catch (InterruptedException e) {
            return StageReport.of(
                    Stage.RERUN,
                    findings.isEmpty() ? StageOutcome.NOT_FINISHED : StageOutcome.FAILED,
                    "not finished: " + compared + " of " + chosen.size() + " trials re-run, "
                            + (findings.isEmpty() ? "all equal" : findings.count() + " different"));
        }
        return StageReport.of(Stage.RERUN, findings, good(chosen.size(), all), "recomputed: different");
    }

    private String good(long sampled, long all) {
        long forged = Math.max(1, (all + 99) / 100);
        BigDecimal caught = SpotCheck.caught(all, forged, sampled);
        return "recomputed: identical: " + sampled + " of " + all + " trials; had 1 % of the trials been forged, this"
                + " would have caught it with probability " + Decimals.text(caught, 3) + "; "
                + examined.promise().compared() + " instances agree with exhaustive search; referee seed \""
                + options.refereeSeed().text() + "\"";
    }

    private NavigableSet<Long> choose(long count, long all) {
        RandomStream stream = new SeedTree(options.refereeSeed()).stream(CHOICE);
        NavigableSet<Long> chosen = new TreeSet<>();
        while (chosen.size() < count) {
            chosen.add(stream.below(all));
        }
        return chosen;
    }

    private void run(Experiment experiment, NavigableSet<Long> chosen, long offset, LinePass.Listener listener)
            throws IOException, BundleFault, InterruptedException {
        String path = Layout.DATA + Layout.trials(experiment.id());
        int strategies = experiment.strategies().size();
        try (LineReader lines =
                new LineReader(bag.open(path), path, options.limits().lineBytes())) {
            for (long global : chosen) {
                if (Thread.interrupted()) {
                    throw new InterruptedException();
                }
                long index = global - offset;
                Optional<byte[]> line = lines.next();
                while (line.isPresent() && lines.number() <= index) {
                    line = lines.next();
                }
                long instance = index / strategies;
                int width = experiment.widths().get((int) (instance / experiment.trials()));
                StrategyChoice choice = experiment.strategies().get((int) (index % strategies));
                compare(experiment, width, instance % experiment.trials(), choice, line, lines.number(), path);
                listener.read();
            }
        }
    }

    private void compare(
            Experiment experiment,
            int width,
            long trial,
            StrategyChoice choice,
            Optional<byte[]> written,
            long number,
            String path) {
        Instance instance = runner.instance(experiment, width, trial);
        TrialRecord record = runner.run(experiment, choice, instance, trial);
        byte[] again = CanonicalJson.bytes(TrialLine.write(record, choice));
        compared++;
        if (!Arrays.equals(written.orElseGet(() -> new byte[0]), again)) {
            RerunStage.difference(findings, path, number, written.orElseGet(() -> new byte[0]), again);
        }
        if (CrossChecker.isExhaustive(files.study(), width)) {
            TrialGroup group = new TrialGroup(experiment.id(), width, trial, List.of(record));
            InstanceTally tally = new InstanceExaminer(Engines.reference()).examine(experiment, instance, group);
            examined = examined.plus(tally);
            if (tally.answers().outcome() == CheckOutcome.DIFFERS
                    || tally.engines().outcome() == CheckOutcome.DIFFERS) {
                findings.add(Finding.of(
                        path, tally.answers().text() + "; " + tally.engines().text(), "no difference"));
            }
        }
    }
}
