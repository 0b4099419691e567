package org.notchwork.strategy;

import java.util.Optional;
import java.util.Set;
import org.notchwork.problem.Problem;
import org.notchwork.problem.Question;

/** Which problems a strategy takes on, and the words in which it declines the others. */
public final class Answering {

    private Answering() {}

    /** Declines a problem with another question. */
    public static Optional<String> only(String name, Problem problem, Set<Question> questions) {
        return questions.contains(problem.promise().question())
                ? Optional.empty()
                : Optional.of(name + " does not answer what " + problem.kind() + " asks");
    }

    /** Declines a problem with another question, and one where equal values can be an accident. */
    public static Optional<String> exactly(String name, Problem problem, Set<Question> questions) {
        return only(name, problem, questions)
                .or(() -> problem.promise().isExact()
                        ? Optional.empty()
                        : Optional.of(name + " takes the first equal values for the answer, and in " + problem.kind()
                                + " they can be an accident; collision-counting verifies"));
    }
}
