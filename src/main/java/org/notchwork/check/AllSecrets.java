package org.notchwork.check;

import java.math.BigInteger;
import java.util.Optional;
import org.notchwork.law.Prediction;
import org.notchwork.law.QueryLaw;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Meter;
import org.notchwork.problem.Oracle;
import org.notchwork.seed.Address;
import org.notchwork.seed.SeedTree;
import org.notchwork.strategy.Attempt;
import org.notchwork.strategy.ClassicalStrategy;
import org.notchwork.study.Experiment;

/** Runs a deterministic strategy on everything that an instance of a width can hide, without a query limit. */
final class AllSecrets {

    private static final String ROLE = "check:all-secrets";

    private final SeedTree seeds;

    AllSecrets(SeedTree seeds) {
        this.seeds = seeds;
    }

    /** Returns the check of one strategy at one width against its law. */
    CrossCheck check(Experiment experiment, int width, String cell, ClassicalStrategy strategy, QueryLaw law) {
        BigInteger sum = BigInteger.ZERO;
        long worst = 0;
        long secrets = 0;
        Optional<String> wrong = Optional.empty();
        for (Answer hidden : experiment.problem().answers(width)) {
            Address address = new Address(experiment.id(), width, secrets, ROLE);
            Instance instance = experiment.problem().drawHiding(hidden, width, seeds.stream(address));
            Meter meter = new Meter(1L << (width + 1));
            Address own = Address.strategy(experiment.id(), width, secrets, strategy.name());
            Attempt attempt = strategy.attempt(new Oracle(instance.function(), meter), seeds.stream(own));
            if (!(attempt instanceof Attempt.Answered answered
                            && answered.answer().equals(hidden))
                    && wrong.isEmpty()) {
                wrong = Optional.of("secret number " + secrets + " is not found");
            }
            sum = sum.add(BigInteger.valueOf(meter.counts().queries()));
            worst = Math.max(worst, meter.counts().queries());
            secrets++;
        }
        Prediction mean = Prediction.ratio(sum, BigInteger.valueOf(secrets));
        String expected = text(law.mean(width), law.worst(width).orElse(-1));
        String observed = text(mean, worst);
        boolean agrees = wrong.isEmpty() && expected.equals(observed);
        return new CrossCheck(
                CheckKind.ALL_SECRETS,
                cell,
                secrets,
                expected,
                observed + wrong.map(w -> "; " + w).orElse(""),
                Optional.empty(),
                agrees ? CheckOutcome.AGREES : CheckOutcome.DIFFERS);
    }

    private static String text(Prediction mean, long worst) {
        return "mean " + mean.fraction().orElseGet(() -> mean.value().toPlainString()) + ", worst " + worst;
    }
}
