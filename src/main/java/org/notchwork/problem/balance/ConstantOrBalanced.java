package org.notchwork.problem.balance;

import java.util.List;
import java.util.function.LongUnaryOperator;
import org.notchwork.json.JsonObject;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Problem;
import org.notchwork.problem.Promise;
import org.notchwork.problem.Question;
import org.notchwork.seed.KeyedPermutation;
import org.notchwork.seed.RandomStream;

/**
 * Find out whether f, with values of one bit, is constant or takes both values equally often (D. Deutsch, R. Jozsa, Proc.
 * R. Soc. A 439 (1992); width 1 is D. Deutsch, Proc. R. Soc. A 400 (1985)).
 *
 * <p>An instance is drawn from its stream in this order, which is a rule of the format: {@code bits(1)}, 1 for balanced.
 * Constant: the value is {@code bits(1)}. Balanced, widths to 16: the points of {@code distinct(2^(n−1), 2^n)} have value
 * 1, so that every balanced function is equally likely. Wider: a keyed permutation π is drawn and cut in half, f(x) being
 * the top bit of π(x).
 */
public record ConstantOrBalanced() implements Problem {

    private static final int GREATEST = 63;
    private static final int TABLE_WIDTH = 16;

    @Override
    public String kind() {
        return ConstantOrBalancedFamily.KIND;
    }

    @Override
    public JsonObject settings() {
        return JsonObject.builder().put("kind", kind()).build();
    }

    @Override
    public String description() {
        return "constant-or-balanced: f has values of one bit and is constant or takes both equally often, each with"
                + " probability 1/2; find out which";
    }

    @Override
    public Promise promise() {
        return new Promise(Question.CONSTANT_OR_BALANCED, 0, Promise.Labels.ANY, false);
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
        return width <= TABLE_WIDTH ? 8L << width : 512;
    }

    @Override
    public Instance draw(int width, RandomStream stream) {
        return drawHiding(new Answer.Balance(stream.bits(1) == 1), width, stream);
    }

    @Override
    public Instance drawHiding(Answer hidden, int width, RandomStream stream) {
        if (!(hidden instanceof Answer.Balance balance) || width < 1 || width > GREATEST) {
            throw new IllegalArgumentException("not constant or balanced at a width of 1 to 63: " + hidden);
        }
        LongUnaryOperator values = balance.isBalanced() ? balanced(width, stream) : constant(stream.bits(1));
        return new Instance(new BooleanFunction(width, values), hidden);
    }

    @Override
    public List<Answer> answers(int width) {
        return List.of(new Answer.Balance(false), new Answer.Balance(true));
    }

    private static LongUnaryOperator constant(long value) {
        return x -> value;
    }

    private static LongUnaryOperator balanced(int width, RandomStream stream) {
        if (width > TABLE_WIDTH) {
            KeyedPermutation permutation = KeyedPermutation.draw(width, stream);
            return x -> permutation.apply(x) >>> (width - 1);
        }
        byte[] table = new byte[1 << width];
        for (int x : stream.distinct(table.length / 2, table.length)) {
            table[x] = 1;
        }
        return x -> table[(int) x];
    }
}
