package org.notchwork.law;

import static org.junit.jupiter.api.Assertions.assertEquals;

import org.junit.jupiter.api.Test;

/** Section I: n queries, n + 1 with an offset, and one quantum query. */
class ConstantCountLawTest {

    @Test
    void everyInstanceTakesTheSameCount() {
        assertConstant(new UnitVectorsLaw(false), 7, 7);
        assertConstant(new UnitVectorsLaw(true), 7, 8);
        assertConstant(new OneQueryLaw(), 7, 1);
    }

    private static void assertConstant(QueryLaw law, int width, long count) {
        MomentsByListing listed = new MomentsByListing();
        for (long s = 1; s < 4; s++) {
            assertEquals(count, law.queries(width, s).orElseThrow());
            listed.add(count);
        }
        listed.assertAre(law, width);
        listed.assertDistributionIs(law, width);
    }
}
