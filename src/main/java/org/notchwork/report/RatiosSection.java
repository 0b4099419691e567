package org.notchwork.report;

import java.io.IOException;
import java.util.List;
import org.notchwork.bundle.Results;
import org.notchwork.figure.Interval;
import org.notchwork.figure.RatioFigures;

/** Ratios of mean queries on paired trials. */
final class RatiosSection {

    private static final String NONE = "none";

    private final Results results;

    RatiosSection(Results results) {
        this.results = results;
    }

    void set(Flow flow) throws IOException {
        List<RatioFigures> all = results.summary().ratios();
        List<RatioFigures> shown = shown(all);
        if (shown.isEmpty()) {
            return;
        }
        flow.heading("Ratios of mean queries on the same instances");
        Table table = new Table(
                Table.Column.left("experiment"),
                Table.Column.right("n"),
                Table.Column.left("of"),
                Table.Column.left("over"),
                Table.Column.right("pairs"),
                Table.Column.right("censored"),
                Table.Column.right("ratio"),
                Table.Column.right("95 % from"),
                Table.Column.right("to"));
        String group = "";
        for (RatioFigures ratio : shown) {
            String here = ratio.of().experiment() + "/" + ratio.of().width();
            if (!here.equals(group)) {
                table.group();
                group = here;
            }
            table.add(
                    ratio.of().experiment(),
                    Integer.toString(ratio.of().width()),
                    ratio.of().label(),
                    ratio.to().label(),
                    Long.toString(ratio.pairs()),
                    Long.toString(ratio.censored()),
                    Numbers.decimal(ratio.ratio()),
                    ratio.interval().map(Interval::low).map(Numbers::decimal).orElse(NONE),
                    ratio.interval().map(Interval::high).map(Numbers::decimal).orElse(NONE));
        }
        table.set(flow);
        flow.note(
                "95 % intervals by Fieller (1954), none where his is unbounded. A ratio with censored pairs bounds nothing."
                        + (shown.size() < all.size()
                                ? " Classical over quantum strategies only; the other "
                                        + Numbers.count(all.size() - shown.size(), "ratio") + " stand in summary.json."
                                : ""));
    }

    /** The ratios of classical over quantum strategies; all of them where a study has only one sort. */
    private static List<RatioFigures> shown(List<RatioFigures> all) {
        List<RatioFigures> mixed = all.stream()
                .filter(r -> r.to().label().contains("@") && !r.of().label().contains("@"))
                .toList();
        return mixed.isEmpty() ? all : mixed;
    }
}
