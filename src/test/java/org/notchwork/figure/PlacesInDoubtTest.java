package org.notchwork.figure;

import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.math.RoundingMode;
import org.apache.commons.statistics.interval.BinomialConfidenceInterval;
import org.junit.jupiter.api.Test;
import org.notchwork.exact.Decimals;

/** Figures whose double lies within 10^−9 of a rounding boundary get the six places that the exact sum demands. */
class PlacesInDoubtTest {

    private static final BigDecimal HALF_STEP = new BigDecimal("0.0000005");
    private static final BigDecimal DOUBT = new BigDecimal("1e-9");
    private static final BigDecimal TAIL = new BigDecimal("0.025");
    private static final BigDecimal CENTRAL = new BigDecimal("0.95");

    @Test
    void studentsQuantileIsOnTheRightSide() {
        int found = 0;
        for (long degrees = 1; degrees <= 6000; degrees++) {
            if (isInDoubt(StudentT.exact(degrees))) {
                found++;
                BigDecimal t = StudentT.quantile(degrees);
                String which = "degrees " + degrees;
                assertTrue(
                        StudentCentral.probability(t.subtract(HALF_STEP), degrees)
                                        .compareTo(CENTRAL)
                                < 0,
                        which);
                assertTrue(StudentCentral.probability(t.add(HALF_STEP), degrees).compareTo(CENTRAL) > 0, which);
            }
        }
        assertTrue(found >= 5, "only " + found + " quantiles are in doubt");
    }

    @Test
    void theEndsOfClopperAndPearsonAreOnTheRightSide() {
        int lows = 0;
        int highs = 0;
        for (int trials = 2; trials <= 250; trials++) {
            for (int solved = 1; solved < trials; solved++) {
                org.apache.commons.statistics.interval.Interval raw =
                        BinomialConfidenceInterval.CLOPPER_PEARSON.fromErrorRate(trials, solved, 0.05);
                Interval interval = ClopperPearson.interval(solved, trials);
                String which = solved + " of " + trials;
                if (isInDoubt(raw.getLowerBound())) {
                    lows++;
                    // P(X >= k) rises with p: the end lies above a point where the tail is still below 0.025.
                    assertTrue(
                            atLeast(solved, trials, interval.low().subtract(HALF_STEP))
                                            .compareTo(TAIL)
                                    < 0,
                            which);
                    assertTrue(
                            atLeast(solved, trials, interval.low().add(HALF_STEP))
                                            .compareTo(TAIL)
                                    > 0,
                            which);
                }
                if (isInDoubt(raw.getUpperBound())) {
                    highs++;
                    BigDecimal one = BigDecimal.ONE;
                    BigDecimal below = interval.high().subtract(HALF_STEP);
                    BigDecimal above = interval.high().add(HALF_STEP);
                    assertTrue(one.subtract(atLeast(solved + 1, trials, below)).compareTo(TAIL) > 0, which);
                    assertTrue(one.subtract(atLeast(solved + 1, trials, above)).compareTo(TAIL) < 0, which);
                }
            }
        }
        assertTrue(lows >= 5 && highs >= 5, "only " + lows + " and " + highs + " ends are in doubt");
    }

    private static boolean isInDoubt(double figure) {
        BigDecimal value = new BigDecimal(figure);
        BigDecimal boundary = value.setScale(6, RoundingMode.FLOOR).add(HALF_STEP);
        return value.subtract(boundary).abs().compareTo(DOUBT) <= 0;
    }

    /** P(X ≥ k) for X binomial, from the definition. */
    private static BigDecimal atLeast(int k, int n, BigDecimal p) {
        BigDecimal q = BigDecimal.ONE.subtract(p);
        BigDecimal sum = BigDecimal.ZERO;
        BigDecimal choices = BigDecimal.ONE;
        for (int i = n; i >= k; i--) {
            BigDecimal powers = p.pow(i, Decimals.CONTEXT).multiply(q.pow(n - i, Decimals.CONTEXT), Decimals.CONTEXT);
            sum = sum.add(choices.multiply(powers, Decimals.CONTEXT), Decimals.CONTEXT);
            choices = choices.multiply(BigDecimal.valueOf(i), Decimals.CONTEXT)
                    .divide(BigDecimal.valueOf(n - i + 1L), Decimals.CONTEXT);
        }
        return sum;
    }
}
