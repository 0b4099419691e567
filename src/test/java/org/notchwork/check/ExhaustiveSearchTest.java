package org.notchwork.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.bits.Word;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Instance;
import org.notchwork.problem.period.Labelling;
import org.notchwork.problem.period.XorPeriod;
import org.notchwork.support.Given;
import org.notchwork.support.Streams;

class ExhaustiveSearchTest {

    @ParameterizedTest
    @EnumSource(Labelling.class)
    void thePeriodOfAnInstanceIsFound(Labelling labelling) {
        for (int width = 2; width <= 9; width++) {
            Instance instance = new XorPeriod(labelling).draw(width, Streams.numbered("search", width));
            ExhaustiveSearch.Found.Period found =
                    assertInstanceOf(ExhaustiveSearch.Found.Period.class, ExhaustiveSearch.search(instance.function()));
            assertEquals(instance.hidden(), new Answer.Period(Word.of(width, found.s())));
        }
    }

    @ParameterizedTest
    @CsvSource({
        "0 0 0 1, 0, 2, a third input has the value 0",
        "0 1 2 3, 0, 0, no other input has its value 0",
        "2 2 3 1, 3, 3, no other input has its value 1",
        "0 0 1 2 1 2 3 3, 2, 4, 'they differ by 6, others by 1'"
    })
    void aBrokenPromiseIsShownByTwoInputs(String values, long x, long y, String why) {
        String[] parts = values.split(" ", -1);
        long[] numbers = new long[parts.length];
        for (int i = 0; i < parts.length; i++) {
            numbers[i] = Long.parseLong(parts[i]);
        }
        Given function = Given.of(Integer.numberOfTrailingZeros(parts.length), 2, numbers);
        assertEquals(new ExhaustiveSearch.Found.Broken(x, y, why), ExhaustiveSearch.search(function));
    }

    @ParameterizedTest
    @ValueSource(ints = {0, 5, 31})
    void oneChangedValueBreaksThePromise(int point) {
        Instance instance = new XorPeriod(Labelling.TABLE).draw(5, Streams.named("changed"));
        for (long value = 0; value < 32; value++) {
            boolean same = value == instance.function().at(point);
            ExhaustiveSearch.Found found = ExhaustiveSearch.search(Given.changed(instance.function(), point, value));
            assertEquals(same, found instanceof ExhaustiveSearch.Found.Period);
        }
    }
}
