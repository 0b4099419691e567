package org.notchwork.figure;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTimeout;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.notchwork.support.CheckValues.assertPrints;

import java.io.IOException;
import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.MathContext;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.exact.Decimals;
import org.notchwork.seed.RandomStream;
import org.notchwork.support.CheckValues;
import org.notchwork.support.Fractions;
import org.notchwork.support.Streams;
import tools.jackson.databind.JsonNode;

class BinomialTailTest {

    private static final MathContext WORK = new MathContext(70);
    private static final BigDecimal NEARLY_ONE = BigDecimal.ONE.subtract(new BigDecimal("1e-48"));

    /** The naive twin: sums of exact probabilities, compared exactly. */
    @ParameterizedTest
    @ValueSource(strings = {"0.5", "0.1", "0.75", "0.123", "0.999", "0.25", "1e-20"})
    void smallCasesAreTheSumsOfExactProbabilities(String text) {
        BigDecimal p = new BigDecimal(text);
        for (int n = 0; n <= 12; n++) {
            List<BigDecimal> law = exactLaw(n, p);
            for (int k = 0; k <= n; k++) {
                BigDecimal observed = law.get(k);
                BigDecimal up = BigDecimal.ZERO;
                BigDecimal down = BigDecimal.ZERO;
                BigDecimal both = BigDecimal.ZERO;
                for (int j = 0; j <= n; j++) {
                    BigDecimal term = law.get(j);
                    up = j >= k ? up.add(term) : up;
                    down = j <= k ? down.add(term) : down;
                    both = term.compareTo(observed) <= 0 ? both.add(term) : both;
                }
                String where = k + " of " + n + " at " + p;
                assertClose(up, BinomialTail.atLeast(k, n, p), where);
                assertClose(down, BinomialTail.atMost(k, n, p), where);
                assertClose(both, BinomialTail.twoSided(k, n, p), where);
            }
        }
    }

    private static List<BigDecimal> exactLaw(int n, BigDecimal p) {
        List<BigDecimal> law = new ArrayList<>();
        BigInteger ways = BigInteger.ONE;
        for (int k = 0; k <= n; k++) {
            law.add(new BigDecimal(ways)
                    .multiply(p.pow(k))
                    .multiply(BigDecimal.ONE.subtract(p).pow(n - k)));
            ways = ways.multiply(BigInteger.valueOf((long) n - k)).divide(BigInteger.valueOf(k + 1L));
        }
        return law;
    }

    /** The other way to the same tails, written for intervals: term by term from 0. */
    @ParameterizedTest
    @CsvSource({"40, 0.3", "127, 0.5", "128, 0.5", "129, 0.7", "300, 0.01", "500, 0.49"})
    void tailsAgreeWithThoseOfTheIntervals(long n, BigDecimal p) {
        for (long k = 0; k <= n; k++) {
            assertNear(ClopperPearson.upperTail(k, n, p), BinomialTail.atLeast(k, n, p), "1e-45");
            assertNear(ClopperPearson.lowerTail(k, n, p), BinomialTail.atMost(k, n, p), "1e-45");
        }
    }

    /** Published: Conover's 0.3825 (1971) and documented examples; the rest of the section is computed or derived. */
    @Test
    void theExamplesOfTheCheckValuesAreMet() throws IOException {
        int greater = 0;
        int twoSided = 0;
        for (JsonNode row : CheckValues.section("L").required("binomial")) {
            long k = row.required(row.has("x") ? "x" : "positives").asLong();
            long n = row.required("n").asLong();
            BigDecimal p = Fractions.value(row.required("p0").asString());
            if (row.has("p_greater")) {
                assertPrinted(row.required("p_greater").asString(), BinomialTail.atLeast(k, n, p));
                greater++;
            }
            if (row.has("p_two_sided")) {
                assertPrinted(row.required("p_two_sided").asString(), BinomialTail.twoSided(k, n, p));
                twoSided++;
            }
        }
        assertEquals(2, greater);
        assertEquals(2, twoSided);
    }

    private static void assertPrinted(String printed, BigDecimal value) {
        if (printed.contains("/")) {
            assertClose(Fractions.value(printed), value, printed);
        } else {
            assertPrints(printed, value);
        }
    }

    /** W. J. Conover (1971): 682 of 925 at 3/4. Sign tests: 9 of 10 is 11/1024 on either side. */
    @Test
    void publishedAndDerivedValuesAreMet() {
        assertPrints("0.3825", BinomialTail.twoSided(682, 925, new BigDecimal("0.75")));
        assertClose(new BigDecimal("0.184061069106391"), BinomialTail.atLeast(3, 15, new BigDecimal("0.1")), "3 of 15");
        BigDecimal half = new BigDecimal("0.5");
        assertClose(Fractions.value("10/512"), BinomialTail.atLeast(8, 9, half), "8 of 9");
        assertClose(Fractions.value("20/512"), BinomialTail.twoSided(8, 9, half), "8 of 9");
        assertClose(Fractions.value("11/1024"), BinomialTail.atMost(1, 10, half), "1 of 10");
        assertClose(Fractions.value("22/1024"), BinomialTail.twoSided(1, 10, half), "1 of 10");
    }

    /** P(X ≥ k) computed with mpmath 1.3.0, 80 digits, from its log-gamma function. */
    @ParameterizedTest
    @CsvSource({
        "500000, 1000000, 0.5, 0.500398942180665875044543622798456497298880054",
        "501500, 1000000, 0.5, 0.00135432765302987840967714558411388841216824938",
        "600000, 1000000, 0.5, 4.42070512872045978594947826474554306228432143e-8748",
        "1000000, 1000000, 0.3, 1.79771011667574383803985164201795517554266854e-522879",
        "3, 1000000, 0.000001, 0.0803013051014495973801963528185539413763743062",
        "999990, 1000000, 0.99999, 0.583039750194028101355873316010642965403569637",
        "333000, 1000000, 0.3333333333333333333333333333333333333333, 0.760561110696896998856956074112841822885752572",
        "70, 140, 0.5, 0.53365662227431640228516853152772834645710399",
        "40, 60, 0.25, 0.0000000000130965715497467475615833628499587210330820653",
        "5001234, 10000000, 0.5, 0.217656033312820310028509285599160600028841059"
    })
    void largeCasesAreMet(long k, long n, BigDecimal p, BigDecimal expected) {
        assertRelative(expected, BinomialTail.atLeast(k, n, p), "1e-43");
        assertRelative(expected, BinomialTail.atMost(n - k, n, BigDecimal.ONE.subtract(p)), "1e-43");
    }

    /** The naive twin for large n: all terms relative to the greatest, summed to both sides of it. */
    @ParameterizedTest
    @CsvSource({"100000, 0.5", "100000, 0.2", "1000000, 0.0001", "1000000, 0.9", "20000, 0.6666666666666666666667"})
    void largeTailsAreSharesOfTheSumAroundTheMode(long n, BigDecimal p) {
        long mode = BigDecimal.valueOf(n + 1).multiply(p).longValue();
        long spread = BigDecimal.valueOf(n)
                .multiply(p)
                .multiply(BigDecimal.ONE.subtract(p))
                .sqrt(WORK)
                .longValue();
        for (long k : new long[] {mode - (4 * spread), mode - 1, mode, mode + 1, mode + spread, mode + (5 * spread)}) {
            assertNear(byTheMode(k, n, p, mode), BinomialTail.atLeast(k, n, p), "1e-44");
        }
    }

    private static BigDecimal byTheMode(long k, long n, BigDecimal p, long mode) {
        BigDecimal odds = p.divide(BigDecimal.ONE.subtract(p), WORK);
        BigDecimal least = new BigDecimal("1e-52");
        BigDecimal all = BigDecimal.ZERO;
        BigDecimal tail = BigDecimal.ZERO;
        BigDecimal term = BigDecimal.ONE;
        for (long j = mode; j <= n && term.compareTo(least) > 0; j++) {
            all = all.add(term, WORK);
            tail = j >= k ? tail.add(term, WORK) : tail;
            term = term.multiply(BigDecimal.valueOf(n - j).multiply(odds), WORK)
                    .divide(BigDecimal.valueOf(j + 1), WORK);
        }
        term = BigDecimal.ONE;
        for (long j = mode; j > 0 && term.compareTo(least) > 0; j--) {
            term = term.multiply(BigDecimal.valueOf(j))
                    .divide(BigDecimal.valueOf(n - j + 1).multiply(odds), WORK);
            all = all.add(term, WORK);
            tail = j - 1 >= k ? tail.add(term, WORK) : tail;
        }
        return tail.divide(all, WORK);
    }

    /** p^n for all, 1 − q^n for any. */
    @ParameterizedTest
    @CsvSource({"1, 0.3", "63, 0.5", "1000, 0.999", "1000000, 0.999999", "1000000, 0.000001"})
    void allAndAnyHaveTheirClosedForms(int n, BigDecimal p) {
        BigDecimal q = BigDecimal.ONE.subtract(p);
        assertRelative(p.pow(n, WORK), BinomialTail.atLeast(n, n, p), "1e-48");
        assertNear(BigDecimal.ONE.subtract(q.pow(n, WORK), WORK), BinomialTail.atLeast(1, n, p), "1e-48");
        assertRelative(q.pow(n, WORK), BinomialTail.atMost(0, n, p), "1e-48");
    }

    @Test
    void aTailFallsWithKAndRisesWithP() {
        RandomStream stream = Streams.named("binomial tails");
        for (int i = 0; i < 200; i++) {
            long n = 1 + stream.below(5_000);
            long k = stream.below(n + 1);
            BigDecimal p = BigDecimal.valueOf(1 + stream.below(999), 3);
            BigDecimal tail = BinomialTail.atLeast(k, n, p);
            String where = k + " of " + n + " at " + p;
            // With 50 digits a tail may be 1 although it is a little less.
            assertTrue(BinomialTail.atLeast(k + 1, n, p).compareTo(tail) < 0 || tail.compareTo(NEARLY_ONE) > 0, where);
            assertTrue(
                    BinomialTail.atLeast(k, n, p.subtract(new BigDecimal("0.0005")))
                                    .compareTo(tail)
                            <= 0,
                    where);
            assertNear(BigDecimal.ONE, tail.add(BinomialTail.atMost(k - 1, n, p)), "1e-48");
        }
    }

    /** The definition again, at a size where Stirling's formula serves: every probability is compared. */
    @ParameterizedTest
    @CsvSource({"400, 0.5", "401, 0.5", "399, 0.25", "500, 0.9", "300, 0.3333333333333333333333333333333333333333"})
    void bothSidesTogetherAreTheProbabilitiesNotAboveTheObservedOne(int n, BigDecimal p) {
        List<BigDecimal> law = exactLaw(n, p);
        for (int k = 0; k <= n; k++) {
            BigDecimal bar = law.get(k).multiply(new BigDecimal("1.00000000000000000001"));
            BigDecimal sum = law.stream().filter(t -> t.compareTo(bar) <= 0).reduce(BigDecimal.ZERO, BigDecimal::add);
            assertRelative(sum, BinomialTail.twoSided(k, n, p), "1e-44");
        }
    }

    /** With p = 1/2 both tails are alike, at any size; the counts n/2 on an even n have p = 1. */
    @Test
    void atOneHalfTheTwoSidesAreAlike() {
        BigDecimal half = new BigDecimal("0.5");
        BigDecimal tail = BinomialTail.atLeast(501_500, 1_000_000, half);
        assertRelative(tail.add(tail), BinomialTail.twoSided(501_500, 1_000_000, half), "1e-48");
        assertRelative(tail.add(tail), BinomialTail.twoSided(498_500, 1_000_000, half), "1e-48");
        assertEquals(BigDecimal.ONE, BinomialTail.twoSided(500_000, 1_000_000, half));
        assertEquals(BigDecimal.ONE, BinomialTail.twoSided(50, 101, half));
        assertEquals(BigDecimal.ONE, BinomialTail.twoSided(51, 101, half));
    }

    /** (n + 1) p is whole in 1/3 of 2: the counts 0 and 1 tie, though 50 digits of 1/3 fall short of it. */
    @Test
    void aRoundedFractionKeepsItsTies() {
        BigDecimal third = Decimals.quotient(1, 3);
        assertEquals(BigDecimal.ONE, BinomialTail.twoSided(0, 2, third));
        assertEquals(BigDecimal.ONE, BinomialTail.twoSided(1, 2, third));
        assertNear(Decimals.quotient(1, 9), BinomialTail.twoSided(2, 2, third), "1e-48");
        // At n = 5: 32, 80, 80, 40, 10, 1 of 243.
        assertNear(Decimals.quotient(83, 243), BinomialTail.twoSided(3, 5, third), "1e-48");
    }

    @Test
    void certaintyIsExact() {
        for (long k = -1; k <= 4; k++) {
            assertEquals(k <= 0 ? BigDecimal.ONE : BigDecimal.ZERO, BinomialTail.atLeast(k, 3, BigDecimal.ZERO));
            assertEquals(k <= 3 ? BigDecimal.ONE : BigDecimal.ZERO, BinomialTail.atLeast(k, 3, BigDecimal.ONE));
            assertEquals(k >= 0 ? BigDecimal.ONE : BigDecimal.ZERO, BinomialTail.atMost(k, 3, BigDecimal.ZERO));
            assertEquals(k >= 3 ? BigDecimal.ONE : BigDecimal.ZERO, BinomialTail.atMost(k, 3, BigDecimal.ONE));
        }
        assertEquals(BigDecimal.ONE, BinomialTail.twoSided(3, 3, BigDecimal.ONE));
        assertEquals(BigDecimal.ZERO, BinomialTail.twoSided(2, 3, BigDecimal.ONE));
        assertEquals(BigDecimal.ZERO, BinomialTail.twoSided(1, 3, new BigDecimal("0.000")));
        assertEquals(BigDecimal.ONE, BinomialTail.atLeast(0, 0, new BigDecimal("0.5")));
        assertEquals(BigDecimal.ZERO, BinomialTail.atLeast(1, 0, new BigDecimal("0.5")));
    }

    /** Some hundredths of a second; the bound is far above, and there to catch a walk over all counts. */
    @Test
    void tenMillionTrialsTakeNoTime() {
        BigDecimal p = Decimals.quotient(1, 3);
        assertTimeout(Duration.ofSeconds(8), () -> BinomialTail.twoSided(3_334_000, 10_000_000, p));
    }

    @Test
    void whatIsNoTestIsRefused() {
        BigDecimal half = new BigDecimal("0.5");
        assertThrows(IllegalArgumentException.class, () -> BinomialTail.atLeast(1, -1, half));
        assertThrows(IllegalArgumentException.class, () -> BinomialTail.atLeast(1, 10_000_001, half));
        assertThrows(IllegalArgumentException.class, () -> BinomialTail.atMost(1, 2, new BigDecimal("-0.1")));
        assertThrows(IllegalArgumentException.class, () -> BinomialTail.atMost(1, 2, new BigDecimal("1.1")));
        assertThrows(IllegalArgumentException.class, () -> BinomialTail.atMost(1, 2, new BigDecimal("1e-101")));
        assertThrows(IllegalArgumentException.class, () -> BinomialTail.twoSided(3, 2, half));
        assertThrows(IllegalArgumentException.class, () -> BinomialTail.twoSided(-1, 2, half));
    }

    private static void assertClose(BigDecimal expected, BigDecimal value, String where) {
        BigDecimal error = expected.subtract(value).abs();
        assertTrue(error.compareTo(new BigDecimal("1e-45")) <= 0, () -> where + ": " + value + ", not " + expected);
    }

    private static void assertNear(BigDecimal expected, BigDecimal value, String bound) {
        BigDecimal error = expected.subtract(value).abs();
        assertTrue(error.compareTo(new BigDecimal(bound)) <= 0, () -> value + ", not " + expected);
    }

    private static void assertRelative(BigDecimal expected, BigDecimal value, String bound) {
        BigDecimal error = expected.subtract(value).abs();
        assertTrue(error.compareTo(expected.multiply(new BigDecimal(bound))) <= 0, () -> value + ", not " + expected);
    }
}
