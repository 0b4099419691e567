package org.notchwork.problem;

/**
 * One function of a family with what it hides.
 *
 * <p>Strategies and blind engines never get one: they get an {@link Oracle} or a {@link Unitary} made from
 * {@link #function}. Immutable, so that checks may share it.
 *
 * @param function the function, without a counter
 * @param hidden the right answer
 */
public record Instance(BitFunction function, Answer hidden) {}
