package org.notchwork.problem.cipher;

import java.util.function.LongUnaryOperator;
import org.notchwork.problem.BitFunction;

/**
 * A function given by what it does to a word. Immutable.
 *
 * @param width the number of input bits
 * @param valueWidth the number of bits of a value
 * @param values the value at each point
 */
record WordFunction(int width, int valueWidth, LongUnaryOperator values) implements BitFunction {

    @Override
    public long at(long x) {
        return values.applyAsLong(x);
    }
}
