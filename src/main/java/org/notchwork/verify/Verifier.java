package org.notchwork.verify;

import java.io.IOException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.notchwork.bundle.Bag;
import org.notchwork.bundle.BundleFault;
import org.notchwork.bundle.Layout;
import org.notchwork.check.CheckOutcome;
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
        reports.add(rerun(files, bag, runner, pass.misplacement().isEmpty(), instances));
        long failed = files.checks().stream()
                .filter(c -> c.outcome() == CheckOutcome.DIFFERS)
                .count();
        return new Verdict(reports, Optional.of(files.seal().digest()), failed, unsealed(files.study()));
    }

    private StageReport rerun(OpenedFiles files, Bag bag, TrialRunner runner, boolean complete, long instances)
            throws IOException {
        if (!complete) {
            return StageReport.of(
                    Stage.RERUN, StageOutcome.NOT_DONE, "the lines are not those that the study calls for");
        }
        if (options.rerun() instanceof Rerun.All) {
            return new RerunStage(files, bag, options, runner).all(counting(Stage.RERUN, instances));
        }
        if (options.rerun() instanceof Rerun.Sample sample) {
            return new SampleStage(files, bag, options, runner)
                    .sample(sample.trials(), counting(Stage.RERUN, Math.min(sample.trials(), Lines.of(files.study()))));
        }
        return StageReport.of(Stage.RERUN, StageOutcome.NOT_DONE, "no trial was run again");
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
