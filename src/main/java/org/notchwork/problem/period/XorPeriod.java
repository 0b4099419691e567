package org.notchwork.problem.period;

import java.util.List;
import java.util.stream.LongStream;
import org.notchwork.bits.Word;
import org.notchwork.json.JsonObject;
import org.notchwork.problem.Answer;
import org.notchwork.problem.BitFunction;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Problem;
import org.notchwork.problem.Promise;
import org.notchwork.seed.RandomStream;

/**
 * Find s ≠ 0 where f(x) = f(y) exactly if y ∈ {x, x ⊕ s} (D. R. Simon, SIAM J. Comput. 26 (1997), section 3).
 *
 * <p>An instance is drawn from its stream in this order, which is a rule of the format. First s =
 * {@code nonZeroBits(n)}, uniform over the non-zero words; {@link #drawHiding} is given s and takes no word for it.
 * With h = ⌊log₂ s⌋ the coset {x, x ⊕ s} is represented by its member r whose bit h is clear. Then the labels. Table:
 * {@code distinct(2^(n−1), 2^n)} in the order of the draws goes to the representatives in increasing order, and f(x)
 * is the label of x's coset. Permutation: π is drawn as {@link org.notchwork.seed.KeyedPermutation} says, and
 * f(x) = π(r).
 *
 * @param labelling how the values are drawn
 */
public record XorPeriod(Labelling labelling) implements Problem {

    private static final int EXHAUSTIBLE = 12;

    @Override
    public String kind() {
        return XorPeriodFamily.KIND;
    }

    @Override
    public JsonObject settings() {
        return JsonObject.builder()
                .put("instances", labelling.word())
                .put("kind", kind())
                .build();
    }

    @Override
    public String description() {
        return "xor-period: f(x) = f(y) exactly if y is x or x xor s, s not 0; find s (" + labelling.word()
                + " instances)";
    }

    @Override
    public Promise promise() {
        return Promise.period(Promise.Labels.RANDOM);
    }

    @Override
    public int leastWidth() {
        return 2;
    }

    @Override
    public int greatestWidth() {
        return labelling.greatestWidth();
    }

    @Override
    public long memoryBytes(int width) {
        return labelling == Labelling.TABLE ? 8L << width : 512;
    }

    @Override
    public Instance draw(int width, RandomStream stream) {
        return draw(width, stream.nonZeroBits(width), stream);
    }

    @Override
    public Instance drawHiding(Answer hidden, int width, RandomStream stream) {
        if (hidden instanceof Answer.Period period && period.s().width() == width) {
            return draw(width, period.s().bits(), stream);
        }
        throw new IllegalArgumentException("not a period of " + width + " bits: " + hidden);
    }

    @Override
    public List<Answer> answers(int width) {
        if (width > EXHAUSTIBLE) {
            throw new IllegalArgumentException("width " + width + " has too many periods to list");
        }
        return LongStream.range(1, 1L << width)
                .<Answer>mapToObj(s -> new Answer.Period(Word.of(width, s)))
                .toList();
    }

    private Instance draw(int width, long period, RandomStream stream) {
        if (width < leastWidth() || width > greatestWidth()) {
            throw new IllegalArgumentException("width " + width + " is not in 2 to " + greatestWidth());
        }
        BitFunction function = labelling.label(new Cosets(width, period), stream);
        return new Instance(function, new Answer.Period(Word.of(width, period)));
    }
}
