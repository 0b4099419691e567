package org.notchwork.problem;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Test;
import org.notchwork.support.Given;

class MeterTest {

    private final BitFunction function = Given.of(2, 3, 5, 0, 7, 1);

    @Test
    void everyCallIsCountedByItsKind() {
        Meter meter = new Meter(100);
        Oracle oracle = new Oracle(function, Promise.period(Promise.Labels.RANDOM), meter);
        Unitary unitary = new Unitary(function, meter);
        assertEquals(7, oracle.query(2));
        assertEquals(0, oracle.query(1));
        assertEquals(1, oracle.confirm(3));
        unitary.use();
        unitary.use();
        unitary.use();
        unitary.useInverse();
        assertEquals(5, unitary.image(0));
        assertEquals(new Counts(2, 3, 1, 1), meter.counts());
        assertEquals(6, meter.counts().queries());
        assertEquals(7, meter.counts().total());
        assertEquals(93, oracle.remaining());
    }

    @Test
    void aCallBeyondTheLimitIsAFaultAndIsNotCounted() {
        Meter meter = new Meter(2);
        Oracle oracle = new Oracle(function, Promise.period(Promise.Labels.RANDOM), meter);
        oracle.query(0);
        oracle.confirm(0);
        assertEquals(0, meter.remaining());
        assertThrows(IllegalStateException.class, () -> oracle.query(0));
        assertThrows(IllegalStateException.class, () -> oracle.confirm(0));
        Unitary unitary = new Unitary(function, meter);
        assertThrows(IllegalStateException.class, unitary::use);
        assertThrows(IllegalStateException.class, unitary::useInverse);
        assertEquals(new Counts(1, 0, 0, 1), meter.counts());
    }

    @Test
    void oracleAndUnitaryShowTheWidthsOfTheFunction() {
        Oracle oracle = new Oracle(function, Promise.period(Promise.Labels.RANDOM), new Meter(1));
        assertEquals(2, oracle.width());
        assertEquals(3, oracle.valueWidth());
        Unitary unitary = new Unitary(function, new Meter(1));
        assertEquals(2, unitary.width());
        assertEquals(3, unitary.valueWidth());
    }

    @Test
    void oneMoreCallRaisesOneCount() {
        Counts counts = new Counts(10, 20, 30, 40);
        assertEquals(new Counts(11, 20, 30, 40), counts.plus(CallKind.CLASSICAL));
        assertEquals(new Counts(10, 21, 30, 40), counts.plus(CallKind.QUANTUM));
        assertEquals(new Counts(10, 20, 31, 40), counts.plus(CallKind.INVERSE));
        assertEquals(new Counts(10, 20, 30, 41), counts.plus(CallKind.CONFIRMING));
    }

    @Test
    void negativeCountsAndEmptyLimitsAreRefused() {
        assertThrows(IllegalArgumentException.class, () -> new Counts(0, 0, 0, -1));
        assertThrows(IllegalArgumentException.class, () -> new Meter(0));
        assertThrows(ArithmeticException.class, () -> new Counts(Long.MAX_VALUE, 1, 0, 0).queries());
    }
}
