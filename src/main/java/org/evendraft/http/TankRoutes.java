package org.evendraft.http;

import java.util.List;
import java.util.Optional;
import org.evendraft.platform.Json;
import org.evendraft.service.ControlRoom;
import org.evendraft.service.ReadSoundings;
import org.evendraft.service.ReadTankStates;
import org.evendraft.service.RecordSoundings;
import org.evendraft.service.Reply;
import org.evendraft.store.PageRequest;
import org.evendraft.store.SoundingQuery;

/** Tanks, what they hold, and the readings that tell it. */
final class TankRoutes {
    static final String TANKS = PlatformRoutes.PLATFORM + "/tanks";
    static final String TANK = TANKS + "/{tank}";
    static final String SOUNDINGS = PlatformRoutes.PLATFORM + "/soundings";

    private final ReadTankStates states;
    private final RecordSoundings record;
    private final ReadSoundings history;
    private final Writes writes;

    TankRoutes(ControlRoom room, Writes writes) {
        this.states = room.readTankStates();
        this.record = room.recordSoundings();
        this.history = room.readSoundings();
        this.writes = writes;
    }

    List<Route> routes() {
        return List.of(
                Route.get(TANKS, this::all),
                Route.get(TANK, this::one),
                Route.post(SOUNDINGS, this::record),
                Route.get(SOUNDINGS, this::history));
    }

    private Answer all(Request request) {
        new Query(request.query()).done();
        return Answer.ok(states.all(request.variable("platform")));
    }

    private Answer one(Request request) {
        new Query(request.query()).done();
        return Answer.ok(states.one(request.variable("platform"), request.variable("tank")));
    }

    private Answer record(Request request) {
        new Query(request.query()).done();
        return writes.post(
                request,
                () -> record.prepare(request.variable("platform"), Json.parse(request.body()))
                        .then(batch -> Reply.created(request.path(), batch)));
    }

    private Answer history(Request request) {
        Query query = new Query(request.query());
        SoundingQuery wanted = new SoundingQuery(
                request.variable("platform"),
                Optional.of("tank").flatMap(query::text),
                query.instant("from"),
                query.instant("to"));
        PageRequest page = query.page();
        query.done();
        return Answer.ok(history.history(wanted, page));
    }
}
