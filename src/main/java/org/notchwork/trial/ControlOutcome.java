package org.notchwork.trial;

import java.util.Locale;
import java.util.Optional;

/** What came of a control, where nothing is hidden. */
public enum ControlOutcome {
    /** The strategy named what the trial hides, which the control's function does not have. */
    SECRET,
    /** It named something else, and its certificate holds: equal values by accident. */
    CLAIMED,
    /** It named something else, and its certificate does not hold. */
    FAILED,
    /** It named nothing: it said so, gave up or was cut off. */
    NOTHING;

    /** Returns the word in files. */
    public String word() {
        return name().toLowerCase(Locale.ROOT);
    }

    /** Returns the outcome of a word. */
    public static Optional<ControlOutcome> of(String word) {
        for (ControlOutcome outcome : values()) {
            if (outcome.word().equals(word)) {
                return Optional.of(outcome);
            }
        }
        return Optional.empty();
    }
}
