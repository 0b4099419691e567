package org.notchwork.problem;

import java.util.List;

/**
 * One function of a family with what it hides.
 *
 * <p>Strategies and blind engines never get one: they get an {@link Oracle} or a {@link Unitary} made from
 * {@link #function}. Immutable, so that checks may share it.
 *
 * @param function the function, without a counter
 * @param hidden the right answer
 * @param parts the functions that it is made of, where they can be called on their own; empty otherwise. One value of
 *     the function costs one call of each
 */
public record Instance(BitFunction function, Answer hidden, List<Part> parts) {

    /** Copies the list. */
    public Instance {
        parts = List.copyOf(parts);
    }

    /** Creates an instance with nothing to call but its function. */
    public Instance(BitFunction function, Answer hidden) {
        this(function, hidden, List.of());
    }

    /** Returns how many counters a meter needs: one a part, or one. */
    public int counters() {
        return Math.max(1, parts.size());
    }
}
