package org.notchwork.report;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import org.junit.jupiter.api.Test;

/** Shares worked out by hand. */
class ColumnWidthsTest {

    private static float[] share(float[] words, float[] wholes, boolean[] firm, float measure) {
        return new ColumnWidths(words, wholes, firm).share(measure);
    }

    @Test
    void roomToSpareIsSpreadEvenly() {
        assertArrayEquals(
                new float[] {20, 40},
                share(new float[] {5, 5}, new float[] {10, 30}, new boolean[] {false, false}, 60),
                0.01f);
    }

    @Test
    void theWidestColumnsGiveWayFirst() {
        assertArrayEquals(
                new float[] {10, 45, 45},
                share(new float[] {5, 5, 5}, new float[] {10, 80, 90}, new boolean[3], 100),
                0.01f);
    }

    @Test
    void noColumnGetsLessThanItsWidestWord() {
        assertArrayEquals(
                new float[] {10, 30, 60},
                share(new float[] {5, 5, 60}, new float[] {10, 80, 90}, new boolean[3], 100),
                0.01f);
    }

    @Test
    void numbersStayWholeWhereNamesCanGiveWay() {
        assertArrayEquals(
                new float[] {40, 60},
                share(new float[] {70, 60}, new float[] {70, 60}, new boolean[] {false, true}, 100),
                0.01f);
    }

    @Test
    void theMeasureIsNeverExceeded() {
        float[] widths =
                share(new float[] {70, 60, 80}, new float[] {90, 60, 80}, new boolean[] {true, true, false}, 100);
        float sum = 0;
        for (float width : widths) {
            assertTrue(width > 0);
            sum += width;
        }
        assertEquals(100, sum, 0.01f);
    }
}
