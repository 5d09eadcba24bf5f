package org.evendraft.service;

import com.fasterxml.jackson.annotation.JsonUnwrapped;
import com.fasterxml.jackson.databind.JsonNode;
import java.time.Instant;
import java.util.List;
import org.evendraft.ballast.BallastPlanner;
import org.evendraft.ballast.Move;
import org.evendraft.ballast.Plan;
import org.evendraft.ballast.PlanRequest;
import org.evendraft.ballast.PlanRequestReader;
import org.evendraft.platform.Condition;
import org.evendraft.platform.ConditionReader;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.store.NewPlan;
import org.evendraft.store.PlanRepository;
import org.evendraft.store.StoredCondition;
import org.evendraft.store.StoredMove;
import org.evendraft.store.StoredPlan;
import org.jdbi.v3.core.Handle;

/** Makes a ballast plan from a stored condition and stores it. */
public final class MakePlan {
    private final PlatformShelf shelf;
    private final ReadConditions readConditions;
    private final PlanRepository plans;
    private final Provenance.Source source;

    MakePlan(PlatformShelf shelf, ReadConditions readConditions, PlanRepository plans, Provenance.Source source) {
        this.shelf = shelf;
        this.readConditions = readConditions;
        this.plans = plans;
        this.source = source;
    }

    /**
     * A plan and where it comes from, on one level of JSON.
     *
     * @param plan the plan, with its caution
     * @param platformRevision revision of the platform, 0 for one that is not stored
     * @param engineVersion version of the program
     * @param computedAt when it was made
     */
    public record TracedPlan(
            @JsonUnwrapped Plan plan, int platformRevision, String engineVersion, Instant computedAt) {}

    /**
     * A stored plan.
     *
     * @param id its id
     * @param condition id of the condition that it starts from
     * @param traced the plan
     */
    public record KeptPlan(
            String id, String condition, @JsonUnwrapped TracedPlan traced) {}

    /**
     * Makes a plan, for the revision of the platform that the condition was checked against.
     *
     * @throws Refusal when there is no such platform or condition
     * @throws FaultyDocumentException with all that is wrong with the request
     */
    public Pending<KeptPlan> prepare(String platform, String condition, JsonNode request) {
        StoredCondition stored = readConditions.stored(platform, condition);
        PlatformAtRevision at = shelf.at(platform, stored.platformRevision());
        Condition loading = ConditionReader.read(StoredJson.tree(stored.document()), at.prepared());
        TracedPlan plan = make(at, loading, request, source);
        return new Pending<>(handle -> store(handle, condition, request, plan));
    }

    /**
     * Makes a plan for a platform that need not be stored.
     *
     * @throws FaultyDocumentException with all that is wrong with the request
     */
    public static TracedPlan make(
            PlatformAtRevision platform, Condition condition, JsonNode request, Provenance.Source source) {
        PlanRequest wanted = PlanRequestReader.read(request, platform.prepared(), condition);
        Plan plan = BallastPlanner.plan(platform.prepared(), condition, wanted);
        Provenance from = source.of(platform.revision());
        return new TracedPlan(plan, from.platformRevision(), from.engineVersion(), from.computedAt());
    }

    private KeptPlan store(Handle handle, String condition, JsonNode request, TracedPlan traced) {
        Plan plan = traced.plan();
        List<StoredMove> moves = plan.moves().stream().map(MakePlan::stored).toList();
        StoredPlan stored = plans.save(
                handle,
                new NewPlan(
                        condition,
                        AnswerJson.text(request),
                        AnswerJson.text(traced),
                        plan.feasible(),
                        plan.cost(),
                        plan.pumpedMass(),
                        moves));
        return new KeptPlan(stored.id(), condition, traced);
    }

    private static StoredMove stored(Move move) {
        return new StoredMove(
                move.step(),
                move.from(),
                move.to(),
                move.mass(),
                move.volume(),
                move.pump(),
                move.startMinute(),
                move.endMinute());
    }
}
