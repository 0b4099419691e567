package org.notchwork.problem.period;

import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.notchwork.json.Fields;
import org.notchwork.json.Spelling;
import org.notchwork.problem.BitFunction;
import org.notchwork.seed.RandomStream;

/** How the values of an instance are drawn. */
public enum Labelling {
    /** A uniformly random table; widths to 20. */
    TABLE(20),
    /** A keyed permutation evaluated on demand; widths to 63. */
    PERMUTATION(63);

    private final int greatestWidth;

    Labelling(int greatestWidth) {
        this.greatestWidth = greatestWidth;
    }

    /** Returns the largest width that can be drawn. */
    public int greatestWidth() {
        return greatestWidth;
    }

    /** Draws the values of a function with a period. */
    BitFunction label(Cosets cosets, RandomStream stream) {
        return this == TABLE ? new TableFunction(cosets, stream) : new PermutationFunction(cosets, stream);
    }

    /**
     * Reads the setting {@code instances}: {@code table}, which is the default, or {@code permutation}.
     *
     * @param settings where faults are noted
     */
    static Labelling read(Fields settings) {
        Optional<String> word = settings.optionalText("instances", 1, 40);
        List<String> words = Arrays.stream(values()).map(Labelling::word).toList();
        if (word.isPresent() && !word.get().isEmpty() && !words.contains(word.get())) {
            settings.fault("instances", Fields.quoted(word.get()), Spelling.mend(word.get(), words));
        }
        return word.filter(PERMUTATION.word()::equals).isPresent() ? PERMUTATION : TABLE;
    }

    /** Returns the word in study files: {@code table} or {@code permutation}. */
    public String word() {
        return name().toLowerCase(Locale.ROOT);
    }
}
