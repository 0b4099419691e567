package org.notchwork.support;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;

import java.util.List;
import java.util.Optional;
import org.notchwork.certificate.CertificateCheck;
import org.notchwork.engine.BlindEngine;
import org.notchwork.engine.Engine;
import org.notchwork.engine.Noise;
import org.notchwork.engine.NoisySimulation;
import org.notchwork.engine.SightedEngine;
import org.notchwork.engine.Simulation;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Counts;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Meter;
import org.notchwork.problem.Oracle;
import org.notchwork.problem.Promise;
import org.notchwork.problem.Unitary;
import org.notchwork.seed.RandomStream;
import org.notchwork.strategy.Attempt;
import org.notchwork.strategy.ClassicalStrategy;
import org.notchwork.strategy.QuantumStrategy;

/**
 * What came of a strategy that faced an instance.
 *
 * @param instance the instance
 * @param attempt how it ended
 * @param byFunction the calls of each function
 */
public record Facing(Instance instance, Attempt attempt, List<Counts> byFunction) {

    private static final long NO_LIMIT = 1L << 50;

    /** Lets a classical strategy face an instance. */
    public static Facing classical(
            ClassicalStrategy strategy, Instance instance, Promise promise, long limit, RandomStream stream) {
        Meter meter = new Meter(limit, instance.counters());
        Oracle oracle = new Oracle(instance.function(), promise, meter, instance.parts());
        return new Facing(instance, strategy.attempt(oracle, stream), meter.byFunction());
    }

    /** Lets a classical strategy face an instance without a limit. */
    public static Facing classical(
            ClassicalStrategy strategy, Instance instance, Promise promise, RandomStream stream) {
        return classical(strategy, instance, promise, NO_LIMIT, stream);
    }

    /** Lets a quantum strategy face an instance without a limit. */
    public static Facing quantum(
            QuantumStrategy strategy,
            Engine engine,
            Noise noise,
            Instance instance,
            Promise promise,
            RandomStream stream) {
        return quantum(strategy, engine, noise, instance, promise, NO_LIMIT, stream);
    }

    /** Lets a quantum strategy face an instance. */
    public static Facing quantum(
            QuantumStrategy strategy,
            Engine engine,
            Noise noise,
            Instance instance,
            Promise promise,
            long limit,
            RandomStream stream) {
        Meter meter = new Meter(limit, instance.counters());
        Unitary unitary = new Unitary(instance.function(), meter);
        Simulation clean = engine instanceof SightedEngine sighted
                ? sighted.open(unitary, instance.hidden())
                : ((BlindEngine) engine).open(unitary);
        Simulation seen = noise.isNone() ? clean : new NoisySimulation(clean, unitary.width(), noise);
        Oracle oracle = new Oracle(instance.function(), promise, meter, instance.parts());
        return new Facing(instance, strategy.attempt(seen, oracle, stream), meter.byFunction());
    }

    /** Lets a quantum strategy face an instance without a limit or noise. */
    public static Facing quantum(
            QuantumStrategy strategy, Engine engine, Instance instance, Promise promise, RandomStream stream) {
        return quantum(strategy, engine, Noise.NONE, instance, promise, stream);
    }

    /** Returns all calls. */
    public Counts counts() {
        return byFunction.stream().reduce(Counts.NONE, Counts::plus);
    }

    /** Returns the answer; fails if there is none. */
    public Answer answer() {
        return assertInstanceOf(Attempt.Answered.class, attempt).answer();
    }

    /** Returns whether the right answer was given. */
    public boolean isSolved() {
        return attempt instanceof Attempt.Answered answered && answered.answer().equals(instance.hidden());
    }

    /** Asserts that the right answer was given with a certificate that holds. */
    public Facing assertProved() {
        Attempt.Answered answered = assertInstanceOf(Attempt.Answered.class, attempt);
        assertEquals(instance.hidden(), answered.answer());
        assertEquals(
                Optional.empty(),
                CertificateCheck.check(instance.function(), answered.answer(), answered.certificate()));
        return this;
    }
}
