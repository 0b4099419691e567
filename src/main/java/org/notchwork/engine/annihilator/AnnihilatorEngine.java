package org.notchwork.engine.annihilator;

import java.util.List;
import java.util.Optional;
import org.notchwork.bits.Word;
import org.notchwork.engine.Circuit;
import org.notchwork.engine.SightedEngine;
import org.notchwork.engine.Simulation;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Problem;
import org.notchwork.problem.Promise;
import org.notchwork.problem.Question;
import org.notchwork.problem.Unitary;

/**
 * Samples uniformly from the words orthogonal to what is hidden, the distribution that theory gives. It is TOLD the
 * secret: its figures show what theory says, not that a circuit would find it.
 */
public final class AnnihilatorEngine implements SightedEngine {

    /** The name in study files. */
    public static final String NAME = "annihilator";

    private static final int WIDTH = 63;

    @Override
    public String name() {
        return NAME;
    }

    @Override
    public String description() {
        return "told the secret: samples uniformly from the words orthogonal to it, as theory says a circuit would";
    }

    @Override
    public Optional<String> refusal(Problem problem, int width, Circuit circuit) {
        if (width > WIDTH) {
            boolean affine = problem.promise().labels() == Promise.Labels.AFFINE;
            return Optional.of("annihilator reaches width " + WIDTH + ", not " + width + "; "
                    + (affine ? "engine stabilizer reaches it" : "no engine reaches it"));
        }
        if (!problem.promise().isExact() || problem.isPromiseBroken()) {
            return Optional.of(
                    "annihilator samples what theory gives where the promise holds, and this one holds nearly"
                            + " at best; engine weights takes any function");
        }
        if (problem.promise().question() == Question.CONSTANT_OR_BALANCED) {
            return Optional.of("annihilator knows only whether the outcome is 0, which is the answer itself; engine"
                    + " weights works from the function");
        }
        return Optional.empty();
    }

    @Override
    public long memoryBytes(int width) {
        return 64;
    }

    @Override
    public Simulation open(Unitary unitary, Answer hidden) {
        if (hidden instanceof Answer.Mask mask && mask.a().width() == unitary.width()) {
            return new ToldMask(unitary, mask.a().bits());
        }
        return new ToldSubspace(unitary, rows(hidden, unitary.width()));
    }

    private static long[] rows(Answer hidden, int width) {
        List<Word> basis = List.of();
        if (hidden instanceof Answer.Period period) {
            basis = List.of(period.s());
        } else if (hidden instanceof Answer.Subspace subspace) {
            basis = subspace.basis();
        } else if (!(hidden instanceof Answer.NoPeriod)) {
            throw new IllegalArgumentException("annihilator needs a period, a subspace or a word: " + hidden);
        }
        if (basis.stream().anyMatch(word -> word.width() != width)) {
            throw new IllegalArgumentException("annihilator needs words of " + width + " bits: " + hidden);
        }
        return basis.stream().mapToLong(Word::bits).toArray();
    }
}
