package org.evendraft.ballast.loadplan;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.evendraft.ballast.BallastPlanner;
import org.evendraft.ballast.Plan;
import org.evendraft.ballast.PlanRequest;
import org.evendraft.ballast.PlanRequest.OperationLimits;
import org.evendraft.ballast.loadplan.LoadPlan.Ended;
import org.evendraft.platform.Condition;
import org.evendraft.platform.Json;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.stability.ConditionResult;

/** Follows the events of a sequence one after the other, as far as the platform floats. Used once, by one thread. */
final class Sequence {
    private final LoadPlanRequest request;
    private final PreparedPlatform prepared;
    private final boolean ballasted;
    private final List<EventOutcome> outcomes = new ArrayList<>();
    private Condition here;
    private SteadyWind wind;
    private Trial trial;
    private Optional<Ended> ended = Optional.empty();

    private Sequence(LoadPlanRequest request, Condition start, boolean ballasted) {
        this.request = request;
        this.prepared = request.prepared();
        this.ballasted = ballasted;
        this.here = start;
        this.wind = request.wind();
        this.trial = Trial.at(prepared, start, wind);
    }

    /**
     * Follows the sequence.
     *
     * @param start the loading to start from, with which the platform floats
     * @param ballasted whether ballast is planned for each event that needs it
     * @throws LostException when the platform finds no rest in the wind at the start
     */
    static Sequence follow(LoadPlanRequest request, Condition start, boolean ballasted) {
        Sequence sequence = new Sequence(request, start, ballasted);
        int number = 0;
        try {
            for (PlannedEvent planned : request.events()) {
                number++;
                sequence.step(number, planned);
            }
        } catch (LostException e) {
            sequence.ended = Optional.of(new Ended(number, e.reason()));
        }
        return sequence;
    }

    private void step(int number, PlannedEvent planned) {
        SteadyWind next = planned.event() instanceof WindChange change ? change.wind() : wind;
        Condition before = here;
        Optional<Plan> planBefore = ballasted ? planBefore(next, number, planned) : Optional.empty();
        Condition ready = pumped(before, planBefore);
        Passage passage = Passage.follow(prepared, ready, next, number, planned);
        Condition after = planned.event().at(ready, 1);
        ConditionResult calm = Position.calm(prepared, after);
        Position position = Position.of(prepared, after, calm, next);
        Optional<Plan> planAfter = ballasted && new Restoring(request.ballast()).needed(calm)
                ? Optional.of(plan(after))
                : Optional.empty();
        here = pumped(after, planAfter);
        wind = next;
        outcomes.add(new EventOutcome(
                number,
                Json.code(planned.event().word()),
                planned.event().subject(),
                planned.minute(),
                planBefore,
                passage.worst(),
                passage.broken(),
                position,
                planAfter,
                passage.broken().isEmpty() && position.limitsMet(),
                LoadingDocument.of(here)));
        trial = trial.and(passage, position);
    }

    private Condition pumped(Condition before, Optional<Plan> plan) {
        return plan.map(p -> Changes.pumped(prepared, before, p)).orElse(before);
    }

    private Plan plan(Condition from) {
        return BallastPlanner.plan(prepared, from, request.ballast());
    }

    /** A plan before an event that would break an operation limit as things are, where one makes that better. */
    private Optional<Plan> planBefore(SteadyWind next, int number, PlannedEvent planned) {
        Trial asItIs = tried(here, next, number, planned);
        if (asItIs.followed() > 0 && asItIs.misses() == 0) {
            return Optional.empty();
        }
        return new PreBallast(prepared, withLimits(planned.limits()), from -> tried(from, next, number, planned))
                .best(here, asItIs)
                .filter(found -> found.trial().saferThan(asItIs))
                .map(PreBallast.Found::plan);
    }

    private PlanRequest withLimits(OperationLimits limits) {
        return request.ballast().withOperationLimits(limits);
    }

    private Trial tried(Condition from, SteadyWind next, int number, PlannedEvent planned) {
        Trial start = Trial.at(prepared, from, wind);
        try {
            return start.and(Passage.follow(prepared, from, next, number, planned));
        } catch (LostException e) {
            return start;
        }
    }

    List<EventOutcome> outcomes() {
        return outcomes;
    }

    Optional<Ended> ended() {
        return ended;
    }

    /** What the sequence comes to, as far as it goes. */
    Trial trial() {
        return trial;
    }
}
