package org.notchwork.bundle;

import java.util.List;
import org.notchwork.json.Printable;
import org.notchwork.study.Experiment;
import org.notchwork.study.StrategyChoice;

/** The text {@code README.txt}: for somebody who has the bundle and nothing else. */
final class ReadMe {

    private ReadMe() {}

    /** Returns the text; it depends on the results alone. */
    static String text(Results results) {
        return String.join(
                        "\n",
                        List.of(
                                SummaryFile.attention(results.checks()),
                                "",
                                "This is a sealed bundle: a study that compares how many oracle calls strategies need, with",
                                "every trial, every figure and every check that was made. Format: notchwork bundle, version 1.",
                                "",
                                "Study: " + oneLine(results.study().title()),
                                "Question: " + oneLine(results.study().question()),
                                "",
                                "CHECK IT WITHOUT THE PROGRAM (coreutils and jq; run in the folder that holds bagit.txt):",
                                "",
                                "  sha256sum -c --strict --quiet tagmanifest-sha256.txt",
                                "  sha256sum -c --strict --quiet manifest-sha256.txt",
                                "  diff <(cut -c67- manifest-sha256.txt | LC_ALL=C sort) <(find data -type f | LC_ALL=C sort)",
                                "  jq -cjS 'del(.seal)' data/seal.json | sha256sum",
                                "",
                                "The first three print nothing if all is well; the third finds files that are not listed. The",
                                "last prints the seal: compare it with the one in the paper, not with the one in this folder.",
                                "",
                                "CHECK IT WITH THE PROGRAM: java -jar notchwork.jar verify FOLDER --expect SEAL --rerun 50",
                                "",
                                "FILES",
                                "  report.pdf           the results for people",
                                "  study.json           what was compared, on what, from which seed, and what is claimed",
                                "  trials-*.jsonl       one line a trial: outcome, calls, and the certificate of its answer",
                                "  summary.json         the figures of every cell, with intervals",
                                "  cross-checks.json    what was checked against what, and the outcome",
                                "  claims.json          every claim with its evidence and verdict",
                                "  seal.json            digests of the files above from study.json on, and the seal",
                                "  environment.json     where and when the study ran; not under the seal",
                                "  schemas.json         JSON Schemas of all these files",
                                "",
                                "Trials are numbered from 0; one number is one instance for every strategy of a width. Words",
                                "are hexadecimal. Decimals are strings with six places.",
                                "",
                                "ENGINES",
                                engines(results),
                                "A blind engine works from evaluations of the function alone; a sighted one is told the secret,",
                                "so its figures show what theory says and not that a circuit would find it.",
                                "",
                                "LIMITS",
                                "The seal shows that nothing under it changed; not who made it, when, or that the seed was not",
                                "chosen for its luck. Widths are toy sizes: nothing here judges a deployed cipher; that belongs",
                                "to qualified cryptographers and current standards."))
                + "\n";
    }

    private static String engines(Results results) {
        List<String> lines = results.study().experiments().stream()
                .map(Experiment::strategies)
                .flatMap(List::stream)
                .filter(s -> s.engine().isPresent())
                .map(ReadMe::engine)
                .distinct()
                .sorted()
                .toList();
        return lines.isEmpty() ? "  none: all strategies are classical" : String.join("\n", lines);
    }

    private static String engine(StrategyChoice choice) {
        return "  " + choice.engine().map(e -> e.name()).orElse("") + ": "
                + choice.sight().orElse("");
    }

    private static String oneLine(String text) {
        return Printable.escape(text);
    }
}
