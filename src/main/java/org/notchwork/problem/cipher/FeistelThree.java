package org.notchwork.problem.cipher;

import java.util.List;
import java.util.function.LongUnaryOperator;
import org.notchwork.bits.Word;
import org.notchwork.json.JsonObject;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Problem;
import org.notchwork.problem.Promise;
import org.notchwork.seed.RandomStream;

/**
 * Tell three Feistel rounds from a random permutation (H. Kuwakado, M. Morii, ISIT 2010). A toy of toy size.
 *
 * <p>A block has a left and a right half of h bits; a round takes (L, R) to (R, L ⊕ F(R)). With constants a₀ = 0, a₁ = 1
 * the function f(b, x) = (left half of the encryption of (x, a_b)) ⊕ a_b has n = h + 1 input bits, b being the top one,
 * and values of h bits. For three rounds f(b, x) = F₂(x ⊕ F₁(a_b)), so that it has the period (1, F₁(a₀) ⊕ F₁(a₁)), with
 * accidental collisions besides unless F₂ is a permutation; for a random permutation of 2h bits there is none.
 *
 * <p>An instance is drawn from its stream in this order, which is a rule of the format: {@code bits(1)}, 1 for Feistel.
 * Then F₁, F₂, F₃: permutations of h bits, or tables of 2^h times {@code bits(h)}. Otherwise a permutation of 2h bits.
 *
 * @param hasPermutations whether the rounds are permutations
 */
public record FeistelThree(boolean hasPermutations) implements Problem {

    private static final int LEAST = 3;
    private static final int GREATEST = 17;

    @Override
    public String kind() {
        return FeistelThreeFamily.KIND;
    }

    @Override
    public JsonObject settings() {
        return JsonObject.builder()
                .put("kind", kind())
                .put("rounds-are", hasPermutations ? FeistelThreeFamily.PERMUTATIONS : FeistelThreeFamily.FUNCTIONS)
                .build();
    }

    @Override
    public String description() {
        return "feistel-three (a toy): three Feistel rounds of random "
                + (hasPermutations ? FeistelThreeFamily.PERMUTATIONS : FeistelThreeFamily.FUNCTIONS)
                + ", which give f a period, or a random permutation, which gives none, each with probability 1/2; find"
                + " out which, and the period";
    }

    @Override
    public Promise promise() {
        return Promise.periodOrNone(Promise.Labels.COLLIDING);
    }

    @Override
    public int leastWidth() {
        return LEAST;
    }

    @Override
    public int greatestWidth() {
        return GREATEST;
    }

    @Override
    public long memoryBytes(int width) {
        return 64L << width;
    }

    @Override
    public Instance draw(int width, RandomStream stream) {
        requireWidth(width);
        int half = width - 1;
        return stream.bits(1) == 1
                ? feistel(half, List.of(round(half, stream), round(half, stream), round(half, stream)))
                : random(half, stream);
    }

    @Override
    public Instance drawHiding(Answer hidden, int width, RandomStream stream) {
        requireWidth(width);
        if (hidden instanceof Answer.NoPeriod) {
            return random(width - 1, stream);
        }
        throw new IllegalArgumentException("a period is a value of the first round, not a choice: " + hidden);
    }

    /** Nothing is listed: the two cases are equally likely, not the answers. */
    @Override
    public List<Answer> answers(int width) {
        return List.of();
    }

    /** A random permutation, as in every other instance. */
    @Override
    public Instance control(int width, RandomStream stream) {
        requireWidth(width);
        return random(width - 1, stream);
    }

    private static void requireWidth(int width) {
        if (width < LEAST || width > GREATEST) {
            throw new IllegalArgumentException("width " + width + " is not in " + LEAST + " to " + GREATEST);
        }
    }

    private LongUnaryOperator round(int half, RandomStream stream) {
        if (hasPermutations) {
            return ToyPermutation.draw(half, stream);
        }
        int[] table = new int[1 << half];
        for (int x = 0; x < table.length; x++) {
            table[x] = (int) stream.bits(half);
        }
        return x -> table[(int) x];
    }

    /** Makes the instance of three round functions. */
    static Instance feistel(int half, List<LongUnaryOperator> rounds) {
        long period = 1L << half | (rounds.get(0).applyAsLong(0) ^ rounds.get(0).applyAsLong(1));
        return new Instance(
                sampled(half, block -> encrypted(block, half, rounds)), new Answer.Period(Word.of(half + 1, period)));
    }

    private static Instance random(int half, RandomStream stream) {
        return new Instance(sampled(half, ToyPermutation.draw(2 * half, stream)), new Answer.NoPeriod());
    }

    private static WordFunction sampled(int half, LongUnaryOperator permutation) {
        long mask = (1L << half) - 1;
        return new WordFunction(half + 1, half, point -> {
            long constant = point >>> half;
            long block = (point & mask) << half | constant;
            return permutation.applyAsLong(block) >>> half ^ constant;
        });
    }

    private static long encrypted(long block, int half, List<LongUnaryOperator> rounds) {
        long left = block >>> half;
        long right = block & ((1L << half) - 1);
        for (LongUnaryOperator round : rounds) {
            long next = left ^ round.applyAsLong(right);
            left = right;
            right = next;
        }
        return left << half | right;
    }
}
