package org.evendraft.http;

import java.time.Duration;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.ThreadFactory;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.function.Supplier;
import org.evendraft.service.Reason;
import org.evendraft.service.Refusal;

/** A bounded number of threads that work on requests, each within a time limit. */
final class Workers implements AutoCloseable {
    private static final int THREADS_PER_PROCESSOR = 4;
    private static final int LEAST_THREADS = 8;
    private static final Duration PATIENCE = Duration.ofSeconds(10);

    private final ExecutorService pool;
    private final Duration limit;

    Workers(Duration limit) {
        this.limit = limit;
        int threads = Math.max(
                LEAST_THREADS, THREADS_PER_PROCESSOR * Runtime.getRuntime().availableProcessors());
        AtomicInteger number = new AtomicInteger();
        ThreadFactory factory = task -> {
            Thread thread = new Thread(task, "work-" + number.incrementAndGet());
            thread.setDaemon(true);
            return thread;
        };
        this.pool = Executors.newFixedThreadPool(threads, factory);
    }

    /**
     * Has work done. Work that takes too long is given up on but not interrupted: an interrupt would close the database's file
     * under every other request. Work that has not begun by then never begins.
     *
     * @throws Refusal when it takes too long
     */
    Answer within(Supplier<Answer> work) {
        Future<Answer> future = pool.submit(work::get);
        try {
            return future.get(limit.toNanos(), TimeUnit.NANOSECONDS);
        } catch (TimeoutException e) {
            future.cancel(false);
            throw late();
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw late();
        } catch (ExecutionException e) {
            if (e.getCause() instanceof RuntimeException cause) {
                throw cause;
            }
            throw new IllegalStateException("work failed", e.getCause());
        }
    }

    private Refusal late() {
        return new Refusal(
                Reason.UNAVAILABLE,
                "The answer was not ready within " + limit.toSeconds()
                        + " s. A write may still be carried out; repeat it with the same Idempotency-Key.");
    }

    @Override
    public void close() {
        pool.shutdown();
        try {
            pool.awaitTermination(PATIENCE.toMillis(), TimeUnit.MILLISECONDS);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
    }
}
