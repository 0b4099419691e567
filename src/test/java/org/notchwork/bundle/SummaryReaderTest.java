package org.notchwork.bundle;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.notchwork.figure.Summary;
import org.notchwork.json.CanonicalJson;
import org.notchwork.json.Fault;
import org.notchwork.json.JsonFault;
import org.notchwork.json.JsonLimits;
import org.notchwork.json.JsonObject;
import org.notchwork.json.JsonReader;

class SummaryReaderTest {

    private static final SampleRun RUN = new SampleRun();
    private static final JsonObject WRITTEN =
            SummaryFile.write(RUN.results().summary(), RUN.results().checks());

    @Test
    void aReadSummaryWritesTheSameFile() {
        List<Fault> faults = new ArrayList<>();
        Summary read = SummaryReader.read(WRITTEN, RUN.study(), faults);
        assertEquals(List.of(), faults);
        assertEquals(
                CanonicalJson.text(WRITTEN),
                CanonicalJson.text(SummaryFile.write(read, RUN.results().checks())));
    }

    @Test
    void countsComeBackExactly() {
        Summary read = SummaryReader.read(WRITTEN, RUN.study(), new ArrayList<>());
        Summary made = RUN.results().summary();
        assertEquals(made.cells().size(), read.cells().size());
        for (int i = 0; i < made.cells().size(); i++) {
            assertEquals(made.cells().get(i).cell(), read.cells().get(i).cell());
            assertEquals(made.cells().get(i).solved(), read.cells().get(i).solved());
            assertEquals(made.cells().get(i).censored(), read.cells().get(i).censored());
            assertEquals(
                    made.cells().get(i).queries().median(),
                    read.cells().get(i).queries().median());
            assertEquals(made.cells().get(i).sight(), read.cells().get(i).sight());
        }
        assertTrue(made.cells().stream().anyMatch(c -> c.censored() > 0), "the sample should hold a censored trial");
    }

    /** What is replaced in the file, by what, and where the first fault should be noted. */
    @ParameterizedTest
    @CsvSource({
        "notchwork-summary/1, notchwork-summary/2, /format",
        "small/3/sequential-scan, small/3/other, /cells/0/cell",
        "'\"sight\":\"sighted\"', '\"sight\":\"blind\"', /cells/3/sight",
        "'\"trials\":6', '\"trials\":-6', /cells/0/trials",
        "'\"mean\":\"', '\"mean\":\"0', /cells/0/queries/mean",
        "'\"median\"', '\"meridian\"', /cells/0/queries/median",
        "'\"low\":\"', '\"low\":\"9', /cells/0/queries/mean-interval/low",
        "'\"pairs\":6', '\"pairs\":\"6\"', /ratios/0/pairs",
        "'\"agree\":', '\"agreed\":', /cross-checks/agree"
    })
    void aChangedFieldIsNotedAtItsPlace(String from, String to, String pointer) throws JsonFault {
        String text = CanonicalJson.text(WRITTEN);
        String changed = text.replaceFirst(Pattern.quote(from), to);
        assertFalse(changed.equals(text), "nothing was changed");
        List<Fault> faults = new ArrayList<>();
        SummaryReader.read(
                new JsonReader(JsonLimits.FILE).read(changed.getBytes(StandardCharsets.UTF_8)), RUN.study(), faults);
        assertTrue(
                faults.stream().anyMatch(f -> f.pointer().equals(pointer)),
                faults.stream().map(Fault::line).toList().toString());
    }

    @Test
    void claimsComeBackAsTheyWereJudged() {
        List<Fault> faults = new ArrayList<>();
        assertEquals(
                RUN.results().claims(),
                ClaimsFile.read(ClaimsFile.write(RUN.results().claims()), RUN.study(), faults));
        assertEquals(List.of(), faults);
    }

    @Test
    void aClaimOfAnotherTextIsNoted() throws JsonFault {
        String text = CanonicalJson.text(ClaimsFile.write(RUN.results().claims()));
        String changed = text.replace("Few rounds are enough.", "No rounds are enough.");
        List<Fault> faults = new ArrayList<>();
        ClaimsFile.read(
                new JsonReader(JsonLimits.FILE).read(changed.getBytes(StandardCharsets.UTF_8)), RUN.study(), faults);
        assertEquals(
                List.of("/claims/0/claim"), faults.stream().map(Fault::pointer).toList());
    }
}
