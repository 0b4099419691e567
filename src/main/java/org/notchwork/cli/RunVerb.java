package org.notchwork.cli;

import java.io.IOException;
import java.nio.file.Path;
import java.time.Instant;
import java.time.temporal.ChronoUnit;
import java.util.List;
import org.apache.commons.cli.CommandLine;
import org.apache.commons.cli.Options;
import org.notchwork.bundle.Environment;
import org.notchwork.bundle.Seal;
import org.notchwork.json.CanonicalJson;
import org.notchwork.json.JsonObject;
import org.notchwork.run.StudyRun;
import org.notchwork.run.Unfinished;
import org.notchwork.study.Study;

/** Runs a study and leaves a sealed bundle. */
final class RunVerb implements Verb {

    /** Stands for a time that is withheld. */
    private static final String ANONYMOUS_DAY = "1970-01-01T00:00:00Z";

    @Override
    public String name() {
        return "run";
    }

    @Override
    public String operands() {
        return "STUDY";
    }

    @Override
    public String purpose() {
        return "runs a study and leaves a sealed bundle";
    }

    @Override
    public String example() {
        return "run configs/first-light.json --output first-light";
    }

    @Override
    public Options options() {
        return new Options()
                .addOption(Arguments.valued("output", "FOLDER", "where the bundle goes; the study's name if left out"))
                .addOption(Arguments.flag("replace", "replace a bundle that is there already"))
                .addOption(Arguments.flag("resume", "go on with a run that was stopped, to the same seal"))
                .addOption(Arguments.flag("restart", "forget a run that was stopped and begin again"))
                .addOption(Arguments.valued("threads", "N", "worker threads; one a processor if left out"))
                .addOption(Arguments.flag(
                        "anonymous", "for anonymous review: say nothing of machine and time; the seal is the same"))
                .addOption(Arguments.flag("json", "print seal and outcome as one JSON object"));
    }

    @Override
    public Exit run(List<String> operands, CommandLine line, Terminal terminal) throws Refusal, InterruptedException {
        Path file = Arguments.onePath(this, operands);
        Path target = line.hasOption("output") ? Arguments.path(line.getOptionValue("output")) : defaultTarget(file);
        int threads = Arguments.threads(line);
        Study study = StudyFileReader.read(file);
        MemoryCheck.require(study, threads);
        Progress progress = new Progress(terminal, "run");
        Workload workload = new Workload(study);
        Instant start = Instant.now();
        StudyRun.Sealed sealed;
        try {
            sealed = new StudyRun(study, threads, System::nanoTime)
                    .seal(
                            target,
                            line.hasOption("replace"),
                            unfinished(line),
                            (experiment, width) -> {
                                workload.done(experiment, width);
                                progress.at(workload.share(), experiment.id() + ", width " + width);
                            },
                            () -> line.hasOption("anonymous") ? anonymous() : environment(start, threads));
        } catch (IOException e) {
            throw new Refusal(Exit.UNFINISHED, IoText.of(e, target));
        } finally {
            progress.end();
        }
        boolean good = sealed.results().differing() == 0;
        if (line.hasOption("json")) {
            terminal.out().println(CanonicalJson.text(json(sealed, target)));
        } else {
            new ResultsScreen(terminal.out()).print(sealed.results());
            terminal.out().println();
            terminal.out().println("bundle: " + target);
            terminal.out().println("seal:   " + Seal.groups(sealed.seal()));
            terminal.out().println("check:  java -jar notchwork.jar verify " + target + " --expect " + sealed.seal());
            if (!good) {
                terminal.out().println("A CROSS-CHECK FAILED: do not rely on these figures.");
            }
        }
        return good ? Exit.GOOD : Exit.NO;
    }

    private static Unfinished unfinished(CommandLine line) throws Refusal {
        if (line.hasOption("resume") && line.hasOption("restart")) {
            throw new Refusal(Exit.USAGE, "--resume and --restart: one of them is wanted");
        }
        if (line.hasOption("resume")) {
            return Unfinished.RESUME;
        }
        return line.hasOption("restart") ? Unfinished.DISCARD : Unfinished.REFUSE;
    }

    private static JsonObject json(StudyRun.Sealed sealed, Path target) {
        return JsonObject.builder()
                .put("bundle", target.toString())
                .put("differing-cross-checks", sealed.results().differing())
                .put("format", "notchwork-run/1")
                .put("seal", sealed.seal())
                .build();
    }

    private static Path defaultTarget(Path study) {
        String name = study.getFileName().toString();
        int dot = name.lastIndexOf('.');
        return Path.of(dot > 0 ? name.substring(0, dot) : name + "-bundle");
    }

    /** Says that it says nothing. */
    private static Environment anonymous() {
        return new Environment(
                Version.program(),
                ANONYMOUS_DAY,
                ANONYMOUS_DAY,
                0,
                1,
                "withheld: anonymous run",
                "withheld: anonymous run");
    }

    private static Environment environment(Instant start, int threads) {
        Instant end = Instant.now();
        return new Environment(
                Version.program(),
                start.truncatedTo(ChronoUnit.SECONDS).toString(),
                end.truncatedTo(ChronoUnit.SECONDS).toString(),
                ChronoUnit.SECONDS.between(start, end) + 1,
                threads,
                System.getProperty("java.vm.name") + " " + Runtime.version(),
                System.getProperty("os.name") + " " + System.getProperty("os.arch"));
    }
}
