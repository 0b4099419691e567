package org.notchwork.cli;

import java.util.Comparator;
import org.notchwork.study.CellForecast;
import org.notchwork.study.Forecast;
import org.notchwork.study.Study;

/** Refuses a study before it runs if its largest cell cannot fit into this Java's memory. */
final class MemoryCheck {

    private MemoryCheck() {}

    /** Throws if one trial a thread needs more memory than there is. */
    static void require(Study study, int threads) throws Refusal {
        CellForecast largest = Forecast.of(study).stream()
                .max(Comparator.comparingLong(CellForecast::memoryBytes))
                .orElseThrow();
        double needed = (double) largest.memoryBytes() * threads;
        long there = Runtime.getRuntime().maxMemory();
        if (needed > there) {
            throw new Refusal(
                    Exit.UNFINISHED,
                    largest.cell().id() + " needs about " + Sizes.text(needed) + " on " + threads
                            + " threads and Java has " + Sizes.text((double) there)
                            + "; use fewer threads, or java -Xmx" + (long) Math.ceil(needed / (1L << 30)) + "g");
        }
    }
}
