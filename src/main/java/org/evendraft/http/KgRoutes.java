package org.evendraft.http;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.List;
import java.util.OptionalInt;
import org.evendraft.platform.Json;
import org.evendraft.service.ComputeAllowableKg;
import org.evendraft.service.ControlRoom;
import org.evendraft.service.ReadPlatforms;

/** Curves of the greatest KG: computed as jobs, stored as those of modes. */
final class KgRoutes {
    private static final String OF_MODE = PlatformRoutes.PLATFORM + "/modes/{mode}/allowable-kg";

    private final ComputeAllowableKg compute;
    private final ReadPlatforms platforms;
    private final Writes writes;

    KgRoutes(ControlRoom room, Writes writes) {
        this.compute = room.computeAllowableKg();
        this.platforms = room.readPlatforms();
        this.writes = writes;
    }

    List<Route> routes() {
        return List.of(
                Route.post(PlatformRoutes.PLATFORM + "/allowable-kg", this::compute),
                Route.put(OF_MODE, this::replace));
    }

    private Answer compute(Request request) {
        new Query(request.query()).done();
        return writes.post(
                request,
                () -> compute.prepare(request.variable("platform"), Json.parse(request.body()))
                        .then(JobRoutes::accepted));
    }

    private Answer replace(Request request) {
        new Query(request.query()).done();
        String platform = request.variable("platform");
        JsonNode curve = Json.parse(request.body());
        return writes.put(() -> {
            OptionalInt expected = Tags.expected(request, platforms, platform);
            return compute.replace(platform, request.variable("mode"), curve, expected)
                    .then(PlatformRoutes::reply);
        });
    }
}
