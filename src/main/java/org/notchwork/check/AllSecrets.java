package org.notchwork.check;

import java.math.BigInteger;
import java.util.List;
import java.util.Optional;
import org.notchwork.engine.BlindEngine;
import org.notchwork.engine.Engine;
import org.notchwork.engine.SightedEngine;
import org.notchwork.engine.Simulation;
import org.notchwork.law.Prediction;
import org.notchwork.law.QueryLaw;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Meter;
import org.notchwork.problem.Oracle;
import org.notchwork.problem.Unitary;
import org.notchwork.seed.Address;
import org.notchwork.seed.RandomStream;
import org.notchwork.seed.SeedTree;
import org.notchwork.strategy.Attempt;
import org.notchwork.strategy.ClassicalStrategy;
import org.notchwork.strategy.QuantumStrategy;
import org.notchwork.study.Experiment;
import org.notchwork.study.StrategyChoice;

/**
 * Runs a deterministic or zero-error strategy on everything that an instance of a width can hide, without a query limit.
 */
final class AllSecrets {

    /** The largest width at which circuits are run on all secrets. */
    static final int CIRCUIT_WIDTH = 6;

    private static final String ROLE = "check:all-secrets";

    private final SeedTree seeds;

    AllSecrets(SeedTree seeds) {
        this.seeds = seeds;
    }

    /** Returns whether a choice is run on all secrets of a width. */
    static boolean applies(Experiment experiment, int width, StrategyChoice choice) {
        boolean certain = choice.strategy() instanceof QuantumStrategy quantum
                ? quantum.isZeroError() && width <= CIRCUIT_WIDTH
                : choice.strategy().deterministic();
        return certain
                && choice.noise().isNone()
                && choice.law(experiment.problem(), width).isPresent()
                && !experiment.problem().answers(width).isEmpty();
    }

    /** Returns the check of one choice at one width against its law. */
    CrossCheck check(Experiment experiment, int width, String cell, StrategyChoice choice, QueryLaw law) {
        List<Answer> answers = experiment.problem().answers(width);
        BigInteger sum = BigInteger.ZERO;
        long worst = 0;
        long secrets = 0;
        Optional<String> wrong = Optional.empty();
        for (Answer hidden : answers) {
            Address address = new Address(experiment.id(), width, secrets, ROLE);
            Instance instance = experiment.problem().drawHiding(hidden, width, seeds.stream(address));
            Meter meter = new Meter(1L << (width + 3), instance.counters());
            Address own = Address.strategy(
                    experiment.id(), width, secrets, choice.strategy().name());
            Attempt attempt = attempt(experiment, choice, instance, meter, seeds.stream(own));
            if (!(attempt instanceof Attempt.Answered answered
                            && answered.answer().equals(hidden))
                    && wrong.isEmpty()) {
                wrong = Optional.of("secret number " + secrets + " is not found");
            }
            sum = sum.add(BigInteger.valueOf(meter.counts().queries()));
            worst = Math.max(worst, meter.counts().queries());
            secrets++;
        }
        boolean fixed = choice.strategy().deterministic();
        long bound = law.worst(width).orElse(-1);
        String expected = fixed ? text(law.mean(width), bound) : "every secret is found in at most " + bound + " calls";
        String observed = fixed
                ? text(Prediction.ratio(sum, BigInteger.valueOf(secrets)), worst)
                : secrets + " secrets, at most " + worst + " calls";
        boolean agrees = wrong.isEmpty() && (fixed ? expected.equals(observed) : worst <= bound);
        return new CrossCheck(
                CheckKind.ALL_SECRETS,
                cell,
                secrets,
                expected,
                observed + wrong.map(w -> "; " + w).orElse(""),
                Optional.empty(),
                agrees ? CheckOutcome.AGREES : CheckOutcome.DIFFERS);
    }

    private static Attempt attempt(
            Experiment experiment, StrategyChoice choice, Instance instance, Meter meter, RandomStream stream) {
        Oracle oracle = new Oracle(instance.function(), experiment.problem().promise(), meter, instance.parts());
        if (choice.strategy() instanceof ClassicalStrategy classical) {
            return classical.attempt(oracle, stream);
        }
        Unitary unitary = new Unitary(instance.function(), meter);
        Engine engine = choice.engine().orElseThrow();
        Simulation simulation = engine instanceof SightedEngine sighted
                ? sighted.open(unitary, instance.hidden())
                : ((BlindEngine) engine).open(unitary);
        return ((QuantumStrategy) choice.strategy()).attempt(simulation, oracle, stream);
    }

    private static String text(Prediction mean, long worst) {
        return "mean " + mean.fraction().orElseGet(() -> mean.value().toPlainString()) + ", worst " + worst;
    }
}
