package org.evendraft.store;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.time.InstantSource;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Supplier;
import org.jdbi.v3.core.Handle;
import org.jdbi.v3.core.statement.PreparedBatch;

/** Keeps load plans; none is ever changed. Safe from many threads. */
public final class LoadPlanRepository {
    private final InstantSource clock;
    private final Supplier<String> ids;

    /**
     * @param clock tells when a load plan is stored
     * @param ids makes the id of a load plan, a UUID
     */
    public LoadPlanRepository(InstantSource clock, Supplier<String> ids) {
        this.clock = clock;
        this.ids = ids;
    }

    /** Stores a load plan. */
    public StoredLoadPlan save(Handle handle, NewLoadPlan plan) {
        StoredLoadPlan stored = new StoredLoadPlan(ids.get(), plan, InstantBinding.toMicros(clock.instant()));
        insertPlan(handle, stored);
        Batch.insert(handle, """
                INSERT INTO load_plan_event (load_plan_id, event_number, kind, subject, start_minute, mass, draft, heel_angle,
                    trim_angle, gm_transverse, gm_longitudinal, worst_heel, worst_trim, worst_gm, limits_kept, pumped_mass)
                VALUES (:plan, :number, :kind, :subject, :minute, :mass, :draft, :heel,
                    :trim, :gmT, :gmL, :worstHeel, :worstTrim, :worstGm, :limitsKept, :pumpedMass)""", plan.events(), (row, event) -> bindEvent(row.bind("plan", stored.id()), event));
        return stored;
    }

    private static void insertPlan(Handle handle, StoredLoadPlan stored) {
        NewLoadPlan plan = stored.plan();
        handle.createUpdate("""
                        INSERT INTO load_plan (id, platform_id, platform_revision, name, condition_id, resumed_from,
                            resumed_after, request, feasible, limits_kept, document, created_at)
                        VALUES (:id, :platform, :revision, :name, :condition, :resumedFrom,
                            :resumedAfter, :request, :feasible, :limitsKept, :document, :now)""")
                .bind("id", stored.id())
                .bind("platform", plan.platformId())
                .bind("revision", plan.platformRevision())
                .bind("name", plan.name())
                .bind("condition", plan.conditionId().orElse(null))
                .bind("resumedFrom", plan.resumption().map(Resumption::loadPlan).orElse(null))
                .bind(
                        "resumedAfter",
                        plan.resumption().map(Resumption::afterEvent).orElse(null))
                .bind("request", plan.requestJson())
                .bind("feasible", plan.feasible())
                .bind("limitsKept", plan.limitsKept())
                .bind("document", plan.planJson())
                .bind("now", stored.createdAt())
                .execute();
    }

    private static void bindEvent(PreparedBatch row, StoredEvent event) {
        row.bind("number", event.number())
                .bind("kind", event.kind())
                .bind("subject", event.subject().orElse(null))
                .bind("minute", event.minute())
                .bind("mass", event.after().mass())
                .bind("draft", event.after().draft())
                .bind("heel", event.after().heelAngle())
                .bind("trim", event.after().trimAngle())
                .bind("gmT", event.after().gmTransverse())
                .bind("gmL", event.after().gmLongitudinal())
                .bind("worstHeel", event.worst().heelAngle())
                .bind("worstTrim", event.worst().trimAngle())
                .bind("worstGm", event.worst().gmLeast())
                .bind("limitsKept", event.limitsKept())
                .bind("pumpedMass", event.pumpedMass());
    }

    /** A load plan of a platform. */
    public Optional<StoredLoadPlan> find(Handle handle, String platformId, String id) {
        return handle.createQuery("""
                        SELECT id, platform_id, platform_revision, name, condition_id, resumed_from, resumed_after, request,
                            feasible, limits_kept, document, created_at
                        FROM load_plan WHERE id = :id AND platform_id = :platform""")
                .bind("id", id)
                .bind("platform", platformId)
                .map((row, context) -> loadPlan(row, events(handle, id)))
                .findOne();
    }

    private static StoredLoadPlan loadPlan(ResultSet row, List<StoredEvent> events) throws SQLException {
        Optional<String> resumedFrom = Optional.ofNullable(row.getString("resumed_from"));
        int resumedAfter = row.getInt("resumed_after");
        NewLoadPlan plan = new NewLoadPlan(
                row.getString("platform_id"),
                row.getInt("platform_revision"),
                row.getString("name"),
                Optional.ofNullable(row.getString("condition_id")),
                resumedFrom.map(from -> new Resumption(from, resumedAfter)),
                row.getString("request"),
                row.getString("document"),
                row.getBoolean("feasible"),
                row.getBoolean("limits_kept"),
                events);
        return new StoredLoadPlan(row.getString("id"), plan, InstantBinding.read(row, "created_at"));
    }

    private static List<StoredEvent> events(Handle handle, String planId) {
        return handle.createQuery("""
                        SELECT event_number, kind, subject, start_minute, mass, draft, heel_angle, trim_angle, gm_transverse,
                            gm_longitudinal, worst_heel, worst_trim, worst_gm, limits_kept, pumped_mass
                        FROM load_plan_event WHERE load_plan_id = :plan ORDER BY event_number""")
                .bind("plan", planId)
                .map((row, context) -> event(row))
                .list();
    }

    private static StoredEvent event(ResultSet row) throws SQLException {
        double minute = row.getDouble("start_minute");
        OptionalDouble at = row.wasNull() ? OptionalDouble.empty() : OptionalDouble.of(minute);
        return new StoredEvent(
                row.getInt("event_number"),
                row.getString("kind"),
                Optional.ofNullable(row.getString("subject")),
                at,
                new StoredEvent.After(
                        row.getDouble("mass"),
                        row.getDouble("draft"),
                        row.getDouble("heel_angle"),
                        row.getDouble("trim_angle"),
                        row.getDouble("gm_transverse"),
                        row.getDouble("gm_longitudinal")),
                new StoredEvent.WorstFigures(
                        row.getDouble("worst_heel"), row.getDouble("worst_trim"), row.getDouble("worst_gm")),
                row.getBoolean("limits_kept"),
                row.getDouble("pumped_mass"));
    }

    /** The load plans of a platform, newest first. */
    public Page<LoadPlanSummary> page(Handle handle, String platformId, PageRequest page) {
        long total = handle.createQuery("SELECT COUNT(*) FROM load_plan WHERE platform_id = :platform")
                .bind("platform", platformId)
                .mapTo(Long.class)
                .one();
        List<LoadPlanSummary> items = handle.createQuery("""
                        SELECT id, platform_revision, name, resumed_from, feasible, limits_kept, created_at FROM load_plan
                        WHERE platform_id = :platform
                        ORDER BY created_at DESC, id DESC LIMIT :limit OFFSET :offset""")
                .bind("platform", platformId)
                .bind("limit", page.limit())
                .bind("offset", page.offset())
                .map((row, context) -> summary(row))
                .list();
        return new Page<>(items, total);
    }

    private static LoadPlanSummary summary(ResultSet row) throws SQLException {
        return new LoadPlanSummary(
                row.getString("id"),
                row.getInt("platform_revision"),
                row.getString("name"),
                Optional.ofNullable(row.getString("resumed_from")),
                row.getBoolean("feasible"),
                row.getBoolean("limits_kept"),
                InstantBinding.read(row, "created_at"));
    }
}
