package org.notchwork.run;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.channels.FileChannel;
import java.nio.charset.StandardCharsets;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.Iterator;
import java.util.List;
import java.util.Optional;
import java.util.function.LongSupplier;
import java.util.stream.LongStream;
import java.util.stream.Stream;
import org.notchwork.bundle.Digests;
import org.notchwork.json.CanonicalJson;
import org.notchwork.study.Experiment;
import org.notchwork.study.Study;
import org.notchwork.study.StudyJson;

/**
 * What a run has finished, on disk: a hidden folder beside the bundle's place, with pieces that are written, forced and
 * renamed one after the other. A run that died goes on from there and ends in the same bytes. Not for use by several
 * threads; the bundle's lock keeps other runs away.
 *
 * <p>A piece is written when it holds a MiB or is five seconds old, so that little is lost and little is written twice.
 */
final class Journal implements AutoCloseable {

    private static final int PIECE_BYTES = 1 << 20;
    private static final long PIECE_NANOS = 5_000_000_000L;
    private static final int LARGEST_PIECE = 1 << 28;
    private static final String STUDY = "study";

    private final Path folder;
    private final Study study;
    private JournalPiece open = new JournalPiece();
    private final LongSupplier clock;
    private long openSince;
    private int pieces;
    private boolean isDone;

    private Journal(Path folder, Study study, LongSupplier clock) {
        this.folder = folder;
        this.study = study;
        this.clock = clock;
        this.openSince = clock.getAsLong();
    }

    /**
     * Opens the journal of a bundle.
     *
     * @param target where the bundle will be
     * @param clock nanoseconds, for how old a piece is; nothing under the seal depends on it
     * @param left what to do with what an earlier run left
     * @throws IOException if there is one that must not be touched, or the disk fails
     */
    static Journal open(Path target, Study study, Unfinished left, LongSupplier clock) throws IOException {
        Path place = target.toAbsolutePath().normalize();
        Journal journal = new Journal(place.resolveSibling("." + place.getFileName() + ".journal"), study, clock);
        boolean exists = Files.isDirectory(journal.folder, LinkOption.NOFOLLOW_LINKS);
        if (exists && left == Unfinished.REFUSE) {
            throw new IOException(target
                    + ": an unfinished run is kept beside it; say --resume to go on, or --restart to begin again");
        }
        if (exists && left == Unfinished.DISCARD) {
            journal.delete();
            exists = false;
        }
        if (exists && !journal.isOfThisStudy()) {
            throw new IOException(
                    target + ": the unfinished run beside it is of another study or program; say --restart"
                            + " to begin again");
        }
        return journal;
    }

    /** The program is part of it: another version may draw or write otherwise. */
    private byte[] identity() {
        String program = Optional.ofNullable(Journal.class.getPackage().getImplementationVersion())
                .orElse("unpacked");
        return (Digests.hex(CanonicalJson.bytes(StudyJson.write(study))) + " " + program + "\n")
                .getBytes(StandardCharsets.UTF_8);
    }

    private boolean isOfThisStudy() throws IOException {
        Path file = folder.resolve(STUDY);
        return Files.isRegularFile(file, LinkOption.NOFOLLOW_LINKS)
                && Arrays.equals(Files.readAllBytes(file), identity());
    }

    /** Takes what was finished. */
    @FunctionalInterface
    interface Sink {

        /** Takes one finished instance. */
        void take(Notch notch) throws IOException;
    }

    /**
     * Hands over what earlier runs finished, in order, up to the first piece that is missing or damaged; what comes after
     * that is removed and done again.
     *
     * @return how many instances were handed over
     */
    long replay(Sink sink) throws IOException {
        Iterator<JournalPiece.Place> places = places();
        long taken = 0;
        while (true) {
            Path file = piece(pieces);
            if (!Files.isRegularFile(file, LinkOption.NOFOLLOW_LINKS) || Files.size(file) > LARGEST_PIECE) {
                break;
            }
            Optional<List<Notch>> notches = JournalPiece.read(Files.readAllBytes(file), study, places);
            if (notches.isEmpty()) {
                break;
            }
            for (Notch notch : notches.get()) {
                sink.take(notch);
                taken++;
            }
            pieces++;
        }
        for (int later = pieces; Files.deleteIfExists(piece(later)); later++) {
            // Removed one by one.
        }
        return taken;
    }

    private Iterator<JournalPiece.Place> places() {
        return study.experiments().stream()
                .flatMap(e -> e.widths().stream().flatMap(width -> trials(e, width)))
                .iterator();
    }

    private static Stream<JournalPiece.Place> trials(Experiment experiment, int width) {
        return LongStream.range(0, experiment.trials())
                .mapToObj(trial -> new JournalPiece.Place(experiment, width, trial));
    }

    /** Notes a finished instance. */
    void add(Notch notch) throws IOException {
        open.add(notch);
        if (open.size() >= PIECE_BYTES || clock.getAsLong() - openSince >= PIECE_NANOS) {
            flush();
        }
    }

    private void flush() throws IOException {
        if (!open.isEmpty()) {
            if (!Files.isDirectory(folder)) {
                Files.createDirectory(folder);
                write(folder.resolve(STUDY), identity());
            }
            write(piece(pieces), open.bytes());
            pieces++;
        }
        open = new JournalPiece();
        openSince = clock.getAsLong();
    }

    private Path piece(int number) {
        return folder.resolve("piece-" + number);
    }

    /**
     * Written beside, forced, renamed: a piece that has its name is whole. An interrupt, which is what often ends a run,
     * would close the channel under the writer's hands; it waits until the piece is written.
     */
    private static void write(Path file, byte[] bytes) throws IOException {
        boolean isInterrupted = Thread.interrupted();
        try {
            writeUndisturbed(file, bytes);
        } finally {
            if (isInterrupted) {
                Thread.currentThread().interrupt();
            }
        }
    }

    private static void writeUndisturbed(Path file, byte[] bytes) throws IOException {
        Path partial = file.resolveSibling(file.getFileName() + ".partial");
        try (FileChannel channel = FileChannel.open(
                partial, StandardOpenOption.CREATE, StandardOpenOption.TRUNCATE_EXISTING, StandardOpenOption.WRITE)) {
            ByteBuffer buffer = ByteBuffer.wrap(bytes);
            while (buffer.hasRemaining()) {
                channel.write(buffer);
            }
            channel.force(true);
        }
        Files.move(partial, file, StandardCopyOption.ATOMIC_MOVE);
    }

    /** Removes the journal: the bundle is finished. */
    void done() throws IOException {
        isDone = true;
        delete();
    }

    private void delete() throws IOException {
        if (!Files.isDirectory(folder, LinkOption.NOFOLLOW_LINKS)) {
            return;
        }
        List<Path> files = new ArrayList<>();
        try (DirectoryStream<Path> entries = Files.newDirectoryStream(folder)) {
            entries.forEach(files::add);
        }
        for (Path file : files) {
            Files.delete(file);
        }
        Files.delete(folder);
    }

    /** Keeps what is not written yet, as far as the disk allows: the run has ended, however it did. */
    @Override
    public void close() throws IOException {
        if (!isDone) {
            flush();
        }
    }
}
