package org.notchwork.json;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class SpellingTest {

    private static final List<String> KNOWN =
            List.of("id", "of", "to", "engine", "fibre", "trials", "widths", "query-limit", "statevector");

    @ParameterizedTest
    @CsvSource({
        "trails, trials",
        "trial, trials",
        "fiber, fibre",
        "fibres, fibre",
        "withds, widths",
        "query_limit, query-limit",
        "querylimit, query-limit",
        "state-vector, statevector",
        "stat-vektor, statevector",
        "idd, id"
    })
    void aSlipIsRecognised(String slip, String meant) {
        assertEquals(Optional.of(meant), Spelling.nearest(slip, KNOWN));
        assertEquals("did you mean \"" + meant + "\"?", Spelling.mend(slip, KNOWN));
    }

    /** One edit for every three characters, two at most: a short name is not any other short name. */
    @ParameterizedTest
    @CsvSource({"q", "is", "''", "on", "wide", "engines-of", "trilobites", "vectorstate"})
    void anotherWordIsNotTakenForASlip(String word) {
        assertEquals(Optional.empty(), Spelling.nearest(word, KNOWN));
        assertEquals("known here: " + String.join(", ", KNOWN), Spelling.mend(word, KNOWN));
    }

    @Test
    void theNearestOfSeveralIsNamedAndTheFirstOfEquals() {
        assertEquals(Optional.of("counter"), Spelling.nearest("countex", List.of("counted-x", "counter", "counted")));
        assertEquals(Optional.of("counted"), Spelling.nearest("countex", List.of("counted", "counter")));
    }

    @Test
    void whereNothingIsKnownNothingIsSuggested() {
        assertEquals("nothing goes here", Spelling.mend("x", List.of()));
    }
}
