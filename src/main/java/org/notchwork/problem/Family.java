package org.notchwork.problem;

import org.notchwork.json.Fields;

/** Makes problems of one kind from the settings in a study file. */
public interface Family {

    /** Returns the kind, as a study file names it. */
    String kind();

    /**
     * Returns the problem that the settings describe.
     *
     * @param settings the members of {@code problem} in the study file; the member {@code kind} is read already.
     *     Faults are noted there; {@link Fields#end} is the caller's to call
     */
    Problem configure(Fields settings);
}
