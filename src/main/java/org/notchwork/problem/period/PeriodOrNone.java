package org.notchwork.problem.period;

import java.util.List;
import org.notchwork.json.JsonObject;
import org.notchwork.problem.Answer;
import org.notchwork.problem.BitFunction;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Problem;
import org.notchwork.problem.Promise;
import org.notchwork.seed.KeyedPermutation;
import org.notchwork.seed.RandomStream;

/**
 * Find out whether f has a period or is injective, and the period (D. R. Simon, SIAM J. Comput. 26 (1997), section 3).
 *
 * <p>An instance is drawn from its stream in this order, which is a rule of the format: first {@code bits(1)}; 1 means a
 * period, and the rest is drawn as for {@code xor-period}. 0 means none, and f is a permutation of the words:
 * {@code distinct(2^n, 2^n)} for tables, a keyed permutation otherwise.
 *
 * @param labelling how the values are drawn
 */
public record PeriodOrNone(Labelling labelling) implements Problem {

    @Override
    public String kind() {
        return PeriodOrNoneFamily.KIND;
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
        return "xor-period-or-none: f(x) = f(y) exactly if y is x or x xor s, s not 0, or f is injective, each with"
                + " probability 1/2; find out which, and s (" + labelling.word() + " instances)";
    }

    @Override
    public Promise promise() {
        return Promise.periodOrNone(Promise.Labels.RANDOM);
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
        return withPeriod().memoryBytes(width);
    }

    @Override
    public Instance draw(int width, RandomStream stream) {
        return stream.bits(1) == 1 ? withPeriod().draw(width, stream) : injective(width, stream);
    }

    @Override
    public Instance drawHiding(Answer hidden, int width, RandomStream stream) {
        return hidden instanceof Answer.NoPeriod
                ? injective(width, stream)
                : withPeriod().drawHiding(hidden, width, stream);
    }

    /** Nothing is listed: the two cases are equally likely, not the answers. */
    @Override
    public List<Answer> answers(int width) {
        return List.of();
    }

    private XorPeriod withPeriod() {
        return new XorPeriod(labelling);
    }

    private Instance injective(int width, RandomStream stream) {
        if (width < leastWidth() || width > greatestWidth()) {
            throw new IllegalArgumentException("width " + width + " is not in 2 to " + greatestWidth());
        }
        BitFunction function = labelling == Labelling.TABLE
                ? InjectiveFunction.table(width, stream)
                : InjectiveFunction.of(KeyedPermutation.draw(width, stream), width);
        return new Instance(function, new Answer.NoPeriod());
    }
}
