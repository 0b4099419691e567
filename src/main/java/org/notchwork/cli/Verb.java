package org.notchwork.cli;

import java.util.List;
import org.apache.commons.cli.CommandLine;
import org.apache.commons.cli.Options;

/** One thing that the program does. */
interface Verb {

    /** Returns the word on the command line. */
    String name();

    /** Returns the operands as the help writes them, for example {@code STUDY}. */
    String operands();

    /** Returns what the verb does, in one sentence. */
    String purpose();

    /** Returns an example, as it would be typed after {@code java -jar notchwork.jar}. */
    String example();

    /** Returns the options, {@code --help} not included. */
    Options options();

    /**
     * Does it.
     *
     * @param operands what stands on the command line besides options
     * @param line the options
     * @param terminal where to speak
     * @return the exit code
     * @throws Refusal if it cannot be done
     * @throws InterruptedException if the user stops it
     */
    Exit run(List<String> operands, CommandLine line, Terminal terminal) throws Refusal, InterruptedException;
}
