package org.evendraft.service;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import org.evendraft.platform.Json;
import org.evendraft.store.Database;
import org.evendraft.store.PlanRepository;
import org.evendraft.store.PlanSummary;
import org.evendraft.store.StoredPlan;

/** Reads and lists stored plans. */
public final class ReadPlans {
    private final Database database;
    private final ReadConditions readConditions;
    private final PlanRepository plans;

    ReadPlans(Database database, ReadConditions readConditions, PlanRepository plans) {
        this.database = database;
        this.readConditions = readConditions;
        this.plans = plans;
    }

    /**
     * The plans of a condition. The component's name is that of the JSON.
     *
     * @param plans the plans, newest first
     */
    public record PlanList(List<PlanSummary> plans) {

        /** Copies the list. */
        public PlanList {
            plans = List.copyOf(plans);
        }
    }

    /**
     * The plans of a condition.
     *
     * @throws Refusal when there is no such platform or condition
     */
    public PlanList list(String platform, String condition) {
        readConditions.stored(platform, condition);
        return new PlanList(database.read(handle -> plans.list(handle, condition)));
    }

    /**
     * A plan with its id and that of its condition.
     *
     * @throws Refusal when there is none
     */
    public JsonNode read(String platform, String condition, String id) {
        readConditions.stored(platform, condition);
        StoredPlan stored = database.read(handle -> plans.find(handle, condition, id))
                .orElseThrow(() -> Refusal.notFound("Condition " + condition + " has no plan " + id + "."));
        ObjectNode answer = Json.mapper().createObjectNode().put("id", id).put("condition", condition);
        return answer.setAll((ObjectNode) StoredJson.tree(stored.planJson()));
    }
}
