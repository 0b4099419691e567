package org.notchwork.cli;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.function.Supplier;
import org.apache.commons.cli.CommandLine;
import org.apache.commons.cli.DefaultParser;
import org.apache.commons.cli.Options;
import org.apache.commons.cli.ParseException;
import org.apache.commons.cli.UnrecognizedOptionException;
import org.notchwork.json.Spelling;

/** Finds the verb, parses its options, runs it, and makes an exit code of whatever happens. */
final class CommandInterpreter {

    /** The verbs. A new one is a class and a line here; only the one that runs is created. */
    private static final List<Supplier<Verb>> VERBS =
            List.of(RunVerb::new, EstimateVerb::new, VerifyVerb::new, ShowVerb::new);

    private static final String TRACE = "--trace";

    private final Terminal terminal;

    CommandInterpreter(Terminal terminal) {
        this.terminal = terminal;
    }

    /** Runs a command line and returns its exit code; never throws. */
    Exit run(String[] args) {
        boolean trace = Arrays.asList(args).contains(TRACE);
        List<String> words = Arrays.stream(args).filter(a -> !a.equals(TRACE)).toList();
        Exit exit;
        try {
            exit = dispatch(words);
        } catch (Refusal refusal) {
            refusal.lines().forEach(l -> terminal.err().println("notchwork: " + l));
            exit = refusal.exit();
        } catch (InterruptedException e) {
            terminal.err().println("notchwork: stopped before it was finished; nothing was left under the final name");
            exit = Exit.UNFINISHED;
        } catch (OutOfMemoryError e) {
            terminal.err().println("notchwork: out of memory; give more with java -Xmx4g, or see estimate");
            exit = Exit.UNFINISHED;
        } catch (RuntimeException | Error e) {
            terminal.err().println("notchwork: a fault of this program: " + e + "; --trace shows where");
            if (trace) {
                e.printStackTrace(terminal.err());
            }
            exit = Exit.FAULT;
        }
        if (!terminal.delivered()) {
            terminal.err().println("notchwork: standard output is full or closed; the result was not delivered");
            return exit == Exit.FAULT ? exit : Exit.UNFINISHED;
        }
        return exit;
    }

    private Exit dispatch(List<String> words) throws Refusal, InterruptedException {
        if (words.isEmpty()) {
            Help.overview(verbs(), terminal.err());
            return Exit.USAGE;
        }
        String first = words.get(0);
        List<String> rest = words.subList(1, words.size());
        if (isHelp(first) && rest.isEmpty()) {
            Help.overview(verbs(), terminal.out());
            return Exit.GOOD;
        }
        if (first.equals("--version")) {
            terminal.out().println(Version.line());
            return Exit.GOOD;
        }
        Verb verb = isHelp(first) ? verb(rest.get(0)) : verb(first);
        if (isHelp(first) || rest.stream().anyMatch(CommandInterpreter::isHelp)) {
            Help.verb(verb, terminal.out());
            return Exit.GOOD;
        }
        CommandLine line = parse(verb, rest);
        return verb.run(line.getArgList(), line, terminal);
    }

    private static boolean isHelp(String word) {
        return word.equals("--help") || word.equals("-h") || word.equals("help");
    }

    private static List<Verb> verbs() {
        return VERBS.stream().map(Supplier::get).toList();
    }

    private static Verb verb(String name) throws Refusal {
        Optional<Verb> found =
                verbs().stream().filter(v -> v.name().equals(name)).findFirst();
        if (found.isEmpty()) {
            List<String> names = verbs().stream().map(Verb::name).toList();
            throw new Refusal(Exit.USAGE, "no verb \"" + name + "\"; " + Spelling.mend(name, names));
        }
        return found.get();
    }

    private static CommandLine parse(Verb verb, List<String> words) throws Refusal {
        Options options = verb.options();
        try {
            return DefaultParser.builder()
                    .setAllowPartialMatching(false)
                    .get()
                    .parse(options, words.toArray(String[]::new));
        } catch (UnrecognizedOptionException e) {
            List<String> known = options.getOptions().stream()
                    .map(o -> "--" + o.getLongOpt())
                    .sorted()
                    .toList();
            throw new Refusal(
                    Exit.USAGE,
                    verb.name() + ": no option " + e.getOption() + "; " + Spelling.mend(e.getOption(), known));
        } catch (ParseException e) {
            throw new Refusal(
                    Exit.USAGE, verb.name() + ": " + e.getMessage() + "; see notchwork " + verb.name() + " --help");
        }
    }
}
