package org.evendraft.store;

import java.time.Instant;
import java.util.Optional;

/**
 * A load plan in the list of a platform's load plans.
 *
 * @param id its id
 * @param platformRevision the revision that it was made for
 * @param name its name for people
 * @param resumedFrom id of the load plan that it goes on with, if it does
 * @param feasible whether it can be carried out
 * @param limitsKept whether every limit is kept
 * @param createdAt when it was stored
 */
public record LoadPlanSummary(
        String id,
        int platformRevision,
        String name,
        Optional<String> resumedFrom,
        boolean feasible,
        boolean limitsKept,
        Instant createdAt) {}
