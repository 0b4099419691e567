package org.notchwork.study;

import java.util.List;
import java.util.Optional;
import org.notchwork.json.Fault;

/**
 * What came of reading a study file.
 *
 * @param study the study; present exactly if there is no fault
 * @param faults all faults of the file, in the order of the file's members
 */
public record StudyReading(Optional<Study> study, List<Fault> faults) {

    /** Checks that there is a study exactly if there is no fault. */
    public StudyReading {
        faults = List.copyOf(faults);
        if (study.isPresent() != faults.isEmpty()) {
            throw new IllegalArgumentException("a study goes with no fault, and only then");
        }
    }
}
