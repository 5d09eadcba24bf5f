package org.evendraft.store;

import java.time.Instant;

/**
 * A batch of readings that is kept.
 *
 * @param id its id
 * @param recordedAt when it was stored
 */
public record SoundingBatch(String id, Instant recordedAt) {}
