package org.evendraft.http;

import io.micrometer.prometheusmetrics.PrometheusMeterRegistry;
import java.util.List;
import java.util.stream.Stream;
import org.evendraft.service.ControlRoom;

/** All routes of the service. */
final class Routes {
    private Routes() {}

    static List<Route> of(ControlRoom room, PrometheusMeterRegistry meters) {
        Writes writes = new Writes(room.once());
        return Stream.of(
                        new ServiceRoutes(room.checkHealth(), meters).routes(),
                        new PlatformRoutes(room, writes).routes(),
                        new HydrostaticRoutes(room).routes(),
                        new TankRoutes(room, writes).routes(),
                        new TableRoutes(room, writes).routes(),
                        new ConditionRoutes(room, writes).routes(),
                        new RightingRoutes(room, writes).routes(),
                        new DamageRoutes(room, writes).routes(),
                        new KgRoutes(room, writes).routes(),
                        new PlanRoutes(room, writes).routes(),
                        new LoadPlanRoutes(room, writes).routes(),
                        new JobRoutes(room).routes())
                .flatMap(List::stream)
                .toList();
    }
}
