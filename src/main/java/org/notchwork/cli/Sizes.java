package org.notchwork.cli;

import java.util.Locale;

/** Amounts of memory in words. */
final class Sizes {

    private static final double STEP = 1024;

    private Sizes() {}

    /** Returns an amount of bytes with a fitting unit. */
    static String text(double bytes) {
        if (bytes < STEP * STEP) {
            return String.format(Locale.ROOT, "%.0f KiB", Math.max(1, Math.ceil(bytes / STEP)));
        }
        if (bytes < STEP * STEP * STEP) {
            return String.format(Locale.ROOT, "%.0f MiB", bytes / (STEP * STEP));
        }
        return String.format(Locale.ROOT, "%.1f GiB", bytes / (STEP * STEP * STEP));
    }
}
