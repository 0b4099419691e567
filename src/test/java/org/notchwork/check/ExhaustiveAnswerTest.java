package org.notchwork.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.notchwork.bits.Word;
import org.notchwork.check.ExhaustiveAnswer.Found;
import org.notchwork.problem.Answer;
import org.notchwork.problem.BitFunction;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Problem;
import org.notchwork.problem.Promise;
import org.notchwork.problem.Question;
import org.notchwork.problem.affine.AffinePeriod;
import org.notchwork.problem.balance.ConstantOrBalanced;
import org.notchwork.problem.cipher.EvenMansour;
import org.notchwork.problem.mask.InnerProduct;
import org.notchwork.problem.period.Labelling;
import org.notchwork.problem.period.PeriodOrNone;
import org.notchwork.problem.period.XorPeriod;
import org.notchwork.problem.subspace.HiddenSubspace;
import org.notchwork.support.Given;
import org.notchwork.support.Hidden;
import org.notchwork.support.Streams;

class ExhaustiveAnswerTest {

    private static final Promise NEARLY = Promise.period(Promise.Labels.COLLIDING);
    private static final Promise NEARLY_OR_NONE = Promise.periodOrNone(Promise.Labels.COLLIDING);
    private static final Promise PLANE = new Promise(Question.SUBSPACE, 2, Promise.Labels.RANDOM, false);
    private static final Promise MASK = new Promise(Question.MASK, 0, Promise.Labels.RANDOM, false);
    private static final Promise MASK_AND_BIT = new Promise(Question.MASK, 0, Promise.Labels.RANDOM, true);
    private static final Promise BALANCE = new Promise(Question.CONSTANT_OR_BALANCED, 0, Promise.Labels.RANDOM, false);

    static Stream<Problem> exact() {
        return Stream.of(
                new XorPeriod(Labelling.TABLE),
                new PeriodOrNone(Labelling.TABLE),
                new PeriodOrNone(Labelling.PERMUTATION),
                new HiddenSubspace(1),
                new HiddenSubspace(2),
                new HiddenSubspace(3),
                new InnerProduct(false),
                new InnerProduct(true),
                new ConstantOrBalanced(),
                new AffinePeriod());
    }

    @ParameterizedTest
    @MethodSource("exact")
    void whatAnInstanceHidesIsTheOneAnswerFound(Problem problem) {
        for (int width = Math.max(4, problem.leastWidth()); width <= 7; width++) {
            for (long number = 0; number < 40; number++) {
                Instance instance = problem.draw(width, Streams.numbered(problem.kind() + width, number));
                assertEquals(
                        new Found.Right(List.of(instance.hidden()), 0),
                        ExhaustiveAnswer.search(instance.function(), problem.promise()));
            }
        }
    }

    /** One value changed: the promise is broken, and two inputs are named. */
    @ParameterizedTest
    @MethodSource("exact")
    void oneValueChangedBreaksThePromise(Problem problem) {
        for (long number = 0; number < 20; number++) {
            Instance instance = problem.draw(5, Streams.numbered("broken " + problem.kind(), number));
            BitFunction function = instance.function();
            long point = number % 32;
            long other = function.valueWidth() == 1 ? 1 - function.at(point) : function.at(point ^ 7);
            if (other == function.at(point)) {
                continue;
            }
            Found.Broken broken = assertInstanceOf(
                    Found.Broken.class,
                    ExhaustiveAnswer.search(Given.changed(function, point, other), problem.promise()));
            assertTrue(!broken.why().isEmpty());
        }
    }

    private static Found search(Promise promise, int width, int valueWidth, long... values) {
        return ExhaustiveAnswer.search(Given.of(width, valueWidth, values), promise);
    }

    /** Equal pairs: 0 and 3, 1 and 2 by the period 3 twice; all four alike add four more by accident. */
    @Test
    void nearlyKeptPromisesCountTheAccidents() {
        assertEquals(new Found.Right(List.of(Hidden.period(2, 3)), 0), search(NEARLY, 2, 2, 0, 1, 1, 0));
        assertEquals(new Found.Right(Hidden.periods(2), 0), search(NEARLY, 2, 2, 1, 1, 1, 1));
        // Period 4 of 8 inputs, and the values at 0 and 1 alike: six pairs among 0, 1, 4, 5, of which two are
        // explained.
        assertEquals(new Found.Right(List.of(Hidden.period(3, 4)), 4), search(NEARLY, 3, 3, 0, 0, 2, 3, 0, 0, 2, 3));
        assertEquals(new Found.Right(List.of(new Answer.NoPeriod()), 1), search(NEARLY_OR_NONE, 2, 2, 0, 1, 2, 0));
        assertEquals(new Found.Right(List.of(new Answer.NoPeriod()), 0), search(NEARLY_OR_NONE, 2, 2, 0, 1, 2, 3));
    }

    @Test
    void toysOfCiphersHaveTheirKeyAmongTheirPeriods() {
        EvenMansour problem = new EvenMansour();
        for (long number = 0; number < 50; number++) {
            Instance instance = problem.draw(5, Streams.numbered("cipher", number));
            Found.Right right = assertInstanceOf(
                    Found.Right.class, ExhaustiveAnswer.search(instance.function(), problem.promise()));
            assertTrue(right.answers().contains(instance.hidden()));
            long equal = 0;
            for (int x = 0; x < 32; x++) {
                for (int y = 0; y < x; y++) {
                    equal += instance.function().at(x) == instance.function().at(y) ? 1 : 0;
                }
            }
            assertEquals(equal, right.accidents() + 16L * right.answers().size());
        }
    }

    @Test
    void subspacesAreFoundInReducedForm() {
        assertEquals(
                new Found.Right(List.of(new Answer.Subspace(List.of(Word.of(3, 5), Word.of(3, 3)))), 0),
                search(PLANE, 3, 1, 0, 1, 1, 0, 1, 0, 0, 1));
    }

    @Test
    void brokenSubspacesNameTwoInputs() {
        // Four inputs share the value of 0, but 1 + 2 = 3 is not among 0, 1, 2, 4.
        assertInstanceOf(Found.Broken.class, search(PLANE, 3, 2, 0, 0, 0, 1, 0, 1, 1, 1));
        Found.Broken few = assertInstanceOf(Found.Broken.class, search(PLANE, 3, 2, 0, 0, 2, 2, 1, 1, 3, 3));
        assertEquals("inputs 0 and 1: 2 inputs have the value of 0", few.why());
        // Cosets of the right subspace with one value.
        assertInstanceOf(Found.Broken.class, search(PLANE, 3, 2, 0, 0, 0, 0, 0, 0, 0, 0));
    }

    @Test
    void innerProductsAreFoundWithAndWithoutTheirBit() {
        assertEquals(new Found.Right(List.of(new Answer.Mask(Word.of(2, 2))), 0), search(MASK, 2, 1, 0, 0, 1, 1));
        assertEquals(
                new Found.Right(List.of(new Answer.Mask(Word.of(2, 2))), 0), search(MASK_AND_BIT, 2, 1, 1, 1, 0, 0));
        assertEquals(
                new Found.Right(List.of(new Answer.Mask(Word.of(2, 0))), 0), search(MASK_AND_BIT, 2, 1, 1, 1, 1, 1));
        assertEquals(new Found.Broken("input 0 has the value 1"), search(MASK, 2, 1, 1, 1, 0, 0));
        assertInstanceOf(Found.Broken.class, search(MASK, 2, 1, 0, 0, 0, 1));
        assertInstanceOf(Found.Broken.class, search(MASK_AND_BIT, 2, 1, 1, 0, 0, 0));
    }

    @Test
    void constantAndBalancedFunctionsAreTold() {
        assertEquals(new Found.Right(List.of(new Answer.Balance(false)), 0), search(BALANCE, 2, 1, 1, 1, 1, 1));
        assertEquals(new Found.Right(List.of(new Answer.Balance(false)), 0), search(BALANCE, 2, 1, 0, 0, 0, 0));
        assertEquals(new Found.Right(List.of(new Answer.Balance(true)), 0), search(BALANCE, 2, 1, 1, 0, 0, 1));
        assertEquals(new Found.Broken("1 values are 1 and 3 are 0"), search(BALANCE, 2, 1, 1, 0, 0, 0));
        assertEquals(new Found.Broken("a value has more than one bit"), search(BALANCE, 2, 2, 2, 0, 0, 1));
    }

    @Test
    void aPeriodOrNoneIsNeitherInBetween() {
        Promise promise = Promise.periodOrNone(Promise.Labels.RANDOM);
        assertEquals(new Found.Right(List.of(new Answer.NoPeriod()), 0), search(promise, 2, 2, 3, 1, 0, 2));
        assertEquals(new Found.Right(List.of(Hidden.period(2, 2)), 0), search(promise, 2, 2, 3, 1, 3, 1));
        assertInstanceOf(Found.Broken.class, search(promise, 2, 2, 3, 1, 3, 0));
    }
}
