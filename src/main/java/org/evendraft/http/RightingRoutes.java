package org.evendraft.http;

import java.util.List;
import java.util.OptionalDouble;
import org.evendraft.platform.Json;
import org.evendraft.service.ComputeRighting;
import org.evendraft.service.ControlRoom;
import org.evendraft.service.JudgeStability;
import org.evendraft.service.Reply;
import org.evendraft.stability.RightingCurve;

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
        Query query = new Query(request.query());
        OptionalDouble wind = StabilityQuery.wind(query);
        RightingCurve.Request wanted = StabilityQuery.curve(query, query.required("azimuth"));
        return writes.read(
                request,
                () -> Reply.ok(compute.curve(request.variable("platform"), Json.parse(request.body()), wind, wanted)));
    }

    private Answer rightingOfStored(Request request) {
        Query query = new Query(request.query());
        boolean one = query.hasAny("azimuth");
        OptionalDouble wind = StabilityQuery.wind(query);
        RightingCurve.Request wanted =
                StabilityQuery.curve(query, query.number("azimuth").orElse(0));
        String platform = request.variable("platform");
        String condition = request.variable("condition");
        return Answer.ok(
                one
                        ? compute.ofStored(platform, condition, wind, wanted)
                        : compute.allAround(platform, condition, wind, wanted));
    }

    private Answer windOnDocument(Request request) {
        Query query = new Query(request.query());
        OptionalDouble wind = StabilityQuery.wind(query);
        RightingCurve.Request wanted = StabilityQuery.curve(query, query.required("azimuth"));
        return writes.read(
                request,
                () -> Reply.ok(judge.wind(request.variable("platform"), Json.parse(request.body()), wind, wanted)));
    }

    private Answer windOnStored(Request request) {
        Query query = new Query(request.query());
        OptionalDouble wind = StabilityQuery.wind(query);
        RightingCurve.Request wanted = StabilityQuery.curve(query, query.required("azimuth"));
        return Answer.ok(judge.windOnStored(request.variable("platform"), request.variable("condition"), wind, wanted));
    }

    private Answer criteriaOfDocument(Request request) {
        Query query = new Query(request.query());
        OptionalDouble wind = StabilityQuery.wind(query);
        query.done();
        return writes.read(
                request,
                () -> Reply.ok(judge.criteria(request.variable("platform"), Json.parse(request.body()), wind)));
    }

    private Answer criteriaOfStored(Request request) {
        Query query = new Query(request.query());
        OptionalDouble wind = StabilityQuery.wind(query);
        query.done();
        return Answer.ok(judge.criteriaOfStored(request.variable("platform"), request.variable("condition"), wind));
    }
}
