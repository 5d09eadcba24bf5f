package org.evendraft.store;

import java.time.Instant;

/**
 * A platform in the list of platforms, by its current revision.
 *
 * @param id its id
 * @param name its name
 * @param revision number of the current revision
 * @param createdAt when that was stored
 * @param tanks how many tanks it has
 */
public record PlatformSummary(String id, String name, int revision, Instant createdAt, int tanks) {}
