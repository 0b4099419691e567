package org.notchwork.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.engine.Engine;
import org.notchwork.json.CanonicalJson;
import org.notchwork.json.Fault;
import org.notchwork.json.JsonObject;

/** What cannot be run is refused before the run, in one line with its place and its mend. */
class SecondFormatFaultsTest {

    private static final String TABLE = "\"kind\": \"xor-period\", \"instances\": \"table\"";
    private static final String PERMUTATION = "\"kind\": \"xor-period\", \"instances\": \"permutation\"";
    private static final String OR_NONE = "\"kind\": \"xor-period-or-none\", \"instances\": \"table\"";
    private static final String FIXED = "\"name\": \"fourier-sampling-fixed\", \"engine\": \"fibre\"";
    private static final String AT = "/experiments/0/strategies/0";

    private static String study(String problem, String widths, String... strategies) {
        return """
                {
                  "format": "notchwork-study/2",
                  "title": "An invented study of faults",
                  "question": "What is refused?",
                  "seed": "a seed of the study of faults",
                  "cross-check-width": 0,
                  "experiments": [
                    {
                      "id": "e",
                      "problem": { %s },
                      "widths": [%s],
                      "strategies": [ { %s } ],
                      "trials": 1,
                      "query-limit": 10
                    }
                  ],
                  "claims": []
                }
                """.formatted(problem, widths, String.join(" }, { ", strategies));
    }

    private static Arguments fault(String problem, String widths, String strategy, String line) {
        return Arguments.of(study(problem, widths, strategy), line);
    }

    static Stream<Arguments> faults() {
        return Stream.of(
                fault(
                        TABLE,
                        "6, 7",
                        "\"name\": \"sidon-set\"",
                        AT
                                + "/name: sidon-set splits words into two halves and width 7 is odd; another strategy or problem is wanted"),
                fault(
                        "\"kind\": \"hidden-subspace\", \"dimension\": 0",
                        "5",
                        "\"name\": \"collision-span\"",
                        "/experiments/0/problem/dimension: 0; a whole number from 1 to 62 is wanted"),
                fault(
                        "\"kind\": \"hidden-subspace\", \"dimension\": 5",
                        "5",
                        "\"name\": \"collision-span\"",
                        "/experiments/0/widths/0: width 5; a width from 6 to 63 is wanted"),
                fault(
                        TABLE,
                        "5",
                        FIXED + ", \"rounds\": 9, \"noise\": { \"readout-flip\": \"0.5\" }",
                        AT
                                + "/noise/readout-flip: a bit that is flipped with probability 1/2 holds no information; less is wanted"),
                fault(
                        TABLE,
                        "5",
                        FIXED + ", \"rounds\": 9, \"noise\": { \"readout-flip\": \"0.500\" }",
                        AT
                                + "/noise/readout-flip: a bit that is flipped with probability 1/2 holds no information; less is wanted"),
                fault(
                        TABLE,
                        "5",
                        FIXED + ", \"rounds\": 9, \"noise\": { \"readout-flip\": \"0.7\" }",
                        AT + "/noise/readout-flip: p = 0.7 is above 1/2; 1 - p with every bit inverted says the same"),
                fault(
                        TABLE,
                        "5",
                        FIXED + ", \"rounds\": 9, \"noise\": { \"uniform-mix\": \"1\" }",
                        AT + "/noise/uniform-mix: q = 1: a uniform word holds no information; less than 1 is wanted"),
                fault(
                        TABLE,
                        "5",
                        FIXED + ", \"rounds\": 9, \"noise\": { \"readout-flip\": \"-0.1\" }",
                        AT + "/noise/readout-flip: -0.1; a probability in quotes is wanted, for example \"0.02\""),
                fault(
                        TABLE,
                        "5",
                        FIXED + ", \"rounds\": 9, \"noise\": { \"readout-flip\": \"2%\" }",
                        AT + "/noise/readout-flip: \"2%\"; a probability in quotes is wanted, for example \"0.02\""),
                fault(
                        TABLE,
                        "5",
                        FIXED + ", \"rounds\": 9, \"noise\": { \"flip\": \"0.1\" }",
                        AT + "/noise/flip: unknown member \"flip\""),
                fault(
                        TABLE,
                        "5",
                        "\"name\": \"fourier-sampling\", \"engine\": \"fibre\", \"noise\": { \"readout-flip\": \"0.1\" }",
                        AT
                                + "/noise: fourier-sampling relies on undisturbed values; noise goes with fourier-sampling-fixed and a decoder"),
                fault(
                        TABLE,
                        "5",
                        "\"name\": \"random-draws\", \"noise\": { \"readout-flip\": \"0.1\" }",
                        AT
                                + "/noise: random-draws relies on undisturbed values; noise goes with fourier-sampling-fixed and a decoder"),
                fault(
                        TABLE,
                        "5, 14",
                        "\"name\": \"fourier-sampling\", \"engine\": \"statevector\"",
                        AT
                                + "/engine: statevector holds 26 qubits and width 14 needs 28; engine fibre reaches width 26"),
                fault(
                        PERMUTATION,
                        "25",
                        "\"name\": \"fourier-sampling\", \"engine\": \"weights\"",
                        AT + "/engine: weights evaluates all 2^n points and reaches width 24, not 25"),
                fault(
                        TABLE,
                        "5",
                        "\"name\": \"unit-vectors\"",
                        AT
                                + "/name: unit-vectors does not answer what xor-period asks; another strategy or problem is wanted"),
                fault(
                        "\"kind\": \"constant-or-balanced\"",
                        "5",
                        "\"name\": \"fourier-sampling\", \"engine\": \"fibre\"",
                        AT + "/name: fourier-sampling does not answer what constant-or-balanced asks"),
                fault(
                        "\"kind\": \"even-mansour\"",
                        "6",
                        "\"name\": \"cycle-walk\"",
                        AT
                                + "/name: cycle-walk takes the first equal values for the answer, and in even-mansour they can be an accident; collision-counting verifies"),
                fault(
                        "\"kind\": \"even-mansour\"",
                        "6",
                        "\"name\": \"zero-error-fourier\", \"engine\": \"fibre\"",
                        AT
                                + "/name: zero-error-fourier is certain only where the promise holds exactly; fourier-sampling takes even-mansour"),
                fault(
                        "\"kind\": \"even-mansour\"",
                        "6",
                        "\"name\": \"fourier-sampling\", \"engine\": \"annihilator\"",
                        AT
                                + "/engine: annihilator samples what theory gives where the promise holds, and this one holds nearly at best; engine weights takes any function"),
                fault(
                        TABLE,
                        "6",
                        "\"name\": \"affine-solve\"",
                        AT
                                + "/name: affine-solve needs functions that are known to be affine, and those of xor-period are not"),
                fault(
                        TABLE,
                        "6",
                        "\"name\": \"data-time-tradeoff\"",
                        AT + "/name: data-time-tradeoff calls a cipher and its permutation, and xor-period has none"),
                fault(
                        "\"kind\": \"even-mansour\"",
                        "6",
                        "\"name\": \"data-time-tradeoff\", \"data-bits\": 5",
                        AT + "/name: data-time-tradeoff asks 2^5 pairs, and width 6 allows data-bits of at most 4"),
                fault(
                        "\"kind\": \"constant-or-balanced\"",
                        "3, 5",
                        "\"name\": \"balance-sampling\", \"queries\": 9",
                        AT + "/name: balance-sampling asks 9 different points and width 3 has fewer"),
                fault(
                        TABLE,
                        "6",
                        "\"name\": \"distinguished-points\", \"distinguished-bits\": 6, \"stored-trails\": 5",
                        AT + "/name: at width 6 no more than one point has 6 lowest bits 0"),
                fault(
                        TABLE,
                        "6",
                        "\"name\": \"distinguished-points\", \"distinguished-bits\": 2",
                        AT + "/stored-trails: this member is missing"),
                fault(
                        PERMUTATION,
                        "5, 30",
                        "\"name\": \"fourier-sampling\", \"engine\": \"auto\"",
                        AT
                                + "/engine: no blind engine takes this, and annihilator is told the secret; a smaller width, or \"allow-sighted\": true, is wanted"),
                fault(
                        TABLE,
                        "5",
                        "\"name\": \"fourier-sampling\", \"engine\": \"fibre\", \"allow-sighted\": true",
                        AT + "/allow-sighted: an engine is named; this goes with \"engine\": \"auto\" only"),
                fault(
                        TABLE,
                        "5",
                        "\"name\": \"random-draws\", \"engine\": \"auto\"",
                        AT + "/engine: random-draws is a classical strategy; leave the engine out"),
                fault(
                        TABLE,
                        "5",
                        FIXED + ", \"rounds\": 9, \"extra-rounds\": 2",
                        AT
                                + ": \"rounds\" and \"extra-rounds\" at once; either \"rounds\" or \"extra-rounds\" (beyond n - 1) is wanted"),
                fault(
                        TABLE,
                        "5",
                        FIXED,
                        AT
                                + ": a fixed number of rounds without the number; either \"rounds\" or \"extra-rounds\" (beyond n - 1) is wanted"),
                fault(
                        TABLE,
                        "5",
                        FIXED + ", \"rounds\": 0",
                        AT + "/rounds: 0; a whole number from 1 to 100000 is wanted"),
                fault(
                        TABLE,
                        "5",
                        FIXED + ", \"rounds\": 9, \"decoder\": \"likelyhood\"",
                        AT + "/decoder: no decoder \"likelyhood\"; did you mean \"likelihood\"?"),
                fault(
                        OR_NONE,
                        "5",
                        FIXED + ", \"rounds\": 9, \"decoder\": \"likelihood\"",
                        AT
                                + "/name: decoder likelihood always names a period; where there may be none, elimination decides"),
                fault(
                        PERMUTATION,
                        "21",
                        FIXED + ", \"rounds\": 40, \"decoder\": \"likelihood\"",
                        AT + "/name: decoder likelihood reaches width 20, not 21"),
                fault(
                        TABLE,
                        "5",
                        "\"name\": \"fourier-sampling\", \"engine\": \"stabilizer\"",
                        AT + "/engine: stabilizer"),
                fault(
                        TABLE,
                        "5",
                        "\"name\": \"random-draws\", \"control\": \"yes\"",
                        AT + "/control: this is a string; true or false is wanted"));
    }

    @ParameterizedTest
    @MethodSource("faults")
    void whatCannotRunIsRefusedInOneLine(String text, String line) {
        List<String> lines = lines(text);
        assertEquals(1, lines.size(), lines.toString());
        assertTrue(lines.get(0).startsWith(line), lines.get(0));
        assertTrue(lines.get(0).contains("; "), lines.get(0) + " has no mend");
    }

    @ParameterizedTest
    @ValueSource(strings = {"Draws", "draws_1", "-draws", "draws-", "", "a label", "a@b", "draws/1", "é"})
    void aLabelIsOfLowerCaseLettersDigitsAndInnerHyphens(String label) {
        List<String> lines = lines(study(TABLE, "5", "\"name\": \"random-draws\", \"label\": \"" + label + "\""));
        assertEquals(1, lines.size(), lines.toString());
        assertTrue(
                lines.get(0).startsWith(AT + "/label: ")
                        && lines.get(0).endsWith("; 1 to 40 lower-case letters, digits and inner hyphens are wanted"),
                lines.get(0));
    }

    @Test
    void aLabelOfFortyOneSignsIsTooLong() {
        assertEquals(
                1,
                lines(study(TABLE, "5", "\"name\": \"random-draws\", \"label\": \"" + "a".repeat(41) + "\""))
                        .size());
        assertEquals(
                List.of(),
                lines(study(TABLE, "5", "\"name\": \"random-draws\", \"label\": \"" + "a".repeat(40) + "\"")));
    }

    @Test
    void labelsMustDiffer() {
        assertEquals(
                List.of(
                        "/experiments/0/strategies/1: a second mine; another strategy, or a \"label\" of its own, is wanted"),
                lines(study(
                        TABLE,
                        "5",
                        "\"name\": \"random-draws\", \"label\": \"mine\"",
                        "\"name\": \"sequential-scan\", \"label\": \"mine\"")));
        assertEquals(
                List.of(
                        "/experiments/0/strategies/1: a second random-draws; another strategy, or a \"label\" of its own, is wanted"),
                lines(study(
                        TABLE,
                        "5",
                        "\"name\": \"random-draws\"",
                        "\"name\": \"sequential-scan\", \"label\": \"random-draws\"")));
    }

    private static StrategyChoice only(String text) {
        return read(text)
                .study()
                .orElseThrow()
                .experiments()
                .get(0)
                .strategies()
                .get(0);
    }

    /** The strongest blind engine within its reach and 2 GiB at every width, whatever machine reads the study. */
    @Test
    void autoTakesTheStrongestBlindEngine() {
        String auto = "\"name\": \"fourier-sampling\", \"engine\": \"auto\"";
        assertEquals("statevector", engine(study(TABLE, "5, 12", auto)));
        assertEquals("weights", engine(study(TABLE, "5, 14", auto)));
        assertEquals("fibre", engine(study(PERMUTATION, "25", auto)));
        assertEquals("stabilizer", engine(study("\"kind\": \"affine-period\"", "200", auto)));
        assertEquals("annihilator", engine(study(PERMUTATION, "30", auto + ", \"allow-sighted\": true")));
        assertEquals("statevector", engine(study(TABLE, "5", auto + ", \"allow-sighted\": true")));
    }

    private static String engine(String text) {
        return only(text).engine().map(Engine::name).orElseThrow();
    }

    @Test
    void labelsSayHowTheEngineWasAskedFor() {
        assertEquals(
                "fourier-sampling@auto",
                only(study(TABLE, "5", "\"name\": \"fourier-sampling\", \"engine\": \"auto\""))
                        .label());
        assertEquals(
                "fourier-sampling@fibre",
                only(study(TABLE, "5", "\"name\": \"fourier-sampling\", \"engine\": \"fibre\""))
                        .label());
        assertEquals(
                "mine",
                only(study(TABLE, "5", "\"name\": \"fourier-sampling\", \"engine\": \"fibre\", \"label\": \"mine\""))
                        .label());
    }

    /** What is written back is read as the same study. */
    @ParameterizedTest
    @ValueSource(
            strings = {
                "\"name\": \"fourier-sampling-fixed\", \"engine\": \"auto\", \"rounds\": 12, \"decoder\": \"likelihood\", \"noise\": { \"readout-flip\": \"0.020\", \"uniform-mix\": \"0.1\" }",
                "\"name\": \"fourier-sampling-fixed\", \"engine\": \"fibre\", \"extra-rounds\": 3",
                "\"name\": \"fourier-sampling\", \"engine\": \"auto\", \"allow-sighted\": true, \"control\": false",
                "\"name\": \"distinguished-points\", \"distinguished-bits\": 1, \"stored-trails\": 8, \"control\": true, \"label\": \"walk\"",
                "\"name\": \"cycle-walk\""
            })
    void aStudyWrittenBackIsTheSame(String strategy) {
        Study study = read(study(TABLE, "5", strategy)).study().orElseThrow();
        Optional<Study> again = read(StudyJson.write(study)).study();
        assertEquals(Optional.of(StudyJson.write(study)), again.map(StudyJson::write));
        assertEquals(
                study.experiments().get(0).strategies().get(0).noise(),
                again.orElseThrow().experiments().get(0).strategies().get(0).noise());
    }

    private static StudyReading read(JsonObject json) {
        return read(CanonicalJson.text(json));
    }

    private static List<String> lines(String text) {
        return read(text).faults().stream().map(Fault::line).toList();
    }

    private static StudyReading read(String text) {
        return StudyReader.read(text.getBytes(StandardCharsets.UTF_8));
    }
}
