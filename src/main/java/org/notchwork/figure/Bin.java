package org.notchwork.figure;

import java.math.BigDecimal;

/**
 * Neighbouring values that a test of goodness of fit counts together.
 *
 * @param least the least value that belongs to it
 * @param greatest the greatest value that belongs to it; {@link Long#MAX_VALUE} for the last bin, which has no end
 * @param expected how many observations the law leads one to expect, above 0
 */
public record Bin(long least, long greatest, BigDecimal expected) {

    /** Refuses what is no bin. */
    public Bin {
        if (least < 0 || greatest < least || expected.signum() <= 0) {
            throw new IllegalArgumentException(least + " to " + greatest + " expects " + expected);
        }
    }
}
