package org.evendraft.service;

import com.fasterxml.jackson.annotation.JsonUnwrapped;
import com.fasterxml.jackson.databind.JsonNode;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.store.ConditionRepository;
import org.evendraft.store.NewCondition;
import org.evendraft.store.NewResult;
import org.jdbi.v3.core.Handle;

/** Evaluates a condition and stores it with its result. */
public final class StoreCondition {
    private final EvaluateCondition evaluate;
    private final ConditionRepository conditions;

    StoreCondition(EvaluateCondition evaluate, ConditionRepository conditions) {
        this.evaluate = evaluate;
        this.conditions = conditions;
    }

    /**
     * A stored condition's result.
     *
     * @param id the condition's id
     * @param evaluated its result
     */
    public record KeptCondition(String id, @JsonUnwrapped EvaluatedCondition evaluated) {}

    /**
     * Evaluates a condition of a stored platform.
     *
     * @param document the condition; {@code "fills": "latest"} takes the tanks' latest readings, which are then stored in its place
     * @throws Refusal when there is no such platform
     * @throws FaultyDocumentException with all that is wrong with the condition
     */
    public Pending<KeptCondition> prepare(String platform, JsonNode document) {
        EvaluateCondition.Outcome outcome = evaluate.outcome(platform, document);
        return new Pending<>(handle -> store(handle, outcome));
    }

    private KeptCondition store(Handle handle, EvaluateCondition.Outcome outcome) {
        EvaluatedCondition evaluated = outcome.evaluated();
        Provenance from = evaluated.provenance();
        String id = conditions
                .save(
                        handle,
                        new NewCondition(
                                outcome.platform().id(),
                                from.platformRevision(),
                                outcome.condition(),
                                AnswerJson.text(outcome.document())),
                        new NewResult(
                                evaluated.result(),
                                AnswerJson.text(evaluated),
                                from.computedAt(),
                                from.engineVersion(),
                                from.platformRevision()))
                .id();
        return new KeptCondition(id, evaluated);
    }
}
