package org.notchwork.check;

/**
 * What exhaustive checks of instances found.
 *
 * @param promise one comparison an instance: the whole domain against the promise
 * @param answers one an instance and one an answer given: against exhaustive search
 * @param engines one an engine and instance: the outcome distribution against theory
 */
public record InstanceTally(Comparison promise, Comparison answers, Comparison engines) {

    /** Nothing examined yet. */
    public static final InstanceTally NONE = new InstanceTally(Comparison.NONE, Comparison.NONE, Comparison.NONE);

    /** Returns both together. */
    public InstanceTally plus(InstanceTally other) {
        return new InstanceTally(promise.plus(other.promise), answers.plus(other.answers), engines.plus(other.engines));
    }
}
