package org.notchwork.bits;

import java.math.BigInteger;
import java.util.Objects;

/**
 * A string of {@code width} bits, written as hexadecimal digits, most significant first.
 *
 * @param width the number of bits, at least 1
 * @param value the bits as a number, 0 ≤ value &lt; 2^width
 */
public record Word(int width, BigInteger value) {

    /** A number of so many hexadecimal digits is below 2^63. */
    private static final int LONG_DIGITS = 15;

    /** Checks that the value fits the width. */
    public Word {
        Objects.requireNonNull(value);
        if (width < 1 || value.signum() < 0 || value.bitLength() > width) {
            throw new IllegalArgumentException("value " + value + " does not fit " + width + " bits");
        }
    }

    /** Returns the word of at most 63 bits that a {@code long} holds. */
    public static Word of(int width, long value) {
        return new Word(width, BigInteger.valueOf(value));
    }

    /** Returns how many hexadecimal digits a word of this width is written with: ⌈width / 4⌉. */
    public static int digits(int width) {
        return (width + 3) / 4;
    }

    /**
     * Reads the form that {@link #hex} writes.
     *
     * @throws IllegalArgumentException if there are more or fewer digits, other characters, or too large a value
     */
    public static Word ofHex(int width, String hex) {
        if (hex.length() != digits(width) || !isLowerHex(hex)) {
            throw new IllegalArgumentException(
                    "a word of " + width + " bits is written with " + digits(width) + " digits 0-9a-f");
        }
        return hex.length() <= LONG_DIGITS
                ? of(width, Long.parseLong(hex, 16))
                : new Word(width, new BigInteger(hex, 16));
    }

    /** Returns the word as ⌈width / 4⌉ lower-case hexadecimal digits. */
    public String hex() {
        String digits = width < Long.SIZE ? Long.toHexString(value.longValue()) : value.toString(16);
        return "0".repeat(digits(width) - digits.length()) + digits;
    }

    /** Returns the word as a {@code long}; for widths of at most 63. */
    public long bits() {
        return value.longValueExact();
    }

    /** Returns whether all bits are 0. */
    public boolean isZero() {
        return value.signum() == 0;
    }

    /** Returns the bitwise sum modulo 2 of two words of one width. */
    public Word xor(Word other) {
        requireSameWidth(other);
        return new Word(width, value.xor(other.value));
    }

    /** Returns the inner product modulo 2 of two words of one width: 0 or 1. */
    public int dot(Word other) {
        requireSameWidth(other);
        return value.and(other.value).bitCount() & 1;
    }

    private void requireSameWidth(Word other) {
        if (width != other.width) {
            throw new IllegalArgumentException("widths " + width + " and " + other.width + " differ");
        }
    }

    private static boolean isLowerHex(String text) {
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            if (!(c >= '0' && c <= '9') && !(c >= 'a' && c <= 'f')) {
                return false;
            }
        }
        return true;
    }
}
