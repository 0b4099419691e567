package org.notchwork.cli;

/** The program's entry: runs the verb that the command line names and ends with its exit code. */
public final class Main {

    private Main() {}

    /**
     * Runs the program.
     *
     * @param args the verb and its arguments
     */
    public static void main(String[] args) {
        Terminal terminal = Terminal.ofProcess();
        Thread.setDefaultUncaughtExceptionHandler((thread, fault) -> {
            terminal.err().println("notchwork: fault in " + thread.getName() + ": " + fault);
            Runtime.getRuntime().halt(Exit.FAULT.code());
        });
        Interruption interruption = Interruption.watchingThisThread();
        Exit exit = new CommandInterpreter(terminal).run(args);
        interruption.finished();
        System.exit(exit.code());
    }
}
