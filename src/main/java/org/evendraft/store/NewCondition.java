package org.evendraft.store;

import org.evendraft.platform.Condition;

/**
 * A condition to be stored.
 *
 * @param platformId the platform's id
 * @param platformRevision the revision it was checked against
 * @param condition the condition, checked
 * @param document its JSON text as posted
 */
public record NewCondition(String platformId, int platformRevision, Condition condition, String document) {}
