package org.evendraft.stability;

import com.fasterxml.jackson.annotation.JsonUnwrapped;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.evendraft.platform.Criterion;
import org.evendraft.platform.Mode;
import org.evendraft.platform.Platform;
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
        OptionalDouble wind = WindSpeed.counted(windSpeed, mode);
        RightingArms upright = RightingArms.fromUpright(loaded, request);
        RightingArms judged = RightingArms.fromRest(loaded, request.forCriteria(), Slopes.of(afloat.waterplane()));
        StabilityRules rules = loaded.prepared().platform().stabilityRules();
        return new AxisAnswer(
                upright.curve(request),
                wind.isPresent() ? windCurve(loaded, upright, judged, wind.getAsDouble()) : null,
                HeelStates.settled(() -> openings(loaded, afloat, judged)),
                rules.rules(),
                rules.assumed(),
                criteria(loaded, mode, wind, judged, request));
    }

    /**
     * The wind that heels about the axis of two curves.
     *
     * @param upright from upright on: its nodes are the points
     * @param judged from the platform's rest on: there the intercepts are found
     */
    static WindCurve windCurve(LoadedPlatform loaded, RightingArms upright, RightingArms judged, double speed) {
        Platform platform = loaded.prepared().platform();
        List<WindPoint> points = HeelStates.settled(() -> upright.exists()
                ? upright.points().stream()
                        .map(point -> point(new AxisStability(upright, platform), point, speed))
                        .toList()
                : List.of());
        return HeelStates.settled(() -> {
            Optional<AxisStability> axis =
                    judged.exists() ? Optional.of(new AxisStability(judged, platform)) : Optional.empty();
            return new WindCurve(
                    speed,
                    points,
                    axis.map(a -> degrees(a.rest(speed))).orElse(null),
                    axis.map(a -> degrees(a.secondIntercept(speed))).orElse(null));
        });
    }

    private static WindPoint point(AxisStability axis, RightingPoint point, double speed) {
        WindForce force = axis.force(axis.arms().at(Math.toRadians(point.angle())), speed);
        return new WindPoint(point.angle(), force.force(), force.moment(), force.arm());
    }

    private static @Nullable Double degrees(OptionalDouble angleRad) {
        return angleRad.isPresent() ? Double.valueOf(Math.toDegrees(angleRad.getAsDouble())) : null;
    }

    private static List<OpeningImmersion> openings(LoadedPlatform loaded, Afloat afloat, RightingArms judged) {
        Platform platform = loaded.prepared().platform();
        Optional<AxisStability> axis =
                judged.exists() ? Optional.of(new AxisStability(judged, platform)) : Optional.empty();
        return platform.openings().stream()
                .map(opening -> new OpeningImmersion(
                        opening.id(),
                        opening.closing(),
                        afloat.waterplane().freeboard(opening.position()),
                        axis.map(a -> degrees(a.immersion(opening))).orElse(null)))
                .toList();
    }

    private static List<CriterionResult> criteria(
            LoadedPlatform loaded,
            Optional<Mode> mode,
            OptionalDouble wind,
            RightingArms judged,
            RightingCurve.Request request) {
        Platform platform = loaded.prepared().platform();
        List<CriterionResult> results = new ArrayList<>(IntactStability.metacentric(
                platform.stabilityRules(), mode, loaded.evenKeel().gm()));
        List<Criterion> byAxis = platform.stabilityRules().byAxis(Situation.INTACT);
        List<Finding> findings = AxisJudge.findings(byAxis, judged, platform, wind);
        for (int i = 0; i < findings.size(); i++) {
            Criterion criterion = byAxis.get(i);
            results.add(findings.get(i).result(criterion, null, request.azimuth(), AxisJudge.wind(criterion, wind)));
        }
        return results;
    }
}
