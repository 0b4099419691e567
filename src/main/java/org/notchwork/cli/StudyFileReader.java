package org.notchwork.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.notchwork.json.JsonLimits;
import org.notchwork.json.Printable;
import org.notchwork.problem.Attachments;
import org.notchwork.study.Study;
import org.notchwork.study.StudyReader;
import org.notchwork.study.StudyReading;

/** Reads the study that the command line names, or refuses it with one line for each fault. */
final class StudyFileReader {

    private StudyFileReader() {}

    /** Returns the study in a file. */
    static Study read(Path file) throws Refusal {
        StudyReading reading = StudyReader.read(bytes(file), name -> beside(file, name));
        if (reading.study().isPresent()) {
            return reading.study().get();
        }
        List<String> lines = reading.faults().stream()
                .map(f -> Printable.escape(file + ": " + f.line()))
                .toList();
        throw new Refusal(Exit.USAGE, lines);
    }

    /** Returns a file that the study names, which stands beside it. */
    private static Optional<byte[]> beside(Path study, String name) {
        Path file = study.resolveSibling(name);
        try {
            return Files.isRegularFile(file) && Files.size(file) <= Attachments.MOST_BYTES
                    ? Optional.of(Files.readAllBytes(file))
                    : Optional.empty();
        } catch (IOException e) {
            return Optional.empty();
        }
    }

    private static byte[] bytes(Path file) throws Refusal {
        try {
            if (Files.isDirectory(file)) {
                throw new Refusal(Exit.USAGE, file + ": this is a directory; a study is a JSON file");
            }
            long size = Files.size(file);
            if (size > JsonLimits.FILE.bytes()) {
                throw new Refusal(
                        Exit.USAGE, file + ": " + size + " bytes; a study has at most " + JsonLimits.FILE.bytes());
            }
            return Files.readAllBytes(file);
        } catch (NoSuchFileException e) {
            throw new Refusal(Exit.USAGE, file + ": no such file; name a study file");
        } catch (IOException e) {
            throw new Refusal(Exit.UNFINISHED, file + ": cannot be read: " + e.getMessage());
        }
    }
}
