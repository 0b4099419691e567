package org.notchwork.bundle;

import java.util.List;
import java.util.Optional;
import org.notchwork.bits.Word;
import org.notchwork.json.Fields;
import org.notchwork.json.JsonArray;
import org.notchwork.json.JsonObject;
import org.notchwork.problem.Answer;

/** Writes and reads answers: an object with exactly one member, which says what kind of answer it is. */
final class AnswerForm {

    private static final String NONE = "none";
    private static final String CONSTANT = "constant";
    private static final String BALANCED = "balanced";

    private AnswerForm() {}

    static JsonObject write(Answer answer) {
        JsonObject.Builder json = JsonObject.builder();
        if (answer instanceof Answer.Period period) {
            return json.put("period", period.s().hex()).build();
        }
        if (answer instanceof Answer.NoPeriod) {
            return json.put("verdict", NONE).build();
        }
        if (answer instanceof Answer.Subspace subspace) {
            return json.put(
                            "subspace",
                            JsonArray.ofTexts(
                                    subspace.basis().stream().map(Word::hex).toList()))
                    .build();
        }
        if (answer instanceof Answer.Mask mask) {
            return json.put("mask", mask.a().hex()).build();
        }
        return json.put("verdict", ((Answer.Balance) answer).isBalanced() ? BALANCED : CONSTANT)
                .build();
    }

    /** Returns the answer; empty if faults were noted. */
    static Optional<Answer> read(Fields fields, int width) {
        Optional<Answer> answer;
        if (fields.has("subspace")) {
            answer = subspace(fields, width);
        } else if (fields.has("mask")) {
            answer = CertificateForm.word(fields, "mask", width).map(Answer.Mask::new);
        } else if (fields.has("verdict")) {
            answer = verdict(fields);
        } else {
            answer = period(fields, width);
        }
        fields.end();
        return answer;
    }

    private static Optional<Answer> period(Fields fields, int width) {
        Optional<Word> s = CertificateForm.word(fields, "period", width);
        if (s.isPresent() && s.get().isZero()) {
            fields.fault("period", "0", "a period is not 0");
            return Optional.empty();
        }
        return s.map(Answer.Period::new);
    }

    private static Optional<Answer> verdict(Fields fields) {
        String word = fields.text("verdict", 1, 20);
        switch (word) {
            case NONE:
                return Optional.of(new Answer.NoPeriod());
            case CONSTANT:
                return Optional.of(new Answer.Balance(false));
            case BALANCED:
                return Optional.of(new Answer.Balance(true));
            default:
                if (!word.isEmpty()) {
                    fields.fault("verdict", Fields.quoted(word), "none, constant or balanced is wanted");
                }
                return Optional.empty();
        }
    }

    private static Optional<Answer> subspace(Fields fields, int width) {
        int before = fields.faults().size();
        List<Word> basis = CertificateForm.words(fields, "subspace", 1, width);
        if (fields.faults().size() > before) {
            return Optional.empty();
        }
        try {
            return Optional.of(new Answer.Subspace(basis));
        } catch (IllegalArgumentException e) {
            fields.fault(
                    "subspace",
                    "not a reduced echelon form",
                    "rows with descending leading bits, each set in no other row, are wanted");
            return Optional.empty();
        }
    }
}
