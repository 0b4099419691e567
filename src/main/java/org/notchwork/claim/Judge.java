package org.notchwork.claim;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.List;
import java.util.Optional;
import org.notchwork.exact.Decimals;
import org.notchwork.figure.CellFigures;
import org.notchwork.figure.Interval;
import org.notchwork.figure.RatioFigures;
import org.notchwork.figure.Summary;
import org.notchwork.study.Cell;
import org.notchwork.study.Claim;
import org.notchwork.study.FigureKind;
import org.notchwork.study.Quantity;
import org.notchwork.study.Study;

/**
 * Finds the verdict on every claim of a study: by the 95 % interval as it is written, so that anybody can find it
 * again from the file.
 */
public final class Judge {

    private Judge() {}

    /** What is known of the quantity of a claim. */
    private record Evidence(BigDecimal value, Optional<Interval> interval, Trust trust) {}

    /** Returns the claims with their verdicts, in the order of the study. */
    public static List<ClaimResult> judge(Study study, Summary summary) {
        return study.claims().stream().map(c -> judge(c, summary)).toList();
    }

    private static ClaimResult judge(Claim claim, Summary summary) {
        Evidence evidence = written(
                claim.quantity() instanceof Quantity.OfCell ofCell
                        ? cell(ofCell, summary)
                        : ratio((Quantity.Ratio) claim.quantity(), summary));
        if (evidence.interval().isEmpty()) {
            return new ClaimResult(
                    claim,
                    evidence.value(),
                    Optional.empty(),
                    ClaimVerdict.UNDECIDED,
                    "there is no interval: too few trials, or one that is unbounded");
        }
        BoundTest test = BoundTest.of(claim.bound(), evidence.interval().get(), evidence.trust());
        return new ClaimResult(claim, evidence.value(), evidence.interval(), test.verdict(), test.reason());
    }

    private static Evidence cell(Quantity.OfCell quantity, Summary summary) {
        CellFigures figures = summary.cells().stream()
                .filter(c -> c.cell().equals(quantity.cell()))
                .findFirst()
                .orElseThrow(() -> new IllegalArgumentException("no cell " + quantity.cell()));
        if (quantity.figure() == FigureKind.SUCCESS_RATE) {
            return new Evidence(figures.success(), Optional.of(figures.successInterval()), Trust.BOTH_ENDS);
        }
        return new Evidence(
                figures.queries().mean(),
                figures.queries().interval(),
                figures.censored() > 0 ? Trust.LOWER_END : Trust.BOTH_ENDS);
    }

    private static Evidence ratio(Quantity.Ratio quantity, Summary summary) {
        RatioFigures figures = summary.ratios().stream()
                .filter(r -> isAbout(r, quantity.of(), quantity.to()) || isAbout(r, quantity.to(), quantity.of()))
                .findFirst()
                .map(r -> r.of().equals(quantity.of()) ? r : r.inverse())
                .orElseThrow(() -> new IllegalArgumentException("no ratio " + quantity));
        return new Evidence(
                figures.ratio(), figures.interval(), figures.censored() > 0 ? Trust.NEITHER_END : Trust.BOTH_ENDS);
    }

    private static boolean isAbout(RatioFigures figures, Cell of, Cell to) {
        return figures.of().equals(of) && figures.to().equals(to);
    }

    private static Evidence written(Evidence evidence) {
        return new Evidence(
                written(evidence.value()),
                evidence.interval().map(i -> new Interval(written(i.low()), written(i.high()))),
                evidence.trust());
    }

    private static BigDecimal written(BigDecimal value) {
        return value.setScale(Decimals.PLACES, RoundingMode.HALF_EVEN);
    }
}
