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
import org.notchwork.seed.RandomStream;
import org.notchwork.strategy.Answering;
import org.notchwork.strategy.Attempt;
import org.notchwork.strategy.ClassicalStrategy;
import org.notchwork.strategy.Usage;

/**
 * Walks x → f(x) from random starts to points whose lowest bits are 0, and keeps start, end and length of each trail in
 * bounded memory. Two trails with one end meet where two different points have one value; walking both again, the longer
 * one ahead until both are equally far from the end, finds them. Those evaluations count as well.
 *
 * <p>A trail goes to slot end mod (number of slots) and replaces what is there. A trail longer than 20 · 2^bits is given
 * up, for it may have come round.
 *
 * @param bits how many lowest bits of an end are 0
 * @param trails how many trails are kept
 * @see "P. C. van Oorschot, M. J. Wiener, Parallel collision search with cryptanalytic applications, J. Cryptology 12 (1999)"
 */
public record DistinguishedPoints(int bits, int trails) implements ClassicalStrategy {

    /** The name in study files. */
    static final String NAME = "distinguished-points";

    private static final int PATIENCE = 20;
    private static final int WORDS_A_TRAIL = 3;

    @Override
    public String name() {
        return NAME;
    }

    @Override
    public JsonObject settings() {
        return JsonObject.builder()
                .put("distinguished-bits", bits)
                .put("stored-trails", trails)
                .build();
    }

    @Override
    public String description() {
        return "walks from random starts to points whose " + bits + " lowest bits are 0, keeps " + trails
                + " trails, and walks two with one end again to the point where they meet";
    }

    @Override
    public Optional<String> refusal(Problem problem, int width) {
        return Answering.exactly(NAME, problem, Set.of(Question.PERIOD))
                .or(() -> PeriodByCollision.tooWide(NAME, width))
                .or(() -> bits < width
                        ? Optional.empty()
                        : Optional.of("at width " + width + " no more than one point has " + bits + " lowest bits 0"));
    }

    @Override
    public boolean deterministic() {
        return false;
    }

    @Override
    public long memoryBytes(int width, long queryLimit) {
        return 8L * WORDS_A_TRAIL * trails;
    }

    @Override
    public Attempt attempt(Oracle oracle, RandomStream stream) {
        return new Search(oracle, stream).run();
    }

    private final class Search {

        private final Oracle oracle;
        private final RandomStream stream;
        private final long mask = (1L << bits) - 1;
        private final long[] starts = new long[trails];
        private final long[] ends = new long[trails];
        /** The length of the trail in each slot; 0 marks a free one. */
        private final long[] lengths = new long[trails];

        private final Usage usage = new Usage(0, (long) WORDS_A_TRAIL * trails);

        Search(Oracle oracle, RandomStream stream) {
            this.oracle = oracle;
            this.stream = stream;
        }

        Attempt run() {
            while (true) {
                long start = stream.bits(oracle.width());
                long end = start;
                long length = 0;
                while (length == 0 || ((end & mask) != 0 && length < (long) PATIENCE << bits)) {
                    if (oracle.remaining() == 0) {
                        return new Attempt.Censored(usage);
                    }
                    end = oracle.query(end);
                    length++;
                }
                if ((end & mask) != 0) {
                    continue;
                }
                int slot = (int) ((end >>> bits) % trails);
                if (lengths[slot] > 0 && ends[slot] == end) {
                    Optional<Attempt> met = meet(starts[slot], lengths[slot], start, length);
                    if (met.isPresent()) {
                        return met.get();
                    }
                }
                starts[slot] = start;
                ends[slot] = end;
                lengths[slot] = length;
            }
        }

        /** Returns what two trails with one end give; empty if one of them is a part of the other. */
        private Optional<Attempt> meet(long a, long lengthA, long b, long lengthB) {
            long ahead = lengthA >= lengthB ? a : b;
            long behind = lengthA >= lengthB ? b : a;
            for (long i = Math.abs(lengthA - lengthB); i > 0; i--) {
                if (oracle.remaining() == 0) {
                    return Optional.of(new Attempt.Censored(usage));
                }
                ahead = oracle.query(ahead);
            }
            while (ahead != behind) {
                if (oracle.remaining() < 2) {
                    return Optional.of(new Attempt.Censored(usage));
                }
                long next = oracle.query(ahead);
                long beside = oracle.query(behind);
                if (next == beside) {
                    return Optional.of(found(ahead, behind, next));
                }
                ahead = next;
                behind = beside;
            }
            return Optional.empty();
        }

        private Attempt found(long x, long y, long value) {
            int width = oracle.width();
            Word shared = Word.of(width, value);
            Pair pair = new Pair(Word.of(width, x), Word.of(width, y), shared, shared);
            return new Attempt.Answered(
                    new Answer.Period(pair.x().xor(pair.y())), new Certificate.Collision(pair), usage);
        }
    }
}
