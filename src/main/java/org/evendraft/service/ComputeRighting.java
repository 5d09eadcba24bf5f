package org.evendraft.service;

import com.fasterxml.jackson.annotation.JsonUnwrapped;
import com.fasterxml.jackson.databind.JsonNode;
import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.IntStream;
import org.evendraft.platform.Condition;
import org.evendraft.platform.FaultyDocumentException;
import org.evendraft.service.Loadings.Loading;
import org.evendraft.stability.AxisAnswer;
import org.evendraft.stability.RightingCurve;

/** Computes curves of righting arms, with the wind, the openings and the criteria judged by them. */
public final class ComputeRighting {
    /** Between the axes of {@link #allAround} (degrees). */
    private static final int AZIMUTH_STEP = 10;

    private final Loadings loadings;
    private final Provenance.Source source;

    ComputeRighting(Loadings loadings, Provenance.Source source) {
        this.loadings = loadings;
        this.source = source;
    }

    /**
     * A curve and where it comes from, on one level of JSON.
     *
     * @param answer the curve and what is judged by it
     * @param provenance where it comes from
     */
    public record TracedCurve(
            @JsonUnwrapped AxisAnswer answer, @JsonUnwrapped Provenance provenance) {}

    /**
     * Curves about axes all around. Component names are those of the JSON.
     *
     * @param curves one for each axis
     * @param provenance where they come from
     */
    public record TracedCurves(
            List<AxisAnswer> curves, @JsonUnwrapped Provenance provenance) {

        /** Copies the list. */
        public TracedCurves {
            curves = List.copyOf(curves);
        }
    }

    /**
     * The curve of a condition of a stored platform.
     *
     * @param windSpeed wind in place of the mode's (m/s)
     * @throws Refusal when there is no such platform
     * @throws FaultyDocumentException with all that is wrong with the condition, or when the platform sinks or capsizes
     */
    public TracedCurve curve(
            String platform, JsonNode document, OptionalDouble windSpeed, RightingCurve.Request request) {
        return curve(loadings.given(platform, document), windSpeed, request, source);
    }

    /**
     * The curve of a stored condition, for the revision of the platform that it was checked against.
     *
     * @throws Refusal when there is no such platform or condition
     */
    public TracedCurve ofStored(
            String platform, String condition, OptionalDouble windSpeed, RightingCurve.Request request) {
        return curve(loadings.stored(platform, condition), windSpeed, request, source);
    }

    /**
     * The curves of a stored condition about axes every ten degrees.
     *
     * @param like what each curve shall be, but for its azimuth
     * @throws Refusal when there is no such platform or condition
     */
    public TracedCurves allAround(
            String platform, String condition, OptionalDouble windSpeed, RightingCurve.Request like) {
        Loading loading = loadings.stored(platform, condition);
        List<AxisAnswer> curves = IntStream.range(0, 360 / AZIMUTH_STEP)
                .parallel()
                .mapToObj(i -> answer(loading, windSpeed, like.about(i * (double) AZIMUTH_STEP)))
                .toList();
        return new TracedCurves(curves, source.of(loading.platform().revision()));
    }

    /**
     * The curve of a condition of a platform that need not be stored.
     *
     * @throws FaultyDocumentException when the platform sinks or capsizes
     */
    public static TracedCurve curve(
            PlatformAtRevision platform,
            Condition condition,
            OptionalDouble windSpeed,
            RightingCurve.Request request,
            Provenance.Source source) {
        return curve(Loading.of(platform, condition), windSpeed, request, source);
    }

    private static TracedCurve curve(
            Loading loading, OptionalDouble windSpeed, RightingCurve.Request request, Provenance.Source source) {
        return new TracedCurve(
                answer(loading, windSpeed, request),
                source.of(loading.platform().revision()));
    }

    private static AxisAnswer answer(Loading loading, OptionalDouble windSpeed, RightingCurve.Request request) {
        return AxisAnswer.of(
                loading.loaded(), loading.afloat(), loading.condition().mode(), windSpeed, request);
    }
}
