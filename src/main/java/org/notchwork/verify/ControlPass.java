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
import org.notchwork.bundle.Bag;
import org.notchwork.bundle.BundleFault;
import org.notchwork.bundle.ControlLine;
import org.notchwork.bundle.Digests;
import org.notchwork.bundle.Layout;
import org.notchwork.bundle.LineReader;
import org.notchwork.figure.SummaryBuilder;
import org.notchwork.json.Fault;
import org.notchwork.json.JsonFault;
import org.notchwork.json.JsonLimits;
import org.notchwork.json.JsonReader;
import org.notchwork.study.Experiment;
import org.notchwork.study.StrategyChoice;
import org.notchwork.study.Study;
import org.notchwork.trial.ControlRecord;

/** One pass over all lines of controls: form, place, outcome, figures. Hashed as they pass, as the trial lines are. */
final class ControlPass {

    private final Study study;
    private final Bag bag;
    private final int lineLimit;
    private final CertificateStage certificates;
    private final SummaryBuilder figures;
    private final Findings misplaced;
    private final JsonReader reader = new JsonReader(JsonLimits.LINE);

    ControlPass(
            Study study,
            Bag bag,
            int lineLimit,
            CertificateStage certificates,
            SummaryBuilder figures,
            Findings misplaced) {
        this.study = study;
        this.bag = bag;
        this.lineLimit = lineLimit;
        this.certificates = certificates;
        this.figures = figures;
        this.misplaced = misplaced;
    }

    /** Reads all lines and adds the digest of each file; returns the first line that is another than the study calls for. */
    Optional<Misplacement> run(Map<String, String> digests)
            throws IOException, BundleFault, OpenedFiles.Malformed, InterruptedException {
        Optional<Misplacement> first = Optional.empty();
        for (Experiment experiment : study.experiments()) {
            if (study.hasControls(experiment)) {
                String name = Layout.controls(experiment.id());
                MessageDigest digest = Digests.sha256();
                try (InputStream in = new DigestInputStream(bag.open(Layout.DATA + name), digest);
                        LineReader lines = new LineReader(in, Layout.DATA + name, lineLimit)) {
                    Optional<Misplacement> here = read(experiment, lines, Layout.DATA + name);
                    first = first.or(() -> here);
                }
                digests.put(name, Digests.text(digest.digest()));
            }
        }
        return first;
    }

    private Optional<Misplacement> read(Experiment experiment, LineReader lines, String path)
            throws IOException, BundleFault, OpenedFiles.Malformed, InterruptedException {
        long called = Lines.ofControls(study, experiment);
        for (int width : experiment.widths()) {
            for (long trial = 0; trial < experiment.trials(); trial++) {
                if (Thread.interrupted()) {
                    throw new InterruptedException();
                }
                for (StrategyChoice choice : study.controls(experiment, width)) {
                    Optional<byte[]> line = lines.next();
                    Misplacement.Place place = new Misplacement.Place(experiment, width, trial, choice.label());
                    if (line.isEmpty()) {
                        misplaced.add(new Finding(
                                path,
                                OptionalLong.of(lines.number() + 1),
                                "",
                                "the end of the file",
                                "control of " + place.text()));
                        return Optional.of(new Misplacement(path, lines.number() + 1, Optional.of(place))
                                .in(lines.number(), called));
                    }
                    ControlRecord record = parsed(line.get(), experiment, path, lines.number());
                    if (!isAt(record, place)) {
                        String found = "control of trial " + record.trial() + " of "
                                + record.cell().label() + " at width "
                                + record.cell().width();
                        long here = lines.number();
                        misplaced.add(
                                new Finding(path, OptionalLong.of(here), "", found, "control of " + place.text()));
                        drain(lines);
                        return Optional.of(new Misplacement(
                                path,
                                here,
                                Optional.of(place),
                                Lines.line(study, experiment, record),
                                false,
                                lines.number(),
                                called));
                    }
                    certificates.check(experiment, record, path, lines.number());
                    figures.addControl(record);
                }
            }
        }
        if (lines.next().isEmpty()) {
            return Optional.empty();
        }
        long extra = lines.number();
        misplaced.add(new Finding(path, OptionalLong.of(extra), "", "one more line", "the end of the file"));
        drain(lines);
        return Optional.of(new Misplacement(path, extra, Optional.empty()).in(lines.number(), called));
    }

    /** Reads on to the end, so that the digest is that of the whole file. */
    private static void drain(LineReader lines) throws IOException, BundleFault {
        Optional<byte[]> line = lines.next();
        while (line.isPresent()) {
            line = lines.next();
        }
    }

    private static boolean isAt(ControlRecord record, Misplacement.Place place) {
        return record.cell().width() == place.width()
                && record.trial() == place.trial()
                && record.cell().label().equals(place.label());
    }

    private ControlRecord parsed(byte[] line, Experiment experiment, String path, long number)
            throws OpenedFiles.Malformed {
        List<Fault> faults = new ArrayList<>();
        try {
            return ControlLine.read(reader.readCanonical(line), experiment.id(), faults)
                    .orElseThrow(() -> new OpenedFiles.Malformed(
                            path + ", line " + number + ", " + faults.get(0).line()));
        } catch (JsonFault e) {
            throw new OpenedFiles.Malformed(path + ", line " + number + ", " + e.place() + ": " + e.getMessage());
        }
    }
}
