package org.evendraft.stability;

import java.util.List;
import java.util.Map;
import org.evendraft.geometry.Vec3;
import org.jspecify.annotations.Nullable;

/**
 * All that is computed of a condition. Component names are those of the JSON answer.
 *
 * @param mass mass afloat (t)
 * @param centreOfGravity centre of gravity, liquids as they lie on even keel (m)
 * @param evenKeelDraft draft at that mass without heel or trim (m)
 * @param km heights of the metacentres over the keel, on even keel (m)
 * @param gm metacentric heights on even keel (m)
 * @param estimate the trade's estimate of heel and trim
 * @param floating the exact floating position, liquids free
 * @param tanks every tank of the platform
 * @param limits every limit in force
 * @param warnings sentences on what deserves attention
 */
public record ConditionResult(
        double mass,
        Vec3 centreOfGravity,
        double evenKeelDraft,
        Directions km,
        Gm gm,
        Estimate estimate,
        Floating floating,
        List<TankResult> tanks,
        List<LimitResult> limits,
        List<String> warnings) {

    /**
     * A value for heeling and one for trimming.
     *
     * @param transverse about the longitudinal axis (m)
     * @param longitudinal about the transverse axis (m)
     */
    public record Directions(double transverse, double longitudinal) {}

    /**
     * Metacentric heights.
     *
     * @param transverse about the longitudinal axis
     * @param longitudinal about the transverse axis
     * @param least the least over all horizontal axes
     */
    public record Gm(GmFigures transverse, GmFigures longitudinal, LeastGm least) {}

    /**
     * A metacentric height and its correction.
     *
     * @param solid liquids taken as frozen (m)
     * @param freeSurfaceCorrection what free surfaces take off (m)
     * @param corrected solid less correction (m)
     */
    public record GmFigures(double solid, double freeSurfaceCorrection, double corrected) {}

    /**
     * The least corrected metacentric height.
     *
     * @param corrected its value (m)
     * @param azimuth direction of its axis, from x towards y, in [0, 180) (degrees)
     */
    public record LeastGm(double corrected, double azimuth) {}

    /**
     * The trade's estimate from corrected GM; null where that is not positive.
     *
     * @param heelAngle starboard down positive (degrees)
     * @param trimAngle bow down positive (degrees)
     */
    public record Estimate(
            @Nullable Double heelAngle, @Nullable Double trimAngle) {}

    /**
     * The exact floating position.
     *
     * @param draft at the origin (m)
     * @param heelAngle starboard down positive (degrees)
     * @param trimAngle bow down positive (degrees)
     * @param displacedVolume displaced volume (m³)
     * @param centreOfBuoyancy centre of buoyancy in platform axes (m)
     * @param marks reading of each draft mark (m)
     * @param upright whether the least corrected GM on even keel is positive
     * @param stable whether the potential energy has a minimum there
     */
    public record Floating(
            double draft,
            double heelAngle,
            double trimAngle,
            double displacedVolume,
            Vec3 centreOfBuoyancy,
            Map<String, Double> marks,
            boolean upright,
            boolean stable) {}

    /**
     * Contents of a tank, the platform upright.
     *
     * @param tank the tank's id
     * @param level level (m)
     * @param volume volume (m³)
     * @param mass mass (t)
     * @param fraction part of the full volume
     * @param state empty, slack or pressed up
     * @param centre centre of the liquid (m)
     * @param freeSurfaceMomentT transverse free-surface moment, 0 unless slack (t·m)
     * @param freeSurfaceMomentL longitudinal free-surface moment, 0 unless slack (t·m)
     */
    public record TankResult(
            String tank,
            double level,
            double volume,
            double mass,
            double fraction,
            TankState state,
            Vec3 centre,
            double freeSurfaceMomentT,
            double freeSurfaceMomentL) {}

    /**
     * A limit judged.
     *
     * @param limit its name
     * @param value what the condition has
     * @param bound what is allowed; null where the limit is not defined here
     * @param margin what is left, positive inside; null with the bound
     * @param met whether it is met
     */
    public record LimitResult(
            String limit,
            double value,
            @Nullable Double bound,
            @Nullable Double margin,
            boolean met) {}
}
