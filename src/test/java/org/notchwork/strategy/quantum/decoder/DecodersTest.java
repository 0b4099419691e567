package org.notchwork.strategy.quantum.decoder;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.notchwork.engine.Noise;
import org.notchwork.engine.NoisySimulation;
import org.notchwork.engine.Outcomes;
import org.notchwork.engine.Simulation;
import org.notchwork.seed.RandomStream;
import org.notchwork.support.CheckValues;
import org.notchwork.support.ChiSquared;
import org.notchwork.support.Sample;
import org.notchwork.support.Streams;
import tools.jackson.databind.JsonNode;

/** Check values, section K. */
class DecodersTest {

    /** Flip probability and number of words: from too few to enough. */
    private static final Set<String> SETTINGS = Set.of("0.02 7", "0.02 16", "0.02 25", "0.05 16", "0.05 35", "0.05 55");

    /** Weight 4 of 8 bits. */
    private static final long SECRET = 0b01101001;

    private static Noise flip(String p) {
        return new Noise(new BigDecimal(p), BigDecimal.ZERO);
    }

    /** Uniform among the words orthogonal to the secret, by drawing again. */
    private static final class Orthogonal implements Simulation {

        private final int width;
        private final long secret;

        Orthogonal(int width, long secret) {
            this.width = width;
            this.secret = secret;
        }

        @Override
        public long fourierSample(RandomStream stream) {
            long y = stream.bits(width);
            while ((Long.bitCount(y & secret) & 1) == 1) {
                y = stream.bits(width);
            }
            return y;
        }

        @Override
        public Outcomes outcomes() {
            throw new UnsupportedOperationException();
        }
    }

    private static long[] words(int width, long secret, int m, Noise noise, RandomStream stream) {
        Simulation noisy = new NoisySimulation(new Orthogonal(width, secret), width, noise);
        long[] words = new long[m];
        for (int i = 0; i < m; i++) {
            words[i] = noisy.fourierSample(stream);
        }
        return words;
    }

    static Stream<JsonNode> simulated() throws Exception {
        List<JsonNode> rows = new ArrayList<>();
        for (JsonNode row : CheckValues.section("K").required("mc")) {
            String setting =
                    row.required("p").asString() + " " + row.required("m").asInt();
            if (row.required("n").asInt() == 8 && SETTINGS.contains(setting)) {
                rows.add(row);
            }
        }
        assertEquals(SETTINGS.size(), rows.size());
        return rows.stream();
    }

    /** Within 4 standard errors of both simulations. */
    @ParameterizedTest
    @MethodSource("simulated")
    void likelihoodSucceedsAsOftenAsSimulatedElsewhere(JsonNode row) {
        Noise noise = flip(row.required("p").asString());
        int m = row.required("m").asInt();
        Sample right = new Sample();
        for (long number = 0; number < 4000; number++) {
            RandomStream stream =
                    Streams.numbered("likelihood " + row.required("p").asString() + " " + m, number);
            Optional<Long> named = new Likelihood(noise).decode(8, words(8, SECRET, m, noise, stream), stream);
            right.add(named.orElseThrow() == SECRET);
        }
        right.assertMean(
                Double.parseDouble(row.required("success_ml").asString()),
                Double.parseDouble(row.required("se").asString()),
                4);
    }

    /** P(y) = 2^−n (1 + δ (−1)^(s·y)) with δ = (1 − q)(1 − 2p)^weight(s). */
    @ParameterizedTest
    @CsvSource({"0.1, 0, 5", "0.02, 0, 7", "0, 0.25, 5", "0.05, 0.1, 6"})
    void disturbedWordsFollowTheirLaw(BigDecimal p, BigDecimal q, long secret) {
        Noise noise = new Noise(p, q);
        RandomStream stream = Streams.named("law " + p + " " + q);
        long[] counts = new long[8];
        for (long word : words(3, secret, 40_000, noise, stream)) {
            counts[(int) word]++;
        }
        double delta = (1 - q.doubleValue()) * Math.pow(1 - 2 * p.doubleValue(), Long.bitCount(secret));
        double[] weights = new double[8];
        for (int y = 0; y < 8; y++) {
            weights[y] = 1 + delta * (1 - 2 * (Long.bitCount(secret & y) & 1));
        }
        ChiSquared.of(counts, weights).assertFits();
    }

    /** The score of every candidate from the definition, in floating point; the winner must be among the best. */
    @Test
    void theMostLikelyCandidateIsNamed() {
        Noise noise = new Noise(new BigDecimal("0.03"), new BigDecimal("0.1"));
        for (long number = 0; number < 200; number++) {
            RandomStream stream = Streams.numbered("most likely", number);
            long[] words = words(6, 0b101100, 15, noise, stream);
            double best = Double.NEGATIVE_INFINITY;
            for (long t = 1; t < 64; t++) {
                best = Math.max(best, logLikelihood(words, t, noise));
            }
            long named = new Likelihood(noise).decode(6, words, stream).orElseThrow();
            assertEquals(best, logLikelihood(words, named, noise), 1e-9);
        }
    }

    private static double logLikelihood(long[] words, long t, Noise noise) {
        double delta = (1 - noise.uniformMix().doubleValue())
                * Math.pow(1 - 2 * noise.readoutFlip().doubleValue(), Long.bitCount(t));
        double sum = 0;
        for (long word : words) {
            sum += Math.log(1 + delta * (1 - 2 * (Long.bitCount(word & t) & 1)));
        }
        return sum;
    }

    /** Without noise all candidates orthogonal to every word are equally likely, and each is named as often. */
    @Test
    void tiesAreBrokenEvenly() {
        long[] words = {0b0001, 0b0010};
        long[] counts = new long[4];
        for (long number = 0; number < 4000; number++) {
            long named = new Likelihood(Noise.NONE)
                    .decode(4, words, Streams.numbered("ties", number))
                    .orElseThrow();
            assertEquals(0, named & 3);
            counts[(int) (named >>> 2)]++;
        }
        assertEquals(0, counts[0]);
        ChiSquared.of(counts, new double[] {0, 1, 1, 1}).assertFits();
    }

    /** One draw of n − 1 words names the secret with probability (1 − τ)^(n−1) ∏ (1 − 2^−i). */
    @ParameterizedTest
    @CsvSource({"8, 0.02", "8, 0.05"})
    void oneDrawNamesTheSecretAsOftenAsTheTableSays(int width, String p) throws Exception {
        Sample right = new Sample();
        for (long number = 0; number < 30_000; number++) {
            RandomStream stream = Streams.numbered("pooled " + p, number);
            long[] words = words(width, SECRET, width - 1, flip(p), stream);
            right.add(new PooledElimination(1)
                    .decode(width, words, stream)
                    .filter(t -> t == SECRET)
                    .isPresent());
        }
        for (JsonNode row : CheckValues.section("K").required("pooled_mc")) {
            if (row.required("n").asInt() == width
                    && row.required("p").asString().equals(p)) {
                right.assertRate(Double.parseDouble(row.required("formula").asString()), 5);
                return;
            }
        }
        throw new AssertionError("no row");
    }

    /** With many draws it does about as well as the most likely candidate, and without noise as well as elimination. */
    @Test
    void manyDrawsFindTheSecretInNoise() {
        Sample pooled = new Sample();
        Sample likely = new Sample();
        Noise noise = flip("0.02");
        for (long number = 0; number < 800; number++) {
            RandomStream stream = Streams.numbered("many draws", number);
            long[] words = words(8, SECRET, 25, noise, stream);
            pooled.add(new PooledElimination(200)
                    .decode(8, words, stream)
                    .filter(t -> t == SECRET)
                    .isPresent());
            likely.add(new Likelihood(noise).decode(8, words, stream).orElseThrow() == SECRET);
        }
        // Its score is the peak of the transform: 0.979 in the table, and the draws miss it rarely.
        pooled.assertMean(0.979, 0.0023, 5);
        assertTrue(Math.abs(pooled.mean() - likely.mean()) < 0.03, pooled.mean() + " and " + likely.mean());
    }

    @Test
    void withoutNoisePooledEliminationNamesWhatEliminationNames() {
        for (long number = 0; number < 500; number++) {
            RandomStream stream = Streams.numbered("without noise", number);
            long[] words = words(6, 0b110101, 9, Noise.NONE, stream);
            Optional<Long> plain = new Elimination().decode(6, words, stream);
            Optional<Long> pooled = new PooledElimination(400).decode(6, words, stream);
            plain.ifPresent(t -> assertEquals(0b110101, t.longValue()));
            assertEquals(plain, pooled);
        }
    }

    @Test
    void tooFewOrDependentWordsNameNothing() {
        RandomStream stream = Streams.named("too few");
        assertEquals(Optional.empty(), new PooledElimination(50).decode(4, new long[] {1, 2}, stream));
        assertEquals(Optional.empty(), new PooledElimination(50).decode(4, new long[] {1, 2, 3}, stream));
        assertEquals(Optional.of(8L), new PooledElimination(50).decode(4, new long[] {1, 2, 4}, stream));
        assertEquals(Optional.empty(), new Elimination().decode(4, new long[] {1, 2, 3}, stream));
        assertEquals(Optional.empty(), new Elimination().decode(4, new long[] {1, 2, 4, 8}, stream));
        assertEquals(Optional.of(8L), new Elimination().decode(4, new long[] {1, 2, 4, 7}, stream));
    }

    @Test
    void theDecodersHaveTheirNamesAndReach() {
        Set<String> names = new HashSet<>();
        for (Decoder decoder : List.of(new Elimination(), new Likelihood(Noise.NONE), new PooledElimination(1))) {
            names.add(decoder.name() + " " + decoder.greatestWidth());
        }
        assertEquals(Set.of("elimination 63", "likelihood 20", "pooled-elimination 63"), names);
    }
}
