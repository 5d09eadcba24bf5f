package org.evendraft.service;

import java.time.Duration;
import java.time.InstantSource;
import java.util.Collection;
import java.util.Set;
import org.evendraft.store.Database;
import org.evendraft.store.JobEnd;
import org.evendraft.store.JobProgress;
import org.evendraft.store.JobRepository;
import org.jdbi.v3.core.Handle;

/** What this run of the service writes about jobs by itself, without being asked. */
final class JobLedger {
    /**
     * A run that has shown no sign of life for so long is gone: many times the interval of {@link JobRunner#SIGNS_OF_LIFE}, to forgive
     * a database that stalls and the clocks of two machines that differ by some seconds.
     */
    static final Duration SILENCE = Duration.ofSeconds(30);

    /** Why a job failed that nobody works on any more. */
    static final String STOPPED = "the service stopped while it ran; ask again";

    private final Database database;
    private final JobRepository jobs;
    private final InstantSource clock;
    private final String run;

    /**
     * @param clock tells the time
     * @param run id of this run of the service
     */
    JobLedger(Database database, JobRepository jobs, InstantSource clock, String run) {
        this.database = database;
        this.jobs = jobs;
        this.clock = clock;
        this.run = run;
    }

    /** Id of this run of the service. */
    String run() {
        return run;
    }

    /**
     * Writes that this run has begun, and lets the jobs fail that earlier ones left behind.
     *
     * @return how many those are
     */
    int open() {
        return database.inTransaction(handle -> {
            jobs.register(handle, run);
            return database.exclusive() ? jobs.failAllOfOthers(handle, run, STOPPED) : failAbandoned(handle);
        });
    }

    /**
     * Lets the jobs fail whose run has fallen silent.
     *
     * @return how many those are
     */
    int failAbandoned() {
        return database.inPassing(this::failAbandoned);
    }

    private int failAbandoned(Handle handle) {
        return jobs.failAbandoned(handle, clock.instant().minus(SILENCE), STOPPED);
    }

    /**
     * Writes that this run is alive and how far its jobs have come.
     *
     * @return ids of its jobs that are not finished
     */
    Set<String> signOfLife(Collection<JobTask> tasks) {
        return database.inPassing(handle -> {
            jobs.markAlive(handle, run);
            tasks.forEach(task -> advance(handle, task));
            return jobs.unfinished(handle, run);
        });
    }

    /** Writes how far a job has come. */
    void advance(Handle handle, JobTask task) {
        jobs.advance(handle, task.id(), run, task.progress());
    }

    /** Writes that a job is worked on; tells whether it still should be. */
    boolean begin(JobTask task) {
        return database.inPassing(handle -> jobs.begin(handle, task.id(), run));
    }

    /** Writes what a job came to, unless it was finished in another way before. */
    void finish(JobTask task, JobEnd end) {
        JobProgress last = task.progress();
        JobProgress reached = end instanceof JobEnd.Done ? new JobProgress(1, last.doing()) : last;
        database.inTransaction(handle -> jobs.finish(handle, task.id(), run, reached, end));
    }
}
