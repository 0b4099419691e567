package org.notchwork.cli;

import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;

/**
 * Turns Ctrl-C and a termination signal into an interrupt of the working thread and exit code 11.
 *
 * <p>The JVM answers a signal by running its shutdown hooks and would then end with 128 plus the signal's number. The
 * hook here interrupts the working thread, lets it put things away and halts with the code of the design.
 */
final class Interruption {

    private static final long PATIENCE_SECONDS = 10;

    private final CountDownLatch done = new CountDownLatch(1);

    private Interruption() {}

    /** Installs the hook for the calling thread. */
    static Interruption watchingThisThread() {
        Interruption interruption = new Interruption();
        Thread worker = Thread.currentThread();
        Thread hook = new Thread(() -> interruption.stop(worker), "interruption");
        Runtime.getRuntime().addShutdownHook(hook);
        return interruption;
    }

    /** Says that the work has ended by itself or has been put away; the process may end. */
    void finished() {
        done.countDown();
    }

    private void stop(Thread worker) {
        if (done.getCount() == 0) {
            return;
        }
        worker.interrupt();
        try {
            if (!done.await(PATIENCE_SECONDS, TimeUnit.SECONDS)) {
                Runtime.getRuntime().halt(Exit.UNFINISHED.code());
            }
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
        Runtime.getRuntime().halt(Exit.UNFINISHED.code());
    }
}
