package org.notchwork.verify;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.function.UnaryOperator;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.notchwork.Studies;
import org.notchwork.json.CanonicalJson;
import org.notchwork.json.JsonArray;
import org.notchwork.json.JsonObject;
import org.notchwork.json.JsonText;
import org.notchwork.json.JsonValue;

/** Answers and certificates moved between trials or weakened, each with all digests made anew. */
class ForgedCertificatesTest {

    /** Line 51 is random-draws' trial 0 at width 5 with a pair; line 53 the fibre engine's with four equations. */
    private static final int PAIR = 50;

    private static final int EQUATIONS = 52;
    private static final int AN_INSTANCE = 6;

    @TempDir
    static Path home;

    private static Path good;

    @TempDir
    Path folder;

    @BeforeAll
    static void makeOneGoodBundle() throws IOException, InterruptedException {
        good = BundleFixture.make(home.resolve("good"));
    }

    @Test
    void answerAndCertificateOfAnotherTrialAreFound() throws Exception {
        for (int at : new int[] {PAIR, EQUATIONS}) {
            StageReport report = certificates("both-" + at, lines -> {
                JsonObject one = Forger.object(lines.get(at));
                JsonObject other = otherAnswer(lines, at);
                lines.set(at, text(moved(moved(one, other, "answer"), other, "certificate")));
                return lines;
            });
            assertFinding(report, at, "/outcome", "solved", "wrong");
        }
    }

    @Test
    void theCertificateOfAnotherTrialAloneIsFound() throws Exception {
        for (int at : new int[] {PAIR, EQUATIONS}) {
            StageReport report = certificates("certificate-" + at, lines -> {
                lines.set(at, text(moved(Forger.object(lines.get(at)), otherAnswer(lines, at), "certificate")));
                return lines;
            });
            assertEquals(StageOutcome.FAILED, report.outcome());
            Finding first = report.findings().get(0);
            assertEquals(at + 1, first.line().orElseThrow());
            assertTrue(first.pointer().startsWith("/certificate/"), first.text());
        }
    }

    @Test
    void aDependentEquationIsFoundByTheRank() throws Exception {
        StageReport report = certificates("dependent", lines -> {
            JsonObject line = Forger.object(lines.get(EQUATIONS));
            lines.set(EQUATIONS, text(words(line, words -> {
                words.set(1, words.get(0));
                return words;
            })));
            return lines;
        });
        assertFinding(report, EQUATIONS, "/certificate/equations/words", "4 words of rank 3", "4 independent words");
    }

    @Test
    void anEquationTooFewIsFound() throws Exception {
        StageReport report = certificates("fewer", lines -> {
            lines.set(EQUATIONS, text(words(Forger.object(lines.get(EQUATIONS)), words -> {
                words.remove(3);
                return words;
            })));
            return lines;
        });
        assertFinding(report, EQUATIONS, "/certificate/equations/words", "3 words of rank 3", "4 independent words");
    }

    @Test
    void aSolvedTrialCalledWrongIsFound() throws Exception {
        StageReport report = certificates("wrong", lines -> {
            lines.set(PAIR, lines.get(PAIR).replace("\"outcome\":\"solved\"", "\"outcome\":\"wrong\""));
            return lines;
        });
        assertFinding(report, PAIR, "/outcome", "wrong", "solved");
    }

    @Test
    void aSecretSwappedTogetherWithAnswerAndOutcomeIsFoundByDrawingTheInstanceAgain() throws Exception {
        StageReport report = certificates("secret", lines -> {
            JsonObject one = Forger.object(lines.get(PAIR));
            JsonObject other = otherAnswer(lines, PAIR);
            for (String member : List.of("answer", "certificate", "hidden")) {
                one = moved(one, other, member);
            }
            lines.set(PAIR, text(one));
            return lines;
        });
        assertEquals(StageOutcome.FAILED, report.outcome());
        assertEquals("/hidden/period", report.findings().get(0).pointer());
        assertEquals(PAIR + 1, report.findings().get(0).line().orElseThrow());
    }

    private StageReport certificates(String name, UnaryOperator<List<String>> change) throws Exception {
        Path bundle = BundleFixture.copy(good, folder.resolve(name));
        BundleFixture.editLines(bundle, "trials-all.jsonl", change);
        BundleFixture.reseal(bundle, Studies.small());
        Verdict verdict = BundleFixture.verify(bundle);
        assertEquals(10, verdict.exitCode(), verdict.sentence());
        return verdict.stages().get(4);
    }

    private static void assertFinding(StageReport report, int at, String pointer, String written, String right) {
        assertEquals(StageOutcome.FAILED, report.outcome(), report.sentence());
        Finding first = report.findings().get(0);
        assertEquals(at + 1, first.line().orElseThrow());
        assertEquals(List.of(pointer, written, right), List.of(first.pointer(), first.written(), first.right()));
    }

    /** The next trial of the same cell that hides something else. */
    private static JsonObject otherAnswer(List<String> lines, int at) {
        JsonObject one = Forger.object(lines.get(at));
        for (int i = at + AN_INSTANCE; i < lines.size(); i += AN_INSTANCE) {
            JsonObject other = Forger.object(lines.get(i));
            if (!other.member("answer").equals(one.member("answer"))) {
                return other;
            }
        }
        throw new IllegalStateException("all trials hide the same");
    }

    private static JsonObject moved(JsonObject to, JsonObject from, String member) {
        return Forger.with(to, member, from.member(member).orElseThrow());
    }

    private static JsonObject words(JsonObject line, UnaryOperator<List<JsonValue>> change) {
        JsonObject certificate = (JsonObject) line.member("certificate").orElseThrow();
        JsonObject equations = (JsonObject) certificate.member("equations").orElseThrow();
        JsonArray words = (JsonArray) equations.member("words").orElseThrow();
        List<JsonValue> changed = change.apply(new ArrayList<>(words.items()));
        assertTrue(changed.stream().allMatch(JsonText.class::isInstance));
        return Forger.with(
                line,
                "certificate",
                Forger.with(certificate, "equations", Forger.with(equations, "words", new JsonArray(changed))));
    }

    private static String text(JsonObject line) {
        return CanonicalJson.text(line);
    }
}
