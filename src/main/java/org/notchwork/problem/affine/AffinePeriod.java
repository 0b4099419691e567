package org.notchwork.problem.affine;

import java.math.BigInteger;
import java.util.List;
import java.util.stream.LongStream;
import org.notchwork.bits.Word;
import org.notchwork.json.JsonObject;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Problem;
import org.notchwork.problem.Promise;
import org.notchwork.seed.RandomStream;

/**
 * Find s ≠ 0 where f(x) = Mx ⊕ c and the kernel of M is {0, s}. The function is given as a circuit of CNOT and X gates,
 * so that stabilizer simulation can follow it to thousands of qubits (D. Gottesman (1998)).
 *
 * <p>An instance is drawn from its stream in this order, which is a rule of the format. A word of n bits is drawn in
 * pieces of 63, lowest first, the last piece being what is left. First s, again until it is not 0. Then
 * 2n⌈log₂ n⌉ gates of a network R, each a control {@code below(n)} and a target {@code below(n − 1)}, one more if it is
 * not below the control. Then c. With h = ⌊log₂ s⌋ and g(x) = x, plus s if bit h of x is set, f(x) = R(g(x)) ⊕ c.
 */
public record AffinePeriod() implements Problem {

    private static final int GREATEST = 2048;
    private static final int PIECE = 63;

    @Override
    public String kind() {
        return AffinePeriodFamily.KIND;
    }

    @Override
    public JsonObject settings() {
        return JsonObject.builder().put("kind", kind()).build();
    }

    @Override
    public String description() {
        return "affine-period: f(x) = Mx xor c, given as a circuit of CNOT and X gates; M takes 0 and s, and nothing"
                + " else, to 0; find s";
    }

    @Override
    public Promise promise() {
        return Promise.period(Promise.Labels.AFFINE);
    }

    @Override
    public int leastWidth() {
        return 2;
    }

    @Override
    public int greatestWidth() {
        return GREATEST;
    }

    @Override
    public long memoryBytes(int width) {
        return 64L * width * (Integer.SIZE - Integer.numberOfLeadingZeros(width));
    }

    @Override
    public Instance draw(int width, RandomStream stream) {
        requireWidth(width);
        BigInteger s;
        do {
            s = word(width, stream);
        } while (s.signum() == 0);
        return instance(new Word(width, s), new Answer.Period(new Word(width, s)), stream);
    }

    @Override
    public Instance drawHiding(Answer hidden, int width, RandomStream stream) {
        requireWidth(width);
        if (hidden instanceof Answer.Period period && period.s().width() == width) {
            return instance(period.s(), hidden, stream);
        }
        throw new IllegalArgumentException("not a period of " + width + " bits: " + hidden);
    }

    @Override
    public List<Answer> answers(int width) {
        if (width > 12) {
            throw new IllegalArgumentException("width " + width + " has too many periods to list");
        }
        return LongStream.range(1, 1L << width)
                .<Answer>mapToObj(s -> new Answer.Period(Word.of(width, s)))
                .toList();
    }

    /** An affine function without a period, as a circuit as well: R and c are drawn as for an instance, g(x) = x. */
    @Override
    public Instance control(int width, RandomStream stream) {
        requireWidth(width);
        return instance(new Word(width, BigInteger.ZERO), new Answer.NoPeriod(), stream);
    }

    private static void requireWidth(int width) {
        if (width < 2 || width > GREATEST) {
            throw new IllegalArgumentException("width " + width + " is not in 2 to " + GREATEST);
        }
    }

    private static Instance instance(Word s, Answer hidden, RandomStream stream) {
        int width = s.width();
        int gates = 2 * width * (Integer.SIZE - Integer.numberOfLeadingZeros(width - 1));
        int[] controls = new int[gates];
        int[] targets = new int[gates];
        for (int gate = 0; gate < gates; gate++) {
            controls[gate] = (int) stream.below(width);
            int target = (int) stream.below(width - 1L);
            targets[gate] = target < controls[gate] ? target : target + 1;
        }
        Word c = new Word(width, word(width, stream));
        return new Instance(new AffineFunction(s, controls, targets, c), hidden);
    }

    private static BigInteger word(int width, RandomStream stream) {
        BigInteger word = BigInteger.ZERO;
        for (int from = 0; from < width; from += PIECE) {
            long piece = stream.bits(Math.min(PIECE, width - from));
            word = word.or(BigInteger.valueOf(piece).shiftLeft(from));
        }
        return word;
    }
}
