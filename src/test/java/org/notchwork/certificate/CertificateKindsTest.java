package org.notchwork.certificate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.LongStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.notchwork.bits.Word;
import org.notchwork.problem.Answer;
import org.notchwork.problem.BitFunction;
import org.notchwork.problem.Certificate;
import org.notchwork.problem.Pair;
import org.notchwork.support.Given;

/** Every kind of certificate holds where it is right, and with one field wrong that field is named. */
class CertificateKindsTest {

    /** Constant on the cosets of the span of 12 and 3 = {0, 3, 12, 15}: the label is (bit 3 + bit 2, bit 1 + bit 0). */
    private static final BitFunction COSETS = cosets();

    private static final Answer SPAN = new Answer.Subspace(List.of(word(4, 12), word(4, 3)));

    /** Injective. */
    private static final BitFunction INJECTIVE = Given.of(3, 3, 6, 1, 0, 3, 2, 7, 5, 4);

    /** The inner product with 6. */
    private static final BitFunction MASK = Given.of(3, 1, 0, 0, 1, 1, 1, 1, 0, 0);

    private static final BitFunction BALANCED = Given.of(2, 1, 0, 1, 1, 0);

    private static final Certificate ABSENT = new Certificate.Absent("nothing that could be checked");

    private static BitFunction cosets() {
        long[] values = new long[16];
        for (int x = 0; x < 16; x++) {
            values[x] = 5 ^ ((x >>> 3 ^ x >>> 2) & 1L) << 2 ^ ((x >>> 1 ^ x) & 1L);
        }
        return Given.of(4, 4, values);
    }

    private static Word word(int width, long bits) {
        return Word.of(width, bits);
    }

    private static List<Word> words(int width, long... bits) {
        return LongStream.of(bits).mapToObj(b -> word(width, b)).toList();
    }

    /** The pair of two points with the values that the function has there. */
    private static Pair pair(BitFunction f, long x, long y) {
        return pair(f, x, y, f.at(x), f.at(y));
    }

    private static Pair pair(BitFunction f, long x, long y, long fx, long fy) {
        return new Pair(word(f.width(), x), word(f.width(), y), word(f.valueWidth(), fx), word(f.valueWidth(), fy));
    }

    private static Optional<String> wrong(BitFunction f, Answer answer, Certificate certificate) {
        return CertificateCheck.check(f, answer, certificate).map(CertificateCheck.Wrong::member);
    }

    private static Certificate collisions(Pair... pairs) {
        return new Certificate.Collisions(List.of(pairs));
    }

    @Test
    void collisionsThatSpanTheSubspaceProveIt() {
        assertEquals(Optional.empty(), wrong(COSETS, SPAN, collisions(pair(COSETS, 0, 12), pair(COSETS, 1, 2))));
        assertEquals(Optional.empty(), wrong(COSETS, SPAN, collisions(pair(COSETS, 4, 11), pair(COSETS, 7, 4))));
    }

    @Test
    void theFirstWrongMemberOfCollisionsIsNamed() {
        Pair good = pair(COSETS, 0, 12);
        long label = COSETS.at(1);
        assertEquals(
                Optional.of("/collisions/1/fx"),
                wrong(COSETS, SPAN, collisions(good, pair(COSETS, 1, 2, label ^ 2, label))));
        assertEquals(
                Optional.of("/collisions/1/fy"),
                wrong(COSETS, SPAN, collisions(good, pair(COSETS, 1, 2, label, label ^ 2))));
        // Right values, but not the same.
        assertEquals(Optional.of("/collisions/0/fy"), wrong(COSETS, SPAN, collisions(pair(COSETS, 0, 1), good)));
        // One point twice collides with itself only.
        assertEquals(Optional.of("/collisions/0/fy"), wrong(COSETS, SPAN, collisions(pair(COSETS, 3, 3), good)));
        // Too few, dependent, too many.
        assertEquals(Optional.of("/collisions"), wrong(COSETS, SPAN, collisions(good)));
        assertEquals(Optional.of("/collisions"), wrong(COSETS, SPAN, collisions(good, pair(COSETS, 1, 13))));
        assertEquals(
                Optional.of("/collisions"),
                wrong(COSETS, SPAN, collisions(good, pair(COSETS, 1, 2), pair(COSETS, 0, 15))));
        assertEquals(Optional.of("/collisions"), wrong(COSETS, SPAN, new Certificate.Collisions(List.of())));
    }

    /** Another subspace than the pairs span, of the same dimension or a smaller one, is not proved. */
    @Test
    void collisionsProveNoOtherSubspace() {
        Certificate right = collisions(pair(COSETS, 0, 12), pair(COSETS, 1, 2));
        assertEquals(Optional.of("/collisions"), wrong(COSETS, new Answer.Subspace(words(4, 12, 2)), right));
        assertEquals(Optional.of("/collisions"), wrong(COSETS, new Answer.Subspace(words(4, 12)), right));
    }

    private static Certificate annihilators(List<Word> words, Pair... confirmations) {
        return new Certificate.Annihilators(words, List.of(confirmations));
    }

    @Test
    void orthogonalWordsAndAConfirmedBasisProveASubspace() {
        Pair first = pair(COSETS, 0, 12);
        Pair second = pair(COSETS, 0, 3);
        assertEquals(Optional.empty(), wrong(COSETS, SPAN, annihilators(words(4, 12, 3), first, second)));
        assertEquals(Optional.empty(), wrong(COSETS, SPAN, annihilators(words(4, 15, 3), first, second)));
    }

    @Test
    void theFirstWrongMemberOfAnnihilatorsIsNamed() {
        Pair first = pair(COSETS, 0, 12);
        Pair second = pair(COSETS, 0, 3);
        String words = "/annihilators/words";
        String confirmations = "/annihilators/confirmations";
        long label = COSETS.at(0);
        assertEquals(Optional.of(words + "/1"), wrong(COSETS, SPAN, annihilators(words(4, 12, 2), first, second)));
        assertEquals(Optional.of(words), wrong(COSETS, SPAN, annihilators(words(4, 12, 12), first, second)));
        assertEquals(Optional.of(words), wrong(COSETS, SPAN, annihilators(words(4, 12), first, second)));
        assertEquals(Optional.of(words), wrong(COSETS, SPAN, annihilators(words(4, 12, 3, 15), first, second)));
        assertEquals(Optional.of(confirmations + "/1"), wrong(COSETS, SPAN, annihilators(words(4, 12, 3), first)));
        assertEquals(
                Optional.of(confirmations), wrong(COSETS, SPAN, annihilators(words(4, 12, 3), first, second, second)));
        assertEquals(
                Optional.of(confirmations + "/0/x"),
                wrong(COSETS, SPAN, annihilators(words(4, 12, 3), pair(COSETS, 1, 13), second)));
        assertEquals(
                Optional.of(confirmations + "/0/y"),
                wrong(COSETS, SPAN, annihilators(words(4, 12, 3), pair(COSETS, 0, 15), second)));
        assertEquals(
                Optional.of(confirmations + "/1/fx"),
                wrong(COSETS, SPAN, annihilators(words(4, 12, 3), first, pair(COSETS, 0, 3, label ^ 1, label))));
        assertEquals(
                Optional.of(confirmations + "/1/fy"),
                wrong(COSETS, SPAN, annihilators(words(4, 12, 3), first, pair(COSETS, 0, 3, label, label ^ 1))));
    }

    /** A basis of which one word is no period of the function: its confirmation does not collide. */
    @Test
    void annihilatorsProveNoOtherSubspace() {
        Answer other = new Answer.Subspace(words(4, 12, 2));
        assertEquals(
                Optional.of("/annihilators/confirmations/1/fy"),
                wrong(COSETS, other, annihilators(words(4, 12, 1), pair(COSETS, 0, 12), pair(COSETS, 0, 2))));
    }

    @Test
    void spanningWordsAreHeldToTheirRank() {
        Answer none = new Answer.NoPeriod();
        assertEquals(Optional.empty(), wrong(INJECTIVE, none, new Certificate.Spanning(words(3, 1, 3, 7))));
        String at = "/spanning/words";
        assertEquals(Optional.of(at), wrong(INJECTIVE, none, new Certificate.Spanning(words(3, 1, 3, 2))));
        assertEquals(Optional.of(at), wrong(INJECTIVE, none, new Certificate.Spanning(words(3, 1, 3))));
        assertEquals(Optional.of(at), wrong(INJECTIVE, none, new Certificate.Spanning(words(3, 1, 2, 4, 7))));
        assertEquals(Optional.of(at), wrong(INJECTIVE, none, new Certificate.Spanning(words(3, 0, 3, 7))));
        List<Word> mixed = new ArrayList<>(words(3, 1, 3));
        mixed.add(word(4, 7));
        assertEquals(Optional.of(at + "/2"), wrong(INJECTIVE, none, new Certificate.Spanning(mixed)));
    }

    /** Words orthogonal to a candidate only, and the values that rule it out. */
    @Test
    void equationsWithValuesThatDifferRuleOutTheOnlyCandidate() {
        Answer none = new Answer.NoPeriod();
        Certificate right = new Certificate.Equations(words(3, 2, 5), pair(INJECTIVE, 0, 5));
        assertEquals(Optional.empty(), wrong(INJECTIVE, none, right));
        String words = "/equations/words";
        String at = "/equations/confirmation";
        assertEquals(
                Optional.of(words + "/1"),
                wrong(INJECTIVE, none, new Certificate.Equations(words(3, 2, 4), pair(INJECTIVE, 0, 5))));
        assertEquals(
                Optional.of(words),
                wrong(INJECTIVE, none, new Certificate.Equations(words(3, 2, 2), pair(INJECTIVE, 0, 5))));
        assertEquals(
                Optional.of(at + "/x"),
                wrong(INJECTIVE, none, new Certificate.Equations(words(3, 2, 5), pair(INJECTIVE, 1, 5))));
        assertEquals(
                Optional.of(at + "/fx"),
                wrong(INJECTIVE, none, new Certificate.Equations(words(3, 2, 5), pair(INJECTIVE, 0, 5, 5, 7))));
        assertEquals(
                Optional.of(at + "/fy"),
                wrong(INJECTIVE, none, new Certificate.Equations(words(3, 2, 5), pair(INJECTIVE, 0, 5, 6, 4))));
    }

    /** The candidate is a period: then there is one, whatever is written. */
    @Test
    void equalValuesDoNotRuleOutTheCandidate() {
        BitFunction periodic = Given.of(3, 3, 6, 1, 0, 3, 1, 6, 3, 0);
        assertEquals(
                Optional.of("/equations/confirmation/fy"),
                wrong(
                        periodic,
                        new Answer.NoPeriod(),
                        new Certificate.Equations(words(3, 2, 5), pair(periodic, 0, 5))));
    }

    /** Rank n − 1 leaves one word besides 0; the word 0 itself is not it. */
    @Test
    void aCandidateOfZeroRulesOutNothing() {
        assertTrue(wrong(
                        INJECTIVE,
                        new Answer.NoPeriod(),
                        new Certificate.Equations(words(3, 2, 5), pair(INJECTIVE, 0, 0)))
                .isPresent());
    }

    @Test
    void twoDifferentValuesProveABalancedFunction() {
        Answer balanced = new Answer.Balance(true);
        assertEquals(Optional.empty(), wrong(BALANCED, balanced, new Certificate.Difference(pair(BALANCED, 0, 2))));
        assertEquals(
                Optional.of("/difference/fy"),
                wrong(BALANCED, balanced, new Certificate.Difference(pair(BALANCED, 0, 3))));
        assertEquals(
                Optional.of("/difference/fx"),
                wrong(BALANCED, balanced, new Certificate.Difference(pair(BALANCED, 0, 2, 1, 1))));
        assertEquals(
                Optional.of("/difference/fy"),
                wrong(BALANCED, balanced, new Certificate.Difference(pair(BALANCED, 0, 2, 0, 0))));
    }

    @Test
    void aDifferenceDoesNotProveAConstantFunction() {
        assertTrue(wrong(BALANCED, new Answer.Balance(false), new Certificate.Difference(pair(BALANCED, 0, 2)))
                .isPresent());
    }

    /** The answer to an inner product needs no certificate: the values at 0 and the unit vectors are the answer. */
    @Test
    void aMaskIsCheckedByEvaluations() {
        assertEquals(Optional.empty(), wrong(MASK, new Answer.Mask(word(3, 6)), ABSENT));
        BitFunction inverted = Given.of(3, 1, 1, 1, 0, 0, 0, 0, 1, 1);
        assertEquals(Optional.empty(), wrong(inverted, new Answer.Mask(word(3, 6)), ABSENT));
        for (long other : new long[] {0, 1, 2, 3, 4, 5, 7}) {
            assertTrue(wrong(MASK, new Answer.Mask(word(3, other)), ABSENT).isPresent(), "mask " + other);
        }
        assertTrue(wrong(MASK, new Answer.Mask(word(4, 6)), ABSENT).isPresent());
    }

    @Test
    void anAbsentCertificateIsTakenOnlyWhereNoneIsWanted() {
        assertEquals(Optional.empty(), wrong(INJECTIVE, new Answer.NoPeriod(), ABSENT));
        assertEquals(Optional.empty(), wrong(BALANCED, new Answer.Balance(true), ABSENT));
        assertEquals(Optional.of(""), wrong(INJECTIVE, new Answer.Period(word(3, 5)), ABSENT));
        assertEquals(Optional.of(""), wrong(COSETS, SPAN, ABSENT));
    }

    /** Certificates of the wrong kind for the answer, whatever they hold. */
    @ParameterizedTest
    @CsvSource({"period", "none", "subspace", "mask", "balance"})
    void aCertificateForAnotherQuestionIsUnfit(String question) {
        Pair pair = pair(INJECTIVE, 0, 5);
        Certificate spanning = new Certificate.Spanning(words(3, 1, 2, 4));
        Certificate collision = new Certificate.Collision(pair);
        Certificate difference = new Certificate.Difference(pair);
        switch (question) {
            case "period" -> {
                assertEquals(Optional.of(""), wrong(INJECTIVE, new Answer.Period(word(3, 5)), spanning));
                assertEquals(Optional.of(""), wrong(INJECTIVE, new Answer.Period(word(3, 5)), difference));
            }
            case "none" -> {
                assertEquals(Optional.of(""), wrong(INJECTIVE, new Answer.NoPeriod(), collision));
                assertEquals(Optional.of(""), wrong(INJECTIVE, new Answer.NoPeriod(), difference));
            }
            case "subspace" -> assertEquals(Optional.of(""), wrong(COSETS, SPAN, spanning));
            case "mask" -> assertEquals(Optional.of(""), wrong(MASK, new Answer.Mask(word(3, 6)), spanning));
            default -> assertEquals(Optional.of(""), wrong(BALANCED, new Answer.Balance(true), spanning));
        }
    }

    /** Words of another width cannot be compared, and that is said instead of an exception. */
    @Test
    void foreignWidthsAreAFaultLikeAnyOther() {
        assertTrue(wrong(COSETS, SPAN, collisions(pair(INJECTIVE, 0, 5), pair(INJECTIVE, 0, 5)))
                .isPresent());
        assertTrue(wrong(COSETS, SPAN, annihilators(words(3, 1, 2), pair(COSETS, 0, 12), pair(COSETS, 0, 3)))
                .isPresent());
        assertTrue(wrong(INJECTIVE, SPAN, collisions(pair(COSETS, 0, 12), pair(COSETS, 1, 2)))
                .isPresent());
        assertTrue(wrong(
                        INJECTIVE,
                        new Answer.NoPeriod(),
                        new Certificate.Equations(words(4, 2, 4, 8), pair(COSETS, 0, 1)))
                .isPresent());
        assertTrue(wrong(BALANCED, new Answer.Balance(true), new Certificate.Difference(pair(MASK, 0, 2)))
                .isPresent());
    }
}
