package org.evendraft.service;

import com.fasterxml.jackson.annotation.JsonUnwrapped;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.time.Instant;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.evendraft.ballast.Plan;
import org.evendraft.ballast.loadplan.EventOutcome;
import org.evendraft.ballast.loadplan.LoadPlan;
import org.evendraft.ballast.loadplan.LoadPlanReader;
import org.evendraft.ballast.loadplan.LoadPlanner;
import org.evendraft.platform.Condition;
import org.evendraft.platform.ConditionReader;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.store.LoadPlanRepository;
import org.evendraft.store.NewLoadPlan;
import org.evendraft.store.Resumption;
import org.evendraft.store.StoredCondition;
import org.evendraft.store.StoredEvent;
import org.evendraft.store.StoredLoadPlan;
import org.jdbi.v3.core.Handle;

/** Makes load plans and stores them, from a loading or from where an earlier one has come to. */
public final class MakeLoadPlan {
    private final PlatformShelf shelf;
    private final ReadConditions readConditions;
    private final ReadLoadPlans readLoadPlans;
    private final LatestFills latestFills;
    private final LoadPlanRepository loadPlans;
    private final Provenance.Source source;

    MakeLoadPlan(
            PlatformShelf shelf,
            ReadConditions readConditions,
            ReadLoadPlans readLoadPlans,
            LatestFills latestFills,
            LoadPlanRepository loadPlans,
            Provenance.Source source) {
        this.shelf = shelf;
        this.readConditions = readConditions;
        this.readLoadPlans = readLoadPlans;
        this.latestFills = latestFills;
        this.loadPlans = loadPlans;
        this.source = source;
    }

    /**
     * A load plan and where it comes from, on one level of JSON.
     *
     * @param plan the load plan, with its caution
     * @param platformRevision revision of the platform, 0 for one that is not stored
     * @param engineVersion version of the program
     * @param computedAt when it was made
     */
    public record TracedLoadPlan(
            @JsonUnwrapped LoadPlan plan, int platformRevision, String engineVersion, Instant computedAt) {}

    /**
     * A stored load plan.
     *
     * @param id its id
     * @param condition id of the stored condition that it starts from, if it names one
     * @param resumption where it goes on from, if it does
     * @param traced the load plan
     */
    public record KeptLoadPlan(
            String id,
            Optional<String> condition,
            Optional<Resumption> resumption,
            @JsonUnwrapped TracedLoadPlan traced) {}

    /**
     * What a load plan is made from.
     *
     * @param at the platform
     * @param request the request, with the fills that are used
     * @param condition the stored condition that it names
     * @param resumption where it goes on from
     * @param warnings sentences on the fills
     */
    private record Basis(
            PlatformAtRevision at,
            JsonNode request,
            Optional<StoredCondition> condition,
            Optional<Resumption> resumption,
            List<String> warnings) {}

    /**
     * Makes a load plan, for the revision of the platform that its stored condition was checked against, else for the current one.
     *
     * @throws Refusal when there is no such platform
     * @throws FaultyDocumentException with all that is wrong with the request
     */
    public Pending<KeptLoadPlan> prepare(String platform, JsonNode request) {
        Optional<StoredCondition> stored = Optional.ofNullable(
                        request.path("condition").textValue())
                .flatMap(id -> readConditions.find(platform, id));
        PlatformAtRevision at = stored.map(condition -> shelf.at(platform, condition.platformRevision()))
                .orElseGet(() -> shelf.current(platform));
        LatestFills.Filled start = latestFills.fill(at, request.path("start"));
        JsonNode filled = request;
        if (request instanceof ObjectNode object && request.has("start")) {
            filled = object.deepCopy().set("start", start.document());
        }
        return prepared(new Basis(at, filled, stored, Optional.empty(), start.warnings()));
    }

    /**
     * Plans the rest of a load plan anew, from where it has come to.
     *
     * @param document after which event, and what the tanks then hold
     * @throws Refusal when there is no such load plan
     * @throws FaultyDocumentException with all that is wrong with the document
     */
    public Pending<KeptLoadPlan> resume(String platform, String id, JsonNode document) {
        StoredLoadPlan stored = readLoadPlans.stored(platform, id);
        PlatformAtRevision at = shelf.at(platform, stored.plan().platformRevision());
        LatestFills.Filled filled = latestFills.fill(at, document, "taken as planned");
        RestOfLoadPlan rest = RestOfLoadPlan.read(filled.document(), stored, at.prepared());
        Resumption from = new Resumption(id, rest.afterEvent());
        Basis basis = new Basis(at, rest.request(), Optional.empty(), Optional.of(from), filled.warnings());
        return rest.inItsTerms(() -> prepared(basis));
    }

    private Pending<KeptLoadPlan> prepared(Basis basis) {
        Optional<Condition> condition = basis.condition()
                .map(c -> ConditionReader.read(
                        StoredJson.tree(c.document()), basis.at().prepared()));
        TracedLoadPlan traced = made(basis.at(), basis.request(), condition, source, basis.warnings());
        return new Pending<>(handle -> store(handle, basis, traced));
    }

    /**
     * Makes a load plan for a platform that need not be stored; its start comes with the request.
     *
     * @throws FaultyDocumentException with all that is wrong with the request
     */
    public static TracedLoadPlan make(PlatformAtRevision platform, JsonNode request, Provenance.Source source) {
        return made(platform, request, Optional.empty(), source, List.of());
    }

    private static TracedLoadPlan made(
            PlatformAtRevision platform,
            JsonNode request,
            Optional<Condition> condition,
            Provenance.Source source,
            List<String> warnings) {
        LoadPlan plan = LoadPlanner.plan(LoadPlanReader.read(request, platform.prepared(), condition));
        Provenance from = source.of(platform.revision());
        return new TracedLoadPlan(
                plan.withWarnings(warnings), from.platformRevision(), from.engineVersion(), from.computedAt());
    }

    private KeptLoadPlan store(Handle handle, Basis basis, TracedLoadPlan traced) {
        LoadPlan plan = traced.plan();
        Optional<String> condition = basis.condition().map(StoredCondition::id);
        String id = loadPlans
                .save(
                        handle,
                        new NewLoadPlan(
                                basis.at().id(),
                                basis.at().revision(),
                                plan.name(),
                                condition,
                                basis.resumption(),
                                AnswerJson.text(basis.request()),
                                AnswerJson.text(traced),
                                plan.feasible(),
                                plan.limitsKept(),
                                plan.events().stream().map(MakeLoadPlan::stored).toList()))
                .id();
        return new KeptLoadPlan(id, condition, basis.resumption(), traced);
    }

    private static StoredEvent stored(EventOutcome outcome) {
        double pumped = Stream.of(outcome.planBefore(), outcome.planAfter())
                .flatMap(Optional::stream)
                .mapToDouble(Plan::pumpedMass)
                .sum();
        return new StoredEvent(
                outcome.number(),
                outcome.event(),
                outcome.subject(),
                outcome.minute(),
                new StoredEvent.After(
                        outcome.position().mass(),
                        outcome.position().draft(),
                        outcome.position().heelAngle(),
                        outcome.position().trimAngle(),
                        outcome.position().gm().transverse().corrected(),
                        outcome.position().gm().longitudinal().corrected()),
                new StoredEvent.WorstFigures(
                        outcome.worst().heelAngle().heelAngle(),
                        outcome.worst().trimAngle().trimAngle(),
                        outcome.worst().gmLeast().gmLeast()),
                outcome.limitsKept(),
                pumped);
    }
}
