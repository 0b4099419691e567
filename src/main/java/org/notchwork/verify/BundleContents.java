package org.notchwork.verify;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.notchwork.bundle.Bag;
import org.notchwork.bundle.BundleFault;
import org.notchwork.bundle.Layout;
import org.notchwork.bundle.Limits;
import org.notchwork.bundle.LineReader;
import org.notchwork.bundle.Results;
import org.notchwork.bundle.TrialLine;
import org.notchwork.claim.Judge;
import org.notchwork.figure.Summary;
import org.notchwork.json.Fault;
import org.notchwork.json.JsonFault;
import org.notchwork.json.JsonLimits;
import org.notchwork.json.JsonReader;
import org.notchwork.json.JsonValue;
import org.notchwork.seed.SeedTree;
import org.notchwork.study.Cell;
import org.notchwork.study.Experiment;
import org.notchwork.study.Study;
import org.notchwork.trial.TrialRecord;
import org.notchwork.trial.TrialRunner;

/** What a bundle says, for people to look at; read with the same care as for verification, but not verified. */
public final class BundleContents {

    private final Bag bag;
    private final OpenedFiles files;
    private final Limits limits;

    private BundleContents(Bag bag, OpenedFiles files, Limits limits) {
        this.bag = bag;
        this.files = files;
        this.limits = limits;
    }

    /** Says why a bundle cannot be shown: place, what, in one line. */
    public static final class Unreadable extends Exception {

        private static final long serialVersionUID = 1L;

        Unreadable(String line) {
            super(line);
        }
    }

    /** Opens a bundle. */
    public static BundleContents open(Path bundle, Limits limits) throws IOException, BundleFault, Unreadable {
        Bag bag = Bag.open(bundle, limits);
        try {
            return new BundleContents(bag, OpenedFiles.open(bag), limits);
        } catch (OpenedFiles.Malformed e) {
            throw new Unreadable(e.getMessage());
        }
    }

    /** Returns the study. */
    public Study study() {
        return files.study();
    }

    /** Returns the seal that the files come to. */
    public String seal() {
        return files.seal().digest();
    }

    /** Returns the file of figures. */
    public JsonValue summary() {
        return files.values().get(Layout.SUMMARY);
    }

    /** Returns the file of claims. */
    public JsonValue claims() {
        return files.values().get(Layout.CLAIMS);
    }

    /** Returns the results: figures and verdicts computed from the lines, cross-checks as written. */
    public Results results() throws IOException, BundleFault, Unreadable, InterruptedException {
        LinePass pass =
                new LinePass(files.study(), bag, limits.lineBytes(), new TrialRunner(new SeedTree(study().seed())));
        try {
            pass.run(() -> {});
        } catch (OpenedFiles.Malformed e) {
            throw new Unreadable(e.getMessage());
        }
        if (!pass.isComplete()) {
            throw new Unreadable(pass.misplaced().first().get(0).text());
        }
        Summary summary = pass.figures().summary();
        return new Results(files.study(), summary, files.checks(), Judge.judge(files.study(), summary));
    }

    /** Returns the record of one trial, as written. */
    public TrialRecord trial(Experiment experiment, Cell cell, long trial) throws IOException, BundleFault, Unreadable {
        String path = Layout.DATA + Layout.trials(experiment.id());
        long before = (experiment.widths().indexOf(cell.width()) * (long) experiment.trials() + trial)
                * experiment.strategies().size();
        int strategy =
                experiment.strategies().stream().map(s -> s.label()).toList().indexOf(cell.label());
        try (LineReader lines = new LineReader(bag.open(path), path, limits.lineBytes())) {
            Optional<byte[]> line = lines.next();
            while (line.isPresent() && lines.number() <= before + strategy) {
                line = lines.next();
            }
            List<Fault> faults = new ArrayList<>();
            JsonValue value = new JsonReader(JsonLimits.LINE)
                    .readCanonical(line.orElseThrow(() -> new Unreadable(path + ": the line is missing")));
            TrialRecord record = TrialLine.read(value, experiment.id(), faults)
                    .orElseThrow(() -> new Unreadable(path + ", line " + lines.number() + ", "
                            + faults.get(0).line()))
                    .record();
            if (!record.cell().equals(cell) || record.trial() != trial) {
                throw new Unreadable(path + ", line " + lines.number() + ": not the trial that should stand here");
            }
            return record;
        } catch (JsonFault e) {
            throw new Unreadable(path + ", " + e.place() + ": " + e.getMessage());
        }
    }
}
