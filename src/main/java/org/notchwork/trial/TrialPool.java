package org.notchwork.trial;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;
import java.util.Queue;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import org.notchwork.study.Experiment;

/**
 * Spreads trials over threads and hands over what came of them in the order of the study.
 *
 * <p>Only a few ranges are under way at once, so memory does not grow with the number of trials. Whatever a worker
 * throws stops the pool and is thrown to the caller: no thread dies unheard.
 */
public final class TrialPool {

    private static final int AHEAD = 4;

    private final int threads;

    /** Creates a pool. */
    public TrialPool(int threads) {
        if (threads < 1) {
            throw new IllegalArgumentException(threads + " threads");
        }
        this.threads = threads;
    }

    /**
     * What is done with one trial, in a worker.
     *
     * @param <R> what comes of it
     */
    @FunctionalInterface
    public interface Work<R> {

        /** Does one trial. */
        R trial(Experiment experiment, int width, long trial);
    }

    /**
     * Takes what came of the trials, in order, on the calling thread.
     *
     * @param <R> what came of a trial
     * @param <E> what it may throw
     */
    @FunctionalInterface
    public interface Sink<R, E extends Exception> {

        /** Takes what came of one trial. */
        void accept(R result) throws E;
    }

    /**
     * Runs all trials of some ranges.
     *
     * @param ranges the ranges, in the order in which their results are wanted
     * @param work what is done with a trial
     * @param sink what takes the results
     * @throws InterruptedException if the calling thread is interrupted; workers are stopped first
     * @throws E if the sink throws it; workers are stopped first
     */
    public <R, E extends Exception> void run(List<TrialRange> ranges, Work<R> work, Sink<R, E> sink)
            throws InterruptedException, E {
        ExecutorService workers = Executors.newFixedThreadPool(threads, TrialPool::worker);
        try {
            Queue<Future<List<R>>> underWay = new ArrayDeque<>();
            Iterator<TrialRange> rest = ranges.iterator();
            while (rest.hasNext() || !underWay.isEmpty()) {
                if (Thread.interrupted()) {
                    throw new InterruptedException();
                }
                while (rest.hasNext() && underWay.size() < AHEAD * threads) {
                    TrialRange range = rest.next();
                    underWay.add(workers.submit(() -> all(range, work)));
                }
                for (R result : finished(underWay.remove())) {
                    sink.accept(result);
                }
            }
        } finally {
            workers.shutdownNow();
        }
    }

    private static Thread worker(Runnable task) {
        Thread thread = new Thread(task, "trials");
        thread.setDaemon(true);
        return thread;
    }

    private static <R> List<R> all(TrialRange range, Work<R> work) throws InterruptedException {
        List<R> results = new ArrayList<>();
        for (long trial = range.from(); trial < range.to(); trial++) {
            if (Thread.interrupted()) {
                throw new InterruptedException();
            }
            results.add(work.trial(range.experiment(), range.width(), trial));
        }
        return results;
    }

    private static <R> List<R> finished(Future<List<R>> future) throws InterruptedException {
        try {
            return future.get();
        } catch (ExecutionException e) {
            if (e.getCause() instanceof Error error) {
                throw error;
            }
            if (e.getCause() instanceof RuntimeException fault) {
                throw fault;
            }
            throw new IllegalStateException("a worker failed", e.getCause());
        }
    }
}
