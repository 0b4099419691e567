package org.notchwork.problem.mask;

import java.util.List;
import java.util.stream.LongStream;
import org.notchwork.bits.Word;
import org.notchwork.json.JsonObject;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Problem;
import org.notchwork.problem.Promise;
import org.notchwork.problem.Question;
import org.notchwork.seed.RandomStream;

/**
 * Find a where f(x) = a·x, or a·x ⊕ b with a constant bit b that is not asked for (E. Bernstein, U. Vazirani, SIAM J.
 * Comput. 26 (1997)).
 *
 * <p>An instance is drawn from its stream in this order, which is a rule of the format: a = {@code bits(n)}, then, with
 * a constant bit, b = {@code bits(1)}.
 *
 * @param hasConstant whether there is a constant bit
 */
public record InnerProduct(boolean hasConstant) implements Problem {

    private static final int GREATEST = 63;

    @Override
    public String kind() {
        return InnerProductFamily.KIND;
    }

    @Override
    public JsonObject settings() {
        return JsonObject.builder()
                .put("constant-bit", hasConstant)
                .put("kind", kind())
                .build();
    }

    @Override
    public String description() {
        return "inner-product: f(x) = a.x" + (hasConstant ? " xor b" : "") + "; find a";
    }

    @Override
    public Promise promise() {
        return new Promise(Question.MASK, 0, Promise.Labels.AFFINE, hasConstant);
    }

    @Override
    public int leastWidth() {
        return 1;
    }

    @Override
    public int greatestWidth() {
        return GREATEST;
    }

    @Override
    public long memoryBytes(int width) {
        return 64;
    }

    @Override
    public Instance draw(int width, RandomStream stream) {
        if (width < 1 || width > GREATEST) {
            throw new IllegalArgumentException("width " + width + " is not in 1 to " + GREATEST);
        }
        return instance(width, stream.bits(width), stream);
    }

    @Override
    public Instance drawHiding(Answer hidden, int width, RandomStream stream) {
        if (hidden instanceof Answer.Mask mask && mask.a().width() == width) {
            return instance(width, mask.a().bits(), stream);
        }
        throw new IllegalArgumentException("not a word of " + width + " bits: " + hidden);
    }

    @Override
    public List<Answer> answers(int width) {
        if (width > 12) {
            throw new IllegalArgumentException("width " + width + " has too many words to list");
        }
        return LongStream.range(0, 1L << width)
                .<Answer>mapToObj(a -> new Answer.Mask(Word.of(width, a)))
                .toList();
    }

    private Instance instance(int width, long a, RandomStream stream) {
        long b = hasConstant ? stream.bits(1) : 0;
        return new Instance(new InnerProductFunction(width, a, b), new Answer.Mask(Word.of(width, a)));
    }
}
