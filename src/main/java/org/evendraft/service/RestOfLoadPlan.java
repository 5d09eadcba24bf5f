package org.evendraft.service;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.Supplier;
import org.evendraft.platform.Condition;
import org.evendraft.platform.ConditionReader;
import org.evendraft.platform.Fault;
import org.evendraft.platform.Faults;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.platform.Fields;
import org.evendraft.platform.Fill;
import org.evendraft.platform.Json;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.platform.Range;
import org.evendraft.store.StoredLoadPlan;

/**
 * What is left of a load plan after one of its events, as a request of its own: it starts from the loading that the plan came to, with the tanks
 * as they were sounded, in the wind of that event, and keeps the plan's target.
 *
 * @param afterEvent number of the event that was done last, 0 for none
 * @param sounded whether the tanks were sounded
 * @param request the request
 */
record RestOfLoadPlan(int afterEvent, boolean sounded, ObjectNode request) {
    private static final String AFTER = "afterEvent";
    private static final String EVENTS = "events";
    private static final String FILLS = "fills";
    private static final List<String> KEPT =
            List.of("objective", "operationLimits", "lockedTanks", "pumpsOutOfService", "ballast");

    /**
     * Reads after which event a load plan goes on.
     *
     * @param document {@code {"afterEvent", "fills", "name"}}: tanks that the fills do not name hold what the plan came to
     * @throws FaultyDocumentException with all faults
     */
    static RestOfLoadPlan read(JsonNode document, StoredLoadPlan stored, PreparedPlatform prepared) {
        JsonNode plan = StoredJson.tree(stored.plan().planJson());
        JsonNode asked = StoredJson.tree(stored.plan().requestJson());
        Faults faults = new Faults();
        Fields fields = Fields.of(document, "", faults);
        int after = after(fields, plan.path(EVENTS).size(), asked.path(EVENTS).size());
        String name = fields.text("name", stored.plan().name());
        List<Fill> fills = fills(fields, prepared);
        fields.noOthers();
        faults.throwIfAny();
        return new RestOfLoadPlan(after, fields.has(FILLS), request(name, after, plan, asked, fills));
    }

    private static int after(Fields fields, int followed, int events) {
        double after = fields.number(AFTER, new Range(0, false, events));
        if (after != Math.rint(after) && !Double.isNaN(after)) {
            fields.meaning(AFTER, "afterEvent must be the number of an event, not " + after);
        } else if (after == events) {
            fields.meaning(AFTER, "no event is left after event " + events);
        } else if (after > followed) {
            fields.meaning(AFTER, "the load plan comes no further than event " + followed);
        }
        return (int) after;
    }

    private static List<Fill> fills(Fields fields, PreparedPlatform prepared) {
        if (!fields.has(FILLS)) {
            return List.of();
        }
        ObjectNode document = Json.mapper().createObjectNode();
        fields.value(FILLS).ifPresent(given -> document.set(FILLS, given));
        try {
            Condition condition = ConditionReader.read(document, prepared);
            return condition.fills();
        } catch (FaultyDocumentException e) {
            for (Fault fault : e.faults()) {
                if (fault.kind() == Fault.Kind.FORM) {
                    fields.faults().form(fault.pointer(), fault.detail());
                } else {
                    fields.faults().meaning(fault.pointer(), fault.detail());
                }
            }
            return List.of();
        }
    }

    private static ObjectNode request(String name, int after, JsonNode plan, JsonNode asked, List<Fill> fills) {
        JsonNode reached = after == 0 ? plan.path("start") : plan.path(EVENTS).path(after - 1);
        ObjectNode next = Json.mapper().createObjectNode().put("name", name);
        next.set("start", sounded(reached.path("loading"), fills));
        next.set("wind", reached.path("position").path("wind"));
        next.set("target", plan.path("target"));
        KEPT.stream().filter(asked::has).forEach(property -> next.set(property, asked.path(property)));
        ArrayNode events = next.putArray(EVENTS);
        for (int i = after; i < asked.path(EVENTS).size(); i++) {
            events.add(asked.path(EVENTS).path(i));
        }
        return next;
    }

    private static ObjectNode sounded(JsonNode loading, List<Fill> fills) {
        ObjectNode start = loading.deepCopy();
        Map<String, JsonNode> byTank = new LinkedHashMap<>();
        loading.path(FILLS).forEach(fill -> byTank.put(fill.path("tank").asText(), fill));
        fills.forEach(fill -> byTank.put(
                fill.tank(),
                Json.mapper()
                        .createObjectNode()
                        .put("tank", fill.tank())
                        .put("volume", fill.volume())
                        .put("density", fill.density())));
        start.putArray(FILLS).addAll(byTank.values());
        return start;
    }

    /** Does something with the request, and tells faults where the document that asked for it can mend them. */
    <T> T inItsTerms(Supplier<T> work) {
        try {
            return work.get();
        } catch (FaultyDocumentException e) {
            String pointer = "/" + (sounded ? FILLS : AFTER);
            throw new FaultyDocumentException(e.faults().stream()
                    .map(fault -> new Fault(
                            pointer, "the rest of the plan, " + fault.pointer() + ": " + fault.detail(), fault.kind()))
                    .toList());
        }
    }
}
