package org.evendraft.service;

import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.stability.Progress;
import org.evendraft.stability.StoppedException;

/** What a job computes. It runs on a thread of its own with no transaction open, and must not be interrupted. */
@FunctionalInterface
public interface JobWork {
    /**
     * Computes it.
     *
     * @param progress is to be told now and then, several times a second at best, how far the work has come; stops it by an exception,
     *     which must be let through
     * @return the result, a record that is written as JSON
     * @throws FaultyDocumentException when what is asked for is impossible; the job has failed for that reason
     * @throws Refusal likewise
     * @throws StoppedException of the progress
     */
    Object run(Progress progress);
}
