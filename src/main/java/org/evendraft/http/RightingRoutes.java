package org.evendraft.http;

import java.util.List;
import java.util.OptionalDouble;
import org.evendraft.platform.Json;
import org.evendraft.service.ComputeRighting;
import org.evendraft.service.ControlRoom;
import org.evendraft.service.JudgeStability;
import org.evendraft.service.Reply;

/** Curves of righting arms, the wind, and the criteria of the intact platform. */
final class RightingRoutes {
    private final ComputeRighting compute;
    private final JudgeStability judge;
    private final Writes writes;

    RightingRoutes(ControlRoom room, Writes writes) {
        this.compute = room.computeRighting();
        this.judge = room.judgeStability();
        this.writes = writes;
    }

    List<Route> routes() {
        return List.of(
                Route.post(PlatformRoutes.PLATFORM + "/righting", this::rightingOfDocument),
                Route.get(ConditionRoutes.CONDITION + "/righting", this::rightingOfStored),
                Route.post(PlatformRoutes.PLATFORM + "/wind", this::windOnDocument),
                Route.get(ConditionRoutes.CONDITION + "/wind", this::windOnStored),
                Route.post(PlatformRoutes.PLATFORM + "/criteria", this::criteriaOfDocument),
                Route.get(ConditionRoutes.CONDITION + "/criteria", this::criteriaOfStored));
    }

    private Answer rightingOfDocument(Request request) {
        StabilityQuery asked = StabilityQuery.aboutOneAxis(new Query(request.query()));
        String platform = request.variable("platform");
        return writes.read(
                request,
                () -> Reply.ok(compute.curve(platform, Json.parse(request.body()), asked.wind(), asked.curve())));
    }

    private Answer rightingOfStored(Request request) {
        Query query = new Query(request.query());
        StabilityQuery asked = StabilityQuery.aboutAnyAxis(query);
        String platform = request.variable("platform");
        String condition = request.variable("condition");
        return Answer.ok(
                query.hasAny("azimuth")
                        ? compute.ofStored(platform, condition, asked.wind(), asked.curve())
                        : compute.allAround(platform, condition, asked.wind(), asked.curve()));
    }

    private Answer windOnDocument(Request request) {
        StabilityQuery asked = StabilityQuery.aboutOneAxis(new Query(request.query()));
        String platform = request.variable("platform");
        return writes.read(
                request, () -> Reply.ok(judge.wind(platform, Json.parse(request.body()), asked.wind(), asked.curve())));
    }

    private Answer windOnStored(Request request) {
        StabilityQuery asked = StabilityQuery.aboutOneAxis(new Query(request.query()));
        return Answer.ok(judge.windOnStored(
                request.variable("platform"), request.variable("condition"), asked.wind(), asked.curve()));
    }

    private Answer criteriaOfDocument(Request request) {
        OptionalDouble wind = windAlone(request);
        String platform = request.variable("platform");
        return writes.read(request, () -> Reply.ok(judge.criteria(platform, Json.parse(request.body()), wind)));
    }

    private Answer criteriaOfStored(Request request) {
        OptionalDouble wind = windAlone(request);
        return Answer.ok(judge.criteriaOfStored(request.variable("platform"), request.variable("condition"), wind));
    }

    private static OptionalDouble windAlone(Request request) {
        Query query = new Query(request.query());
        OptionalDouble wind = StabilityQuery.wind(query);
        query.done();
        return wind;
    }
}
