package org.evendraft.http;

import java.util.List;
import org.evendraft.platform.Json;
import org.evendraft.service.ControlRoom;
import org.evendraft.service.MakeLoadPlan;
import org.evendraft.service.ReadLoadPlans;
import org.evendraft.service.Reply;
import org.evendraft.store.PageRequest;

/** Load plans. */
final class LoadPlanRoutes {
    static final String LOAD_PLANS = PlatformRoutes.PLATFORM + "/load-plans";
    static final String LOAD_PLAN = LOAD_PLANS + "/{loadPlan}";

    private final MakeLoadPlan make;
    private final ReadLoadPlans read;
    private final Writes writes;

    LoadPlanRoutes(ControlRoom room, Writes writes) {
        this.make = room.makeLoadPlan();
        this.read = room.readLoadPlans();
        this.writes = writes;
    }

    List<Route> routes() {
        return List.of(
                Route.post(LOAD_PLANS, this::make),
                Route.get(LOAD_PLANS, this::list),
                Route.get(LOAD_PLAN, this::one),
                Route.post(LOAD_PLAN + "/resume", this::resume));
    }

    private Answer make(Request request) {
        new Query(request.query()).done();
        String platform = request.variable("platform");
        return writes.post(
                request,
                () -> make.prepare(platform, Json.parse(request.body())).then(kept -> created(platform, kept)));
    }

    private Answer resume(Request request) {
        new Query(request.query()).done();
        String platform = request.variable("platform");
        return writes.post(
                request,
                () -> make.resume(platform, request.variable("loadPlan"), Json.parse(request.body()))
                        .then(kept -> created(platform, kept)));
    }

    private static Reply created(String platform, MakeLoadPlan.KeptLoadPlan kept) {
        return Reply.created(LOAD_PLANS.replace("{platform}", platform) + "/" + kept.id(), kept);
    }

    private Answer list(Request request) {
        Query query = new Query(request.query());
        PageRequest page = query.page();
        query.done();
        return Answer.ok(read.page(request.variable("platform"), page));
    }

    private Answer one(Request request) {
        new Query(request.query()).done();
        return Answer.ok(read.read(request.variable("platform"), request.variable("loadPlan")));
    }
}
