package org.notchwork.figure;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;
import static org.notchwork.support.CheckValues.assertPrints;

import java.io.IOException;
import java.math.BigDecimal;
import java.math.BigInteger;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.SortedMap;
import java.util.TreeMap;
import java.util.concurrent.atomic.AtomicLong;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.exact.Decimals;
import org.notchwork.support.CheckValues;
import org.notchwork.support.Fractions;
import tools.jackson.databind.JsonNode;

class GoodnessOfFitTest {

    /** Mendel's 9:3:3:1, and the documented examples with six classes. */
    @Test
    void theExamplesOfTheCheckValuesAreMet() throws IOException {
        JsonNode rows = CheckValues.section("L").required("chi2");
        for (JsonNode row : rows) {
            List<Long> observed = longs(row.required("observed"));
            GoodnessOfFit fit = GoodnessOfFit.of(counts(observed), sum(observed), classes(weights(row, observed)))
                    .orElseThrow();
            assertEquals(row.required("df").asInt(), fit.degrees());
            assertEquals(places(Fractions.value(row.required("stat").asString())), fit.statistic());
            assertPrints(row.required("p").asString(), fit.p());
            assertEquals(OptionalLong.empty(), fit.impossible());
        }
        assertEquals(3, rows.size());
    }

    private static List<Long> weights(JsonNode row, List<Long> observed) {
        if (row.has("expected_ratio")) {
            return longs(row.required("expected_ratio"));
        }
        return row.required("expected").isArray()
                ? longs(row.required("expected"))
                : observed.stream().map(count -> 1L).toList();
    }

    /** By hand: a die, 60 throws, 10 expected each; (25 + 4 + 1 + 1 + 4 + 25) / 10 = 6. */
    @Test
    void aDieIsTestedByHand() {
        List<Long> observed = List.of(5L, 8L, 9L, 11L, 12L, 15L);
        GoodnessOfFit fit = GoodnessOfFit.of(counts(observed), 60, classes(List.of(1L, 1L, 1L, 1L, 1L, 1L)))
                .orElseThrow();
        assertEquals(places(BigDecimal.valueOf(6)), fit.statistic());
        assertEquals(5, fit.degrees());
        assertEquals(
                List.of(0L, 2L, 3L, 4L, 5L, 6L),
                fit.bins().stream().map(Bin::least).toList());
        assertEquals(Long.MAX_VALUE, fit.bins().get(5).greatest());
        assertEquals(ChiSquared.pValue(BigDecimal.valueOf(6), 5), fit.p());
    }

    /** Thirds and sixths are rounded, yet 5 expected are 5, and no difference is none. */
    @ParameterizedTest
    @ValueSource(longs = {2, 3, 6, 7, 8, 10, 97})
    void perfectCountsFitPerfectly(long faces) {
        List<Long> observed = new ArrayList<>();
        List<Long> weights = new ArrayList<>();
        for (long face = 0; face < faces; face++) {
            observed.add(5L);
            weights.add(1L);
        }
        GoodnessOfFit fit =
                GoodnessOfFit.of(counts(observed), 5 * faces, classes(weights)).orElseThrow();
        assertEquals(faces - 1, fit.degrees());
        assertEquals(0, fit.statistic().signum());
        assertEquals(BigDecimal.ONE, fit.p());
    }

    /** By hand: 8 expect 4 each of 2 classes; 20 of weights 4, 1, 4, 1 pool 8, 2 + 8, 2 into 8 and 12. */
    @Test
    void classesArePooledUntilTheyExpectFive() {
        assertEquals(Optional.empty(), GoodnessOfFit.of(counts(List.of(8L, 0L)), 8, classes(List.of(1L, 1L))));
        GoodnessOfFit fit = GoodnessOfFit.of(counts(List.of(11L, 3L, 3L, 3L)), 20, classes(List.of(4L, 1L, 4L, 1L)))
                .orElseThrow();
        assertEquals(2, fit.bins().size());
        assertEquals(1, fit.bins().get(0).greatest());
        assertPrints("12", fit.bins().get(1).expected());
        assertEquals(places(Decimals.quotient(15, 8)), fit.statistic());
    }

    @Test
    void oneBinIsNoTest() {
        assertEquals(Optional.empty(), GoodnessOfFit.of(counts(List.of(4L)), 4, classes(List.of(1L))));
        assertEquals(Optional.empty(), GoodnessOfFit.of(counts(List.of(400L)), 400, classes(List.of(1L))));
        assertEquals(Optional.empty(), GoodnessOfFit.of(counts(List.of(9L, 0L)), 9, classes(List.of(1L, 1L))));
    }

    @Test
    void anImpossibleObservationRefutesTheLaw() {
        Cumulative even = m -> m < 2 ? BigDecimal.ZERO : m < 4 ? new BigDecimal("0.5") : BigDecimal.ONE;
        for (long stranger : new long[] {0, 1, 3, 5, 1L << 41, Long.MAX_VALUE}) {
            TreeMap<Long, Long> observed = new TreeMap<>(pairs(2, 500, 4, 499));
            observed.put(stranger, 1L);
            GoodnessOfFit fit = GoodnessOfFit.of(observed, 1000, even).orElseThrow();
            assertEquals(BigDecimal.ZERO, fit.p());
            assertEquals(OptionalLong.of(stranger), fit.impossible());
            assertEquals(1, fit.degrees());
        }
        TreeMap<Long, Long> noStranger = new TreeMap<>(pairs(2, 500, 4, 500));
        noStranger.put(3L, 0L);
        assertEquals(
                BigDecimal.ONE,
                GoodnessOfFit.of(noStranger, 1000, even).orElseThrow().p());
    }

    /** Even where there is nothing else to test. */
    @Test
    void anImpossibleObservationIsToldOfOneBinToo() {
        Cumulative always7 = m -> m < 7 ? BigDecimal.ZERO : BigDecimal.ONE;
        assertEquals(Optional.empty(), GoodnessOfFit.of(pairs(7, 100), 100, always7));
        GoodnessOfFit fit = GoodnessOfFit.of(pairs(7, 99, 8, 1), 100, always7).orElseThrow();
        assertEquals(BigDecimal.ZERO, fit.p());
        assertEquals(OptionalLong.of(8), fit.impossible());
        assertEquals(0, fit.degrees());
    }

    /** P(X ≤ m) = 1 − 2^−(m+1): of 640, 320, 160, … 5 are expected at 0, 1, …, and 5 beyond 6. */
    @Test
    void aLawWithoutEndHasALastBin() {
        Cumulative halves = m -> BigDecimal.ONE.subtract(BigDecimal.ONE.divide(
                BigDecimal.valueOf(2).pow((int) Math.min(m + 1, 400)), Decimals.CONTEXT));
        TreeMap<Long, Long> observed = new TreeMap<>();
        for (long m = 0; m < 7; m++) {
            observed.put(m, 320L >> m);
        }
        observed.put(9L, 2L);
        observed.put(100L, 3L);
        GoodnessOfFit fit = GoodnessOfFit.of(observed, 640, halves).orElseThrow();
        assertEquals(8, fit.bins().size());
        assertEquals(7, fit.bins().get(7).least());
        assertEquals(0, fit.statistic().signum());
    }

    /** A law that comes near 1 but never so near that its rest could be dropped: the rest is a bin. */
    @Test
    void aRestThatNoEdgeReachesIsTheLastBin() {
        Cumulative defect = m -> m == 0 ? new BigDecimal("0.4") : new BigDecimal("0.5");
        List<Bin> bins = Binning.of(defect, 100);
        assertEquals(List.of(0L, 1L, 2L), bins.stream().map(Bin::least).toList());
        assertPrints("50", bins.get(2).expected());
        assertEquals(1, Binning.of(m -> BigDecimal.ZERO, 100).size());
    }

    /** A million even observations over 2^40 values: 200 bins of 5000, each found in some 2 · 33 questions. */
    @Test
    void wideSupportsNeedFewQuestionsAndFewBins() {
        BigDecimal size = new BigDecimal(BigInteger.ONE.shiftLeft(40));
        AtomicLong questions = new AtomicLong();
        Cumulative even = m -> {
            questions.incrementAndGet();
            return BigDecimal.valueOf(m + 1).divide(size, Decimals.CONTEXT).min(BigDecimal.ONE);
        };
        List<Bin> bins = Binning.of(even, 1_000_000);
        assertTrue(bins.size() >= 199 && bins.size() <= 200, bins::toString);
        assertTrue(questions.get() <= 200 * 42L, questions::toString);
        BigDecimal all = bins.stream().map(Bin::expected).reduce(BigDecimal.ZERO, BigDecimal::add);
        assertEquals(0, all.compareTo(BigDecimal.valueOf(1_000_000)));
        long edge = 0;
        for (Bin bin : bins) {
            assertEquals(edge, bin.least());
            assertTrue(bin.expected().compareTo(BigDecimal.valueOf(5000)) >= 0);
            boolean last = bin.greatest() == Long.MAX_VALUE;
            assertTrue(last || bin.expected().compareTo(new BigDecimal("5000.1")) < 0);
            edge = last ? 0 : bin.greatest() + 1;
        }
    }

    /** The naive twin: values are taken one by one. */
    @Test
    void edgesAreThoseOfAWalkOverAllValues() {
        List<Long> weights = new ArrayList<>();
        for (long i = 0; i < 300; i++) {
            weights.add((i * i * 37) % 11);
        }
        Cumulative law = classes(weights);
        for (long size : new long[] {5, 10, 11, 60, 100, 999, 5_000, 100_000}) {
            assertEquals(
                    walk(law, size, 300),
                    Binning.of(law, size).stream().map(Bin::least).toList(),
                    "N = " + size);
        }
    }

    private static List<Long> walk(Cumulative law, long size, long last) {
        BigDecimal n = BigDecimal.valueOf(size);
        BigDecimal enough =
                BigDecimal.valueOf(5).max(n.divide(BigDecimal.valueOf(200))).subtract(new BigDecimal("1e-25"));
        List<Long> starts = new ArrayList<>(List.of(0L));
        BigDecimal below = BigDecimal.ZERO;
        for (long m = 0; m <= last; m++) {
            BigDecimal upTo = law.atMost(m);
            boolean full = upTo.subtract(below).multiply(n).compareTo(enough) >= 0;
            boolean restFull = BigDecimal.ONE.subtract(upTo).multiply(n).compareTo(enough) >= 0;
            if (full && restFull) {
                starts.add(m + 1);
                below = upTo;
            }
        }
        return starts;
    }

    @Test
    void whatIsNoSampleIsRefused() {
        Cumulative law = classes(List.of(1L, 1L));
        assertThrows(IllegalArgumentException.class, () -> GoodnessOfFit.of(pairs(1, 4), 5, law));
        assertThrows(IllegalArgumentException.class, () -> GoodnessOfFit.of(pairs(-1, 5), 5, law));
        assertThrows(IllegalArgumentException.class, () -> GoodnessOfFit.of(pairs(1, 6, 2, -1), 5, law));
        assertThrows(IllegalArgumentException.class, () -> GoodnessOfFit.of(new TreeMap<>(), 0, law));
    }

    private static BigDecimal places(BigDecimal value) {
        return value.setScale(30, RoundingMode.HALF_EVEN);
    }

    /** The law on 1, 2, … with these weights. */
    private static Cumulative classes(List<Long> weights) {
        return m -> Decimals.quotient(sum(weights.subList(0, (int) Math.min(m, weights.size()))), sum(weights));
    }

    /** Counts of the values 1, 2, …. */
    private static SortedMap<Long, Long> counts(List<Long> observed) {
        TreeMap<Long, Long> counts = new TreeMap<>();
        for (int i = 0; i < observed.size(); i++) {
            counts.put(i + 1L, observed.get(i));
        }
        return counts;
    }

    private static long sum(List<Long> numbers) {
        return numbers.stream().mapToLong(Long::longValue).sum();
    }

    private static List<Long> longs(JsonNode array) {
        List<Long> all = new ArrayList<>();
        array.forEach(node -> all.add(node.asLong()));
        return all;
    }

    private static SortedMap<Long, Long> pairs(long... valuesAndCounts) {
        TreeMap<Long, Long> map = new TreeMap<>();
        for (int i = 0; i < valuesAndCounts.length; i += 2) {
            map.put(valuesAndCounts[i], valuesAndCounts[i + 1]);
        }
        return map;
    }
}
