package org.notchwork.problem.table;

import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.notchwork.problem.Promise;
import org.notchwork.problem.Question;

/**
 * What an author declares about a table.
 *
 * @param kind the promise, by the name of the family that has it
 * @param dimension the dimension of the hidden subspace, 1 for a period
 */
record Declared(Kind kind, int dimension) {

    /** The promises that a table can have. */
    enum Kind {
        /** One period. */
        XOR_PERIOD,
        /** One period or none. */
        XOR_PERIOD_OR_NONE,
        /** Constant exactly on the cosets of a subspace. */
        HIDDEN_SUBSPACE,
        /** An inner product, a constant bit allowed. */
        INNER_PRODUCT,
        /** Constant or balanced. */
        CONSTANT_OR_BALANCED;

        /** Returns the word in study files. */
        String word() {
            return name().toLowerCase(Locale.ROOT).replace('_', '-');
        }

        static List<String> words() {
            return Arrays.stream(values()).map(Kind::word).toList();
        }

        static Optional<Kind> of(String word) {
            return Arrays.stream(values()).filter(k -> k.word().equals(word)).findFirst();
        }
    }

    /** Returns the promise that strategies are told. */
    Promise promise() {
        return switch (kind) {
            case XOR_PERIOD -> Promise.period(Promise.Labels.ANY);
            case XOR_PERIOD_OR_NONE -> Promise.periodOrNone(Promise.Labels.ANY);
            case HIDDEN_SUBSPACE -> new Promise(Question.SUBSPACE, dimension, Promise.Labels.ANY, false);
            case INNER_PRODUCT -> new Promise(Question.MASK, 0, Promise.Labels.ANY, true);
            case CONSTANT_OR_BALANCED -> new Promise(Question.CONSTANT_OR_BALANCED, 0, Promise.Labels.ANY, false);
        };
    }

    /** Returns whether the values have one bit. */
    boolean isBoolean() {
        return kind == Kind.INNER_PRODUCT || kind == Kind.CONSTANT_OR_BALANCED;
    }
}
