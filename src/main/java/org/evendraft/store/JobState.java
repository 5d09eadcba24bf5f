package org.evendraft.store;

/** How far a job has come. */
public enum JobState {
    /** It waits for its turn. */
    QUEUED,
    /** It is being worked on. */
    RUNNING,
    /** It has a result. */
    DONE,
    /** It ended without a result, for a reason that it tells. */
    FAILED,
    /** Whoever asked for it no longer wants it. */
    CANCELLED;

    /** Whether it has come to its end, and stays as it is. */
    public boolean finished() {
        return this != QUEUED && this != RUNNING;
    }
}
