package org.evendraft.store;

import java.time.Instant;

/**
 * A load plan that is kept.
 *
 * @param id its id
 * @param plan all of it
 * @param createdAt when it was stored
 */
public record StoredLoadPlan(String id, NewLoadPlan plan, Instant createdAt) {}
