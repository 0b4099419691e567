package org.notchwork.check;

import java.math.BigDecimal;
import java.util.Optional;
import org.notchwork.exact.Decimals;
import org.notchwork.figure.CellFigures;
import org.notchwork.law.Prediction;
import org.notchwork.law.QueryLaw;

/**
 * Compares the observed mean number of queries of a cell with the exact expectation.
 *
 * <p>The standard error is the square root of the law's variance over the number of trials, or of the sample's variance
 * where the law gives none. Beyond five standard errors the check differs: for a normal mean that happens by chance
 * with probability 5.7 · 10^−7. A law without variance is held to equality. Where trials were censored, or where neither
 * the law nor the trials tell a spread, the mean is not comparable.
 */
final class TheoryMean {

    private static final BigDecimal LIMIT = BigDecimal.valueOf(5);
    private static final int PLACES = 2;

    private TheoryMean() {}

    static CrossCheck check(CellFigures figures, QueryLaw law) {
        int width = figures.cell().width();
        Prediction mean = law.mean(width);
        String expected = "mean " + Decimals.text(mean.value())
                + mean.fraction().map(f -> " = " + f).orElse("");
        String observed = "mean " + Decimals.text(figures.queries().mean());
        if (figures.censored() > 0) {
            return result(
                    figures,
                    expected,
                    observed + ", not comparable: " + figures.censored() + " trials censored",
                    Optional.empty(),
                    CheckOutcome.NOT_COMPARABLE);
        }
        Optional<BigDecimal> known = law.variance(width);
        BigDecimal variance = known.or(() -> figures.queries().deviation().map(d -> d.multiply(d, Decimals.CONTEXT)))
                .orElse(BigDecimal.ZERO);
        BigDecimal error = Decimals.root(variance.divide(BigDecimal.valueOf(figures.trials()), Decimals.CONTEXT));
        BigDecimal difference = figures.queries().mean().subtract(mean.value(), Decimals.CONTEXT);
        if (error.signum() == 0) {
            return withoutSpread(figures, expected, observed, difference.signum() == 0, known.isPresent());
        }
        BigDecimal deviation = difference.divide(error, Decimals.CONTEXT);
        return result(
                figures,
                expected,
                observed + ", standard error " + Decimals.text(error),
                Optional.of(Decimals.text(deviation, PLACES)),
                deviation.abs().compareTo(LIMIT) <= 0 ? CheckOutcome.AGREES : CheckOutcome.DIFFERS);
    }

    private static CrossCheck withoutSpread(
            CellFigures figures, String expected, String observed, boolean equal, boolean known) {
        if (equal || known) {
            return result(
                    figures,
                    expected,
                    observed + ", standard error 0",
                    Optional.empty(),
                    equal ? CheckOutcome.AGREES : CheckOutcome.DIFFERS);
        }
        return result(
                figures,
                expected,
                observed + ", not comparable: neither the law nor the trials tell a spread",
                Optional.empty(),
                CheckOutcome.NOT_COMPARABLE);
    }

    private static CrossCheck result(
            CellFigures figures, String expected, String observed, Optional<String> deviation, CheckOutcome outcome) {
        return new CrossCheck(
                CheckKind.THEORY_MEAN, figures.cell().id(), figures.trials(), expected, observed, deviation, outcome);
    }
}
