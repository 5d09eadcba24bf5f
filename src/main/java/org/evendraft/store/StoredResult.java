package org.evendraft.store;

import java.time.Instant;

/**
 * A result of a condition as it was answered.
 *
 * @param id its id
 * @param conditionId the condition's id
 * @param computedAt when it was computed
 * @param engineVersion version of the program that computed it
 * @param platformRevision the revision of the platform it was computed for
 * @param document JSON text
 */
public record StoredResult(
        String id,
        String conditionId,
        Instant computedAt,
        String engineVersion,
        int platformRevision,
        String document) {}
