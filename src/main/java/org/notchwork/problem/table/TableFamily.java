package org.notchwork.problem.table;

import java.util.Locale;
import java.util.Optional;
import java.util.regex.Pattern;
import org.apache.commons.codec.digest.DigestUtils;
import org.notchwork.json.Fields;
import org.notchwork.json.Spelling;
import org.notchwork.problem.Attachment;
import org.notchwork.problem.Attachments;
import org.notchwork.problem.Family;
import org.notchwork.problem.Problem;

/**
 * Reads the settings of {@code table}: {@code file}, {@code width}, {@code promise} (what the author declares), {@code
 * dimension} for a hidden subspace, {@code sha256} of the file (filled in where it is left out), and {@code
 * promise-not-kept} for a function that is run although it breaks its promise.
 */
public final class TableFamily implements Family {

    /** The kind in study files. */
    public static final String KIND = "table";

    private static final int GREATEST_WIDTH = 16;
    private static final Pattern FILE = Pattern.compile("[A-Za-z0-9][A-Za-z0-9._-]{0,80}\\.(csv|json)");
    private static final String FILE_MEND = "a file name ending in .csv or .json, without a folder, is wanted";
    private static final Pattern DIGEST = Pattern.compile("[0-9a-f]{64}");

    @Override
    public String kind() {
        return KIND;
    }

    @Override
    public Optional<Problem> configure(Fields settings, Attachments files) {
        int before = settings.faults().size();
        String name = settings.text("file", FILE, FILE_MEND);
        int width = (int) settings.integer("width", 1, GREATEST_WIDTH);
        Optional<Declared> declared = declared(settings, width);
        Optional<String> digest =
                settings.optionalText("sha256", DIGEST, "the SHA-256 of the file as 64 digits 0-9a-f is wanted");
        boolean isBroken = settings.optionalTruth("promise-not-kept").orElse(false);
        if (settings.faults().size() > before || declared.isEmpty()) {
            return Optional.empty();
        }
        Optional<byte[]> bytes = files.read(name);
        if (bytes.isEmpty()) {
            settings.fault(
                    "file",
                    "there is no file " + Fields.quoted(name) + " that can be read",
                    "a file beside the study, of at most 16 MiB, is wanted");
            return Optional.empty();
        }
        String found = DigestUtils.sha256Hex(bytes.get());
        if (digest.isPresent() && !digest.get().equals(found)) {
            settings.fault("sha256", "the file has the digest " + found, "the file that was meant is wanted");
            return Optional.empty();
        }
        return table(settings, new Attachment(name, bytes.get()), width, declared.get(), isBroken, found);
    }

    private static Optional<Problem> table(
            Fields settings, Attachment file, int width, Declared declared, boolean isBroken, String digest) {
        int[] values;
        try {
            values = TableFile.read(
                    file.bytes(), file.name().toLowerCase(Locale.ROOT).endsWith(".json"), width);
        } catch (TableFile.Fault e) {
            settings.fault("file", file.name() + ": " + e.getMessage(), "one row for each x is wanted");
            return Optional.empty();
        }
        PromiseSearch.Found found = PromiseSearch.search(values, width, declared);
        if (found.broken().isPresent() && !isBroken) {
            settings.fault(
                    "promise",
                    "the table breaks it: " + found.broken().get(),
                    "mend the table, or state \"promise-not-kept\": true");
            return Optional.empty();
        }
        if (found.broken().isEmpty() && isBroken) {
            settings.fault("promise-not-kept", "the table keeps its promise", "leave this member out");
            return Optional.empty();
        }
        return Optional.of(new GivenTable(file, width, values, declared, found, digest));
    }

    private static Optional<Declared> declared(Fields settings, int width) {
        String word = settings.text("promise", 1, 60);
        if (word.isEmpty()) {
            return Optional.empty();
        }
        Optional<Declared.Kind> kind = Declared.Kind.of(word);
        if (kind.isEmpty()) {
            settings.fault("promise", Fields.quoted(word), Spelling.mend(word, Declared.Kind.words()));
            return Optional.empty();
        }
        if (kind.get() != Declared.Kind.HIDDEN_SUBSPACE) {
            return Optional.of(new Declared(kind.get(), 1));
        }
        int dimension = (int) settings.integer("dimension", 1, GREATEST_WIDTH);
        if (dimension >= width) {
            settings.fault("dimension", "dimension " + dimension, "less than the width " + width + " is wanted");
            return Optional.empty();
        }
        return Optional.of(new Declared(kind.get(), dimension));
    }
}
