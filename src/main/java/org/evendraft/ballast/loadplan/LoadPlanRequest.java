package org.evendraft.ballast.loadplan;

import java.util.List;
import org.evendraft.ballast.PlanRequest;
import org.evendraft.platform.Condition;
import org.evendraft.platform.PreparedPlatform;

/**
 * A sequence of events to be planned; {@link LoadPlanReader} makes it.
 *
 * @param name its name for people
 * @param prepared the platform
 * @param start how it is loaded at the start; it floats so
 * @param startPointer JSON pointer of what gave the start
 * @param wind the wind at the start
 * @param events the events in their order
 * @param ballast what ballast plans shall reach, and by which limits
 * @param ballasting when ballast is moved
 */
public record LoadPlanRequest(
        String name,
        PreparedPlatform prepared,
        Condition start,
        String startPointer,
        SteadyWind wind,
        List<PlannedEvent> events,
        PlanRequest ballast,
        Ballasting ballasting) {

    /** Copies the list. */
    public LoadPlanRequest {
        events = List.copyOf(events);
    }
}
