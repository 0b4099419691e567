package org.notchwork.cli;

import java.io.PrintStream;
import java.math.BigDecimal;
import java.util.List;
import org.notchwork.bundle.Results;
import org.notchwork.check.CheckOutcome;
import org.notchwork.check.CrossCheck;
import org.notchwork.claim.ClaimResult;
import org.notchwork.claim.ClaimVerdict;
import org.notchwork.exact.Decimals;
import org.notchwork.figure.CellFigures;
import org.notchwork.figure.Interval;
import org.notchwork.json.Printable;

/** The results of a study as text: cells, claims, cross-checks. */
final class ResultsScreen {

    private static final int PLACES = 3;

    private final PrintStream out;

    ResultsScreen(PrintStream out) {
        this.out = out;
    }

    /** Prints everything. */
    void print(Results results) {
        out.println(Printable.escape(results.study().title()));
        out.println(Printable.escape(results.study().question()));
        out.println();
        cells(results);
        out.println();
        claims(results.claims());
        checks(results.checks());
    }

    private void cells(Results results) {
        Columns table = new Columns(
                2,
                List.of(
                        "cell",
                        "engine",
                        "trials",
                        "solved",
                        "wrong",
                        "censored",
                        "mean queries",
                        "95 % interval",
                        "median",
                        "max"));
        for (CellFigures cell : results.summary().cells()) {
            table.add(List.of(
                    cell.cell().id(),
                    cell.sight().orElse("-"),
                    Long.toString(cell.trials()),
                    Long.toString(cell.solved()),
                    Long.toString(cell.wrong()),
                    Long.toString(cell.censored()),
                    decimal(cell.queries().mean()),
                    cell.queries().interval().map(ResultsScreen::interval).orElse("-"),
                    Long.toString(cell.queries().median()),
                    Long.toString(cell.queries().max())));
        }
        table.print(out);
        out.println("queries: calls spent on finding the answer; confirming calls are counted apart");
        for (CellFigures cell : results.summary().cells()) {
            if (cell.unanswered() > 0) {
                out.println("without an answer: " + cell.unanswered() + " trials of "
                        + cell.cell().id());
            }
        }
        controls(results);
    }

    private void controls(Results results) {
        List<CellFigures> controlled = results.summary().cells().stream()
                .filter(c -> c.control().isPresent())
                .toList();
        if (controlled.isEmpty()) {
            return;
        }
        List<String> flagged = controlled.stream()
                .filter(c -> c.control().orElseThrow().isFlagged())
                .map(c -> c.cell().id() + c.sight().map(s -> " (" + s + ")").orElse(""))
                .toList();
        out.println("controls: " + controlled.size() + " cells faced functions that hide nothing; " + flagged.size()
                + " flagged for naming what is not there");
        flagged.forEach(cell -> out.println("  flagged: " + cell));
    }

    private void claims(List<ClaimResult> claims) {
        for (ClaimResult claim : claims) {
            out.println("claim " + claim.claim().id() + ": "
                    + claim.verdict().word() + ": "
                    + Printable.escape(claim.claim().text()));
            out.println("  " + claim.reason());
        }
        if (!claims.isEmpty()) {
            out.println("claims: " + count(claims, ClaimVerdict.SUPPORTED) + " supported, "
                    + count(claims, ClaimVerdict.REFUTED) + " refuted, " + count(claims, ClaimVerdict.UNDECIDED)
                    + " undecided");
        }
    }

    private void checks(List<CrossCheck> checks) {
        for (CrossCheck check : checks) {
            if (check.outcome() == CheckOutcome.DIFFERS) {
                out.println("CROSS-CHECK FAILED: " + check.kind().word() + " on " + check.subject() + ": expected "
                        + check.expected() + ", observed " + check.observed());
            }
        }
        out.println("cross-checks: " + count(checks, CheckOutcome.AGREES) + " agree, "
                + count(checks, CheckOutcome.DIFFERS) + " differ, " + count(checks, CheckOutcome.NOT_COMPARABLE)
                + " not comparable");
    }

    private static long count(List<ClaimResult> claims, ClaimVerdict verdict) {
        return claims.stream().filter(c -> c.verdict() == verdict).count();
    }

    private static long count(List<CrossCheck> checks, CheckOutcome outcome) {
        return checks.stream().filter(c -> c.outcome() == outcome).count();
    }

    private static String interval(Interval interval) {
        return "[" + decimal(interval.low()) + ", " + decimal(interval.high()) + "]";
    }

    private static String decimal(BigDecimal value) {
        return Decimals.text(value, PLACES);
    }
}
