package org.notchwork.cli;

import java.io.PrintStream;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.notchwork.bits.EchelonBasis;
import org.notchwork.bits.Word;
import org.notchwork.json.Printable;
import org.notchwork.problem.Answer;
import org.notchwork.problem.AnswerText;
import org.notchwork.problem.BitFunction;
import org.notchwork.problem.Certificate;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Meter;
import org.notchwork.problem.Oracle;
import org.notchwork.problem.Pair;
import org.notchwork.seed.Address;
import org.notchwork.seed.SeedTree;
import org.notchwork.strategy.ClassicalStrategy;
import org.notchwork.study.Experiment;
import org.notchwork.study.StrategyChoice;
import org.notchwork.trial.Outcome;
import org.notchwork.trial.TrialRecord;

/** Walks one recorded trial step by step, as a referee would do it by hand. */
final class TrialWalk {

    private static final int SHOWN_FIRST = 24;
    private static final int SHOWN_LAST = 6;

    private final SeedTree seeds;
    private final PrintStream out;

    TrialWalk(SeedTree seeds, PrintStream out) {
        this.seeds = seeds;
        this.out = out;
    }

    /** Prints the walk of a trial of an experiment. */
    void walk(Experiment experiment, StrategyChoice choice, TrialRecord trial) {
        int width = trial.cell().width();
        Instance instance =
                experiment.problem().draw(width, seeds.stream(Address.instance(experiment.id(), width, trial.trial())));
        BitFunction function = instance.function();
        out.println("trial " + trial.cell().id() + "/" + trial.trial() + ": "
                + trial.outcome().word());
        out.println("problem: " + experiment.problem().description());
        out.println("strategy: " + choice.strategy().description());
        choice.engine()
                .ifPresent(e ->
                        out.println("engine: " + e.name() + ", " + e.sight().word() + ": " + e.description()));
        out.println("the instance, drawn again from the seed, hides " + text(instance.hidden()) + "; recorded: "
                + text(trial.hidden()) + same(instance.hidden().equals(trial.hidden())));
        out.println();
        boolean isListed = instance.parts().isEmpty() && width < Long.SIZE;
        if (choice.strategy() instanceof ClassicalStrategy classical && isListed) {
            queries(classical, experiment, choice, trial, function);
        }
        trial.certificate().ifPresent(c -> certificate(c, function));
        out.println();
        trial.answer()
                .ifPresentOrElse(
                        a -> out.println(
                                "answer: " + text(a) + same(a.equals(instance.hidden())) + " as what is hidden"),
                        () -> out.println(
                                trial.outcome() == Outcome.CENSORED
                                        ? "no answer: the query limit of " + experiment.queryLimit() + " was reached"
                                        : "no answer: the strategy had done all that it does"));
        out.println("calls recorded: " + trial.counts().classical() + " classical, "
                + trial.counts().quantum() + " quantum, " + trial.counts().inverse() + " inverse, "
                + trial.counts().confirming() + " confirming");
    }

    private void queries(
            ClassicalStrategy strategy,
            Experiment experiment,
            StrategyChoice choice,
            TrialRecord trial,
            BitFunction function) {
        Recorder recorder = new Recorder(function);
        Meter meter = new Meter(experiment.queryLimit());
        strategy.attempt(
                new Oracle(recorder, experiment.problem().promise(), meter),
                seeds.stream(Address.strategy(experiment.id(), function.width(), trial.trial(), choice.label())));
        out.println("queries, asked again now:");
        Map<Long, Integer> seen = new HashMap<>();
        int asked = recorder.points.size();
        for (int i = 0; i < asked; i++) {
            long value = recorder.values.get(i);
            Integer earlier = seen.putIfAbsent(value, i);
            if (i < SHOWN_FIRST || i >= asked - SHOWN_LAST) {
                out.println("  " + (i + 1) + ": f(" + hex(function.width(), recorder.points.get(i)) + ") = "
                        + hex(function.valueWidth(), value)
                        + (earlier == null ? "" : ", the value of query " + (earlier + 1)));
            } else if (i == SHOWN_FIRST) {
                out.println("  ... " + (asked - SHOWN_FIRST - SHOWN_LAST) + " more, all values different");
            }
        }
        out.println("asked now: " + meter.counts().queries() + "; recorded: "
                + trial.counts().queries()
                + same(meter.counts().equals(trial.counts())));
        out.println();
    }

    private void certificate(Certificate certificate, BitFunction function) {
        if (certificate instanceof Certificate.Collision collision) {
            out.println("certificate: a collision");
            pair(collision.pair(), function);
        } else if (certificate instanceof Certificate.Equations equations) {
            out.println("certificate: independent words y, each with y·s = 0; eliminated one by one:");
            eliminate(equations.words(), 1, function.width());
            out.println("confirmation by two classical queries:");
            pair(equations.confirmation(), function);
        } else if (certificate instanceof Certificate.Collisions collisions) {
            out.println("certificate: collisions whose sums span the subspace");
            collisions.pairs().forEach(p -> pair(p, function));
        } else if (certificate instanceof Certificate.Annihilators annihilators) {
            out.println("certificate: independent words orthogonal to the subspace; eliminated one by one:");
            eliminate(annihilators.words(), annihilators.confirmations().size(), function.width());
            out.println("confirmation of each word of a basis by classical queries:");
            annihilators.confirmations().forEach(p -> pair(p, function));
        } else if (certificate instanceof Certificate.Spanning spanning) {
            out.println("certificate: measured words that span everything; eliminated one by one:");
            eliminate(spanning.words(), 0, function.width());
        } else if (certificate instanceof Certificate.Difference difference) {
            out.println("certificate: two points with different values");
            pair(difference.pair(), function);
        } else if (certificate instanceof Certificate.Absent absent) {
            out.println("no certificate that evaluations could check; the answer rests on "
                    + Printable.escape(absent.basis()));
        }
    }

    private void eliminate(List<Word> words, int wanted, int width) {
        EchelonBasis basis = new EchelonBasis(width);
        for (Word word : words) {
            long rest = basis.reduce(word.bits());
            boolean independent = basis.add(word.bits());
            out.println("  y = " + word.hex() + "  " + binary(width, word.bits()) + "  reduced " + binary(width, rest)
                    + "  rank " + basis.rank() + (independent ? "" : "  DEPENDENT"));
        }
        long[] solutions = basis.complement();
        if (solutions.length != wanted) {
            out.println("  the words leave " + solutions.length + " dimensions open, so they do not fix the answer");
            return;
        }
        if (solutions.length != 1) {
            out.println("  the words leave " + solutions.length + " dimensions, as they should");
            return;
        }
        Word solution = Word.of(width, solutions[0]);
        out.println("  the only word orthogonal to all of them, 0 apart: s = " + solution.hex() + "  "
                + binary(width, solutions[0]));
        long orthogonal = words.stream().filter(w -> w.dot(solution) == 0).count();
        out.println("  y·s = 0 holds for " + orthogonal + " of " + words.size());
    }

    private void pair(Pair pair, BitFunction function) {
        Word nowX = function.at(pair.x());
        Word nowY = function.at(pair.y());
        out.println("  f(" + pair.x().hex() + ") = " + nowX.hex() + ", recorded "
                + pair.fx().hex() + same(nowX.equals(pair.fx())));
        out.println("  f(" + pair.y().hex() + ") = " + nowY.hex() + ", recorded "
                + pair.fy().hex() + same(nowY.equals(pair.fy())));
        out.println("  " + pair.x().hex() + " xor " + pair.y().hex() + " = "
                + pair.x().xor(pair.y()).hex() + (pair.collides() ? ", two points with one value" : ", NO COLLISION"));
    }

    private static String text(Answer answer) {
        return (answer instanceof Answer.Period ? "s = " : "") + AnswerText.of(answer);
    }

    private static String same(boolean equal) {
        return equal ? " (the same)" : " (DIFFERENT)";
    }

    private static String hex(int width, long word) {
        return Word.of(width, word).hex();
    }

    private static String binary(int width, long word) {
        String digits = Long.toBinaryString(word);
        return "0".repeat(width - digits.length()) + digits;
    }

    /** A function that writes down where it was evaluated. */
    private static final class Recorder implements BitFunction {

        private final BitFunction function;
        private final List<Long> points = new ArrayList<>();
        private final List<Long> values = new ArrayList<>();

        Recorder(BitFunction function) {
            this.function = function;
        }

        @Override
        public int width() {
            return function.width();
        }

        @Override
        public int valueWidth() {
            return function.valueWidth();
        }

        @Override
        public long at(long x) {
            long value = function.at(x);
            points.add(x);
            values.add(value);
            return value;
        }
    }
}
