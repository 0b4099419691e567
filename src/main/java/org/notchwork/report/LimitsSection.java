package org.notchwork.report;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.notchwork.bundle.Results;
import org.notchwork.claim.ClaimVerdict;
import org.notchwork.figure.CellFigures;
import org.notchwork.study.Experiment;

/** What is not covered, found from the results themselves. */
final class LimitsSection {

    private final Results results;

    LimitsSection(Results results) {
        this.results = results;
    }

    void set(Flow flow) throws IOException {
        flow.heading("What is not covered");
        for (String line : lines()) {
            flow.body("– " + line);
        }
    }

    private List<String> lines() {
        List<String> lines = new ArrayList<>();
        for (Experiment experiment : results.study().experiments()) {
            List<String> above = experiment.widths().stream()
                    .filter(w -> w > results.study().crossCheckWidth())
                    .map(String::valueOf)
                    .toList();
            if (!above.isEmpty()) {
                lines.add("Experiment " + experiment.id() + ": widths " + String.join(", ", above)
                        + " were not checked exhaustively; certificates and laws were.");
            }
        }
        List<CellFigures> cells = results.summary().cells();
        add(lines, cells.stream().filter(c -> c.censored() > 0), "Cells with censored trials");
        add(
                lines,
                cells.stream().filter(c -> c.sight().equals(Optional.of("sighted"))),
                "Cells of a sighted engine, which was told the secret");
        long undecided = results.claims().stream()
                .filter(c -> c.verdict() == ClaimVerdict.UNDECIDED)
                .count();
        if (undecided > 0) {
            lines.add(undecided + " claims are undecided: more trials would be needed.");
        }
        lines.add("The seed was chosen by the author, and no plan was published beforehand that this program knows of."
                + " A run on a seed of the reader's own is the remedy.");
        lines.add("No noise is modelled; a query costs one, whatever it would cost on a machine.");
        lines.add(
                "Widths are toy sizes. Nothing here judges a deployed cipher; that belongs to qualified cryptographers"
                        + " and current standards.");
        return lines;
    }

    private static void add(List<String> lines, Stream<CellFigures> cells, String what) {
        List<String> ids = cells.map(c -> c.cell().id()).toList();
        if (!ids.isEmpty()) {
            lines.add(what + ": " + String.join(", ", ids) + ".");
        }
    }
}
