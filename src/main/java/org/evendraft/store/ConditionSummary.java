package org.evendraft.store;

import java.time.Instant;
import java.util.Optional;

/**
 * A condition in the list of a platform's conditions.
 *
 * @param id its id
 * @param platformRevision the revision of the platform it was checked against
 * @param name its name
 * @param mode id of its mode, if any
 * @param createdAt when it was stored
 */
public record ConditionSummary(
        String id, int platformRevision, String name, Optional<String> mode, Instant createdAt) {}
