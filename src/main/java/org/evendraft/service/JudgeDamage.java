package org.evendraft.service;

import com.fasterxml.jackson.annotation.JsonUnwrapped;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.MissingNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.OptionalDouble;
import org.evendraft.platform.Condition;
import org.evendraft.platform.DamageCase;
import org.evendraft.platform.DamageCaseReader;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.platform.Json;
import org.evendraft.platform.Load;
import org.evendraft.platform.Mode;
import org.evendraft.platform.Platform;
import org.evendraft.platform.PreparedPlatform;
import org.evendraft.platform.Situation;
import org.evendraft.service.Loadings.Loading;
import org.evendraft.stability.DamageSurvey;
import org.evendraft.stability.DamageSurvey.Question;
import org.evendraft.stability.Progress;
import org.evendraft.stability.WindSpeed;
import org.evendraft.stability.damage.DamageExtents;
import org.evendraft.stability.damage.GeneratedCases;
import org.evendraft.store.NewJob;
import org.evendraft.store.StoredJob;

/** Judges platforms with spaces open to the sea. */
public final class JudgeDamage {
    private final Loadings loadings;
    private final Jobs jobs;
    private final Provenance.Source source;

    JudgeDamage(Loadings loadings, Jobs jobs, Provenance.Source source) {
        this.loadings = loadings;
        this.jobs = jobs;
        this.source = source;
    }

    /** Which cases are judged. */
    public enum Cases {
        /** Those that the platform's document lists. */
        LISTED,
        /** Those of the Code's extents of damage at the drafts of the condition's mode. */
        COLLISION,
        /** Flooding of any one space that lies wholly or partly under the water. */
        FLOODING
    }

    /**
     * What is asked.
     *
     * @param cases which cases
     * @param own one case in their place, as the platform's document would list it; a missing node for none
     * @param windSpeed wind speed for criteria that give none of their own, in place of the mode's (m/s)
     */
    public record Asked(Cases cases, JsonNode own, OptionalDouble windSpeed) {

        /** Cases of a kind. */
        public static Asked cases(Cases cases, OptionalDouble windSpeed) {
            return new Asked(cases, MissingNode.getInstance(), windSpeed);
        }

        /**
         * One case of its own.
         *
         * @param flooded ids of the spaces open to the sea, as yet unchecked
         */
        public static Asked flooded(List<String> flooded, Situation situation, OptionalDouble windSpeed) {
            ObjectNode own = Json.mapper().createObjectNode();
            own.put("id", "asked").put("situation", Json.code(situation));
            flooded.forEach(own.putArray("flooded")::add);
            return new Asked(Cases.LISTED, own, windSpeed);
        }
    }

    /**
     * Damage cases judged and where the figures come from, on one level of JSON.
     *
     * @param survey the cases
     * @param provenance where the figures come from
     */
    public record TracedSurvey(
            @JsonUnwrapped DamageSurvey survey,
            @JsonUnwrapped Provenance provenance) {}

    /**
     * Judges a platform in a condition.
     *
     * @throws Refusal when there is no such platform
     * @throws FaultyDocumentException with all that is wrong, or when the intact platform sinks or capsizes
     */
    public TracedSurvey survey(String platform, JsonNode document, Asked asked) {
        return survey(loadings.given(platform, document), asked, Progress.UNWATCHED, source);
    }

    /**
     * Judges a platform in a stored condition, for the revision of the platform that it was checked against.
     *
     * @throws Refusal when there is no such platform or condition
     * @throws FaultyDocumentException with all that is wrong
     */
    public TracedSurvey ofStored(String platform, String condition, Asked asked) {
        return survey(loadings.stored(platform, condition), asked, Progress.UNWATCHED, source);
    }

    /**
     * The same as a job, for many cases.
     *
     * @param request the question in words of JSON, kept with the job
     * @throws Refusal when there is no such platform or condition
     * @throws FaultyDocumentException with all that is wrong
     */
    public Pending<StoredJob> job(String platform, String condition, Asked asked, JsonNode request) {
        Loading loading = loadings.stored(platform, condition);
        question(loading, asked);
        return jobs.prepare(
                new NewJob("damage", platform, loading.platform().revision(), AnswerJson.text(request)),
                progress -> survey(loading, asked, progress, source));
    }

    /**
     * Judges a platform that need not be stored.
     *
     * @param progress is told of the work
     */
    public static TracedSurvey survey(
            PlatformAtRevision platform,
            Condition condition,
            Asked asked,
            Progress progress,
            Provenance.Source source) {
        return survey(Loading.of(platform, condition), asked, progress, source);
    }

    private static TracedSurvey survey(Loading loading, Asked asked, Progress progress, Provenance.Source source) {
        OptionalDouble wind =
                WindSpeed.counted(asked.windSpeed(), loading.condition().mode());
        DamageSurvey survey = DamageSurvey.of(loading.loaded(), question(loading, asked), wind, progress);
        return new TracedSurvey(survey, source.of(loading.platform().revision()));
    }

    private static Question question(Loading loading, Asked asked) {
        List<String> notes = new ArrayList<>();
        loading.platform().prepared().warnings().stream()
                .filter(warning -> warning.contains(" overlap"))
                .forEach(warning -> notes.add(warning + "; flooded together they lose that buoyancy twice."));
        if (loading.condition().loads().stream().anyMatch(load -> load.kind() == Load.Kind.LINE)) {
            notes.add(
                    "The condition's loads of kind line stay; for the platform free of its moorings judge a condition without them.");
        }
        return cases(loading, asked).and(new Question(List.of(), List.of(), notes));
    }

    private static Question cases(Loading loading, Asked asked) {
        PreparedPlatform prepared = loading.platform().prepared();
        if (!asked.own().isMissingNode()) {
            DamageCase own = DamageCaseReader.read(asked.own(), prepared.platform());
            return new Question(List.of(own), List.of("asked for"), List.of());
        }
        return switch (asked.cases()) {
            case LISTED -> listed(prepared.platform());
            case COLLISION -> collision(prepared, loading.condition());
            case FLOODING -> flooding(prepared, loading.loaded().evenKeel().draft());
        };
    }

    /** The cases that the platform's document lists. */
    static Question listed(Platform platform) {
        List<DamageCase> cases = platform.damageCases();
        List<String> notes = cases.isEmpty() ? List.of("The platform's document lists no damage cases.") : List.of();
        return new Question(cases, Collections.nCopies(cases.size(), "listed in the platform's document"), notes);
    }

    private static Question collision(PreparedPlatform prepared, Condition condition) {
        Mode mode = condition
                .mode()
                .orElseThrow(
                        () -> FaultyDocumentException.impossible(
                                "/mode",
                                "The condition names no mode of operation, and the extent of damage goes by the drafts of a mode."));
        return collision(prepared, mode);
    }

    /** The cases of the Code's extents of damage. */
    static Question collision(PreparedPlatform prepared, Mode mode) {
        return question(DamageExtents.collisionCases(prepared, mode));
    }

    /** Flooding of any one space that lies wholly or partly under the water at a draft (m). */
    static Question flooding(PreparedPlatform prepared, double draft) {
        return question(DamageExtents.floodingCases(prepared, draft));
    }

    private static Question question(GeneratedCases generated) {
        return new Question(generated.cases(), generated.reasons(), generated.notes());
    }
}
