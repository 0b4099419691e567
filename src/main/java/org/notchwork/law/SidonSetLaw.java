package org.notchwork.law;

import java.math.BigDecimal;
import java.math.BigInteger;
import java.util.BitSet;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalLong;

/**
 * The points (x, x³) over the field of q = 2^k elements, k = n/2, then (0, 1), (0, 2), … in integer order.
 *
 * <p>Query m of the first part meets m − 1 new periods, since all sums of two of its points differ. Query (0, b) meets
 * c(b) periods (u, v) with u ≠ 0, and b periods (0, v) if b is a power of two. For odd k, c(b) = q/2; for even k it
 * depends on whether b is a cube, and so on the field polynomial. Even widths 2 to 32 except 28.
 */
public final class SidonSetLaw implements QueryLaw {

    private static final int WIDEST = 32;

    /** Wider ones take seconds. */
    private static final int WIDEST_QUICK = 24;

    /** The field polynomials for even k, the top bit first. */
    private static final Map<Integer, Integer> POLYNOMIALS = Map.of(
            2, 0b111,
            4, 0b10011,
            6, 0b1000011,
            8, 0b100011011,
            10, 0b10000001001,
            12, 0b1000001010011,
            16, 0b10001000000001011);

    @Override
    public boolean reaches(int width) {
        return width >= 2
                && width <= WIDEST_QUICK
                && width % 2 == 0
                && (width % 4 != 0 || POLYNOMIALS.containsKey(width / 2));
    }

    @Override
    public Prediction mean(int width) {
        return Prediction.ratio(moment(width, 1), periods(width));
    }

    @Override
    public Optional<BigDecimal> variance(int width) {
        Fraction first = new Fraction(moment(width, 1), periods(width));
        Fraction second = new Fraction(moment(width, 2), periods(width));
        return Optional.of(second.minus(first.times(first)).value());
    }

    @Override
    public OptionalLong worst(int width) {
        return OptionalLong.of((2L << degree(width)) - 1);
    }

    /** Empty: the count hangs on how the two halves of a word are laid out, which the law leaves open. */
    @Override
    public OptionalLong queries(int width, long period) {
        return OptionalLong.empty();
    }

    @Override
    public Optional<Prediction> within(int width, long queries) {
        long met = 0;
        LineCounts line = new LineCounts(degree(width));
        for (int m = 1; m <= Math.min(queries, 2L * line.size - 1); m++) {
            met += line.newPeriods(m);
        }
        return Optional.of(Prediction.ratio(BigInteger.valueOf(met), periods(width)));
    }

    @Override
    public String formula() {
        return "[sum_{m<=q} m (m-1) + sum_{b<q} (q + b) (c(b) + [b is a power of 2] b)] / (2^n - 1), q = 2^(n/2)";
    }

    @Override
    public String source() {
        return "derived; Gold, IEEE Trans. Inf. Theory 14 (1968) for the sums; Carlitz, Math. Scand. (1979) for the"
                + " cubic sums in c(b)";
    }

    private static BigInteger moment(int width, int power) {
        LineCounts line = new LineCounts(degree(width));
        BigInteger sum = BigInteger.ZERO;
        for (int m = 1; m < 2 * line.size; m++) {
            sum = sum.add(BigInteger.valueOf(m).pow(power).multiply(BigInteger.valueOf(line.newPeriods(m))));
        }
        return sum;
    }

    private static int degree(int width) {
        int k = width / 2;
        if (width < 2 || width > WIDEST || width % 2 != 0 || (k % 2 == 0 && !POLYNOMIALS.containsKey(k))) {
            throw new IllegalArgumentException("width " + width + " is not an even width from 2 to 32, 28 left out");
        }
        return k;
    }

    private static BigInteger periods(int width) {
        return BigInteger.ONE.shiftLeft(width).subtract(BigInteger.ONE);
    }

    /** How many periods each query is the first to meet. */
    private static final class LineCounts {

        private final int degree;
        private final int size;
        private final BitSet cubes = new BitSet();

        LineCounts(int degree) {
            this.degree = degree;
            size = 1 << degree;
            if (degree % 2 == 0) {
                int polynomial = POLYNOMIALS.get(degree);
                for (int x = 1; x < size; x++) {
                    cubes.set(product(x, product(x, x, polynomial), polynomial));
                }
            }
        }

        long newPeriods(int m) {
            if (m <= size) {
                return m - 1L;
            }
            int b = m - size;
            return withFirstPart(b) + (Integer.bitCount(b) == 1 ? b : 0);
        }

        private long withFirstPart(int b) {
            if (degree % 2 == 1) {
                return size / 2;
            }
            int root = degree / 2 % 2 == 0 ? 1 << (degree / 2) : -(1 << (degree / 2));
            return cubes.get(b) ? (size + 2L * root) / 2 : (size - root) / 2;
        }

        private int product(int x, int y, int polynomial) {
            int sum = 0;
            int shifted = x;
            for (int rest = y; rest != 0; rest >>>= 1) {
                sum ^= (rest & 1) == 0 ? 0 : shifted;
                shifted <<= 1;
                shifted ^= (shifted & size) == 0 ? 0 : polynomial;
            }
            return sum;
        }
    }
}
