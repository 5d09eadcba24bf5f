package org.evendraft.store;

import java.time.Instant;

/**
 * A condition as it was posted.
 *
 * @param id its id
 * @param platformId the platform's id
 * @param platformRevision the revision it was checked against
 * @param name its name
 * @param document JSON text as posted
 * @param createdAt when it was stored
 */
public record StoredCondition(
        String id, String platformId, int platformRevision, String name, String document, Instant createdAt) {}
