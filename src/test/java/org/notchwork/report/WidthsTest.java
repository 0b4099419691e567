package org.notchwork.report;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import org.junit.jupiter.api.Test;

class WidthsTest {

    @Test
    void runsOfAtLeastFourAreSaidByTheirEnds() {
        assertEquals("4 to 7", Widths.words(List.of(4, 5, 6, 7)));
        assertEquals("2, 4 to 8, 10, 11, 12", Widths.words(List.of(2, 4, 5, 6, 7, 8, 10, 11, 12)));
    }

    @Test
    void othersAreListed() {
        assertEquals("3", Widths.words(List.of(3)));
        assertEquals("4, 5, 6", Widths.words(List.of(4, 5, 6)));
        assertEquals("4, 6, 8, 10, 12", Widths.words(List.of(4, 6, 8, 10, 12)));
    }
}
