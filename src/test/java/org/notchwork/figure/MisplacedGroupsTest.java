package org.notchwork.figure;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.notchwork.Studies;
import org.notchwork.study.Study;
import org.notchwork.trial.TrialGroup;
import org.notchwork.trial.TrialRecord;
import org.notchwork.trial.TrialRunner;

/** Records that are not one a strategy, in order, would pair the wrong cells: they are refused. */
class MisplacedGroupsTest {

    private final Study study = Studies.small();
    private final TrialRunner runner = new TrialRunner(study);
    private final TrialGroup group = runner.run(study.experiments().get(0), 5, 0);

    @Test
    void aGroupWithoutOneOfItsRecordsIsRefused() {
        refused(group.records().subList(0, 5));
        refused(group.records().subList(1, 6));
        refused(List.of());
    }

    @Test
    void aGroupInAnotherOrderIsRefused() {
        List<TrialRecord> swapped = new ArrayList<>(group.records());
        Collections.swap(swapped, 1, 2);
        refused(swapped);
    }

    @Test
    void aGroupOfAnotherWidthOrExperimentIsRefused() {
        SummaryBuilder builder = new SummaryBuilder(study);
        for (TrialGroup stranger : List.of(
                new TrialGroup("all", 3, 0, group.records()),
                new TrialGroup("all", 4, 0, group.records()),
                new TrialGroup("none", 5, 0, List.of()))) {
            assertThrows(IllegalArgumentException.class, () -> builder.add(stranger));
        }
    }

    @Test
    void theOrderOfTrialsDoesNotMatter() {
        SummaryBuilder forwards = new SummaryBuilder(study);
        SummaryBuilder backwards = new SummaryBuilder(study);
        List<TrialGroup> groups = new ArrayList<>();
        study.experiments()
                .forEach(e -> e.widths().forEach(w -> {
                    for (long t = 0; t < e.trials(); t++) {
                        groups.add(runner.run(e, w, t));
                    }
                }));
        groups.forEach(forwards::add);
        Collections.reverse(groups);
        groups.forEach(backwards::add);
        assertEquals(forwards.summary(), backwards.summary());
    }

    private void refused(List<TrialRecord> records) {
        SummaryBuilder builder = new SummaryBuilder(study);
        assertThrows(IllegalArgumentException.class, () -> builder.add(new TrialGroup("all", 5, 0, records)));
    }
}
