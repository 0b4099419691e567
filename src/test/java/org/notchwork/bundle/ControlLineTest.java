package org.notchwork.bundle;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.notchwork.Controlled;
import org.notchwork.Studies;
import org.notchwork.json.CanonicalJson;
import org.notchwork.json.Fault;
import org.notchwork.json.JsonFault;
import org.notchwork.json.JsonLimits;
import org.notchwork.json.JsonReader;
import org.notchwork.study.Experiment;
import org.notchwork.study.Study;
import org.notchwork.trial.ControlRecord;
import org.notchwork.trial.TrialRunner;

class ControlLineTest {

    private static final Study STUDY = Studies.of(Controlled.TEXT);

    private static Optional<ControlRecord> read(String line, List<Fault> faults) throws JsonFault {
        return ControlLine.read(
                new JsonReader(JsonLimits.LINE).readCanonical(line.getBytes(StandardCharsets.UTF_8)), "c", faults);
    }

    @Test
    void whatIsWrittenIsReadAsTheSame() throws JsonFault {
        Experiment experiment = STUDY.experiments().get(0);
        TrialRunner runner = new TrialRunner(STUDY);
        for (int width : experiment.widths()) {
            for (long trial = 0; trial < 20; trial++) {
                for (ControlRecord record : runner.run(experiment, width, trial).controls()) {
                    List<Fault> faults = new ArrayList<>();
                    String line = CanonicalJson.text(ControlLine.write(record));
                    assertEquals(Optional.of(record), read(line, faults));
                    assertEquals(List.of(), faults);
                }
            }
        }
    }

    private static String line() {
        Experiment experiment = STUDY.experiments().get(0);
        return CanonicalJson.text(ControlLine.write(
                new TrialRunner(STUDY).run(experiment, 6, 0).controls().get(0)));
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '~', textBlock = """
            "outcome":"[a-z]+"                  | "outcome":"odd"               | /outcome
            "trial":0                           | "trial":-1                    | /trial
            "width":6                           | "width":0                     | /width
            "strategy":"random-draws"           | "strategy":""                 | /strategy
            "format":"[^"]+"                    | "format":"notchwork-trial/1"  | /format
            "answer":.*,"calls"                 | "calls"                       | /answer
            "secret":.*,"strategy"              | "strategy"                    | /secret
            "outcome":"[a-z]+"                  | "outcom":"claimed"            | /outcome
            """)
    void aFaultIsNamedWithItsPlace(String from, String to, String pointer) throws JsonFault {
        String changed = line().replaceFirst(from.strip(), to.strip());
        assertTrue(!changed.equals(line()), "nothing was changed");
        List<Fault> faults = new ArrayList<>();
        assertEquals(Optional.empty(), read(changed, faults));
        assertEquals(pointer, faults.get(0).pointer(), faults.toString());
    }

    @Test
    void somethingNamedNeedsAnAnswer() throws JsonFault {
        String bare = line().replaceFirst("\"answer\":.*,\"format\"", "\"calls\":CALLS,\"format\"");
        String calls = line().replaceFirst(".*\"calls\":(\\{[^}]*\\}).*", "$1");
        List<Fault> faults = new ArrayList<>();
        assertEquals(Optional.empty(), read(bare.replace("CALLS", calls), faults));
        assertEquals("/outcome", faults.get(0).pointer(), faults.toString());
        assertTrue(read(
                        bare.replace("CALLS", calls).replaceFirst("\"outcome\":\"[a-z]+\"", "\"outcome\":\"nothing\""),
                        new ArrayList<>())
                .isPresent());
    }
}
