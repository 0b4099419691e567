package org.notchwork.cli;

import java.io.PrintStream;
import java.util.List;
import org.apache.commons.cli.Option;

/** The help texts, made from the verbs' own words and option tables. */
final class Help {

    private static final String COMMAND = "java -jar notchwork.jar";

    private Help() {}

    /** Prints what the program is and what it can do. */
    static void overview(List<Verb> verbs, PrintStream out) {
        out.println("notchwork: runs studies that compare query counts, seals them, and checks sealed ones.");
        out.println();
        out.println("usage: " + COMMAND + " VERB ...");
        out.println();
        for (Verb verb : verbs) {
            out.println("  " + padded(verb.name() + " " + verb.operands(), 18) + verb.purpose());
        }
        out.println();
        out.println("examples:");
        for (Verb verb : verbs) {
            out.println("  " + COMMAND + " " + verb.example());
        }
        out.println();
        out.println("VERB --help tells more; --version tells the version; --trace shows where a fault happened.");
        out.println("exit codes: 0 good; 2 wrong usage or invalid study; 10 checked, and the answer is no;");
        out.println("  11 not finished or not decided; 12 malformed or unsafe bundle; 70 a fault of this program");
    }

    /** Prints what one verb does and which options it takes. */
    static void verb(Verb verb, PrintStream out) {
        out.println(verb.name() + ": " + verb.purpose());
        out.println();
        out.println("usage: " + COMMAND + " " + verb.name() + " " + verb.operands() + " [options]");
        out.println("example: " + COMMAND + " " + verb.example());
        out.println();
        out.println("options:");
        for (Option option : verb.options().getOptions()) {
            String argument = option.hasArg() ? " " + option.getArgName() : "";
            out.println("  " + padded("--" + option.getLongOpt() + argument, 24) + option.getDescription());
        }
        out.println("  " + padded("--help", 24) + "this text");
    }

    private static String padded(String text, int width) {
        return text.length() >= width ? text + "  " : text + " ".repeat(width - text.length());
    }
}
