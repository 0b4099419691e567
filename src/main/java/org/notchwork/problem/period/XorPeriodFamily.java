package org.notchwork.problem.period;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.notchwork.json.Fields;
import org.notchwork.json.Spelling;
import org.notchwork.problem.Family;
import org.notchwork.problem.Problem;

/** Reads the settings of {@code xor-period}: {@code instances}, either {@code table} (the default) or {@code permutation}. */
public final class XorPeriodFamily implements Family {

    /** The kind in study files. */
    public static final String KIND = "xor-period";

    @Override
    public String kind() {
        return KIND;
    }

    @Override
    public Problem configure(Fields settings) {
        Optional<String> word = settings.optionalText("instances", 1, 40);
        List<String> words =
                Arrays.stream(Labelling.values()).map(Labelling::word).toList();
        if (word.isPresent() && !word.get().isEmpty() && !words.contains(word.get())) {
            settings.fault("instances", Fields.quoted(word.get()), Spelling.mend(word.get(), words));
        }
        return new XorPeriod(
                word.filter(Labelling.PERMUTATION.word()::equals).isPresent()
                        ? Labelling.PERMUTATION
                        : Labelling.TABLE);
    }
}
