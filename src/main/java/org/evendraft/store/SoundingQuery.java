package org.evendraft.store;

import java.time.Instant;
import java.util.Optional;

/**
 * Which readings of a platform are wanted.
 *
 * @param platformId the platform's id
 * @param tank a tank's id, empty for all tanks
 * @param from the earliest moment at which they were taken, if any
 * @param to the moment before which they were taken, if any
 */
public record SoundingQuery(String platformId, Optional<String> tank, Optional<Instant> from, Optional<Instant> to) {}
