package org.notchwork.report;

import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Predicate;
import org.notchwork.bundle.Results;
import org.notchwork.check.CheckOutcome;
import org.notchwork.claim.ClaimVerdict;
import org.notchwork.figure.CellFigures;
import org.notchwork.study.Experiment;
import org.notchwork.study.StrategyChoice;

/** What is not covered, found from the results themselves. */
final class LimitsSection {

    private final Results results;

    LimitsSection(Results results) {
        this.results = results;
    }

    void set(Flow flow) throws IOException {
        flow.heading("What is not covered");
        flow.items(lines());
    }

    private List<String> lines() {
        List<String> lines = new ArrayList<>();
        notExhaustive(lines);
        long without = results.checks().stream()
                .filter(c -> c.outcome() == CheckOutcome.NOT_COMPARABLE)
                .count();
        if (without > 0) {
            lines.add(Numbers.count(without, "cross-check") + " had nothing to compare; their tables say why.");
        }
        cells(lines, "Some trials were censored", c -> c.censored() > 0);
        cells(lines, "A sighted engine was told the secret", c -> c.sight().equals(Optional.of("sighted")));
        long undecided = results.claims().stream()
                .filter(c -> c.verdict() == ClaimVerdict.UNDECIDED)
                .count();
        if (undecided > 0) {
            lines.add("Undecided: " + Numbers.count(undecided, "claim") + "; the reasons stand with the claims.");
        }
        lines.add("The seed was chosen by the author, and no plan was published beforehand that this program knows of."
                + " A run on a seed of the reader's own is the remedy.");
        boolean isNoisy = results.study().experiments().stream()
                .flatMap(e -> e.strategies().stream())
                .anyMatch(c -> !c.noise().isNone());
        lines.add((isNoisy ? "No noise but that of readout is modelled" : "No noise is modelled")
                + "; a query costs one, whatever it would cost on a machine.");
        lines.add(
                "Widths are toy sizes. Nothing here judges a deployed cipher; that belongs to qualified cryptographers"
                        + " and current standards.");
        return lines;
    }

    private void notExhaustive(List<String> lines) {
        for (Experiment experiment : results.study().experiments()) {
            List<Integer> above = experiment.widths().stream()
                    .filter(w -> w > results.study().crossCheckWidth())
                    .toList();
            if (!above.isEmpty()) {
                lines.add("Experiment " + experiment.id() + ", not checked exhaustively: "
                        + (above.size() == 1 ? "width " : "widths ") + Widths.words(above)
                        + ". Certificates and laws were.");
            }
        }
    }

    /** Adds one line for each strategy of each experiment that has such cells. */
    private void cells(List<String> lines, String what, Predicate<CellFigures> such) {
        for (Experiment experiment : results.study().experiments()) {
            for (StrategyChoice choice : experiment.strategies()) {
                List<Integer> widths = results.summary().cells().stream()
                        .filter(c -> c.cell().experiment().equals(experiment.id())
                                && c.cell().label().equals(choice.label())
                                && such.test(c))
                        .map(c -> c.cell().width())
                        .toList();
                if (!widths.isEmpty()) {
                    lines.add(what + ": " + experiment.id() + ", " + choice.label() + ", "
                            + (widths.size() == 1 ? "width " : "widths ") + Widths.words(widths) + ".");
                }
            }
        }
    }
}
