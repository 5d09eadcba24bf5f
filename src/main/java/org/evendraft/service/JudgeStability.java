package org.evendraft.service;

import com.fasterxml.jackson.annotation.JsonUnwrapped;
import com.fasterxml.jackson.databind.JsonNode;
import java.util.OptionalDouble;
import org.evendraft.platform.Condition;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.service.Loadings.Loading;
import org.evendraft.stability.CriteriaAnswer;
import org.evendraft.stability.RightingCurve;
import org.evendraft.stability.WindAnswer;
import org.evendraft.stability.WindSpeed;

/** Judges the intact platform about every axis, and tells of the wind on it. */
public final class JudgeStability {
    private final Loadings loadings;
    private final Provenance.Source source;

    JudgeStability(Loadings loadings, Provenance.Source source) {
        this.loadings = loadings;
        this.source = source;
    }

    /**
     * Criteria judged and where they come from, on one level of JSON.
     *
     * @param answer the criteria
     * @param provenance where they come from
     */
    public record TracedCriteria(
            @JsonUnwrapped CriteriaAnswer answer,
            @JsonUnwrapped Provenance provenance) {}

    /**
     * The wind on a platform and where the figures come from, on one level of JSON.
     *
     * @param answer the wind
     * @param provenance where the figures come from
     */
    public record TracedWind(
            @JsonUnwrapped WindAnswer answer, @JsonUnwrapped Provenance provenance) {}

    /**
     * The intact criteria of a condition of a stored platform.
     *
     * @param windSpeed wind in place of the mode's (m/s)
     * @throws Refusal when there is no such platform
     * @throws FaultyDocumentException with all that is wrong with the condition, when the platform sinks or capsizes, or when no wind is
     *     known
     */
    public TracedCriteria criteria(String platform, JsonNode document, OptionalDouble windSpeed) {
        return criteria(loadings.given(platform, document), windSpeed, source);
    }

    /**
     * The intact criteria of a stored condition, for the revision of the platform that it was checked against.
     *
     * @throws Refusal when there is no such platform or condition
     */
    public TracedCriteria criteriaOfStored(String platform, String condition, OptionalDouble windSpeed) {
        return criteria(loadings.stored(platform, condition), windSpeed, source);
    }

    /** The intact criteria of a condition of a platform that need not be stored. */
    public static TracedCriteria criteria(
            PlatformAtRevision platform, Condition condition, OptionalDouble windSpeed, Provenance.Source source) {
        return criteria(Loading.of(platform, condition), windSpeed, source);
    }

    private static TracedCriteria criteria(Loading loading, OptionalDouble windSpeed, Provenance.Source source) {
        speed(loading.condition(), windSpeed);
        CriteriaAnswer answer = CriteriaAnswer.of(
                loading.loaded(), loading.afloat(), loading.condition().mode(), windSpeed);
        return new TracedCriteria(answer, source.of(loading.platform().revision()));
    }

    /**
     * The wind on a platform in a condition.
     *
     * @throws Refusal when there is no such platform
     * @throws FaultyDocumentException with all that is wrong with the condition, when the platform sinks or capsizes, lists no windage, or
     *     when no wind is known
     */
    public TracedWind wind(
            String platform, JsonNode document, OptionalDouble windSpeed, RightingCurve.Request request) {
        return wind(loadings.given(platform, document), windSpeed, request, source);
    }

    /**
     * The wind on a platform in a stored condition, for the revision of the platform that it was checked against.
     *
     * @throws Refusal when there is no such platform or condition
     */
    public TracedWind windOnStored(
            String platform, String condition, OptionalDouble windSpeed, RightingCurve.Request request) {
        return wind(loadings.stored(platform, condition), windSpeed, request, source);
    }

    /** The wind on a platform that need not be stored. */
    public static TracedWind wind(
            PlatformAtRevision platform,
            Condition condition,
            OptionalDouble windSpeed,
            RightingCurve.Request request,
            Provenance.Source source) {
        return wind(Loading.of(platform, condition), windSpeed, request, source);
    }

    private static TracedWind wind(
            Loading loading, OptionalDouble windSpeed, RightingCurve.Request request, Provenance.Source source) {
        double speed = speed(loading.condition(), windSpeed);
        if (loading.platform().prepared().platform().windage().isEmpty()) {
            throw FaultyDocumentException.impossible(
                    "", "The platform lists no windage: there is nothing for the wind to blow on.");
        }
        WindAnswer answer = WindAnswer.of(loading.loaded(), loading.afloat(), speed, request);
        return new TracedWind(answer, source.of(loading.platform().revision()));
    }

    /** The wind that counts: the one asked for, else that of the condition's mode (m/s). */
    static double speed(Condition condition, OptionalDouble windSpeed) {
        OptionalDouble speed = WindSpeed.counted(windSpeed, condition.mode());
        return speed.orElseThrow(() -> FaultyDocumentException.impossible(
                "/mode",
                condition.mode().isEmpty()
                        ? "The condition names no mode of operation, so no wind speed is known; name one, or give wind."
                        : "The condition's mode gives no wind speed; give wind."));
    }
}
