package org.notchwork.problem.period;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.notchwork.bits.Word;
import org.notchwork.problem.Answer;
import org.notchwork.problem.BitFunction;
import org.notchwork.problem.Instance;
import org.notchwork.seed.RandomStream;
import org.notchwork.support.ChiSquared;
import org.notchwork.support.Streams;

class XorPeriodTest {

    private static long period(Instance instance) {
        return ((Answer.Period) instance.hidden()).s().bits();
    }

    /** The promise, point by point against point. */
    @ParameterizedTest
    @EnumSource(Labelling.class)
    void twoInputsHaveOneValueExactlyIfTheyDifferByThePeriod(Labelling labelling) {
        for (int width = 2; width <= 7; width++) {
            for (int i = 0; i < 10; i++) {
                Instance instance = new XorPeriod(labelling).draw(width, Streams.numbered("promise " + width, i));
                BitFunction f = instance.function();
                for (long x = 0; x < 1L << width; x++) {
                    assertEquals(0, f.at(x) >>> f.valueWidth());
                    for (long y = 0; y < x; y++) {
                        assertEquals((x ^ y) == period(instance), f.at(x) == f.at(y));
                    }
                }
            }
        }
    }

    @Test
    void thePromiseHoldsAtSampledPointsOfWidth63() {
        Instance instance = new XorPeriod(Labelling.PERMUTATION).draw(63, Streams.named("wide"));
        RandomStream points = Streams.named("points");
        for (int i = 0; i < 1000; i++) {
            long x = points.bits(63);
            BitFunction f = instance.function();
            assertEquals(f.at(x), f.at(x ^ period(instance)));
            assertNotEquals(f.at(x), f.at(x ^ points.nonZeroBits(62)));
        }
    }

    @Test
    void everyNonZeroPeriodIsEquallyLikely() {
        long[] counts = new long[15];
        for (int i = 0; i < 15_000; i++) {
            counts[(int) period(new XorPeriod(Labelling.TABLE).draw(4, Streams.numbered("period", i))) - 1]++;
        }
        ChiSquared.even(counts).assertFits();
    }

    @Test
    void everyLabelOfATableIsEquallyLikelyAtEveryPoint() {
        for (int x = 0; x < 8; x++) {
            long[] counts = new long[8];
            for (int i = 0; i < 8_000; i++) {
                counts[
                        (int) new XorPeriod(Labelling.TABLE)
                                .draw(3, Streams.numbered("label", i))
                                .function()
                                .at(x)]++;
            }
            ChiSquared.even(counts).assertFits();
        }
    }

    @Test
    void aTableFollowsItsDescription() {
        RandomStream stream = Streams.named("table");
        long s = stream.nonZeroBits(5);
        int[] labels = stream.distinct(16, 32);
        Instance instance = new XorPeriod(Labelling.TABLE).draw(5, Streams.named("table"));
        assertEquals(s, period(instance));
        int next = 0;
        for (long x = 0; x < 32; x++) {
            if ((x & Long.highestOneBit(s)) == 0) {
                assertEquals(labels[next++], instance.function().at(x));
            }
        }
        assertEquals(16, next);
    }

    @ParameterizedTest
    @EnumSource(Labelling.class)
    void anInstanceHidesTheAnswerItIsToldTo(Labelling labelling) {
        XorPeriod problem = new XorPeriod(labelling);
        List<Answer> answers = problem.answers(5);
        assertEquals(31, new HashSet<>(answers).size());
        for (Answer answer : answers) {
            Instance instance = problem.drawHiding(answer, 5, Streams.named("hiding"));
            assertEquals(answer, instance.hidden());
            assertEquals(instance.function().at(0), instance.function().at(period(instance)));
        }
        Answer other = new Answer.Period(Word.of(4, 1));
        assertThrows(IllegalArgumentException.class, () -> problem.drawHiding(other, 5, Streams.named("hiding")));
    }

    @ParameterizedTest
    @CsvSource({"TABLE, 1", "TABLE, 21", "PERMUTATION, 1", "PERMUTATION, 64"})
    void widthsOutsideTheBoundsAreRefused(Labelling labelling, int width) {
        XorPeriod problem = new XorPeriod(labelling);
        assertTrue(width < problem.leastWidth() || width > problem.greatestWidth());
        assertThrows(IllegalArgumentException.class, () -> problem.draw(width, Streams.named("bounds")));
    }

    @Test
    void periodsAreListedUpToWidth12() {
        XorPeriod problem = new XorPeriod(Labelling.TABLE);
        assertEquals(4095, problem.answers(12).size());
        assertThrows(IllegalArgumentException.class, () -> problem.answers(13));
    }

    @Test
    void theRepresentativeIsOneMemberOfItsCosetWithTheTopBitClear() {
        for (long s = 1; s < 64; s++) {
            Cosets cosets = new Cosets(6, s);
            List<Long> representatives = new ArrayList<>();
            for (long x = 0; x < 64; x++) {
                long r = cosets.representative(x);
                assertEquals(r, cosets.representative(x ^ s));
                assertTrue(r == x || r == (x ^ s));
                assertEquals(0, r & Long.highestOneBit(s));
                representatives.add(r);
            }
            assertEquals(32, new HashSet<>(representatives).size());
        }
        assertThrows(IllegalArgumentException.class, () -> new Cosets(6, 0));
        assertThrows(IllegalArgumentException.class, () -> new Cosets(6, 64));
    }

    /** The draw of s comes first and is all that a given answer saves; the labels follow. */
    @ParameterizedTest
    @EnumSource(Labelling.class)
    void aGivenAnswerSkipsTheDrawOfThePeriodAndNothingElse(Labelling labelling) {
        XorPeriod problem = new XorPeriod(labelling);
        for (int width = 2; width <= 9; width++) {
            RandomStream whole = Streams.numbered("skip", width);
            RandomStream rest = Streams.numbered("skip", width);
            Instance drawn = problem.draw(width, whole);
            assertEquals(new Answer.Period(Word.of(width, rest.nonZeroBits(width))), drawn.hidden());
            Instance given = problem.drawHiding(drawn.hidden(), width, rest);
            for (long x = 0; x < 1L << width; x++) {
                assertEquals(drawn.function().at(x), given.function().at(x));
            }
            assertEquals(whole.nextLong(), rest.nextLong());
        }
    }
}
