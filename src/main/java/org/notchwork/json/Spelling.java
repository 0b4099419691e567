package org.notchwork.json;

import java.util.Collection;
import java.util.Optional;

/** Suggests the known name that a misspelt one was probably meant to be. */
public final class Spelling {

    private static final int NEAR = 2;

    private Spelling() {}

    /**
     * Returns the nearest of the known names if it is at most two edits away (insertion, deletion, substitution;
     * V. I. Levenshtein, Soviet Physics Doklady 10 (1966)).
     */
    public static Optional<String> nearest(String name, Collection<String> known) {
        String best = null;
        int least = NEAR + 1;
        for (String candidate : known) {
            int distance = distance(name, candidate);
            if (distance < least) {
                least = distance;
                best = candidate;
            }
        }
        return Optional.ofNullable(best);
    }

    /** Returns advice for an unknown name: the nearest known one, else all of them. */
    public static String mend(String name, Collection<String> known) {
        return nearest(name, known)
                .map(near -> "did you mean \"" + near + "\"?")
                .orElseGet(() -> known.isEmpty() ? "nothing goes here" : "known here: " + String.join(", ", known));
    }

    private static int distance(String a, String b) {
        if (Math.abs(a.length() - b.length()) > NEAR) {
            return NEAR + 1;
        }
        int[] previous = new int[b.length() + 1];
        for (int j = 0; j <= b.length(); j++) {
            previous[j] = j;
        }
        for (int i = 1; i <= a.length(); i++) {
            int[] row = new int[b.length() + 1];
            row[0] = i;
            for (int j = 1; j <= b.length(); j++) {
                int change = previous[j - 1] + (a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1);
                row[j] = Math.min(change, Math.min(previous[j], row[j - 1]) + 1);
            }
            previous = row;
        }
        return previous[b.length()];
    }
}
