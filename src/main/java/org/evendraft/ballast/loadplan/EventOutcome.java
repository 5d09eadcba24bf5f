package org.evendraft.ballast.loadplan;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.evendraft.ballast.Plan;

/**
 * What comes of an event. Component names are those of the JSON answer.
 *
 * @param number its number, from 1
 * @param event the word for it
 * @param subject the load's name or the tank's id; empty for the wind
 * @param minute when, where the request says so (min)
 * @param planBefore the ballast plan carried out before it
 * @param worst its worst instants
 * @param broken operation limits that it breaks while it lasts
 * @param position where the platform lies after it, before the plan after it
 * @param planAfter the ballast plan carried out after it
 * @param limitsKept whether it breaks no operation limit and ends inside every limit in force
 * @param loading how the platform is loaded when the event and its plans are done
 */
public record EventOutcome(
        int number,
        String event,
        Optional<String> subject,
        OptionalDouble minute,
        Optional<Plan> planBefore,
        Worst worst,
        List<Breach> broken,
        Position position,
        Optional<Plan> planAfter,
        boolean limitsKept,
        LoadingDocument loading) {

    /** Copies the list. */
    public EventOutcome {
        broken = List.copyOf(broken);
    }

    /** Whether each plan made meets its target. */
    boolean plansFeasible() {
        return planBefore.map(Plan::feasible).orElse(true)
                && planAfter.map(Plan::feasible).orElse(true);
    }
}
