package org.notchwork.verify;

import java.util.ArrayList;
import java.util.List;

/** The differences that a stage found: the first few kept, the rest counted. */
final class Findings {

    private static final int KEPT = 20;

    private final List<Finding> first = new ArrayList<>();
    private long count;

    void add(Finding finding) {
        if (first.size() < KEPT) {
            first.add(finding);
        }
        count++;
    }

    boolean isEmpty() {
        return count == 0;
    }

    List<Finding> first() {
        return List.copyOf(first);
    }

    long count() {
        return count;
    }
}
