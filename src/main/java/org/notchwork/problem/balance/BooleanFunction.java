package org.notchwork.problem.balance;

import java.util.function.LongUnaryOperator;
import org.notchwork.problem.BitFunction;

/**
 * A function with values of one bit. Immutable.
 *
 * @param width the number of input bits
 * @param values the value at each point
 */
record BooleanFunction(int width, LongUnaryOperator values) implements BitFunction {

    @Override
    public int valueWidth() {
        return 1;
    }

    @Override
    public long at(long x) {
        return values.applyAsLong(x);
    }
}
