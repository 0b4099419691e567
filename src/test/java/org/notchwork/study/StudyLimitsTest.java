package org.notchwork.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.function.IntFunction;
import java.util.stream.Collectors;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.Studies;
import org.notchwork.json.Fault;

/** Every limit of a study file: the last value within is read, the first beyond is one fault. */
class StudyLimitsTest {

    private static final String TITLE = "\"A small study of an invented lock\"";
    private static final String QUESTION = "\"Invented for tests: how many settings open it?\"";
    private static final String SEED = "\"a seed of the small study\"";
    private static final String SMILEY = "\ud83d\ude00";

    @Test
    void lengthsAreCountedInCharactersNotInUnits() {
        accepted(TITLE, "\"" + SMILEY.repeat(200) + "\"");
        refused(
                TITLE,
                "\"" + SMILEY.repeat(201) + "\"",
                "/title: a string of 201 characters; a string of 1 to 200 characters is wanted");
        accepted(QUESTION, "\"" + SMILEY.repeat(2000) + "\"");
        refused(
                QUESTION,
                "\"" + "q".repeat(2001) + "\"",
                "/question: a string of 2001 characters; a string of 1 to 2000 characters is wanted");
        accepted("\"few\"", "\"" + SMILEY.repeat(1000) + "\"");
        refused(
                "\"few\"",
                "\"" + "x".repeat(1001) + "\"",
                "/claims/0/text: a string of 1001 characters; a string of 1 to 1000 characters is wanted");
    }

    @Test
    void aTitleIsOneLineAndAQuestionMayBeSeveral() {
        accepted(QUESTION, "\"one\\ntwo\"");
        for (String end : List.of("\\n", "\\r", "\\u0085", "\\u2028", "\\u2029", "\\u001b", "\\u0000")) {
            refused(
                    TITLE,
                    "\"one" + end + "two\"",
                    "/title: a string with a line break or another control character; one line is wanted");
        }
    }

    @Test
    void aSeedHas16To200PrintableAsciiCharacters() {
        accepted(SEED, "\"" + "s".repeat(16) + "\"");
        accepted(SEED, "\"" + " ~".repeat(100) + "\"");
        accepted(SEED, "\"" + "0123456789abcdef".repeat(4) + "\"");
        for (String seed : List.of("s".repeat(15), "s".repeat(201), "é".repeat(20), "s".repeat(20) + "\\n")) {
            assertEquals(
                    List.of("/seed"),
                    read(SEED, "\"" + seed + "\"").faults().stream()
                            .map(Fault::pointer)
                            .toList(),
                    seed);
        }
    }

    @ParameterizedTest
    @CsvSource(delimiter = '|', textBlock = """
            "cross-check-width": 5 | "cross-check-width": | 0 | 12      | /cross-check-width
            "trials": 8            | "trials":            | 1 | 1000000 | /experiments/0/trials
            """)
    void aNumberIsWithinItsBoundsOrRefused(String member, String name, long least, long most, String pointer) {
        accepted(member, name + " " + least);
        accepted(member, name + " " + most);
        String mend = "; a whole number from " + least + " to " + most + " is wanted";
        refused(member, name + " " + (least - 1), pointer + ": " + (least - 1) + mend);
        refused(member, name + " " + (most + 1), pointer + ": " + (most + 1) + mend);
    }

    @Test
    void aQueryLimitGoesFromOneToTheLargestExactNumber() {
        accepted("\"query-limit\": 9", "\"query-limit\": 1");
        accepted("\"query-limit\": 9", "\"query-limit\": 9007199254740991");
        refused(
                "\"query-limit\": 9",
                "\"query-limit\": 0",
                "/experiments/1/query-limit: 0; a whole number from 1 to 9007199254740991 is wanted");
        refused(
                "\"query-limit\": 9",
                "\"query-limit\": 9007199254740992",
                "line 32, column 22: a whole number beyond 2^53 - 1 in magnitude; write it as a string");
    }

    @ParameterizedTest
    @ValueSource(
            strings = {"z", "0", "a-b", "a--b", "0123456789012345678901234567890123456789", "x12345678901234567890"})
    void anIdOfTheFormIsRead(String id) {
        accepted("\"id\": \"a\"", "\"id\": \"" + id + "\"");
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "-", "-a", "a-", "A", "a b", "a_b", "a/b", "..", "é", "a\\n", "\\u0430"})
    void anIdThatCouldConfuseAFileSystemIsRefused(String id) {
        refusedId(id);
    }

    @Test
    void anIdOf41CharactersIsRefused() {
        refusedId("a".repeat(41));
    }

    @ParameterizedTest
    @ValueSource(strings = {"0", "-0", "-1.5", "0.000000000001", "9999999999999999999999999999999999999999"})
    void aBoundIsADecimalInQuotes(String bound) {
        accepted("\"at-most\": \"9\"", "\"at-most\": \"" + bound + "\"");
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "",
                "1e3",
                "+1",
                "01",
                ".5",
                "5.",
                "1,5",
                " 1",
                "NaN",
                "0.0000000000001",
                "10000000000000000000000000000000000000000"
            })
    void anythingElseInABoundIsRefused(String bound) {
        refused(
                "\"at-most\": \"9\"",
                "\"at-most\": \"" + bound + "\"",
                "/claims/0/at-most: \"" + bound + "\"; a decimal in quotes is wanted, for example \"12.5\"");
    }

    @Test
    void equalBoundsAreInOrder() {
        accepted("[\"0.5\", \"1\"]", "[\"0.5\", \"0.50\"]");
        accepted("[\"0.5\", \"1\"]", "[\"0\", \"-0\"]");
        refused(
                "[\"0.5\", \"1\"]",
                "[\"-1\", \"-1.000000000001\"]",
                "/claims/2/between: -1 is above -1.000000000001; the lower bound goes first");
    }

    @Test
    void listsHaveTheirLongestLength() {
        accepted("\"widths\": [6]", "\"widths\": " + numbers(3, 26));
        refused(
                "\"widths\": [3, 5]",
                "\"widths\": []",
                "/experiments/0/widths: an empty list; 1 to 40 items are wanted");
        assertEquals(
                List.of(),
                Studies.of(only(experiment("e", 2, 41, "sequential-scan"))).claims());
        assertEquals(
                List.of("/experiments/0/widths: a list of 41; 1 to 40 items are wanted"),
                lines(only(experiment("e", 2, 42, "sequential-scan"))));
        assertEquals(
                "/experiments/0/strategies: a list of 21; 1 to 20 items are wanted",
                lines(only(experiment("e", 2, 3, "sequential-scan", 21))).get(0));
        String sixteen = joined(16, i -> experiment("e" + i, 2, 3, "random-draws"));
        assertEquals(16, Studies.of(only(sixteen)).experiments().size());
        assertEquals(
                List.of("/experiments: a list of 17; 1 to 16 items are wanted"),
                lines(only(sixteen + ", " + experiment("e16", 2, 3, "random-draws"))));
    }

    @Test
    void aStudyHasAtMost100ClaimsAndNeedsNone() {
        String none = only(experiment("e", 2, 3, "random-draws"));
        assertEquals(List.of(), Studies.of(none).claims());
        String hundred = joined(
                100,
                i -> "{\"id\": \"c" + i
                        + "\", \"text\": \"t\", \"figure\": \"success-rate\", \"cell\": \"e/2/random-draws\", \"at-least\": \"0\"}");
        assertEquals(100, Studies.of(claimed(none, hundred)).claims().size());
        assertEquals(
                List.of("/claims: a list of 101; 0 to 100 items are wanted"),
                lines(claimed(none, hundred + ", " + hundred.substring(0, hundred.indexOf('}') + 1))));
        assertEquals(List.of(), lines(claimed(none, "")));
    }

    private static String claimed(String study, String claims) {
        return study.strip().replaceFirst("\\{", "{\"claims\": [" + claims + "], ");
    }

    private static String only(String experiments) {
        return "{\"format\": \"notchwork-study/1\", \"title\": \"t\", \"question\": \"q\", \"seed\": \"sixteen"
                + " characters\", \"experiments\": [" + experiments + "]}";
    }

    private static String experiment(String id, int least, int greatest, String strategy) {
        return experiment(id, least, greatest, strategy, 1);
    }

    private static String experiment(String id, int least, int greatest, String strategy, int times) {
        return "{\"id\": \"" + id + "\", \"problem\": {\"kind\": \"xor-period\", \"instances\": \"permutation\"},"
                + " \"widths\": " + numbers(least, greatest) + ", \"strategies\": ["
                + joined(times, i -> "{\"name\": \"" + strategy + "\"}") + "], \"trials\": 1, \"query-limit\": 1}";
    }

    private static String numbers(int least, int greatest) {
        return IntStream.rangeClosed(least, greatest).boxed().toList().toString();
    }

    private static String joined(int count, IntFunction<String> item) {
        return IntStream.range(0, count).mapToObj(item).collect(Collectors.joining(", "));
    }

    private static void refusedId(String id) {
        List<Fault> faults = read("\"id\": \"a\"", "\"id\": \"" + id + "\"").faults();
        assertEquals(1, faults.size(), faults.toString());
        assertEquals("/claims/0/id", faults.get(0).pointer());
        assertEquals(
                "1 to 40 lower-case letters, digits and inner hyphens are wanted",
                faults.get(0).mend());
    }

    private static void accepted(String from, String to) {
        assertEquals(List.of(), read(from, to).faults(), to);
    }

    private static void refused(String from, String to, String line) {
        assertEquals(
                List.of(line), read(from, to).faults().stream().map(Fault::line).toList());
    }

    private static StudyReading read(String from, String to) {
        String text = Studies.SMALL.replace(from, to);
        assertNotEquals(Studies.SMALL, text, from);
        return StudyReader.read(text.getBytes(StandardCharsets.UTF_8));
    }

    private static List<String> lines(String text) {
        return StudyReader.read(text.getBytes(StandardCharsets.UTF_8)).faults().stream()
                .map(Fault::line)
                .toList();
    }
}
