package org.evendraft.service;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.function.Predicate;
import java.util.function.Supplier;
import org.evendraft.stability.Progress;
import org.evendraft.stability.StoppedException;

/** The work of a job as a test wants it: it stands where the test puts it and ends when the test says so. */
public final class SteppedWork implements JobWork {
    /** Far more than anything here takes, so that only what never happens fails. */
    public static final int PATIENCE_S = 60;

    private static final int STEP_MS = 2;

    private final CountDownLatch begun = new CountDownLatch(1);
    private final CountDownLatch stopped = new CountDownLatch(1);
    private final AtomicInteger runs = new AtomicInteger();
    private volatile double fraction;
    private volatile String doing = "first step";
    private volatile Supplier<Object> end = SteppedWork::goesOn;

    /**
     * What it computes.
     *
     * @param kg a figure
     */
    public record Figures(double kg) {}

    private static Object goesOn() {
        return "";
    }

    @Override
    public Object run(Progress progress) {
        runs.incrementAndGet();
        begun.countDown();
        try {
            Object result = "";
            while (result.equals("")) {
                progress.reached(fraction, doing);
                TimeUnit.MILLISECONDS.sleep(STEP_MS);
                result = end.get();
            }
            return result;
        } catch (StoppedException e) {
            stopped.countDown();
            throw e;
        } catch (InterruptedException e) {
            throw new IllegalStateException("a job must not be interrupted", e);
        }
    }

    /** Puts it forward. */
    public void put(double part, String words) {
        doing = words;
        fraction = part;
    }

    /** Has it end with a result. */
    public void finish(double kg) {
        end = () -> new Figures(kg);
    }

    /** Has it end by an exception. */
    public void fail(RuntimeException e) {
        end = () -> {
            throw e;
        };
    }

    /** Waits until it has begun. */
    public void awaitBegun() {
        await(begun);
    }

    /** Waits until its progress has stopped it. */
    public void awaitStopped() {
        await(stopped);
    }

    /** How often it was begun. */
    public int runs() {
        return runs.get();
    }

    private static void await(CountDownLatch latch) {
        try {
            assertThat(latch.await(PATIENCE_S, TimeUnit.SECONDS)).isTrue();
        } catch (InterruptedException e) {
            throw new IllegalStateException(e);
        }
    }

    /** Asks again and again until an answer is as wanted. */
    public static <T> T await(Supplier<T> question, Predicate<T> wanted) {
        long deadline = System.nanoTime() + TimeUnit.SECONDS.toNanos(PATIENCE_S);
        T answer = question.get();
        while (!wanted.test(answer)) {
            assertThat(System.nanoTime()).as("still " + answer).isLessThan(deadline);
            try {
                TimeUnit.MILLISECONDS.sleep(STEP_MS);
            } catch (InterruptedException e) {
                throw new IllegalStateException(e);
            }
            answer = question.get();
        }
        return answer;
    }
}
