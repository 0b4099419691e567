package org.notchwork.bundle;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.regex.Pattern;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.notchwork.bits.Word;
import org.notchwork.catalogue.Engines;
import org.notchwork.json.CanonicalJson;
import org.notchwork.json.Fault;
import org.notchwork.json.JsonFault;
import org.notchwork.json.JsonLimits;
import org.notchwork.json.JsonReader;
import org.notchwork.problem.Answer;
import org.notchwork.problem.Certificate;
import org.notchwork.problem.Counts;
import org.notchwork.problem.Pair;
import org.notchwork.strategy.Usage;
import org.notchwork.study.Cell;
import org.notchwork.study.StrategyChoice;
import org.notchwork.support.Studies;
import org.notchwork.trial.Outcome;
import org.notchwork.trial.TrialRecord;

class TrialLineTest {

    private static final SampleRun RUN = new SampleRun();
    private static final StrategyChoice FIBRE = choice("fourier-sampling", "fibre");

    /** The members and their order as the format page gives them. */
    @Test
    void aQuantumLineIsWrittenToTheByte() {
        assertEquals(
                "{\"answer\":{\"period\":\"15\"},\"calls\":{\"classical\":0,\"confirming\":2,\"inverse\":0,\"quantum\":5},"
                        + "\"certificate\":{\"equations\":{\"confirmation\":{\"fx\":\"03\",\"fy\":\"03\",\"x\":\"00\",\"y\":\"15\"},"
                        + "\"words\":[\"0a\",\"14\",\"02\",\"11\"]}},\"engine\":\"fibre\",\"equations\":5,"
                        + "\"format\":\"notchwork-trial/1\",\"hidden\":{\"period\":\"15\"},\"memory-words\":4,"
                        + "\"outcome\":\"solved\",\"sight\":\"blind\",\"strategy\":\"fourier-sampling@fibre\","
                        + "\"trial\":7,\"width\":5}",
                CanonicalJson.text(TrialLine.write(quantum(), FIBRE)));
    }

    @Test
    void aCensoredLineHasNeitherAnswerNorCertificate() {
        TrialRecord record = new TrialRecord(
                new Cell("e", 3, "sequential-scan"),
                0,
                period(3, 5),
                Outcome.CENSORED,
                Optional.empty(),
                Optional.empty(),
                new Counts(2, 0, 0, 0),
                new Usage(0, 32));
        assertEquals(
                "{\"calls\":{\"classical\":2,\"confirming\":0,\"inverse\":0,\"quantum\":0},\"equations\":0,"
                        + "\"format\":\"notchwork-trial/1\",\"hidden\":{\"period\":\"5\"},\"memory-words\":32,"
                        + "\"outcome\":\"censored\",\"strategy\":\"sequential-scan\",\"trial\":0,\"width\":3}",
                CanonicalJson.text(TrialLine.write(record, choice("sequential-scan"))));
    }

    @Test
    void everyRecordOfARunComesBackEqual() throws JsonFault {
        List<TrialRecord> records =
                RUN.groups().stream().flatMap(g -> g.records().stream()).toList();
        List<byte[]> lines = RUN.lines();
        assertEquals(records.size(), lines.size());
        for (int i = 0; i < lines.size(); i++) {
            List<Fault> faults = new ArrayList<>();
            TrialLine.Read read = TrialLine.read(
                            new JsonReader(JsonLimits.LINE).readCanonical(lines.get(i)),
                            records.get(i).cell().experiment(),
                            faults)
                    .orElseThrow();
            assertEquals(records.get(i), read.record());
            assertEquals(List.of(), faults);
        }
        assertTrue(records.stream().anyMatch(r -> r.outcome() == Outcome.CENSORED), "none was censored");
    }

    @Test
    void wordsOf63BitsComeBack() throws JsonFault {
        long s = Long.MAX_VALUE;
        Pair pair = new Pair(Word.of(63, 0), Word.of(63, s), Word.of(63, s), Word.of(63, s));
        TrialRecord record = new TrialRecord(
                new Cell("e", 63, "random-draws"),
                999_999,
                period(63, s),
                Outcome.SOLVED,
                Optional.of(period(63, s)),
                Optional.of(new Certificate.Collision(pair)),
                new Counts((1L << 51) - 1, 0, 0, 0),
                new Usage(0, 9));
        String line = CanonicalJson.text(TrialLine.write(record, choice("random-draws")));
        assertEquals(record, read(line, new ArrayList<>()).orElseThrow().record());
    }

    /** What is replaced in a right line, by what, and where the first fault should be noted. */
    @ParameterizedTest
    @CsvSource({
        "notchwork-trial/1, notchwork-trial/2, /format",
        "'\"width\":5', '\"width\":2049', /width",
        "'\"width\":5', '\"width\":\"5\"', /width",
        "'\"trial\":7', '\"trial\":-1', /trial",
        "'\"outcome\":\"solved\"', '\"outcome\":\"won\"', /outcome",
        "'\"hidden\":{\"period\":\"15\"}', '\"hidden\":{\"period\":\"00\"}', /hidden/period",
        "'\"hidden\":{\"period\":\"15\"}', '\"hidden\":{\"period\":\"20\"}', /hidden/period",
        "'\"hidden\":{\"period\":\"15\"}', '\"hidden\":{\"period\":\"5\"}', /hidden/period",
        "'\"hidden\":{\"period\":\"15\"}', '\"hidden\":{\"period\":\"1G\"}', /hidden/period",
        "'\"hidden\":{\"period\":\"15\"}', '\"hidden\":{\"disguise\":\"15\"}', /hidden/period",
        "'\"quantum\":5', '\"quantum\":-5', /calls/quantum",
        "'\"quantum\":5', '\"quantum\":5,\"secret\":1', /calls/secret",
        "'\"equations\":5', '\"equations\":\"five\"', /equations",
        "'\"fx\":\"03\"', '\"fx\":\"3\"', /certificate/equations/confirmation/fx",
        "'\"words\":[\"0a\"', '\"words\":[\"a\"', /certificate/equations/words/0",
        "'\"words\":[\"0a\"', '\"words\":[10', /certificate/equations/words/0",
        "'\"certificate\":', '\"diploma\":', /certificate",
        "'\"answer\":{\"period\":\"15\"},', '', /answer",
        "'\"memory-words\":4', '\"memory-words\":4,\"note\":\"x\"', /note"
    })
    void aChangedFieldIsNotedAtItsPlace(String from, String to, String pointer) throws JsonFault {
        String right = CanonicalJson.text(TrialLine.write(quantum(), FIBRE));
        String changed = right.replaceFirst(Pattern.quote(from), to == null ? "" : to);
        assertNotEquals(right, changed);
        List<Fault> faults = new ArrayList<>();
        assertTrue(read(changed, faults).isEmpty());
        assertTrue(
                faults.stream().anyMatch(f -> f.pointer().equals(pointer)),
                faults.stream().map(Fault::line).toList().toString());
    }

    @Test
    void aCensoredLineWithAnAnswerIsRefused() throws JsonFault {
        String right = CanonicalJson.text(TrialLine.write(quantum(), FIBRE));
        List<Fault> faults = new ArrayList<>();
        assertTrue(read(right.replace("\"solved\"", "\"censored\""), faults).isEmpty());
        assertEquals(
                List.of("/answer", "/certificate"),
                faults.stream().map(Fault::pointer).toList());
    }

    @Test
    void twoCertificatesAreRefused() throws JsonFault {
        String right = CanonicalJson.text(TrialLine.write(quantum(), FIBRE));
        String both = right.replace(
                "\"certificate\":{",
                "\"certificate\":{\"collision\":{\"fx\":\"03\",\"fy\":\"03\",\"x\":\"00\",\"y\":\"15\"},");
        assertTrue(read(both, new ArrayList<>()).isEmpty());
    }

    @Test
    void faultsOfEarlierLinesDoNotSpoilThisOne() throws JsonFault {
        String right = CanonicalJson.text(TrialLine.write(quantum(), FIBRE));
        List<Fault> faults = new ArrayList<>(List.of(new Fault("", "an earlier fault", "none")));
        assertFalse(read(right, faults).isEmpty());
    }

    private static Optional<TrialLine.Read> read(String line, List<Fault> faults) throws JsonFault {
        return TrialLine.read(new JsonReader(JsonLimits.LINE).read(line.getBytes(StandardCharsets.UTF_8)), "e", faults);
    }

    private static TrialRecord quantum() {
        List<Word> words = List.of(Word.of(5, 0x0a), Word.of(5, 0x14), Word.of(5, 0x02), Word.of(5, 0x11));
        Pair pair = new Pair(Word.of(5, 0), Word.of(5, 0x15), Word.of(5, 3), Word.of(5, 3));
        return new TrialRecord(
                new Cell("e", 5, "fourier-sampling@fibre"),
                7,
                period(5, 0x15),
                Outcome.SOLVED,
                Optional.of(period(5, 0x15)),
                Optional.of(new Certificate.Equations(words, pair)),
                new Counts(0, 5, 0, 2),
                new Usage(5, 4));
    }

    private static Answer period(int width, long s) {
        return new Answer.Period(Word.of(width, s));
    }

    private static StrategyChoice choice(String strategy) {
        return new StrategyChoice(Studies.strategy(strategy), Optional.empty());
    }

    private static StrategyChoice choice(String strategy, String engine) {
        return new StrategyChoice(Studies.strategy(strategy), Engines.engine(engine));
    }
}
