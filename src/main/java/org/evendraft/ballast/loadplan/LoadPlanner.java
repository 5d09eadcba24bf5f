package org.evendraft.ballast.loadplan;

import java.util.Optional;
import java.util.stream.Stream;
import org.evendraft.ballast.Plan;
import org.evendraft.ballast.loadplan.LoadPlan.Start;
import org.evendraft.platform.Caution;
import org.evendraft.platform.Condition;
import org.evendraft.platform.Fault;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.platform.PreparedPlatform;

/** Makes load plans; see the package's description. Pure: the same question has the same plan. Safe from many threads. */
public final class LoadPlanner {
    private LoadPlanner() {}

    /**
     * Follows a sequence of events and plans the ballast that it needs. When the platform would sink or capsize, the plan ends there and
     * is not feasible.
     *
     * @throws FaultyDocumentException when a ballast tank that a plan may move holds something other than the condition's sea water
     */
    public static LoadPlan plan(LoadPlanRequest request) {
        try {
            return planned(request);
        } catch (FaultyDocumentException e) {
            throw new FaultyDocumentException(
                    e.faults().stream().map(fault -> ofStart(request, fault)).toList());
        }
    }

    /** A fault of the loading that plans start from, in terms of the request. */
    private static Fault ofStart(LoadPlanRequest request, Fault fault) {
        boolean given = request.startPointer().equals(LoadPlanReader.START);
        return new Fault(
                given ? request.startPointer() + fault.pointer() : request.startPointer(),
                fault.detail(),
                fault.kind());
    }

    private static LoadPlan planned(LoadPlanRequest request) {
        boolean each = request.ballasting() == Ballasting.EACH_EVENT;
        Sequence asItIs = Sequence.follow(request, request.start(), each);
        Optional<Plan> preBallast =
                request.ballasting() == Ballasting.ONCE ? preBallast(request, asItIs) : Optional.empty();
        PreparedPlatform prepared = request.prepared();
        Condition ready = preBallast
                .map(plan -> Changes.pumped(prepared, request.start(), plan))
                .orElse(request.start());
        Sequence followed = preBallast.isPresent() ? Sequence.follow(request, ready, false) : asItIs;
        Position position =
                Position.of(prepared, request.start(), Position.calm(prepared, request.start()), request.wind());
        return answer(request, new Start(position, LoadingDocument.of(ready)), preBallast, asItIs, followed);
    }

    private static Optional<Plan> preBallast(LoadPlanRequest request, Sequence asItIs) {
        return new PreBallast(
                        request.prepared(),
                        request.ballast(),
                        from -> Sequence.follow(request, from, false).trial())
                .best(request.start(), asItIs.trial())
                .map(PreBallast.Found::plan);
    }

    private static LoadPlan answer(
            LoadPlanRequest request, Start start, Optional<Plan> preBallast, Sequence asItIs, Sequence followed) {
        boolean plansFeasible = preBallast.map(Plan::feasible).orElse(true)
                && followed.outcomes().stream().allMatch(EventOutcome::plansFeasible);
        boolean toTheEnd = followed.ended().isEmpty();
        return new LoadPlan(
                request.name(),
                request.ballasting(),
                request.ballast().target(),
                toTheEnd && plansFeasible,
                toTheEnd
                        && start.position().limitsMet()
                        && followed.outcomes().stream().allMatch(EventOutcome::limitsKept),
                start,
                preBallast,
                followed.outcomes(),
                followed.trial().worst(),
                preBallast.map(plan -> asItIs.trial().worst()),
                followed.ended(),
                Stream.of(
                                Notes.onBallast(request, preBallast, followed.outcomes()),
                                Notes.onTime(request, preBallast, followed.outcomes()),
                                Notes.onLimits(followed.outcomes(), followed.ended()))
                        .flatMap(notes -> notes.stream())
                        .toList(),
                Caution.TEXT);
    }
}
