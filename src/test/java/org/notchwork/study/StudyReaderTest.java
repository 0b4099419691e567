package org.notchwork.study;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.notchwork.Studies;
import org.notchwork.json.Fault;

/** Every fault of a study is named with its place, what is wrong and what would be right; all at once. */
class StudyReaderTest {

    /** What is changed in the small study, and the one line that must come of it. */
    static Stream<Arguments> faults() {
        return Stream.of(
                fault(
                        "\"notchwork-study/1\"",
                        "\"notchwork-study/3\"",
                        "/format: \"notchwork-study/3\"; \"notchwork-study/1\" or \"notchwork-study/2\" is wanted"),
                fault(
                        "\"title\": \"A small study of an invented lock\"",
                        "\"title\": \"\"",
                        "/title: a string of 0 characters; a string of 1 to 200 characters is wanted"),
                fault(
                        "\"seed\": \"a seed of the small study\"",
                        "\"seed\": \"too short\"",
                        "/seed: \"too short\"; 16 to 200 printable ASCII"),
                fault(
                        "\"seed\": \"a seed of the small study\"",
                        "\"seed\": 7",
                        "/seed: this is a whole number; 16 to 200"),
                fault(
                        "\"cross-check-width\": 5",
                        "\"cross-check-width\": 13",
                        "/cross-check-width: 13; a whole number from 0 to 12 is wanted"),
                fault(
                        "\"trials\": 8",
                        "\"trails\": 8",
                        "/experiments/0/trails: unknown member \"trails\"; did you mean \"trials\"?"),
                fault(
                        "\"trials\": 8",
                        "\"trails\": 8",
                        "/experiments/0/trials: this member is missing; a whole number is wanted"),
                fault(
                        "\"trials\": 8",
                        "\"trials\": 0",
                        "/experiments/0/trials: 0; a whole number from 1 to 1000000 is wanted"),
                fault(
                        "\"trials\": 8",
                        "\"trials\": \"8\"",
                        "/experiments/0/trials: this is a string; a whole number from 1 to 1000000 is wanted"),
                fault("\"trials\": 8", "\"trials\": 8, \"trials\": 9", "a second member \"trials\"; names must differ"),
                fault("\"trials\": 8", "\"trials\": 8.5", "a number with a fraction or an exponent"),
                fault(
                        "\"query-limit\": 9",
                        "\"query-limit\": 0",
                        "/experiments/1/query-limit: 0; a whole number from 1 to"),
                fault(
                        "\"id\": \"cut\"",
                        "\"id\": \"all\"",
                        "/experiments/1/id: a second experiment \"all\"; ids must differ"),
                fault(
                        "\"id\": \"cut\"",
                        "\"id\": \"Cut/1\"",
                        "/experiments/1/id: \"Cut/1\"; 1 to 40 lower-case letters"),
                fault(
                        "\"widths\": [3, 5]",
                        "\"widths\": []",
                        "/experiments/0/widths: an empty list; 1 to 40 items are wanted"),
                fault(
                        "\"widths\": [3, 5]",
                        "\"widths\": [5, 3]",
                        "/experiments/0/widths/1: width 3 after 5; different widths in ascending order are wanted"),
                fault(
                        "\"widths\": [3, 5]",
                        "\"widths\": [3, 3]",
                        "/experiments/0/widths/1: width 3 after 3; different widths"),
                fault(
                        "\"widths\": [3, 5]",
                        "\"widths\": [1, 5]",
                        "/experiments/0/widths/0: width 1; a width from 2 to 20 is wanted"),
                fault(
                        "\"widths\": [3, 5]",
                        "\"widths\": [3, 21]",
                        "/experiments/0/widths/1: width 21; a width from 2 to 20 is wanted for these instances"),
                fault(
                        "\"widths\": [6]",
                        "\"widths\": [64]",
                        "/experiments/1/widths/0: width 64; a width from 2 to 63 is wanted"),
                fault(
                        "\"widths\": [3, 5]",
                        "\"widths\": [3, 14]",
                        "/experiments/0/strategies/3/engine: statevector holds 26 qubits and width 14 needs 28; engine fibre reaches width 26"),
                fault(
                        "\"widths\": [6]",
                        "\"widths\": [27]",
                        "/experiments/1/strategies/1/engine: fibre evaluates all 2^n points and reaches width 26, not 27"),
                fault(
                        "\"kind\": \"xor-period\", \"instances\": \"table\"",
                        "\"kind\": \"xor-perod\"",
                        "/experiments/0/problem/kind: no problem \"xor-perod\"; did you mean \"xor-period\"?"),
                fault(
                        "\"instances\": \"table\"",
                        "\"instances\": \"tables\"",
                        "/experiments/0/problem/instances: \"tables\"; did you mean \"table\"?"),
                fault(
                        "\"kind\": \"xor-period\", \"instances\": \"table\"",
                        "\"instances\": \"table\"",
                        "/experiments/0/problem/kind: this member is missing; one of xor-period, xor-period-or-none, hidden-subspace, "
                                + "inner-product, constant-or-balanced, affine-period, even-mansour, feistel-three, table is wanted"),
                fault(
                        "\"sequential-scan\"",
                        "\"sequential-scam\"",
                        "/experiments/0/strategies/0/name: no strategy \"sequential-scam\"; did you mean \"sequential-scan\"?"),
                fault(
                        "{ \"name\": \"random-draws\" }",
                        "{ \"name\": \"sequential-scan\" }",
                        "/experiments/0/strategies/1: a second sequential-scan; another strategy, or a \"label\" of its own, is wanted"),
                fault(
                        "\"engine\": \"statevector\"",
                        "\"engine\": \"fibre\"",
                        "/experiments/0/strategies/4: a second fourier-sampling@fibre"),
                fault(
                        "\"engine\": \"statevector\"",
                        "\"engine\": \"state-vector\"",
                        "/experiments/0/strategies/3/engine: no engine \"state-vector\"; did you mean \"statevector\"?"),
                fault(
                        "{ \"name\": \"random-draws\" }",
                        "{ \"name\": \"random-draws\", \"engine\": \"fibre\" }",
                        "/experiments/0/strategies/1/engine: random-draws is a classical strategy; leave the engine out"),
                fault(
                        "\"name\": \"fourier-sampling\", \"engine\": \"statevector\"",
                        "\"name\": \"fourier-sampling\"",
                        "/experiments/0/strategies/3/engine: this member is missing; fourier-sampling is a quantum strategy; auto or one of"),
                fault("\"id\": \"b\"", "\"id\": \"a\"", "/claims/1/id: a second claim \"a\"; ids must differ"),
                fault(
                        "all/5/fourier-sampling@fibre\", \"at-most\"",
                        "all/5/fourier-sampling@fiber\", \"at-most\"",
                        "/claims/0/cell: no cell \"all/5/fourier-sampling@fiber\"; did you mean \"all/5/fourier-sampling@fibre\"?"),
                fault(
                        "\"figure\": \"queries-mean\"",
                        "\"figure\": \"query-mean\"",
                        "/claims/0/figure: no figure \"query-mean\""),
                fault(
                        "\"at-most\": \"9\"",
                        "\"at-most\": 9",
                        "/claims/0/at-most: this is a whole number; a decimal in quotes is wanted"),
                fault(
                        "\"at-most\": \"9\"",
                        "\"at-most\": \"9,5\"",
                        "/claims/0/at-most: \"9,5\"; a decimal in quotes is wanted"),
                fault(", \"at-most\": \"9\"", "", "/claims/0: a claim without a bound; exactly one of"),
                fault(
                        "\"at-most\": \"9\"",
                        "\"at-most\": \"9\", \"at-least\": \"1\"",
                        "/claims/0: a claim with 2 bounds; exactly one of"),
                fault(
                        "[\"0.5\", \"1\"]",
                        "[\"1\", \"0.5\"]",
                        "/claims/2/between: 1 is above 0.5; the lower bound goes first"),
                fault("[\"0.5\", \"1\"]", "[\"0.5\"]", "/claims/2/between: a list of 1; 2 items are wanted"),
                fault(
                        "\"to\": \"all/5/sequential-scan\"",
                        "\"to\": \"all/3/sequential-scan\"",
                        "/claims/3/ratio/to: cells that do not face the same instances"),
                fault(
                        "\"to\": \"all/5/sequential-scan\"",
                        "\"to\": \"all/5/fourier-sampling@fibre\"",
                        "/claims/3/ratio/to: a cell over itself"),
                fault(
                        "\"ratio\":",
                        "\"figure\": \"queries-mean\", \"ratio\":",
                        "/claims/3: a claim about a cell and a ratio at once"));
    }

    @ParameterizedTest
    @MethodSource("faults")
    void aFaultIsNamedWithPlaceAndMend(String from, String to, String line) {
        List<String> lines = lines(Studies.SMALL.replace(from, to));
        if (!Studies.SMALL.contains(from)) {
            throw new IllegalStateException("not in the study: " + from);
        }
        assertTrue(lines.stream().anyMatch(l -> l.contains(line)), lines.toString());
    }

    @Test
    void allFaultsOfAFileAreFoundInOnePass() {
        String broken = Studies.SMALL
                .replace("\"cross-check-width\": 5", "\"cross-check-width\": 50")
                .replace("\"trials\": 8", "\"trials\": -1")
                .replace("[3, 5]", "[]")
                .replace("\"at-most\": \"9\"", "\"at-most\": \"nine\"")
                .replace("\"query-limit\": 9", "\"query-limitt\": 9");
        assertEquals(
                List.of(
                        "/cross-check-width",
                        "/experiments/0/widths",
                        "/experiments/0/trials",
                        "/experiments/1/query-limit",
                        "/experiments/1/query-limitt",
                        "/claims/0/at-most"),
                read(broken).faults().stream().map(Fault::pointer).toList());
    }

    @Test
    void aFaultyExperimentIsNotReportedAgainByTheClaimsAboutIt() {
        StudyReading reading = read(Studies.SMALL.replace("\"trials\": 8", "\"trials\": 0"));
        assertEquals(1, reading.faults().size(), reading.faults().toString());
    }

    @Test
    void aClaimAboutASoundExperimentIsCheckedWhateverElseIsWrong() {
        assertEquals(
                List.of(
                        "/title: a string of 0 characters; a string of 1 to 200 characters is wanted",
                        "/experiments/0/trials: 0; a whole number from 1 to 1000000 is wanted",
                        "/claims/1/cell: no cell \"cut/6/sequential-scam\"; did you mean \"cut/6/sequential-scan\"?"),
                lines(Studies.SMALL
                        .replace("\"A small study of an invented lock\"", "\"\"")
                        .replace("\"trials\": 8", "\"trials\": 0")
                        .replace("all/5/fourier-sampling@fibre\", \"at-most\"", "all/5/fibre\", \"at-most\"")
                        .replace("cut/6/sequential-scan", "cut/6/sequential-scam")));
    }

    /** The first experiment's id cannot be read or is taken twice, so any name may have been meant for it. */
    @ParameterizedTest
    @ValueSource(strings = {"\"id\": \"All\"", "\"id\": 7", "\"id\": \"cut\"", "\"di\": \"all\""})
    void noCellIsCalledUnknownWhileAnIdIsInDoubt(String id) {
        List<Fault> faults = read(Studies.SMALL.replace("\"id\": \"all\"", id)).faults();
        assertTrue(faults.stream().noneMatch(f -> f.pointer().startsWith("/claims")), faults.toString());
        assertTrue(faults.stream().anyMatch(f -> f.pointer().endsWith("/id")), faults.toString());
    }

    /** One slip, one line: what follows from it is not reported as well. */
    @ParameterizedTest
    @CsvSource(delimiter = '|', quoteCharacter = '~', textBlock = """
            "claims": [                  | "claims": [7,           | /claims/0: this is a whole number; an object is wanted
            "experiments": [             | "experiments": ["x",    | /experiments/0: this is a string; an object is wanted
            { "name": "random-draws" }   | []                      | /experiments/0/strategies/1: this is an array; an object is wanted
            "problem": { "kind": "xor-period", "instances": "table" }, |  | /experiments/0/problem: this member is missing; an object is wanted
            "problem": { "kind": "xor-period", "instances": "table" }  | "problem": "xor-period" | /experiments/0/problem: this is a string; an object is wanted
            { "of": "all/5/fourier-sampling@fibre", "to": "all/5/sequential-scan" } | "x" | /claims/3/ratio: this is a string; an object is wanted
            { "name": "random-draws" }   | { "name": "random-draws", "engine": "fiber" } | /experiments/0/strategies/1/engine: random-draws is a classical strategy; leave the engine out
            "widths": [3, 5]             | "widths": 3             | /experiments/0/widths: this is a whole number; an array is wanted
            "widths": [3, 5]             | "widths": [3, 99]       | /experiments/0/widths/1: width 99; a width from 2 to 20 is wanted for these instances
            "A small study of an invented lock" | "A small\\nstudy" | /title: a string with a line break or another control character; one line is wanted
            """)
    void oneSlipIsOneLine(String from, String to, String line) {
        String changed = Studies.SMALL.replace(from.strip(), to == null ? "" : to.strip());
        assertEquals(List.of(line.strip()), lines(changed));
    }

    @Test
    void aFaultOfTheDocumentHasALineAndAMendOfItsOwn() {
        assertEquals(
                List.of("line 20, column 20: a second member \"trials\"; names must differ"),
                lines(Studies.SMALL.replace("\"trials\": 8", "\"trials\": 8, \"trials\": 9")));
        assertEquals(
                List.of("line 20, column 17: null is not used; leave the member out"),
                lines(Studies.SMALL.replace("\"trials\": 8", "\"trials\": null")));
        assertEquals(List.of("byte 0: a byte-order mark; save the file as UTF-8 without one"), lines("\uFEFF{}"));
    }

    /** Whatever name a hostile file invents, cutting it for the message does not end the program. */
    @Test
    void aNameOfWideCharactersIsReportedLikeAnyOther() {
        for (int before = 50; before < 70; before++) {
            String name = "a".repeat(before) + "😀".repeat(20);
            StudyReading reading = read(Studies.SMALL.replace("\"title\"", "\"" + name + "\": 1, \"title\""));
            assertEquals(
                    List.of("/" + name),
                    reading.faults().stream().map(Fault::pointer).toList());
        }
    }

    @Test
    void aListFarOverItsLimitIsNotReadToItsEnd() {
        String claim =
                "{ \"id\": \"z\", \"text\": \"t\", \"figure\": \"queries-mean\", \"cell\": \"all/3/nobody\", \"at-most\": \"1\" },";
        StudyReading reading = read(Studies.SMALL.replace("\"claims\": [", "\"claims\": [" + claim.repeat(5_000)));
        assertEquals(
                "/claims: a list of 5004; 0 to 100 items are wanted",
                reading.faults().get(0).line());
        assertEquals(1 + 100 + 99, reading.faults().size());
    }

    @Test
    void whatIsNotAStudyAtAllIsOneFault() {
        assertEquals(1, read("").faults().size());
        assertEquals(1, read("{\"title\": ").faults().size());
        assertEquals(List.of("(top): this is an array; an object is wanted"), lines("[]"));
    }

    @Test
    void everyCommittedStudyIsValidAndSaysThatItIsInvented() throws IOException {
        try (Stream<Path> files = Files.list(Path.of("configs"))) {
            for (Path file : files.filter(f -> f.toString().endsWith(".json")).toList()) {
                StudyReading reading =
                        StudyReader.read(Files.readAllBytes(file), name -> bytes(file.resolveSibling(name)));
                assertEquals(List.of(), reading.faults(), file.toString());
                assertTrue(reading.study().orElseThrow().title().contains("invented"), file.toString());
            }
        }
    }

    private static Arguments fault(String from, String to, String line) {
        return Arguments.of(from, to, line);
    }

    private static List<String> lines(String text) {
        return read(text).faults().stream().map(Fault::line).toList();
    }

    private static StudyReading read(String text) {
        return StudyReader.read(text.getBytes(StandardCharsets.UTF_8));
    }

    private static Optional<byte[]> bytes(Path file) {
        try {
            return Optional.of(Files.readAllBytes(file));
        } catch (IOException e) {
            return Optional.empty();
        }
    }
}
