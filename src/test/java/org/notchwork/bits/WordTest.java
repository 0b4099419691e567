package org.notchwork.bits;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.notchwork.seed.RandomStream;
import org.notchwork.support.Streams;

class WordTest {

    @ParameterizedTest
    @CsvSource({"1, 0, 0", "1, 1, 1", "4, 10, a", "5, 10, 0a", "8, 255, ff", "9, 256, 100", "63, 1, 0000000000000001"})
    void aWordIsWrittenWithOneDigitForEveryFourBits(int width, long value, String hex) {
        assertEquals(hex, Word.of(width, value).hex());
        assertEquals(Word.of(width, value), Word.ofHex(width, hex));
    }

    @Test
    void wordsOf200BitsAreReadAsTheyAreWritten() {
        Word word = new Word(200, BigInteger.ONE.shiftLeft(199).add(BigInteger.valueOf(0xabc)));
        assertEquals("8" + "0".repeat(46) + "abc", word.hex());
        assertEquals(word, Word.ofHex(200, word.hex()));
        assertThrows(ArithmeticException.class, word::bits);
    }

    @ParameterizedTest
    @CsvSource({"4, 0a", "5, a", "5, 3f", "4, A", "4, g", "4, ''", "8, -1", "8, +1"})
    void otherFormsAreRefused(int width, String hex) {
        assertThrows(IllegalArgumentException.class, () -> Word.ofHex(width, hex));
    }

    @ParameterizedTest
    @CsvSource({"0, 0", "3, 8", "3, -1", "63, -1"})
    void aValueThatDoesNotFitIsRefused(int width, long value) {
        assertThrows(IllegalArgumentException.class, () -> Word.of(width, value));
    }

    @Test
    void sumAndInnerProductAreThoseOfTheBits() {
        RandomStream stream = Streams.named("words");
        for (int i = 0; i < 2000; i++) {
            int width = 1 + (int) stream.below(63);
            long a = stream.bits(width);
            long b = stream.bits(width);
            int dot = 0;
            for (int bit = 0; bit < width; bit++) {
                dot ^= (int) (a >>> bit & b >>> bit & 1);
            }
            assertEquals(a ^ b, Word.of(width, a).xor(Word.of(width, b)).bits());
            assertEquals(dot, Word.of(width, a).dot(Word.of(width, b)));
        }
    }

    @Test
    void wordsOfDifferentWidthsDoNotMix() {
        Word narrow = Word.of(3, 5);
        Word wide = Word.of(4, 5);
        assertThrows(IllegalArgumentException.class, () -> narrow.xor(wide));
        assertThrows(IllegalArgumentException.class, () -> narrow.dot(wide));
    }

    @Test
    void onlyTheWordWithoutBitsIsZero() {
        assertTrue(Word.of(5, 0).isZero());
        assertFalse(Word.of(5, 16).isZero());
    }
}
