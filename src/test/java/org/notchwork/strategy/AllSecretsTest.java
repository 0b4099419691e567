package org.notchwork.strategy;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;

import java.math.BigInteger;
import java.util.OptionalLong;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.notchwork.catalogue.Laws;
import org.notchwork.catalogue.Strategies;
import org.notchwork.law.Prediction;
import org.notchwork.law.QueryLaw;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Meter;
import org.notchwork.problem.Oracle;
import org.notchwork.problem.period.Labelling;
import org.notchwork.problem.period.XorPeriod;
import org.notchwork.seed.Address;
import org.notchwork.seed.Seed;
import org.notchwork.seed.SeedTree;

/** Every secret of a width is faced by the deterministic strategies; mean and worst case are the closed forms. */
class AllSecretsTest {

    private final SeedTree seeds = new SeedTree(new Seed("all secrets of a small width"));

    @ParameterizedTest
    @CsvSource({
        "sequential-scan, 2", "sequential-scan, 3", "sequential-scan, 5", "sequential-scan, 8", "sequential-scan, 10",
        "difference-cover, 2", "difference-cover, 3", "difference-cover, 5", "difference-cover, 8",
                "difference-cover, 10"
    })
    void meanAndWorstCaseOverAllSecretsAreTheClosedForms(String name, int width) {
        ClassicalStrategy strategy =
                (ClassicalStrategy) Strategies.strategy(name).orElseThrow();
        QueryLaw law = Laws.law("xor-period", name).orElseThrow();
        XorPeriod problem = new XorPeriod(Labelling.TABLE);
        long sum = 0;
        long worst = 0;
        for (Answer hidden : problem.answers(width)) {
            long s = ((Answer.Period) hidden).s().bits();
            Instance instance = problem.drawHiding(hidden, width, seeds.stream(Address.instance("all", width, s)));
            Meter meter = new Meter(1L << width);
            Attempt attempt = strategy.attempt(
                    new Oracle(instance.function(), meter), seeds.stream(Address.strategy("all", width, s, name)));
            assertEquals(
                    hidden, assertInstanceOf(Attempt.Answered.class, attempt).answer());
            assertEquals(OptionalLong.of(meter.counts().queries()), law.queries(width, s));
            sum += meter.counts().queries();
            worst = Math.max(worst, meter.counts().queries());
        }
        assertEquals(law.mean(width), Prediction.ratio(BigInteger.valueOf(sum), BigInteger.valueOf((1L << width) - 1)));
        assertEquals(law.worst(width), OptionalLong.of(worst));
    }
}
