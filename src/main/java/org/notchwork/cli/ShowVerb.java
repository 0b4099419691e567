package org.notchwork.cli;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import org.apache.commons.cli.CommandLine;
import org.apache.commons.cli.Options;
import org.notchwork.bundle.BundleFault;
import org.notchwork.bundle.Limits;
import org.notchwork.bundle.Results;
import org.notchwork.bundle.Seal;
import org.notchwork.json.CanonicalJson;
import org.notchwork.json.JsonObject;
import org.notchwork.json.Spelling;
import org.notchwork.seed.SeedTree;
import org.notchwork.study.Cell;
import org.notchwork.study.Experiment;
import org.notchwork.study.StrategyChoice;
import org.notchwork.trial.TrialRecord;
import org.notchwork.verify.BundleContents;

/** Prints the table of a bundle, or walks one of its trials. */
final class ShowVerb implements Verb {

    @Override
    public String name() {
        return "show";
    }

    @Override
    public String operands() {
        return "BUNDLE";
    }

    @Override
    public String purpose() {
        return "prints the table of a bundle, or walks one of its trials";
    }

    @Override
    public String example() {
        return "show first-light --trial growth/8/random-draws/17";
    }

    @Override
    public Options options() {
        return new Options()
                .addOption(Arguments.valued("trial", "CELL/NUMBER", "walk one trial as a referee would by hand"))
                .addOption(Arguments.flag("proof", "with --trial: print its line and audit path as one JSON object"))
                .addOption(Arguments.flag("json", "print the figures as one JSON object"));
    }

    @Override
    public Exit run(List<String> operands, CommandLine line, Terminal terminal) throws Refusal, InterruptedException {
        Path bundle = Arguments.onePath(this, operands);
        try {
            BundleContents contents = BundleContents.open(bundle, Limits.USUAL);
            if (line.hasOption("proof") && !line.hasOption("trial")) {
                throw new Refusal(Exit.USAGE, "--proof: --trial CELL/NUMBER says of which trial");
            }
            if (line.hasOption("trial")) {
                trial(contents, line, terminal);
            } else if (line.hasOption("json")) {
                terminal.out().println(CanonicalJson.text(json(contents)));
            } else {
                Results results = contents.results();
                new ResultsScreen(terminal.out()).print(results);
                terminal.out().println("seal:   " + Seal.groups(contents.seal()));
                terminal.out().println("shown as written in the bundle; verify checks it");
            }
            return Exit.GOOD;
        } catch (BundleFault e) {
            throw new Refusal(Exit.MALFORMED, e.place() + ": " + e.getMessage());
        } catch (BundleContents.Unreadable e) {
            throw new Refusal(Exit.MALFORMED, e.getMessage());
        } catch (IOException e) {
            throw new Refusal(Exit.UNFINISHED, IoText.of(e));
        }
    }

    private static JsonObject json(BundleContents contents) {
        return JsonObject.builder()
                .put("claims", contents.claims())
                .put("format", "notchwork-show/1")
                .put("seal", contents.seal())
                .put("summary", contents.summary())
                .build();
    }

    private static void trial(BundleContents contents, CommandLine line, Terminal terminal)
            throws Refusal, IOException, BundleFault, BundleContents.Unreadable {
        String named = line.getOptionValue("trial");
        int slash = named.lastIndexOf('/');
        String id = slash < 0 ? named : named.substring(0, slash);
        List<String> cells = contents.study().cells().stream().map(Cell::id).toList();
        if (slash < 0 || !cells.contains(id)) {
            throw new Refusal(
                    Exit.USAGE,
                    "--trial " + named + ": CELL/NUMBER is wanted, for example " + cells.get(0) + "/0"
                            + Spelling.nearest(id, cells)
                                    .map(near -> "; did you mean " + near + "?")
                                    .orElse(""));
        }
        Cell cell = contents.study().cells().get(cells.indexOf(id));
        Experiment experiment = contents.study().experiment(cell.experiment()).orElseThrow();
        StrategyChoice choice = experiment.choice(cell.label()).orElseThrow();
        long number = number(named.substring(slash + 1), experiment.trials());
        if (line.hasOption("proof")) {
            terminal.out()
                    .println(CanonicalJson.text(
                            contents.proof(experiment, cell, number).write()));
            return;
        }
        TrialRecord trial = contents.trial(experiment, cell, number);
        new TrialWalk(new SeedTree(contents.study().seed()), terminal.out()).walk(experiment, choice, trial);
    }

    private static long number(String text, int trials) throws Refusal {
        if (text.matches("[0-9]{1,9}") && Long.parseLong(text) < trials) {
            return Long.parseLong(text);
        }
        throw new Refusal(Exit.USAGE, "--trial: no trial " + text + "; 0 to " + (trials - 1) + " are there");
    }
}
