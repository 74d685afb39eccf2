package org.rodside.study;

import java.util.ArrayDeque;
import java.util.Deque;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.function.Consumer;
import java.util.function.DoubleConsumer;
import java.util.function.IntFunction;
import java.util.function.Supplier;

/**
 * Runs numbered pieces of work on several threads and hands the results on in order, so that the outcome does not depend
 * on the number of threads. Only a few finished pieces wait at any time.
 */
public final class Chunks {

    /** Pieces under way or waiting, for each thread: enough to keep all busy, few enough to hold little memory. */
    private static final int AHEAD = 4;

    private final int threads;
    private final DoubleConsumer progress;

    /**
     * @param threads number of threads, at least 1
     * @param progress told the share done after each piece, on the calling thread; no unit
     */
    public Chunks(int threads, DoubleConsumer progress) {
        this.threads = threads;
        this.progress = progress;
    }

    /**
     * Works through all pieces.
     *
     * @param count number of pieces
     * @param worker makes a worker, once for each thread; a worker turns the number of a piece into its result
     * @param merge takes every result in order, on the calling thread
     */
    public <T> void inOrder(int count, Supplier<IntFunction<T>> worker, Consumer<T> merge) {
        if (threads == 1 || count == 1) {
            IntFunction<T> only = worker.get();
            for (int i = 0; i < count; i++) {
                merge.accept(only.apply(i));
                progress.accept((i + 1.0) / count);
            }
            return;
        }
        ExecutorService pool = Executors.newFixedThreadPool(Math.min(threads, count), Chunks::daemon);
        try {
            ThreadLocal<IntFunction<T>> own = ThreadLocal.withInitial(worker);
            inOrder(count, pool, piece -> own.get().apply(piece), merge);
        } finally {
            pool.shutdownNow();
        }
    }

    private <T> void inOrder(int count, ExecutorService pool, IntFunction<T> work, Consumer<T> merge) {
        Deque<Future<T>> waiting = new ArrayDeque<>();
        int next = 0;
        for (int done = 0; done < count; done++) {
            while (next < count && waiting.size() < AHEAD * threads) {
                int piece = next++;
                waiting.add(pool.submit(() -> work.apply(piece)));
            }
            merge.accept(result(waiting.remove()));
            progress.accept((done + 1.0) / count);
        }
    }

    private static <T> T result(Future<T> future) {
        try {
            return future.get();
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new IllegalStateException("interrupted", e);
        } catch (ExecutionException e) {
            if (e.getCause() instanceof RuntimeException cause) {
                throw cause;
            }
            throw new IllegalStateException(e.getCause());
        }
    }

    private static Thread daemon(Runnable work) {
        Thread thread = new Thread(work, "rodside-worker");
        thread.setDaemon(true);
        return thread;
    }
}
