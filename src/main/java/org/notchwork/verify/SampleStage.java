package org.notchwork.verify;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.NavigableSet;
import java.util.TreeSet;
import org.notchwork.bundle.Bag;
import org.notchwork.bundle.ControlLine;
import org.notchwork.bundle.Layout;
import org.notchwork.bundle.TrialLine;
import org.notchwork.catalogue.Engines;
import org.notchwork.check.CheckOutcome;
import org.notchwork.check.Comparison;
import org.notchwork.check.CrossChecker;
import org.notchwork.check.InstanceExaminer;
import org.notchwork.check.InstanceTally;
import org.notchwork.problem.Instance;
import org.notchwork.seed.Address;
import org.notchwork.seed.RandomStream;
import org.notchwork.seed.SeedTree;
import org.notchwork.study.Cell;
import org.notchwork.study.Experiment;
import org.notchwork.study.StrategyChoice;
import org.notchwork.trial.ControlRecord;
import org.notchwork.trial.TrialGroup;
import org.notchwork.trial.TrialPool;
import org.notchwork.trial.TrialRange;
import org.notchwork.trial.TrialRecord;
import org.notchwork.trial.TrialRunner;

/**
 * Runs a random sample of trials again, drawn without replacement from the referee's own seed, and searches the
 * instances of the sample exhaustively where the study's cross-checks do.
 */
final class SampleStage {

    private static final Address CHOICE = new Address("referee", 1, 0, "sample");

    private final OpenedFiles files;
    private final Bag bag;
    private final VerifyOptions options;
    private final TrialRunner runner;
    private final InstanceExaminer examiner = new InstanceExaminer(Engines.reference());
    private final Findings findings = new Findings();
    private long searched;
    private long compared;

    SampleStage(OpenedFiles files, Bag bag, VerifyOptions options, TrialRunner runner) {
        this.files = files;
        this.bag = bag;
        this.options = options;
        this.runner = runner;
    }

    private record Again(TrialGroup group, InstanceTally examined) {}

    /** Runs the sample. An interrupt ends it early, and the report says how far it came. */
    StageReport sample(int wanted, LinePass.Listener listener) throws IOException {
        long all = Lines.of(files.study());
        long eligible = eligible();
        NavigableSet<Long> chosen = wanted >= eligible ? everyEligible() : choose(wanted, all);
        long offset = 0;
        try {
            for (Experiment experiment : files.study().experiments()) {
                long lines = Lines.of(experiment);
                NavigableSet<Long> here = new TreeSet<>();
                for (long global : chosen.subSet(offset, true, offset + lines, false)) {
                    here.add(global - offset);
                }
                run(experiment, here, listener);
                offset += lines;
            }
        } catch (InterruptedException e) {
            return RerunStage.stopped(compared, chosen.size(), findings);
        } catch (WrittenLines.Stopped e) {
            throw new IOException(e.getMessage(), e);
        }
        return StageReport.of(Stage.RERUN, findings, good(chosen.size(), eligible), "recomputed: different");
    }

    private String good(long sampled, long all) {
        return "recomputed: identical: " + sampled + " of " + all + " trials; " + SpotCheck.sentence(all, sampled)
                + (searched > 0 ? "; " + searched + " instances agree with exhaustive search" : "")
                + "; referee seed \"" + options.refereeSeed().text() + "\"";
    }

    /** Returns how many trials there are in the cells that the referee allows. */
    private long eligible() {
        long eligible = 0;
        for (Experiment experiment : files.study().experiments()) {
            long cells = experiment.cells().stream().filter(this::isAllowed).count();
            eligible += cells * experiment.trials();
        }
        return eligible;
    }

    private boolean isAllowed(Cell cell) {
        return options.cells().isEmpty() || options.cells().contains(cell.id());
    }

    private NavigableSet<Long> choose(long count, long all) {
        RandomStream stream = new SeedTree(options.refereeSeed()).stream(CHOICE);
        NavigableSet<Long> chosen = new TreeSet<>();
        while (chosen.size() < count) {
            long index = stream.below(all);
            if (options.cells().isEmpty() || isAllowed(cell(index))) {
                chosen.add(index);
            }
        }
        return chosen;
    }

    private NavigableSet<Long> everyEligible() {
        NavigableSet<Long> chosen = new TreeSet<>();
        for (long index = 0; index < Lines.of(files.study()); index++) {
            if (options.cells().isEmpty() || isAllowed(cell(index))) {
                chosen.add(index);
            }
        }
        return chosen;
    }

    /** Returns the cell of a line, by its place among all lines. */
    private Cell cell(long index) {
        long offset = 0;
        for (Experiment experiment : files.study().experiments()) {
            long lines = Lines.of(experiment);
            if (index < offset + lines) {
                long within = index - offset;
                int strategies = experiment.strategies().size();
                int width = experiment.widths().get((int) (within / strategies / experiment.trials()));
                String label =
                        experiment.strategies().get((int) (within % strategies)).label();
                return new Cell(experiment.id(), width, label);
            }
            offset += lines;
        }
        throw new IllegalArgumentException("no line " + index);
    }

    private void run(Experiment experiment, NavigableSet<Long> chosen, LinePass.Listener listener)
            throws IOException, InterruptedException, WrittenLines.Stopped {
        String path = Layout.DATA + Layout.trials(experiment.id());
        String controls = files.study().hasControls(experiment) ? Layout.DATA + Layout.controls(experiment.id()) : path;
        try (WrittenLines written = new WrittenLines(bag, path, options.limits().lineBytes(), findings);
                WrittenLines writtenControls =
                        new WrittenLines(bag, controls, options.limits().lineBytes(), findings)) {
            new TrialPool(options.threads())
                    .<Again, WrittenLines.Stopped>run(
                            ranges(experiment, chosen),
                            (e, width, trial) -> again(e, width, trial, chosen),
                            (Again again) -> take(experiment, again, written, writtenControls, listener));
        }
    }

    /** Returns one range for each instance that has a chosen line. */
    private static List<TrialRange> ranges(Experiment experiment, NavigableSet<Long> chosen) {
        List<TrialRange> ranges = new ArrayList<>();
        long last = -1;
        for (long index : chosen) {
            long instance = index / experiment.strategies().size();
            if (instance != last) {
                int width = experiment.widths().get((int) (instance / experiment.trials()));
                long trial = instance % experiment.trials();
                ranges.add(new TrialRange(experiment, width, trial, trial + 1));
                last = instance;
            }
        }
        return ranges;
    }

    private Again again(Experiment experiment, int width, long trial, NavigableSet<Long> chosen) {
        Instance instance = runner.instance(experiment, width, trial);
        long first = Lines.first(experiment, width, trial);
        List<TrialRecord> records = new ArrayList<>();
        for (int i = 0; i < experiment.strategies().size(); i++) {
            if (chosen.contains(first + i)) {
                records.add(runner.run(experiment, experiment.strategies().get(i), instance, trial));
            }
        }
        TrialGroup group = new TrialGroup(
                experiment.id(), width, trial, records, runner.controls(experiment, width, trial, instance.hidden()));
        return new Again(
                group,
                CrossChecker.isExhaustive(files.study(), width)
                        ? examiner.examine(experiment, instance, group)
                        : InstanceTally.NONE);
    }

    private void take(
            Experiment experiment,
            Again again,
            WrittenLines written,
            WrittenLines writtenControls,
            LinePass.Listener listener)
            throws WrittenLines.Stopped {
        TrialGroup group = again.group();
        long first = Lines.first(experiment, group.width(), group.trial());
        for (TrialRecord record : group.records()) {
            StrategyChoice choice = experiment.choice(record.cell().label()).orElseThrow();
            written.compare(
                    first + experiment.strategies().indexOf(choice),
                    TrialLine.write(record, choice, experiment.problem().functions()));
            compared++;
            listener.read();
        }
        long control = Lines.firstControl(files.study(), experiment, group.width(), group.trial());
        for (ControlRecord record : group.controls()) {
            writtenControls.compare(control++, ControlLine.write(record));
        }
        InstanceTally examined = again.examined();
        for (Comparison part : List.of(examined.promise(), examined.answers(), examined.engines())) {
            if (part.outcome() == CheckOutcome.DIFFERS) {
                written.note("exhaustive search: " + part.text(), "agreement");
            }
        }
        searched += examined.promise().compared();
    }
}
