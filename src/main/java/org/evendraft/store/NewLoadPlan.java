package org.evendraft.store;

import java.util.List;
import java.util.Optional;

/**
 * A load plan to be stored.
 *
 * @param platformId the platform's id
 * @param platformRevision the revision that it was made for
 * @param name its name for people
 * @param conditionId id of the stored condition that it starts from, if it names one
 * @param resumption where it goes on from, if it does
 * @param requestJson JSON text of the request
 * @param planJson JSON text of the load plan
 * @param feasible whether it can be carried out
 * @param limitsKept whether every limit is kept
 * @param events its events by number, as far as the platform floats
 */
public record NewLoadPlan(
        String platformId,
        int platformRevision,
        String name,
        Optional<String> conditionId,
        Optional<Resumption> resumption,
        String requestJson,
        String planJson,
        boolean feasible,
        boolean limitsKept,
        List<StoredEvent> events) {

    /** Copies the list. */
    public NewLoadPlan {
        events = List.copyOf(events);
    }
}
