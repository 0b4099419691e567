package org.notchwork.problem.cipher;

import java.util.List;
import java.util.function.LongUnaryOperator;
import org.notchwork.bits.Word;
import org.notchwork.json.JsonObject;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Part;
import org.notchwork.problem.Problem;
import org.notchwork.problem.Promise;
import org.notchwork.seed.RandomStream;

/**
 * Find k₁ where E(x) = P(x ⊕ k₁) ⊕ k₂ is the cipher and P a public permutation: f(x) = E(x) ⊕ P(x) has the period k₁, and
 * accidental collisions besides (H. Kuwakado, M. Morii, ISITA 2012). A toy of toy size.
 *
 * <p>An instance is drawn from its stream in this order, which is a rule of the format: P as a permutation of n bits,
 * k₁ = {@code nonZeroBits(n)}, k₂ = {@code bits(n)}.
 */
public record EvenMansour() implements Problem {

    /** The name of the keyed function. */
    public static final String CIPHER = "cipher";

    /** The name of the public permutation. */
    public static final String PERMUTATION = "permutation";

    private static final int LEAST = 3;
    private static final int GREATEST = 24;

    @Override
    public String kind() {
        return EvenMansourFamily.KIND;
    }

    @Override
    public JsonObject settings() {
        return JsonObject.builder().put("kind", kind()).build();
    }

    @Override
    public String description() {
        return "even-mansour (a toy): E(x) = P(x xor k1) xor k2 with a public permutation P; f(x) = E(x) xor P(x) has"
                + " the period k1 and accidental collisions; find k1";
    }

    @Override
    public Promise promise() {
        return Promise.period(Promise.Labels.COLLIDING);
    }

    @Override
    public List<String> functions() {
        return List.of(CIPHER, PERMUTATION);
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
        return width <= ToyPermutation.TABLE_WIDTH ? 8L << width : 512;
    }

    @Override
    public Instance draw(int width, RandomStream stream) {
        requireWidth(width);
        LongUnaryOperator permutation = ToyPermutation.draw(width, stream);
        return instance(width, permutation, stream.nonZeroBits(width), stream.bits(width));
    }

    @Override
    public Instance drawHiding(Answer hidden, int width, RandomStream stream) {
        requireWidth(width);
        if (hidden instanceof Answer.Period period && period.s().width() == width) {
            LongUnaryOperator permutation = ToyPermutation.draw(width, stream);
            return instance(width, permutation, period.s().bits(), stream.bits(width));
        }
        throw new IllegalArgumentException("not a key of " + width + " bits: " + hidden);
    }

    /** Nothing is listed: a small instance can have a second exact period, so that its answer is not what is hidden. */
    @Override
    public List<Answer> answers(int width) {
        return List.of();
    }

    /** A cipher that has nothing to do with the permutation: both are drawn, the cipher first. */
    @Override
    public Instance control(int width, RandomStream stream) {
        LongUnaryOperator cipher = ToyPermutation.draw(width, stream);
        return instance(width, cipher, ToyPermutation.draw(width, stream), new Answer.NoPeriod());
    }

    private static void requireWidth(int width) {
        if (width < LEAST || width > GREATEST) {
            throw new IllegalArgumentException("width " + width + " is not in " + LEAST + " to " + GREATEST);
        }
    }

    /** Makes the instance of a permutation and two keys. */
    static Instance instance(int width, LongUnaryOperator permutation, long k1, long k2) {
        LongUnaryOperator cipher = x -> permutation.applyAsLong(x ^ k1) ^ k2;
        return instance(width, cipher, permutation, new Answer.Period(Word.of(width, k1)));
    }

    private static Instance instance(
            int width, LongUnaryOperator cipher, LongUnaryOperator permutation, Answer hidden) {
        return new Instance(
                new WordFunction(width, width, x -> cipher.applyAsLong(x) ^ permutation.applyAsLong(x)),
                hidden,
                List.of(
                        new Part(CIPHER, new WordFunction(width, width, cipher)),
                        new Part(PERMUTATION, new WordFunction(width, width, permutation))));
    }
}
