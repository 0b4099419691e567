package org.notchwork.verify;

import java.time.Duration;
import java.util.Collections;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
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
 * @param cells the ids of the cells whose trials may be run again; empty for all
 * @param fresh how many new trials a cell are run on the referee's seed; 0 for none
 * @param time how long re-run and fresh run may take together
 */
public record VerifyOptions(
        Optional<String> expect,
        Rerun rerun,
        Seed refereeSeed,
        int threads,
        Limits limits,
        Set<String> cells,
        int fresh,
        Duration time) {

    /** How long a re-run may take where the referee does not say: an hour. */
    public static final Duration USUAL_TIME = Duration.ofHours(1);

    /** The fewest digits of a seal that prove anything against an author who could prepare two bundles. */
    public static final int FEWEST_DIGITS = 40;

    private static final Pattern SEAL = Pattern.compile("[0-9a-f]{" + FEWEST_DIGITS + ",64}");

    /** Creates options without a restriction to cells and without a fresh run. */
    public VerifyOptions(Optional<String> expect, Rerun rerun, Seed refereeSeed, int threads, Limits limits) {
        this(expect, rerun, refereeSeed, threads, limits, Set.of(), 0, USUAL_TIME);
    }

    /** Takes the gaps out of the seal, and checks it and the numbers. */
    public VerifyOptions {
        cells = Collections.unmodifiableSet(new TreeSet<>(cells));
        if (fresh < 0 || time.isNegative() || time.isZero()) {
            throw new IllegalArgumentException(fresh + " fresh trials within " + time);
        }
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
