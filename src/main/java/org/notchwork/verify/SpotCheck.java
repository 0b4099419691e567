package org.notchwork.verify;

import java.math.BigDecimal;
import java.math.RoundingMode;
import org.notchwork.exact.Decimals;

/** What a random sample of trials, drawn without replacement, would have caught. */
public final class SpotCheck {

    private static final int PLACES = 3;

    private SpotCheck() {}

    /**
     * Returns the probability that a sample holds at least one forged trial: 1 − C(N−b, k) / C(N, k), the
     * hypergeometric law.
     *
     * @param all N, how many trials there are
     * @param forged b, how many of them are forged
     * @param sampled k, how many are drawn, at most N
     */
    public static BigDecimal caught(long all, long forged, long sampled) {
        if (forged < 0 || sampled < 0 || forged > all || sampled > all) {
            throw new IllegalArgumentException(forged + " forged and " + sampled + " sampled of " + all);
        }
        BigDecimal missed = BigDecimal.ONE;
        long few = Math.min(forged, sampled);
        long many = Math.max(forged, sampled);
        for (long i = 0; i < few; i++) {
            missed = missed.multiply(Decimals.quotient(Math.max(0, all - many - i), all - i), Decimals.CONTEXT);
        }
        return BigDecimal.ONE.subtract(missed);
    }

    /**
     * Says what a sample without a difference is worth; 1 % of the trials is rounded up to a whole one. The
     * probability is rounded down, so that only certainty is called 1.
     *
     * @param all how many trials there are, at least 1
     * @param sampled how many were drawn
     */
    static String sentence(long all, long sampled) {
        long forged = (all + 99) / 100;
        String probability =
                caught(all, forged, sampled).setScale(PLACES, RoundingMode.DOWN).toPlainString();
        return "had 1 % of the trials (" + forged + ") been forged, this sample would have caught at least one with"
                + " probability " + probability;
    }
}
