package org.notchwork.verify;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import org.notchwork.bundle.Bag;
import org.notchwork.bundle.BundleFault;
import org.notchwork.bundle.Layout;
import org.notchwork.check.CheckOutcome;
import org.notchwork.study.Forecast;
import org.notchwork.study.Study;
import org.notchwork.trial.TrialRunner;

/** Verifies a bundle, stage by stage. A stage that fails does not keep later ones from naming a deeper reason. */
public final class Verifier {

    private final VerifyOptions options;
    private final Listener listener;
    private final List<StageReport> reports = new ArrayList<>();

    private Verifier(VerifyOptions options, Listener listener) {
        this.options = options;
        this.listener = listener;
    }

    /** Told what is being done and how far it is. */
    @FunctionalInterface
    public interface Listener {

        /**
         * One more step of a stage is done.
         *
         * @param stage the stage
         * @param done steps done
         * @param all steps in all
         */
        void step(Stage stage, long done, long all);
    }

    /**
     * Verifies a bundle.
     *
     * @param bundle its folder
     * @param options what the referee asks for
     * @param listener told of the progress
     * @throws IOException if the disk fails while reading
     * @throws InterruptedException if interrupted before the re-run; a re-run stopped midway is told by the verdict
     */
    public static Verdict verify(Path bundle, VerifyOptions options, Listener listener)
            throws IOException, InterruptedException {
        return new Verifier(options, listener).verify(bundle);
    }

    private Verdict verify(Path bundle) throws IOException, InterruptedException {
        Stage current = Stage.CONTAINER;
        try {
            Bag bag = Bag.open(bundle, options.limits());
            reports.add(StageReport.of(
                    Stage.CONTAINER, StageOutcome.PASSED, bag.sizes().size() + " plain files, all listed"));
            hashes(bag);
            current = Stage.SCHEMA;
            return opened(bag);
        } catch (BundleFault e) {
            return malformed(current, e.place() + ": " + e.getMessage());
        } catch (OpenedFiles.Malformed e) {
            return malformed(Stage.SCHEMA, e.getMessage());
        }
    }

    private void hashes(Bag bag) throws IOException {
        Findings findings = new Findings();
        bag.mismatches()
                .forEach(m -> findings.add(Finding.of(m.path(), m.found(), m.listed() + " (" + m.manifest() + ")")));
        reports.add(StageReport.of(
                Stage.HASHES,
                findings,
                "all digests as listed",
                findings.count() + (findings.count() == 1 ? " file does" : " files do")
                        + " not have the listed digest"));
    }

    private Verdict opened(Bag bag) throws IOException, BundleFault, OpenedFiles.Malformed, InterruptedException {
        OpenedFiles files = OpenedFiles.open(bag);
        TrialRunner runner = new TrialRunner(files.study());
        LinePass pass = new LinePass(files.study(), bag, options.limits().lineBytes(), runner);
        long instances =
                files.study().experiments().stream().mapToLong(Lines::instances).sum();
        pass.run(counting(Stage.CERTIFICATES, instances));
        reports.add(StageReport.of(
                Stage.SCHEMA,
                StageOutcome.PASSED,
                "all JSON files are canonical and name their format; no fault in study, seal, cross-checks, environment and "
                        + pass.tree().size() + " trial lines"));
        reports.add(SealStage.report(files, bag, pass, options.expect()));
        reports.add(pass.certificates().report());
        reports.add(FiguresStage.report(files, pass));
        again(files, bag, runner, pass, instances);
        long failed = files.checks().stream()
                .filter(c -> c.outcome() == CheckOutcome.DIFFERS)
                .count();
        return new Verdict(reports, Optional.of(files.seal().digest()), failed, unsealed(files.study()));
    }

    private void again(OpenedFiles files, Bag bag, TrialRunner runner, LinePass pass, long instances)
            throws IOException {
        if (pass.misplacement().isPresent()) {
            String why = "the lines are not those that the study calls for";
            reports.add(StageReport.of(Stage.RERUN, StageOutcome.NOT_DONE, why));
            reports.add(StageReport.of(Stage.FRESH, StageOutcome.NOT_DONE, why));
            return;
        }
        Optional<String> tooLarge = tooLarge(files.study());
        try (Deadline deadline = new Deadline(options.time())) {
            reports.add(
                    tooLarge.isPresent() && !(options.rerun() instanceof Rerun.None)
                            ? StageReport.of(Stage.RERUN, StageOutcome.NOT_FINISHED, tooLarge.get())
                            : rerun(files, bag, runner, instances));
            reports.add(fresh(files, pass, deadline, tooLarge));
        }
    }

    /** A study that was run on a larger machine must not take this one down. */
    private Optional<String> tooLarge(Study study) {
        long there = Runtime.getRuntime().maxMemory();
        return Forecast.of(study).stream()
                .filter(c -> options.cells().isEmpty()
                        || options.cells().contains(c.cell().id()))
                .filter(c -> (double) c.memoryBytes() * options.threads() > there)
                .findFirst()
                .map(c -> "not finished: 0 trials re-run: " + c.cell().id() + " needs about "
                        + (c.memoryBytes() >> 20) + " MiB a thread and Java has " + (there >> 20)
                        + " MiB; use fewer threads, java -Xmx, or --cells");
    }

    private StageReport rerun(OpenedFiles files, Bag bag, TrialRunner runner, long instances) throws IOException {
        boolean everywhere = options.cells().isEmpty();
        if (options.rerun() instanceof Rerun.All && everywhere) {
            return new RerunStage(files, bag, options, runner).all(counting(Stage.RERUN, instances));
        }
        if (options.rerun() instanceof Rerun.None) {
            return StageReport.of(Stage.RERUN, StageOutcome.NOT_DONE, "no trial was run again");
        }
        Set<String> unknown = new TreeSet<>(options.cells());
        files.study().cells().forEach(c -> unknown.remove(c.id()));
        if (!unknown.isEmpty()) {
            return StageReport.of(
                    Stage.RERUN,
                    StageOutcome.NOT_FINISHED,
                    "not finished: the study has no cell " + String.join(", no cell ", unknown));
        }
        long population = population(files.study());
        int wanted = Integer.MAX_VALUE;
        if (options.rerun() instanceof Rerun.Sample sample) {
            wanted = sample.trials();
        } else if (options.rerun() instanceof Rerun.Until until) {
            wanted = Rerun.until(population, until.caught(), until.share());
        }
        return new SampleStage(files, bag, options, runner)
                .sample(wanted, counting(Stage.RERUN, Math.min(wanted, population)));
    }

    private long population(Study study) {
        return study.experiments().stream()
                .mapToLong(e -> e.trials()
                        * e.cells().stream()
                                .filter(c -> options.cells().isEmpty()
                                        || options.cells().contains(c.id()))
                                .count())
                .sum();
    }

    private StageReport fresh(OpenedFiles files, LinePass pass, Deadline deadline, Optional<String> tooLarge) {
        if (options.fresh() == 0) {
            return StageReport.of(
                    Stage.FRESH, StageOutcome.NOT_DONE, "no trial on another seed (--fresh 50 runs some)");
        }
        if (tooLarge.isPresent() || deadline.hasPassed()) {
            return StageReport.of(
                    Stage.FRESH, StageOutcome.NOT_FINISHED, tooLarge.orElse("the time was over before it began"));
        }
        long instances = options.fresh()
                * files.study().experiments().stream()
                        .mapToLong(e -> e.widths().size())
                        .sum();
        return new FreshStage(files, pass, options).run(counting(Stage.FRESH, instances));
    }

    /** Returns the payload files that are not under the seal and of which, so, only the digests are compared. */
    private static List<String> unsealed(Study study) {
        List<String> names = new ArrayList<>(Layout.payload(study));
        names.removeAll(Layout.sealed(study));
        names.remove(Layout.SEAL);
        return names;
    }

    private LinePass.Listener counting(Stage stage, long all) {
        long[] done = {0};
        return () -> listener.step(stage, ++done[0], all);
    }

    private Verdict malformed(Stage stage, String line) {
        reports.add(StageReport.of(stage, StageOutcome.MALFORMED, line));
        for (Stage later : Stage.values()) {
            if (later.compareTo(stage) > 0) {
                reports.add(StageReport.of(later, StageOutcome.NOT_DONE, "an earlier stage stopped here"));
            }
        }
        return new Verdict(reports, Optional.empty(), 0, List.of());
    }
}
