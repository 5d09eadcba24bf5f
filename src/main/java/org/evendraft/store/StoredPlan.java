package org.evendraft.store;

import java.time.Instant;
import java.util.List;

/**
 * A ballast plan that is kept.
 *
 * @param id its id
 * @param conditionId id of the condition it starts from
 * @param requestJson JSON text of the request
 * @param planJson JSON text of the plan
 * @param feasible whether the target is met
 * @param cost what the plan minimises (t)
 * @param pumpedMass sum of the moves' masses (t)
 * @param moves its moves by step
 * @param createdAt when it was stored
 */
public record StoredPlan(
        String id,
        String conditionId,
        String requestJson,
        String planJson,
        boolean feasible,
        double cost,
        double pumpedMass,
        List<StoredMove> moves,
        Instant createdAt) {

    /** Copies the list. */
    public StoredPlan {
        moves = List.copyOf(moves);
    }
}
