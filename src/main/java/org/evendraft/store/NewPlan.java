package org.evendraft.store;

import java.util.List;

/**
 * A ballast plan to be stored.
 *
 * @param conditionId id of the condition it starts from
 * @param requestJson JSON text of the request
 * @param planJson JSON text of the plan
 * @param feasible whether the target is met
 * @param cost what the plan minimises (t)
 * @param pumpedMass sum of the moves' masses (t)
 * @param moves its moves by step
 */
public record NewPlan(
        String conditionId,
        String requestJson,
        String planJson,
        boolean feasible,
        double cost,
        double pumpedMass,
        List<StoredMove> moves) {

    /** Copies the list. */
    public NewPlan {
        moves = List.copyOf(moves);
    }
}
