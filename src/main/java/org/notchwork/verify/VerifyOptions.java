package org.notchwork.verify;

import java.util.Optional;
import org.notchwork.bundle.Limits;
import org.notchwork.seed.Seed;

/**
 * What a referee asks for.
 *
 * @param expect the seal that the referee has from elsewhere: 40 to 64 hexadecimal digits
 * @param rerun which trials are run again
 * @param refereeSeed where the choice of trials comes from; never from the bundle
 * @param threads how many worker threads
 * @param limits what is believed at most
 */
public record VerifyOptions(Optional<String> expect, Rerun rerun, Seed refereeSeed, int threads, Limits limits) {

    /** The fewest digits of a seal that prove anything against an author who could prepare two bundles. */
    public static final int FEWEST_DIGITS = 40;
}
