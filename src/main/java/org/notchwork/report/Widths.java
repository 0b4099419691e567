package org.notchwork.report;

import java.util.ArrayList;
import java.util.List;

/** How a report writes a list of widths. */
final class Widths {

    private static final int SHORTEST_RUN = 4;

    private Widths() {}

    /** Returns ascending widths in words; runs of at least four neighbours as {@code 4 to 24}. */
    static String words(List<Integer> widths) {
        List<String> parts = new ArrayList<>();
        int from = 0;
        while (from < widths.size()) {
            int to = from;
            while (to + 1 < widths.size() && widths.get(to + 1) == widths.get(to) + 1) {
                to++;
            }
            if (to - from + 1 >= SHORTEST_RUN) {
                parts.add(widths.get(from) + " to " + widths.get(to));
            } else {
                widths.subList(from, to + 1).forEach(w -> parts.add(w.toString()));
            }
            from = to + 1;
        }
        return String.join(", ", parts);
    }
}
