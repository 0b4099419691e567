package org.notchwork.verify;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.notchwork.bundle.Bag;
import org.notchwork.bundle.BundleFault;
import org.notchwork.bundle.ClaimsFile;
import org.notchwork.bundle.Digests;
import org.notchwork.bundle.Layout;
import org.notchwork.bundle.Limits;
import org.notchwork.bundle.LineReader;
import org.notchwork.bundle.MerklePath;
import org.notchwork.bundle.MerkleTree;
import org.notchwork.bundle.Results;
import org.notchwork.bundle.SummaryReader;
import org.notchwork.bundle.TrialLine;
import org.notchwork.bundle.TrialProof;
import org.notchwork.claim.ClaimResult;
import org.notchwork.figure.Summary;
import org.notchwork.json.Fault;
import org.notchwork.json.JsonFault;
import org.notchwork.json.JsonLimits;
import org.notchwork.json.JsonObject;
import org.notchwork.json.JsonReader;
import org.notchwork.json.JsonValue;
import org.notchwork.study.Cell;
import org.notchwork.study.Experiment;
import org.notchwork.study.Study;
import org.notchwork.trial.TrialRecord;

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

    /** Returns the results as they are written. */
    public Results results() throws Unreadable {
        List<Fault> faults = new ArrayList<>();
        Summary summary = SummaryReader.read(summary(), files.study(), faults);
        List<ClaimResult> claims = ClaimsFile.read(claims(), files.study(), faults);
        if (!faults.isEmpty()) {
            throw new Unreadable(faults.get(0).line());
        }
        return new Results(files.study(), summary, files.checks(), claims);
    }

    /**
     * Returns the proof that one trial stands under the seal: its line and audit path.
     *
     * @throws Unreadable if the lines do not come to the tree head that the seal lists
     */
    public TrialProof proof(Experiment experiment, Cell cell, long trial) throws IOException, BundleFault, Unreadable {
        long wanted = 0;
        for (Experiment before : files.study().experiments()) {
            if (before.id().equals(experiment.id())) {
                break;
            }
            wanted += Lines.of(before);
        }
        wanted += Lines.first(experiment, cell.width(), trial)
                + experiment.strategies().stream().map(s -> s.label()).toList().indexOf(cell.label());
        MerklePath path = new MerklePath(wanted);
        byte[] line = new byte[0];
        for (Experiment each : files.study().experiments()) {
            String name = Layout.DATA + Layout.trials(each.id());
            try (LineReader lines = new LineReader(bag.open(name), name, limits.lineBytes())) {
                Optional<byte[]> next = lines.next();
                while (next.isPresent()) {
                    if (path.size() == wanted) {
                        line = next.get();
                    }
                    path.add(MerkleTree.leaf(next.get()));
                    next = lines.next();
                }
            }
        }
        try {
            JsonObject value = (JsonObject) new JsonReader(JsonLimits.LINE).readCanonical(line);
            TrialProof proof = new TrialProof(
                    value, wanted, path.path().stream().map(Digests::text).toList(), files.seal());
            if (!proof.holds()) {
                throw new Unreadable("the trial lines do not come to the tree head that the seal lists");
            }
            return proof;
        } catch (JsonFault e) {
            throw new Unreadable("line " + (wanted + 1) + ", " + e.place() + ": " + e.getMessage());
        }
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
