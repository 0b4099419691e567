package org.notchwork.law;

/**
 * A linear function read off at the unit words: n queries, the least that are certain of an answer.
 *
 * @param offset whether an unknown constant is added, which takes one query more, at the word 0
 */
public record UnitVectorsLaw(boolean offset) implements ConstantCountLaw {

    @Override
    public long count(int width) {
        return offset ? width + 1L : width;
    }

    @Override
    public String formula() {
        return offset ? "n + 1" : "n";
    }

    @Override
    public String source() {
        return "derived: a query tells one bit, and there are as many bits to tell";
    }
}
