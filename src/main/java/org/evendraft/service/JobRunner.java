package org.evendraft.service;

import java.time.Duration;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.LinkedBlockingQueue;
import java.util.concurrent.ScheduledExecutorService;
import java.util.concurrent.ThreadPoolExecutor;
import java.util.concurrent.TimeUnit;
import java.util.stream.Collectors;
import org.evendraft.platform.Fault;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.stability.StoppedException;
import org.evendraft.store.JobEnd;
import org.jdbi.v3.core.Handle;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;

/**
 * The jobs that this run of the service works on. The database says what becomes of a job: whoever finishes it first there, the work,
 * a cancellation by any instance or another run that takes this one for gone, has the last word, and the work of a job that is
 * finished otherwise is stopped. Threads are asked to stop and never interrupted, for an interrupt would close the database's file
 * under everyone else. Safe from many threads.
 */
final class JobRunner {
    /** Jobs worked on at once: one that takes long does not keep a short one waiting, and requests still get their share. */
    static final int AT_ONCE = 2;

    /** The most jobs that wait for their turn; with a minute for each, the last one waits some ten minutes. */
    static final int MOST_WAITING = 16;

    /** How often a run with jobs writes that it is alive and how far they have come. */
    static final Duration SIGNS_OF_LIFE = Duration.ofMillis(500);

    /** After how many signs of life it looks for jobs whose run is gone. */
    private static final int SIGNS_BETWEEN_LOOKS = 10;

    /** How long jobs are waited for that have been asked to stop. */
    private static final Duration PATIENCE = Duration.ofSeconds(10);

    private static final Logger LOG = LoggerFactory.getLogger(JobRunner.class);

    private final JobLedger ledger;
    private final Map<String, JobTask> tasks = new LinkedHashMap<>();
    private final ThreadPoolExecutor workers;
    private final ScheduledExecutorService watch;
    private int admitted;
    private boolean open;
    private int signs;

    JobRunner(JobLedger ledger) {
        this.ledger = ledger;
        this.workers = new ThreadPoolExecutor(
                AT_ONCE, AT_ONCE, 0, TimeUnit.SECONDS, new LinkedBlockingQueue<>(), task -> thread(task, "job"));
        this.watch = Executors.newSingleThreadScheduledExecutor(task -> thread(task, "job-watch"));
    }

    private static Thread thread(Runnable task, String name) {
        Thread thread = new Thread(task, name);
        thread.setDaemon(true);
        return thread;
    }

    /** Lets the jobs fail that nobody works on any more, and begins to take others. */
    void open() {
        tell(ledger.open());
        synchronized (this) {
            open = true;
        }
        long interval = SIGNS_OF_LIFE.toMillis();
        var unused = watch.scheduleWithFixedDelay(this::look, interval, interval, TimeUnit.MILLISECONDS);
    }

    private static void tell(int abandoned) {
        if (abandoned > 0) {
            LOG.atWarn().addKeyValue("jobs", abandoned).log("jobs failed whose run of the service is gone");
        }
    }

    /**
     * Takes a place for a job that is about to be stored; {@link #take} or {@link #giveUp} must follow.
     *
     * @throws Refusal when there is none
     */
    synchronized void admit() {
        if (!open) {
            throw new Refusal(Reason.UNAVAILABLE, "The service takes no jobs while it starts or stops.");
        }
        if (tasks.size() + admitted >= AT_ONCE + MOST_WAITING) {
            throw new Refusal(
                    Reason.TOO_MANY,
                    AT_ONCE + MOST_WAITING + " jobs are being worked on or wait for their turn, and more are not taken."
                            + " Ask again when one is finished, or cancel one that is no longer needed.");
        }
        admitted++;
    }

    /** Takes a job that is stored. */
    void take(JobTask task) {
        boolean taken;
        synchronized (this) {
            admitted--;
            tasks.put(task.id(), task);
            taken = open;
            if (taken) {
                workers.execute(task);
            }
        }
        if (!taken) {
            conclude(task, new JobEnd.Failed(JobLedger.STOPPED));
        }
    }

    /** Gives the place up of a job that has not been stored. */
    synchronized void giveUp() {
        admitted--;
    }

    /** Writes how far a job has come, if this run works on it. */
    void advance(Handle handle, String id) {
        task(id).ifPresent(task -> ledger.advance(handle, task));
    }

    /** Stops the work on a job that is finished otherwise, if this run works on it. */
    void stop(String id) {
        task(id).ifPresent(this::stop);
    }

    private void stop(JobTask task) {
        task.stop();
        if (workers.remove(task)) {
            forget(task);
        }
    }

    private synchronized Optional<JobTask> task(String id) {
        return Optional.ofNullable(tasks.get(id));
    }

    private synchronized List<JobTask> tasks() {
        return List.copyOf(tasks.values());
    }

    private synchronized void forget(JobTask task) {
        tasks.remove(task.id());
    }

    /** Works on a job whose turn has come. */
    void carryOut(JobTask task) {
        outcome(task).ifPresentOrElse(end -> conclude(task, end), () -> forget(task));
    }

    // The edge of the work: whatever goes wrong in it must end the job. Empty for a job finished while it waited.
    private Optional<JobEnd> outcome(JobTask task) {
        try {
            if (task.stopped()) {
                return failed(JobLedger.STOPPED);
            }
            return ledger.begin(task) ? Optional.of(new JobEnd.Done(task.result())) : Optional.empty();
        } catch (FaultyDocumentException e) {
            return failed(e.faults().stream().map(JobRunner::words).collect(Collectors.joining("; ")));
        } catch (Refusal e) {
            return failed(e.detail());
        } catch (StoppedException e) {
            return task.stopped() ? failed(JobLedger.STOPPED) : bug(task, e);
        } catch (Throwable e) {
            return bug(task, e);
        }
    }

    private static String words(Fault fault) {
        return fault.pointer().isEmpty() ? fault.detail() : fault.pointer() + ": " + fault.detail();
    }

    private static Optional<JobEnd> bug(JobTask task, Throwable cause) {
        LOG.atError().setCause(cause).addKeyValue("job", task.id()).log("job failed");
        return failed("internal error; whoever runs the service finds the cause in its log under this job's id");
    }

    private static Optional<JobEnd> failed(String reason) {
        return Optional.of(new JobEnd.Failed(reason));
    }

    /** Stores what a job came to; when that fails, it is tried again with each sign of life. */
    private void conclude(JobTask task, JobEnd end) {
        task.keep(end);
        try {
            ledger.finish(task, end);
            forget(task);
        } catch (RuntimeException e) {
            LOG.atWarn().setCause(e).addKeyValue("job", task.id()).log("what a job came to is not stored yet");
        }
    }

    // Nothing that goes wrong here, as a database that does not answer for a while, may end the watch.
    private void look() {
        try {
            showLife();
            signs++;
            if (signs % SIGNS_BETWEEN_LOOKS == 0) {
                tell(ledger.failAbandoned());
            }
        } catch (Throwable e) {
            LOG.warn("no sign of life could be written", e);
        }
    }

    private void showLife() {
        List<JobTask> mine = tasks();
        if (mine.isEmpty()) {
            return;
        }
        mine.forEach(task -> task.kept().ifPresent(end -> conclude(task, end)));
        Set<String> unfinished = ledger.signOfLife(mine);
        mine.stream().filter(task -> !unfinished.contains(task.id())).forEach(this::stop);
    }

    /** Stops all jobs and lets those fail that do not come to their end. */
    void close() {
        synchronized (this) {
            open = false;
        }
        end(watch);
        tasks().forEach(JobTask::stop);
        workers.getQueue().clear();
        end(workers);
        tasks().forEach(task -> conclude(task, task.kept().orElse(new JobEnd.Failed(JobLedger.STOPPED))));
    }

    private static void end(ExecutorService threads) {
        threads.shutdown();
        try {
            threads.awaitTermination(PATIENCE.toMillis(), TimeUnit.MILLISECONDS);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
    }
}
