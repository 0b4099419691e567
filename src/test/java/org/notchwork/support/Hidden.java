package org.notchwork.support;

import java.util.List;
import java.util.stream.LongStream;
import org.notchwork.bits.Word;
import org.notchwork.problem.Answer;

/** Answers by their bits. */
public final class Hidden {

    private Hidden() {}

    /** Returns a period. */
    public static Answer period(int width, long s) {
        return new Answer.Period(Word.of(width, s));
    }

    /** Returns all periods of a width. */
    public static List<Answer> periods(int width) {
        return LongStream.range(1, 1L << width).mapToObj(s -> period(width, s)).toList();
    }

    /** Returns the bits of a period. */
    public static long bits(Answer answer) {
        return ((Answer.Period) answer).s().bits();
    }
}
