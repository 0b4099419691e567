package org.notchwork.bundle;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.notchwork.bits.Word;
import org.notchwork.json.Fields;
import org.notchwork.json.JsonText;
import org.notchwork.problem.Certificate;
import org.notchwork.problem.Pair;

/** Reads the certificate of a trial line. */
final class CertificateForm {

    private CertificateForm() {}

    /** Returns the certificate; empty if faults were noted. */
    static Optional<Certificate> read(Fields fields, int width) {
        Optional<Certificate> certificate = fields.has("equations")
                ? equations(fields.object("equations"), width)
                : pair(fields.object("collision"), width).map(Certificate.Collision::new);
        fields.end();
        return certificate;
    }

    /** Returns a member that is a word of a width; empty if a fault was noted. */
    static Optional<Word> word(Fields fields, String name, int width) {
        String hex = fields.text(name, 1, Word.digits(width));
        if (hex.isEmpty()) {
            return Optional.empty();
        }
        try {
            return Optional.of(Word.ofHex(width, hex));
        } catch (IllegalArgumentException e) {
            fields.fault(name, Fields.quoted(hex), mend(width));
            return Optional.empty();
        }
    }

    private static Optional<Certificate> equations(Fields fields, int width) {
        List<Word> words = new ArrayList<>();
        for (Fields.Item item : fields.items("words", 0, width)) {
            Optional<Word> word = item.value() instanceof JsonText text ? word(text.value(), width) : Optional.empty();
            word.ifPresentOrElse(words::add, () -> item.fault("not such a word", mend(width)));
        }
        Optional<Pair> confirmation = pair(fields.object("confirmation"), width);
        fields.end();
        return confirmation.map(c -> new Certificate.Equations(words, c));
    }

    private static Optional<Pair> pair(Fields fields, int width) {
        Optional<Word> x = word(fields, "x", width);
        Optional<Word> y = word(fields, "y", width);
        Optional<Word> fx = word(fields, "fx", width);
        Optional<Word> fy = word(fields, "fy", width);
        fields.end();
        return x.isPresent() && y.isPresent() && fx.isPresent() && fy.isPresent()
                ? Optional.of(new Pair(x.get(), y.get(), fx.get(), fy.get()))
                : Optional.empty();
    }

    private static Optional<Word> word(String hex, int width) {
        try {
            return Optional.of(Word.ofHex(width, hex));
        } catch (IllegalArgumentException e) {
            return Optional.empty();
        }
    }

    private static String mend(int width) {
        return "a word of " + width + " bits as " + Word.digits(width) + " digits 0-9a-f is wanted";
    }
}
