package org.evendraft.service;

import com.fasterxml.jackson.annotation.JsonUnwrapped;
import com.fasterxml.jackson.databind.JsonNode;
import java.util.List;
import java.util.stream.IntStream;
import org.evendraft.platform.Condition;
import org.evendraft.platform.ConditionReader;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.stability.Evaluation;
import org.evendraft.stability.LoadedPlatform;
import org.evendraft.stability.RightingArms;
import org.evendraft.stability.RightingCurve;
import org.evendraft.store.StoredCondition;

/** Computes curves of righting arms. */
public final class ComputeRighting {
    /** Between the axes of {@link #allAround} (degrees). */
    private static final int AZIMUTH_STEP = 10;

    private final PlatformShelf shelf;
    private final EvaluateCondition evaluate;
    private final ReadConditions readConditions;
    private final Provenance.Source source;

    ComputeRighting(
            PlatformShelf shelf, EvaluateCondition evaluate, ReadConditions readConditions, Provenance.Source source) {
        this.shelf = shelf;
        this.evaluate = evaluate;
        this.readConditions = readConditions;
        this.source = source;
    }

    /**
     * A curve and where it comes from, on one level of JSON.
     *
     * @param curve the curve
     * @param provenance where it comes from
     */
    public record TracedCurve(
            @JsonUnwrapped RightingCurve curve,
            @JsonUnwrapped Provenance provenance) {}

    /**
     * Curves about axes all around. Component names are those of the JSON.
     *
     * @param curves one for each axis
     * @param provenance where they come from
     */
    public record TracedCurves(
            List<RightingCurve> curves, @JsonUnwrapped Provenance provenance) {

        /** Copies the list. */
        public TracedCurves {
            curves = List.copyOf(curves);
        }
    }

    /**
     * The curve of a condition of a stored platform.
     *
     * @throws Refusal when there is no such platform
     * @throws FaultyDocumentException with all that is wrong with the condition, or when the platform sinks or capsizes
     */
    public TracedCurve curve(String platform, JsonNode document, RightingCurve.Request request) {
        EvaluateCondition.Outcome outcome = evaluate.outcome(platform, document);
        return curve(outcome.platform(), outcome.condition(), request, source);
    }

    /**
     * The curve of a stored condition, for the revision of the platform that it was checked against.
     *
     * @throws Refusal when there is no such platform or condition
     */
    public TracedCurve ofStored(String platform, String condition, RightingCurve.Request request) {
        StoredCondition stored = readConditions.stored(platform, condition);
        PlatformAtRevision at = shelf.at(platform, stored.platformRevision());
        return curve(at, loading(stored, at), request, source);
    }

    /**
     * The curves of a stored condition about axes every ten degrees.
     *
     * @param like what each curve shall be, but for its azimuth
     * @throws Refusal when there is no such platform or condition
     */
    public TracedCurves allAround(String platform, String condition, RightingCurve.Request like) {
        StoredCondition stored = readConditions.stored(platform, condition);
        PlatformAtRevision at = shelf.at(platform, stored.platformRevision());
        LoadedPlatform loaded = floating(at, loading(stored, at));
        List<RightingCurve> curves = IntStream.range(0, 360 / AZIMUTH_STEP)
                .parallel()
                .mapToObj(i -> RightingArms.curve(loaded, like.about(i * (double) AZIMUTH_STEP)))
                .toList();
        return new TracedCurves(curves, source.of(at.revision()));
    }

    private static Condition loading(StoredCondition stored, PlatformAtRevision at) {
        return ConditionReader.read(StoredJson.tree(stored.document()), at.prepared());
    }

    /**
     * The curve of a condition of a platform that need not be stored.
     *
     * @throws FaultyDocumentException when the platform sinks or capsizes
     */
    public static TracedCurve curve(
            PlatformAtRevision platform, Condition condition, RightingCurve.Request request, Provenance.Source source) {
        RightingCurve curve = RightingArms.curve(floating(platform, condition), request);
        return new TracedCurve(curve, source.of(platform.revision()));
    }

    private static LoadedPlatform floating(PlatformAtRevision platform, Condition condition) {
        LoadedPlatform loaded = LoadedPlatform.of(platform.prepared(), condition);
        Evaluation.afloat(loaded);
        return loaded;
    }
}
