package org.evendraft.service;

import java.util.Optional;
import org.evendraft.stability.Progress;
import org.evendraft.stability.StoppedException;
import org.evendraft.store.JobEnd;
import org.evendraft.store.JobProgress;

/** A job in the hands of this run of the service. */
final class JobTask implements Progress, Runnable {
    private final String id;
    private final JobWork work;
    private final JobRunner runner;
    private volatile JobProgress progress = JobProgress.NONE;
    private volatile Optional<JobEnd> end = Optional.empty();
    private volatile boolean stopped;

    /**
     * @param id the job's id
     * @param work what it computes
     * @param runner carries it out
     */
    JobTask(String id, JobWork work, JobRunner runner) {
        this.id = id;
        this.work = work;
        this.runner = runner;
    }

    String id() {
        return id;
    }

    JobProgress progress() {
        return progress;
    }

    @Override
    public void run() {
        runner.carryOut(this);
    }

    /** The result of the work, as JSON text. */
    String result() {
        return AnswerJson.text(work.run(this));
    }

    @Override
    public void reached(double fraction, String doing) {
        if (stopped) {
            throw new StoppedException();
        }
        // a fraction that is no number tells nothing; the bound forgives what rounding puts past the end
        double bounded = Double.isNaN(fraction) ? progress.fraction() : Math.min(1, Math.max(0, fraction));
        progress = new JobProgress(bounded, Optional.of(doing));
    }

    /** Has the work stop when it tells its progress next. */
    void stop() {
        stopped = true;
    }

    boolean stopped() {
        return stopped;
    }

    /** Keeps what the work came to until it is stored. */
    void keep(JobEnd outcome) {
        end = Optional.of(outcome);
    }

    /** What the work came to, if that is yet to be stored. */
    Optional<JobEnd> kept() {
        return end;
    }
}
