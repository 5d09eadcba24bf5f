package org.evendraft.store;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.concurrent.CyclicBarrier;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.function.IntFunction;

/** Runs the same work on many threads that start at one moment. */
final class Simultaneously {
    private Simultaneously() {}

    /** What the threads returned; a thread that throws fails the test. */
    static <T> List<T> run(int threads, IntFunction<T> work) throws InterruptedException, ExecutionException {
        CyclicBarrier start = new CyclicBarrier(threads);
        ExecutorService executor = Executors.newFixedThreadPool(threads);
        try {
            List<Callable<T>> calls = new ArrayList<>();
            for (int i = 0; i < threads; i++) {
                int number = i;
                calls.add(() -> {
                    start.await();
                    return work.apply(number);
                });
            }
            List<T> answers = new ArrayList<>();
            for (Future<T> future : executor.invokeAll(calls)) {
                answers.add(future.get());
            }
            return answers;
        } finally {
            executor.shutdownNow();
        }
    }
}
