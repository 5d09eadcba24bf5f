package org.evendraft.http;

import java.util.List;
import org.evendraft.platform.Json;
import org.evendraft.service.ControlRoom;
import org.evendraft.service.EvaluateCondition;
import org.evendraft.service.ReadConditions;
import org.evendraft.service.Reply;
import org.evendraft.service.StoreCondition;
import org.evendraft.store.PageRequest;

/** Conditions and their results. */
final class ConditionRoutes {
    static final String CONDITIONS = PlatformRoutes.PLATFORM + "/conditions";
    static final String CONDITION = CONDITIONS + "/{condition}";

    private final EvaluateCondition evaluate;
    private final StoreCondition store;
    private final ReadConditions read;
    private final Writes writes;

    ConditionRoutes(ControlRoom room, Writes writes) {
        this.evaluate = room.evaluateCondition();
        this.store = room.storeCondition();
        this.read = room.readConditions();
        this.writes = writes;
    }

    List<Route> routes() {
        return List.of(
                Route.post(PlatformRoutes.PLATFORM + "/evaluate", this::evaluate),
                Route.post(CONDITIONS, this::add),
                Route.get(CONDITIONS, this::list),
                Route.get(CONDITION, this::one),
                Route.get(CONDITION + "/result", this::result));
    }

    private Answer evaluate(Request request) {
        new Query(request.query()).done();
        return writes.read(
                request, () -> Reply.ok(evaluate.evaluate(request.variable("platform"), Json.parse(request.body()))));
    }

    private Answer add(Request request) {
        new Query(request.query()).done();
        return writes.post(
                request,
                () -> store.prepare(request.variable("platform"), Json.parse(request.body()))
                        .then(kept -> Reply.created(request.path() + "/" + kept.id(), kept)));
    }

    private Answer list(Request request) {
        Query query = new Query(request.query());
        PageRequest page = query.page();
        query.done();
        return Answer.ok(read.page(request.variable("platform"), page));
    }

    private Answer one(Request request) {
        new Query(request.query()).done();
        return Answer.ok(read.read(request.variable("platform"), request.variable("condition")));
    }

    private Answer result(Request request) {
        new Query(request.query()).done();
        return Answer.ok(read.result(request.variable("platform"), request.variable("condition")));
    }
}
