package org.evendraft.http;

import java.util.List;
import org.evendraft.platform.Json;
import org.evendraft.service.ControlRoom;
import org.evendraft.service.MakePlan;
import org.evendraft.service.ReadPlans;
import org.evendraft.service.Reply;

/** Ballast plans. */
final class PlanRoutes {
    static final String PLANS = ConditionRoutes.CONDITION + "/plans";

    private final MakePlan make;
    private final ReadPlans read;
    private final Writes writes;

    PlanRoutes(ControlRoom room, Writes writes) {
        this.make = room.makePlan();
        this.read = room.readPlans();
        this.writes = writes;
    }

    List<Route> routes() {
        return List.of(
                Route.post(PLANS, this::make), Route.get(PLANS, this::list), Route.get(PLANS + "/{plan}", this::one));
    }

    private Answer make(Request request) {
        new Query(request.query()).done();
        String platform = request.variable("platform");
        String condition = request.variable("condition");
        return writes.post(
                request,
                () -> make.prepare(platform, condition, Json.parse(request.body()))
                        .then(kept -> Reply.created(request.path() + "/" + kept.id(), kept)));
    }

    private Answer list(Request request) {
        new Query(request.query()).done();
        return Answer.ok(read.list(request.variable("platform"), request.variable("condition")));
    }

    private Answer one(Request request) {
        new Query(request.query()).done();
        return Answer.ok(
                read.read(request.variable("platform"), request.variable("condition"), request.variable("plan")));
    }
}
