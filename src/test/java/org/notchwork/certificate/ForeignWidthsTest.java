package org.notchwork.certificate;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.function.LongUnaryOperator;
import org.junit.jupiter.api.Test;
import org.notchwork.bits.Word;
import org.notchwork.check.ExhaustiveSearch;
import org.notchwork.problem.Answer;
import org.notchwork.problem.BitFunction;
import org.notchwork.problem.Certificate;
import org.notchwork.problem.Pair;

/** Words that do not fit the function are a finding, not a crash: certificates come from files of strangers. */
class ForeignWidthsTest {

    private static final Answer PERIOD = new Answer.Period(Word.of(3, 5));
    private final BitFunction function = function(3, 3, x -> Math.min(x, x ^ 5));

    @Test
    void aCollisionOfAnotherWidthIsAFinding() {
        assertTrue(CertificateCheck.check(function, PERIOD, collision(3, 3)).isEmpty());
        assertEquals("/collision", fault(PERIOD, collision(4, 3)));
        assertEquals("/collision", fault(PERIOD, collision(70, 3)));
        assertEquals("/collision", fault(PERIOD, collision(3, 2)));
        assertEquals("", fault(new Answer.Period(Word.of(4, 5)), collision(3, 3)));
        assertEquals("", fault(new Answer.Period(Word.of(90, 5)), collision(90, 3)));
    }

    @Test
    void anEquationOfAnotherWidthIsAFinding() {
        Pair confirmation = pair(3, 3);
        List<Word> words = List.of(Word.of(3, 2), Word.of(3, 5));
        assertTrue(CertificateCheck.check(function, PERIOD, new Certificate.Equations(words, confirmation))
                .isEmpty());
        List<Word> wide = List.of(Word.of(3, 2), Word.of(4, 5));
        assertEquals("/equations/words/1", fault(PERIOD, new Certificate.Equations(wide, confirmation)));
        assertEquals("/equations/confirmation", fault(PERIOD, new Certificate.Equations(words, pair(64, 3))));
    }

    @Test
    void aValueWithTooManyBitsIsABrokenPromise() {
        assertEquals(
                new ExhaustiveSearch.Found.Broken(0, 0, "the value 4 has too many bits"),
                ExhaustiveSearch.search(function(2, 2, x -> 4 + x)));
        assertEquals(
                new ExhaustiveSearch.Found.Broken(0, 0, "the value -1 has too many bits"),
                ExhaustiveSearch.search(function(2, 2, x -> -1)));
    }

    @Test
    void aDomainThatCannotBeSearchedIsRefused() {
        assertThrows(IllegalArgumentException.class, () -> ExhaustiveSearch.search(function(21, 4, x -> 0)));
        assertThrows(IllegalArgumentException.class, () -> ExhaustiveSearch.search(function(4, 40, x -> 0)));
    }

    private String fault(Answer answer, Certificate certificate) {
        return CertificateCheck.check(function, answer, certificate)
                .orElseThrow()
                .member();
    }

    private static Certificate collision(int width, int valueWidth) {
        return new Certificate.Collision(pair(width, valueWidth));
    }

    private static Pair pair(int width, int valueWidth) {
        return new Pair(Word.of(width, 0), Word.of(width, 5), Word.of(valueWidth, 0), Word.of(valueWidth, 0));
    }

    private static BitFunction function(int width, int valueWidth, LongUnaryOperator values) {
        return new BitFunction() {
            @Override
            public int width() {
                return width;
            }

            @Override
            public int valueWidth() {
                return valueWidth;
            }

            @Override
            public long at(long x) {
                return values.applyAsLong(x);
            }
        };
    }
}
