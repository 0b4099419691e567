package org.notchwork.bundle;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.notchwork.bits.Word;
import org.notchwork.json.Fields;
import org.notchwork.json.JsonArray;
import org.notchwork.json.JsonObject;
import org.notchwork.json.JsonText;
import org.notchwork.json.JsonValue;
import org.notchwork.problem.Certificate;
import org.notchwork.problem.Pair;

/**
 * Writes and reads certificates: an object with exactly one member, which says what kind of certificate it is.
 *
 * <p>Points and values have their own widths; a value is written with as many digits as its function's width wants.
 */
final class CertificateForm {

    private static final int LONGEST_BASIS = 200;

    private CertificateForm() {}

    static JsonObject write(Certificate certificate) {
        JsonObject.Builder json = JsonObject.builder();
        if (certificate instanceof Certificate.Collision collision) {
            return json.put("collision", pair(collision.pair())).build();
        }
        if (certificate instanceof Certificate.Equations equations) {
            return json.put(
                            "equations",
                            JsonObject.builder()
                                    .put("confirmation", pair(equations.confirmation()))
                                    .put("words", words(equations.words()))
                                    .build())
                    .build();
        }
        if (certificate instanceof Certificate.Collisions collisions) {
            return json.put("collisions", pairs(collisions.pairs())).build();
        }
        if (certificate instanceof Certificate.Annihilators annihilators) {
            return json.put(
                            "annihilators",
                            JsonObject.builder()
                                    .put("confirmations", pairs(annihilators.confirmations()))
                                    .put("words", words(annihilators.words()))
                                    .build())
                    .build();
        }
        if (certificate instanceof Certificate.Spanning spanning) {
            return json.put(
                            "spanning",
                            JsonObject.builder()
                                    .put("words", words(spanning.words()))
                                    .build())
                    .build();
        }
        if (certificate instanceof Certificate.Difference difference) {
            return json.put("difference", pair(difference.pair())).build();
        }
        return json.put("absent", ((Certificate.Absent) certificate).basis()).build();
    }

    /**
     * Returns the certificate; empty if faults were noted.
     *
     * @param width the number of bits of a point
     */
    static Optional<Certificate> read(Fields fields, int width) {
        Optional<Certificate> certificate;
        if (fields.has("equations")) {
            certificate = equations(fields.object("equations"), width);
        } else if (fields.has("collisions")) {
            certificate = Optional.of(new Certificate.Collisions(pairs(fields, "collisions", width)));
        } else if (fields.has("annihilators")) {
            certificate = annihilators(fields.object("annihilators"), width);
        } else if (fields.has("spanning")) {
            certificate = spanning(fields.object("spanning"), width);
        } else if (fields.has("difference")) {
            certificate = pair(fields.object("difference"), width).map(Certificate.Difference::new);
        } else if (fields.has("absent")) {
            certificate = Optional.of(new Certificate.Absent(fields.line("absent", 1, LONGEST_BASIS)));
        } else {
            certificate = pair(fields.object("collision"), width).map(Certificate.Collision::new);
        }
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

    /** Returns a member that is a list of words of a width; those that are not are noted. */
    static List<Word> words(Fields fields, String name, int least, int width) {
        List<Word> words = new ArrayList<>();
        for (Fields.Item item : fields.items(name, least, width)) {
            Optional<Word> word = item.value() instanceof JsonText text ? word(text.value(), width) : Optional.empty();
            word.ifPresentOrElse(words::add, () -> item.fault("not such a word", mend(width)));
        }
        return words;
    }

    private static Optional<Certificate> equations(Fields fields, int width) {
        List<Word> words = words(fields, "words", 0, width);
        Optional<Pair> confirmation = pair(fields.object("confirmation"), width);
        fields.end();
        return confirmation.map(c -> new Certificate.Equations(words, c));
    }

    private static Optional<Certificate> annihilators(Fields fields, int width) {
        List<Word> words = words(fields, "words", 0, width);
        List<Pair> confirmations = pairs(fields, "confirmations", width);
        fields.end();
        return Optional.of(new Certificate.Annihilators(words, confirmations));
    }

    private static Optional<Certificate> spanning(Fields fields, int width) {
        List<Word> words = words(fields, "words", 0, width);
        fields.end();
        return Optional.of(new Certificate.Spanning(words));
    }

    private static List<Pair> pairs(Fields fields, String name, int width) {
        List<Pair> pairs = new ArrayList<>();
        for (Fields.Item item : fields.items(name, 1, width)) {
            pair(item.object(), width).ifPresent(pairs::add);
        }
        return pairs;
    }

    private static Optional<Pair> pair(Fields fields, int width) {
        Optional<Word> x = word(fields, "x", width);
        Optional<Word> y = word(fields, "y", width);
        int valueWidth = valueWidth(fields, width);
        Optional<Word> fx = word(fields, "fx", valueWidth);
        Optional<Word> fy = word(fields, "fy", valueWidth);
        fields.end();
        return x.isPresent() && y.isPresent() && fx.isPresent() && fy.isPresent()
                ? Optional.of(new Pair(x.get(), y.get(), fx.get(), fy.get()))
                : Optional.empty();
    }

    /** Values have as many bits as points, unless the pair says otherwise. */
    private static int valueWidth(Fields fields, int width) {
        return (int) fields.optionalInteger("value-width", 1, width).orElse(width);
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

    private static JsonArray words(List<Word> words) {
        return JsonArray.ofTexts(words.stream().map(Word::hex).toList());
    }

    private static JsonArray pairs(List<Pair> pairs) {
        return new JsonArray(
                pairs.stream().<JsonValue>map(CertificateForm::pair).toList());
    }

    private static JsonObject pair(Pair pair) {
        JsonObject.Builder json = JsonObject.builder()
                .put("fx", pair.fx().hex())
                .put("fy", pair.fy().hex())
                .put("x", pair.x().hex())
                .put("y", pair.y().hex());
        if (pair.fx().width() != pair.x().width()) {
            json.put("value-width", pair.fx().width());
        }
        return json.build();
    }
}
