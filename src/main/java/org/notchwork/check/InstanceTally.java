package org.notchwork.check;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;

/**
 * What exhaustive checks of instances found.
 *
 * @param promise one comparison an instance: the whole domain against the promise
 * @param answers one an instance and one an answer given: against exhaustive search
 * @param engines one an engine and instance: the outcome distribution against theory
 * @param accidents pairs of inputs with one value by accident, where the promise holds only nearly
 * @param samplingBounds by label: the sum of what a fixed number of samples must reach at least on each instance
 * @param ambiguous the trials whose instances have a second exact period, so that their answer is not fixed; at most 20
 */
public record InstanceTally(
        Comparison promise,
        Comparison answers,
        Comparison engines,
        long accidents,
        Map<String, BigDecimal> samplingBounds,
        List<Long> ambiguous) {

    private static final int MOST_NAMED = 20;

    /** Copies the list and the map. */
    public InstanceTally {
        samplingBounds = Collections.unmodifiableMap(new TreeMap<>(samplingBounds));
        ambiguous = List.copyOf(ambiguous.subList(0, Math.min(MOST_NAMED, ambiguous.size())));
    }

    /** Creates what was found where nothing happens by accident. */
    public InstanceTally(Comparison promise, Comparison answers, Comparison engines) {
        this(promise, answers, engines, 0, Map.of(), List.of());
    }

    /** Nothing examined yet. */
    public static final InstanceTally NONE = new InstanceTally(Comparison.NONE, Comparison.NONE, Comparison.NONE);

    /** Returns both together. */
    public InstanceTally plus(InstanceTally other) {
        List<Long> both = new ArrayList<>(ambiguous);
        both.addAll(other.ambiguous);
        Map<String, BigDecimal> sums = new TreeMap<>(samplingBounds);
        other.samplingBounds.forEach((label, bound) -> sums.merge(label, bound, BigDecimal::add));
        return new InstanceTally(
                promise.plus(other.promise),
                answers.plus(other.answers),
                engines.plus(other.engines),
                Math.addExact(accidents, other.accidents),
                sums,
                both);
    }
}
