package org.notchwork.engine;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.notchwork.catalogue.Engines;
import org.notchwork.engine.fibre.FibreEngine;
import org.notchwork.engine.statevector.StateVectorEngine;
import org.notchwork.problem.Meter;
import org.notchwork.problem.Unitary;
import org.notchwork.problem.period.Labelling;
import org.notchwork.problem.period.XorPeriod;
import org.notchwork.support.Given;

class EngineReachTest {

    private static final XorPeriod PROBLEM = new XorPeriod(Labelling.PERMUTATION);

    /** The engine that a refusal names must itself serve the width. */
    @ParameterizedTest
    @CsvSource({
        "statevector, 14, fibre",
        "statevector, 26, fibre",
        "statevector, 27, annihilator",
        "statevector, 63, annihilator",
        "fibre, 27, annihilator",
        "fibre, 63, annihilator"
    })
    void aRefusalNamesAnEngineThatCan(String name, int width, String other) {
        String refusal = Engines.engine(name)
                .orElseThrow()
                .refusal(PROBLEM, width, Circuit.FOURIER)
                .orElseThrow();
        assertTrue(refusal.contains("engine " + other), refusal);
        assertEquals(
                0,
                Engines.engine(other).orElseThrow().refusal(PROBLEM, width, Circuit.FOURIER).stream()
                        .count());
    }

    /** Values as wide as the fibres' sort can hold: the weights do not depend on how values are written. */
    @Test
    void valuesOf31BitsAreToldApart() {
        long high = (1L << 31) - 1;
        Outcomes wide = new FibreEngine()
                .open(unitary(Given.of(2, 31, high, high - 1, high - 1, high)))
                .outcomes();
        Outcomes narrow =
                new FibreEngine().open(unitary(Given.of(2, 2, 3, 1, 1, 3))).outcomes();
        assertEquals(0, narrow.differences(wide));
        assertEquals(8, wide.weight(0));
        assertEquals(8, wide.weight(3));
    }

    @Test
    void valuesTooWideForAnEngineAreRefusedAndNotCut() {
        Unitary wide = unitary(Given.of(2, 32, 0, 1L << 31, 0, 1L << 31));
        assertThrows(IllegalArgumentException.class, () -> new FibreEngine().open(wide));
        Unitary deep = unitary(Given.of(2, 25, 0, 1, 0, 1));
        assertThrows(IllegalArgumentException.class, () -> new StateVectorEngine().open(deep));
    }

    private static Unitary unitary(Given function) {
        return new Unitary(function, new Meter(1));
    }
}
