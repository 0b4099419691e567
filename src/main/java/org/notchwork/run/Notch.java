package org.notchwork.run;

import java.util.List;
import org.notchwork.check.InstanceTally;
import org.notchwork.trial.TrialGroup;

/**
 * What a worker hands over for one instance: the records, their lines ready to be written, what examination found.
 *
 * @param group the records
 * @param lines one line a record
 * @param examined what exhaustive checks found; empty counts above the cross-check width
 */
record Notch(TrialGroup group, List<Line> lines, InstanceTally examined) {

    Notch {
        lines = List.copyOf(lines);
    }
}
