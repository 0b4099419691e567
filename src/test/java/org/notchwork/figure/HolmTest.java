package org.notchwork.figure;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.notchwork.seed.RandomStream;
import org.notchwork.support.CheckValues;
import org.notchwork.support.Streams;
import tools.jackson.databind.JsonNode;

class HolmTest {

    /** The fifteen p-values of Y. Benjamini and Y. Hochberg, J. R. Statist. Soc. B 57 (1995); three are rejected. */
    @Test
    void theFifteenOfBenjaminiAndHochbergAreAdjusted() throws IOException {
        JsonNode data = CheckValues.section("L").required("BH1995");
        List<BigDecimal> adjusted = Holm.adjust(decimals(data.required("p")));
        assertSame(decimals(data.required("holm")), adjusted);
        long rejected = adjusted.stream()
                .filter(p -> p.compareTo(new BigDecimal("0.05")) <= 0)
                .count();
        assertEquals(data.required("rejected_05").required("holm").asLong(), rejected);
    }

    @Test
    void theSmallExampleOfTheCheckValuesIsAdjusted() throws IOException {
        JsonNode data = CheckValues.section("L").required("small_multiplicity");
        assertSame(decimals(data.required("holm")), Holm.adjust(decimals(data.required("p"))));
    }

    /** By hand: 4 · 0.005, 3 · 0.01, 2 · 0.03, and 0.04 is raised to the 0.06 before it. */
    @Test
    void fourAreAdjustedInTheOrderGiven() {
        assertSame(decimals("0.03", "0.06", "0.06", "0.02"), Holm.adjust(decimals("0.01", "0.04", "0.03", "0.005")));
    }

    @Test
    void equalValuesStayEqualAndOneIsTheMost() {
        assertSame(decimals("0.6", "0.6", "0.6"), Holm.adjust(decimals("0.2", "0.20", "0.2")));
        assertSame(decimals("1", "0", "1", "1"), Holm.adjust(decimals("0.5", "0", "0.5", "1")));
        assertSame(decimals("0.3"), Holm.adjust(decimals("0.3")));
        assertEquals(List.of(), Holm.adjust(List.of()));
    }

    /** The procedure itself: step down while the smallest remaining is at most α over the number remaining. */
    @Test
    void anAdjustedValueIsAtMostAlphaWhereTheProcedureRejects() {
        RandomStream stream = Streams.named("holm");
        int rejections = 0;
        for (int round = 0; round < 300; round++) {
            List<BigDecimal> p = new ArrayList<>();
            for (long i = stream.below(8); i >= 0; i--) {
                p.add(BigDecimal.valueOf(stream.below(60), 3));
            }
            BigDecimal alpha = BigDecimal.valueOf(50, 3);
            List<BigDecimal> adjusted = Holm.adjust(p);
            List<BigDecimal> remaining = new ArrayList<>(p.stream().sorted().toList());
            while (!remaining.isEmpty()
                    && remaining
                                    .get(0)
                                    .multiply(BigDecimal.valueOf(remaining.size()))
                                    .compareTo(alpha)
                            <= 0) {
                remaining.remove(0);
                rejections++;
            }
            long below = adjusted.stream().filter(a -> a.compareTo(alpha) <= 0).count();
            assertEquals(p.size() - remaining.size(), below, p::toString);
        }
        assertTrue(rejections > 100, "some are rejected");
    }

    @Test
    void whatIsNoProbabilityIsRefused() {
        assertThrows(IllegalArgumentException.class, () -> Holm.adjust(decimals("0.5", "-0.1")));
        assertThrows(IllegalArgumentException.class, () -> Holm.adjust(decimals("1.01")));
    }

    private static void assertSame(List<BigDecimal> expected, List<BigDecimal> values) {
        assertEquals(
                expected.stream().map(BigDecimal::stripTrailingZeros).toList(),
                values.stream().map(BigDecimal::stripTrailingZeros).toList());
    }

    private static List<BigDecimal> decimals(JsonNode array) {
        List<BigDecimal> all = new ArrayList<>();
        array.forEach(node -> all.add(new BigDecimal(node.asString())));
        return all;
    }

    private static List<BigDecimal> decimals(String... texts) {
        return List.of(texts).stream().map(BigDecimal::new).toList();
    }
}
