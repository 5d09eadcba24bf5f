package org.evendraft.stability;

import com.fasterxml.jackson.annotation.JsonUnwrapped;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.IntStream;
import org.evendraft.platform.Criterion;
import org.evendraft.platform.Criterion.Measure;
import org.evendraft.platform.Mode;
import org.evendraft.platform.Situation;
import org.evendraft.platform.StabilityRules;
import org.evendraft.stability.Equilibrium.Afloat;
import org.evendraft.stability.WindCurve.WindPoint;
import org.jspecify.annotations.Nullable;

/**
 * A curve of righting arms with all that is judged by it. Component names are those of the JSON answer.
 *
 * @param curve the curve
 * @param wind the wind that heels about the axis; null where no speed is known
 * @param openings every opening of the platform
 * @param rules name of the rules that the criteria start from
 * @param rulesAssumed whether the platform names none and these were taken for want of better
 * @param criteria the intact criteria about this axis; the worst axis may be another
 */
public record AxisAnswer(
        @JsonUnwrapped RightingCurve curve,
        @Nullable WindCurve wind,
        List<OpeningImmersion> openings,
        String rules,
        boolean rulesAssumed,
        List<CriterionResult> criteria) {

    /** Copies the lists. */
    public AxisAnswer {
        openings = List.copyOf(openings);
        criteria = List.copyOf(criteria);
    }

    /**
     * The answer for a loaded platform about one axis.
     *
     * @param afloat where it floats
     * @param mode the mode in force, whose wind and least GM count
     * @param windSpeed wind in place of the mode's (m/s)
     */
    public static AxisAnswer of(
            LoadedPlatform loaded,
            Afloat afloat,
            Optional<Mode> mode,
            OptionalDouble windSpeed,
            RightingCurve.Request request) {
        OptionalDouble wind = IntactStability.wind(mode, windSpeed);
        RightingArms arms = new RightingArms(loaded, request);
        return RightingArms.settled(() -> of(loaded, afloat, mode, wind, request, arms));
    }

    private static AxisAnswer of(
            LoadedPlatform loaded,
            Afloat afloat,
            Optional<Mode> mode,
            OptionalDouble wind,
            RightingCurve.Request request,
            RightingArms arms) {
        Optional<AxisStability> axis = arms.exists()
                ? Optional.of(new AxisStability(arms, loaded.prepared().platform()))
                : Optional.empty();
        StabilityRules rules = loaded.prepared().platform().stabilityRules();
        return new AxisAnswer(
                arms.curve(request),
                axis.isPresent() && wind.isPresent() ? windCurve(axis.get(), wind.getAsDouble()) : null,
                openings(loaded, afloat, axis),
                rules.rules(),
                rules.assumed(),
                criteria(loaded, afloat, mode, wind, request));
    }

    /** The wind at the nodes of the curve. */
    static WindCurve windCurve(AxisStability axis, double speed) {
        RightingArms arms = axis.arms();
        int last = (int) Math.round(arms.endRad() / arms.stepRad());
        List<WindPoint> points = IntStream.rangeClosed(0, last)
                .mapToObj(i -> {
                    double angle = i * arms.stepRad();
                    WindForce force = axis.force(arms.at(angle), speed);
                    return new WindPoint(Math.toDegrees(angle), force.force(), force.moment(), force.arm());
                })
                .toList();
        return new WindCurve(speed, points, degrees(axis.rest(speed)), degrees(axis.secondIntercept(speed)));
    }

    private static @Nullable Double degrees(OptionalDouble angleRad) {
        return angleRad.isPresent() ? Double.valueOf(Math.toDegrees(angleRad.getAsDouble())) : null;
    }

    private static List<OpeningImmersion> openings(LoadedPlatform loaded, Afloat afloat, Optional<AxisStability> axis) {
        return loaded.prepared().platform().openings().stream()
                .map(opening -> new OpeningImmersion(
                        opening.id(),
                        opening.closing(),
                        afloat.waterplane().freeboard(opening.position()),
                        axis.map(a -> degrees(a.immersion(opening))).orElse(null)))
                .toList();
    }

    private static List<CriterionResult> criteria(
            LoadedPlatform loaded,
            Afloat afloat,
            Optional<Mode> mode,
            OptionalDouble wind,
            RightingCurve.Request request) {
        StabilityRules rules = loaded.prepared().platform().stabilityRules();
        List<CriterionResult> results = new ArrayList<>(
                IntactStability.metacentric(rules, mode, loaded.evenKeel().gm()));
        List<Criterion> byAxis = rules.of(Situation.INTACT).stream()
                .filter(c -> c.measure() != Measure.LEAST_GM)
                .toList();
        List<Finding> findings =
                new AllAround(loaded, Slopes.of(afloat.waterplane()), wind).findings(byAxis, request.forCriteria());
        for (int i = 0; i < findings.size(); i++) {
            Criterion criterion = byAxis.get(i);
            results.add(findings.get(i).result(criterion, null, request.azimuth(), AxisJudge.wind(criterion, wind)));
        }
        return results;
    }
}
