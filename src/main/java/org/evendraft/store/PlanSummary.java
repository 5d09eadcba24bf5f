package org.evendraft.store;

import java.time.Instant;

/**
 * A ballast plan in the list of a condition's plans.
 *
 * @param id its id
 * @param feasible whether the target is met
 * @param cost what the plan minimises (t)
 * @param pumpedMass sum of the moves' masses (t)
 * @param createdAt when it was stored
 */
public record PlanSummary(String id, boolean feasible, double cost, double pumpedMass, Instant createdAt) {}
