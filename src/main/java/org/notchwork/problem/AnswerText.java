package org.notchwork.problem;

import java.util.stream.Collectors;
import org.notchwork.bits.Word;

/** Answers as people read them. */
public final class AnswerText {

    private AnswerText() {}

    /** Returns the digits of a word, the words of a basis, or what was decided. */
    public static String of(Answer answer) {
        if (answer instanceof Answer.Period period) {
            return period.s().hex();
        }
        if (answer instanceof Answer.Subspace subspace) {
            return subspace.basis().stream().map(Word::hex).collect(Collectors.joining(" ", "span of ", ""));
        }
        if (answer instanceof Answer.Mask mask) {
            return mask.a().hex();
        }
        if (answer instanceof Answer.NoPeriod) {
            return "no period";
        }
        return ((Answer.Balance) answer).isBalanced() ? "balanced" : "constant";
    }
}
