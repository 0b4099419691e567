package org.notchwork.seed;

import java.util.regex.Pattern;

/**
 * The one seed of a study: a text of 16 to 200 printable ASCII characters. 64 hexadecimal digits are a text as well.
 *
 * @param text the seed as the study gives it
 */
public record Seed(String text) {

    /** What a seed looks like. */
    public static final Pattern FORM = Pattern.compile("[\\x20-\\x7e]{16,200}");

    /** What to say when a seed does not look so. */
    public static final String MEND = "16 to 200 printable ASCII characters are wanted, for example 64 hex digits";

    /** Checks the form. */
    public Seed {
        if (!FORM.matcher(text).matches()) {
            throw new IllegalArgumentException("not a seed: " + MEND);
        }
    }
}
