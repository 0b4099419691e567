package org.notchwork.strategy.quantum;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.notchwork.bits.Word;
import org.notchwork.catalogue.Engines;
import org.notchwork.engine.Circuit;
import org.notchwork.engine.Engine;
import org.notchwork.engine.weights.WeightsEngine;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Counts;
import org.notchwork.problem.Instance;
import org.notchwork.problem.Problem;
import org.notchwork.problem.balance.ConstantOrBalanced;
import org.notchwork.problem.mask.InnerProduct;
import org.notchwork.strategy.QuantumStrategy;
import org.notchwork.support.Facing;
import org.notchwork.support.Given;
import org.notchwork.support.Streams;

/** One use of U_f decides, on every function of few bits. */
class PhaseCircuitTest {

    private static final Counts ONE = new Counts(0, 1, 0, 0);

    static Stream<Engine> forMasks() {
        return taking(new InnerProduct(true));
    }

    static Stream<Engine> forBalance() {
        return taking(new ConstantOrBalanced());
    }

    private static Stream<Engine> taking(Problem problem) {
        return Engines.all().stream()
                .filter(e -> e.refusal(problem, 3, Circuit.PHASE).isEmpty());
    }

    @Test
    void theEnginesThatTakeTheCircuitAreKnown() {
        List<String> blind = List.of("statevector", "fibre", "weights");
        assertEquals(
                blind,
                forBalance()
                        .map(Engine::name)
                        .filter(n -> !n.equals("stabilizer"))
                        .toList());
        assertEquals(
                true,
                forMasks().map(Engine::name).toList().containsAll(List.of("statevector", "weights", "annihilator")));
    }

    private static void face(QuantumStrategy strategy, Engine engine, Problem problem, Instance instance) {
        Facing facing = Facing.quantum(strategy, engine, instance, problem.promise(), Streams.named("phase"))
                .assertProved();
        assertEquals(ONE, facing.counts());
    }

    @ParameterizedTest
    @MethodSource("forMasks")
    void everyMaskIsReadWithEitherConstant(Engine engine) {
        for (int width = 1; width <= 4; width++) {
            for (int a = 0; a < 1 << width; a++) {
                for (int constant = 0; constant <= 1; constant++) {
                    long[] values = new long[1 << width];
                    for (int x = 0; x < values.length; x++) {
                        values[x] = (Integer.bitCount(x & a) & 1) ^ constant;
                    }
                    Instance drawn = new InnerProduct(true)
                            .drawHiding(new Answer.Mask(Word.of(width, a)), width, Streams.numbered("mask", constant));
                    face(new InnerProductFourier(), engine, new InnerProduct(true), drawn);
                    if (!engine.name().equals("stabilizer")) {
                        face(
                                new InnerProductFourier(),
                                engine,
                                new InnerProduct(true),
                                new Instance(Given.of(width, 1, values), new Answer.Mask(Word.of(width, a))));
                    }
                }
            }
        }
    }

    private static void everyFunction(Engine engine, int width) {
        int points = 1 << width;
        for (int table = 0; table < 1 << points; table++) {
            int ones = Integer.bitCount(table);
            if (ones != 0 && ones != points && ones != points / 2) {
                continue;
            }
            long[] values = new long[points];
            for (int x = 0; x < points; x++) {
                values[x] = (long) (table >>> x) & 1;
            }
            face(
                    new PhaseQuery(),
                    engine,
                    new ConstantOrBalanced(),
                    new Instance(Given.of(width, 1, values), new Answer.Balance(ones == points / 2)));
        }
    }

    @ParameterizedTest
    @MethodSource("forBalance")
    void everyConstantAndBalancedFunctionOfThreeBitsIsDecided(Engine engine) {
        for (int width = 1; width <= 3; width++) {
            everyFunction(engine, width);
        }
    }

    /** 12 870 balanced functions and both constant ones. */
    @Test
    void everyConstantAndBalancedFunctionOfFourBitsIsDecided() {
        everyFunction(new WeightsEngine(), 4);
    }
}
