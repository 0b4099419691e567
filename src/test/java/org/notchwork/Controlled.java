package org.notchwork;

/** A small study of the second format, with controls by default, asked for and declined, and a sighted cell. */
public final class Controlled {

    /** Width 9 has a control only where one is asked for. */
    public static final String TEXT = """
            {
              "format": "notchwork-study/2",
              "title": "A small study with controls, invented",
              "question": "Invented for tests: who names what is not there?",
              "seed": "a seed of the controlled study",
              "cross-check-width": 4,
              "experiments": [
                {
                  "id": "c",
                  "problem": { "kind": "xor-period", "instances": "table" },
                  "widths": [4, 6, 9],
                  "strategies": [
                    { "name": "random-draws" },
                    { "name": "sequential-scan", "control": false },
                    { "name": "fourier-sampling", "engine": "fibre" },
                    { "name": "fourier-sampling", "engine": "annihilator" },
                    { "name": "difference-cover", "control": true }
                  ],
                  "trials": 30,
                  "query-limit": 1000
                },
                {
                  "id": "d",
                  "problem": { "kind": "constant-or-balanced" },
                  "widths": [4],
                  "strategies": [{ "name": "phase-query", "engine": "weights" }],
                  "trials": 3,
                  "query-limit": 100
                }
              ],
              "claims": []
            }
            """;

    private Controlled() {}
}
