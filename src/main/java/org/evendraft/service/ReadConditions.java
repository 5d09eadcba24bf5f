package org.evendraft.service;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.time.Instant;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import org.evendraft.platform.Json;
import org.evendraft.store.ConditionRepository;
import org.evendraft.store.ConditionSummary;
import org.evendraft.store.Database;
import org.evendraft.store.Page;
import org.evendraft.store.PageRequest;
import org.evendraft.store.StoredCondition;

/** Reads and lists stored conditions and their results. */
public final class ReadConditions {
    private final Database database;
    private final PlatformShelf shelf;
    private final ConditionRepository conditions;

    ReadConditions(Database database, PlatformShelf shelf, ConditionRepository conditions) {
        this.database = database;
        this.shelf = shelf;
        this.conditions = conditions;
    }

    /**
     * A stored condition. Component names are those of the JSON.
     *
     * @param id its id
     * @param platform the platform's id
     * @param platformRevision the revision it was checked against
     * @param createdAt when it was stored
     * @param condition its document
     */
    public record ConditionFile(
            String id, String platform, int platformRevision, Instant createdAt, JsonNode condition) {}

    /**
     * Part of the list of a platform's conditions. Component names are those of the JSON.
     *
     * @param conditions the conditions, newest first
     * @param total how many there are in all
     * @param limit the most that were asked for
     * @param offset how many were passed over
     */
    public record ConditionPage(List<ConditionSummary> conditions, long total, int limit, long offset) {

        /** Copies the list. */
        public ConditionPage {
            conditions = List.copyOf(conditions);
        }
    }

    /**
     * A page of the conditions of a platform.
     *
     * @throws Refusal when there is no such platform
     */
    public ConditionPage page(String platform, PageRequest request) {
        shelf.stored(platform, OptionalInt.empty());
        Page<ConditionSummary> page = database.read(handle -> conditions.page(handle, platform, request));
        return new ConditionPage(page.items(), page.total(), request.limit(), request.offset());
    }

    /**
     * A condition.
     *
     * @throws Refusal when there is none
     */
    public ConditionFile read(String platform, String id) {
        StoredCondition stored = stored(platform, id);
        return new ConditionFile(
                stored.id(),
                stored.platformId(),
                stored.platformRevision(),
                stored.createdAt(),
                StoredJson.tree(stored.document()));
    }

    StoredCondition stored(String platform, String id) {
        return find(platform, id)
                .orElseThrow(() -> Refusal.notFound("Platform " + platform + " has no condition " + id + "."));
    }

    Optional<StoredCondition> find(String platform, String id) {
        return database.read(handle -> conditions.find(handle, platform, id));
    }

    /**
     * The latest result of a condition, with the condition's id.
     *
     * @throws Refusal when there is no such condition
     */
    public JsonNode result(String platform, String id) {
        stored(platform, id);
        String result = database.read(handle -> conditions.latestResult(handle, id))
                .orElseThrow(() -> Refusal.notFound("Condition " + id + " has no result."))
                .document();
        ObjectNode answer = Json.mapper().createObjectNode().put("id", id);
        return answer.setAll((ObjectNode) StoredJson.tree(result));
    }
}
