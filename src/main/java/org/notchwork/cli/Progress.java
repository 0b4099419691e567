package org.notchwork.cli;

import java.util.Locale;

/**
 * Tells how far the work is: a bar that is drawn over on a terminal, plain lines at intervals elsewhere.
 *
 * <p>Time left is estimated from the share of work done, the work being weighed by the forecast of its cost.
 */
final class Progress {

    private static final long BAR_NANOS = 200_000_000L;
    private static final long FIRST_LINE_NANOS = 5_000_000_000L;
    private static final long LINE_NANOS = 30_000_000_000L;
    private static final int BAR = 28;

    /** Before this much is done, or this much time has passed, a guess at the time left would be wild. */
    private static final double LEAST_SHARE = 0.03;

    private static final long LEAST_NANOS = 2_000_000_000L;

    private final Terminal terminal;
    private final String what;
    private final long start = System.nanoTime();
    private long next;
    private boolean drawn;

    Progress(Terminal terminal, String what) {
        this.terminal = terminal;
        this.what = what;
        this.next = start + (terminal.live() ? BAR_NANOS : FIRST_LINE_NANOS);
    }

    /**
     * Notes that part of the work is done; prints if it is time to.
     *
     * @param share the share of the work that is done, 0 to 1
     * @param detail what is being worked on
     */
    void at(double share, String detail) {
        long now = System.nanoTime();
        if (now < next) {
            return;
        }
        boolean known = share > LEAST_SHARE && now - start > LEAST_NANOS;
        String left = known ? ", about " + duration(Math.max(1e9, (now - start) * (1 - share) / share)) + " left" : "";
        String percent = String.format(Locale.ROOT, "%3.0f %%", share * 100);
        if (terminal.live()) {
            int full = (int) Math.round(share * BAR);
            terminal.err()
                    .print("\r" + what + " [" + "#".repeat(full) + ".".repeat(BAR - full) + "] " + percent + left + "  "
                            + detail + "\u001b[K");
            terminal.err().flush();
            drawn = true;
            next = now + BAR_NANOS;
        } else {
            terminal.err().println(what + ": " + percent.strip() + left + " (" + detail + ")");
            next = now + LINE_NANOS;
        }
    }

    /** Removes the bar, if one was drawn. */
    void end() {
        if (drawn) {
            terminal.err().print("\r\u001b[K");
            terminal.err().flush();
        }
    }

    /** Returns a duration in words. */
    static String duration(double nanos) {
        double seconds = nanos / 1e9;
        if (seconds < 1) {
            return "under 1 s";
        }
        if (seconds < 90) {
            return String.format(Locale.ROOT, "%.0f s", seconds);
        }
        if (seconds < 90 * 60) {
            return String.format(Locale.ROOT, "%.0f min", seconds / 60);
        }
        return String.format(Locale.ROOT, "%.1f h", seconds / 3600);
    }
}
