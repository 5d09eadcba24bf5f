package org.evendraft.store;

import java.time.Instant;

/**
 * A reading that is kept.
 *
 * @param sounding the reading
 * @param platformRevision the revision by whose calibration its figures were computed
 * @param batchId id of the batch in which it came
 * @param recordedAt when that was stored
 */
public record StoredSounding(Sounding sounding, int platformRevision, String batchId, Instant recordedAt) {}
