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

    /** Reads all lines; stops early where a line is not the one that the study calls for. */
    void run(Listener listener) throws IOException, BundleFault, OpenedFiles.Malformed, InterruptedException {
        for (Experiment experiment : study.experiments()) {
            String path = Layout.DATA + Layout.trials(experiment.id());
            MessageDigest digest = Digests.sha256();
            try (InputStream in = new DigestInputStream(bag.open(path), digest);
                    LineReader lines = new LineReader(in, path, lineLimit)) {
                if (!read(experiment, lines, path, listener)) {
                    return;
                }
            }
            digests.put(Layout.trials(experiment.id()), Digests.text(digest.digest()));
        }
    }

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
        if (lines.next().isPresent()) {
            misplaced.add(
                    new Finding(path, OptionalLong.of(lines.number()), "", "one more line", "the end of the file"));
            return false;
        }
        return true;
    }

    private boolean group(Experiment experiment, int width, long trial, LineReader lines, String path)
            throws IOException, BundleFault, OpenedFiles.Malformed {
        List<TrialRecord> records = new ArrayList<>();
        long firstLine = lines.number() + 1;
        for (StrategyChoice choice : experiment.strategies()) {
            Optional<byte[]> line = lines.next();
            if (line.isEmpty()) {
                misplaced.add(new Finding(
                        path,
                        OptionalLong.of(lines.number() + 1),
                        "",
                        "the end of the file",
                        "trial " + trial + " of " + choice.label() + " at width " + width));
                return false;
            }
            tree.add(line.get());
            TrialLine.Read read = parsed(line.get(), experiment, path, lines.number());
            if (!Expected.isMet(read, width, trial, choice, path, lines.number(), misplaced)) {
                return false;
            }
            records.add(read.record());
        }
        TrialGroup group = new TrialGroup(experiment.id(), width, trial, records);
        certificates.check(experiment, group, path, firstLine);
        figures.add(group);
        lineChecks.add(group);
        return true;
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

    /** Returns whether every line was there and in its place; if not, nothing else was completed. */
    boolean isComplete() {
        return misplaced.isEmpty();
    }

    /** Returns the lines that are not those that the study calls for. */
    Findings misplaced() {
        return misplaced;
    }

    /** Returns what is wrong with answers and certificates. */
    Findings certificateFindings() {
        return certificates.findings();
    }

    /** Returns how many certificates were checked. */
    long certificatesChecked() {
        return certificates.checked();
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
