package org.evendraft.store;

import java.util.Optional;

/**
 * How far the work on a job has come.
 *
 * @param fraction part of the work that is done, 0 to 1
 * @param doing what is being done, in words; none before anything was told
 */
public record JobProgress(double fraction, Optional<String> doing) {
    /** Nothing was told yet. */
    public static final JobProgress NONE = new JobProgress(0, Optional.empty());

    /**
     * Checks the fraction.
     *
     * @throws IllegalArgumentException when it is not from 0 to 1
     */
    public JobProgress {
        if (!(fraction >= 0 && fraction <= 1)) {
            throw new IllegalArgumentException("fraction " + fraction);
        }
    }
}
