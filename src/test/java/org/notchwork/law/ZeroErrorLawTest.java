package org.notchwork.law;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.notchwork.support.CheckValues.assertPrints;

import java.io.IOException;
import java.util.Arrays;
import java.util.Optional;
import java.util.OptionalLong;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.support.CheckValues;
import org.notchwork.support.Fractions;
import tools.jackson.databind.JsonNode;

class ZeroErrorLawTest {

    private final ZeroErrorLaw law = new ZeroErrorLaw();

    @Test
    void allRowsOfTheCheckValuesAreMet() throws IOException {
        JsonNode table = CheckValues.section("G").required("table");
        assertEquals(15, table.size());
        for (JsonNode row : table) {
            int width = row.required("n").asInt();
            assertEquals(OptionalLong.of(row.required("worst_calls").asLong()), law.worst(width));
            if (!row.required("mean_calls").isNull()) {
                assertEquals(
                        Fractions.value(row.required("mean_calls").asString()),
                        law.mean(width).value());
            }
            assertPrints(
                    row.required("mean_calls_dec").asString(), law.mean(width).value());
        }
    }

    /** The naive twin: every period and every word that a round can bring, all equally likely. */
    @ParameterizedTest
    @ValueSource(ints = {2, 3, 4})
    void meanVarianceAndDistributionAreThoseOfAllCourses(int width) {
        MomentsByListing listed = new MomentsByListing();
        for (int s = 1; s < 1 << width; s++) {
            follow(width, s, new int[0], 1 << ((width - 2) * (width - 1)), listed);
        }
        listed.assertAre(law, width);
        listed.assertDistributionIs(law, width);
    }

    private static void follow(int width, int s, int[] words, int weight, MomentsByListing listed) {
        int candidate = 1;
        while (!orthogonal(candidate, words)) {
            candidate++;
        }
        if (words.length == width - 1 || candidate == s) {
            int rounds = Math.min(words.length + 1, width - 1);
            for (int i = 0; i < weight; i++) {
                listed.add(3L * rounds);
            }
            return;
        }
        for (int y = 1; y < 1 << width; y++) {
            if (!odd(y, s) && odd(y, candidate)) {
                int[] more = Arrays.copyOf(words, words.length + 1);
                more[words.length] = y;
                follow(width, s, more, weight >> (width - 2), listed);
            }
        }
    }

    private static boolean orthogonal(int w, int[] words) {
        for (int y : words) {
            if (odd(w, y)) {
                return false;
            }
        }
        return true;
    }

    private static boolean odd(int a, int b) {
        return Integer.bitCount(a & b) % 2 == 1;
    }

    @Test
    void aPartOfARoundTellsNothing() {
        assertEquals(law.within(5, 3), law.within(5, 5));
        assertEquals(Optional.of(Fraction.ZERO.prediction()), law.within(5, 2));
    }
}
