package org.notchwork.cli;

import java.util.List;

/** Ends a verb with an exit code and one line for each thing that is wrong: what, where, the mend. */
public final class Refusal extends Exception {

    private static final long serialVersionUID = 1L;

    private final Exit exit;
    private final transient List<String> lines;

    /**
     * Creates a refusal.
     *
     * @param exit the exit code
     * @param lines what to tell, a line each
     */
    public Refusal(Exit exit, List<String> lines) {
        super(String.join("\n", lines));
        this.exit = exit;
        this.lines = List.copyOf(lines);
    }

    /** Creates a refusal of one line. */
    public Refusal(Exit exit, String line) {
        this(exit, List.of(line));
    }

    /** Returns the exit code. */
    public Exit exit() {
        return exit;
    }

    /** Returns the lines. */
    public List<String> lines() {
        return lines;
    }
}
