package org.notchwork.run;

import java.io.ByteArrayOutputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Iterator;
import java.util.List;
import java.util.Optional;
import org.notchwork.bundle.ControlLine;
import org.notchwork.bundle.Digests;
import org.notchwork.bundle.TrialLine;
import org.notchwork.check.InstanceTally;
import org.notchwork.json.CanonicalJson;
import org.notchwork.json.Fault;
import org.notchwork.json.JsonFault;
import org.notchwork.json.JsonLimits;
import org.notchwork.json.JsonReader;
import org.notchwork.json.JsonValue;
import org.notchwork.study.Experiment;
import org.notchwork.study.StrategyChoice;
import org.notchwork.study.Study;
import org.notchwork.trial.ControlRecord;
import org.notchwork.trial.TrialGroup;
import org.notchwork.trial.TrialRecord;

/**
 * Finished instances as lines: for each one its trial lines, its lines of controls and what checks of it found. The first
 * line of a piece is the SHA-256 of all others, so that a piece that was cut or damaged is noticed.
 */
final class JournalPiece {

    private static final int DIGITS = 64;

    private final ByteArrayOutputStream body = new ByteArrayOutputStream();
    private long groups;

    /** Adds a finished instance. */
    void add(Notch notch) {
        notch.lines().forEach(line -> put(line.bytes()));
        notch.group().controls().forEach(control -> put(CanonicalJson.bytes(ControlLine.write(control))));
        put(CanonicalJson.bytes(TallyForm.write(notch.examined())));
        groups++;
    }

    private void put(byte[] line) {
        body.writeBytes(line);
        body.write('\n');
    }

    int size() {
        return body.size();
    }

    boolean isEmpty() {
        return groups == 0;
    }

    byte[] bytes() {
        byte[] lines = body.toByteArray();
        ByteArrayOutputStream file = new ByteArrayOutputStream();
        file.writeBytes((Digests.hex(lines) + "\n").getBytes(StandardCharsets.US_ASCII));
        file.writeBytes(lines);
        return file.toByteArray();
    }

    /** One instance that the study calls for. */
    record Place(Experiment experiment, int width, long trial) {}

    /**
     * Reads a piece.
     *
     * @param file its bytes
     * @param places the instances of the study, in order, from the piece's first on
     * @return the instances; empty if the piece is damaged
     */
    static Optional<List<Notch>> read(byte[] file, Study study, Iterator<Place> places) {
        if (file.length <= DIGITS || file[DIGITS] != '\n') {
            return Optional.empty();
        }
        byte[] lines = Arrays.copyOfRange(file, DIGITS + 1, file.length);
        String digest = new String(file, 0, DIGITS, StandardCharsets.US_ASCII);
        if (!digest.equals(Digests.hex(lines))) {
            return Optional.empty();
        }
        return new Reading(lines, study).all(places);
    }

    /** Takes the lines of a piece apart. */
    private static final class Reading {

        private final byte[] lines;
        private final Study study;
        private final JsonReader reader = new JsonReader(JsonLimits.LINE);
        private int at;

        Reading(byte[] lines, Study study) {
            this.lines = lines;
            this.study = study;
        }

        Optional<List<Notch>> all(Iterator<Place> places) {
            List<Notch> notches = new ArrayList<>();
            try {
                while (at < lines.length) {
                    if (!places.hasNext()) {
                        return Optional.empty();
                    }
                    Optional<Notch> notch = notch(places.next());
                    if (notch.isEmpty()) {
                        return Optional.empty();
                    }
                    notches.add(notch.get());
                }
                return Optional.of(notches);
            } catch (JsonFault e) {
                return Optional.empty();
            }
        }

        private Optional<Notch> notch(Place place) throws JsonFault {
            List<Fault> faults = new ArrayList<>();
            List<Line> written = new ArrayList<>();
            List<TrialRecord> records = new ArrayList<>();
            for (StrategyChoice choice : place.experiment().strategies()) {
                byte[] line = next();
                written.add(new Line(line));
                TrialLine.read(reader.readCanonical(line), place.experiment().id(), faults)
                        .filter(read -> read.record().cell().label().equals(choice.label()))
                        .filter(read -> read.record().cell().width() == place.width()
                                && read.record().trial() == place.trial())
                        .ifPresent(read -> records.add(read.record()));
            }
            List<ControlRecord> controls = new ArrayList<>();
            int wanted = study.controls(place.experiment(), place.width()).size();
            for (int i = 0; i < wanted; i++) {
                ControlLine.read(
                                reader.readCanonical(next()), place.experiment().id(), faults)
                        .ifPresent(controls::add);
            }
            JsonValue tally = reader.readCanonical(next());
            Optional<InstanceTally> examined = TallyForm.read(tally);
            if (records.size() != written.size() || controls.size() != wanted || examined.isEmpty()) {
                return Optional.empty();
            }
            TrialGroup group = new TrialGroup(place.experiment().id(), place.width(), place.trial(), records, controls);
            return Optional.of(new Notch(group, written, examined.get()));
        }

        private byte[] next() {
            int end = at;
            while (end < lines.length && lines[end] != '\n') {
                end++;
            }
            byte[] line = Arrays.copyOfRange(lines, at, end);
            at = Math.min(lines.length, end + 1);
            return line;
        }
    }
}
