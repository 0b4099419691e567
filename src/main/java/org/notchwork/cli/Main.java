package org.notchwork.cli;

/** The program's entry: maps a verb to the class that does it. */
public final class Main {

    private Main() {}

    /**
     * Runs the program.
     *
     * @param args the verb and its arguments
     */
    public static void main(String[] args) {
        System.err.println("notchwork: no verb given");
        System.exit(2);
    }
}
