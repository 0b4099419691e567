package org.notchwork.verify;

import java.io.IOException;
import java.io.InputStream;
import java.security.DigestInputStream;
import java.security.MessageDigest;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.TreeMap;
import org.notchwork.bundle.Bag;
import org.notchwork.bundle.BundleFault;
import org.notchwork.bundle.Digests;
import org.notchwork.bundle.Layout;
import org.notchwork.bundle.LineReader;
import org.notchwork.bundle.MerkleTree;
import org.notchwork.bundle.TrialLine;
import org.notchwork.check.LineChecks;
import org.notchwork.figure.SummaryBuilder;
import org.notchwork.json.Fault;
import org.notchwork.json.JsonFault;
import org.notchwork.json.JsonLimits;
import org.notchwork.json.JsonReader;
import org.notchwork.json.JsonValue;
import org.notchwork.study.Experiment;
import org.notchwork.study.StrategyChoice;
import org.notchwork.study.Study;
import org.notchwork.trial.TrialGroup;
import org.notchwork.trial.TrialRecord;
import org.notchwork.trial.TrialRunner;

/**
 * One pass over all trial lines that feeds every stage that reads them: form, tree, certificates, figures. Memory does
 * not grow with the number of lines. The bytes are hashed as they pass, so that what was checked is what was hashed.
 *
 * <p>Where a line is not the one that the study calls for, the figures end; form, tree and certificates go on to the
 * last line.
 */
final class LinePass {

    private final Study study;
    private final Bag bag;
    private final int lineLimit;
    private final JsonReader reader = new JsonReader(JsonLimits.LINE);
    private final CertificateStage certificates;
    private final MerkleTree tree = new MerkleTree();
    private final Map<String, String> digests = new TreeMap<>();
    private final SummaryBuilder figures;
    private final LineChecks lineChecks;
    private final Findings misplaced = new Findings();
    private Optional<Misplacement> misplacement = Optional.empty();

    LinePass(Study study, Bag bag, int lineLimit, TrialRunner runner) {
        this.study = study;
        this.bag = bag;
        this.lineLimit = lineLimit;
        this.certificates = new CertificateStage(runner);
        this.figures = new SummaryBuilder(study);
        this.lineChecks = new LineChecks(study);
    }

    /** Told of every instance that was read. */
    @FunctionalInterface
    interface Listener {

        /** One more instance was read. */
        void read();
    }

    /** Reads all lines of all files. */
    void run(Listener listener) throws IOException, BundleFault, OpenedFiles.Malformed, InterruptedException {
        for (Experiment experiment : study.experiments()) {
            String path = Layout.DATA + Layout.trials(experiment.id());
            MessageDigest digest = Digests.sha256();
            try (InputStream in = new DigestInputStream(bag.open(path), digest);
                    LineReader lines = new LineReader(in, path, lineLimit)) {
                boolean inPlace = misplacement.isEmpty() && read(experiment, lines, path, listener);
                rest(experiment, lines, path, inPlace);
            }
            digests.put(Layout.trials(experiment.id()), Digests.text(digest.digest()));
        }
        Optional<Misplacement> inControls =
                new ControlPass(study, bag, lineLimit, certificates, figures, misplaced).run(digests);
        misplacement = misplacement.or(() -> inControls);
    }

    /** Reads the lines that the study calls for; returns false after the first that is another or is missing. */
    private boolean read(Experiment experiment, LineReader lines, String path, Listener listener)
            throws IOException, BundleFault, OpenedFiles.Malformed, InterruptedException {
        for (int width : experiment.widths()) {
            for (long trial = 0; trial < experiment.trials(); trial++) {
                if (Thread.interrupted()) {
                    throw new InterruptedException();
                }
                if (!group(experiment, width, trial, lines, path)) {
                    return false;
                }
                listener.read();
            }
        }
        return true;
    }

    private boolean group(Experiment experiment, int width, long trial, LineReader lines, String path)
            throws IOException, BundleFault, OpenedFiles.Malformed {
        List<TrialRecord> records = new ArrayList<>();
        for (StrategyChoice choice : experiment.strategies()) {
            Misplacement.Place place = new Misplacement.Place(experiment, width, trial, choice.label());
            Optional<byte[]> line = lines.next();
            if (line.isEmpty()) {
                misplaced.add(new Finding(
                        path, OptionalLong.of(lines.number() + 1), "", "the end of the file", place.text()));
                misplacement = Optional.of(new Misplacement(path, lines.number() + 1, Optional.of(place)));
                return false;
            }
            TrialLine.Read read = take(line.get(), experiment, path, lines.number());
            if (!Expected.isMet(read, width, trial, choice, path, lines.number(), misplaced)) {
                misplacement =
                        Optional.of(new Misplacement(path, lines.number(), Optional.of(place)).by(read.record()));
                return false;
            }
            records.add(read.record());
        }
        TrialGroup group = new TrialGroup(experiment.id(), width, trial, records);
        figures.add(group);
        lineChecks.add(group);
        return true;
    }

    /** Reads the lines that are left in a file. */
    private void rest(Experiment experiment, LineReader lines, String path, boolean inPlace)
            throws IOException, BundleFault, OpenedFiles.Malformed, InterruptedException {
        Optional<byte[]> line = lines.next();
        if (inPlace && line.isPresent()) {
            misplaced.add(
                    new Finding(path, OptionalLong.of(lines.number()), "", "one more line", "the end of the file"));
            misplacement = Optional.of(new Misplacement(path, lines.number(), Optional.empty()));
        }
        while (line.isPresent()) {
            if (Thread.interrupted()) {
                throw new InterruptedException();
            }
            take(line.get(), experiment, path, lines.number());
            line = lines.next();
        }
        long count = lines.number();
        misplacement = misplacement.map(m -> m.path().equals(path) ? m.in(count, Lines.of(experiment)) : m);
    }

    /** Takes a line, wherever it stands: its form, its leaf of the tree, its certificate. */
    private TrialLine.Read take(byte[] line, Experiment experiment, String path, long number)
            throws OpenedFiles.Malformed {
        TrialLine.Read read = parsed(line, experiment, path, number);
        tree.add(line);
        certificates.check(experiment, read.record(), path, number);
        return read;
    }

    private TrialLine.Read parsed(byte[] line, Experiment experiment, String path, long number)
            throws OpenedFiles.Malformed {
        List<Fault> faults = new ArrayList<>();
        try {
            JsonValue value = reader.readCanonical(line);
            return TrialLine.read(value, experiment.id(), faults)
                    .orElseThrow(() -> new OpenedFiles.Malformed(
                            path + ", line " + number + ", " + faults.get(0).line()));
        } catch (JsonFault e) {
            throw new OpenedFiles.Malformed(path + ", line " + number + ", " + e.place() + ": " + e.getMessage());
        }
    }

    /** Returns the first line that is not the one that the study calls for; if there is none, the figures are whole. */
    Optional<Misplacement> misplacement() {
        return misplacement;
    }

    /** Returns the fields in which the first misplaced line is not the one that the study calls for. */
    Findings misplaced() {
        return misplaced;
    }

    /** Returns what became of the answers and certificates. */
    CertificateStage certificates() {
        return certificates;
    }

    MerkleTree tree() {
        return tree;
    }

    /** Returns the digest of each file of lines as it passed, by name. */
    Map<String, String> digests() {
        return digests;
    }

    SummaryBuilder figures() {
        return figures;
    }

    LineChecks lineChecks() {
        return lineChecks;
    }
}
