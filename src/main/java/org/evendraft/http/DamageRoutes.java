package org.evendraft.http;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.MissingNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.evendraft.platform.Json;
import org.evendraft.service.ControlRoom;
import org.evendraft.service.JudgeDamage;
import org.evendraft.service.JudgeDamage.Asked;
import org.evendraft.service.JudgeDamage.Cases;
import org.evendraft.service.Reply;

/** Platforms with spaces open to the sea. */
final class DamageRoutes {
    private static final String OF_STORED = ConditionRoutes.CONDITION + "/damage";

    private final JudgeDamage judge;
    private final Writes writes;

    DamageRoutes(ControlRoom room, Writes writes) {
        this.judge = room.judgeDamage();
        this.writes = writes;
    }

    List<Route> routes() {
        return List.of(
                Route.post(PlatformRoutes.PLATFORM + "/damage", this::ofDocument),
                Route.get(OF_STORED, this::ofStored),
                Route.post(OF_STORED, this::asJob).reading());
    }

    private Answer ofDocument(Request request) {
        Asked asked = asked(request);
        return writes.read(
                request, () -> Reply.ok(judge.survey(request.variable("platform"), Json.parse(request.body()), asked)));
    }

    private Answer ofStored(Request request) {
        Asked asked = asked(request);
        return Answer.ok(judge.ofStored(request.variable("platform"), request.variable("condition"), asked));
    }

    private Answer asJob(Request request) {
        Asked asked = asked(request);
        ObjectNode kept = Json.mapper().createObjectNode();
        kept.put("condition", request.variable("condition"));
        request.query().forEach((name, values) -> kept.put(name, values.get(0)));
        return writes.post(
                request,
                () -> judge.job(request.variable("platform"), request.variable("condition"), asked, kept)
                        .then(JobRoutes::accepted));
    }

    private static Asked asked(Request request) {
        Query query = new Query(request.query());
        OptionalDouble wind = StabilityQuery.wind(query);
        String[] words = Stream.of(Cases.values()).map(Json::code).toArray(String[]::new);
        String cases = StabilityQuery.oneOf(query, "cases", words[0], words);
        JsonNode own = own(query);
        if (!own.isMissingNode() && query.hasAny("cases")) {
            query.fault("cases", "cannot be given together with flooded");
        }
        query.done();
        Cases chosen = Stream.of(Cases.values())
                .filter(c -> Json.code(c).equals(cases))
                .findFirst()
                .orElse(Cases.LISTED);
        return new Asked(chosen, own, wind);
    }

    /** One case of its own: spaces named in the query, by commas. */
    private static JsonNode own(Query query) {
        String situation = StabilityQuery.oneOf(query, "situation", "collision", "collision", "flooding");
        if (!query.hasAny("flooded")) {
            if (query.hasAny("situation")) {
                query.fault("situation", "goes with flooded");
            }
            return MissingNode.getInstance();
        }
        ObjectNode own = Json.mapper().createObjectNode().put("id", "asked").put("situation", situation);
        ArrayNode flooded = own.putArray("flooded");
        query.text("flooded").ifPresent(list -> Stream.of(list.split(",", -1)).forEach(flooded::add));
        return own;
    }
}
