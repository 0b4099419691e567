package org.notchwork.cli;

import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.List;
import org.apache.commons.cli.CommandLine;
import org.apache.commons.cli.Option;

/** Reads operands and option values, refusing what is not of their form. */
final class Arguments {

    private Arguments() {}

    /** Returns the one operand of a verb as a path. */
    static Path onePath(Verb verb, List<String> operands) throws Refusal {
        if (operands.size() != 1) {
            throw new Refusal(
                    Exit.USAGE,
                    verb.name() + ": " + operands.size() + " operands; one is wanted: " + verb.operands()
                            + ", for example: " + verb.example());
        }
        return path(operands.get(0));
    }

    /** Returns a text as a path. */
    static Path path(String text) throws Refusal {
        try {
            return Path.of(text);
        } catch (InvalidPathException e) {
            throw new Refusal(Exit.USAGE, "\"" + text + "\" is not a path on this machine: " + e.getReason());
        }
    }

    /** Returns the value of an option as a whole number, or the stand-in if it is not given. */
    static int number(CommandLine line, String option, int min, int max, int absent) throws Refusal {
        String text = line.getOptionValue(option);
        if (text == null) {
            return absent;
        }
        try {
            int number = Integer.parseInt(text);
            if (number >= min && number <= max) {
                return number;
            }
        } catch (NumberFormatException e) {
            // Answered below, together with a number out of range.
        }
        throw new Refusal(
                Exit.USAGE, "--" + option + " " + text + ": a whole number from " + min + " to " + max + " is wanted");
    }

    /** Returns how many worker threads to use: the option, or one a processor. */
    static int threads(CommandLine line) throws Refusal {
        int processors = Runtime.getRuntime().availableProcessors();
        return number(line, "threads", 1, 256, Math.min(256, processors));
    }

    /** Returns an option without a value. */
    static Option flag(String name, String description) {
        return Option.builder().longOpt(name).desc(description).get();
    }

    /** Returns an option with a value. */
    static Option valued(String name, String value, String description) {
        return Option.builder()
                .longOpt(name)
                .hasArg()
                .argName(value)
                .desc(description)
                .get();
    }
}
