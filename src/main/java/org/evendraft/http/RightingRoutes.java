package org.evendraft.http;

import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import org.evendraft.platform.Json;
import org.evendraft.service.ComputeRighting;
import org.evendraft.service.ControlRoom;
import org.evendraft.service.Reply;
import org.evendraft.stability.LiquidTreatment;
import org.evendraft.stability.RightingCurve;

/** Curves of righting arms. */
final class RightingRoutes {
    private final ComputeRighting compute;
    private final Writes writes;

    RightingRoutes(ControlRoom room, Writes writes) {
        this.compute = room.computeRighting();
        this.writes = writes;
    }

    List<Route> routes() {
        return List.of(
                Route.post(PlatformRoutes.PLATFORM + "/righting", this::ofDocument),
                Route.get(ConditionRoutes.CONDITION + "/righting", this::ofStored));
    }

    private Answer ofDocument(Request request) {
        Query query = new Query(request.query());
        RightingCurve.Request wanted = wanted(query, query.required("azimuth"));
        return writes.read(
                request,
                () -> Reply.ok(compute.curve(request.variable("platform"), Json.parse(request.body()), wanted)));
    }

    private Answer ofStored(Request request) {
        Query query = new Query(request.query());
        boolean one = query.hasAny("azimuth");
        RightingCurve.Request wanted = wanted(query, query.number("azimuth").orElse(0));
        String platform = request.variable("platform");
        String condition = request.variable("condition");
        return Answer.ok(
                one ? compute.ofStored(platform, condition, wanted) : compute.allAround(platform, condition, wanted));
    }

    private static RightingCurve.Request wanted(Query query, double azimuth) {
        double to = query.number("to").orElse(RightingCurve.Request.USUAL_ANGLE);
        double step = query.number("step").orElse(1);
        boolean freeTrim = oneOf(query, "trim", "free", "free", "fixed").equals("free");
        String treatment = oneOf(query, "liquids", "free", codes());
        LiquidTreatment liquids = Stream.of(LiquidTreatment.values())
                .filter(way -> Json.code(way).equals(treatment))
                .findFirst()
                .orElse(LiquidTreatment.FREE);
        query.done();
        return RightingCurve.Request.checked(azimuth, to, step, freeTrim, liquids);
    }

    private static String[] codes() {
        return Stream.of(LiquidTreatment.values()).map(Json::code).toArray(String[]::new);
    }

    private static String oneOf(Query query, String name, String otherwise, String... words) {
        String given = query.text(name).orElse(otherwise);
        if (!List.of(words).contains(given)) {
            query.fault(name, String.format(Locale.ROOT, "must be one of %s", String.join(", ", words)));
        }
        return given;
    }
}
