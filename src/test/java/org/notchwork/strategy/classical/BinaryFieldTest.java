package org.notchwork.strategy.classical;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.math.BigInteger;
import java.util.HashMap;
import java.util.Map;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.seed.RandomStream;
import org.notchwork.support.CheckValues;
import org.notchwork.support.Streams;
import tools.jackson.databind.JsonNode;

class BinaryFieldTest {

    static IntStream degrees() {
        return IntStream.rangeClosed(1, 31);
    }

    /** The modulus as the multiplication shows it: x · x^(k−1) is what x^k leaves. */
    private static BigInteger modulus(int degree) {
        BinaryField field = new BinaryField(degree);
        long rest = degree == 1 ? field.times(1, 1) : field.times(2, 1L << (degree - 1));
        return BigInteger.ONE.shiftLeft(degree).or(BigInteger.valueOf(rest));
    }

    /**
     * M. O. Rabin's test (SIAM J. Comput. 9 (1980)): g of degree k is irreducible exactly if it divides x^(2^k) − x and has
     * no factor in common with x^(2^(k/p)) − x for any prime p dividing k. Written with polynomials of its own.
     */
    @ParameterizedTest
    @MethodSource("degrees")
    void theModulusIsIrreducible(int degree) {
        BigInteger modulus = modulus(degree);
        assertEquals(BigInteger.ZERO, rest(frobenius(degree, modulus).xor(x()), modulus));
        for (int prime = 2; prime <= degree; prime++) {
            if (degree % prime == 0 && BigInteger.valueOf(prime).isProbablePrime(50)) {
                BigInteger other = frobenius(degree / prime, modulus).xor(x());
                assertEquals(BigInteger.ONE, gcd(modulus, rest(other, modulus)), "factor of degree below " + degree);
            }
        }
    }

    /** The test itself tells a product from an irreducible polynomial: x² + 1 and x⁴ + x² + 1 are squares. */
    @Test
    void theTestFindsProducts() {
        assertTrue(rest(frobenius(2, BigInteger.valueOf(5)).xor(x()), BigInteger.valueOf(5))
                        .signum()
                != 0);
        assertTrue(rest(frobenius(4, BigInteger.valueOf(21)).xor(x()), BigInteger.valueOf(21))
                        .signum()
                != 0);
    }

    private static BigInteger x() {
        return BigInteger.TWO;
    }

    /** x^(2^times), reduced. */
    private static BigInteger frobenius(int times, BigInteger modulus) {
        BigInteger power = rest(x(), modulus);
        for (int i = 0; i < times; i++) {
            power = rest(square(power), modulus);
        }
        return power;
    }

    private static BigInteger square(BigInteger a) {
        BigInteger square = BigInteger.ZERO;
        for (int bit = 0; bit < a.bitLength(); bit++) {
            square = a.testBit(bit) ? square.setBit(2 * bit) : square;
        }
        return square;
    }

    private static BigInteger rest(BigInteger a, BigInteger modulus) {
        BigInteger rest = a;
        while (rest.bitLength() >= modulus.bitLength()) {
            rest = rest.xor(modulus.shiftLeft(rest.bitLength() - modulus.bitLength()));
        }
        return rest;
    }

    private static BigInteger gcd(BigInteger a, BigInteger b) {
        return b.signum() == 0 ? a : gcd(b, rest(a, b));
    }

    /** Check values, section D: the field polynomials of published orders of points. */
    @Test
    void theModuliOfTheTableAreThosePublished() throws Exception {
        for (JsonNode row : CheckValues.section("D").required("table")) {
            int degree = row.required("k").asInt();
            assertEquals(new BigInteger(row.required("poly").asString(), 2), modulus(degree), "degree " + degree);
        }
    }

    @ParameterizedTest
    @ValueSource(ints = {1, 2, 3, 4, 5})
    void theAxiomsOfAFieldHoldForAllElements(int degree) {
        BinaryField field = new BinaryField(degree);
        long size = 1L << degree;
        for (long a = 0; a < size; a++) {
            assertEquals(a, field.times(a, 1));
            assertEquals(0, field.times(a, 0));
            int inverses = 0;
            for (long b = 0; b < size; b++) {
                long product = field.times(a, b);
                assertTrue(product >= 0 && product < size);
                assertEquals(product, field.times(b, a));
                inverses += product == 1 ? 1 : 0;
                for (long c = 0; c < size; c++) {
                    assertEquals(field.times(product, c), field.times(a, field.times(b, c)));
                    assertEquals(product ^ field.times(a, c), field.times(a, b ^ c));
                }
            }
            assertEquals(a == 0 ? 0 : 1, inverses);
        }
    }

    /** Schoolbook multiplication and division of polynomials, at every degree. */
    @ParameterizedTest
    @MethodSource("degrees")
    void productsAreThoseOfPolynomials(int degree) {
        BinaryField field = new BinaryField(degree);
        RandomStream stream = Streams.numbered("field", degree);
        for (int i = 0; i < 200; i++) {
            long a = stream.bits(degree);
            long b = stream.bits(degree);
            BigInteger product = BigInteger.ZERO;
            for (int bit = 0; bit < degree; bit++) {
                product = (b >>> bit & 1) == 0
                        ? product
                        : product.xor(BigInteger.valueOf(a).shiftLeft(bit));
            }
            assertEquals(rest(product, modulus(degree)).longValueExact(), field.times(a, b));
        }
    }

    /** Almost perfect nonlinear: x ↦ F(x + u) + F(x) takes no value more than twice, for no u but 0 (K. Nyberg 1993). */
    @ParameterizedTest
    @ValueSource(ints = {2, 3, 4, 5, 6, 7, 8, 9, 10})
    void cubingIsAlmostPerfectNonlinear(int degree) {
        assertEquals(2, worstDifference(degree, 3));
    }

    /** The exponent 2^i + 1 has the property exactly if i and k have no factor in common (R. Gold 1968): here i = 2. */
    @ParameterizedTest
    @ValueSource(ints = {3, 4, 5, 6, 7, 8, 9, 10})
    void theFifthPowerHasThePropertyAtOddDegreesOnly(int degree) {
        assertEquals(degree % 2 == 1 ? 2 : 4, worstDifference(degree, 5));
    }

    private static long worstDifference(int degree, int exponent) {
        BinaryField field = new BinaryField(degree);
        long size = 1L << degree;
        long worst = 0;
        for (long u = 1; u < size; u++) {
            Map<Long, Long> seen = new HashMap<>();
            for (long x = 0; x < size; x++) {
                long difference = power(field, x ^ u, exponent) ^ power(field, x, exponent);
                worst = Math.max(worst, seen.merge(difference, 1L, Long::sum));
            }
        }
        return worst;
    }

    private static long power(BinaryField field, long x, int exponent) {
        long power = 1;
        for (int i = 0; i < exponent; i++) {
            power = field.times(power, x);
        }
        return power;
    }

    @Test
    void otherDegreesAreRefused() {
        assertThrows(IllegalArgumentException.class, () -> new BinaryField(0));
        assertThrows(IllegalArgumentException.class, () -> new BinaryField(32));
    }
}
