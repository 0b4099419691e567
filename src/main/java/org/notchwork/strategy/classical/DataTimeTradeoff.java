package org.notchwork.strategy.classical;

import java.util.Optional;
import java.util.Set;
import org.notchwork.bits.Word;
import org.notchwork.json.JsonObject;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Certificate;
import org.notchwork.problem.Oracle;
import org.notchwork.problem.Pair;
import org.notchwork.problem.Problem;
import org.notchwork.problem.Question;
import org.notchwork.problem.cipher.EvenMansour;
import org.notchwork.seed.RandomStream;
import org.notchwork.strategy.Answering;
import org.notchwork.strategy.Attempt;
import org.notchwork.strategy.ClassicalStrategy;
import org.notchwork.strategy.Usage;

/**
 * Finds the key of the toy E(x) = P(x ⊕ k₁) ⊕ k₂ from pairs of chosen plaintexts with the difference 1: the sum
 * E(x) ⊕ E(x ⊕ 1) = P(x ⊕ k₁) ⊕ P(x ⊕ 1 ⊕ k₁) does not depend on k₂, so that equal sums of the cipher at x and of the
 * permutation at y suggest k₁ = x ⊕ y or x ⊕ y ⊕ 1. With D pairs about 2^n/D points y are needed: data × time = 2^n.
 *
 * <p>D = 2^d pairs: x is {@code 2 bits(n − 1)}, drawn again while it has been asked before. Then y = {@code bits(n)} until
 * a candidate holds: the sums E(x) ⊕ P(x ⊕ k) of three plaintexts, the one that suggested it and two others, are the
 * same, so that it costs up to three evaluations of the permutation.
 *
 * @param dataBits d; absent for ⌊n/2⌋
 * @see "J. Daemen, Limitations of the Even-Mansour construction, Asiacrypt 1991; O. Dunkelman, N. Keller, A. Shamir,
 *     J. Cryptology (2015), for data × time = 2^n"
 */
public record DataTimeTradeoff(Optional<Integer> dataBits) implements ClassicalStrategy {

    /** The name in study files. */
    static final String NAME = "data-time-tradeoff";

    private static final int MOST_DATA_BITS = 22;

    @Override
    public String name() {
        return NAME;
    }

    @Override
    public JsonObject settings() {
        JsonObject.Builder json = JsonObject.builder();
        dataBits.ifPresent(d -> json.put("data-bits", d));
        return json.build();
    }

    @Override
    public String description() {
        return "matches sums of the cipher at 2^"
                + dataBits.map(d -> Integer.toString(d)).orElse("floor(n/2)")
                + " pairs of plaintexts with sums of the permutation at random points; data times time is 2^n";
    }

    @Override
    public Optional<String> refusal(Problem problem, int width) {
        return Answering.only(NAME, problem, Set.of(Question.PERIOD))
                .or(() -> problem.functions().contains(EvenMansour.CIPHER)
                        ? Optional.empty()
                        : Optional.of(
                                NAME + " calls a cipher and its permutation, and " + problem.kind() + " has none"))
                .or(() -> dataBits.filter(d -> d > width - 2).isEmpty()
                        ? Optional.empty()
                        : Optional.of(NAME + " asks 2^" + dataBits.get() + " pairs, and width " + width
                                + " allows data-bits of at most " + (width - 2)));
    }

    @Override
    public boolean deterministic() {
        return false;
    }

    @Override
    public boolean mayErr() {
        return true;
    }

    @Override
    public long memoryBytes(int width, long queryLimit) {
        return 4 * SeenValues.bytes(1L << Math.min(MOST_DATA_BITS, dataBits.orElse(width / 2)));
    }

    @Override
    public Attempt attempt(Oracle oracle, RandomStream stream) {
        return new Search(oracle, stream, dataBits.orElse(Math.max(1, oracle.width() / 2))).run();
    }

    private static final class Search {

        private final Oracle oracle;
        private final Oracle cipher;
        private final Oracle permutation;
        private final RandomStream stream;
        private final int width;
        private final long pairs;
        private final SeenValues sums = new SeenValues();
        private final SeenValues asked = new SeenValues();
        private final long[] plain;
        private final long[] encrypted;
        private boolean cut;

        Search(Oracle oracle, RandomStream stream, int dataBits) {
            this.oracle = oracle;
            this.cipher = oracle.part(EvenMansour.CIPHER);
            this.permutation = oracle.part(EvenMansour.PERMUTATION);
            this.stream = stream;
            this.width = oracle.width();
            this.pairs = 1L << dataBits;
            this.plain = new long[1 << dataBits];
            this.encrypted = new long[1 << dataBits];
        }

        Attempt run() {
            for (int i = 0; i < pairs; i++) {
                if (cipher.remaining() < 2) {
                    return censored();
                }
                plain[i] = fresh();
                encrypted[i] = cipher.query(plain[i]);
                sums.noteOrFind(encrypted[i] ^ cipher.query(plain[i] ^ 1), i);
            }
            while (!cut && permutation.remaining() >= 2) {
                long y = stream.bits(width);
                long sum = permutation.query(y) ^ permutation.query(y ^ 1);
                long index = sums.find(sum);
                if (index != SeenValues.NONE) {
                    Optional<Attempt> found = tried(plain[(int) index] ^ y, (int) index)
                            .or(() -> tried(plain[(int) index] ^ y ^ 1, (int) index));
                    if (found.isPresent()) {
                        return found.get();
                    }
                }
            }
            return censored();
        }

        private long fresh() {
            while (true) {
                long x = stream.bits(width - 1) << 1;
                if (asked.noteOrFind(x, x) == SeenValues.NONE) {
                    return x;
                }
            }
        }

        private Optional<Attempt> tried(long key, int index) {
            if (key == 0 || cut) {
                return Optional.empty();
            }
            long second = 0;
            for (int i = 0; i < Math.min(3, pairs); i++) {
                if (permutation.remaining() == 0) {
                    cut = true;
                    return Optional.empty();
                }
                int at = (int) ((index + i) % pairs);
                long suggested = encrypted[at] ^ permutation.query(plain[at] ^ key);
                if (i > 0 && suggested != second) {
                    return Optional.empty();
                }
                second = suggested;
            }
            return Optional.of(answered(key));
        }

        /** The certificate is on f = E ⊕ P, at 0 and the key: two calls of each function, counted apart. */
        private Attempt answered(long key) {
            if (oracle.remaining() < 2) {
                return censored();
            }
            Pair pair = new Pair(
                    Word.of(width, 0),
                    Word.of(width, key),
                    Word.of(width, oracle.confirm(0)),
                    Word.of(width, oracle.confirm(key)));
            return new Attempt.Answered(new Answer.Period(pair.y()), new Certificate.Collision(pair), usage());
        }

        private Attempt censored() {
            return new Attempt.Censored(usage());
        }

        private Usage usage() {
            return new Usage(0, sums.memoryWords() + 2L * plain.length);
        }
    }
}
