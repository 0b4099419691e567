package org.notchwork.cli;

import java.io.IOException;
import java.math.BigDecimal;
import java.nio.file.Path;
import java.security.SecureRandom;
import java.time.Duration;
import java.time.LocalDate;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
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
import org.notchwork.verify.VerdictRecord;
import org.notchwork.verify.Verifier;
import org.notchwork.verify.VerifyOptions;

/** Checks a bundle and says what it proves. */
final class VerifyVerb implements Verb {

    private static final int MOST_SAMPLED = 1_000_000;
    private static final int MOST_FRESH = 100_000;
    private static final int USUAL_SECONDS = 3600;
    private static final int MOST_SECONDS = 10_000_000;
    private static final int MOST_FILES = 10_000;
    private static final int MOST_GIB = 100_000;
    private static final Pattern UNTIL = Pattern.compile("(0\\.[0-9]{1,9}|1):(0\\.[0-9]{1,9}|1)");

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
                .addOption(
                        Arguments.valued(
                                "rerun-until",
                                "P:SHARE",
                                "run as many again as catch a forger of SHARE of the trials with probability P, e.g. 0.99:0.01"))
                .addOption(Arguments.valued("cells", "CELL,...", "run only trials of these cells again"))
                .addOption(Arguments.valued(
                        "fresh", "K", "run K new trials a cell on the referee's seed and compare the figures"))
                .addOption(Arguments.valued(
                        "time-limit", "SECONDS", "stop re-run and fresh run after this long; 3600 if left out"))
                .addOption(Arguments.valued("record", "FILE", "leave a dated record of the verdict, .json or .pdf"))
                .addOption(Arguments.flag(
                        "proof", "the operand is the proof of one trial (show --proof), to be held against --expect"))
                .addOption(Arguments.valued("max-files", "N", "believe so many files; 100 if left out"))
                .addOption(Arguments.valued("max-gib", "N", "believe so many GiB in all; 16 if left out"))
                .addOption(Arguments.valued("expect", "SEAL", "the seal you have from elsewhere; at least 40 digits"))
                .addOption(Arguments.valued(
                        "referee-seed", "TEXT", "where the choice of K trials comes from; fresh if left out"))
                .addOption(Arguments.valued("threads", "N", "worker threads; one a processor if left out"))
                .addOption(Arguments.flag("json", "print the verdict as one JSON object"));
    }

    @Override
    public Exit run(List<String> operands, CommandLine line, Terminal terminal) throws Refusal, InterruptedException {
        Path bundle = Arguments.onePath(this, operands);
        if (line.hasOption("proof")) {
            return ProofCheck.run(bundle, expected(line), terminal);
        }
        Optional<RecordFile> record = RecordFile.of(line.getOptionValue("record"));
        VerifyOptions options = new VerifyOptions(
                expected(line),
                rerun(line),
                refereeSeed(line),
                Arguments.threads(line),
                limits(line),
                cells(line),
                Arguments.number(line, "fresh", 1, MOST_FRESH, 0),
                Duration.ofSeconds(Arguments.number(line, "time-limit", 1, MOST_SECONDS, USUAL_SECONDS)));
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
        if (record.isPresent()) {
            record.get()
                    .write(new VerdictRecord(verdict, LocalDate.now(ZoneOffset.UTC), Version.program(), asked(line)));
        }
        return exit(verdict);
    }

    /** Returns the options that say what was checked, without any path. */
    private static String asked(CommandLine line) {
        List<String> words = new ArrayList<>();
        for (String option :
                List.of("rerun", "rerun-until", "cells", "fresh", "time-limit", "expect", "referee-seed")) {
            if (line.hasOption(option)) {
                words.add("--" + option + " " + line.getOptionValue(option));
            }
        }
        return words.isEmpty() ? "no re-run" : String.join(" ", words);
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

    private static Limits limits(CommandLine line) throws Refusal {
        Limits usual = Limits.USUAL;
        int files = Arguments.number(line, "max-files", 1, MOST_FILES, usual.files());
        long total = (long) Arguments.number(line, "max-gib", 1, MOST_GIB, (int) (usual.totalBytes() >> 30)) << 30;
        return new Limits(files, Math.max(usual.fileBytes(), total / 2), total, usual.lineBytes());
    }

    private static Set<String> cells(CommandLine line) {
        String text = line.getOptionValue("cells");
        return text == null
                ? Set.of()
                : new TreeSet<>(Pattern.compile(",").splitAsStream(text).toList());
    }

    private static Rerun until(String text) throws Refusal {
        Matcher parts = UNTIL.matcher(text);
        if (parts.matches()) {
            BigDecimal caught = new BigDecimal(parts.group(1));
            BigDecimal share = new BigDecimal(parts.group(2));
            if (caught.signum() > 0 && share.signum() > 0) {
                return new Rerun.Until(caught, share);
            }
        }
        throw new Refusal(
                Exit.USAGE,
                "--rerun-until " + text + ": two numbers above 0 and at most 1 are wanted, for example 0.99:0.01");
    }

    private static Rerun rerun(CommandLine line) throws Refusal {
        if (line.hasOption("rerun-until")) {
            if (line.hasOption("rerun")) {
                throw new Refusal(Exit.USAGE, "--rerun and --rerun-until: one of them is wanted");
            }
            return until(line.getOptionValue("rerun-until"));
        }
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
