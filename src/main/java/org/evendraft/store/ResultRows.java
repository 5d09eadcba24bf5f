package org.evendraft.store;

import java.util.List;
import java.util.Map;
import org.evendraft.geometry.Vec3;
import org.evendraft.stability.ConditionResult;
import org.jdbi.v3.core.Handle;
import org.jdbi.v3.core.statement.PreparedBatch;
import org.jdbi.v3.core.statement.Update;

/** Writes the figures of a result as rows, so that they can be queried. */
final class ResultRows {
    private ResultRows() {}

    static void insert(Handle handle, String platformId, StoredResult stored, ConditionResult result) {
        insertFigures(handle, platformId, stored, result);
        insertTanks(handle, platformId, stored, result.tanks());
        insertMarks(handle, stored.id(), result.floating().marks());
        insertLimits(handle, stored.id(), result.limits());
        insertWarnings(handle, stored.id(), result.warnings());
    }

    private static void insertFigures(Handle handle, String platformId, StoredResult stored, ConditionResult result) {
        Update row = handle.createUpdate("""
                        INSERT INTO result (id, condition_id, computed_at, engine_version, platform_id, platform_revision, document,
                            mass, centre_x, centre_y, centre_z, even_keel_draft, km_transverse, km_longitudinal,
                            gm_transverse_solid, gm_transverse_free_surface, gm_transverse,
                            gm_longitudinal_solid, gm_longitudinal_free_surface, gm_longitudinal, gm_least, gm_least_azimuth,
                            estimated_heel, estimated_trim, draft, heel_angle, trim_angle, displaced_volume,
                            buoyancy_x, buoyancy_y, buoyancy_z, upright, stable)
                        VALUES (:id, :condition, :computedAt, :engine, :platform, :revision, :document,
                            :mass, :centreX, :centreY, :centreZ, :evenKeelDraft, :kmT, :kmL,
                            :gmTSolid, :gmTFreeSurface, :gmT,
                            :gmLSolid, :gmLFreeSurface, :gmL, :gmLeast, :gmLeastAzimuth,
                            :estimatedHeel, :estimatedTrim, :draft, :heel, :trim, :displacedVolume,
                            :buoyancyX, :buoyancyY, :buoyancyZ, :upright, :stable)""")
                .bind("id", stored.id())
                .bind("condition", stored.conditionId())
                .bind("computedAt", stored.computedAt())
                .bind("engine", stored.engineVersion())
                .bind("platform", platformId)
                .bind("revision", stored.platformRevision())
                .bind("document", stored.document());
        bindWeights(row, result);
        bindGm(row, result.gm());
        bindFloating(row, result.floating());
        row.execute();
    }

    private static void bindWeights(Update row, ConditionResult result) {
        Vec3 centre = result.centreOfGravity();
        row.bind("mass", result.mass())
                .bind("centreX", centre.x())
                .bind("centreY", centre.y())
                .bind("centreZ", centre.z())
                .bind("evenKeelDraft", result.evenKeelDraft())
                .bind("kmT", result.km().transverse())
                .bind("kmL", result.km().longitudinal())
                .bind("estimatedHeel", result.estimate().heelAngle())
                .bind("estimatedTrim", result.estimate().trimAngle());
    }

    private static void bindGm(Update row, ConditionResult.Gm gm) {
        row.bind("gmTSolid", gm.transverse().solid())
                .bind("gmTFreeSurface", gm.transverse().freeSurfaceCorrection())
                .bind("gmT", gm.transverse().corrected())
                .bind("gmLSolid", gm.longitudinal().solid())
                .bind("gmLFreeSurface", gm.longitudinal().freeSurfaceCorrection())
                .bind("gmL", gm.longitudinal().corrected())
                .bind("gmLeast", gm.least().corrected())
                .bind("gmLeastAzimuth", gm.least().azimuth());
    }

    private static void bindFloating(Update row, ConditionResult.Floating floating) {
        Vec3 buoyancy = floating.centreOfBuoyancy();
        row.bind("draft", floating.draft())
                .bind("heel", floating.heelAngle())
                .bind("trim", floating.trimAngle())
                .bind("displacedVolume", floating.displacedVolume())
                .bind("buoyancyX", buoyancy.x())
                .bind("buoyancyY", buoyancy.y())
                .bind("buoyancyZ", buoyancy.z())
                .bind("upright", floating.upright())
                .bind("stable", floating.stable());
    }

    private static void insertTanks(
            Handle handle, String platformId, StoredResult stored, List<ConditionResult.TankResult> tanks) {
        Batch.insert(
                handle,
                """
                INSERT INTO result_tank (result_id, ordinal, platform_id, platform_revision, tank_id, level, volume, mass,
                    fraction, state, x, y, z, free_surface_moment_t, free_surface_moment_l)
                VALUES (:result, :ordinal, :platform, :revision, :tank, :level, :volume, :mass,
                    :fraction, :state, :x, :y, :z, :momentT, :momentL)""",
                tanks,
                (row, tank) -> bindTank(
                        row.bind("result", stored.id())
                                .bind("platform", platformId)
                                .bind("revision", stored.platformRevision()),
                        tank));
    }

    private static void bindTank(PreparedBatch row, ConditionResult.TankResult tank) {
        row.bind("tank", tank.tank())
                .bind("level", tank.level())
                .bind("volume", tank.volume())
                .bind("mass", tank.mass())
                .bind("fraction", tank.fraction())
                .bind("state", tank.state().name())
                .bind("x", tank.centre().x())
                .bind("y", tank.centre().y())
                .bind("z", tank.centre().z())
                .bind("momentT", tank.freeSurfaceMomentT())
                .bind("momentL", tank.freeSurfaceMomentL());
    }

    private static void insertMarks(Handle handle, String resultId, Map<String, Double> marks) {
        Batch.insert(
                handle,
                "INSERT INTO result_mark (result_id, mark_id, reading) VALUES (:result, :mark, :reading)",
                List.copyOf(marks.entrySet()),
                (row, mark) ->
                        row.bind("result", resultId).bind("mark", mark.getKey()).bind("reading", mark.getValue()));
    }

    private static void insertLimits(Handle handle, String resultId, List<ConditionResult.LimitResult> limits) {
        Batch.insert(
                handle,
                """
                INSERT INTO result_limit (result_id, ordinal, limit_name, attained, bound, margin, met)
                VALUES (:result, :ordinal, :limit, :attained, :bound, :margin, :met)""",
                limits,
                (row, limit) -> row.bind("result", resultId)
                        .bind("limit", limit.limit())
                        .bind("attained", limit.value())
                        .bind("bound", limit.bound())
                        .bind("margin", limit.margin())
                        .bind("met", limit.met()));
    }

    private static void insertWarnings(Handle handle, String resultId, List<String> warnings) {
        Batch.insert(
                handle,
                "INSERT INTO result_warning (result_id, ordinal, sentence) VALUES (:result, :ordinal, :sentence)",
                warnings,
                (row, warning) -> row.bind("result", resultId).bind("sentence", warning));
    }
}
