package org.evendraft.store;

import java.time.Instant;

/**
 * A revision of a platform as it was posted.
 *
 * @param id the platform's id
 * @param revision number of the revision, from 1
 * @param name the platform's name
 * @param document JSON text as posted
 * @param createdAt when it was stored
 */
public record StoredPlatform(String id, int revision, String name, String document, Instant createdAt) {}
