package org.notchwork;

import java.nio.charset.StandardCharsets;
import org.notchwork.study.Study;
import org.notchwork.study.StudyReader;

/** Small studies for tests, written as an author would write them. */
public final class Studies {

    /** Two experiments, both kinds of instance, all strategies and engines, claims of every sort, censored trials. */
    public static final String SMALL = """
            {
              "format": "notchwork-study/1",
              "title": "A small study of an invented lock",
              "question": "Invented for tests: how many settings open it?",
              "seed": "a seed of the small study",
              "cross-check-width": 5,
              "experiments": [
                {
                  "id": "all",
                  "problem": { "kind": "xor-period", "instances": "table" },
                  "widths": [3, 5],
                  "strategies": [
                    { "name": "sequential-scan" },
                    { "name": "random-draws" },
                    { "name": "difference-cover" },
                    { "name": "fourier-sampling", "engine": "statevector" },
                    { "name": "fourier-sampling", "engine": "fibre" },
                    { "name": "fourier-sampling", "engine": "annihilator" }
                  ],
                  "trials": 8,
                  "query-limit": 1000
                },
                {
                  "id": "cut",
                  "problem": { "kind": "xor-period", "instances": "permutation" },
                  "widths": [6],
                  "strategies": [
                    { "name": "sequential-scan" },
                    { "name": "fourier-sampling", "engine": "fibre" }
                  ],
                  "trials": 12,
                  "query-limit": 9
                }
              ],
              "claims": [
                { "id": "a", "text": "few", "figure": "queries-mean", "cell": "all/5/fourier-sampling@fibre", "at-most": "9" },
                { "id": "b", "text": "many", "figure": "queries-mean", "cell": "cut/6/sequential-scan", "at-least": "8.5" },
                { "id": "c", "text": "always", "figure": "success-rate", "cell": "all/3/random-draws", "between": ["0.5", "1"] },
                { "id": "d", "text": "more", "ratio": { "of": "all/5/fourier-sampling@fibre", "to": "all/5/sequential-scan" }, "at-most": "2" }
              ]
            }
            """;

    private Studies() {}

    /** Returns the small study. */
    public static Study small() {
        return of(SMALL);
    }

    /** Returns the study of a text that has no fault. */
    public static Study of(String text) {
        return StudyReader.read(text.getBytes(StandardCharsets.UTF_8))
                .study()
                .orElseThrow(() -> new IllegalArgumentException(StudyReader.read(text.getBytes(StandardCharsets.UTF_8))
                        .faults()
                        .toString()));
    }
}
