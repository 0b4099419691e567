package org.notchwork.verify;

import java.time.Duration;
import java.util.Timer;
import java.util.TimerTask;

/** Interrupts the thread that made it when the referee's time is over; closing it calls that off. */
final class Deadline implements AutoCloseable {

    private final Timer clock = new Timer("deadline", true);
    private volatile boolean passed;

    Deadline(Duration time) {
        Thread waiting = Thread.currentThread();
        clock.schedule(
                new TimerTask() {
                    @Override
                    public void run() {
                        passed = true;
                        waiting.interrupt();
                    }
                },
                time.toMillis());
    }

    /** Returns whether the time is over. */
    boolean hasPassed() {
        return passed;
    }

    @Override
    public void close() {
        clock.cancel();
        if (passed) {
            // The interrupt was this clock's own, and what it was for has ended.
            Thread.interrupted();
        }
    }
}
