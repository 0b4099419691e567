package org.notchwork.check;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigDecimal;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.function.LongUnaryOperator;
import org.junit.jupiter.api.Test;
import org.notchwork.Studies;
import org.notchwork.bits.Word;
import org.notchwork.catalogue.Engines;
import org.notchwork.catalogue.Laws;
import org.notchwork.engine.BlindEngine;
import org.notchwork.engine.Outcomes;
import org.notchwork.engine.Simulation;
import org.notchwork.figure.CellFigures;
import org.notchwork.figure.Interval;
import org.notchwork.figure.QueryFigures;
import org.notchwork.law.Prediction;
import org.notchwork.law.QueryLaw;
import org.notchwork.law.SequentialScanLaw;
import org.notchwork.problem.Answer;
import org.notchwork.problem.BitFunction;
import org.notchwork.problem.CallKind;
import org.notchwork.problem.Certificate;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Oracle;
import org.notchwork.problem.Pair;
import org.notchwork.problem.Problem;
import org.notchwork.problem.Unitary;
import org.notchwork.seed.RandomStream;
import org.notchwork.seed.SeedTree;
import org.notchwork.strategy.Attempt;
import org.notchwork.strategy.ClassicalStrategy;
import org.notchwork.study.Cell;
import org.notchwork.study.Experiment;
import org.notchwork.study.Study;
import org.notchwork.trial.TrialGroup;
import org.notchwork.trial.TrialRecord;
import org.notchwork.trial.TrialRunner;

/** Every cross-check agrees on honest data and finds a fault that is put there. */
class CrossChecksTest {

    private final Study study = Studies.small();
    private final Experiment experiment = study.experiments().get(0);
    private final TrialRunner runner = new TrialRunner(new SeedTree(study.seed()));
    private final Instance instance = runner.instance(experiment, 5, 1);
    private final TrialGroup group = runner.run(experiment, 5, 1);
    private final InstanceExaminer examiner = new InstanceExaminer(Engines.all());

    @Test
    void honestInstancesAgreeInEveryRespect() {
        InstanceTally tally = examiner.examine(experiment, instance, group);
        assertEquals(new Comparison(1, 0, Optional.empty()), tally.promise());
        assertEquals(new Comparison(7, 0, Optional.empty()), tally.answers());
        assertEquals(new Comparison(3, 0, Optional.empty()), tally.engines());
    }

    @Test
    void aBrokenPromiseIsFoundWithItsTwoInputs() {
        for (long at = 0; at < 32; at++) {
            long broken = at;
            BitFunction function = changed(instance.function(), x -> x == broken ? 31 ^ value(x) : value(x));
            InstanceTally tally = examiner.examine(experiment, new Instance(function, instance.hidden()), group);
            assertEquals(CheckOutcome.DIFFERS, tally.promise().outcome());
            assertTrue(
                    tally.promise().text().contains("trial 1: inputs"),
                    tally.promise().text());
        }
    }

    @Test
    void aFunctionWithAnotherPeriodThanTheHiddenOneIsFound() {
        long s = ((Answer.Period) instance.hidden()).s().bits();
        Answer other = new Answer.Period(Word.of(5, s == 1 ? 2 : s ^ 1));
        InstanceTally tally = examiner.examine(experiment, new Instance(instance.function(), other), group);
        assertEquals(CheckOutcome.DIFFERS, tally.promise().outcome());
    }

    @Test
    void aWrongAnswerIsFoundByExhaustiveSearch() {
        TrialRecord right = group.records().get(1);
        long s = ((Answer.Period) instance.hidden()).s().bits();
        TrialRecord wrong = new TrialRecord(
                right.cell(),
                right.trial(),
                right.hidden(),
                right.outcome(),
                Optional.of(new Answer.Period(Word.of(5, s == 7 ? 8 : 7))),
                right.certificate(),
                right.counts(),
                right.usage());
        InstanceTally tally = examiner.examine(experiment, instance, new TrialGroup("all", 5, 1, List.of(wrong)));
        assertEquals(new Comparison(2, 1, Optional.of("trial 1: random-draws answers otherwise")), tally.answers());
    }

    @Test
    void anEngineWithAWrongDistributionIsFound() {
        InstanceTally tally = new InstanceExaminer(List.of(new UniformEngine())).examine(experiment, instance, group);
        assertEquals(CheckOutcome.DIFFERS, tally.engines().outcome());
        assertTrue(
                tally.engines().text().contains("uniform differs on 32 words"),
                tally.engines().text());
    }

    @Test
    void aStrategyThatCountsOneTooFewIsFoundOverAllSecrets() {
        AllSecrets allSecrets = new AllSecrets(new SeedTree(study.seed()));
        ClassicalStrategy honest = (ClassicalStrategy)
                experiment.choice("sequential-scan").orElseThrow().strategy();
        QueryLaw law = new SequentialScanLaw();
        assertEquals(
                CheckOutcome.AGREES,
                allSecrets.check(experiment, 5, "c", honest, law).outcome());
        assertEquals(
                CheckOutcome.DIFFERS,
                allSecrets.check(experiment, 5, "c", new OneMore(honest), law).outcome());
        assertEquals(
                CheckOutcome.DIFFERS,
                allSecrets
                        .check(
                                experiment,
                                5,
                                "c",
                                honest,
                                Laws.law("xor-period", "difference-cover").orElseThrow())
                        .outcome());
    }

    @Test
    void aCountOffByOneIsFoundByTheClosedForm() {
        LineChecks lines = new LineChecks(study);
        lines.add(group);
        Cell cell = group.records().get(0).cell();
        assertEquals(CheckOutcome.AGREES, lines.check(cell).orElseThrow().outcome());
        TrialRecord record = group.records().get(0);
        TrialRecord off = new TrialRecord(
                cell,
                record.trial(),
                record.hidden(),
                record.outcome(),
                record.answer(),
                record.certificate(),
                record.counts().plus(CallKind.CLASSICAL),
                record.usage());
        lines.add(new TrialGroup("all", 5, 1, List.of(off)));
        assertEquals(CheckOutcome.DIFFERS, lines.check(cell).orElseThrow().outcome());
    }

    @Test
    void aMeanFiveErrorsAwayDiffersAndAMeanNearbyAgrees() {
        SequentialScanLaw law = new SequentialScanLaw();
        BigDecimal mean = law.mean(5).value();
        // Variance 30, 30 trials: the standard error is 1.
        assertEquals(CheckOutcome.AGREES, theory(mean.add(new BigDecimal("4.9")), 0, law));
        assertEquals(CheckOutcome.DIFFERS, theory(mean.add(new BigDecimal("5.1")), 0, law));
        assertEquals(CheckOutcome.DIFFERS, theory(mean.subtract(new BigDecimal("5.1")), 0, law));
        assertEquals(CheckOutcome.NOT_COMPARABLE, theory(mean, 1, law));
    }

    @Test
    void aLawWithoutChanceIsHeldToEquality() {
        QueryLaw constant = new ConstantLaw();
        assertEquals(CheckOutcome.AGREES, theory(BigDecimal.TEN, 0, constant));
        assertEquals(CheckOutcome.DIFFERS, theory(new BigDecimal("10.000001"), 0, constant));
    }

    @Test
    void everyFaultOfACertificateIsFound() {
        TrialRecord collision = group.records().get(1);
        Pair pair = ((Certificate.Collision) collision.certificate().orElseThrow()).pair();
        Answer answer = collision.answer().orElseThrow();
        assertTrue(check(answer, new Certificate.Collision(pair)).isEmpty());
        Word other = Word.of(5, pair.y().bits() ^ 1);
        assertEquals(
                "/collision/fy",
                fault(answer, new Certificate.Collision(new Pair(pair.x(), other, pair.fx(), pair.fy()))));
        assertEquals(
                "/collision/fx",
                fault(
                        answer,
                        new Certificate.Collision(new Pair(
                                pair.x(), pair.y(), Word.of(5, pair.fx().bits() ^ 1), pair.fy()))));
        assertEquals(
                "/collision/y",
                fault(answer, new Certificate.Collision(new Pair(pair.x(), pair.x(), pair.fx(), pair.fx()))));
        TrialRecord fourier = group.records().get(4);
        Certificate.Equations equations = assertInstanceOf(
                Certificate.Equations.class, fourier.certificate().orElseThrow());
        assertTrue(check(answer, equations).isEmpty());
        List<Word> words = equations.words();
        List<Word> dependent = List.of(words.get(0), words.get(1), words.get(0).xor(words.get(1)), words.get(3));
        assertEquals("/equations/words", fault(answer, new Certificate.Equations(dependent, equations.confirmation())));
        assertEquals(
                "/equations/words",
                fault(answer, new Certificate.Equations(words.subList(0, 3), equations.confirmation())));
        long s = ((Answer.Period) answer).s().bits();
        Word slanted = words.get(2).xor(Word.of(5, Long.highestOneBit(s)));
        assertEquals(
                "/equations/words/2",
                fault(
                        answer,
                        new Certificate.Equations(
                                List.of(words.get(0), words.get(1), slanted, words.get(3)), equations.confirmation())));
        assertEquals(
                "/equations/confirmation/x",
                fault(answer, new Certificate.Equations(words, pair.x().isZero() ? swapped(pair) : pair)));
    }

    private static Pair swapped(Pair pair) {
        return new Pair(pair.y(), pair.x(), pair.fy(), pair.fx());
    }

    private Optional<CertificateCheck.Wrong> check(Answer answer, Certificate certificate) {
        return CertificateCheck.check(instance.function(), answer, certificate);
    }

    private String fault(Answer answer, Certificate certificate) {
        return check(answer, certificate).orElseThrow().member();
    }

    private static CheckOutcome theory(BigDecimal mean, long censored, QueryLaw law) {
        QueryFigures queries = new QueryFigures(mean, Optional.of(BigDecimal.ONE), Optional.empty(), 1, 1, 1, 1, 1);
        CellFigures figures = new CellFigures(
                new Cell("all", 5, "c"),
                Optional.empty(),
                Optional.empty(),
                30,
                30 - censored,
                0,
                censored,
                queries,
                0,
                BigDecimal.ONE,
                new Interval(BigDecimal.ZERO, BigDecimal.ONE));
        return TheoryMean.check(figures, law).outcome();
    }

    private long value(long x) {
        return instance.function().at(x);
    }

    private static BitFunction changed(BitFunction function, LongUnaryOperator values) {
        return new BitFunction() {
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
                return values.applyAsLong(x);
            }
        };
    }

    /** An engine that has forgotten the function: every word is equally likely. */
    private static final class UniformEngine implements BlindEngine {

        @Override
        public String name() {
            return "uniform";
        }

        @Override
        public String description() {
            return "wrong on purpose";
        }

        @Override
        public Optional<String> refusal(Problem problem, int width) {
            return Optional.empty();
        }

        @Override
        public long memoryBytes(int width) {
            return 0;
        }

        @Override
        public Simulation open(Unitary unitary) {
            return new Simulation() {
                @Override
                public long fourierSample(RandomStream stream) {
                    return stream.bits(unitary.width());
                }

                @Override
                public Outcomes outcomes() {
                    long[] weights = new long[1 << unitary.width()];
                    Arrays.fill(weights, 1);
                    return new Outcomes(weights);
                }
            };
        }
    }

    /** A strategy that asks one question more than it needs. */
    private record OneMore(ClassicalStrategy honest) implements ClassicalStrategy {

        @Override
        public String name() {
            return honest.name();
        }

        @Override
        public String description() {
            return "wrong on purpose";
        }

        @Override
        public Optional<String> refusal(Problem problem, int width) {
            return Optional.empty();
        }

        @Override
        public boolean deterministic() {
            return true;
        }

        @Override
        public long memoryBytes(int width, long queryLimit) {
            return 0;
        }

        @Override
        public Attempt attempt(Oracle oracle, RandomStream stream) {
            Attempt attempt = honest.attempt(oracle, stream);
            oracle.query(0);
            return attempt;
        }
    }

    /** Ten queries, always. */
    private static final class ConstantLaw implements QueryLaw {

        @Override
        public Prediction mean(int width) {
            return Prediction.decimal(BigDecimal.TEN);
        }

        @Override
        public Optional<BigDecimal> variance(int width) {
            return Optional.of(BigDecimal.ZERO);
        }

        @Override
        public OptionalLong worst(int width) {
            return OptionalLong.of(10);
        }

        @Override
        public OptionalLong queries(int width, long period) {
            return OptionalLong.of(10);
        }

        @Override
        public String formula() {
            return "10";
        }

        @Override
        public String source() {
            return "made for a test";
        }
    }
}
