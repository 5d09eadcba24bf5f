package org.evendraft.store;

import java.time.Instant;
import org.evendraft.stability.ConditionResult;

/**
 * A result to be stored.
 *
 * @param result the figures
 * @param document their JSON text as answered
 * @param computedAt when it was computed
 * @param engineVersion version of the program that computed it
 * @param platformRevision the revision of the platform it was computed for
 */
public record NewResult(
        ConditionResult result, String document, Instant computedAt, String engineVersion, int platformRevision) {}
