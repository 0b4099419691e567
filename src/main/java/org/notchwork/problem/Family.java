package org.notchwork.problem;

import java.util.Optional;
import org.notchwork.json.Fields;

/** Makes problems of one kind from the settings in a study file. */
public interface Family {

    /** Returns the kind, as a study file names it. */
    String kind();

    /**
     * Returns the problem that the settings describe; empty if faults were noted that leave nothing to go on with.
     *
     * @param settings the members of {@code problem} in the study file; the member {@code kind} is read already.
     *     Faults are noted there; {@link Fields#end} is the caller's to call
     * @param files the files that a study may name
     */
    Optional<Problem> configure(Fields settings, Attachments files);
}
