package org.notchwork.verify;

import java.util.Optional;
import java.util.OptionalLong;
import org.notchwork.bundle.TrialLine;
import org.notchwork.study.StrategyChoice;
import org.notchwork.trial.TrialRecord;

/** Whether a line is the one that the study calls for at its place. */
final class Expected {

    private static final String NONE = "(nothing)";

    private Expected() {}

    /** Notes every field that is not what the study calls for, and returns whether there was none. */
    static boolean isMet(
            TrialLine.Read read,
            int width,
            long trial,
            StrategyChoice choice,
            String path,
            long line,
            Findings findings) {
        TrialRecord record = read.record();
        long before = findings.count();
        compare(findings, path, line, "/width", Integer.toString(record.cell().width()), Integer.toString(width));
        compare(findings, path, line, "/trial", Long.toString(record.trial()), Long.toString(trial));
        compare(findings, path, line, "/strategy", record.cell().label(), choice.label());
        Optional<String> engine = choice.engine().map(e -> e.name());
        compare(findings, path, line, "/engine", read.engine().orElse(NONE), engine.orElse(NONE));
        compare(
                findings,
                path,
                line,
                "/sight",
                read.sight().orElse(NONE),
                choice.sight().orElse(NONE));
        return findings.count() == before;
    }

    private static void compare(
            Findings findings, String path, long line, String pointer, String written, String right) {
        if (!written.equals(right)) {
            findings.add(new Finding(path, OptionalLong.of(line), pointer, written, right));
        }
    }
}
