package org.notchwork.check;

import java.util.List;
import java.util.Optional;
import org.notchwork.bits.Word;
import org.notchwork.problem.Answer;
import org.notchwork.problem.BitFunction;
import org.notchwork.problem.Certificate;
import org.notchwork.problem.Pair;

/**
 * Checks certificates against the function, sharing nothing with the strategies that made them: two evaluations for a
 * pair; inner products, rank and two evaluations for equations.
 */
public final class CertificateCheck {

    private CertificateCheck() {}

    /**
     * What is wrong with a certificate.
     *
     * @param member which part, as an RFC 6901 pointer below the certificate
     * @param written what stands there
     * @param right what would be right
     */
    public record Wrong(String member, String written, String right) {}

    /** Returns the first thing wrong with a certificate; empty if it proves the answer. */
    public static Optional<Wrong> check(BitFunction function, Answer answer, Certificate certificate) {
        if (!(answer instanceof Answer.Period period)) {
            return Optional.of(new Wrong("", answer.toString(), "a period"));
        }
        if (certificate instanceof Certificate.Collision collision) {
            return widths(function, period.s(), collision.pair(), "/collision")
                    .or(() -> pair(function, period.s(), collision.pair(), "/collision"));
        }
        Certificate.Equations equations = (Certificate.Equations) certificate;
        return widths(function, period.s(), equations.confirmation(), "/equations/confirmation")
                .or(() -> equations(period.s(), equations.words()))
                .or(() -> startsAtZero(equations.confirmation()))
                .or(() -> pair(function, period.s(), equations.confirmation(), "/equations/confirmation"));
    }

    /** A word of another width than the function's cannot even be compared. */
    private static Optional<Wrong> widths(BitFunction function, Word period, Pair pair, String at) {
        if (period.width() != function.width()) {
            return Optional.of(new Wrong("", bits(period), "a period of " + function.width() + " bits"));
        }
        if (pair.x().width() != function.width()) {
            return Optional.of(new Wrong(at, bits(pair.x()), "points of " + function.width() + " bits"));
        }
        return pair.fx().width() == function.valueWidth()
                ? Optional.empty()
                : Optional.of(new Wrong(at, bits(pair.fx()), "values of " + function.valueWidth() + " bits"));
    }

    private static String bits(Word word) {
        return word.width() + " bits";
    }

    private static Optional<Wrong> pair(BitFunction function, Word period, Pair pair, String at) {
        String atX =
                Word.of(function.valueWidth(), function.at(pair.x().bits())).hex();
        String atY =
                Word.of(function.valueWidth(), function.at(pair.y().bits())).hex();
        if (!pair.fx().hex().equals(atX)) {
            return Optional.of(new Wrong(at + "/fx", pair.fx().hex(), atX));
        }
        if (!pair.fy().hex().equals(atY)) {
            return Optional.of(new Wrong(at + "/fy", pair.fy().hex(), atY));
        }
        String sum = pair.x().xor(period).hex();
        if (!pair.y().hex().equals(sum)) {
            return Optional.of(new Wrong(at + "/y", pair.y().hex(), sum));
        }
        return pair.collides() ? Optional.empty() : Optional.of(new Wrong(at + "/fy", atY, atX));
    }

    private static Optional<Wrong> startsAtZero(Pair confirmation) {
        return confirmation.x().isZero()
                ? Optional.empty()
                : Optional.of(new Wrong(
                        "/equations/confirmation/x",
                        confirmation.x().hex(),
                        Word.of(confirmation.x().width(), 0).hex()));
    }

    private static Optional<Wrong> equations(Word period, List<Word> words) {
        for (int i = 0; i < words.size(); i++) {
            if (words.get(i).width() != period.width()) {
                return Optional.of(new Wrong(
                        "/equations/words/" + i, bits(words.get(i)), "a word of " + period.width() + " bits"));
            }
            if (words.get(i).dot(period) != 0) {
                return Optional.of(
                        new Wrong("/equations/words/" + i, words.get(i).hex(), "a word orthogonal to " + period.hex()));
            }
        }
        int rank = rank(words);
        int wanted = period.width() - 1;
        if (words.size() != wanted || rank != wanted) {
            return Optional.of(new Wrong(
                    "/equations/words", words.size() + " words of rank " + rank, wanted + " independent words"));
        }
        return Optional.empty();
    }

    /** The rank by plain Gaussian elimination, column by column. */
    private static int rank(List<Word> words) {
        long[] rows = words.stream().mapToLong(Word::bits).toArray();
        int rank = 0;
        for (int column = 62; column >= 0 && rank < rows.length; column--) {
            int pivot = rank;
            while (pivot < rows.length && (rows[pivot] >>> column & 1) == 0) {
                pivot++;
            }
            if (pivot == rows.length) {
                continue;
            }
            long row = rows[pivot];
            rows[pivot] = rows[rank];
            rows[rank] = row;
            for (int i = rank + 1; i < rows.length; i++) {
                if ((rows[i] >>> column & 1) != 0) {
                    rows[i] ^= row;
                }
            }
            rank++;
        }
        return rank;
    }
}
