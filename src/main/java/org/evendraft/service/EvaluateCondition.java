package org.evendraft.service;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.List;
import java.util.stream.Stream;
import org.evendraft.platform.Condition;
import org.evendraft.platform.ConditionReader;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.stability.ConditionResult;
import org.evendraft.stability.Evaluation;

/** Evaluates a condition and stores nothing. */
public final class EvaluateCondition {
    private final PlatformShelf shelf;
    private final LatestFills latestFills;
    private final Provenance.Source source;

    EvaluateCondition(PlatformShelf shelf, LatestFills latestFills, Provenance.Source source) {
        this.shelf = shelf;
        this.latestFills = latestFills;
        this.source = source;
    }

    /**
     * A condition with its result.
     *
     * @param platform the platform
     * @param document the condition's document, with the fills that were used
     * @param condition the condition
     * @param evaluated its result
     */
    record Outcome(PlatformAtRevision platform, JsonNode document, Condition condition, EvaluatedCondition evaluated) {}

    /**
     * The result of a condition of a stored platform.
     *
     * @param document the condition; {@code "fills": "latest"} takes the tanks' latest readings
     * @throws Refusal when there is no such platform
     * @throws FaultyDocumentException with all that is wrong with the condition
     */
    public EvaluatedCondition evaluate(String platform, JsonNode document) {
        return outcome(platform, document).evaluated();
    }

    Outcome outcome(String platform, JsonNode document) {
        PlatformAtRevision current = shelf.current(platform);
        LatestFills.Filled filled = latestFills.fill(current, document);
        Condition condition = ConditionReader.read(filled.document(), current.prepared());
        EvaluatedCondition evaluated = evaluate(current, condition, source);
        return new Outcome(current, filled.document(), condition, withWarnings(evaluated, filled.warnings()));
    }

    /**
     * The result of a condition of a platform that need not be stored.
     *
     * @throws FaultyDocumentException when the platform would sink or capsize
     */
    public static EvaluatedCondition evaluate(
            PlatformAtRevision platform, Condition condition, Provenance.Source source) {
        ConditionResult result = Evaluation.evaluate(platform.prepared(), condition);
        return new EvaluatedCondition(result, source.of(platform.revision()));
    }

    private static EvaluatedCondition withWarnings(EvaluatedCondition evaluated, List<String> more) {
        ConditionResult r = evaluated.result();
        List<String> warnings =
                Stream.concat(r.warnings().stream(), more.stream()).toList();
        ConditionResult told = new ConditionResult(
                r.mass(),
                r.centreOfGravity(),
                r.evenKeelDraft(),
                r.km(),
                r.gm(),
                r.estimate(),
                r.floating(),
                r.tanks(),
                r.limits(),
                warnings);
        return new EvaluatedCondition(told, evaluated.provenance());
    }
}
