package org.evendraft.service;

import java.time.Clock;
import java.time.Instant;
import java.time.temporal.ChronoUnit;
import org.evendraft.platform.Caution;

/**
 * Where figures come from, so that each can be traced. Component names are those of the JSON.
 *
 * @param platformRevision revision of the platform; 0 for one that is not stored
 * @param engineVersion version of the program
 * @param computedAt when they were computed
 * @param caution what they must not be taken for
 */
public record Provenance(int platformRevision, String engineVersion, Instant computedAt, String caution) {
    /**
     * Tells where figures computed now come from.
     *
     * @param clock tells when
     * @param engineVersion version of the program
     */
    public record Source(Clock clock, String engineVersion) {

        /** Of figures computed now from a platform's revision. */
        public Provenance of(int platformRevision) {
            Instant now = clock.instant().truncatedTo(ChronoUnit.MILLIS);
            return new Provenance(platformRevision, engineVersion, now, Caution.TEXT);
        }
    }
}
