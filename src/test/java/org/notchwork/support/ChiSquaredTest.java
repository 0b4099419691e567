package org.notchwork.support;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Test;

class ChiSquaredTest {

    /** G. Mendel's dihybrid cross, 9:3:3:1; printed as 0.47, P > 0.90 in textbooks, 196/417 exactly. */
    @Test
    void theDihybridCrossFits() {
        ChiSquared test = ChiSquared.of(new long[] {315, 101, 108, 32}, new double[] {9, 3, 3, 1});
        assertEquals(196.0 / 417, test.statistic(), 1e-12);
        assertEquals(3, test.degrees());
        assertEquals(0.9254258951, test.p(), 1e-10);
        test.assertFits();
    }

    @Test
    void aLoadedDieDoesNotFit() {
        ChiSquared test = ChiSquared.even(new long[] {160, 100, 100, 100, 100, 40});
        assertThrows(AssertionError.class, test::assertFits);
    }

    @Test
    void anImpossibleClassThatIsSeenDoesNotFit() {
        assertThrows(AssertionError.class, () -> ChiSquared.of(new long[] {20, 20, 1}, new double[] {1, 1, 0}));
    }
}
