package org.notchwork.certificate;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.notchwork.bits.Word;
import org.notchwork.problem.Answer;
import org.notchwork.problem.BitFunction;
import org.notchwork.problem.Certificate;
import org.notchwork.problem.Pair;

/**
 * Checks certificates against the function, sharing nothing with the strategies that made them: two evaluations for a
 * pair; inner products, rank and two evaluations for equations; the unit vectors for an inner product.
 *
 * <p>A certificate that is absent, and one of measured words alone, prove nothing about the function; only their form is
 * checked. The answers of inner products are checked by evaluations of this class's own.
 */
public final class CertificateCheck {

    private final BitFunction function;

    private CertificateCheck(BitFunction function) {
        this.function = function;
    }

    /**
     * What is wrong with a certificate.
     *
     * @param member which part, as an RFC 6901 pointer below the certificate
     * @param written what stands there
     * @param right what would be right
     */
    public record Wrong(String member, String written, String right) {}

    /** Returns the first thing wrong with a certificate; empty if nothing speaks against the answer. */
    public static Optional<Wrong> check(BitFunction function, Answer answer, Certificate certificate) {
        CertificateCheck check = new CertificateCheck(function);
        if (answer instanceof Answer.Period period) {
            return check.period(period.s(), certificate);
        }
        if (answer instanceof Answer.NoPeriod) {
            return check.noPeriod(certificate);
        }
        if (answer instanceof Answer.Subspace subspace) {
            return check.subspace(subspace.basis(), certificate);
        }
        if (answer instanceof Answer.Mask mask) {
            return certificate instanceof Certificate.Absent
                    ? check.mask(mask.a())
                    : unfit(certificate, "none is wanted for an inner product");
        }
        return check.balance(((Answer.Balance) answer).isBalanced(), certificate);
    }

    private static Optional<Wrong> unfit(Certificate certificate, String right) {
        return Optional.of(new Wrong("", certificate.getClass().getSimpleName().toLowerCase(Locale.ROOT), right));
    }

    private Optional<Wrong> period(Word s, Certificate certificate) {
        if (certificate instanceof Certificate.Collision collision) {
            return widths(s, collision.pair(), "/collision").or(() -> collides(s, collision.pair(), "/collision"));
        }
        if (certificate instanceof Certificate.Equations equations) {
            String at = "/equations/confirmation";
            return widths(s, equations.confirmation(), at)
                    .or(() -> words(List.of(s), equations.words(), "/equations/words"))
                    .or(() -> startsAtZero(equations.confirmation(), at))
                    .or(() -> collides(s, equations.confirmation(), at));
        }
        return unfit(certificate, "a collision or equations");
    }

    private Optional<Wrong> noPeriod(Certificate certificate) {
        if (certificate instanceof Certificate.Absent) {
            return Optional.empty();
        }
        if (certificate instanceof Certificate.Spanning spanning) {
            return spans(spanning.words());
        }
        if (certificate instanceof Certificate.Equations equations) {
            String at = "/equations/confirmation";
            Pair pair = equations.confirmation();
            return widths(pair.y(), pair, at)
                    .or(() -> words(List.of(pair.y()), equations.words(), "/equations/words"))
                    .or(() -> startsAtZero(pair, at))
                    .or(() -> values(pair, at))
                    .or(() -> pair.fx().equals(pair.fy())
                            ? Optional.of(new Wrong(at + "/fy", pair.fy().hex(), "another value than at 0"))
                            : Optional.empty());
        }
        return unfit(certificate, "equations with values that differ, words that span everything, or none");
    }

    private Optional<Wrong> spans(List<Word> words) {
        int width = function.width();
        for (int i = 0; i < words.size(); i++) {
            if (words.get(i).width() != width) {
                return Optional.of(
                        new Wrong("/spanning/words/" + i, bits(words.get(i)), "a word of " + width + " bits"));
            }
        }
        int rank = rank(words);
        return words.size() == width && rank == width
                ? Optional.empty()
                : Optional.of(new Wrong(
                        "/spanning/words", words.size() + " words of rank " + rank, width + " independent words"));
    }

    private Optional<Wrong> subspace(List<Word> basis, Certificate certificate) {
        if (certificate instanceof Certificate.Collisions collisions) {
            return collisions(basis, collisions.pairs());
        }
        if (certificate instanceof Certificate.Annihilators annihilators) {
            return widths(basis.get(0), annihilators.confirmations(), "/annihilators/confirmations")
                    .or(() -> words(basis, annihilators.words(), "/annihilators/words"))
                    .or(() -> confirmations(basis, annihilators.confirmations()));
        }
        return unfit(certificate, "collisions or annihilators");
    }

    private Optional<Wrong> collisions(List<Word> basis, List<Pair> pairs) {
        List<Word> sums = pairs.stream().map(p -> p.x().xor(p.y())).toList();
        for (int i = 0; i < pairs.size(); i++) {
            String at = "/collisions/" + i;
            Pair pair = pairs.get(i);
            Optional<Wrong> wrong =
                    widths(basis.get(0), pair, at).or(() -> collides(pair.x().xor(pair.y()), pair, at));
            if (wrong.isPresent()) {
                return wrong;
            }
        }
        List<Word> all = new ArrayList<>(basis);
        all.addAll(sums);
        int rank = rank(sums);
        return rank == basis.size() && rank(all) == rank && pairs.size() == rank
                ? Optional.empty()
                : Optional.of(new Wrong(
                        "/collisions",
                        pairs.size() + " pairs of rank " + rank,
                        "pairs whose sums are a basis of the answer"));
    }

    private Optional<Wrong> confirmations(List<Word> basis, List<Pair> pairs) {
        for (int i = 0; i < basis.size(); i++) {
            String at = "/annihilators/confirmations/" + i;
            int index = i;
            Optional<Wrong> wrong = i >= pairs.size()
                    ? Optional.of(new Wrong(at, "nothing", "a pair"))
                    : startsAtZero(pairs.get(i), at).or(() -> collides(basis.get(index), pairs.get(index), at));
            if (wrong.isPresent()) {
                return wrong;
            }
        }
        return pairs.size() == basis.size()
                ? Optional.empty()
                : Optional.of(
                        new Wrong("/annihilators/confirmations", pairs.size() + " pairs", basis.size() + " pairs"));
    }

    private Optional<Wrong> mask(Word a) {
        if (a.width() != function.width()) {
            return Optional.of(new Wrong("", bits(a), "a word of " + function.width() + " bits"));
        }
        long atZero = function.at(0);
        for (int i = 0; i < a.width(); i++) {
            boolean isSet = (function.at(1L << i) ^ atZero) == 1;
            if (isSet != a.value().testBit(i)) {
                return Optional.of(new Wrong(
                        "",
                        a.hex(),
                        "a word whose bit " + i + " is " + (isSet ? 1 : 0) + ", as the values at 0 and 2^" + i
                                + " say"));
            }
        }
        return Optional.empty();
    }

    private Optional<Wrong> balance(boolean isBalanced, Certificate certificate) {
        if (certificate instanceof Certificate.Absent) {
            return Optional.empty();
        }
        if (!isBalanced || !(certificate instanceof Certificate.Difference difference)) {
            return unfit(certificate, isBalanced ? "a difference or none" : "none");
        }
        Pair pair = difference.pair();
        return widths(pair.x(), pair, "/difference")
                .or(() -> values(pair, "/difference"))
                .or(() -> pair.fx().equals(pair.fy())
                        ? Optional.of(new Wrong("/difference/fy", pair.fy().hex(), "another value"))
                        : Optional.empty());
    }

    /** A word of another width than the function's cannot even be compared. */
    private Optional<Wrong> widths(Word answer, Pair pair, String at) {
        if (answer.width() != function.width()) {
            return Optional.of(new Wrong("", bits(answer), "a period of " + function.width() + " bits"));
        }
        if (pair.x().width() != function.width()) {
            return Optional.of(new Wrong(at, bits(pair.x()), "points of " + function.width() + " bits"));
        }
        return pair.fx().width() == function.valueWidth()
                ? Optional.empty()
                : Optional.of(new Wrong(at, bits(pair.fx()), "values of " + function.valueWidth() + " bits"));
    }

    private Optional<Wrong> widths(Word answer, List<Pair> pairs, String at) {
        for (int i = 0; i < pairs.size(); i++) {
            Optional<Wrong> wrong = widths(answer, pairs.get(i), at + "/" + i);
            if (wrong.isPresent()) {
                return wrong;
            }
        }
        return Optional.empty();
    }

    private static String bits(Word word) {
        return word.width() + " bits";
    }

    private Optional<Wrong> values(Pair pair, String at) {
        String atX = function.at(pair.x()).hex();
        String atY = function.at(pair.y()).hex();
        if (!pair.fx().hex().equals(atX)) {
            return Optional.of(new Wrong(at + "/fx", pair.fx().hex(), atX));
        }
        return pair.fy().hex().equals(atY)
                ? Optional.empty()
                : Optional.of(new Wrong(at + "/fy", pair.fy().hex(), atY));
    }

    private Optional<Wrong> collides(Word period, Pair pair, String at) {
        return values(pair, at).or(() -> {
            String sum = pair.x().xor(period).hex();
            if (!pair.y().hex().equals(sum)) {
                return Optional.of(new Wrong(at + "/y", pair.y().hex(), sum));
            }
            return pair.collides()
                    ? Optional.empty()
                    : Optional.of(
                            new Wrong(at + "/fy", pair.fy().hex(), pair.fx().hex()));
        });
    }

    private static Optional<Wrong> startsAtZero(Pair confirmation, String at) {
        return confirmation.x().isZero()
                ? Optional.empty()
                : Optional.of(new Wrong(
                        at + "/x",
                        confirmation.x().hex(),
                        new Word(confirmation.x().width(), BigInteger.ZERO).hex()));
    }

    private static Optional<Wrong> words(List<Word> hidden, List<Word> words, String at) {
        int width = hidden.get(0).width();
        for (int i = 0; i < words.size(); i++) {
            Word word = words.get(i);
            if (word.width() != width) {
                return Optional.of(new Wrong(at + "/" + i, bits(word), "a word of " + width + " bits"));
            }
            for (Word one : hidden) {
                if (word.dot(one) != 0) {
                    return Optional.of(new Wrong(at + "/" + i, word.hex(), "a word orthogonal to " + one.hex()));
                }
            }
        }
        int rank = rank(words);
        int wanted = width - hidden.size();
        if (words.size() != wanted || rank != wanted) {
            return Optional.of(new Wrong(at, words.size() + " words of rank " + rank, wanted + " independent words"));
        }
        return Optional.empty();
    }

    /** The rank by plain Gaussian elimination, column by column. */
    private static int rank(List<Word> words) {
        BigInteger[] rows = words.stream().map(Word::value).toArray(BigInteger[]::new);
        int columns = words.stream().mapToInt(Word::width).max().orElse(0);
        int rank = 0;
        for (int column = columns - 1; column >= 0 && rank < rows.length; column--) {
            int pivot = rank;
            while (pivot < rows.length && !rows[pivot].testBit(column)) {
                pivot++;
            }
            if (pivot == rows.length) {
                continue;
            }
            BigInteger row = rows[pivot];
            rows[pivot] = rows[rank];
            rows[rank] = row;
            for (int i = rank + 1; i < rows.length; i++) {
                if (rows[i].testBit(column)) {
                    rows[i] = rows[i].xor(row);
                }
            }
            rank++;
        }
        return rank;
    }
}
