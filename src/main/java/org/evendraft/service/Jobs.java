package org.evendraft.service;

import java.time.Clock;
import java.util.Optional;
import java.util.function.Supplier;
import org.evendraft.store.Database;
import org.evendraft.store.JobRepository;
import org.evendraft.store.JobState;
import org.evendraft.store.NewJob;
import org.evendraft.store.Page;
import org.evendraft.store.PageRequest;
import org.evendraft.store.StoredJob;
import org.jdbi.v3.core.Handle;

/**
 * Long computations: they are asked for, worked on one after the other, looked at, cancelled, and their results read. A job whose
 * run of the service is gone has failed and says so. Safe from many threads.
 */
public final class Jobs implements AutoCloseable {
    private final Database database;
    private final JobRepository jobs;
    private final JobLedger ledger;
    private final JobRunner runner;

    /**
     * @param database where jobs are kept
     * @param clock tells the time
     * @param ids makes ids, UUIDs
     */
    Jobs(Database database, Clock clock, Supplier<String> ids) {
        this.database = database;
        this.jobs = new JobRepository(clock, ids);
        this.ledger = new JobLedger(database, jobs, clock, ids.get());
        this.runner = new JobRunner(ledger);
    }

    /** Lets the jobs fail that an earlier run of the service left behind, and begins to take jobs. */
    public void begin() {
        runner.open();
    }

    /**
     * A job to be stored; the work on it begins when it is, in its turn.
     *
     * @param job what it is
     * @param work what it computes; what is wrong with a request should be found before
     * @return the job, queued; storing it throws a {@link Refusal} when too many jobs wait
     */
    public Pending<StoredJob> prepare(NewJob job, JobWork work) {
        return new Pending<>(handle -> store(handle, job, work));
    }

    private StoredJob store(Handle handle, NewJob job, JobWork work) {
        runner.admit();
        StoredJob stored;
        try {
            stored = jobs.save(handle, job, ledger.run());
        } catch (RuntimeException e) {
            runner.giveUp();
            throw e;
        }
        JobTask task = new JobTask(stored.id(), work, runner);
        Database.whenEnded(handle, () -> runner.take(task), runner::giveUp);
        return stored;
    }

    /**
     * A job as it stands.
     *
     * @throws Refusal when there is none
     */
    public StoredJob read(String id) {
        return database.read(handle -> found(handle, id));
    }

    private StoredJob found(Handle handle, String id) {
        return jobs.find(handle, id).orElseThrow(() -> Refusal.notFound("There is no job " + id + "."));
    }

    /**
     * Jobs, newest first.
     *
     * @param platform the platform whose jobs are wanted; empty for all
     */
    public Page<StoredJob> page(Optional<String> platform, PageRequest request) {
        return database.read(handle -> jobs.page(handle, platform, request));
    }

    /**
     * The result of a job, as JSON text.
     *
     * @throws Refusal when there is no such job, or it has no result
     */
    public String result(String id) {
        return database.read(handle -> {
            StoredJob job = found(handle, id);
            return jobs.result(handle, id).orElseThrow(() -> new Refusal(Reason.NO_RESULT, whyNoResult(job)));
        });
    }

    private static String whyNoResult(StoredJob job) {
        String name = "Job " + job.id();
        return switch (job.state()) {
            case QUEUED -> name + " waits for its turn and has no result yet.";
            case RUNNING ->
                name + " is running, " + Math.round(100 * job.fraction()) + " % done, and has no result yet.";
            case FAILED ->
                name + " has failed and has no result: " + job.reason().orElse("") + ".";
            case CANCELLED -> name + " was cancelled and has no result.";
            case DONE -> throw new IllegalStateException(name + " is done without a result");
        };
    }

    /**
     * What came of a cancellation.
     *
     * @param job the job as it stands
     * @param note a sentence for people when the job was finished before and stays as it is
     */
    public record Cancellation(StoredJob job, Optional<String> note) {}

    /**
     * Cancels a job; its work stops when it tells its progress next. One that is cancelled already is answered the same.
     *
     * @throws Refusal when there is none
     */
    public Cancellation cancel(String id) {
        return database.inTransaction(handle -> {
            runner.advance(handle, id);
            if (jobs.cancel(handle, id)) {
                Database.whenEnded(handle, () -> runner.stop(id), () -> {});
            }
            StoredJob job = found(handle, id);
            return new Cancellation(job, note(job));
        });
    }

    private static Optional<String> note(StoredJob job) {
        if (job.state() == JobState.CANCELLED) {
            return Optional.empty();
        }
        String before = job.state() == JobState.DONE ? "is done, and its result stays" : "has failed";
        return Optional.of("There was nothing left to cancel: the job " + before + ".");
    }

    /** Stops the jobs that are worked on and lets them fail with that reason; takes no more. */
    @Override
    public void close() {
        runner.close();
    }
}
