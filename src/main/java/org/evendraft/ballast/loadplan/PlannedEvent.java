package org.evendraft.ballast.loadplan;

import java.util.OptionalDouble;
import org.evendraft.ballast.PlanRequest.OperationLimits;

/**
 * An event in its place of the sequence.
 *
 * @param event the event
 * @param minute when, from the start of the sequence (min)
 * @param limits what must hold at every instant of it
 */
record PlannedEvent(LoadEvent event, OptionalDouble minute, OperationLimits limits) {}
