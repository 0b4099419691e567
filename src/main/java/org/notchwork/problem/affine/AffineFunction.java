package org.notchwork.problem.affine;

import java.math.BigInteger;
import org.notchwork.bits.Word;
import org.notchwork.problem.Network;
import org.notchwork.problem.NetworkFunction;

/**
 * x ↦ R(g(x)) ⊕ c, where g(x) is x, plus s if the bit of x at the top of s is set, and R a CNOT network; s = 0 leaves
 * out the sum. Immutable.
 */
final class AffineFunction implements NetworkFunction {

    private final int width;
    private final Word s;
    private final int[] controls;
    private final int[] targets;
    private final Word c;
    /** The images of the single bits and the constant, for words that a {@code long} holds. */
    private final long[] columns;

    AffineFunction(Word s, int[] controls, int[] targets, Word c) {
        this.width = s.width();
        this.s = s;
        this.controls = controls;
        this.targets = targets;
        this.c = c;
        this.columns = new long[width < Long.SIZE ? width : 0];
        for (int i = 0; i < columns.length; i++) {
            columns[i] = linear(BigInteger.ONE.shiftLeft(i)).longValueExact();
        }
    }

    @Override
    public int width() {
        return width;
    }

    @Override
    public int valueWidth() {
        return width;
    }

    @Override
    public long at(long x) {
        long value = c.bits();
        for (long rest = x; rest != 0; rest &= rest - 1) {
            value ^= columns[Long.numberOfTrailingZeros(rest)];
        }
        return value;
    }

    @Override
    public Word at(Word x) {
        return new Word(width, linear(x.value()).xor(c.value()));
    }

    private BigInteger linear(BigInteger x) {
        int top = s.value().bitLength() - 1;
        long[] word = unpacked(top >= 0 && x.testBit(top) ? x.xor(s.value()) : x);
        for (int gate = 0; gate < controls.length; gate++) {
            long bit = word[controls[gate] >>> 6] >>> (controls[gate] & 63) & 1;
            word[targets[gate] >>> 6] ^= bit << (targets[gate] & 63);
        }
        return packed(word);
    }

    private long[] unpacked(BigInteger x) {
        long[] word = new long[(width + 63) >>> 6];
        BigInteger rest = x;
        for (int i = 0; i < word.length; i++) {
            word[i] = rest.longValue();
            rest = rest.shiftRight(Long.SIZE);
        }
        return word;
    }

    private static BigInteger packed(long[] word) {
        byte[] bytes = new byte[8 * word.length];
        for (int i = 0; i < bytes.length; i++) {
            bytes[bytes.length - 1 - i] = (byte) (word[i >>> 3] >>> (8 * (i & 7)));
        }
        return new BigInteger(1, bytes);
    }

    /**
     * R backwards on the value register, the bits of g(x) added to it, R forwards, X gates for c: so |x⟩|z⟩ becomes
     * |x⟩|z ⊕ f(x)⟩ whatever z is.
     */
    @Override
    public Network network() {
        int gates = controls.length;
        int weight = s.value().bitCount();
        int constants = c.value().bitCount();
        int[] from = new int[2 * gates + width + weight + constants];
        int[] to = new int[from.length];
        int next = 0;
        for (int gate = gates - 1; gate >= 0; gate--) {
            from[next] = width + controls[gate];
            to[next++] = width + targets[gate];
        }
        int top = s.value().bitLength() - 1;
        for (int i = 0; i < width; i++) {
            from[next] = i;
            to[next++] = width + i;
        }
        for (int i = 0; i < width; i++) {
            if (s.value().testBit(i)) {
                from[next] = top;
                to[next++] = width + i;
            }
        }
        for (int gate = 0; gate < gates; gate++) {
            from[next] = width + controls[gate];
            to[next++] = width + targets[gate];
        }
        for (int i = 0; i < width; i++) {
            if (c.value().testBit(i)) {
                from[next] = Network.NO_CONTROL;
                to[next++] = width + i;
            }
        }
        return new Network(width, width, from, to);
    }
}
