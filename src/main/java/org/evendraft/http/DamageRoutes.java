package org.evendraft.http;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.evendraft.platform.Json;
import org.evendraft.platform.Situation;
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
        Cases cases = query.choice("cases", EnumSet.allOf(Cases.class), Cases.LISTED);
        Situation situation =
                query.choice("situation", EnumSet.of(Situation.COLLISION, Situation.FLOODING), Situation.COLLISION);
        Optional<String> flooded = query.text("flooded");
        if (flooded.isPresent() && query.hasAny("cases")) {
            query.fault("cases", "cannot be given together with flooded");
        }
        if (flooded.isEmpty() && query.hasAny("situation")) {
            query.fault("situation", "goes with flooded");
        }
        query.done();
        return flooded.map(spaces -> Asked.flooded(List.of(spaces.split(",", -1)), situation, wind))
                .orElseGet(() -> Asked.cases(cases, wind));
    }
}
