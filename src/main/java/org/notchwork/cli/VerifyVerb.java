package org.notchwork.cli;

import java.io.IOException;
import java.nio.file.Path;
import java.security.SecureRandom;
import java.util.List;
import java.util.Optional;
import org.apache.commons.cli.CommandLine;
import org.apache.commons.cli.Options;
import org.apache.commons.codec.binary.Hex;
import org.notchwork.bundle.Limits;
import org.notchwork.json.CanonicalJson;
import org.notchwork.seed.Seed;
import org.notchwork.verify.Finding;
import org.notchwork.verify.Rerun;
import org.notchwork.verify.StageReport;
import org.notchwork.verify.Verdict;
import org.notchwork.verify.Verifier;
import org.notchwork.verify.VerifyOptions;

/** Checks a bundle and says what it proves. */
final class VerifyVerb implements Verb {

    private static final int MOST_SAMPLED = 1_000_000;

    @Override
    public String name() {
        return "verify";
    }

    @Override
    public String operands() {
        return "BUNDLE";
    }

    @Override
    public String purpose() {
        return "checks a bundle and says what it proves";
    }

    @Override
    public String example() {
        return "verify first-light --rerun 50";
    }

    @Override
    public Options options() {
        return new Options()
                .addOption(Arguments.valued(
                        "rerun", "none|all|K", "run no, all or K random trials again; none if left out"))
                .addOption(Arguments.valued("expect", "SEAL", "the seal you have from elsewhere; at least 40 digits"))
                .addOption(Arguments.valued(
                        "referee-seed", "TEXT", "where the choice of K trials comes from; fresh if left out"))
                .addOption(Arguments.valued("threads", "N", "worker threads; one a processor if left out"))
                .addOption(Arguments.flag("json", "print the verdict as one JSON object"));
    }

    @Override
    public Exit run(List<String> operands, CommandLine line, Terminal terminal) throws Refusal, InterruptedException {
        Path bundle = Arguments.onePath(this, operands);
        VerifyOptions options = new VerifyOptions(
                expected(line), rerun(line), refereeSeed(line), Arguments.threads(line), Limits.USUAL);
        Progress progress = new Progress(terminal, "verify");
        Verdict verdict;
        try {
            verdict = Verifier.verify(
                    bundle, options, (stage, done, all) -> progress.at((double) done / all, stage.word()));
        } catch (IOException e) {
            throw new Refusal(Exit.UNFINISHED, IoText.of(e));
        } finally {
            progress.end();
        }
        if (line.hasOption("json")) {
            terminal.out().println(CanonicalJson.text(verdict.json()));
        } else {
            print(verdict, terminal);
        }
        return exit(verdict);
    }

    private static void print(Verdict verdict, Terminal terminal) {
        for (StageReport stage : verdict.stages()) {
            String word = stage.stage().word();
            terminal.out()
                    .println(word + " ".repeat(14 - word.length())
                            + stage.outcome().word() + ": " + stage.sentence());
            switch (stage.outcome()) {
                case PASSED ->
                    terminal.out()
                            .println("              proves: " + stage.stage().proves() + "; not: "
                                    + stage.stage().doesNotProve());
                case FAILED, MALFORMED -> findings(stage, terminal);
                case NOT_DONE, NOT_FINISHED -> {
                    // The sentence has said all.
                }
            }
        }
        if (!verdict.notCovered().isEmpty()) {
            terminal.out()
                    .println("not covered   not under the seal, of these only the digests were compared: "
                            + String.join(", ", verdict.notCovered()));
        }
        terminal.out().println(verdict.sentence());
    }

    private static void findings(StageReport stage, Terminal terminal) {
        for (Finding finding : stage.findings()) {
            terminal.out().println("              " + finding.text());
        }
        long more = stage.differences() - stage.findings().size();
        if (more > 0) {
            terminal.out().println("              and " + more + " more");
        }
    }

    private static Exit exit(Verdict verdict) {
        return switch (verdict.exitCode()) {
            case 0 -> Exit.GOOD;
            case 10 -> Exit.NO;
            case 11 -> Exit.UNFINISHED;
            default -> Exit.MALFORMED;
        };
    }

    private static Optional<String> expected(CommandLine line) throws Refusal {
        String text = line.getOptionValue("expect");
        if (text == null) {
            return Optional.empty();
        }
        if (!VerifyOptions.isSeal(text)) {
            throw new Refusal(
                    Exit.USAGE,
                    "--expect: 40 to 64 hexadecimal digits are wanted; fewer prove nothing against an author who could"
                            + " prepare two bundles with one short seal");
        }
        return Optional.of(text);
    }

    private static Rerun rerun(CommandLine line) throws Refusal {
        String text = line.getOptionValue("rerun", "none");
        return switch (text) {
            case "none" -> new Rerun.None();
            case "all" -> new Rerun.All();
            default -> {
                if (!text.matches("[0-9]{1,9}")) {
                    throw new Refusal(Exit.USAGE, "--rerun " + text + ": none, all or a number of trials is wanted");
                }
                yield new Rerun.Sample(Arguments.number(line, "rerun", 1, MOST_SAMPLED, 1));
            }
        };
    }

    private static Seed refereeSeed(CommandLine line) throws Refusal {
        String text = line.getOptionValue("referee-seed");
        if (text == null) {
            byte[] fresh = new byte[16];
            new SecureRandom().nextBytes(fresh);
            return new Seed(Hex.encodeHexString(fresh));
        }
        if (!Seed.FORM.matcher(text).matches()) {
            throw new Refusal(Exit.USAGE, "--referee-seed: " + Seed.MEND);
        }
        return new Seed(text);
    }
}
