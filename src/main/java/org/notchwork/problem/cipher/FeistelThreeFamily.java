package org.notchwork.problem.cipher;

import java.util.List;
import java.util.Optional;
import org.notchwork.json.Fields;
import org.notchwork.json.Spelling;
import org.notchwork.problem.Attachments;
import org.notchwork.problem.Family;
import org.notchwork.problem.Problem;

/** Reads the settings of {@code feistel-three}: {@code rounds-are}, {@code functions} (the default) or {@code permutations}. */
public final class FeistelThreeFamily implements Family {

    /** The kind in study files. */
    public static final String KIND = "feistel-three";

    static final String FUNCTIONS = "functions";
    static final String PERMUTATIONS = "permutations";

    private static final List<String> WORDS = List.of(FUNCTIONS, PERMUTATIONS);

    @Override
    public String kind() {
        return KIND;
    }

    @Override
    public Optional<Problem> configure(Fields settings, Attachments files) {
        Optional<String> word = settings.optionalText("rounds-are", 1, 40).filter(w -> !w.isEmpty());
        if (word.isPresent() && !WORDS.contains(word.get())) {
            settings.fault("rounds-are", Fields.quoted(word.get()), Spelling.mend(word.get(), WORDS));
        }
        return Optional.of(new FeistelThree(word.filter(PERMUTATIONS::equals).isPresent()));
    }
}
