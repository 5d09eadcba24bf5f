package org.evendraft.service;

import com.fasterxml.jackson.databind.JsonNode;
import org.evendraft.platform.Condition;
import org.evendraft.platform.ConditionReader;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.stability.Equilibrium.Afloat;
import org.evendraft.stability.Evaluation;
import org.evendraft.stability.LoadedPlatform;
import org.evendraft.store.StoredCondition;

/** Finds the loading that a question is about: that of a stored condition, or one that comes with the question. */
final class Loadings {
    private final PlatformShelf shelf;
    private final EvaluateCondition evaluate;
    private final ReadConditions readConditions;

    Loadings(PlatformShelf shelf, EvaluateCondition evaluate, ReadConditions readConditions) {
        this.shelf = shelf;
        this.evaluate = evaluate;
        this.readConditions = readConditions;
    }

    /**
     * A loading of a platform that floats.
     *
     * @param platform the platform
     * @param condition the condition
     * @param loaded the platform so loaded
     * @param afloat where it floats
     */
    record Loading(PlatformAtRevision platform, Condition condition, LoadedPlatform loaded, Afloat afloat) {
        /**
         * Puts a platform and a condition together.
         *
         * @throws FaultyDocumentException when the platform sinks or capsizes
         */
        static Loading of(PlatformAtRevision platform, Condition condition) {
            LoadedPlatform loaded = LoadedPlatform.of(platform.prepared(), condition);
            return new Loading(platform, condition, loaded, Evaluation.afloat(loaded));
        }
    }

    /**
     * The loading of a stored condition, for the revision of the platform that it was checked against.
     *
     * @throws Refusal when there is no such platform or condition
     */
    Loading stored(String platform, String condition) {
        StoredCondition stored = readConditions.stored(platform, condition);
        PlatformAtRevision at = shelf.at(platform, stored.platformRevision());
        return Loading.of(at, ConditionReader.read(StoredJson.tree(stored.document()), at.prepared()));
    }

    /**
     * The loading that a document describes, for the current revision of the platform.
     *
     * @throws Refusal when there is no such platform
     * @throws FaultyDocumentException with all that is wrong with the condition, or when the platform sinks or capsizes
     */
    Loading given(String platform, JsonNode document) {
        EvaluateCondition.Outcome outcome = evaluate.outcome(platform, document);
        return Loading.of(outcome.platform(), outcome.condition());
    }
}
