package org.evendraft.ballast.loadplan;

import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.evendraft.ballast.Plan;
import org.evendraft.ballast.PlanRequest.Target;

/**
 * A load plan. Component names are those of the JSON answer.
 *
 * @param name its name for people
 * @param ballast when ballast is moved
 * @param target what ballast plans are to reach
 * @param feasible whether the platform floats to the end of the sequence and every ballast plan made meets its target
 * @param limitsKept whether every limit in force and every operation limit is kept, at the start, while each event lasts and after it
 * @param start the platform at the start
 * @param preBallast the one plan before the first event, where one was asked for and helps
 * @param events what comes of each event, as far as the platform floats
 * @param worst the worst instants of the whole sequence, pumping left out: each plan tells its own
 * @param worstWithoutBallast the worst without the plan before the first event, where there is one
 * @param ended where and why the sequence ends before its last event
 * @param warnings sentences on what deserves attention
 * @param caution what the plan must not be taken for
 */
public record LoadPlan(
        String name,
        Ballasting ballast,
        Target target,
        boolean feasible,
        boolean limitsKept,
        Start start,
        Optional<Plan> preBallast,
        List<EventOutcome> events,
        Worst worst,
        Optional<Worst> worstWithoutBallast,
        Optional<Ended> ended,
        List<String> warnings,
        String caution) {

    /** Copies the lists. */
    public LoadPlan {
        events = List.copyOf(events);
        warnings = List.copyOf(warnings);
    }

    /** The same with more sentences on what deserves attention, before its own. */
    public LoadPlan withWarnings(List<String> more) {
        return new LoadPlan(
                name,
                ballast,
                target,
                feasible,
                limitsKept,
                start,
                preBallast,
                events,
                worst,
                worstWithoutBallast,
                ended,
                Stream.concat(more.stream(), warnings.stream()).toList(),
                caution);
    }

    /**
     * The platform at the start.
     *
     * @param position where it lies, before any ballast is moved
     * @param loading how it is loaded when the one plan before the first event, if there is one, is done
     */
    public record Start(Position position, LoadingDocument loading) {}

    /**
     * The end of a sequence that cannot go on.
     *
     * @param event number of the event during which the platform would be lost; 0 for the wind at the start
     * @param reason why, in a sentence
     */
    public record Ended(int event, String reason) {}
}
