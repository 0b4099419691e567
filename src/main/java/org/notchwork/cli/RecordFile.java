package org.notchwork.cli;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.Optional;
import org.notchwork.json.CanonicalJson;
import org.notchwork.report.RecordReport;
import org.notchwork.verify.VerdictRecord;

/** The file in which a referee's record is left; never one that is there already. */
final class RecordFile {

    private final Path file;
    private final boolean isPdf;

    private RecordFile(Path file, boolean isPdf) {
        this.file = file;
        this.isPdf = isPdf;
    }

    /** Returns the file that an option names; refused before anything is checked if it cannot be written. */
    static Optional<RecordFile> of(String option) throws Refusal {
        if (option == null) {
            return Optional.empty();
        }
        Path file = Arguments.path(option);
        boolean isPdf = option.endsWith(".pdf");
        if (!isPdf && !option.endsWith(".json")) {
            throw new Refusal(Exit.USAGE, "--record " + option + ": a name that ends in .json or .pdf is wanted");
        }
        if (Files.exists(file, LinkOption.NOFOLLOW_LINKS)) {
            throw new Refusal(Exit.USAGE, "--record " + option + ": already there; name another file");
        }
        return Optional.of(new RecordFile(file, isPdf));
    }

    /** Writes the record. */
    void write(VerdictRecord record) throws Refusal {
        byte[] bytes = isPdf
                ? RecordReport.pdf(record)
                : (CanonicalJson.text(record.json()) + "\n").getBytes(StandardCharsets.UTF_8);
        try {
            Files.write(file, bytes, StandardOpenOption.CREATE_NEW, StandardOpenOption.WRITE);
        } catch (IOException e) {
            throw new Refusal(Exit.UNFINISHED, IoText.of(e, file));
        }
    }
}
