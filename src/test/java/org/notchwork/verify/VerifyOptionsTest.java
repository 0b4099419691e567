package org.notchwork.verify;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.bundle.Limits;
import org.notchwork.seed.Seed;

/** What a referee may ask for. */
class VerifyOptionsTest {

    private static final String FORTY = "0123456789abcdef0123456789abcdef01234567";

    @ParameterizedTest
    @ValueSource(
            strings = {
                "",
                "ab",
                "0123456789abcdef0123456789abcdef0123456",
                "0123456789abcdef0123456789abcdef0123456 ",
                "g123456789abcdef0123456789abcdef01234567",
                "0123456789abcdef0123456789abcdef0123456789abcdef0123456789abcdef0"
            })
    void aSealTooShortTooLongOrNotHexadecimalIsRefused(String expect) {
        assertFalse(VerifyOptions.isSeal(expect));
        assertThrows(IllegalArgumentException.class, () -> options(expect, 1));
    }

    @Test
    void gapsAndCaseOfASealDoNotMatter() {
        String spoken = "01234567 89ABCDEF\t01234567 89abcdef 01234567\n";
        assertTrue(VerifyOptions.isSeal(spoken));
        assertEquals(Optional.of(FORTY), options(spoken, 1).expect());
        assertEquals(40, VerifyOptions.FEWEST_DIGITS);
    }

    @Test
    void noThreadsAndAnEmptySampleAreRefused() {
        assertThrows(IllegalArgumentException.class, () -> options(FORTY, 0));
        assertThrows(IllegalArgumentException.class, () -> new Rerun.Sample(0));
    }

    private static VerifyOptions options(String expect, int threads) {
        return new VerifyOptions(
                Optional.of(expect), new Rerun.None(), new Seed("the seed of a referee"), threads, Limits.USUAL);
    }
}
