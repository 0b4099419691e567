package org.notchwork.check;

import org.notchwork.problem.Problem;
import org.notchwork.problem.Promise;
import org.notchwork.problem.Question;

/** What exhaustive checks expect of a problem, in one line each. The lines are under the seal and do not change. */
final class PromiseText {

    private final Promise promise;
    private final boolean isBroken;

    PromiseText(Problem problem) {
        this.promise = problem.promise();
        this.isBroken = problem.isPromiseBroken();
    }

    String promise() {
        if (isBroken) {
            return "the promise is broken, as the study says";
        }
        return switch (promise.question()) {
            case PERIOD ->
                promise.isExact()
                        ? "in every instance every value has two inputs, and they differ by the hidden period"
                        : "every instance has the hidden period exactly, whatever other inputs share a value";
            case PERIOD_OR_NONE ->
                promise.isExact()
                        ? "every instance is injective, or every value has two inputs that differ by the hidden period"
                        : "every instance has the hidden period exactly, or none, whatever other inputs share a value";
            case SUBSPACE ->
                "in every instance two inputs have one value exactly if they differ by a word of the hidden"
                        + " subspace, of dimension " + promise.dimension();
            case MASK ->
                "every instance is the inner product with the hidden word"
                        + (promise.offset() ? ", a constant bit added or not" : "");
            case CONSTANT_OR_BALANCED -> "every instance is constant or takes both values equally often, as hidden";
        };
    }

    String answers() {
        return isBroken
                ? "no answer is right where the promise is broken"
                : "the hidden answer of every instance and every answer given equal what search finds";
    }

    String engines() {
        if (promise.question() == Question.PERIOD && promise.isExact() && !isBroken) {
            return "every engine gives 2^(1-n) to each word orthogonal to the period and 0 to the others, exactly";
        }
        return "every engine gives the probabilities that the definition of the circuit gives, by double sums, exactly";
    }
}
