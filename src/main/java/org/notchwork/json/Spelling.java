package org.notchwork.json;

import java.util.Collection;
import java.util.Optional;

/** Suggests the known name that a misspelt one was probably meant to be. */
public final class Spelling {

    private static final int MOST_EDITS = 2;
    private static final int CHARACTERS_PER_EDIT = 3;

    private Spelling() {}

    /**
     * Returns the nearest of the known names, the first of several, if it is near enough to be meant.
     *
     * <p>Near is at most two edits, and at most one for every three characters of the longer name, so that a name of
     * two letters is never taken for another. An edit is an insertion, a deletion, a substitution or a swap of
     * neighbours (F. J. Damerau, CACM 7 (1964), in the form that edits no part twice).
     */
    public static Optional<String> nearest(String name, Collection<String> known) {
        String best = null;
        int least = MOST_EDITS + 1;
        for (String candidate : known) {
            int allowed = Math.min(least - 1, Math.max(name.length(), candidate.length()) / CHARACTERS_PER_EDIT);
            if (Math.abs(name.length() - candidate.length()) <= allowed) {
                int distance = distance(name, candidate);
                if (distance <= allowed) {
                    least = distance;
                    best = candidate;
                }
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
        int[] beforePrevious = new int[b.length() + 1];
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
                if (swapped(a, i, b, j)) {
                    row[j] = Math.min(row[j], beforePrevious[j - 2] + 1);
                }
            }
            beforePrevious = previous;
            previous = row;
        }
        return previous[b.length()];
    }

    private static boolean swapped(String a, int i, String b, int j) {
        return i > 1 && j > 1 && a.charAt(i - 1) == b.charAt(j - 2) && a.charAt(i - 2) == b.charAt(j - 1);
    }
}
