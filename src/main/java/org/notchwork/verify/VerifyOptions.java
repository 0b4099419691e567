package org.notchwork.verify;

import java.util.Locale;
import java.util.Optional;
import java.util.regex.Pattern;
import org.notchwork.bundle.Limits;
import org.notchwork.seed.Seed;

/**
 * What a referee asks for.
 *
 * @param expect the seal that the referee has from elsewhere: 40 to 64 hexadecimal digits; gaps and case do not matter
 * @param rerun which trials are run again
 * @param refereeSeed where the choice of trials comes from; never from the bundle
 * @param threads how many worker threads, at least 1
 * @param limits what is believed at most
 */
public record VerifyOptions(Optional<String> expect, Rerun rerun, Seed refereeSeed, int threads, Limits limits) {

    /** The fewest digits of a seal that prove anything against an author who could prepare two bundles. */
    public static final int FEWEST_DIGITS = 40;

    private static final Pattern SEAL = Pattern.compile("[0-9a-f]{" + FEWEST_DIGITS + ",64}");

    /** Takes the gaps out of the seal, and checks it and the number of threads. */
    public VerifyOptions {
        expect = expect.map(VerifyOptions::plain);
        if (!expect.map(VerifyOptions::isSeal).orElse(true)) {
            throw new IllegalArgumentException(FEWEST_DIGITS + " to 64 hexadecimal digits of a seal are wanted");
        }
        if (threads < 1) {
            throw new IllegalArgumentException(threads + " threads");
        }
    }

    /** Returns whether a text, as a person may type it, has digits enough of a seal to compare. */
    public static boolean isSeal(String typed) {
        return SEAL.matcher(plain(typed)).matches();
    }

    private static String plain(String typed) {
        return typed.replaceAll("\\s", "").toLowerCase(Locale.ROOT);
    }
}
