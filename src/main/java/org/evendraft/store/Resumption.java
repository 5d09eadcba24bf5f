package org.evendraft.store;

/**
 * Where a load plan goes on from.
 *
 * @param loadPlan id of the load plan that it goes on with
 * @param afterEvent number of the event that was done last, 0 for none
 */
public record Resumption(String loadPlan, int afterEvent) {}
