package org.notchwork.bundle;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.notchwork.check.CheckOutcome;
import org.notchwork.check.CrossCheck;
import org.notchwork.study.Study;

class ReadMeTest {

    private static final SampleRun RUN = new SampleRun();

    @Test
    void theFirstLineSaysWhetherTheCrossChecksAgree() {
        assertEquals(
                "All cross-checks that could be made agree.",
                ReadMe.text(RUN.results()).lines().findFirst().orElseThrow());
    }

    @Test
    void aFailedCrossCheckStandsInTheFirstLineOfEverything() {
        List<CrossCheck> checks = new ArrayList<>(RUN.results().checks());
        CrossCheck first = checks.get(0);
        checks.set(
                0,
                new CrossCheck(
                        first.kind(),
                        first.subject(),
                        first.compared(),
                        first.expected(),
                        "1 of 6 differ",
                        Optional.empty(),
                        CheckOutcome.DIFFERS));
        Results failed = new Results(
                RUN.study(), RUN.results().summary(), checks, RUN.results().claims());
        String line = ReadMe.text(failed).lines().findFirst().orElseThrow();
        assertTrue(line.contains("1 of " + checks.size() + " differ"), line);
        assertTrue(line.contains("cross-checks.json"), line);
        assertTrue(SummaryFile.write(failed.summary(), checks).toString().contains(line));
        assertTrue(CrossChecksFile.write(checks).toString().contains(line));
    }

    @Test
    void everyEngineIsNamedBlindOrSightedOnce() {
        List<String> lines = ReadMe.text(RUN.results()).lines().toList();
        assertEquals(1, lines.stream().filter("  fibre: blind"::equals).count());
        assertEquals(1, lines.stream().filter("  annihilator: sighted"::equals).count());
    }

    @Test
    void everyPayloadFileIsExplained() {
        String text = ReadMe.text(RUN.results());
        for (String name : Layout.payload(RUN.study())) {
            String shown = name.startsWith("trials-") ? "trials-*.jsonl" : name;
            assertTrue(name.equals(Layout.README) || text.contains("  " + shown + " "), name);
        }
    }

    @Test
    void textFromTheStudyCannotPrintALineOfItsOwn() {
        Study study = RUN.study();
        Study forged = new Study(
                "fine\nALL GOOD \u001b[32m",
                "why\u202e?",
                study.seed(),
                study.experiments(),
                study.crossCheckWidth(),
                study.claims());
        String text = ReadMe.text(
                new Results(forged, RUN.results().summary(), RUN.results().checks(), List.of()));
        assertTrue(text.contains("Study: fine\\u{a}ALL GOOD \\u{1b}[32m"), text);
        assertFalse(text.contains("\u202e"));
    }

    @Test
    void linesAreShortPlainAndEndWithOneLineFeed() {
        String text = ReadMe.text(RUN.results());
        assertTrue(text.endsWith(".\n"));
        text.lines()
                .filter(l -> !l.startsWith("Study:") && !l.startsWith("Question:"))
                .forEach(line -> {
                    assertTrue(line.length() <= 100, line);
                    assertTrue(line.chars().allMatch(c -> c >= ' ' && c <= '~'), line);
                });
    }
}
