package org.evendraft.service;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import java.util.OptionalInt;
import org.evendraft.platform.Json;
import org.evendraft.store.Database;
import org.evendraft.store.LoadPlanRepository;
import org.evendraft.store.LoadPlanSummary;
import org.evendraft.store.Page;
import org.evendraft.store.PageRequest;
import org.evendraft.store.StoredLoadPlan;

/** Reads and lists stored load plans. */
public final class ReadLoadPlans {
    private final Database database;
    private final PlatformShelf shelf;
    private final LoadPlanRepository loadPlans;

    ReadLoadPlans(Database database, PlatformShelf shelf, LoadPlanRepository loadPlans) {
        this.database = database;
        this.shelf = shelf;
        this.loadPlans = loadPlans;
    }

    /**
     * Part of the list of a platform's load plans. Component names are those of the JSON.
     *
     * @param loadPlans the load plans, newest first
     * @param total how many there are in all
     * @param limit the most that were asked for
     * @param offset how many were passed over
     */
    public record LoadPlanPage(List<LoadPlanSummary> loadPlans, long total, int limit, long offset) {

        /** Copies the list. */
        public LoadPlanPage {
            loadPlans = List.copyOf(loadPlans);
        }
    }

    /**
     * A page of the load plans of a platform.
     *
     * @throws Refusal when there is no such platform
     */
    public LoadPlanPage page(String platform, PageRequest request) {
        shelf.stored(platform, OptionalInt.empty());
        Page<LoadPlanSummary> page = database.read(handle -> loadPlans.page(handle, platform, request));
        return new LoadPlanPage(page.items(), page.total(), request.limit(), request.offset());
    }

    /**
     * A load plan as it was answered when it was made.
     *
     * @throws Refusal when there is none
     */
    public JsonNode read(String platform, String id) {
        StoredLoadPlan stored = stored(platform, id);
        ObjectNode answer = Json.mapper().createObjectNode().put("id", id);
        answer.set("condition", Json.mapper().valueToTree(stored.plan().conditionId()));
        answer.set("resumption", Json.mapper().valueToTree(stored.plan().resumption()));
        return answer.setAll((ObjectNode) StoredJson.tree(stored.plan().planJson()));
    }

    StoredLoadPlan stored(String platform, String id) {
        return database.read(handle -> loadPlans.find(handle, platform, id))
                .orElseThrow(() -> Refusal.notFound("Platform " + platform + " has no load plan " + id + "."));
    }
}
